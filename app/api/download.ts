/** A table as a download, streamed. */
import type { Download } from '../../lib/answers/table'
import { streamOf } from './stream'

export const streamed = ({ mediaType, fileName, pieces }: Download) => ({
  content: streamOf(pieces()),
  headers: { 'Content-Type': mediaType, 'Content-Disposition': `attachment; filename="${fileName}"` },
})
