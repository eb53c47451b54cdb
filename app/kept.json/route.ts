import { readdirSync } from 'node:fs'
import { join } from 'node:path'

/** Made once, at the end of the build: the list of its files, for a browser that keeps them. */
export const dynamic = 'force-static'

const FOLDER = join(process.cwd(), '.next', 'static')

export function GET(): Response {
  const paths = readdirSync(FOLDER, { recursive: true, encoding: 'utf8' }).filter((path) =>
    /\.(js|css|woff2)$/.test(path),
  )
  return Response.json({ files: paths.map((path) => `/_next/static/${path.split('\\').join('/')}`) })
}
