import type { BrowserWindow, Dialog } from 'electron'
import type { Frame } from './handlers'

/**
 * The frame of a window: its title, printing, and the question before unsaved work is closed. The unsaved
 * brief is also kept for recovery, so closing by force loses nothing.
 */
export function windowFrame(window: BrowserWindow, dialog: Pick<Dialog, 'showMessageBoxSync'>): Frame {
  let unsaved = false
  window.on('close', (event) => {
    if (!unsaved) return
    const answer = dialog.showMessageBoxSync(window, {
      type: 'question',
      message: 'The brief has changes that are not saved.',
      detail: 'They are kept and offered again at the next start.',
      buttons: ['Close without saving', 'Stay'],
      defaultId: 1,
      cancelId: 1,
    })
    if (answer === 1) event.preventDefault()
  })
  // A page may not replace the title that the document gives.
  window.on('page-title-updated', (event) => event.preventDefault())
  return {
    setTitle: (title) => window.setTitle(title === '' ? 'Sectionwright' : `${title} - Sectionwright`),
    setUnsaved: (now) => {
      unsaved = now
      window.setDocumentEdited(now)
    },
    print: () =>
      new Promise((resolve, reject) => {
        window.webContents.print({ printBackground: true }, (done, reason) => {
          if (done || /cancel/i.test(reason)) resolve()
          else reject(new Error(`Printing did not work: ${reason}`))
        })
      }),
  }
}
