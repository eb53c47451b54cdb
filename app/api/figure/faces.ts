/** The typeface of figures as files, read when one is first asked for. */
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import * as fontkit from 'fontkit'
import type { FaceKey, Faces } from '../../../lib/print/face'

const FOLDER = join(process.cwd(), 'app/fonts')
const NAMES: Readonly<Record<FaceKey, string>> = {
  regular: 'longhence-sans-regular.ttf',
  semibold: 'longhence-sans-semibold.ttf',
  italic: 'longhence-sans-italic.ttf',
}

interface Typeface {
  readonly files: Readonly<Record<FaceKey, Buffer>>
  readonly faces: Faces
}

let known: Typeface | undefined

export function typeface(): Typeface {
  known ??= read()
  return known
}

function read(): Typeface {
  const entries = Object.entries(NAMES).map(([key, name]) => [key, readFileSync(join(FOLDER, name))] as const)
  const files = Object.fromEntries(entries) as Record<FaceKey, Buffer>
  const faces = Object.fromEntries(entries.map(([key, file]) => [key, fontkit.create(file)]))
  return { files, faces: faces as unknown as Faces }
}
