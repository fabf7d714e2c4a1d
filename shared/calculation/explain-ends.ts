import { cutDepth } from './cut-point'
import { passedOverPhrase } from './fitting-phrases'
import type { Phrase } from './phrase'
import { needsSize, type RunEnd, type RunEnds, settledFitting } from './run-ends'
import type { EndWorking } from './working'

/** Both ends of a run: the fitting taken, its depth, and why the others were passed over. */
export const explainEnds = ({ from, to }: RunEnds): EndWorking[] => [
  explainEnd('from', from),
  explainEnd('to', to),
]

function explainEnd(end: EndWorking['end'], runEnd: RunEnd): EndWorking {
  const { post, choice, angle } = runEnd
  const fitting = settledFitting(runEnd)
  const passedOver = (choice?.passedOver ?? []).map(({ fitting: { id, name }, reason }) => ({
    fitting: id,
    name,
    reason: passedOverPhrase(reason),
  }))
  if (!fitting) return { end, post: post.post.id, reason: whyNone(runEnd), passedOver }
  const reason: Phrase = [
    `suits ${post.post.material ?? 'the post'}`,
    post.post.core ? ` over a core of ${post.post.core}` : '',
    ', takes the angle of ',
    { angle: angle ?? 0 },
    '; of those that suit, the shortest body, then the lowest price',
  ]
  const depth = {
    label: [`Depth at ${post.post.id}`],
    value: cutDepth(fitting),
    reason: [
      'the cable ends ',
      { length: fitting.cutPastFace },
      ' past the fitting’s face, which stands ',
      { length: fitting.headProjection },
      ' proud of the post',
    ],
  }
  return { end, post: post.post.id, fitting: fitting.id, name: fitting.name, reason, depth, passedOver }
}

function whyNone(end: RunEnd): Phrase {
  if (!end.choice) return ['no choice can be made before the cable and the angle are known']
  if (needsSize(end)) return [`the post’s size ${end.post.side} is needed first`]
  return ['no fitting of the hardware suits']
}
