import { z } from 'zod'
import {
  cableSchema,
  catalogueCableSchema,
  catalogueFittingSchema,
  catalogueSchema,
  fittingSchema,
  houseRulesSchema,
} from '../schemas/catalogue'
import { keySchema } from '../schemas/id'
import { endpoint } from './endpoint'

const entry = z.object({ key: keySchema })
const retired = z.object({ retired: z.boolean() })

export const hardware = {
  listHardware: endpoint({
    id: 'hardware.list',
    method: 'GET',
    path: '/api/hardware',
    gate: 'hardware:read',
    summary: 'The company’s fittings and cables, retired ones too.',
    response: catalogueSchema,
  }),
  addCable: endpoint({
    id: 'cable.add',
    method: 'POST',
    path: '/api/hardware/cables',
    gate: 'hardware:edit',
    summary: 'Add a cable.',
    body: cableSchema,
    response: catalogueCableSchema,
    status: 201,
  }),
  changeCable: endpoint({
    id: 'cable.change',
    method: 'PUT',
    path: '/api/hardware/cables/:key',
    gate: 'hardware:edit',
    summary: 'Change a cable; its id stays.',
    params: entry,
    body: cableSchema,
    response: catalogueCableSchema,
  }),
  retireCable: endpoint({
    id: 'cable.retire',
    method: 'PATCH',
    path: '/api/hardware/cables/:key',
    gate: 'hardware:edit',
    summary: 'Retire a cable, or offer it again.',
    params: entry,
    body: retired,
    response: catalogueCableSchema,
  }),
  addFitting: endpoint({
    id: 'fitting.add',
    method: 'POST',
    path: '/api/hardware/fittings',
    gate: 'hardware:edit',
    summary: 'Add a fitting.',
    body: fittingSchema,
    response: catalogueFittingSchema,
    status: 201,
  }),
  changeFitting: endpoint({
    id: 'fitting.change',
    method: 'PUT',
    path: '/api/hardware/fittings/:key',
    gate: 'hardware:edit',
    summary: 'Change a fitting; its id stays.',
    params: entry,
    body: fittingSchema,
    response: catalogueFittingSchema,
  }),
  retireFitting: endpoint({
    id: 'fitting.retire',
    method: 'PATCH',
    path: '/api/hardware/fittings/:key',
    gate: 'hardware:edit',
    summary: 'Retire a fitting, or offer it again.',
    params: entry,
    body: retired,
    response: catalogueFittingSchema,
  }),
  readHouseRules: endpoint({
    id: 'house-rules.read',
    method: 'GET',
    path: '/api/house-rules',
    gate: 'house-rules:read',
    summary: 'The company’s house rules.',
    response: houseRulesSchema,
  }),
  changeHouseRules: endpoint({
    id: 'house-rules.change',
    method: 'PUT',
    path: '/api/house-rules',
    gate: 'house-rules:edit',
    summary: 'Change the house rules.',
    body: houseRulesSchema,
    response: houseRulesSchema,
  }),
}
