import { createAppointmentRequest, endAppointmentRequest } from '@/shared/contracts/appointments';

import { callerOf, itemParams, shopParams } from '../http/params';
import { ok, signedInRoute, stored, type Route } from '../http/route';
import type { AppointmentsService } from './appointments-service';

const path = '/shops/:shopId/appointments';

export const appointmentsRoutes = (service: AppointmentsService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    act: async (input) => ok(await service.list(callerOf(input))),
  }),
  signedInRoute({
    method: 'post',
    path,
    params: shopParams,
    body: createAppointmentRequest,
    act: async (input) => stored(await service.create(callerOf(input), input.body)),
  }),
  signedInRoute({
    method: 'post',
    path: `${path}/:id/end`,
    params: itemParams,
    body: endAppointmentRequest,
    act: async (input) => ok(await service.end(callerOf(input), input.params.id, input.body)),
  }),
];
