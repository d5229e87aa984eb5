import { z } from 'zod';
import { id, instant, isoDate, line, listOf, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';

export const NOTICES_MAX = 20;
/** A notice of the weather service says how long it holds; none holds for longer than a season. */
export const NOTICE_DAYS_MAX = 200;
/** Days of rain that stand in the short list. */
export const RAIN_DAYS_SHOWN = 60;
export const RAIN_MM_MAX = 2000;

/** What the weather service told, in its words: who issued it, on which day, and until when it holds. */
export const noticeInput = z
  .strictObject({
    text: text(1000).refine((words) => words !== '', 'required'),
    issuer: line(120, 1),
    issuedOn: z.iso.date('date-form'),
    expiresOn: z.iso.date('date-form'),
  })
  .superRefine(({ issuedOn, expiresOn }, context) => {
    if (expiresOn < issuedOn) {
      context.addIssue({ code: 'custom', path: ['expiresOn'], message: 'before-issued' });
    }
  });
export type NoticeInput = z.infer<typeof noticeInput>;

export const notice = z.strictObject({
  id,
  text: z.string(),
  issuer: z.string(),
  issuedOn: isoDate,
  expiresOn: isoDate,
  writtenBy: z.string(),
  writtenAt: instant,
});
export type Notice = z.infer<typeof notice>;

/** Rain of one day: measured, or in words where nobody measures. */
export const rainInput = z
  .strictObject({
    day: z.iso.date('date-form'),
    mm: z.number('not-a-number').min(0, 'rain-range').max(RAIN_MM_MAX, 'rain-range').nullable(),
    words: line(120),
  })
  .superRefine(({ mm, words }, context) => {
    if (mm === null && words === '') context.addIssue({ code: 'custom', path: ['mm'], message: 'rain-said' });
  });
export type RainInput = z.infer<typeof rainInput>;

export const rainDay = z.strictObject({
  id,
  day: isoDate,
  mm: z.number().nullable(),
  words: z.string(),
  writtenBy: z.string(),
  /** Theirs to take out: whoever wrote it, and officers. */
  mine: z.boolean(),
});
export type RainDay = z.infer<typeof rainDay>;

/** What holds today, and the rain of the last weeks. */
export const weather = z.strictObject({
  today: isoDate,
  notices: z.array(notice),
  rain: z.array(rainDay),
});
export type Weather = z.infer<typeof weather>;

const communityParams = z.strictObject({ communityId: id });

export const weatherEndpoints = {
  read: defineEndpoint({
    id: 'readWeather',
    method: 'GET',
    path: '/api/communities/:communityId/weather',
    summary: 'Notices of the weather service that hold today, and the rain of the last days, newest first',
    access: member('community', ...ROLES),
    params: communityParams,
    response: weather,
  }),
  listNotices: defineEndpoint({
    id: 'listNotices',
    method: 'GET',
    path: '/api/communities/:communityId/weather/notices',
    summary: 'Every notice that was written down, also those that hold no more, newest first',
    access: member('community', 'officer', 'steward', 'elder'),
    params: communityParams,
    response: listOf(notice),
  }),
  addNotice: defineEndpoint({
    id: 'addNotice',
    method: 'POST',
    path: '/api/communities/:communityId/weather/notices',
    summary: 'Write down a notice of the weather service: it stands above farm work until it expires',
    access: member('community', 'officer', 'steward'),
    params: communityParams,
    body: noticeInput,
    response: notice,
    status: 201,
  }),
  removeNotice: defineEndpoint({
    id: 'removeNotice',
    method: 'DELETE',
    path: '/api/communities/:communityId/weather/notices/:noticeId',
    summary: 'Take a notice down for good',
    access: member('community', 'officer', 'steward'),
    params: z.strictObject({ communityId: id, noticeId: id }),
  }),
  addRain: defineEndpoint({
    id: 'addRain',
    method: 'POST',
    path: '/api/communities/:communityId/weather/rain',
    summary: 'Write down the rain of a day, in millimetres or in words',
    access: member('community', ...ROLES),
    params: communityParams,
    body: rainInput,
    response: rainDay,
    status: 201,
  }),
  removeRain: defineEndpoint({
    id: 'removeRain',
    method: 'DELETE',
    path: '/api/communities/:communityId/weather/rain/:rainId',
    summary: 'Take the rain of a day out again: whoever wrote it, or an officer',
    access: member('community', ...ROLES),
    params: z.strictObject({ communityId: id, rainId: id }),
  }),
} as const;
