/** Brotli or gzip by Accept-Encoding, for types that shrink and bodies of 1 kB or more; streams stay streams. */
import { constants } from 'node:zlib'
import compression from 'compression'

export const compress = compression({
  threshold: 1024,
  // Part of a file has to stay part of that very file.
  filter: (request, response) => response.statusCode !== 206 && compression.filter(request, response),
  brotli: {
    params: { [constants.BROTLI_PARAM_QUALITY]: 4 },
  },
})
