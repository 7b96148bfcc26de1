/**
 * Lift and drag of NACA 0012 with transition forced by grit strips near 0.05 chord (strip place from memory) on
 * both sides, Reynolds number 6e6, Mach number 0.15.
 *
 * Source: C. L. Ladson, NASA TM 4074 (1988), found; allow 0.015 in lift and 0.0003 in drag.
 */
export interface ForcedPoint {
  readonly grit: number
  readonly alphaDeg: number
  readonly lift: number
  readonly drag: number
}

export const FORCED_AT = 0.05
export const FORCED_REYNOLDS = 6e6
export const FORCED_MACH = 0.15

/** The points up to 10.2 deg, in the order of the tables. */
export const FORCED_POINTS: readonly ForcedPoint[] = [
  { grit: 80, alphaDeg: -4.04, lift: -0.4417, drag: 0.00871 },
  { grit: 80, alphaDeg: -2.14, lift: -0.2385, drag: 0.008 },
  { grit: 80, alphaDeg: -0.05, lift: -0.0126, drag: 0.00809 },
  { grit: 80, alphaDeg: 2.05, lift: 0.2125, drag: 0.00816 },
  { grit: 80, alphaDeg: 4.04, lift: 0.4316, drag: 0.00823 },
  { grit: 80, alphaDeg: 6.09, lift: 0.6546, drag: 0.00885 },
  { grit: 80, alphaDeg: 8.3, lift: 0.8873, drag: 0.0105 },
  { grit: 80, alphaDeg: 10.12, lift: 1.0707, drag: 0.01201 },
  { grit: 120, alphaDeg: -4.01, lift: -0.4466, drag: 0.00843 },
  { grit: 120, alphaDeg: -2.12, lift: -0.2425, drag: 0.00789 },
  { grit: 120, alphaDeg: -0.01, lift: -0.012, drag: 0.00811 },
  { grit: 120, alphaDeg: 0.01, lift: -0.0122, drag: 0.00804 },
  { grit: 120, alphaDeg: 2.15, lift: 0.2236, drag: 0.00823 },
  { grit: 120, alphaDeg: 4.11, lift: 0.4397, drag: 0.00879 },
  { grit: 120, alphaDeg: 6.01, lift: 0.6487, drag: 0.00842 },
  { grit: 120, alphaDeg: 8.08, lift: 0.8701, drag: 0.00995 },
  { grit: 120, alphaDeg: 10.1, lift: 1.0775, drag: 0.01175 },
]
