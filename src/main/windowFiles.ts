import { readFile } from 'node:fs/promises'
import { isAbsolute, join, relative, sep } from 'node:path'
import { mimeType } from '../shared/mimeTypes'
import { SECURITY_HEADERS } from '../shared/security'
import { ORIGIN } from './windowOptions'

/**
 * Answers a request of the window for one of its own files in `folder`. Anything else (another method,
 * another origin, a path that leads out, an unknown kind of file) is refused.
 */
export async function answerWindowFile(folder: string, request: Request): Promise<Response> {
  const url = new URL(request.url)
  if (request.method !== 'GET') return refusal(405, 'Only GET')
  if (`${url.protocol}//${url.host}` !== ORIGIN) return refusal(403, 'Unknown origin')
  const path = pathInside(folder, url.pathname)
  const type = path === null ? null : mimeType(path)
  if (path === null || type === null) return refusal(404, 'Not found')
  try {
    const bytes = new Uint8Array(await readFile(path))
    return new Response(bytes, { headers: { ...SECURITY_HEADERS, 'Content-Type': type } })
  } catch {
    return refusal(404, 'Not found')
  }
}

function pathInside(folder: string, pathname: string): string | null {
  try {
    const name = decodeURIComponent(pathname)
    if (name.includes('\0') || name.includes('\\')) return null
    const path = join(folder, name === '/' ? 'index.html' : name)
    const inside = relative(folder, path)
    return inside === '' || inside === '..' || inside.startsWith(`..${sep}`) || isAbsolute(inside)
      ? null
      : path
  } catch {
    return null
  }
}

function refusal(status: number, message: string): Response {
  return new Response(message, { status, headers: { ...SECURITY_HEADERS, 'Content-Type': 'text/plain' } })
}
