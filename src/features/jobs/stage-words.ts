import type { Stage } from '@shared/schemas/job'

/** What a job at a stage needs next, in one sentence. */
export const nextStep: Record<Stage, string> = {
  measure: 'Measure on site: photo, posts, readings.',
  check: 'Check the cut list and its findings.',
  price: 'Price the survey and send the quote.',
  agreed: 'Agreed with the customer: hand it to the shop.',
  shop: 'Cut and crimp from the cut list.',
  fit: 'Drill, string and tension on site.',
  done: 'Done.',
  lost: 'Lost; kept for the record.',
}

const order: readonly Stage[] = ['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done']

/** The stage after this one; none after the last. */
export const stageAfter = (stage: Stage): Stage | undefined =>
  stage === 'lost' ? undefined : order[order.indexOf(stage) + 1]
