interface Names {
  posts: { id: string }[]
  bays: { id: string; from: string; to: string; readings: { id: string }[] }[]
  runs: { id: string; bays: string[]; readings: { id: string }[] }[]
  diagonals: { id: string; from: string; to: string }[]
  corners: { post: string }[]
  photos: { id: string; posts: Record<string, unknown> }[]
}

type Ends = { from: string; to: string }
type Path = (string | number)[]
/** Takes a fault: where, what was found there, what was expected. */
export type Report = (path: Path, value: unknown, message: string) => void

/** Checks that ids are unique, that every name leads somewhere and that a run's bays follow one another. */
export function checkSurveyReferences(survey: Names, report: Report): void {
  for (const list of ['posts', 'bays', 'runs', 'diagonals', 'photos'] as const)
    checkUnique(survey[list], [list], report)
  const posts = new Set(survey.posts.map((post) => post.id))
  const needPost = (id: string, path: Path) => {
    if (!posts.has(id)) report(path, id, 'expected the id of a post of this survey')
  }
  survey.bays.forEach((bay, i) => {
    needPost(bay.from, ['bays', i, 'from'])
    needPost(bay.to, ['bays', i, 'to'])
    if (bay.from === bay.to) report(['bays', i, 'to'], bay.to, 'expected another post than the bay begins at')
    checkUnique(bay.readings, ['bays', i, 'readings'], report)
  })
  const bays = new Map(survey.bays.map((bay) => [bay.id, bay]))
  survey.runs.forEach((run, i) => {
    checkChain(bays, run.bays, ['runs', i, 'bays'], report)
    checkUnique(run.readings, ['runs', i, 'readings'], report)
  })
  survey.diagonals.forEach((diagonal, i) => {
    needPost(diagonal.from, ['diagonals', i, 'from'])
    needPost(diagonal.to, ['diagonals', i, 'to'])
  })
  survey.corners.forEach(({ post }, i) => {
    needPost(post, ['corners', i, 'post'])
    if (survey.corners.findIndex((corner) => corner.post === post) !== i)
      report(['corners', i, 'post'], post, 'expected a post whose angle is not given above')
  })
  survey.photos.forEach((photo, i) => {
    for (const id of Object.keys(photo.posts)) needPost(id, ['photos', i, 'posts', id])
  })
}

function checkUnique(items: { id: string }[], path: Path, report: Report): void {
  const seen = new Set<string>()
  items.forEach((item, i) => {
    if (seen.has(item.id)) report([...path, i, 'id'], item.id, 'expected an id that is not used twice')
    seen.add(item.id)
  })
}

/** Each bay of a run begins where the one before it ended, in whichever direction the bay was written. */
function checkChain(bays: ReadonlyMap<string, Ends>, ids: string[], path: Path, report: Report): void {
  const ends: Ends[] = []
  for (const [j, id] of ids.entries()) {
    const bay = bays.get(id)
    if (!bay) return report([...path, j], id, 'expected the id of a bay of this survey')
    if (ids.indexOf(id) !== j) return report([...path, j], id, 'expected each bay once')
    ends.push(bay)
  }
  const first = ends[0]
  const second = ends[1]
  if (!first || !second) return
  let at = second.from === first.to || second.to === first.to ? first.to : first.from
  for (const [j, bay] of ends.entries()) {
    if (j === 0) continue
    if (bay.from !== at && bay.to !== at) {
      return report([...path, j], ids[j], `expected a bay that begins or ends at post ${at}`)
    }
    const before = ends[j - 1]
    if (before && bothMeet(before, bay)) {
      return report([...path, j], ids[j], 'expected a bay that leads on, not back to the post before')
    }
    at = bay.from === at ? bay.to : bay.from
  }
}

/** Two bays side by side, between the same two posts. */
const bothMeet = (a: Ends, b: Ends): boolean =>
  (a.from === b.from && a.to === b.to) || (a.from === b.to && a.to === b.from)
