import type { Brief } from '../../io/briefTypes'
import type { App } from '../state/app'

/** The sample brief with its coordinate files read and embedded, as the window does with any file. */
export async function embedded(app: App, brief: Brief, texts: Record<string, string>): Promise<Brief> {
  const shortlist = await Promise.all(
    brief.shortlist.map(async (entry) => {
      const text = entry.section === null ? undefined : texts[entry.section]
      if (text === undefined) return entry
      const [reading] = await app.read(entry.section!, text)
      return reading?.entry === null || reading === undefined
        ? entry
        : { ...entry, coordinates: reading.entry.coordinates }
    }),
  )
  return { ...brief, shortlist }
}
