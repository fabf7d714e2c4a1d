import type { SurveyOperation } from '@shared/survey/survey-operation'
import { type LengthFormat, writeLength } from '@shared/units/format-length'

const fields: Record<string, string> = {
  along: 'size along',
  across: 'size across',
  cover: 'cover',
  core: 'core',
  material: 'material',
  note: 'note',
  kind: 'kind',
  spacers: 'spacers',
  skewFrom: 'skew at its first post',
  skewTo: 'skew at its second post',
  taped: 'how it was taped',
  rise: 'rise',
  going: 'going',
  gauge: 'gauge angle',
  from: 'first post',
  to: 'second post',
  bays: 'bays',
  cable: 'cable',
  tension: 'tension',
  cables: 'layout of the cables',
  height: 'height',
  topRailUnderside: 'top rail underside',
  bottom: 'where the opening begins',
  sphere: 'sphere that must not pass',
  stairSphere: 'sphere that must not pass on stairs',
  readAt: 'heights of the readings',
  stair: 'heights on stairs',
  situation: 'situation',
  fall: 'fall beside the walking surface',
  railTies: 'whether the top rail ties the posts',
  lumber: 'species and grade',
  rules: 'rules followed',
  title: 'title',
  units: 'units',
}

const changed = ({ set, unset }: { set: object; unset: readonly string[] }): string =>
  [...Object.keys(set), ...unset].map((key) => fields[key] ?? key).join(', ')

const place = ({ kind, id }: { kind: string; id: string }): string => `${kind} ${id}`

/** One change of a survey as a plain sentence without its end. */
export function describeOperation(operation: SurveyOperation, format: LengthFormat): string {
  switch (operation.type) {
    case 'group':
      return operation.operations.map((step) => describeOperation(step, format)).join('; ')
    case 'post.add':
      return `put post ${operation.post.id}`
    case 'post.remove':
      return `removed post ${operation.id}`
    case 'post.set':
      return `changed post ${operation.id}: ${changed(operation)}`
    case 'bay.add':
      return `joined ${operation.bay.from} and ${operation.bay.to} by bay ${operation.bay.id}`
    case 'bay.remove':
      return `removed bay ${operation.id}`
    case 'bay.set':
      return `changed bay ${operation.id}: ${changed(operation)}`
    case 'run.add':
      return `laid run ${operation.run.id} over ${operation.run.bays.join(', ')}`
    case 'run.remove':
      return `removed run ${operation.id}`
    case 'run.set':
      return `changed run ${operation.id}: ${changed(operation)}`
    case 'reading.add':
      return `read ${writeLength(operation.reading.value, format)} at the ${operation.reading.at} of ${place(operation.of)}`
    case 'reading.strike':
      return `struck a reading of ${place(operation.of)}: ${operation.reason}`
    case 'reading.restore':
      return `took the strike of a reading of ${place(operation.of)} back`
    case 'reading.retract':
      return `took a reading of ${place(operation.of)} back`
    case 'corner.set':
      return `set the corner at ${operation.corner.post} to ${operation.corner.angle}°`
    case 'corner.remove':
      return `removed the corner angle at ${operation.post}`
    case 'diagonal.add':
      return `measured the diagonal ${operation.diagonal.from} to ${operation.diagonal.to}: ${writeLength(operation.diagonal.value, format)}`
    case 'diagonal.remove':
      return `removed diagonal ${operation.id}`
    case 'photo.add':
      return `added photo ${operation.photo.id}`
    case 'photo.remove':
      return `removed photo ${operation.id}`
    case 'photo.mark':
      return `marked ${operation.post} on photo ${operation.photo}`
    case 'photo.unmark':
      return `took the mark of ${operation.post} off photo ${operation.photo}`
    case 'photo.setRectangle':
      return `marked the rectangle on photo ${operation.photo}`
    case 'photo.clearRectangle':
      return `removed the rectangle from photo ${operation.photo}`
    case 'stop.overrule':
      return `let a stop pass (${operation.overrule.text}): ${operation.overrule.reason}`
    case 'stop.uphold':
      return 'made a stop stand again that was let pass'
    case 'guard.set':
      return `changed the guard: ${changed(operation)}`
    case 'survey.set':
      return `changed the survey: ${changed(operation)}`
  }
}
