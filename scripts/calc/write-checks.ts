import type { SurveyChecks } from '../../shared/calculation/checks/check-survey'
import type { Units } from '../../shared/schemas/quantities'
import { quantityWriter, writeFindings } from './write-quantities'

/** The answer of `checks`, in the file's own units; a key without a value is left out. */
export function writeChecks({ bays, posts, corners, findings }: SurveyChecks, units: Units) {
  const { length, force, moment, stress } = quantityWriter(units)
  return {
    bays: bays.map(({ run, bay, span, openings, push, infill }) => ({
      run,
      bay,
      span: length(span),
      pitch: length(openings.pitch),
      clear: length(openings.between),
      push: force(push),
      infillDeflection: length(infill?.deflection),
      infillTension: force(infill?.tension),
    })),
    posts: posts.map(({ run, post, pull, cantilever, propped }) => ({
      run,
      post,
      pull: force(pull),
      cantilever: moment(cantilever.moment),
      propped: moment(propped.moment),
      stressCantilever: stress(cantilever.stress),
      stressPropped: stress(propped.stress),
    })),
    corners: corners
      .filter(({ kind }) => kind === 'turned')
      .map(({ post, overlap, stagger }) => ({ post, overlap: length(overlap), stagger: length(stagger) })),
    findings: writeFindings(findings),
  }
}
