import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  attachmentsEndpoints,
  type Attachment,
  type AttachmentSubject,
  type WordsInput,
} from '#shared/contracts/attachments.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';

const ALL = 'attachments';

/** Recordings and pictures of one thing, as far as the person may see them. */
export function attachmentsQuery(communityId: string, { subjectType, subjectId }: AttachmentSubject) {
  return queryOptions({
    queryKey: [ALL, communityId, subjectType, subjectId],
    queryFn: async ({ signal }) =>
      (
        await callApi(attachmentsEndpoints.list, {
          params: { communityId },
          query: { subjectType, subjectId },
          signal,
        })
      ).items,
  });
}

/** Asks again for what belongs to a thing: something was added. */
export function useLookAgain(): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: [ALL] });
}

export function useRemoveAttachment() {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (attachmentId: string) => callApi(attachmentsEndpoints.remove, { params: { attachmentId } }),
    onSuccess: lookAgain,
  });
}

export function useSaveWords({ id }: Attachment) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (body: WordsInput) =>
      callApi(attachmentsEndpoints.saveWords, { params: { attachmentId: id }, body }),
    onSuccess: lookAgain,
  });
}

/** Address of a part's bytes. */
export function partUrl(attachmentId: string, part: number): string {
  return apiUrl(attachmentsEndpoints.readPart, { params: { attachmentId, part } });
}

export function thumbnailUrl(attachmentId: string): string {
  return apiUrl(attachmentsEndpoints.readThumbnail, { params: { attachmentId } });
}
