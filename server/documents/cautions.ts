/** The cautions of every print that bears on safety. */
export const CAUTIONS: readonly string[] = [
  'Guards are life-safety parts. Local code, the authority having jurisdiction and a licensed engineer decide; these checks are arithmetic on what was entered.',
  'Eye protection when cutting, crimping and tensioning: stainless ends are sharp and a cable under tension can whip. Never stand in line with a cable being tensioned. Cap or trim every cut end.',
  'Never tension past the limit of the fitting, the cable or the post. Find wiring and plumbing before drilling into a wall. Masonry anchors follow the anchor maker’s instructions.',
  'Treated wood and stainless only: no plain or galvanised steel against it.',
]
