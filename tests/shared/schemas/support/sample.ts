/** The survey file of the format's description, in inches, with the posts, ids and names it leaves to the reader. */
export const sample = {
  survey: {
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Back deck',
    guard: {
      rules: 'irc-2021',
      situation: 'dwelling',
      fall: 60,
      railTies: true,
      height: 36,
      topRailUnderside: 34.5,
      bottom: 0,
      sphere: 4,
      stairSphere: 4.375,
      readAt: { top: 33, bottom: 3 },
      stair: { height: 34, topRailUnderside: 32.5 },
    },
    posts: [
      { id: 'P1', material: 'veneered', core: 'softwood', cover: 0.75, along: 5, across: 5 },
      { id: 'P2', material: 'softwood', along: 3.5, across: 3.5, lumber: 'hem-fir-2', railTies: false },
      { id: 'P3', material: 'masonry', along: 8, across: 8, note: 'brick' },
      { id: 'P4', material: 'metal' },
    ],
    bays: [
      {
        id: 'B1',
        from: 'P1',
        to: 'P2',
        kind: 'level',
        spacers: 0,
        skewFrom: 0,
        skewTo: 0,
        taped: 'slope',
        readings: [
          { id: 'r1', at: 'top', value: 46.5, by: 'The surveyor', on: '2026-05-04T10:12:00Z' },
          { id: 'r2', at: 'bottom', value: 64.25, struck: 'digits swapped' },
        ],
      },
      {
        id: 'B2',
        from: 'P2',
        to: 'P3',
        kind: 'stair',
        spacers: 0,
        skewFrom: 0,
        skewTo: 0,
        taped: 'slope',
        rise: 52.5,
        going: 75,
        gauge: 35,
        readings: [],
      },
    ],
    runs: [
      {
        id: 'R1',
        bays: ['B1'],
        cable: 'c532',
        tension: 150,
        readings: [],
        cables: { layout: 'even', spacing: 3 },
      },
      { id: 'R2', bays: ['B2'], cable: 'c532', readings: [], cables: { heights: [3, 6] } },
    ],
    diagonals: [{ id: 'D1', from: 'P1', to: 'P4', value: 201.5 }],
    corners: [{ post: 'P3', angle: 90 }],
    photos: [
      {
        id: 'F1',
        file: 'harbour-deck.jpg',
        posts: { P1: { base: [412, 980], top: [420, 640] } },
        rectangle: {
          width: 120,
          depth: 96,
          corners: [
            [10, 900],
            [20, 500],
            [700, 510],
            [900, 910],
          ],
        },
      },
    ],
    overruled: [
      {
        code: 'opening-between',
        where: { run: 'R1', bay: 'B1' },
        text: 'Bay B1: the opening is 4 in.',
        reason: 'A glass panel stands behind it',
        by: 'The estimator',
        on: '2026-05-05T08:00:00Z',
      },
    ],
  },
  hardware: {
    cables: [
      {
        id: 'c532',
        name: '5/32 7x7 316',
        construction: '7x7',
        diameter: 0.15625,
        axialStiffness: 151000,
        settlingStretch: 0.00125,
        breakingLoad: 2400,
        price: 0,
      },
    ],
    fittings: [
      {
        id: 'f1',
        name: 'Sleeve',
        mount: 'drilled',
        materials: ['softwood', 'hardwood'],
        cables: ['c532'],
        body: 1.5,
        headProjection: 0.25,
        cutPastFace: 1,
        takeUp: 0.75,
        rating: 900,
        maxAngle: 5,
        maxRun: 240,
        minGrip: { softwood: 1.5, hardwood: 1.25 },
        hole: 0.5625,
        spotFace: 0.625,
        tap: ['hardwood'],
        price: 12.34,
      },
    ],
  },
  rules: {
    cutStep: 0.0625,
    holeStep: 0.0625,
    stacking: 'rss',
    grouping: 'cable',
    readingLimit: 0.0625,
    gaugeLimit: 0.25,
    tapeClass: 'II',
    cutLimit: 0.0625,
    seatLimit: 0.03125,
    reserve: 0.15,
    trim: 4,
    tension: 150,
    backWall: 0.5,
    plumbLimit: 0.25,
    maxBend: 0,
    wideBay: 48,
    cornerOverlap: 0.0625,
    cornerWeb: 0.25,
    keepOffcut: 60,
    edgeWall: 0.5,
    leastPush: 5,
    coldest: -20,
    hottest: 40,
    tensionedAt: 15,
    lumber: [{ id: 'hem-fir-2', name: 'Hem-Fir No. 2', bending: 850, sizeFactor: 1.5, modulus: 1300000 }],
    wetService: true,
  },
}

export type Json = null | boolean | number | string | Json[] | { [key: string]: Json }

/** A copy of the sample with one place set, or taken away where the value is undefined. */
export function sampleWith(path: readonly (string | number)[], value: Json | undefined): unknown {
  const copy = structuredClone(sample) as unknown
  let at = copy as Record<string | number, unknown>
  for (const part of path.slice(0, -1)) at = at[part] as Record<string | number, unknown>
  const last = path.at(-1)!
  if (value === undefined) delete at[last]
  else at[last] = value
  return copy
}
