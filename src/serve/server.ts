import { readFile, realpath } from 'node:fs/promises'
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http'
import { isAbsolute, join, relative, sep } from 'node:path'
import { mimeType } from '../shared/mimeTypes'
import { SECURITY_HEADERS } from '../shared/security'

/** The window served on this machine only. */
export interface Served {
  /** http://127.0.0.1:PORT/ */
  readonly address: string
  close(): Promise<void>
}

/**
 * Serves the built window in `folder` on 127.0.0.1 and nothing else: no listing, no upload, no file outside
 * the folder. Requests that name another host are refused, so that a page elsewhere cannot reach in by a
 * name that it points here.
 *
 * Throws when the folder is not there or no port can be had.
 */
export async function serveWindow(folder: string, port = 0): Promise<Served> {
  const root = await realpath(folder).catch(() => {
    throw new Error('it is not built; run "npm run build"')
  })
  const server = createServer((request, response) => {
    answer(root, hosts(server), request, response).catch(() => refuse(response, 500, 'Internal error'))
  })
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', resolve)
  })
  return {
    address: `http://127.0.0.1:${portOf(server)}/`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}

function portOf(server: Server): number {
  const address = server.address()
  return typeof address === 'object' && address !== null ? address.port : 0
}

function hosts(server: Server): readonly string[] {
  return [`127.0.0.1:${portOf(server)}`, `localhost:${portOf(server)}`]
}

async function answer(
  root: string,
  allowedHosts: readonly string[],
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  if (!allowedHosts.includes(request.headers.host ?? '')) return refuse(response, 403, 'Unknown host')
  if (request.method !== 'GET' && request.method !== 'HEAD') {
    response.setHeader('Allow', 'GET, HEAD')
    return refuse(response, 405, 'Only GET and HEAD')
  }
  const found = await findFile(root, request.url ?? '/')
  if (found === null) return refuse(response, 404, 'Not found')
  response.writeHead(200, {
    ...SECURITY_HEADERS,
    'Content-Type': found.type,
    'Content-Length': found.bytes.length,
    'Cache-Control': 'no-store',
  })
  response.end(request.method === 'HEAD' ? undefined : found.bytes)
}

/** The file of a request path; null for anything that is not a known kind of file inside the folder. */
async function findFile(root: string, url: string): Promise<{ bytes: Buffer; type: string } | null> {
  const name = fileName(url)
  const type = name === null ? null : mimeType(name)
  if (name === null || type === null) return null
  try {
    const path = await realpath(join(root, name))
    const inside = relative(root, path)
    if (inside === '' || inside === '..' || inside.startsWith(`..${sep}`) || isAbsolute(inside)) return null
    return { bytes: await readFile(path), type }
  } catch {
    return null
  }
}

function fileName(url: string): string | null {
  try {
    const path = decodeURIComponent(url.split(/[?#]/, 1)[0] ?? '')
    if (!path.startsWith('/') || path.includes('\0') || path.includes('\\')) return null
    return path === '/' ? 'index.html' : path.slice(1)
  } catch {
    return null
  }
}

function refuse(response: ServerResponse, status: number, message: string): void {
  if (!response.headersSent) {
    response.writeHead(status, { ...SECURITY_HEADERS, 'Content-Type': 'text/plain; charset=utf-8' })
  }
  response.end(`${message}\n`)
}
