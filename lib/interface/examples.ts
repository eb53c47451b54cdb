/** Examples as commands of a shell, and as links. */
import type { Example, Route } from './route'

/** Where `npm start` serves. */
const HERE = 'http://localhost:3000'

export const exampleLink = ({ path }: Route, { query }: Example): string => `${path}${query ? `?${query}` : ''}`

export function exampleCommand(route: Route, example: Example, base: string): string {
  const target = `'${base === '' ? HERE : base}${exampleLink(route, example)}'`
  if (example.body === undefined) return `curl ${target}`
  const [type] = Object.keys(route.body ?? {})
  return `printf '%s' '${example.body.trimEnd()}' | curl --data-binary @- -H 'Content-Type: ${type}' ${target}`
}
