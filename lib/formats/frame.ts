/** What a page pastes to show a figure. */
import { xml } from './xml'

export const FRAME_SIZE = { width: 800, height: 480 }

export const frameHtml = (src: string, title: string, { width, height } = FRAME_SIZE): string =>
  `<iframe src="${xml(src)}" title="${xml(title)}" width="${width}" height="${height}" loading="lazy" style="border:0;max-width:100%"></iframe>`
