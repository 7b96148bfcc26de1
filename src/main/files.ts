import type { Dialog, OpenDialogOptions, SaveDialogOptions } from 'electron'
import { basename, join } from 'node:path'
import { LARGEST_FILE, type NamedText, type OpenedFile, type SavedAs } from '../shared/host'
import type { FileToWrite } from '../files/writeFiles'

/** What the file requests need from outside. */
export interface FileParts {
  readonly dialog: {
    open(options: OpenDialogOptions): ReturnType<Dialog['showOpenDialog']>
    save(options: SaveDialogOptions): ReturnType<Dialog['showSaveDialog']>
  }
  /** Size in bytes. */
  readonly sizeOf: (path: string) => Promise<number>
  readonly read: (path: string) => Promise<Uint8Array>
  /** Whole or not at all. */
  readonly write: (files: readonly FileToWrite[]) => Promise<void>
}

const ANY_FILE = { name: 'All files', extensions: ['*'] }
const BRIEFS = { name: 'Briefs', extensions: ['json'] }
const SECTIONS = { name: 'Coordinate files', extensions: ['dat', 'txt', 'csv'] }

/** Asks for coordinate files and reads them; a file too large is refused by its size, before it is read. */
export async function openFiles(parts: FileParts): Promise<readonly OpenedFile[]> {
  const paths = await pick(parts, {
    title: 'Add sections from coordinate files',
    properties: ['openFile', 'multiSelections'],
    filters: [SECTIONS, ANY_FILE],
  })
  return Promise.all(paths.map((path) => readPicked(parts, path)))
}

/** The brief's own file: opened, saved under the name it came from or another, and forgotten. */
export function briefFile(parts: FileParts): {
  open(): Promise<OpenedFile | null>
  save(text: string, suggestedName: string, as: boolean): Promise<SavedAs | null>
  forget(): void
} {
  let current: string | null = null
  return {
    open: async () => {
      const [path] = await pick(parts, {
        title: 'Open a brief',
        properties: ['openFile'],
        filters: [BRIEFS, ANY_FILE],
      })
      if (path === undefined) return null
      const file = await readPicked(parts, path)
      current = path
      return file
    },
    save: async (text, suggestedName, as) => {
      const path =
        current !== null && !as
          ? current
          : await place(parts, 'Save the brief', current ?? suggestedName, [BRIEFS])
      if (path === null) return null
      await parts.write([{ path, content: text }])
      current = path
      return { name: basename(path) }
    },
    forget: () => {
      current = null
    },
  }
}

/** Asks where to put an exported file and writes it. */
export async function saveFile(
  parts: FileParts,
  suggestedName: string,
  content: string | Uint8Array,
): Promise<SavedAs | null> {
  const path = await place(parts, 'Export', suggestedName, [ANY_FILE])
  if (path === null) return null
  await parts.write([{ path, content }])
  return { name: basename(path) }
}

/** Asks for a folder and writes all files into it, or none. */
export async function saveFiles(parts: FileParts, files: readonly NamedText[]): Promise<SavedAs | null> {
  const [folder] = await pick(parts, {
    title: 'Export into a folder',
    buttonLabel: 'Export here',
    properties: ['openDirectory', 'createDirectory'],
  })
  if (folder === undefined) return null
  await parts.write(files.map(({ name, text }) => ({ path: join(folder, name), content: text })))
  return { name: basename(folder) }
}

async function pick(parts: FileParts, options: OpenDialogOptions): Promise<readonly string[]> {
  const { canceled, filePaths } = await parts.dialog.open(options)
  return canceled ? [] : filePaths
}

async function place(
  parts: FileParts,
  title: string,
  defaultPath: string,
  filters: SaveDialogOptions['filters'] & object,
): Promise<string | null> {
  const properties = ['createDirectory' as const, 'showOverwriteConfirmation' as const]
  const { canceled, filePath } = await parts.dialog.save({ title, defaultPath, filters, properties })
  return canceled || filePath === '' ? null : filePath
}

async function readPicked(parts: FileParts, path: string): Promise<OpenedFile> {
  const name = basename(path)
  if ((await parts.sizeOf(path)) > LARGEST_FILE) {
    throw new Error(
      `${name} is larger than ${LARGEST_FILE / 1024 / 1024} MB, so it is not read. Open a smaller file.`,
    )
  }
  return { name, bytes: await parts.read(path) }
}
