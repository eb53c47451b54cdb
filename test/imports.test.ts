/** Who may import whom in lib: a file takes from its own folder or from what stands above it in this list. */
import { readdirSync, readFileSync } from 'node:fs'
import { dirname, join, normalize } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, test } from 'vitest'

const ORDER = [
  'constants',
  'units',
  'parameter',
  'numerics',
  'neutrinos',
  'dark-energy',
  'scenario',
  'components',
  'model',
  'history',
  'measures',
  'quantities',
  'solve',
  'neighbours',
  'ruler',
  'retune',
  'words',
  'tables',
  'formats',
  'takeaway',
  'figures',
  'print',
  'answers',
  'interface',
]

/** What a pure function cannot know: the time, chance, its process, the network, the page. */
const OUTSIDE =
  /\bDate\.now\b|\bnew Date\b|\bDate\(|\bMath\.random\b|\bcrypto\.|\bperformance\.|\bprocess\.|\bfetch\(|\bsetTimeout\(|\bglobalThis\b|\blocalStorage\b/
const PACKAGES_OUTSIDE = /^(?:node:|next(?:$|\/)|react(?:$|[-/])|recharts|@tanstack\/)/

const lib = fileURLToPath(new URL('../lib', import.meta.url))
const files = readdirSync(lib, { recursive: true, encoding: 'utf8' })
  .filter((file) => /\.[mc]?[jt]sx?$/.test(file))
  .toSorted()
const codeOf = (file: string) => withoutComments(readFileSync(join(lib, file), 'utf8'))

function withoutComments(source: string): string {
  return source.replace(/\/\*[\s\S]*?\*\//g, '').replace(/(^|\s)\/\/.*$/gm, '$1')
}

/** Everything after `from`, a bare `import` or an `import(…)`. */
function importsOf(code: string): string[] {
  const pattern = /(?:\bfrom\s*|\bimport\s*\(?\s*)(['"])([^'"\n]+)\1/g
  return [...code.matchAll(pattern)].map((match) => match[2])
}

/** The name in the list that a path inside lib belongs to. */
const placeOf = (path: string): string => path.split('/')[0].replace(/\.[mc]?[jt]sx?$/, '')

/** What is wrong with an import, or null. `file` is a path inside lib. */
function complaint(file: string, specifier: string): string | null {
  if (!specifier.startsWith('.')) return PACKAGES_OUTSIDE.test(specifier) ? `${specifier} is no part of lib` : null
  const target = normalize(join(dirname(file), specifier))
  if (target.startsWith('..')) return `${specifier} lies outside lib`
  if (/\.[mc]?[jt]sx?$/.test(target)) return `${specifier} has an extension`
  const [from, to] = [placeOf(file), placeOf(target)]
  if (from === to) return null
  return ORDER.indexOf(to) >= 0 && ORDER.indexOf(to) < ORDER.indexOf(from) ? null : `${from} stands above ${to}`
}

/** The file that a relative import means. */
function resolved(file: string, specifier: string): string | undefined {
  const target = normalize(join(dirname(file), specifier))
  return [`${target}.ts`, `${target}.tsx`, `${target}/index.ts`].find((path) => files.includes(path))
}

describe('the rules can fail', () => {
  test.each([
    ['dark-energy/law.ts', '../scenario/read'],
    ['numerics/roots.ts', '../neutrinos/energy'],
    ['units.ts', './parameter'],
    ['scenario/read.ts', '../unheard-of/thing'],
    ['scenario/read.ts', '../../app/page'],
    ['scenario/read.ts', './write.ts'],
    ['figures/chart.ts', 'react'],
    ['figures/chart.ts', 'react-dom/server'],
    ['figures/chart.ts', 'next/link'],
    ['tables/rows.ts', 'node:fs'],
  ])('%s must not import %s', (file, specifier) => expect(complaint(file, specifier)).not.toBe(null))
  test.each([
    ['scenario/read.ts', './write'],
    ['scenario/read.ts', '../dark-energy'],
    ['solve.ts', './history/history'],
    ['scenario/read.ts', '../units'],
  ])('%s may import %s', (file, specifier) => expect(complaint(file, specifier)).toBe(null))
  test('imports are found in every form', () => {
    const code =
      "import a, { type B } from './a'\nimport './b'\nexport * from \"./c\"\nawait import('./d')\nimport type {\n  E,\n} from './e'"
    expect(importsOf(code)).toEqual(['./a', './b', './c', './d', './e'])
  })
  test.each(['Date.now()', 'new Date(0)', 'Math.random()', 'process.env.X', "fetch('/')", 'performance.now()'])(
    '%s is seen',
    (code) => expect(OUTSIDE.test(withoutComments(`const a = ${code} // why`))).toBe(true),
  )
  test('not in comments', () => expect(OUTSIDE.test(withoutComments('/* new Date */ a() // fetch(it)'))).toBe(false))
})

describe.each(files)('lib/%s', (file) => {
  test('stands in the list', () => expect(ORDER).toContain(placeOf(file)))
  test('imports from its folder or above', () => {
    expect(importsOf(codeOf(file)).flatMap((one) => complaint(file, one) ?? [])).toEqual([])
  })
  test('knows no clock, chance, process, network or page', () => {
    expect(codeOf(file).match(OUTSIDE)?.[0] ?? null).toBe(null)
  })
})

test('no import cycle', () => {
  const done = new Set<string>()
  const visit = (file: string, path: readonly string[]): void => {
    if (path.includes(file)) throw new Error(`cycle: ${[...path.slice(path.indexOf(file)), file].join(' → ')}`)
    if (done.has(file)) return
    const relative = importsOf(codeOf(file)).filter((one) => one.startsWith('.'))
    for (const next of relative.flatMap((one) => resolved(file, one) ?? [])) visit(next, [...path, file])
    done.add(file)
  }
  expect(files.length).toBeGreaterThan(0)
  for (const file of files) visit(file, [])
})

test('every relative import leads to a file', () => {
  const lost = files.flatMap((file) =>
    importsOf(codeOf(file))
      .filter((one) => one.startsWith('.') && !resolved(file, one))
      .map((one) => `${file}: ${one}`),
  )
  expect(lost).toEqual([])
})

test('DEVELOPERS.md tells this order', () => {
  const [, flow = ''] = readFileSync(new URL('../DEVELOPERS.md', import.meta.url), 'utf8').split('```')
  const told = flow.split('\n').flatMap((line) => (line.startsWith('lib/') ? line.split(/ {2}/)[0].split(' ') : []))
  expect(told.map((path) => placeOf(path.replace('lib/', '')))).toEqual(ORDER)
})
