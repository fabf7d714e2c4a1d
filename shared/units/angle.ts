/** An angle in degrees; stair angles are measured from the horizontal. */
export type Degrees = number
/** An angle in radians. */
export type Radians = number

export const toRadians = (degrees: Degrees): Radians => (degrees * Math.PI) / 180
export const toDegrees = (radians: Radians): Degrees => (radians * 180) / Math.PI
