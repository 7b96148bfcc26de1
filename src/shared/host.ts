/**
 * What the window asks of the program that holds it: Electron through the preload, or a plain browser.
 * Both implementations keep this contract. Every promise settles; a refused or failed action rejects with
 * an Error whose message is a plain sentence for the user, a dialog that the user closes gives null or [].
 *
 * Paths never come from the page: the holder remembers which file the open brief came from.
 */
export interface Host {
  /** Which holder this is, for the few words that differ. */
  readonly kind: 'electron' | 'browser'

  /** Asks for coordinate files, several at once. [] when the user picks none. */
  openFiles(): Promise<readonly OpenedFile[]>

  /** Asks for a brief and remembers it as the one that `saveBrief` writes. null when the user picks none. */
  openBrief(): Promise<OpenedFile | null>

  /**
   * Writes the brief whole or not at all. Asks where when `as` is true or no file is known yet; the
   * suggested name is used only then. null when the user gives up. A browser downloads the file.
   */
  saveBrief(text: string, suggestedName: string, options: { readonly as: boolean }): Promise<SavedAs | null>

  /** Forgets which file the brief came from: the next `saveBrief` asks. For a new document. */
  forgetBrief(): Promise<void>

  /** Asks where to put one exported file and writes it whole or not at all. */
  saveFile(suggestedName: string, content: string | Uint8Array): Promise<SavedAs | null>

  /**
   * Several exported files at once: into a folder that the user chooses (Electron), or one download each
   * (browser). Names are plain file names. null when the user gives up.
   */
  saveFiles(files: readonly NamedText[]): Promise<SavedAs | null>

  /** The unsaved document of a window that ended without saving, or null. */
  recover(): Promise<string | null>

  /** Keeps the unsaved document for `recover`; null once it is saved or given up. */
  keepForRecovery(text: string | null): Promise<void>

  /** Prints the window, or the report that it shows. */
  print(): Promise<void>

  /** Tells the holder the title and whether there is something unsaved, for the title bar and on closing. */
  showDocument(state: { readonly title: string; readonly unsaved: boolean }): Promise<void>

  /** Calls back when the user picks an entry of the application menu; the result stops that. */
  onMenu(callback: (command: MenuCommand) => void): () => void
}

/** A file that the user picked: its name without folder, and its bytes as they are. */
export interface OpenedFile {
  readonly name: string
  readonly bytes: Uint8Array
}

/** A file to write. */
export interface NamedText {
  readonly name: string
  readonly text: string
}

/** Where something was saved, in words to show: a file name, or a folder's name. Not a path to use. */
export interface SavedAs {
  readonly name: string
}

/** What the application menu can ask of the window. */
export const MENU_COMMANDS = [
  'new',
  'open brief',
  'save',
  'save as',
  'add sections',
  'export',
  'print',
  'undo',
  'redo',
] as const

export type MenuCommand = (typeof MENU_COMMANDS)[number]

/** Text read as a section is refused above this size, in bytes, before it is read. */
export const LARGEST_FILE = 5 * 1024 * 1024
