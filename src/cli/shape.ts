import { measure, thinAirfoil } from '../core'
import { readArguments } from './arguments'
import { STATUS } from './failure'
import { readSections, SECTION_HELP, SECTION_OPTIONS, type NamedSection } from './sections'
import type { Command } from './terminal'

const HELP = `Usage: shape SECTION… [options]

Measures sections and prints them as a JSON array, one object a section. Lengths are in chords, angles in
degrees, the aerodynamic values by thin-airfoil theory.

${SECTION_HELP}`

/** Measures of sections as JSON. */
export const shape: Command = {
  help: HELP,
  run: async (args, terminal) => {
    const { values, positionals } = readArguments(args, SECTION_OPTIONS)
    const sections = readSections(positionals, values, terminal)
    await terminal.print(`${JSON.stringify(sections.map(measuresOf), null, 2)}\n`)
    return STATUS.done
  },
}

const degrees = (angle: number): number => (angle * 180) / Math.PI

function measuresOf({ name, section }: NamedSection): Record<string, unknown> {
  const found = measure(section)
  const thin = thinAirfoil(section)
  return {
    section: name,
    max_thickness: found.maxThickness,
    max_thickness_at: found.maxThicknessAt,
    max_camber: found.maxCamber,
    max_camber_at: found.maxCamberAt,
    nose_radius: found.noseRadius,
    edge_gap: found.edgeGap,
    edge_angle_deg: degrees(found.edgeAngle),
    area: found.area,
    zero_lift_deg: degrees(thin.zeroLiftAngle),
    moment_coefficient: thin.momentQuarterChord,
    ideal_lift_coefficient: thin.idealLift,
    notes: section.notes,
  }
}
