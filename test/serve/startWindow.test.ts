import { describe, expect, it, vi } from 'vitest'
import { start, type StartParts } from '../../src/serve/startWindow'

function parts(over: Partial<StartParts> = {}): StartParts & { lines: string[]; closed: () => boolean } {
  const lines: string[] = []
  let closed = false
  return {
    lines,
    closed: () => closed,
    say: (line) => lines.push(line),
    complain: (line) => lines.push(line),
    help: 'help text',
    hasDisplay: true,
    findElectron: async () => ({ missing: 'its download failed' }),
    runElectron: async () => 0,
    serve: async () => ({ address: 'http://127.0.0.1:5/', close: async () => void (closed = true) }),
    openBrowser: async () => true,
    ...over,
  }
}

/** Ends the window soon after it was opened, as Ctrl-C would. */
function soon(): AbortSignal {
  return AbortSignal.timeout(20)
}

describe('starting the window', () => {
  it('opens Electron, says so in one line, and ends with it', async () => {
    const given = parts({ findElectron: async () => ({ program: '/electron' }) })
    expect(await start([], given, soon())).toBe(0)
    expect(given.lines).toEqual(['Sectionwright opens in its own window (Electron).'])
  })

  it('serves the window when Electron is missing, says why, and closes on Ctrl-C', async () => {
    const given = parts()
    expect(await start([], given, soon())).toBe(0)
    expect(given.lines).toEqual([
      'Sectionwright opens in your browser at http://127.0.0.1:5/ (Electron is not here: its download failed). Ctrl-C ends it.',
    ])
    expect(given.closed()).toBe(true)
  })

  it('serves the window when Electron cannot start here', async () => {
    const given = parts({
      findElectron: async () => ({ program: '/electron' }),
      runElectron: async () => null,
    })
    await start([], given, soon())
    expect(given.lines[1]).toContain('Electron could not start on this system')
  })

  it('does not fetch Electron without a display, and gives the address and the same job by command', async () => {
    const findElectron = vi.fn()
    const given = parts({ hasDisplay: false, findElectron, openBrowser: async () => false })
    await start([], given, soon())
    expect(findElectron).not.toHaveBeenCalled()
    expect(given.lines[0]).toContain('http://127.0.0.1:5/')
    expect(given.lines[1]).toContain('npm run -s cli -- compare ')
  })

  it('leaves Electron out with --browser, and serves at the port that is asked for', async () => {
    const findElectron = vi.fn()
    const serve = vi.fn(parts().serve)
    await start(['--browser', '--port', '8123'], parts({ findElectron, serve }), soon())
    expect(findElectron).not.toHaveBeenCalled()
    expect(serve).toHaveBeenCalledWith(8123)
  })

  it('ends without serving when it is interrupted while Electron is fetched', async () => {
    const stop = new AbortController()
    const serve = vi.fn(parts().serve)
    const findElectron: StartParts['findElectron'] = async () => {
      stop.abort()
      return { missing: 'its download failed' }
    }
    expect(await start([], parts({ findElectron, serve }), stop.signal)).toBe(0)
    expect(serve).not.toHaveBeenCalled()
  })

  it('prints its help', async () => {
    const given = parts()
    expect(await start(['--help'], given, soon())).toBe(0)
    expect(given.lines).toEqual(['help text'])
  })

  it.each([['--port', 'x'], ['--port', '70000'], ['--tabs'], ['word']])('refuses %s %s', async (...argv) => {
    expect(await start(argv, parts(), soon())).toBe(2)
  })

  it('says why when the window cannot be served', async () => {
    const serve = async (): Promise<never> => {
      throw new Error('port in use')
    }
    const given = parts({ serve })
    expect(await start([], given, soon())).toBe(2)
    expect(given.lines[0]).toContain('port in use')
  })
})
