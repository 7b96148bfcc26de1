/**
 * A section for low Reynolds numbers in a low-turbulence tunnel: outline of the model, forces and bubbles.
 *
 * Source: R. J. McGhee, B. S. Walker and B. F. Millard, NASA TM 4062 (1988): Table I (ordinates, trailing edge
 * thickened), Table B1 (forces), Table III (oil flow, upper surface, within 0.02 chord); found. Allow 0.03 in lift,
 * 8 % in drag at 2e5 and 15 % at 1e5, 0.010 in moment, 0.03 chord in separation. Second source of bubbles: G. M.
 * Cole and T. J. Mueller, University of Notre Dame UNDAS-1419-FR (1990), figures 4.37 and 4.38; the two tunnels
 * differ in reattachment by up to 0.08 chord.
 */
export const LOW_REYNOLDS_OUTLINE: readonly (readonly [x: number, y: number])[] = [
  [1, 0.00083],
  [0.95128, 0.00763],
  [0.92553, 0.01183],
  [0.8951, 0.01678],
  [0.86035, 0.02242],
  [0.82183, 0.02867],
  [0.78007, 0.0354],
  [0.73567, 0.04248],
  [0.68922, 0.04975],
  [0.64137, 0.05697],
  [0.59272, 0.0639],
  [0.54393, 0.0702],
  [0.49548, 0.07547],
  [0.44767, 0.07937],
  [0.40077, 0.08173],
  [0.35505, 0.08247],
  [0.31078, 0.08157],
  [0.26813, 0.07908],
  [0.22742, 0.07528],
  [0.18907, 0.07037],
  [0.15345, 0.06448],
  [0.12093, 0.05775],
  [0.09185, 0.05033],
  [0.06643, 0.04238],
  [0.04493, 0.03408],
  [0.02748, 0.02562],
  [0.01423, 0.01727],
  [0.00518, 0.00932],
  [0.00043, 0.00233],
  [0.00092, -0.00287],
  [0.00717, -0.00682],
  [0.0189, -0.01017],
  [0.03597, -0.01265],
  [0.05827, -0.01425],
  [0.08568, -0.015],
  [0.118, -0.01502],
  [0.1549, -0.01442],
  [0.19598, -0.01328],
  [0.24083, -0.01177],
  [0.28892, -0.00998],
  [0.33968, -0.00803],
  [0.39252, -0.00605],
  [0.44678, -0.0041],
  [0.50182, -0.00228],
  [0.55693, -0.00065],
  [0.61147, 0.00073],
  [0.66472, 0.00187],
  [0.71602, 0.00268],
  [0.76475, 0.0032],
  [0.81027, 0.00342],
  [0.85202, 0.00337],
  [0.88943, 0.00307],
  [0.92205, 0.00258],
  [0.94942, 0.00197],
  [1, -0.00083],
]

/** Lift and drag at Reynolds number 2e5 and Mach number 0.06; the last ones are past or at the stall. */
export const LOW_REYNOLDS_POLAR: readonly (readonly [lift: number, drag: number])[] = [
  [0.066, 0.0163],
  [0.156, 0.0133],
  [0.249, 0.0105],
  [0.35, 0.0106],
  [0.352, 0.0105],
  [0.466, 0.0113],
  [0.574, 0.0118],
  [0.68, 0.0127],
  [0.785, 0.0133],
  [0.891, 0.0138],
  [0.895, 0.0139],
  [0.894, 0.0137],
  [0.897, 0.0137],
  [0.948, 0.0142],
  [1.004, 0.0141],
  [0.999, 0.0144],
  [1.052, 0.0143],
  [1.103, 0.0145],
  [1.107, 0.0144],
  [1.127, 0.0145],
  [1.155, 0.0152],
  [1.166, 0.016],
  [1.18, 0.0175],
  [1.182, 0.0174],
  [1.219, 0.0244],
  [1.231, 0.0357],
  [1.214, 0.057],
]

