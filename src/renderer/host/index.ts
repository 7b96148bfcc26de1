import type { Bridge } from '../../shared/channels'
import type { Host } from '../../shared/host'
import { browserHost } from './browser'
import { electronHost } from './electron'

/** The host of this window: Electron's preload where there is one, else the browser. */
export function findHost(): Host {
  const bridge = (window as Window & { readonly sectionwright?: Bridge }).sectionwright
  return bridge === undefined ? browserHost(document, localStorage) : electronHost(bridge)
}
