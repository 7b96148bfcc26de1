/** What a number field takes. */
export interface NumberRule {
  readonly above?: number
  readonly least?: number
  readonly most?: number
}

/** A typed text as a number, decimal point or comma; `fault` says in words what to type instead. */
export function parseNumber(
  text: string,
  rule: NumberRule & { readonly mayBeEmpty: boolean },
): { readonly value: number | null; readonly fault: string | null } {
  const plain = text.trim().replace(',', '.').replace('−', '-')
  if (plain === '') return rule.mayBeEmpty ? ok(null) : bad('give a number')
  if (!/^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(plain)) return bad(`"${text.trim()}" is not a number`)
  const value = Number(plain)
  if (rule.above !== undefined && !(value > rule.above)) return bad(`give more than ${rule.above}`)
  if (rule.least !== undefined && value < rule.least) return bad(`give ${rule.least} or more`)
  if (rule.most !== undefined && value > rule.most) return bad(`give ${rule.most} or less`)
  return ok(value)
}

const ok = (value: number | null) => ({ value, fault: null })
const bad = (fault: string) => ({ value: null, fault })
