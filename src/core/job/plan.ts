import { flightState, whyUnflyable } from '../flight/conditions'
import { liftLine, type SectionLine } from '../polar/liftLine'
import { machBracket, polarBetween } from '../polar/machLattice'
import type { Polar } from '../polar/polar'
import { lineAt, polarAt } from '../polar/polarFamily'
import { slowestStep } from '../wing/slowest'
import { wingAt, type WingAtCondition, type WingInput } from '../wing/wing'
import type { Condition, Job, JobEntry } from './job'
import { flightOf, polarTasks } from './polarNeeds'
import type { Task, TaskResult } from './task'
import { taskKey } from './taskKey'

/** Results by the names of their tasks. */
export type Known = ReadonlyMap<string, TaskResult>

/** Why a condition gives no figures with this method; null when it does. */
export function whyNotComputed(job: Job, condition: Condition): string | null {
  if (condition.speed === 'slowest' && job.method !== 'viscous') {
    return 'the slowest speed needs the viscous method: without a boundary layer no section stalls'
  }
  if (condition.flap !== 0) return 'a deflected flap is not computed by this method'
  return whyUnflyable({ ...condition, speed: condition.speed === 'slowest' ? 1 : condition.speed })
}

/** One entry at one condition, as far as it can be followed with what is known. */
export interface Planned {
  /** Polars that it needs, root first; those of the speed last tried. */
  readonly tasks: readonly Task[]
  /** m/s; null while polars are missing or when there is no such speed. */
  readonly speed: number | null
  /** Why there is no wing; empty when there is, or when it waits. */
  readonly fault: string
  /** Null without a speed. */
  readonly input: WingInput | null
}

/** Wing C_L of the first guess of the slowest speed; it moves only how many rounds of polars follow. */
const FIRST_LIFT = 1.2
/** Relative change of the speed at which it stands; the wing's maximum lift is then met as closely. */
const SAME_SPEED = 1e-10
/** The map contracts about tenfold a step and faster by secants; far more steps mean it does not settle. */
const MOST_STEPS = 60

/**
 * Follows one entry at one condition: at a given speed to its polars and its wing, at the slowest speed
 * from the first guess over the polars of each speed tried to the one that stays. Depends on the results
 * alone, so that asked again it takes the same way and comes further.
 */
export function follow(job: Job, entry: JobEntry, condition: Condition, known: Known): Planned {
  const slowest = condition.speed === 'slowest'
  let before: Tried | null = null
  let speed = slowest ? firstSpeed(job, condition) : (condition.speed as number)
  for (let step = 0; step < MOST_STEPS; step++) {
    const { tasks, input, fault } = ready(job, entry, condition, known, speed)
    if (input === null || !slowest) return { tasks, speed: input === null ? null : speed, fault, input }
    const next = slowestStep(input)
    if (typeof next === 'string') return { tasks, speed: null, fault: next, input: null }
    if (Math.abs(next / speed - 1) < SAME_SPEED) return { tasks, speed, fault: '', input }
    const tried = { speed, next }
    speed = nextTry(tried, before)
    before = tried
  }
  return { tasks: [], speed: null, fault: 'the slowest speed does not settle', input: null }
}

/** A speed tried and what the step from it gave, m/s. */
interface Tried {
  readonly speed: number
  readonly next: number
}

/** Growth of the step's result with the speed beyond which the straight line through two tries is not trusted. */
const TRUSTED_GROWTH = 0.5

/** Where the straight line through two tries stands still; without it, the step itself. */
function nextTry({ speed, next }: Tried, before: Tried | null): number {
  if (before === null) return next
  const growth = (next - before.next) / (speed - before.speed)
  return Math.abs(growth) < TRUSTED_GROWTH ? speed + (next - speed) / (1 - growth) : next
}

function firstSpeed(job: Job, condition: Condition): number {
  const { air, load } = flightState(job.wing.area, flightOf(condition, 1))
  return Math.sqrt((2 * load) / (air.density * job.wing.area * FIRST_LIFT))
}

/** The wing's input at a speed, null until its polars are known or when they failed. */
function ready(job: Job, entry: JobEntry, condition: Condition, known: Known, speed: number): Planned {
  if (entry.root === null || entry.tip === null) return { tasks: [], speed, fault: '', input: null }
  const sections = entry.tip === entry.root ? [entry.root] : [entry.root, entry.tip]
  const tasks = sections.map((section) => polarTasks(job, entry, section, condition, speed))
  const all = tasks.flat()
  const lines: SectionLine[] = []
  const families: Polar[][] = []
  for (const [k, some] of tasks.entries()) {
    const polars = polarsOf(some, known)
    if (polars === null) return { tasks: all, speed, fault: '', input: null }
    if (typeof polars === 'string') return { tasks: all, speed, fault: polars, input: null }
    const line = lineOf(job, condition, polars, speed)
    if (line === null) {
      const fault = `${sections[k].name}: no zero-lift angle between -12 and 20 deg`
      return { tasks: all, speed, fault, input: null }
    }
    lines.push(line)
    families.push(polars)
  }
  const input: WingInput = {
    shape: job.wing,
    aircraft: job.aircraft,
    condition: flightOf(condition, speed),
    root: lines[0],
    tip: lines[lines.length - 1],
    fixedReynolds: condition.reynolds,
    ...(job.method === 'viscous'
      ? { families: { root: families[0], tip: families[families.length - 1] } }
      : {}),
  }
  return { tasks: all, speed, fault: '', input }
}

function polarsOf(tasks: readonly Task[], known: Known): Polar[] | string | null {
  const polars: Polar[] = []
  for (const task of tasks) {
    const result = known.get(taskKey(task))
    if (result === undefined) return null
    if (result.kind === 'failed') return result.reason
    if (result.kind === 'polar') polars.push(result.polar)
  }
  return polars
}

/** The lift line by which a section is named; null when one of its polars has none. */
function lineOf(job: Job, condition: Condition, polars: Polar[], speed: number): SectionLine | null {
  const { air } = flightState(job.wing.area, flightOf(condition, speed))
  const mach = speed / air.speedOfSound
  if (job.method !== 'viscous') return liftLine(betweenMachs(job, polars, mach))
  if (polars.some((polar) => liftLine(polar) === null)) return null
  return lineAt(polars, polars[0].reynolds!, mach)
}

function betweenMachs(job: Job, polars: readonly Polar[], mach: number): Polar {
  return polarBetween(polars[0], polars[polars.length - 1], machBracket(job.method, mach).fraction, mach)
}

/** The root section's polar at a Reynolds number and a Mach number, from the results of its tasks; null until known. */
export function rootPolar(
  job: Job,
  entry: JobEntry,
  tasks: readonly Task[],
  known: Known,
  at: { readonly reynolds: number; readonly mach: number },
): Polar | null {
  const polars = polarsOf(
    tasks.filter((task) => task.section === entry.root),
    known,
  )
  if (polars === null || typeof polars === 'string' || polars.length === 0) return null
  if (job.method !== 'viscous') return betweenMachs(job, polars, at.mach)
  return polarAt(polars, at.reynolds, at.mach)?.polar ?? null
}

/** The wing of a plan that came to its end. */
export function wingOf(planned: Planned): WingAtCondition | null {
  return planned.input === null ? null : wingAt(planned.input)
}
