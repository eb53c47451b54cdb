/** The HTTP front around an application of a few lines, spoken to over plain sockets, since clients repair what is malformed. */
import { randomBytes } from 'node:crypto'
import { once } from 'node:events'
import { type IncomingMessage, request, type Server, type ServerResponse } from 'node:http'
import { type AddressInfo, connect } from 'node:net'
import { Readable } from 'node:stream'
import { setTimeout as wait } from 'node:timers/promises'
import { brotliDecompressSync, gunzipSync } from 'node:zlib'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { drainer } from '../scripts/front/drain.mjs'
import { createFront } from '../scripts/front/server.mjs'
import { LONGEST_TARGET } from '../scripts/front/target.mjs'

type Handler = (request: IncomingMessage, response: ServerResponse) => unknown
const open: Server[] = []
const text = JSON.stringify(Array.from({ length: 500 }, (_, i) => i * 3))

async function start(handler: Handler, limits = {}) {
  const server = createFront(handler, limits)
  open.push(server)
  await once(server.listen(0), 'listening')
  return { server, port: (server.address() as AddressInfo).port }
}

afterEach(() => {
  for (const server of open.splice(0)) {
    server.close()
    server.closeAllConnections()
  }
})

/** Sends bytes as they are, and returns everything until the other side closes. */
async function raw(port: number, bytes: string) {
  const socket = connect(port)
  socket.write(bytes)
  let answer = ''
  socket.on('data', (chunk) => {
    answer += chunk
  })
  await once(socket, 'close')
  const [head, body] = answer.split('\r\n\r\n')
  return { status: Number(head.split(' ')[1]), head, body }
}

const ask = (port: number, line: string) => raw(port, `${line} HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n`)

async function get(port: number, path: string, headers: Record<string, string> = {}, method = 'GET') {
  const outgoing = request({ port, path, headers, method }).end()
  const [response] = (await once(outgoing, 'response')) as [IncomingMessage]
  const chunks: Buffer[] = []
  for await (const chunk of response) chunks.push(chunk)
  return { response, body: Buffer.concat(chunks) }
}

