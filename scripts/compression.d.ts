/** What we use of the package, which ships no types; the published ones ask for a whole web framework. */
declare module 'compression' {
  import type { IncomingMessage, ServerResponse } from 'node:http'
  import type { BrotliOptions, ZlibOptions } from 'node:zlib'

  type Filter = (request: IncomingMessage, response: ServerResponse) => boolean
  interface Options extends ZlibOptions {
    readonly threshold?: number
    readonly filter?: Filter
    readonly brotli?: BrotliOptions
  }
  function compression(
    options?: Options,
  ): (request: IncomingMessage, response: ServerResponse, next: () => void) => void
  namespace compression {
    const filter: Filter
  }
  export default compression
}
