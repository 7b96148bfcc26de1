/**
 * Exact potential flow round Karman-Trefftz sections (Joukowski for edge angle 0): the circle of centre c
 * through 1 in the plane of zeta is mapped by z = n (1 + q) / (1 - q), q = ((zeta - 1) / (zeta + 1))^n,
 * n = 2 - edge angle / pi, then moved to leading edge 0 and trailing edge 1 (leading edge: the point farthest
 * from the trailing edge). Kutta: the flow is at rest at zeta = 1.
 * Source: Milne-Thomson, Theoretical Aerodynamics (1966), sections 7.1 to 7.5; forces by Blasius.
 */
type Complex = readonly [number, number]

export interface ExactSection {
  readonly x: Float64Array
  readonly y: Float64Array
  /** Pressure coefficient at the points, alpha in rad. */
  readonly pressure: (alpha: number) => Float64Array
  readonly lift: (alpha: number) => number
  /** About the quarter chord, nose up positive. */
  readonly moment: (alpha: number) => number
}

export interface KarmanTrefftz {
  readonly name: string
  readonly edgeAngleDeg: number
  readonly centre: Complex
}

/** The six sections that the tests use. */
export const exactCases: readonly KarmanTrefftz[] = [
  { name: 'J1, thin symmetric cusp', edgeAngleDeg: 0, centre: [-0.0485, 0] },
  { name: 'J2, thick symmetric cusp', edgeAngleDeg: 0, centre: [-0.1833, 0] },
  { name: 'J3, cambered cusp', edgeAngleDeg: 0, centre: [-0.1015, 0.0896] },
  { name: 'KT1, symmetric, 10 deg edge', edgeAngleDeg: 10, centre: [-0.0704, 0] },
  { name: 'KT2, cambered, 15 deg edge', edgeAngleDeg: 15, centre: [-0.0521, 0.0657] },
  { name: 'KT3, thick, 20 deg edge', edgeAngleDeg: 20, centre: [-0.1225, 0.0481] },
]

const add = (a: Complex, b: Complex): Complex => [a[0] + b[0], a[1] + b[1]]
const sub = (a: Complex, b: Complex): Complex => [a[0] - b[0], a[1] - b[1]]
const mul = (a: Complex, b: Complex): Complex => [a[0] * b[0] - a[1] * b[1], a[0] * b[1] + a[1] * b[0]]
const div = (a: Complex, b: Complex): Complex => {
  const square = b[0] * b[0] + b[1] * b[1]
  return [(a[0] * b[0] + a[1] * b[1]) / square, (a[1] * b[0] - a[0] * b[1]) / square]
}
const polar = (size: number, angle: number): Complex => [size * Math.cos(angle), size * Math.sin(angle)]
const power = (a: Complex, n: number): Complex => polar(Math.hypot(...a) ** n, n * Math.atan2(a[1], a[0]))

/** An exact section with `panels` + 1 points at even angles of the circle, from the edge over the upper side. */
export function exactSection({ edgeAngleDeg, centre }: KarmanTrefftz, panels: number): ExactSection {
  const n = 2 - edgeAngleDeg / 180
  const one: Complex = [1, 0]
  const radius = Math.hypot(1 - centre[0], centre[1])
  const edgeTurn = Math.atan2(-centre[1], 1 - centre[0])
  const onCircle = (turn: number, reach = radius): Complex => add(centre, polar(reach, turn))
  const ratio = (zeta: Complex): Complex => power(div(sub(zeta, one), add(zeta, one)), n)
  const mapped = (zeta: Complex): Complex => {
    const q = ratio(zeta)
    return mul([n, 0], div(add(one, q), sub(one, q)))
  }
  const slope = (zeta: Complex): Complex => {
    const q = ratio(zeta)
    const dq = div(mul([2 * n, 0], q), sub(mul(zeta, zeta), one))
    return div(mul([2 * n, 0], dq), mul(sub(one, q), sub(one, q)))
  }

  const away = (turn: number): number => Math.hypot(...sub(mapped(onCircle(turn)), [n, 0]))
  let [low, high] = [edgeTurn + 0.5 * Math.PI, edgeTurn + 1.5 * Math.PI]
  for (let step = 0; step < 200; step++) {
    const [a, b] = [low + (high - low) / 3, high - (high - low) / 3]
    if (away(a) < away(b)) low = a
    else high = b
  }
  const nose = mapped(onCircle(0.5 * (low + high)))
  const chord = sub([n, 0], nose)
  const size = Math.hypot(...chord)
  const tilt = Math.atan2(chord[1], chord[0])
  const placed = (zeta: Complex): Complex => div(sub(mapped(zeta), nose), chord)

  const circulation = (alpha: number): number => 4 * Math.PI * radius * Math.sin(alpha + tilt - edgeTurn)
  /** dw/dz for unit speed at the angle alpha to the chord, per unit of z. */
  const velocity = (zeta: Complex, alpha: number): Complex => {
    const d = sub(zeta, centre)
    const stream = sub(polar(1, -alpha - tilt), div(polar(radius * radius, alpha + tilt), mul(d, d)))
    return div(add(stream, div([0, circulation(alpha) / (2 * Math.PI)], d)), slope(zeta))
  }

  const turns = Array.from({ length: panels + 1 }, (_, i) => edgeTurn + (2 * Math.PI * i) / panels)
  const inside = (i: number): boolean => i > 0 && i < panels
  const points = turns.map((turn, i): Complex => (inside(i) ? placed(onCircle(turn)) : [1, 0]))
  return {
    x: Float64Array.from(points, (p) => p[0]),
    y: Float64Array.from(points, (p) => p[1]),
    pressure: (alpha) =>
      Float64Array.from(turns, (turn, i) =>
        inside(i) ? 1 - Math.hypot(...velocity(onCircle(turn), alpha)) ** 2 : NaN,
      ),
    lift: (alpha) => (2 * circulation(alpha)) / size,
    moment: (alpha) => {
      // Blasius on a circle twice as large, where the even sum is exact.
      const count = 256
      let sum = 0
      for (let i = 0; i < count; i++) {
        const zeta = onCircle((2 * Math.PI * i) / count, 2 * radius)
        const v = mul(velocity(zeta, alpha), polar(1, tilt))
        const step = div(mul(mul(sub(zeta, centre), [0, (2 * Math.PI) / count]), slope(zeta)), chord)
        sum += mul(mul(mul(v, v), sub(placed(zeta), [0.25, 0])), step)[0]
      }
      return sum
    },
  }
}
