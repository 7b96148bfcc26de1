/** One comparison of a computed value with a published one. */
export interface Row {
  readonly name: string
  /** null where nothing was computed; such a row counts in no mean and is shown. */
  readonly computed: number | null
  readonly published: number
}

/** A figure of the report: its rows and what is aimed at. */
export interface Figure {
  readonly key: string
  readonly title: string
  /** Errors are differences, or shares of the published value. */
  readonly kind: 'difference' | 'share'
  readonly decimals: number
  readonly aim: string
  readonly rows: readonly Row[]
}

/** Bias (mean error), mean size and greatest size of the errors, over the rows with a computed value. */
export interface Errors {
  readonly count: number
  readonly missing: number
  readonly bias: number
  readonly mean: number
  readonly worst: number
}

/** Error of a row: computed less published, or that over the published value. */
export function errorOf({ kind }: Figure, { computed, published }: Row): number | null {
  if (computed === null) return null
  return kind === 'share' ? computed / published - 1 : computed - published
}

export function errorsOf(figure: Figure): Errors {
  const errors = figure.rows.map((row) => errorOf(figure, row)).filter((error) => error !== null)
  const sum = (of: (error: number) => number): number => errors.reduce((total, error) => total + of(error), 0)
  return {
    count: errors.length,
    missing: figure.rows.length - errors.length,
    bias: sum((error) => error) / errors.length,
    mean: sum(Math.abs) / errors.length,
    worst: Math.max(...errors.map(Math.abs)),
  }
}

/** The figure as lines of text: case, computed, published, error; then bias, mean and worst beside the aim. */
export function printFigure(figure: Figure): string {
  const { title, aim, rows, decimals } = figure
  const error = (value: number): string => {
    const text = figure.kind === 'share' ? `${(100 * value).toFixed(1)} %` : value.toFixed(decimals)
    return value > 0 ? `+${text}` : text
  }
  const lines = rows.map((row) => {
    const value = errorOf(figure, row)
    const computed = row.computed === null ? 'none' : row.computed.toFixed(decimals)
    return [
      `  ${row.name.padEnd(28)}`,
      computed.padStart(10),
      row.published.toFixed(decimals).padStart(10),
      (value === null ? '' : error(value)).padStart(10),
    ].join('')
  })
  const { count, missing, bias, mean, worst } = errorsOf(figure)
  const size = (value: number): string => error(value).replace('+', '')
  return [
    title,
    `  ${'case'.padEnd(28)}${'computed'.padStart(10)}${'published'.padStart(10)}${'error'.padStart(10)}`,
    ...lines,
    `  ${count} cases${missing > 0 ? `, ${missing} without a value` : ''}: bias ${error(bias)}, mean ${size(mean)}, worst ${size(worst)}; aim: ${aim}`,
    '',
  ].join('\n')
}
