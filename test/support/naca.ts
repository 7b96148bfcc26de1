import fc from 'fast-check'

/** NACA codes of both families, 4 to 24 % thick. */
export const nacaCodes = fc.oneof(
  fc
    .tuple(fc.integer({ min: 0, max: 6 }), fc.integer({ min: 2, max: 7 }), fc.integer({ min: 4, max: 24 }))
    .map(
      ([camber, place, thickness]) =>
        `${camber}${camber === 0 ? 0 : place}${String(thickness).padStart(2, '0')}`,
    ),
  fc
    .tuple(
      fc.integer({ min: 1, max: 4 }),
      fc.constantFrom('20', '30', '40', '31', '41'),
      fc.integer({ min: 6, max: 24 }),
    )
    .map(([lift, line, thickness]) => `${lift}${line}${String(thickness).padStart(2, '0')}`),
)

export const edges = fc.constantFrom('closed' as const, 'open' as const)

/** Angles from -6 to 12 deg, in rad. */
export const angles = fc.integer({ min: -60, max: 120 }).map((tenths) => (tenths * Math.PI) / 1800)
