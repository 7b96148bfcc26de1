import { spawn } from 'node:child_process'

/** The command that opens an address in the user's browser; null when there is no display to show it on. */
export function browserCommand(
  platform: NodeJS.Platform,
  env: NodeJS.ProcessEnv,
  address: string,
): readonly [program: string, ...args: string[]] | null {
  if (platform === 'darwin') return ['open', address]
  if (platform === 'win32') return ['cmd', '/c', 'start', '', address]
  return hasDisplay(platform, env) ? ['xdg-open', address] : null
}

/** Whether a window can be shown at all. */
export function hasDisplay(platform: NodeJS.Platform, env: NodeJS.ProcessEnv): boolean {
  if (platform === 'darwin' || platform === 'win32') return true
  return Boolean(env['DISPLAY']) || Boolean(env['WAYLAND_DISPLAY'])
}

/** Starts a command and lets it go; resolves to whether it could be started and did not fail at once. */
export function launch([program, ...args]: readonly [string, ...string[]]): Promise<boolean> {
  return new Promise((resolve) => {
    const child = spawn(program, args, { stdio: 'ignore', detached: true })
    // An opener that is going to fail does so quickly; one that works may live as long as the browser.
    const timer = setTimeout(() => resolve(true), 1500)
    const end = (started: boolean): void => {
      clearTimeout(timer)
      resolve(started)
    }
    child.once('error', () => end(false))
    child.once('exit', (status) => end(status === 0))
    child.unref()
  })
}
