/** A stored survey as each version wrote it, kept as it was written. A new version adds its own and edits none. */
export const versionExamples: Record<number, unknown> = {
  1: {
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Back deck',
    guard: {
      rules: 'irc-2021',
      height: 914_400_000,
      bottom: 0,
      sphere: 101_600_000,
      stairSphere: 111_125_000,
      readAt: { top: 838_200_000, bottom: 76_200_000 },
    },
    posts: [
      {
        id: 'P1',
        material: 'veneered',
        core: 'softwood',
        cover: 19_050_000,
        along: 127_000_000,
        across: 127_000_000,
      },
      { id: 'P2' },
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
          { id: 'r1', at: 'top', value: 1_181_100_000, by: 'A. Person', on: '2026-05-04T10:12:00Z' },
        ],
      },
    ],
    runs: [
      {
        id: 'R1',
        bays: ['B1'],
        cable: 'c532',
        readings: [],
        cables: { layout: 'even', spacing: 76_200_000 },
      },
    ],
    diagonals: [],
    corners: [],
    photos: [{ id: 'F1', file: 'deck.jpg', posts: { P1: { base: [412, 980], top: [420, 640] } } }],
  },
}
