import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { attachmentsEndpoints } from '#shared/contracts/attachments.js';
import {
  consentsEndpoints,
  type Consent,
  type ConsentContent,
  type ConsentItemType,
  type ConsentLine,
} from '#shared/contracts/consents.js';
import { fillPath } from '#shared/contracts/endpoint.js';
import { callApi } from '#src/lib/api-client.js';
import { uploadToApi } from '#src/lib/api-upload.js';

export interface ThingRef {
  communityId: string;
  itemType: ConsentItemType;
  itemId: string;
}

export function consentsQuery(communityId: string) {
  return queryOptions({
    queryKey: ['consents', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(consentsEndpoints.list, { params: { communityId }, signal })).items,
  });
}

export function itemConsentsQuery({ communityId, itemType, itemId }: ThingRef) {
  return queryOptions({
    queryKey: ['consents', communityId, itemType, itemId],
    queryFn: ({ signal }) =>
      callApi(consentsEndpoints.ofItem, { params: { communityId, itemType, itemId }, signal }),
  });
}

/** Recordings and pictures that may prove a consent. */
export function proofsQuery(communityId: string, consentId: string) {
  return queryOptions({
    queryKey: ['attachments', communityId, 'consent', consentId],
    queryFn: async ({ signal }) =>
      (
        await callApi(attachmentsEndpoints.list, {
          params: { communityId },
          query: { subjectType: 'consent', subjectId: consentId },
          signal,
        })
      ).items,
  });
}

/** Written anew, or over the consent that was there. */
export function useSaveConsent({ communityId, itemType, itemId }: ThingRef) {
  return useMutation({
    mutationFn: ({
      content,
      over,
      clip,
    }: {
      content: ConsentContent;
      over: Pick<Consent, 'id' | 'version'> | null;
      /** Their voice, as the proof: it is sent with the words, or neither is kept. */
      clip: Blob | null;
    }) => {
      if (clip !== null) {
        const { proof: _clip, ...said } = content;
        return over === null
          ? uploadToApi(consentsEndpoints.addSpoken, {
              params: { communityId },
              body: { ...said, itemType, itemId },
              file: clip,
            })
          : uploadToApi(consentsEndpoints.changeSpoken, {
              params: { communityId, consentId: over.id },
              body: { content: said, version: over.version },
              file: clip,
            });
      }
      return over === null
        ? callApi(consentsEndpoints.add, {
            params: { communityId },
            body: { ...content, itemType, itemId },
          })
        : callApi(consentsEndpoints.change, {
            params: { communityId, consentId: over.id },
            body: { content, version: over.version },
          });
    },
    onSuccess: useForgetWhatItChanges(),
  });
}

export function useWithdrawConsent(communityId: string) {
  return useMutation({
    mutationFn: ({ id, version }: ConsentLine) =>
      callApi(consentsEndpoints.withdraw, { params: { communityId, consentId: id }, body: { version } }),
    onSuccess: useForgetWhatItChanges(),
  });
}

export function consentCardUrl(communityId: string, consentId: string): string {
  return fillPath(consentsEndpoints.card.path, { communityId, consentId });
}

/** What is agreed decides what is shown anywhere, so everything but the session is asked for again. */
function useForgetWhatItChanges() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
}
