import type { Role } from '../schemas/role'

export { type Role, roles, roleSchema } from '../schemas/role'

/** One sentence on each role, as shown where roles are given. */
export const roleMeanings: Record<Role, string> = {
  owner: 'Sets the company, its people, hardware and house rules, and sees everything.',
  surveyor: 'Measures on site: photos, posts, bays and readings.',
  estimator: 'Prices the survey, agrees it with the customer and moves the job on.',
  shop: 'Cuts and crimps from the cut list.',
  fitter: 'Drills, strings and tensions on site.',
}
