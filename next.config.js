/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  // Compression belongs to the HTTP front (scripts/serve.mjs), which can cache its result.
  compress: false,
  reactStrictMode: true,
  images: { unoptimized: true },
}

export default config
