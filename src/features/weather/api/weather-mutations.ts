import { useMutation, useQueryClient } from '@tanstack/react-query';
import { weatherEndpoints, type NoticeInput, type RainInput } from '#shared/contracts/weather.js';
import { callApi } from '#src/lib/api-client.js';
import { weatherQuery } from '#src/lib/weather-query.js';

/** Notices and rain: written down, and taken out again. */
export function useWeather(communityId: string) {
  const client = useQueryClient();
  const onSuccess = () => client.invalidateQueries({ queryKey: weatherQuery(communityId).queryKey });
  const params = { communityId };
  const addNotice = useMutation({
    mutationFn: (body: NoticeInput) => callApi(weatherEndpoints.addNotice, { params, body }),
    onSuccess,
  });
  const removeNotice = useMutation({
    mutationFn: (noticeId: string) =>
      callApi(weatherEndpoints.removeNotice, { params: { ...params, noticeId } }),
    onSuccess,
  });
  const addRain = useMutation({
    mutationFn: (body: RainInput) => callApi(weatherEndpoints.addRain, { params, body }),
    onSuccess,
  });
  const removeRain = useMutation({
    mutationFn: (rainId: string) => callApi(weatherEndpoints.removeRain, { params: { ...params, rainId } }),
    onSuccess,
  });
  return { addNotice, removeNotice, addRain, removeRain };
}
