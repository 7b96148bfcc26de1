import { power } from '../numerics/elementary'

/** A lift slope with a plain warning when the formula is used outside its range; empty when inside. */
export interface QuickSlope {
  /** Wing lift slope, per rad. */
  readonly slope: number
  readonly warning: string
}

/**
 * Lift slope of an unswept wing of low aspect ratio A for a section slope of 2 pi:
 * 2 pi A / (2 + sqrt(A^2 + 4)).
 * Source: Helmbold, Der unverwundene Ellipsenfluegel als tragende Flaeche, Jahrbuch der deutschen
 * Luftfahrtforschung (1942).
 */
export function helmboldSlope(aspectRatio: number): QuickSlope {
  return {
    slope: (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(power(aspectRatio, 2) + 4)),
    warning: aspectRatio > 8 ? "Helmbold's formula is meant for low aspect ratios, up to about 8" : '',
  }
}
