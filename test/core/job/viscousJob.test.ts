import { describe, expect, it } from 'vitest'
import { assemble } from '../../../src/core/job/assemble'
import { nextTasks } from '../../../src/core/job/nextTasks'
import { NO_LIMITS, type Polar } from '../../../src/core/polar/polar'
import type { Task, TaskResult } from '../../../src/core/job/task'
import { taskKey } from '../../../src/core/job/taskKey'
import { compareFiles } from '../../../src/io/csv'
import { readBrief } from '../../../src/io/brief'
import { jobFromBrief } from '../../../src/io/job'
import { wingJson } from '../../../src/io/wingJson'
import { briefText } from '../../support/briefs'
import { inventedPolar, type InventedSection } from '../../support/polars'

const jobOf = (change: Record<string, unknown> = {}) =>
  jobFromBrief(readBrief(briefText(change), 'test'), 'test', () => new Uint8Array(), { method: 'viscous' })
    .job
type Ready = ReturnType<typeof jobOf>

const section: InventedSection = {
  slope: 6.1,
  zeroLift: -0.04,
  maxLift: (reynolds) => 0.9 + 0.15 * Math.log(reynolds / 5e4),
  moment: -0.05,
  drag: (lift) => 0.009 + 0.004 * lift * lift,
}

function invented(task: Task, change: (polar: Polar) => Polar = (polar) => polar): TaskResult {
  if (task.kind === 'pressure') return { kind: 'failed', reason: 'no pressures here' }
  const { reynolds, mach, surface, tripUpper, tripLower } = task.state
  const polar = { ...inventedPolar(section, reynolds!, mach), surface, tripUpper, tripLower }
  return { kind: 'polar', polar: change(polar) }
}

/** Runs a job to its end on invented polars; the rounds that it took. */
function complete(job: Ready, change?: (polar: Polar) => Polar) {
  const known = new Map<string, TaskResult>()
  const rounds: Task[][] = []
  for (;;) {
    const tasks = nextTasks(job, known)
    if (tasks.length === 0) return { known, rounds }
    if (rounds.length > 20) throw new Error('the tasks do not come to an end')
    rounds.push(tasks)
    for (const task of tasks) known.set(taskKey(task), invented(task, change))
  }
}

const one = { shortlist: [{ section: 'naca:4412' }] }

