import { once } from 'node:events'
import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, test } from 'vitest'
import { CHROMIUM, FIREFOX, find } from '../../scripts/setup/browsers.mjs'
import { builtIn, isSource } from '../../scripts/setup/build.mjs'
import { npmCommand } from '../../scripts/setup/install.mjs'
import { nodeProblem, requiredNode } from '../../scripts/setup/node-version.mjs'
import { choosePort, explainListenError, probePort } from '../../scripts/setup/port.mjs'
import { clearStamp, filesUnder, hashOf, isFresh, setStamp } from '../../scripts/setup/stamp.mjs'

describe('Node', () => {
  test.each(['v20.19.0', 'v20.20.2', 'v22.0.0', 'v24.11.1'])('%s will do', (version) => {
    expect(nodeProblem(version, '20.19')).toBeNull()
  })

  test.each(['v20.18.9', 'v18.20.0', 'v9.99.0'])('%s is too old, which one line says', (version) => {
    const problem = nodeProblem(version, '20.19')
    expect(problem).toContain(version)
    expect(problem).not.toContain('\n')
  })

  test('the required version is a number that this test can read', () => {
    expect(requiredNode()).toMatch(/^\d+\.\d+$/)
  })
})

describe('the port', () => {
  test('is the argument, else the variable, else 3000', () => {
    expect(choosePort([], {})).toBe(3000)
    expect(choosePort([], { PORT: '' })).toBe(3000)
    expect(choosePort([], { PORT: '8080' })).toBe(8080)
    expect(choosePort(['-p', '81'], { PORT: '8080' })).toBe(81)
    expect(choosePort(['-p81'], {})).toBe(81)
    expect(choosePort(['--port=81'], {})).toBe(81)
  })

  test.each([['x'], ['-1'], ['65536'], ['80.5'], ['0x50'], ['']])('is not %j', (text) => {
    expect(() => choosePort([`--port=${text}`], {})).toThrow('A port is a number')
  })

  test('is the only argument', () => {
    expect(() => choosePort(['--prot', '81'], {})).toThrow('The only option is -p PORT')
  })

  test('in use gives one line', async () => {
    const server = createServer().listen(0)
    await once(server, 'listening')
    const { port } = server.address() as { port: number }
    const error = await probePort(port).catch((thrown) => explainListenError(thrown, port))
    expect(error).toMatchObject({ message: `Port ${port} is in use. Choose another one with PORT or -p.` })
    server.close()
    await once(server, 'close')
    expect(await probePort(port)).toBe(port)
  })
})

describe('stamps', () => {
  const project = () => {
    const root = mkdtempSync(join(tmpdir(), 'stamp-'))
    mkdirSync(join(root, 'app'))
    writeFileSync(join(root, 'app', 'page.tsx'), 'page')
    writeFileSync(join(root, 'app', 'layout.tsx'), 'layout')
    writeFileSync(join(root, 'README.md'), 'text')
    return root
  }

  test('the hash follows contents, names and words, and nothing else', () => {
    const root = project()
    const hash = (words?: string[]) => hashOf(root, filesUnder(root, isSource), words)
    const first = hash()
    expect(filesUnder(root, isSource)).toEqual(['app/layout.tsx', 'app/page.tsx'])
    writeFileSync(join(root, 'README.md'), 'other text')
    expect(hash()).toBe(first)
    expect(hash(['v22'])).not.toBe(first)
    writeFileSync(join(root, 'app', 'page.tsx'), 'Page')
    const second = hash()
    expect(second).not.toBe(first)
    writeFileSync(join(root, 'app', 'error.tsx'), '')
    expect(hash()).not.toBe(second)
  })

  test('a stamp holds until it is cleared or the hash changes', () => {
    const file = join(project(), 'stamp')
    expect(isFresh(file, 'a')).toBe(false)
    setStamp(file, 'a')
    expect(isFresh(file, 'a')).toBe(true)
    expect(isFresh(file, 'b')).toBe(false)
    clearStamp(file)
    expect(isFresh(file, 'a')).toBe(false)
  })

  test('sources are what pages can be made from', () => {
    const sources = ['app/page.tsx', 'lib/solve.ts', 'proxy.ts', 'next.config.js', 'package-lock.json', 'new/file.ts']
    const others = ['README.md', 'test/serve.test.ts', 'e2e/a.spec.ts', '.git/HEAD', '.next/x', 'node_modules/a/b.js']
    expect(sources.filter((path) => !isSource(path))).toEqual([])
    expect(others.filter(isSource)).toEqual([])
  })

  test('settings that are built in belong to the hash', () => {
    expect(builtIn({ PUBLIC_URL: 'u', NEXT_PUBLIC_A: '1', HOME: '/' })).toEqual(['NEXT_PUBLIC_A=1', 'PUBLIC_URL=u'])
  })
})

test('npm is the one that runs us, and no other package manager', () => {
  expect(npmCommand({ npm_execpath: '/n/npm-cli.js' })).toEqual([process.execPath, '/n/npm-cli.js'])
  expect(npmCommand({ npm_execpath: '/n/pnpm.cjs' })).toEqual(['npm'])
  expect(npmCommand({})).toEqual(['npm'])
})

test('a browser is the named one, else a known place, else none', () => {
  const only = (path: string) => (asked: string) => asked === path
  expect(find(CHROMIUM, { CHROMIUM_PATH: '/c' }, only('/c'))).toBe('/c')
  expect(() => find(CHROMIUM, { CHROMIUM_PATH: '/d' }, only('/c'))).toThrow('/d')
  expect(find(CHROMIUM, {}, only('/usr/bin/google-chrome'))).toBe('/usr/bin/google-chrome')
  expect(find(CHROMIUM, {}, () => false)).toBeUndefined()
  expect(find(FIREFOX, { CHROMIUM_PATH: '/c', FIREFOX_PATH: '/f' }, only('/f'))).toBe('/f')
})
