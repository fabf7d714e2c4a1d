import { type Degrees, type Radians, toDegrees, toRadians } from '../units/angle'

/**
 * The angle between a cable and the square of the post's face, which the fitting at that end must take.
 *
 * Formula: `acos(cos θ · cos skew)`; skew is the plan angle between the cable and the square of the face.
 * Units: θ in radians, skew and the answer in degrees.
 * Source: section 2 of the calculation; the right spherical triangle.
 *
 * @example θ = 35°, skew 10°: acos(0.8191520 · 0.9848078) = 36.2245°
 */
export function angleAtFitting(theta: Radians, skew: Degrees): Degrees {
  const cosine = Math.cos(theta) * Math.cos(toRadians(skew))
  return toDegrees(Math.acos(Math.min(1, Math.max(-1, cosine))))
}
