import type { briefFile, FileParts } from './files'
import { openFiles, saveFile, saveFiles } from './files'
import type { Handlers } from './ipc'
import type { recovery } from './recovery'

/** The window's frame, in the few words that the requests need. */
export interface Frame {
  setTitle(title: string): void
  setUnsaved(unsaved: boolean): void
  print(): Promise<void>
}

/** What answers each request of the window. */
export function requestHandlers(
  files: FileParts,
  brief: ReturnType<typeof briefFile>,
  unsaved: ReturnType<typeof recovery>,
  frame: Frame,
): Handlers {
  return {
    openFiles: () => openFiles(files),
    openBrief: () => brief.open(),
    saveBrief: (text, suggestedName, as) => brief.save(text, suggestedName, as),
    forgetBrief: async () => {
      brief.forget()
      return null
    },
    saveFile: (suggestedName, content) => saveFile(files, suggestedName, content),
    saveFiles: (named) => saveFiles(files, named),
    recover: () => unsaved.recover(),
    keepForRecovery: async (text) => {
      await unsaved.keep(text)
      return null
    },
    print: async () => {
      await frame.print()
      return null
    },
    showDocument: async (title, isUnsaved) => {
      frame.setTitle(title)
      frame.setUnsaved(isUnsaved)
      return null
    },
  }
}
