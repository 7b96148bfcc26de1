import { liftLine } from '../../../src/core/polar/liftLine'
import type { PressureResult } from '../../../src/core/polar/state'
import { pressureAt } from '../../../src/core/polar/sweep'
import { FORCED_AT, FORCED_MACH, FORCED_POINTS, FORCED_REYNOLDS } from '../cases/forcedTransition'
import { BUBBLES, LOW_REYNOLDS_AT_5_DEG, LOW_REYNOLDS_POLAR } from '../cases/lowReynolds'
import { FURTHER_MAXIMA, LEAST_DRAGS, MEASURED_SECTIONS, SECTIONS_REYNOLDS } from '../cases/measuredSections'
import type { Figure } from './figure'
import { atLift, lowReynoldsSection, polarStore, solved, viscousState } from './polars'

const DEGREE = Math.PI / 180

/** Every figure by its key, computed when it is asked for; polars are shared. */
export function publishedFigures(): Readonly<Record<string, () => Figure>> {
  const polarOf = polarStore()
  const clean = (code: string, reynolds: number): ReturnType<typeof polarOf> =>
    polarOf(code, viscousState(reynolds), -6, 20)
  const lineOf = (code: string): NonNullable<ReturnType<typeof liftLine>> | null =>
    liftLine(clean(code, SECTIONS_REYNOLDS))
  return {
    zero_lift_angle: () => ({
      ...{ key: 'zero_lift_angle', title: 'Zero-lift angle, deg, smooth, Reynolds number 9e6' },
      ...{ kind: 'difference', decimals: 2, aim: 'each within 0.3 deg' },
      rows: MEASURED_SECTIONS.map(({ code, zeroLiftDeg }) => ({
        name: `NACA ${code}`,
        computed: (lineOf(code)?.zeroLift ?? NaN) / DEGREE,
        published: zeroLiftDeg,
      })),
    }),
    moment: () => ({
      ...{ key: 'moment', title: 'Quarter-chord moment at zero lift, smooth, Reynolds number 9e6' },
      ...{ kind: 'difference', decimals: 4, aim: 'each within 0.010' },
      rows: MEASURED_SECTIONS.map(({ code, momentAtZeroLift }) => ({
        name: `NACA ${code}`,
        computed: lineOf(code)?.momentAtZeroLift ?? null,
        published: momentAtZeroLift,
      })),
    }),
    lift_slope: () => ({
      ...{ key: 'lift_slope', title: 'Lift slope per deg over c_l -0.2 to 0.9, smooth, Reynolds number 9e6' },
      ...{ kind: 'share', decimals: 4, aim: 'none stated' },
      rows: MEASURED_SECTIONS.map(({ code, slopePerDeg }) => ({
        name: `NACA ${code}`,
        computed: (lineOf(code)?.slope ?? NaN) * DEGREE,
        published: slopePerDeg,
      })),
    }),
    max_lift: () => ({
      ...{ key: 'max_lift', title: 'Maximum lift coefficient, smooth' },
      ...{ kind: 'share', decimals: 3, aim: 'bias within 5 %, mean at most 6 %, worst at most 0.20' },
      rows: [
        ...MEASURED_SECTIONS.map((row) => ({ ...row, reynolds: SECTIONS_REYNOLDS })),
        ...FURTHER_MAXIMA,
      ].map(({ code, reynolds, maxLift }) => {
        const limit = clean(code, reynolds).maxLift
        return {
          name: `NACA ${code}, ${reynolds / 1e6}e6${limit?.by === 'nose' ? ', nose' : ''}`,
          computed: limit?.liftCoefficient ?? null,
          published: maxLift,
        }
      }),
    }),
    least_drag: () => ({
      ...{ key: 'least_drag', title: 'Least drag coefficient, smooth' },
      ...{ kind: 'share', decimals: 5, aim: 'mean at most 8 %' },
      rows: LEAST_DRAGS.map(({ code, reynolds, drag }) => ({
        name: `NACA ${code}, ${reynolds / 1e6}e6`,
        computed: Math.min(...solved(clean(code, reynolds)).map((point) => point.dragCoefficient!)),
        published: drag,
      })),
    }),
    forced_drag: () => {
      const state = {
        mach: FORCED_MACH,
        tripUpper: FORCED_AT,
        tripLower: FORCED_AT,
        surface: 'dirty',
      } as const
      const polar = polarOf('0012', viscousState(FORCED_REYNOLDS, state), -6, 20)
      return {
        ...{
          key: 'forced_drag',
          title: 'Drag at the same lift, NACA 0012, transition forced, Reynolds number 6e6',
        },
        ...{ kind: 'share', decimals: 5, aim: 'bias within 4 %, worst at most 8 %, up to 10 deg' },
        rows: FORCED_POINTS.map(({ grit, alphaDeg, lift, drag }) => ({
          name: `grit ${grit}, ${alphaDeg} deg`,
          computed: atLift(polar, lift, (point) => point.dragCoefficient),
          published: drag,
        })),
      }
    },
    low_reynolds_drag: () => {
      const polar = polarOf('low', viscousState(2e5, { mach: 0.06 }), -4, 14)
      return {
        ...{
          key: 'low_reynolds_drag',
          title: 'Drag at the same lift, section for low Reynolds numbers, 2e5',
        },
        ...{ kind: 'share', decimals: 4, aim: 'mean at most 10 %' },
        rows: LOW_REYNOLDS_POLAR.map(([lift, drag]) => ({
          name: `c_l ${lift}`,
          computed: atLift(polar, lift, (point) => point.dragCoefficient),
          published: drag,
        })),
      }
    },
    low_reynolds_drag_1e5: () => ({
      ...{ key: 'low_reynolds_drag_1e5', title: 'Drag at the same lift near 5 deg, the same section' },
      ...{ kind: 'share', decimals: 4, aim: 'reported, not judged' },
      rows: LOW_REYNOLDS_AT_5_DEG.map(({ reynolds, mach, lift, drag }) => ({
        name: `${reynolds / 1e5}e5, c_l ${lift}`,
        computed: atLift(
          polarOf('low', viscousState(reynolds, { mach }), -4, 14),
          lift,
          (p) => p.dragCoefficient,
        ),
        published: drag,
      })),
    }),
    bubble_separation: () => bubbleFigure('separation', 'each within 0.03 chord at 2e5'),
    bubble_transition: () => bubbleFigure('transition', 'none stated'),
    bubble_reattachment: () => bubbleFigure('reattachment', 'each within 0.08 chord at 2e5'),
  }
}

/** Bubbles on the upper side of the low-Reynolds-number section, at the angles of the tunnels. */
function bubbleFigure(event: 'separation' | 'transition' | 'reattachment', aim: string): Figure {
  const section = lowReynoldsSection()
  const known = new Map<string, PressureResult>()
  return {
    ...{ key: `bubble_${event}`, title: `Laminar bubble, upper side: ${event}, x/c` },
    ...{ kind: 'difference', decimals: 3, aim },
    rows: BUBBLES.flatMap((bubble) => {
      const { reynolds, alphaDeg, tunnel } = bubble
      const state = viscousState(reynolds, { mach: reynolds === 2e5 ? 0.06 : 0.03 })
      const key = `${reynolds} ${alphaDeg}`
      const result = known.get(key) ?? pressureAt(section, state, { alpha: alphaDeg * DEGREE })
      known.set(key, result)
      const upper = result.layers?.upper
      const published = bubble[event]
      if (published === null) return []
      const computed = event === 'separation' ? upper?.laminarSeparation : upper?.[event]
      const name = `${reynolds / 1e5}e5, ${alphaDeg} deg, ${tunnel}`
      return [{ name, computed: computed ?? null, published }]
    }),
  }
}
