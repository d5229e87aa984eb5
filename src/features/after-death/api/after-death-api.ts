import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { afterDeathEndpoints, type DeathInput, type HeirInput } from '#shared/contracts/after-death.js';
import { callApi } from '#src/lib/api-client.js';

/** Somebody of a village. */
export interface Whom {
  communityId: string;
  personId: string;
}

export function afterDeathQuery({ communityId, personId }: Whom) {
  return queryOptions({
    queryKey: ['after-death', communityId, personId],
    queryFn: ({ signal }) => callApi(afterDeathEndpoints.read, { params: { communityId, personId }, signal }),
  });
}

export function useNoteDeath(whom: Whom) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (body: DeathInput) => callApi(afterDeathEndpoints.note, { params: { ...whom }, body }),
    onSuccess: lookAgain,
  });
}

export function useNameHeir(whom: Whom) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (body: HeirInput) => callApi(afterDeathEndpoints.nameHeir, { params: { ...whom }, body }),
    onSuccess: lookAgain,
  });
}

export function useUndoDeath(whom: Whom) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: () => callApi(afterDeathEndpoints.undo, { params: { ...whom } }),
    onSuccess: lookAgain,
  });
}

/** What they gave stands everywhere. */
function useLookAgain(): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries();
}
