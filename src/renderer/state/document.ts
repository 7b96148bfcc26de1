import { computed, shallowRef } from 'vue'
import type { Brief, BriefCondition, BriefEntry, BriefLimit } from '../../io/briefTypes'
import { createHistory } from './history'

/** The document: brief and shortlist, with one named command a change. */
export function createDocument(initial: Brief) {
  const history = createHistory(initial)
  const saved = shallowRef<Brief | null>(initial)
  const brief = history.value
  const set = (name: string, part: Partial<Brief>, field?: string): void =>
    history.change(name, { ...brief.value, ...part }, field)
  const setEntries = (name: string, shortlist: readonly BriefEntry[]): void => {
    if (shortlist !== brief.value.shortlist) set(name, { shortlist })
  }

  return {
    brief,
    undoName: history.undoName,
    redoName: history.redoName,
    undo: history.undo,
    redo: history.redo,
    unsaved: computed(() => saved.value !== brief.value),
    markSaved: (): void => void (saved.value = brief.value),
    /** Another document; `asSaved` when it stands like that in a file. */
    open(next: Brief, asSaved: boolean): void {
      history.reset(next)
      saved.value = asSaved ? next : null
    },
    rename: (name: string): void => set('rename the brief', { name }, 'name'),
    setWing: (part: Partial<Brief['wing']>, field: string): void =>
      set('change the wing', { wing: { ...brief.value.wing, ...part } }, field),
    setAircraft: (part: Partial<Brief['aircraft']>, field: string): void =>
      set('change the aircraft', { aircraft: { ...brief.value.aircraft, ...part } }, field),
    setAir: (part: Partial<Brief['air']>, field: string): void =>
      set('change the air', { air: { ...brief.value.air, ...part } }, field),
    setStation: (station_y_m: number | null): void => set('choose the station', { station_y_m }, 'station'),
    setCondition(index: number, part: Partial<BriefCondition>, field: string): void {
      const before = brief.value.conditions[index]!
      const conditions = brief.value.conditions.with(index, { ...before, ...part })
      const renamed = part.name
      if (renamed === undefined) return set('change a condition', { conditions }, `${index} ${field}`)
      const follow = <T extends { readonly condition: string | null }>(item: T): T =>
        item.condition === before.name ? { ...item, condition: renamed } : item
      const { limits, rank_by } = brief.value
      const part2 = {
        conditions,
        limits: limits.map(follow),
        rank_by: rank_by === null ? null : follow(rank_by),
      }
      set('rename a condition', part2, `${index} ${field}`)
    },
    addCondition: (condition: BriefCondition): void =>
      set('add a condition', { conditions: [...brief.value.conditions, condition] }),
    removeCondition: (index: number): void =>
      set('remove a condition', { conditions: brief.value.conditions.toSpliced(index, 1) }),
    moveCondition(index: number, by: number): void {
      const conditions = moved(brief.value.conditions, index, by)
      if (conditions !== brief.value.conditions) set('move a condition', { conditions })
    },
    addLimit: (limit: BriefLimit): void => set('add a limit', { limits: [...brief.value.limits, limit] }),
    setLimit: (index: number, part: Partial<BriefLimit>, field: string): void =>
      set(
        'change a limit',
        { limits: brief.value.limits.with(index, { ...brief.value.limits[index]!, ...part }) },
        `limit ${index} ${field}`,
      ),
    removeLimit: (index: number): void =>
      set('remove a limit', { limits: brief.value.limits.toSpliced(index, 1) }),
    setRanking: (rank_by: Brief['rank_by']): void => set('change the ranking', { rank_by }, 'ranking'),
    addEntries: (entries: readonly BriefEntry[]): void =>
      setEntries(entries.length === 1 ? 'add a section' : 'add sections', [
        ...brief.value.shortlist,
        ...entries,
      ]),
    setEntry: (index: number, part: Partial<BriefEntry>, name: string): void =>
      setEntries(name, brief.value.shortlist.with(index, { ...brief.value.shortlist[index]!, ...part })),
    removeEntry: (index: number): void =>
      setEntries('remove a section', brief.value.shortlist.toSpliced(index, 1)),
    moveEntry: (index: number, by: number): void =>
      setEntries('move a section', moved(brief.value.shortlist, index, by)),
  }
}

export type BriefDocument = ReturnType<typeof createDocument>

function moved<T>(list: readonly T[], index: number, by: number): readonly T[] {
  const to = index + by
  if (to < 0 || to >= list.length) return list
  const next = [...list]
  next.splice(to, 0, ...next.splice(index, 1))
  return next
}
