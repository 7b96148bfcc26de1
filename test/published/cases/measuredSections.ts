/**
 * Measured sections with smooth leading edges at Reynolds number 9e6.
 *
 * Source: USAF Stability and Control DATCOM (R. D. Finck, AFWAL-TR-83-3048, 1978 edition), section 4.1.1, table
 * of experimental low-speed section characteristics. Values from memory, confidence high. Allow 0.3 deg,
 * 0.010, 0.004 per deg and 0.06.
 */
export interface MeasuredSection {
  readonly code: string
  readonly zeroLiftDeg: number
  readonly momentAtZeroLift: number
  readonly slopePerDeg: number
  readonly maxLift: number
}

export const SECTIONS_REYNOLDS = 9e6

export const MEASURED_SECTIONS: readonly MeasuredSection[] = [
  { code: '0006', zeroLiftDeg: 0, momentAtZeroLift: 0, slopePerDeg: 0.108, maxLift: 0.92 },
  { code: '1408', zeroLiftDeg: -0.8, momentAtZeroLift: -0.023, slopePerDeg: 0.109, maxLift: 1.35 },
  { code: '1412', zeroLiftDeg: -1.1, momentAtZeroLift: -0.025, slopePerDeg: 0.108, maxLift: 1.58 },
  { code: '2412', zeroLiftDeg: -2, momentAtZeroLift: -0.047, slopePerDeg: 0.105, maxLift: 1.68 },
  { code: '2415', zeroLiftDeg: -2, momentAtZeroLift: -0.049, slopePerDeg: 0.106, maxLift: 1.63 },
  { code: '2421', zeroLiftDeg: -1.8, momentAtZeroLift: -0.04, slopePerDeg: 0.103, maxLift: 1.47 },
  { code: '2424', zeroLiftDeg: -1.8, momentAtZeroLift: -0.04, slopePerDeg: 0.098, maxLift: 1.29 },
  { code: '4412', zeroLiftDeg: -3.8, momentAtZeroLift: -0.093, slopePerDeg: 0.105, maxLift: 1.67 },
  { code: '4415', zeroLiftDeg: -4.3, momentAtZeroLift: -0.093, slopePerDeg: 0.105, maxLift: 1.64 },
  { code: '4424', zeroLiftDeg: -3.8, momentAtZeroLift: -0.082, slopePerDeg: 0.1, maxLift: 1.38 },
  { code: '23012', zeroLiftDeg: -1.4, momentAtZeroLift: -0.014, slopePerDeg: 0.107, maxLift: 1.79 },
  { code: '23015', zeroLiftDeg: -1, momentAtZeroLift: -0.007, slopePerDeg: 0.107, maxLift: 1.72 },
  { code: '23021', zeroLiftDeg: -1.2, momentAtZeroLift: 0, slopePerDeg: 0.103, maxLift: 1.5 },
  { code: '23024', zeroLiftDeg: -0.8, momentAtZeroLift: 0, slopePerDeg: 0.097, maxLift: 1.4 },
]

/**
 * Further maxima of the same kind.
 *
 * Sources: NACA 0012 at 6e6 from I. H. Abbott and A. E. von Doenhoff, Theory of Wing Sections (1959), largest
 * digitised point; the others, at an effective 8.2e6, from E. N. Jacobs and A. Sherman, NACA Report 586 (1937), from memory,
 * medium to high. Tunnels differ by up to 0.12 at one Reynolds number.
 */
export const FURTHER_MAXIMA: readonly {
  readonly code: string
  readonly reynolds: number
  readonly maxLift: number
}[] = [
  { code: '0012', reynolds: 6e6, maxLift: 1.6 },
  { code: '0009', reynolds: 8.2e6, maxLift: 1.39 },
  { code: '0015', reynolds: 8.2e6, maxLift: 1.66 },
  { code: '0018', reynolds: 8.2e6, maxLift: 1.53 },
]

/**
 * Least drag of smooth sections.
 *
 * Sources: NACA 0012 at 6e6: smallest digitised point of Abbott and von Doenhoff (1959), within 0.0003; the others
 * from the same book or NACA Report 824 (1945), from memory, confidence medium, within 0.0005.
 */
export const LEAST_DRAGS: readonly {
  readonly code: string
  readonly reynolds: number
  readonly drag: number
}[] = [
  { code: '0012', reynolds: 6e6, drag: 0.0058 },
  { code: '0012', reynolds: 9e6, drag: 0.0058 },
  { code: '0012', reynolds: 3e6, drag: 0.0062 },
  { code: '2412', reynolds: 9e6, drag: 0.006 },
  { code: '4415', reynolds: 9e6, drag: 0.0064 },
  { code: '23012', reynolds: 9e6, drag: 0.006 },
]
