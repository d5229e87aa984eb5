import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { meetingsEndpoints, type MeetingInput } from '#shared/contracts/meetings.js';
import { reviewsEndpoints, type AnswerInput, type SpokenAnswerInput } from '#shared/contracts/reviews.js';
import { callApi } from '#src/lib/api-client.js';
import { uploadToApi } from '#src/lib/api-upload.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

export interface VersionRef {
  calendarId: string;
  number: number;
}

const paramsOf = ({ calendarId, number }: VersionRef) => ({ calendarId, number: String(number) });

/** What was said to its entries, and how far each elder is. */
export function answersQuery({ calendarId, number }: VersionRef) {
  return queryOptions({
    queryKey: calendarKeys.answers(calendarId, number),
    queryFn: ({ signal }) =>
      callApi(reviewsEndpoints.listAnswers, { params: paramsOf({ calendarId, number }), signal }),
  });
}

export function usePutAnswer(ref: VersionRef) {
  return useMutation({
    mutationFn: ({ entryId, ...body }: AnswerInput & { entryId: string }) =>
      callApi(reviewsEndpoints.putAnswer, { params: { ...paramsOf(ref), entryId }, body }),
    onSettled: useLookAgain(ref),
  });
}

/** With the elder's voice, which proves it. */
export function usePutSpokenAnswer(ref: VersionRef) {
  return useMutation({
    mutationFn: ({ entryId, clip, ...body }: SpokenAnswerInput & { entryId: string; clip: Blob }) =>
      uploadToApi(reviewsEndpoints.putSpokenAnswer, {
        params: { ...paramsOf(ref), entryId },
        body,
        file: clip,
      }),
    onSettled: useLookAgain(ref),
  });
}

/** All of a paper's answers with its picture. */
export function useTypeMeeting(ref: VersionRef) {
  return useMutation({
    mutationFn: ({ body, picture }: { body: MeetingInput; picture: Blob }) =>
      uploadToApi(meetingsEndpoints.type, { params: paramsOf(ref), body, file: picture }),
    onSettled: useLookAgain(ref),
  });
}

export function useTakeBackAnswer(ref: VersionRef) {
  return useMutation({
    mutationFn: (entryId: string) =>
      callApi(reviewsEndpoints.takeBackAnswer, { params: { ...paramsOf(ref), entryId } }),
    onSettled: useLookAgain(ref),
  });
}

export function useLetStand(ref: VersionRef) {
  return useMutation({
    mutationFn: (entryId: string) =>
      callApi(reviewsEndpoints.letStand, { params: { ...paramsOf(ref), entryId } }),
    onSettled: useLookAgain(ref),
  });
}

export function useSign(ref: VersionRef) {
  return useMutation({
    mutationFn: (role: 'elder' | 'steward') =>
      callApi(reviewsEndpoints.sign, { params: paramsOf(ref), body: { role } }),
    onSettled: useLookAgain(ref),
  });
}

/** An answer changes gaps and progress; a signature can change the state and unlock a button elsewhere. */
function useLookAgain({ calendarId }: VersionRef) {
  const client = useQueryClient();
  return () =>
    Promise.all([
      client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) }),
      client.invalidateQueries({ queryKey: ['today'] }),
    ]);
}