describe('what is refused', () => {
  const refusals: readonly [string, number, string][] = [
    ['a method that reflects the request', 405, 'TRACE / '],
    ['a method that would change something', 405, 'DELETE /api/history'],
    ['a method nobody knows', 405, 'FOO /'],
    ['a key of every object', 400, 'GET /api/at?z=1&__proto__=2'],
    ['a key of the framework', 400, 'GET /api/at?z=1&nxtPz=2'],
    ['a tunnel', 405, 'CONNECT x:443'],
    ['a target with a host', 400, 'GET http://x/'],
    ['a target that could be taken for a host', 400, 'GET //x/'],
    ['the same with a backslash', 400, 'GET /\\x/'],
    ['the server as such', 400, 'OPTIONS *'],
    ['a broken percent-encoding', 400, 'GET /%zz'],
    ['a percent-encoding that is not UTF-8', 400, 'GET /%ff'],
    ['a NUL, encoded', 400, 'GET /a%00b'],
    ['a NUL, plain', 400, 'GET /a\0b'],
    ['a line feed, encoded', 400, 'GET /a%0ab'],
    ['bytes beyond ASCII', 400, 'GET /é'],
    ['a broken query under /api', 400, 'GET /api/at?s=as:100%'],
    ['a target over the limit', 414, `GET /?s=${'a'.repeat(LONGEST_TARGET)}`],
    ['headers over the limit', 431, `GET /?s=${'a'.repeat(3 * LONGEST_TARGET)}`],
  ]

  test.each(refusals)('%s: %i', async (_what, status, line) => {
    const handler = vi.fn()
    const { port } = await start(handler)
    const answer = await ask(port, line.trim())
    expect(answer.status).toBe(status)
    expect(answer.head.toLowerCase()).toContain('content-type: application/problem+json')
    const problem = JSON.parse(answer.body)
    expect(problem).toMatchObject({ type: 'about:blank', status, errors: expect.any(Array) })
    expect(problem.title.length * problem.detail.length).toBeGreaterThan(0)
    // RFC 9110, section 15.5.6: a 405 must say what is allowed.
    if (status === 405) expect(answer.head).toContain('Allow: GET, HEAD, OPTIONS')
    expect(handler).not.toHaveBeenCalled()
  })

  test('the batch is posted and nothing else, and nothing else is posted', async () => {
    const { port } = await start((_incoming, response) => response.end())
    for (const method of ['GET', 'HEAD', 'PUT', 'DELETE']) {
      const answer = await ask(port, `${method} /api/batch`)
      expect(answer.status).toBe(405)
      expect(answer.head).toContain('Allow: POST, OPTIONS')
    }
    expect((await ask(port, 'POST /api/batch')).status).toBe(200)
    for (const path of ['/', '/api', '/api/batch/x', '/api/batches', '/api/history']) {
      const answer = await ask(port, `POST ${path}`)
      expect([answer.status, /Allow: ([A-Z, ]+)/.exec(answer.head)?.[1]]).toEqual([405, 'GET, HEAD, OPTIONS'])
    }
  })

  test('pages of any site may ask the interface before they use it', async () => {
    const { port } = await start(vi.fn())
    const preflight = async (path: string) =>
      (await get(port, path, { Origin: 'https://a.example' }, 'OPTIONS')).response
    expect((await preflight('/api/at?z=1')).headers).toMatchObject({
      'access-control-allow-origin': '*',
      'access-control-allow-methods': 'GET, HEAD, OPTIONS',
    })
    expect((await preflight('/api/batch')).headers).toMatchObject({
      'access-control-allow-methods': 'POST, OPTIONS',
      'access-control-allow-headers': expect.stringContaining('Content-Type'),
    })
    expect((await preflight('/')).headers).not.toHaveProperty('access-control-allow-origin')
  })

  test('a request without Host (RFC 9112, section 3.2), and one with an expectation', async () => {
    const { port } = await start(vi.fn())
    expect(await raw(port, 'GET / HTTP/1.1\r\nConnection: close\r\n\r\n')).toMatchObject({ status: 400 })
    const expecting = 'GET / HTTP/1.1\r\nHost: x\r\nExpect: tea\r\nConnection: close\r\n\r\n'
    expect(await raw(port, expecting)).toMatchObject({ status: 417 })
  })

  test("a router's state that Next cannot read", async () => {
    const { port } = await start((_incoming, response) => response.end())
    const status = async (state: string) =>
      (await get(port, '/', { RSC: '1', 'Next-Router-State-Tree': state })).response.statusCode
    expect(await status('%zz')).toBe(400)
    expect(await status('[1]')).toBe(400)
    expect(await status(encodeURIComponent('["",{"children":["__PAGE__",{}]}]'))).toBe(200)
  })

  test('a broken query names the parameter and its scenario', async () => {
    const { port } = await start(vi.fn())
    const { body } = await ask(port, 'GET /api/history?s=h0:70&x=1&s=as:100%')
    expect(JSON.parse(body)).toMatchObject({
      instance: '/api/history',
      errors: [{ parameter: 's', scenario: 1, value: 'as:100%' }],
    })
  })

  test('characters that are no part of an address: the parameter is named where it can be', async () => {
    const { port } = await start(vi.fn())
    const { status, body } = await ask(port, 'GET /api/at?s=h0:70&z=١')
    expect(status).toBe(400)
    expect(JSON.parse(body).errors).toMatchObject([
      { parameter: 'z', scenario: null, value: '١', allowed: 'percent-encoded UTF-8' },
    ])
  })

  test('a refusal too may be read by pages of any site', async () => {
    const { port } = await start(vi.fn())
    expect((await ask(port, 'DELETE /api/history')).head).toContain('Access-Control-Allow-Origin: *')
    expect((await ask(port, 'DELETE /')).head).not.toContain('Access-Control')
  })

  test('headers that do not end', async () => {
    const { port } = await start(vi.fn(), { headersTimeout: 100, requestTimeout: 100, connectionsCheckingInterval: 20 })
    expect(await raw(port, 'GET / HTTP/1.1\r\nHost: x\r\n')).toMatchObject({ status: 408 })
  })
})

describe('what is let through', () => {
  test('a target just within the limit, and a broken query outside /api', async () => {
    const { port } = await start((incoming, response) => response.end(String(incoming.url?.length)))
    const longest = `/${'a'.repeat(LONGEST_TARGET - 1)}`
    expect(await ask(port, `GET ${longest}`)).toMatchObject({ status: 200 })
    expect(await ask(port, 'GET /?s=as:100%')).toMatchObject({ status: 200 })
  })

  test('HEAD, and OPTIONS without the application', async () => {
    const handler = vi.fn((_incoming, response) => response.end('body'))
    const { port } = await start(handler)
    expect(await ask(port, 'OPTIONS /any')).toMatchObject({ status: 204, body: '' })
    expect(handler).not.toHaveBeenCalled()
    expect(await ask(port, 'HEAD /any')).toMatchObject({ status: 200, body: '' })
  })

  test('every answer tells browsers not to guess, and only /embed may be framed elsewhere', async () => {
    const { port } = await start((_incoming, response) => response.end())
    expect((await get(port, '/')).response.headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'same-origin',
      'x-frame-options': 'SAMEORIGIN',
    })
    expect((await get(port, '/embed?s=h0:70')).response.headers['x-frame-options']).toBeUndefined()
    expect((await get(port, '/embedded')).response.headers['x-frame-options']).toBe('SAMEORIGIN')
  })

  test('an error that the application throws is logged and becomes a problem', async () => {
    const log = vi.spyOn(console, 'error').mockImplementation(() => {})
    const { port } = await start(() => Promise.reject(new Error('lost')))
    const { response, body } = await get(port, '/x')
    expect(response.statusCode).toBe(500)
    expect(body.toString()).not.toContain('lost')
    expect(log).toHaveBeenCalledOnce()
    log.mockRestore()
  })
})

