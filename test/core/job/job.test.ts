import { describe, expect, it } from 'vitest'
import { assemble } from '../../../src/core/job/assemble'
import { nextTasks } from '../../../src/core/job/nextTasks'
import { runTask, type TaskResult } from '../../../src/core/job/task'
import { taskKey } from '../../../src/core/job/taskKey'
import { liftLine } from '../../../src/core/polar/liftLine'
import { machBracket, polarBetween } from '../../../src/core/polar/machLattice'
import { sweep } from '../../../src/core/polar/sweep'
import { nacaSection } from '../../../src/core/shape/naca'
import { readBrief } from '../../../src/io/brief'
import { jobFromBrief } from '../../../src/io/job'
import { briefText } from '../../support/briefs'
import { sectionState } from '../../support/states'

const jobOf = (change: Record<string, unknown> = {}, method: 'thin' | 'panel' = 'panel') =>
  jobFromBrief(readBrief(briefText(change), 'test'), 'test', () => new Uint8Array(), { method }).job

function completed(job: ReturnType<typeof jobOf>): Map<string, TaskResult> {
  const known = new Map<string, TaskResult>()
  for (let round = 0; round < 5; round++) {
    const tasks = nextTasks(job, known)
    if (tasks.length === 0) return known
    for (const task of tasks) known.set(taskKey(task), runTask(task))
  }
  throw new Error('the tasks do not come to an end')
}

const two = {
  conditions: [
    { name: 'Slowest', speed_m_s: 'slowest' },
    { name: 'Cruise', speed_m_s: 25, altitude_m: 600 },
  ],
  shortlist: [{ section: 'naca:2412' }, { root: 'naca:4415', tip: 'naca:4412' }],
}

describe('a job', () => {
  it('asks for polars first, for pressures when the wing is known, and then for nothing', () => {
    const job = jobOf(two)
    const first = nextTasks(job, new Map())
    expect(first.every((task) => task.kind === 'polar')).toBe(true)
    // Three sections at the two Mach numbers that bracket the cruise.
    expect(first).toHaveLength(6)
    const known = completed(job)
    expect(nextTasks(job, known)).toEqual([])
    expect(known.size).toBe(8)
  })

  it('assembles a comparison from any part of the results', () => {
    const job = jobOf(two)
    const known = completed(job)
    const empty = assemble(job, new Map())
    expect(empty.entries[0].conditions[1].status).toBe('waiting')
    expect(empty.entries[0].root!.measures.maxThickness).toBeGreaterThan(0.11)
    for (let k = 0; k <= known.size; k++) {
      const partial = assemble(job, new Map([...known].slice(0, k)))
      expect(partial.entries.map((entry) => entry.name)).toEqual(['naca:2412', 'naca:4415 > naca:4412'])
    }
    const whole = assemble(job, known)
    for (const entry of whole.entries) {
      expect(entry.conditions[1].status).toBe('known')
      expect(entry.conditions[1].pane!.pressure!.liftCoefficient).toBeCloseTo(
        entry.conditions[1].pane!.liftCoefficient,
        8,
      )
    }
  })

  it('does not depend on the order in which results came', () => {
    const job = jobOf(two)
    const known = completed(job)
    expect(assemble(job, new Map([...known].reverse()))).toEqual(assemble(job, known))
  })

  it('marks the slowest speed, a flap and a condition that cannot be flown, and computes the rest', () => {
    const job = jobOf({
      ...two,
      conditions: [
        ...two.conditions,
        { name: 'Still', speed_m_s: 0 },
        { name: 'Flapped', speed_m_s: 20, flap_deg: 10 },
      ],
    })
    const states = assemble(job, completed(job)).entries[0].conditions
    expect(states.map((state) => state.status)).toEqual(['marked', 'known', 'marked', 'marked'])
    expect(states[0].notes[0]).toContain('needs the viscous method')
    expect(states[2].notes[0]).toContain('more than 0 m/s')
    expect(states[3].notes[0]).toContain('flap')
  })

  it('marks what rests on a failed task with its reason', () => {
    const job = jobOf(two)
    const known = completed(job)
    const key = taskKey(nextTasks(job, new Map())[0])
    known.set(key, { kind: 'failed', reason: 'the worker stopped' })
    const state = assemble(job, known).entries[0].conditions[1]
    expect(state.status).toBe('marked')
    expect(state.notes).toEqual(['the worker stopped'])
  })

  it('asks for no pressures with thin-airfoil theory, which is always incompressible', () => {
    const job = jobOf(two, 'thin')
    const known = completed(job)
    expect(known.size).toBe(3)
    expect(assemble(job, known).entries[0].conditions[1].wing!.liftSlope).toBeGreaterThan(5)
  })

  it('names tasks by their content: not by the order of fields, nor by names and notes', () => {
    const [task] = nextTasks(jobOf(two), new Map())
    const renamed = { ...task, section: { ...task.section, name: 'other', notes: ['read'] } }
    expect(taskKey(renamed)).toBe(taskKey(task))
    const state = Object.fromEntries(Object.entries(task.state).reverse()) as unknown as typeof task.state
    expect(taskKey({ ...task, state })).toBe(taskKey(task))
    const moved = { ...task.section, y: task.section.y.map((y, i) => (i === 50 ? y + 1e-15 : y)) }
    expect(taskKey({ ...task, section: moved })).not.toBe(taskKey(task))
  })
})

describe('polars between the Mach numbers of the lattice', () => {
  const section = nacaSection('4412')
  const alphas = [-4, 0, 4, 8].map((deg) => (deg * Math.PI) / 180)
  const at = (mach: number) => sweep(section, sectionState({ mach }), alphas)

  it.each([0.08, 0.22, 0.35, 0.45])(
    'at Mach %d differ from the computed ones by less than 0.2 per cent in lift',
    (mach) => {
      const { low, high, fraction } = machBracket('panel', mach)
      const between = polarBetween(at(low), at(high), fraction, mach)
      at(mach).points.forEach((point, i) => {
        // Where the flow turns sonic the rule does not hold, and its own curvature grows without bound.
        if (point.reason !== '') return
        const error = between.points[i].liftCoefficient! - point.liftCoefficient!
        expect(Math.abs(error)).toBeLessThan(0.002 * Math.max(Math.abs(point.liftCoefficient!), 0.5))
      })
    },
  )

  it('are the computed ones on the lattice, and the last one above it', () => {
    expect(machBracket('panel', 0.3)).toEqual({ low: 0.3, high: 0.3, fraction: 0 })
    expect(machBracket('panel', 0.7)).toEqual({ low: 0.5, high: 0.5, fraction: 0 })
    expect(machBracket('thin', 0.4)).toEqual({ low: 0, high: 0, fraction: 0 })
  })
})

describe('the straight line of a polar', () => {
  it('is that of thin-airfoil theory to rounding', () => {
    const state = sectionState({ method: 'thin' })
    const alphas = Array.from({ length: 65 }, (_, i) => ((-12 + 0.5 * i) * Math.PI) / 180)
    const line = liftLine(sweep(nacaSection('2412'), state, alphas))!
    expect(line.slope).toBeCloseTo(2 * Math.PI, 10)
    // Exact zero-lift angle of the mean line, rad.
    expect(line.zeroLift).toBeCloseTo(-0.036254684421, 10)
  })

  it('is none for a polar that does not cross zero lift', () => {
    const state = sectionState({ method: 'thin' })
    expect(liftLine(sweep(nacaSection('2412'), state, [0.1, 0.2]))).toBeNull()
  })
})
