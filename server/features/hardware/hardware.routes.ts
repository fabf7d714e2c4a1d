import type { Router } from 'express'
import { hardware } from '@shared/endpoints/hardware'
import { route } from '../../http/route'
import type { Services } from '../../services'
import {
  addCable,
  addFitting,
  changeCable,
  changeFitting,
  type HardwareScope,
  listHardware,
  retireCable,
  retireFitting,
} from './hardware.service'

export function hardwareRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const scope = ({ companyId }: { companyId: string }): HardwareScope => ({
    database: services.database,
    companyId,
  })
  route(at, hardware.listHardware, (call) => listHardware(scope(call)))
  route(at, hardware.addCable, (call) => addCable(scope(call), call.body))
  route(at, hardware.changeCable, (call) => changeCable(scope(call), call.params.key, call.body))
  route(at, hardware.retireCable, (call) => retireCable(scope(call), call.params.key, call.body.retired))
  route(at, hardware.addFitting, (call) => addFitting(scope(call), call.body))
  route(at, hardware.changeFitting, (call) => changeFitting(scope(call), call.params.key, call.body))
  route(at, hardware.retireFitting, (call) => retireFitting(scope(call), call.params.key, call.body.retired))
}
