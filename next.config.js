/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  // Compression belongs to the HTTP front (scripts/serve.mjs), which can cache its result.
  compress: false,
  // Types are held by `npm run check`, so that a mistake in a test keeps nobody from starting the server.
  typescript: { ignoreBuildErrors: true },
  reactStrictMode: true,
  // They read files beside their own, and one is no JavaScript: not to be bundled.
  serverExternalPackages: ['@resvg/resvg-js', 'fontkit', 'pdfkit'],
  images: { unoptimized: true },
  // By its ending it would be sent as a film.
  headers: async () => [
    { source: '/longhence.d.ts', headers: [{ key: 'Content-Type', value: 'text/plain; charset=utf-8' }] },
  ],
}

export default config
