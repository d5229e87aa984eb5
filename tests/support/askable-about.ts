import type { Village } from './calendar-api.js';
import type { Askable } from './every-endpoint.js';

/** What every endpoint is asked about one entry of a village: in its calendar, its first version and the next year's draft. */
export function askableAbout(about: {
  village: Village;
  calendarId: string;
  rolledId: string;
  itemId: string;
  feedKey: string;
  openKey: string;
}): Askable {
  const { village, calendarId, rolledId, itemId, feedKey, openKey } = about;
  return {
    only: {
      readRollover: { calendarId: [rolledId] },
      listSeasonTasks: { calendarId: [rolledId] },
      listEntries: { calendarId: [calendarId, rolledId] },
    },
    params: {
      communityId: [village.officer.communityId],
      placeId: [village.placeId],
      calendarId: [calendarId],
      entryId: [itemId],
      number: ['1', 'draft'],
      figureId: [itemId],
      markerKey: ['pleiades'],
      itemType: ['entry'],
      itemId: [itemId],
      groupId: [itemId],
      personId: [village.elder.personId],
      deviceId: ['0'.repeat(64)],
      attachmentId: [itemId],
      part: ['1'],
      withdrawalId: [itemId],
      consentId: [itemId],
      noteId: [itemId],
      cardId: [itemId],
      variantId: [itemId],
    },
    queries: {
      compareVersions: ['?from=1&to=draft'],
      readLongLook: ['?from=2027&years=1&number=1', '?from=2027&years=1&number=draft'],
      readFeed: [`?key=${feedKey}`],
      readOpenPage: [`?key=${openKey}`],
      listAttachments: [`?subjectType=entry&subjectId=${itemId}`],
      listAuditEvents: ['?limit=200'],
      printSheet: ['?layout=month-cards'],
      readSheet: ['?layout=year-board'],
    },
  };
}