/** Near 5 deg, by Reynolds number; repeats are rows of their own. */
export const LOW_REYNOLDS_AT_5_DEG: readonly {
  readonly reynolds: number
  readonly mach: number
  readonly alphaDeg: number
  readonly lift: number
  readonly drag: number
  readonly moment: number
}[] = [
  { reynolds: 1e5, mach: 0.03, alphaDeg: 5.01, lift: 0.873, drag: 0.0237, moment: -0.0889 },
  { reynolds: 1e5, mach: 0.03, alphaDeg: 5.01, lift: 0.873, drag: 0.024, moment: -0.0889 },
  { reynolds: 2e5, mach: 0.06, alphaDeg: 5, lift: 0.891, drag: 0.0138, moment: -0.0809 },
  { reynolds: 2e5, mach: 0.06, alphaDeg: 5.03, lift: 0.895, drag: 0.0139, moment: -0.0803 },
  { reynolds: 2e5, mach: 0.06, alphaDeg: 5.06, lift: 0.894, drag: 0.0137, moment: -0.0785 },
  { reynolds: 2e5, mach: 0.06, alphaDeg: 5.06, lift: 0.897, drag: 0.0137, moment: -0.0802 },
]

/** Bubble on the upper side, x/c: laminar separation, transition (null where oil does not show it), reattachment. */
export interface Bubble {
  readonly reynolds: number
  readonly alphaDeg: number
  readonly separation: number
  readonly transition: number | null
  readonly reattachment: number
  readonly tunnel: 'McGhee' | 'Cole'
}

export const BUBBLES: readonly Bubble[] = [
  { reynolds: 2e5, alphaDeg: -2, separation: 0.53, transition: null, reattachment: 0.8, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 0, separation: 0.48, transition: null, reattachment: 0.74, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 2, separation: 0.43, transition: null, reattachment: 0.67, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 4, separation: 0.4, transition: null, reattachment: 0.62, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 5, separation: 0.38, transition: null, reattachment: 0.59, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 6, separation: 0.37, transition: null, reattachment: 0.55, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 7, separation: 0.33, transition: null, reattachment: 0.48, tunnel: 'McGhee' },
  { reynolds: 2e5, alphaDeg: 8.5, separation: 0.03, transition: null, reattachment: 0.18, tunnel: 'McGhee' },
  { reynolds: 1e5, alphaDeg: 5, separation: 0.34, transition: null, reattachment: 0.67, tunnel: 'McGhee' },
  { reynolds: 1e5, alphaDeg: -2, separation: 0.5, transition: 0.9, reattachment: 0.98, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: -1, separation: 0.48, transition: 0.85, reattachment: 0.9, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 0, separation: 0.44, transition: 0.85, reattachment: 0.9, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 1, separation: 0.46, transition: 0.8, reattachment: 0.85, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 2, separation: 0.4, transition: 0.76, reattachment: 0.85, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 4, separation: 0.38, transition: 0.68, reattachment: 0.78, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 6, separation: 0.38, transition: 0.6, reattachment: 0.68, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 7, separation: 0.28, transition: 0.44, reattachment: 0.54, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 8, separation: 0.28, transition: 0.44, reattachment: 0.52, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 9, separation: 0.02, transition: 0.06, reattachment: 0.1, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 10, separation: 0.005, transition: 0.06, reattachment: 0.08, tunnel: 'Cole' },
  { reynolds: 1e5, alphaDeg: 2, separation: 0.395, transition: 0.76, reattachment: 0.805, tunnel: 'Cole' },
  { reynolds: 2e5, alphaDeg: -2, separation: 0.54, transition: 0.82, reattachment: 0.88, tunnel: 'Cole' },
  { reynolds: 2e5, alphaDeg: -1, separation: 0.54, transition: 0.76, reattachment: 0.8, tunnel: 'Cole' },
  { reynolds: 2e5, alphaDeg: 1, separation: 0.44, transition: 0.7, reattachment: 0.74, tunnel: 'Cole' },
  { reynolds: 2e5, alphaDeg: 3, separation: 0.4, transition: 0.64, reattachment: 0.68, tunnel: 'Cole' },
]
