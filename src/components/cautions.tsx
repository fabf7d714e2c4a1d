/** The cautions of the bench and the site, short, where lengths are cut and crimped. */
export function CutCautions() {
  return (
    <p className="rounded border border-rule bg-card p-3 text-sm text-soft">
      Guards are life-safety parts: this arithmetic is only as good as what was entered. Local code, the
      authority having jurisdiction and a licensed engineer decide. Wear eye protection when cutting, crimping
      and tensioning; cut ends are sharp and a cable under tension can whip. Never tension past the limit of
      fitting, cable or post.
    </p>
  )
}

/** The cautions of whoever judges a guard. */
export function GuardCautions() {
  return (
    <p className="rounded border border-rule bg-card p-3 text-sm text-soft">
      Guards are life-safety parts. These checks are arithmetic on what was entered: local code, the authority
      having jurisdiction and a licensed engineer decide. Never tension past the limit of fitting, cable or
      post. Masonry anchors follow the anchor maker’s instructions; treated wood and stainless only, no plain
      or galvanised steel against it. Find wiring and plumbing before drilling into a wall.
    </p>
  )
}