describe('a job with viscous polars', () => {
  it('asks at a given speed for the Reynolds numbers that bracket those of all stations, no others', () => {
    const job = jobOf({ ...one, conditions: [{ name: 'Cruise', speed_m_s: 25 }] })
    const tasks = nextTasks(job, new Map())
    // 25 m/s at sea level over chords of 0.22917 to 0.38194 m: 3.9e5 to 6.5e5; Mach 0.073.
    const asked = new Set(tasks.map((task) => `${task.state.reynolds} ${task.state.mach}`))
    expect([...asked].sort()).toEqual(
      [379687.5, 569531.25, 854296.875].flatMap((re) => [`${re} 0`, `${re} 0.15`]).sort(),
    )
    expect(tasks).toHaveLength(6)
    expect(tasks[0].state.amplification).toBe(job.amplification)
    const fixed = jobOf({ ...one, conditions: [{ name: 'Cruise', speed_m_s: 25, reynolds: 3e6 }] })
    expect(Math.max(...nextTasks(fixed, new Map()).map((task) => task.state.reynolds!))).toBeGreaterThan(3e6)
  })

  it('trips a dirty surface near the nose unless the entry says where, and an entry with a trip is dirty', () => {
    const statesOf = (surface: string, entry: object) =>
      nextTasks(
        jobOf({
          shortlist: [{ section: 'naca:4412', ...entry }],
          conditions: [{ name: 'C', speed_m_s: 25, surface }],
        }),
        new Map(),
      )[0].state
    expect(statesOf('dirty', {})).toMatchObject({ surface: 'dirty', tripUpper: 0.05, tripLower: 0.1 })
    expect(statesOf('dirty', { trip_upper: 1 })).toMatchObject({
      surface: 'dirty',
      tripUpper: 1,
      tripLower: 0.1,
    })
    expect(statesOf('clean', { trip_lower: 0.4 })).toMatchObject({
      surface: 'dirty',
      tripUpper: 1,
      tripLower: 0.4,
    })
    expect(statesOf('clean', {})).toMatchObject({ surface: 'clean', tripUpper: 1, tripLower: 1 })
  })

  it('finds the slowest speed over the polars that each try needs, and comes to an end', () => {
    const job = jobOf(one)
    const { known, rounds } = complete(job)
    expect(rounds.length).toBeLessThanOrEqual(5)
    const [entry] = assemble(job, known).entries
    const wing = entry.conditions[0].wing!
    expect(entry.conditions[0].status).toBe('known')
    expect(wing.liftCoefficient).toBeCloseTo(wing.maxLiftCoefficient!, 8)
    expect(wing.liftCoefficient * wing.dynamicPressure * 1.1 + wing.tailLoad!).toBeCloseTo(24 * 9.80665, 6)
    // A quarter of the mass flies at a lower Reynolds number and so at more than half of the speed.
    const light = jobOf({ ...one, aircraft: { mass_kg: 6, tail_arm_m: 1.4 } })
    const slow = assemble(light, complete(light).known).entries[0].conditions[0].wing!
    expect(slow.speed).toBeGreaterThan(0.5 * wing.speed)
    expect(slow.speed).toBeLessThan(0.6 * wing.speed)
  })

  it('does not depend on the order in which results came, and waits for what is missing', () => {
    const job = jobOf()
    const { known } = complete(job)
    expect(assemble(job, new Map([...known].reverse()))).toEqual(assemble(job, known))
    const first = assemble(job, new Map([...known].slice(0, 1)))
    expect(first.entries[0].conditions.map(({ status }) => status)).toEqual(['waiting', 'waiting'])
  })

  it('marks a slowest speed that would rest on a polar without a maximum, and keeps the rest', () => {
    const job = jobOf(one)
    const { known } = complete(job, (polar) => ({ ...polar, ...NO_LIMITS }))
    const [slowest, mapping] = assemble(job, known).entries[0].conditions
    expect(slowest).toMatchObject({ status: 'marked', wing: null })
    expect(slowest.notes[0]).toContain('no slowest speed')
    expect(mapping.status).toBe('marked')
    expect(mapping.wing!.maxLiftCoefficient).toBeNull()
    expect(mapping.wing!.drag).toBeGreaterThan(0)
  })

  it('writes the figures of each condition, polars to two degrees past the stall, stations in full', () => {
    const job = jobOf(one)
    const comparison = assemble(job, complete(job).known)
    const { wings } = JSON.parse(wingJson(comparison)) as {
      wings: { conditions: Record<string, number | null>[] }[]
    }
    const [slowest, mapping] = wings[0].conditions
    expect(slowest.slowest_speed_m_s).toBe(comparison.entries[0].conditions[0].wing!.speed)
    expect(slowest.slowest_equivalent_speed_m_s).toBeCloseTo(slowest.slowest_speed_m_s!, 7)
    expect(mapping.slowest_speed_m_s).toBeNull()
    expect(mapping.power_W! / mapping.drag_N!).toBeCloseTo(25, 9)
    expect(mapping.glide_ratio! * mapping.drag_N!).toBeCloseTo(24 * 9.80665, 9)
    const [polars, , stations] = compareFiles(comparison)
    const last = polars.text.trim().split('\r\n').at(-1)!.split(',')
    const stall = comparison.entries[0].polars.at(-1)!.polar.maxLift!.alpha * (180 / Math.PI)
    expect(stall + 2 - Number(last[5])).toBeGreaterThanOrEqual(0)
    expect(stall + 2 - Number(last[5])).toBeLessThan(0.5)
    expect(
      stations.text
        .split('\r\n')[1]
        .split(',')
        .every((cell) => cell !== ''),
    ).toBe(true)
  })
})
