import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { sessionEndpoints } from '#shared/contracts/session.js';
import { callApi } from '#src/lib/api-client.js';

export const devicesQuery = queryOptions({
  queryKey: ['devices'],
  queryFn: async ({ signal }) => (await callApi(sessionEndpoints.listDevices, { signal })).items,
});

export function useEndDevice() {
  return useMutation({
    mutationFn: (deviceId: string) => callApi(sessionEndpoints.endDevice, { params: { deviceId } }),
    onSettled: useRefreshDevices(),
  });
}

export function useEndOtherDevices() {
  return useMutation({
    mutationFn: () => callApi(sessionEndpoints.endOtherDevices, {}),
    onSettled: useRefreshDevices(),
  });
}

function useRefreshDevices() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: devicesQuery.queryKey });
}
