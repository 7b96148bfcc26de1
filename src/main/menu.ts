import type { MenuItemConstructorOptions } from 'electron'
import type { MenuCommand } from '../shared/host'

/** The application menu. Each of our entries sends its command to the window. */
export function menuTemplate(
  platform: NodeJS.Platform,
  send: (command: MenuCommand) => void,
): MenuItemConstructorOptions[] {
  const entry = (label: string, command: MenuCommand, accelerator?: string): MenuItemConstructorOptions => ({
    label,
    click: () => send(command),
    ...(accelerator === undefined ? {} : { accelerator }),
  })
  const line: MenuItemConstructorOptions = { type: 'separator' }
  const mac = platform === 'darwin'
  return [
    ...(mac ? [{ role: 'appMenu' } as const] : []),
    {
      label: '&File',
      submenu: [
        entry('New brief', 'new', 'CmdOrCtrl+N'),
        entry('Open brief…', 'open brief', 'CmdOrCtrl+O'),
        line,
        entry('Save brief', 'save', 'CmdOrCtrl+S'),
        entry('Save brief as…', 'save as', 'CmdOrCtrl+Shift+S'),
        line,
        entry('Add sections from files…', 'add sections', 'CmdOrCtrl+Shift+O'),
        entry('Export results as CSV…', 'export', 'CmdOrCtrl+E'),
        entry('Print…', 'print', 'CmdOrCtrl+P'),
        line,
        mac ? { role: 'close' } : { role: 'quit' },
      ],
    },
    {
      label: '&Edit',
      submenu: [
        entry('Undo', 'undo', 'CmdOrCtrl+Z'),
        entry('Redo', 'redo', 'CmdOrCtrl+Shift+Z'),
        line,
        { role: 'cut' },
        { role: 'copy' },
        { role: 'paste' },
        { role: 'selectAll' },
      ],
    },
    {
      label: '&View',
      submenu: [
        { role: 'resetZoom' },
        { role: 'zoomIn' },
        { role: 'zoomOut' },
        line,
        { role: 'togglefullscreen' },
      ],
    },
    { label: '&Window', submenu: [{ role: 'minimize' }, { role: 'zoom' }] },
  ]
}
