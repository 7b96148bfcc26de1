import type { Host, NamedText, OpenedFile, SavedAs } from '../../shared/host'

const RECOVERY_KEY = 'sectionwright recovery'

/** The host of a plain browser: file inputs, downloads, and the page's own storage for recovery. */
export function browserHost(page: Document, storage: Storage): Host {
  return {
    kind: 'browser',
    openFiles: () => pick(page, { multiple: true, accept: '.dat,.txt,.csv,.cor,text/plain,text/csv' }),
    openBrief: async () => (await pick(page, { multiple: false, accept: '.json' }))[0] ?? null,
    saveBrief: async (text, suggestedName) => download(page, { name: suggestedName, text }),
    forgetBrief: async () => {},
    saveFile: async (name, content) =>
      download(page, {
        name,
        text: typeof content === 'string' ? content : new TextDecoder().decode(content),
      }),
    saveFiles: async (files) => {
      for (const file of files) download(page, file)
      return { name: files.map((file) => file.name).join(', ') }
    },
    recover: async () => storage.getItem(RECOVERY_KEY),
    keepForRecovery: async (text) =>
      text === null ? storage.removeItem(RECOVERY_KEY) : storage.setItem(RECOVERY_KEY, text),
    print: async () => page.defaultView?.print(),
    showDocument: async ({ title, unsaved }) => {
      page.title = `${unsaved ? '• ' : ''}${title} – Sectionwright`
    },
    onMenu: () => () => {},
  }
}

function pick(page: Document, options: { multiple: boolean; accept: string }): Promise<OpenedFile[]> {
  const input = page.createElement('input')
  input.type = 'file'
  input.multiple = options.multiple
  input.accept = options.accept
  return new Promise((resolve, reject) => {
    input.addEventListener('cancel', () => resolve([]))
    input.addEventListener('change', () => {
      Promise.all([...(input.files ?? [])].map(readFile)).then(resolve, reject)
    })
    input.click()
  })
}

/** The name and the bytes of a file that was picked or dropped. */
export async function readFile(file: File): Promise<OpenedFile> {
  return { name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) }
}

function download(page: Document, { name, text }: NamedText): SavedAs {
  const link = page.createElement('a')
  const url = URL.createObjectURL(new Blob([text], { type: 'text/plain;charset=utf-8' }))
  link.href = url
  link.download = name
  link.click()
  setTimeout(() => URL.revokeObjectURL(url), 10_000)
  return { name }
}
