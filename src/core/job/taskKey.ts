import type { Section } from '../shape/section'
import type { Task } from './task'

/**
 * The canonical name of a task: equal tasks have equal names, whatever the order of their fields. The
 * outline enters by a 2 x 32-bit FNV-1a hash (Fowler, Noll and Vo) of the bytes of its coordinates and the
 * closed-form mean line; names and notes do not matter to the result and stay out.
 */
export function taskKey(task: Task): string {
  const asked = task.kind === 'polar' ? [task.alphas, task.toTheStall ?? false] : task.at
  return `${task.kind} ${sectionKey(task.section)} ${canonical(task.state)} ${canonical(asked)}`
}

/** Names of sections met before: a section never changes. */
const met = new WeakMap<Section, string>()

/** The part of a task's name that belongs to the outline. */
function sectionKey(section: Section): string {
  const had = met.get(section)
  if (had !== undefined) return had
  const name = hashedName(section)
  met.set(section, name)
  return name
}

function hashedName(section: Section): string {
  const low = hash(section, 0x811c9dc5)
  const high = hash(section, 0x01000193)
  const line = section.meanLine === null ? '' : canonical(section.meanLine)
  return `${section.x.length}-${low.toString(16)}${high.toString(16)}${line}`
}

function hash(section: Section, seed: number): number {
  let h = seed
  for (const values of [section.x, section.y]) {
    const bytes = new Uint8Array(values.buffer, values.byteOffset, values.byteLength)
    for (const byte of bytes) h = Math.imul(h ^ byte, 0x01000193)
  }
  return h >>> 0
}

function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join()}]`
  if (value !== null && typeof value === 'object') {
    const fields = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1))
    return `{${fields.map(([key, field]) => `${key}:${canonical(field)}`).join()}}`
  }
  return String(value)
}
