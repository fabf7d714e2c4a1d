import type { PassedOver } from './choose-fitting'
import type { Phrase } from './phrase'

/** Why a fitting was passed over, as a phrase that follows its name. */
export function passedOverPhrase(reason: PassedOver): Phrase {
  switch (reason.because) {
    case 'material':
      return reason.material
        ? [`not made for ${reason.material} posts`]
        : ['the post’s material is not known']
    case 'cable':
      return [`does not take cable ${reason.cable}`]
    case 'angle':
      return [
        'takes angles up to ',
        { angle: reason.most },
        ', the cable meets the post at ',
        { angle: reason.angle },
      ]
    case 'core-not-listed':
      return reason.core === 'veneered'
        ? ['the core under the veneer is not known']
        : [`no least grip is given for a core of ${reason.core}`]
    case 'grip':
      return [
        'grips ',
        { length: reason.grip },
        ` of the ${reason.core} core, needs `,
        { length: reason.least },
      ]
    case 'back-wall':
      return [
        'its body of ',
        { length: reason.body },
        ' is longer than the ',
        { length: reason.most },
        ' the post allows',
      ]
    case 'size-missing':
      return ['the post’s size in this direction is not known']
    case 'longer-body':
      return [
        'suits, but its body of ',
        { length: reason.body },
        ' is longer than ',
        { length: reason.chosen },
      ]
    case 'price':
      return ['suits, but costs more']
    case 'id':
      return ['suits just as well; the first by id is taken']
  }
}
