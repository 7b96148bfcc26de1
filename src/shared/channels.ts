import type { MenuCommand, NamedText, OpenedFile, SavedAs } from './host'

/**
 * Every request that the window makes to the main process: what it asks and what it gives. Main, preload
 * and window take their types from this one map, so that they cannot disagree and still compile.
 */
export interface ChannelMap {
  readonly openFiles: { asks: []; gives: readonly OpenedFile[] }
  readonly openBrief: { asks: []; gives: OpenedFile | null }
  readonly saveBrief: { asks: [text: string, suggestedName: string, as: boolean]; gives: SavedAs | null }
  readonly forgetBrief: { asks: []; gives: null }
  readonly saveFile: { asks: [suggestedName: string, content: string | Uint8Array]; gives: SavedAs | null }
  readonly saveFiles: { asks: [files: readonly NamedText[]]; gives: SavedAs | null }
  readonly recover: { asks: []; gives: string | null }
  readonly keepForRecovery: { asks: [text: string | null]; gives: null }
  readonly print: { asks: []; gives: null }
  readonly showDocument: { asks: [title: string, unsaved: boolean]; gives: null }
}

export type Channel = keyof ChannelMap

/** The names of all requests; the compiler checks that none is missing. */
export const CHANNELS = Object.keys({
  openFiles: 0,
  openBrief: 0,
  saveBrief: 0,
  forgetBrief: 0,
  saveFile: 0,
  saveFiles: 0,
  recover: 0,
  keepForRecovery: 0,
  print: 0,
  showDocument: 0,
} satisfies Record<Channel, 0>) as readonly Channel[]

/** The message by which the menu speaks to the window. */
export const MENU_CHANNEL = 'menu'

/** An answer as plain data: an exception would lose its message on the way. */
export type Answer<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly message: string }

/** What the preload hands to the page as `window.sectionwright`; absent in a plain browser. */
export interface Bridge {
  call<K extends Channel>(channel: K, ...asks: ChannelMap[K]['asks']): Promise<Answer<ChannelMap[K]['gives']>>
  /** Calls back for each menu command; the result stops that. */
  onMenu(callback: (command: MenuCommand) => void): () => void
}

/** The value of an answer. Throws an Error with the plain sentence of a failed one. */
export function valueOf<T>(answer: Answer<T>): T {
  if (answer.ok) return answer.value
  throw new Error(answer.message)
}
