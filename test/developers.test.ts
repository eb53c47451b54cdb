/** DEVELOPERS.md names only what exists, and every dependency with its reason. */
import { existsSync, readFileSync } from 'node:fs'
import { expect, it } from 'vitest'
import { FAMILIES } from '../lib/dark-energy/index'

const ROOT = new URL('../', import.meta.url)
const read = (path: string) => readFileSync(new URL(path, ROOT), 'utf8')
const text = read('DEVELOPERS.md')
const manifest: Record<'dependencies' | 'devDependencies' | 'scripts', Record<string, string>> = JSON.parse(
  read('package.json'),
)

const PLACES = [...text.matchAll(/`((?:lib|app|test|e2e|scripts)\/[\w./[\]-]*)`/g)].map(([, path]) => path)

it.each([...new Set(PLACES)])('%s exists', (path) => {
  expect(existsSync(new URL(path, ROOT))).toBe(true)
})

it.each([...text.matchAll(/`npm (?:run )?([\w:-]+)`/g)].map(([, script]) => script))(
  'npm has the script %s',
  (script) => {
    expect(Object.keys(manifest.scripts)).toContain(script)
  },
)

const listed = [...text.matchAll(/^\| ([^|]+) \| [^|]+ \|$/gm)].flatMap(([, names]) => names.split(', '))

const packages = { ...manifest.dependencies, ...manifest.devDependencies }

it.each(Object.keys(packages))('%s has its reason', (name) => {
  expect(listed).toContain(name)
})

it.each(Object.entries(packages))('%s is pinned', (_, version) => {
  expect(version).toMatch(/^\d+\.\d+\.\d+$/)
})

it.each(FAMILIES.map(({ key }) => key))('README.md names the law %s', (key) => {
  expect(read('README.md')).toContain(`\`${key}\``)
})
