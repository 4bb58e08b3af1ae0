import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

import { request, STALE } from '@/features/transport';
import {
  appointment,
  appointmentList,
  type CreateAppointmentRequest,
} from '@/shared/contracts/appointments';

const at = (shopId: string) => `/api/shops/${shopId}/appointments`;

export const appointmentQueries = {
  list: (shopId: string) =>
    queryOptions({
      queryKey: ['appointments', shopId],
      queryFn: ({ signal }) => request(appointmentList, at(shopId), { signal }),
      staleTime: STALE.short,
    }),
};

// Which steps of a wheel's life a person may take hangs on it: whatever was fetched of the shop is old then.
const ofShop = (shopId: string) => ({
  predicate: ({ queryKey }: { queryKey: readonly unknown[] }) => queryKey[1] === shopId,
});

export function useAppoint(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateAppointmentRequest) =>
      request(appointment, at(shopId), { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries(ofShop(shopId)),
  });
}

/** Ends an appointment now, whatever its last day was to be. */
export function useEndAppointment(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      request(appointment, `${at(shopId)}/${id}/end`, { method: 'POST', body: { version } }),
    onSettled: () => client.invalidateQueries(ofShop(shopId)),
  });
}
