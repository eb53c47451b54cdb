import { LRUCache } from 'lru-cache'
import { askFigure, type FigureFile } from '../../../lib/answers/figure'
import { mapped } from '../../../lib/answers/question'
import { HOME } from '../home'
import { type Body, pairsOf, reply } from '../reply'
import { drawn } from './draw'

export const dynamic = 'force-dynamic'

const BYTES = 32 * 2 ** 20

/** Files that were asked for already, until the memory for them is full. */
const files = new LRUCache<string, Uint8Array<ArrayBuffer>>({ maxSize: BYTES, sizeCalculation: ({ length }) => length })

/** A view of scenarios as SVG, PNG or PDF. */
export function GET(request: Request): Response {
  return reply(request, '/api/figure', askFigure(pairsOf(request), HOME), (question, place) =>
    mapped(question.answer(), (file) => bodyOf(file, place)),
  )
}

/** Drawn when the answer is read, beside other requests. */
function bodyOf(file: FigureFile, place: string): Body {
  const content = new ReadableStream<Uint8Array>({
    async pull(controller) {
      const bytes = files.get(place) ?? (await drawn(file))
      files.set(place, bytes)
      controller.enqueue(bytes)
      controller.close()
    },
  })
  return {
    content,
    headers: {
      'Content-Type': file.format.mediaType,
      'Content-Disposition': `inline; filename="${file.fileName}"`,
      // An SVG opened by itself is a page: it runs nothing and loads nothing.
      'Content-Security-Policy': "default-src 'none'; style-src 'unsafe-inline'; sandbox",
    },
  }
}
