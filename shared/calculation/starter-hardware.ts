import type { z } from 'zod'
import { type Hardware, makeHardwareSchema } from '../schemas/hardware'
import { quantitiesIn } from '../schemas/quantities'
import { inches } from '../units/length'
import { toPoundsForce } from '../units/force'
import { axialStiffness } from './cable-properties'
import { startingBreakingLoad } from './published-breaking-loads'

type HardwareInput = z.input<ReturnType<typeof makeHardwareSchema>>
type CableInput = HardwareInput['cables'][number]
type FittingInput = HardwareInput['fittings'][number]

/** Stiffness in lbf to the nearest ten: the modulus it comes from is known no better. */
const stiffness = (diameter: number): number =>
  Math.round(toPoundsForce(axialStiffness({ construction: '7x7', diameter: inches(diameter) })) / 10) * 10

const cable = (id: string, name: string, diameter: number): CableInput => ({
  id,
  name,
  construction: '7x7',
  diameter,
  axialStiffness: stiffness(diameter),
  settlingStretch: 0.00125,
  breakingLoad: startingBreakingLoad(diameter),
  price: 0,
})

const cables: CableInput[] = [
  cable('c18', '1/8 in 7x7 stainless', 0.125),
  cable('c532', '5/32 in 7x7 stainless', 0.15625),
  cable('c316', '3/16 in 7x7 stainless', 0.1875),
]

const allCables = cables.map(({ id }) => id)
const wood: FittingInput['materials'] = ['softwood', 'hardwood', 'veneered']

/** What all drilled sleeves of the catalogue share: 1/4 in proud, cut point 1 in past the face, 3/4 in of travel. */
const drilled = {
  mount: 'drilled' as const,
  materials: wood,
  cables: allCables,
  headProjection: 0.25,
  cutPastFace: 1,
  takeUp: 0.75,
  rating: 700,
  maxRun: 480,
  minGrip: { softwood: 1.5, hardwood: 1.25 },
  hole: 0.5625,
  spotFace: 0.75,
  tap: ['hardwood' as const],
}

const fittings: FittingInput[] = [
  { ...drilled, id: 'sleeve-short', name: 'Short sleeve, drilled', body: 1.5, maxAngle: 5, price: 9 },
  { ...drilled, id: 'sleeve-middle', name: 'Middle sleeve, drilled', body: 2.25, maxAngle: 5, price: 10.5 },
  { ...drilled, id: 'sleeve-long', name: 'Long sleeve, drilled', body: 3, maxAngle: 5, price: 12 },
  {
    ...drilled,
    id: 'sleeve-stair',
    name: 'Stair sleeve, drilled at the pitch',
    body: 2.5,
    maxAngle: 50,
    minGrip: { softwood: 1.75, hardwood: 1.5 },
    price: 16,
  },
  {
    id: 'plate-masonry',
    name: 'Wall plate with eye screw, for masonry',
    mount: 'surface',
    materials: ['masonry'],
    cables: allCables,
    body: 0,
    headProjection: 2.5,
    cutPastFace: 1,
    takeUp: 0.875,
    rating: 700,
    maxAngle: 50,
    maxRun: 480,
    price: 21,
  },
  {
    id: 'lug-metal',
    name: 'Threaded lug on the face, for metal',
    mount: 'surface',
    materials: ['metal'],
    cables: allCables,
    body: 0,
    headProjection: 2,
    cutPastFace: 1,
    takeUp: 0.875,
    rating: 700,
    maxAngle: 50,
    maxRun: 480,
    price: 14,
  },
]

/**
 * The catalogue a company starts with. Sizes are our own and stand for no maker's part: they are a beginning to be
 * replaced by what the company buys. Cable stiffness is derived (see `cable-properties`).
 */
export const starterHardware: Hardware = makeHardwareSchema(
  quantitiesIn({ length: 'in', force: 'lbf' }),
).parse({ cables, fittings })
