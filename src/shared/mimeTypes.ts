const TYPES: Readonly<Record<string, string>> = {
  html: 'text/html; charset=utf-8',
  js: 'text/javascript; charset=utf-8',
  css: 'text/css; charset=utf-8',
  json: 'application/json; charset=utf-8',
  txt: 'text/plain; charset=utf-8',
  svg: 'image/svg+xml',
  png: 'image/png',
  ico: 'image/x-icon',
  woff2: 'font/woff2',
  wasm: 'application/wasm',
}

/** The media type of a file by the end of its name; null when it is none that the window is made of. */
export function mimeType(name: string): string | null {
  const end = name.slice(name.lastIndexOf('.') + 1).toLowerCase()
  return TYPES[end] ?? null
}
