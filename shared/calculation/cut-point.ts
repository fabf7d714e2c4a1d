import type { Fitting } from '../schemas/hardware'

/**
 * How far past the post's face the cable's end sits in a fitting.
 *
 * Formula: `cutPastFace − headProjection`; negative where the end stays outside the post, as in surface fittings.
 * Units: nm.
 * Source: section 6 of the calculation. Common practice: a drilled fitting standing 1/4 in proud with a cut point
 * 1 in past its face gives 3/4 in, so a cable is post face to post face and 1 1/2 in.
 *
 * @example 1 in − 1/4 in = 3/4 in
 */
export const cutDepth = ({
  cutPastFace,
  headProjection,
}: Pick<Fitting, 'cutPastFace' | 'headProjection'>): number => cutPastFace - headProjection
