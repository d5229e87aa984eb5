import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  seasonReviewsEndpoints as at,
  type DecisionInput,
  type LessonInput,
} from '#shared/contracts/season-reviews.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

export function seasonReviewQuery(calendarId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'season-review'],
    queryFn: ({ signal }) => callApi(at.read, { params: { calendarId }, signal }),
  });
}

/** What the year before decided for this draft. */
export function seasonTasksQuery(calendarId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'season-tasks'],
    queryFn: async ({ signal }) => (await callApi(at.listTasks, { params: { calendarId }, signal })).items,
  });
}

/** What is said and decided about a year. Its tasks stand in another calendar, so all of them look again. */
export function useSeasonWords(calendarId: string) {
  const client = useQueryClient();
  const onSettled = () => client.invalidateQueries({ queryKey: calendarKeys.all });
  const addLesson = useMutation({
    mutationFn: (body: LessonInput) => callApi(at.addLesson, { params: { calendarId }, body }),
    onSettled,
  });
  const removeLesson = useMutation({
    mutationFn: (lessonId: string) => callApi(at.removeLesson, { params: { calendarId, lessonId } }),
    onSettled,
  });
  const decide = useMutation({
    mutationFn: (body: DecisionInput) => callApi(at.decide, { params: { calendarId }, body }),
    onSettled,
  });
  const removeDecision = useMutation({
    mutationFn: (decisionId: string) => callApi(at.removeDecision, { params: { calendarId, decisionId } }),
    onSettled,
  });
  return { addLesson, removeLesson, decide, removeDecision };
}

/** Ticks a task off, or takes the tick off again. */
export function useTick(calendarId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ taskId, isDone }: { taskId: string; isDone: boolean }) =>
      callApi(isDone ? at.tick : at.untick, { params: { calendarId, taskId } }),
    onSettled: () => client.invalidateQueries({ queryKey: calendarKeys.all }),
  });
}
