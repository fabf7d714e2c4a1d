import type { Stage } from '@shared/schemas/job'
import type { Role } from '@shared/permissions/roles'

/** The demo company and everybody in it are invented. */
export const demoCompany = {
  name: 'Quillmere Rail & Deck',
  units: { length: 'in', force: 'lbf' },
  fraction: 16,
} as const

export interface DemoPerson {
  name: string
  email: string
  roles: Role[]
  password: string
}

/** Four people for five roles; whoever starts the server is told how to sign in as each. */
export const demoSignIns: DemoPerson[] = [
  { name: 'Odile Farrant', email: 'odile@quillmere.example', roles: ['owner'], password: 'harbour-gull-41' },
  {
    name: 'Imre Vasko',
    email: 'imre@quillmere.example',
    roles: ['surveyor', 'fitter'],
    password: 'muddy-boots-17',
  },
  {
    name: 'Tamsin Okoro',
    email: 'tamsin@quillmere.example',
    roles: ['estimator'],
    password: 'paper-kite-82',
  },
  { name: 'Rune Aldersey', email: 'rune@quillmere.example', roles: ['shop'], password: 'copper-bench-29' },
]

export type DemoPicture = 'harbour-deck' | 'mill-stair' | 'ridge-deck'

export interface DemoJob {
  title: string
  customer: string
  site: string
  stage: Stage
  /** Days from the day of the seed. */
  dueIn: number | null
  /** E-mail address of the person it is with. */
  with: string
  notes: string
  survey?: { title: string; picture: DemoPicture }
}

const odile = 'odile@quillmere.example'
const imre = 'imre@quillmere.example'
const tamsin = 'tamsin@quillmere.example'
const rune = 'rune@quillmere.example'

/** The oldest first. */
export const demoJobs: DemoJob[] = [
  {
    title: 'Pellworth, balcony over the yard',
    customer: 'Aurel Pellworth',
    site: '3 Cooper’s Rise, Quillmere',
    stage: 'done',
    dueIn: -40,
    with: imre,
    notes: 'Tensioned and looked over with the customer; copy of the tension sheet left with them.',
  },
  {
    title: 'Sandgate boathouse, upper landing',
    customer: 'Sandgate Rowing Circle',
    site: 'Boathouse, Lower Quay, Sandgate',
    stage: 'lost',
    dueIn: null,
    with: tamsin,
    notes: 'They stay with wooden balusters.',
  },
  {
    title: 'Dunmarrow, roof terrace',
    customer: 'Ilse Dunmarrow',
    site: '18 Lantern Street, Quillmere',
    stage: 'fit',
    dueIn: 3,
    with: imre,
    notes: 'Key with the neighbour. Bring the long ladder.',
  },
  {
    title: 'Brackwater, porch and steps',
    customer: 'Joss Brackwater',
    site: '27 Weir Path, Quillmere',
    stage: 'agreed',
    dueIn: 21,
    with: tamsin,
    notes: '',
  },
  {
    title: 'Holloway, harbour deck',
    customer: 'Maren Holloway',
    site: '5 Harbour Row, Sandgate',
    stage: 'shop',
    dueIn: 9,
    with: rune,
    notes: 'L-shaped deck on the water side, 2x6 cap rail in place.',
    survey: { title: 'Harbour deck', picture: 'harbour-deck' },
  },
  {
    title: 'Old mill, deck and stair',
    customer: 'Weir Path Housing Circle',
    site: 'The Old Mill, Weir Path, Quillmere',
    stage: 'price',
    dueIn: 14,
    with: tamsin,
    notes: 'Hardwood posts are in; they want the stair before the season.',
    survey: { title: 'Deck edge and stair', picture: 'mill-stair' },
  },
  {
    title: 'Ostrander, ridge deck',
    customer: 'Pim Ostrander',
    site: '61 Ridge Road, Upper Quillmere',
    stage: 'measure',
    dueIn: 6,
    with: imre,
    notes: 'Rain stopped the visit at the fifth post; go back for the rest.',
    survey: { title: 'Long front', picture: 'ridge-deck' },
  },
  {
    title: 'Tollgate inn, garden steps',
    customer: 'Tollgate Inn',
    site: '1 Tollgate, Quillmere',
    stage: 'measure',
    dueIn: 12,
    with: imre,
    notes: 'First visit agreed; ask for the gate code.',
  },
  {
    title: 'Averill, mezzanine',
    customer: 'Bo Averill',
    site: '9 Sailmaker’s Yard, Sandgate',
    stage: 'check',
    dueIn: 18,
    with: odile,
    notes: 'Indoors: steel posts, ask the customer for the drawings.',
  },
]
