import type { Finding } from '../schemas/finding'
import type { Length } from '../units/length'
import type { ReadingThatMatters } from './reading-that-matters'

/** Why a cable has no length. */
export type WhyNone = 'missing-reading' | 'no-fitting' | 'too-long'

interface CableName {
  run: string
  /** From 1, the lowest. */
  cable: number
  /** Of the hole's centre, nm. */
  height: number
}

interface Cut {
  /** D, from end face to end face. */
  path: number
  /** Fitting ids. */
  from: string
  to: string
  cut: Length
  planned: number
  worst: number
  limit: number
  longest: number
  why?: undefined
}

/** A cable crimped at both ends in the shop. Lengths in nm, unrounded but for `cut`. */
export interface ShopCable extends CableName, Cut {
  mode: 'shop'
  slack: number
  /** U */
  u: number
  finish?: undefined
}

/** A cable crimped at one end in the shop and finished on site, where its bare length is to be `finish`. */
export interface SiteCable extends CableName, Cut {
  mode: 'site'
  finish: number
  /** Us */
  u: number
  slack?: undefined
}

/** A cable that cannot be cut, with what is known of it. */
export interface NoCable extends CableName {
  mode: 'none'
  why: WhyNone
  path?: number
  from?: string
  to?: string
  limit?: number
  longest?: number
  cut?: undefined
  finish?: undefined
  slack?: undefined
  u?: undefined
  planned?: undefined
  worst?: undefined
}

export type CableResult = ShopCable | SiteCable | NoCable

export interface RunResult {
  run: string
  /** Id in the catalogue. */
  cable: string
  /** Newtons. */
  tension: number
  /** End posts, in the run's direction; empty for a run that names what is not there. */
  fromPost: string
  toPost: string
  /** From the lowest up. */
  cables: CableResult[]
  /** For a run that is *site* only because its slop is too big. */
  readingThatMatters?: ReadingThatMatters
}

/** What `calculateSurvey` answers. */
export interface SurveyResult {
  runs: RunResult[]
  /** The cables of all runs, in the survey's order. */
  cables: CableResult[]
  findings: Finding[]
}
