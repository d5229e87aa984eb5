import { useMutation, useQueryClient } from '@tanstack/react-query';
import { calendarsEndpoints, type CalendarInput } from '#shared/contracts/calendars.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

export function useBeginCalendar(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CalendarInput) =>
      callApi(calendarsEndpoints.create, { params: { communityId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: [...calendarKeys.all, 'list'] }),
  });
}
