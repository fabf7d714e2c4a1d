import type { Catalogue } from '@shared/schemas/catalogue'
import type { Hardware } from '@shared/schemas/hardware'
import type { Survey } from '@shared/schemas/survey'

/** What a survey is calculated with, as on the server: what is offered, and retired cables that its runs still name. */
export function usableHardware({ cables, fittings }: Catalogue, survey: Survey): Hardware {
  const used = new Set(survey.runs.map(({ cable }) => cable))
  return {
    cables: cables.filter(({ retired, cable }) => !retired || used.has(cable.id)).map(({ cable }) => cable),
    fittings: fittings.filter(({ retired }) => !retired).map(({ fitting }) => fitting),
  }
}