describe('compression', () => {
  const json: Handler = (_incoming, response) => response.setHeader('Content-Type', 'application/json').end(text)

  test('follows Accept-Encoding, and the text survives it', async () => {
    const { port } = await start(json)
    const brotli = await get(port, '/', { 'Accept-Encoding': 'gzip, deflate, br' })
    expect(brotli.response.headers).toMatchObject({ 'content-encoding': 'br', vary: 'Accept-Encoding' })
    expect(brotliDecompressSync(brotli.body).toString()).toBe(text)
    const gzip = await get(port, '/', { 'Accept-Encoding': 'gzip, br;q=0' })
    expect(gunzipSync(gzip.body).toString()).toBe(text)
    const plain = await get(port, '/')
    expect(plain.response.headers['content-encoding']).toBeUndefined()
    expect(plain.body.toString()).toBe(text)
  })

  test.each<[string, Handler]>([
    ['a short body', (_incoming, response) => response.setHeader('Content-Type', 'application/json').end('[]')],
    ['a picture', (_incoming, response) => response.setHeader('Content-Type', 'image/png').end(text)],
    ['part of a file', (_incoming, response) => response.writeHead(206, { 'Content-Type': 'text/css' }).end(text)],
  ])('leaves %s alone', async (_what, handler) => {
    const { port } = await start(handler)
    const { response } = await get(port, '/', { 'Accept-Encoding': 'br' })
    expect(response.headers['content-encoding']).toBeUndefined()
  })

  test.each(['identity', 'br', 'gzip'])('holds back a producer whose reader stalls: %s', async (encoding) => {
    const most = 64 * 1024 * 1024
    let produced = 0
    function* chunks() {
      for (; produced < most; produced += 64 * 1024) yield randomBytes(64 * 1024)
    }
    const { port } = await start((_incoming, response) => {
      Readable.from(chunks()).pipe(response.setHeader('Content-Type', 'text/csv'))
    })
    const outgoing = request({ port, path: '/', headers: { 'Accept-Encoding': encoding } }).end()
    const [response] = (await once(outgoing, 'response')) as [IncomingMessage]
    response.pause()
    let before = -1
    while (produced > before) {
      before = produced
      await wait(200)
    }
    // Noise cannot be made small, so this is what lies in the sockets' and the compressor's buffers: a few MB.
    expect(produced).toBeLessThan(most / 4)
    outgoing.destroy()
  })
})

describe('stopping', () => {
  test('finishes an answer under way, refuses new ones, and drops idle connections', async () => {
    let release = () => {}
    const { server, port } = await start((_incoming, response) => {
      release = () => response.end('done')
    })
    const stop = drainer(server, 10_000)
    const idle = connect(port)
    await once(idle, 'connect')
    const answer = get(port, '/slow', { Connection: 'keep-alive' })
    await once(server, 'request')
    const stopped = stop()
    await expect(get(port, '/late')).rejects.toThrow('ECONNREFUSED')
    release()
    expect((await answer).body.toString()).toBe('done')
    const begin = performance.now()
    await stopped
    // Far below the time that a kept-alive connection would be held.
    expect(performance.now() - begin).toBeLessThan(3000)
  })

  test('cuts off at the deadline', async () => {
    const { server, port } = await start(() => {})
    const stop = drainer(server, 100)
    const answer = get(port, '/never')
    const failed = expect(answer).rejects.toThrow()
    await once(server, 'request')
    await stop()
    await failed
  })
})

describe('a page', () => {
  const scripts = ['/a.js', '/b.js'].map((source) => `<script src="${source}" async="" nonce="n+/="></script>`)
  const page = `<html><head><title>Ω_m älter</title>${scripts.join('')}</head><body>ü<script src="/a.js" async=""></script></body></html>`
  /** Written in pieces that cut letters and tags. */
  const serve = (size: number, type = 'text/html; charset=utf-8') =>
    start((_request, response) => {
      response.setHeader('Content-Type', type)
      const bytes = Buffer.from(page)
      for (let i = 0; i < bytes.length; i += size) response.write(bytes.subarray(i, i + size))
      response.end()
    })

  test.each([1, 7, 100, 10_000])('rests: its scripts wait, written %i bytes at a time', async (size) => {
    const { port } = await serve(size)
    const body = String((await get(port, '/')).body)
    const [head, rest] = body.split('</head>')
    expect(head).not.toContain('async')
    expect(head).toContain('<title>Ω_m älter</title>')
    expect(head).toContain('<script nonce="n+/=" data-scripts="/a.js /b.js">')
    expect(rest).toBe('<body>ü<script src="/a.js" async=""></script></body></html>')
  })

  test('without scripts, and what is no page, are passed on as they are', async () => {
    const plain = await start((_request, response) => {
      response.setHeader('Content-Type', 'text/html').end('<head></head>', 'latin1')
    })
    expect(String((await get(plain.port, '/')).body)).toBe('<head></head>')
    const { port } = await serve(9, 'text/plain; charset=utf-8')
    expect(String((await get(port, '/')).body)).toBe(page)
  })
})
