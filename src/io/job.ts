import {
  BadInput,
  checkStations,
  criticalAmplification,
  DEFAULT_PANELS,
  FIGURES,
  sectionFromPoints,
  taperedStations,
  type Condition,
  type Job,
  type JobEntry,
  type Method,
  type Section,
  type WingShape,
} from '../core'
import type { Brief, BriefCondition, BriefEntry } from './briefTypes'
import { entryName } from './entryName'
import { FileProblem } from './problem'
import { resolveSection, type ReadBytes } from './resolveSection'

/** A brief ready to compute, and the faults of single parts of it: named, marked, the rest computed. */
export interface ReadyJob {
  readonly job: Job
  readonly faults: readonly string[]
  readonly warnings: readonly string[]
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180

/**
 * The job of a brief in SI units with its sections read. Throws a FileProblem (of `file`) when the wing
 * makes no sense or no entry of the shortlist can be used.
 */
export function jobFromBrief(
  brief: Brief,
  file: string,
  readBytes: ReadBytes,
  options: { readonly method: Method; readonly allowEmpty?: boolean },
): ReadyJob {
  const faults: string[] = []
  const warnings: string[] = []
  const names = new Set<string>()
  const entries = brief.shortlist.map((entry) => {
    const ready = jobEntry(entry, names, readBytes, warnings)
    if (ready.fault !== null) faults.push(ready.fault)
    return ready
  })
  if (!options.allowEmpty && entries.every((entry) => entry.fault !== null)) {
    const first = entries[0]?.fault ?? 'the shortlist is empty'
    throw new FileProblem(
      file,
      null,
      `no entry of the shortlist can be used (${first})`,
      'add a section that can',
    )
  }
  faults.push(...limitFaults(brief))
  const job: Job = {
    method: options.method,
    wing: wingShape(brief, file),
    aircraft: {
      mass: brief.aircraft.mass_kg,
      dragArea: brief.aircraft.drag_area_m2,
      tailArm: brief.aircraft.tail_arm_m,
      centreOfGravity: brief.aircraft.centre_of_gravity_mac_fraction,
      tailless: brief.aircraft.tailless,
      propellerEfficiency: brief.aircraft.propeller_efficiency,
    },
    amplification: brief.air.amplification ?? criticalAmplification(brief.air.turbulence_percent / 100),
    conditions: brief.conditions.map((condition) => jobCondition(condition, brief)),
    entries,
    station: brief.station_y_m === null ? null : Math.min(brief.station_y_m, brief.wing.span_m / 2),
    panels: DEFAULT_PANELS,
  }
  return { job, faults, warnings }
}

function wingShape({ wing }: Brief, file: string): WingShape {
  try {
    const stations =
      wing.stations?.map(({ y_m, chord_m, twist_deg }) => ({
        y: y_m,
        chord: chord_m,
        twist: radians(twist_deg),
      })) ?? taperedStations(wing.area_m2, wing.span_m, wing.taper_ratio, radians(wing.washout_deg))
    checkStations(stations, wing.area_m2, wing.span_m)
    return {
      area: wing.area_m2,
      span: wing.span_m,
      stations,
      sweepQuarterChord: radians(wing.sweep_quarter_chord_deg),
      sparAt: wing.spar_at_chord_fraction,
      skinThickness: wing.skin_thickness_mm / 1000,
      flap:
        wing.flap === null
          ? null
          : {
              chordFraction: wing.flap.chord_fraction,
              fromSemispan: wing.flap.from_semispan,
              toSemispan: wing.flap.to_semispan,
            },
    }
  } catch (error) {
    if (!(error instanceof BadInput)) throw error
    throw new FileProblem(file, null, error.message, 'correct the wing')
  }
}

function jobCondition(condition: BriefCondition, brief: Brief): Condition {
  return {
    name: condition.name,
    speed: condition.speed_m_s,
    altitude: condition.altitude_m,
    isaOffset: condition.isa_offset_K,
    loadFactor: condition.load_factor,
    mass: condition.mass_kg ?? brief.aircraft.mass_kg,
    surface: condition.surface,
    flap: radians(condition.flap_deg),
    climbRate: condition.climb_rate_m_s,
    reynolds: condition.reynolds,
  }
}

function jobEntry(entry: BriefEntry, names: Set<string>, readBytes: ReadBytes, warnings: string[]): JobEntry {
  const plain = entryName(entry)
  let name = plain
  for (let times = 2; names.has(name); times++) name = `${plain} (${times})`
  names.add(name)
  const pair = entry.section === null
  const common = {
    name,
    rootName: pair ? (entry.root ?? '?') : name,
    tipName: pair ? (entry.tip ?? '?') : name,
    tripUpper: entry.trip_upper,
    tripLower: entry.trip_lower,
  }
  try {
    const [root, tip] = entrySections(entry, readBytes, (words) => warnings.push(`${name}: ${words}`))
    return { ...common, root, tip, fault: null }
  } catch (error) {
    if (!(error instanceof FileProblem || error instanceof BadInput)) throw error
    return { ...common, root: null, tip: null, fault: error.message }
  }
}

function entrySections(
  entry: BriefEntry,
  readBytes: ReadBytes,
  warn: (words: string) => void,
): [root: Section, tip: Section] {
  if (entry.change !== null) {
    throw new BadInput(
      `${entryName(entry)}: changes to a section are not computed by this version; remove "change"`,
    )
  }
  const one = (text: string, outline: BriefEntry['coordinates']): Section => {
    if (outline !== null) {
      const raw = { kind: 'loop', points: outline } as const
      return sectionFromPoints(raw, { name: entry.name ?? text, chordLine: entry.chord_line ?? 'file' })
        .section
    }
    const resolved = resolveSection(text, readBytes, { edge: entry.edge, chordLine: entry.chord_line })
    resolved.warnings.forEach(warn)
    return resolved.section
  }
  if (entry.section !== null && entry.root === null && entry.tip === null) {
    const section = one(entry.section, entry.coordinates)
    return [section, section]
  }
  if (entry.section === null && entry.root !== null && entry.tip !== null) {
    const root = one(entry.root, entry.root_coordinates)
    return [root, entry.tip === entry.root ? root : one(entry.tip, entry.tip_coordinates)]
  }
  throw new BadInput(`${entryName(entry)}: an entry names a "section", or a "root" and a "tip"`)
}

function limitFaults(brief: Brief): string[] {
  const conditions = new Set(brief.conditions.map((condition) => condition.name))
  const known = new Set(FIGURES.map((figure) => figure.key))
  const faults: string[] = []
  for (const limit of brief.limits) {
    if (!known.has(limit.figure)) faults.push(`limit on "${limit.figure}": there is no such figure`)
    if (limit.condition !== null && !conditions.has(limit.condition)) {
      faults.push(`limit on "${limit.figure}": there is no condition "${limit.condition}"`)
    }
    if ((limit.at_most === null) === (limit.at_least === null)) {
      faults.push(`limit on "${limit.figure}": give either at_most or at_least`)
    }
  }
  return faults
}
