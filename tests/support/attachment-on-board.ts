import type { Attachment } from '#shared/contracts/attachments.js';
import { OFFICER } from './on-board.js';

/** A recording as the server would answer it, for tests of screens. */
export function attachmentOf(changes: Partial<Attachment> = {}): Attachment {
  return {
    id: '0190a3a0-0000-7000-8000-0000000000d1',
    communityId: OFFICER.memberships?.[0]?.communityId ?? '',
    clientId: '0190a3a0-0000-4000-8000-0000000000d2',
    kind: 'recording',
    subjectType: 'figure',
    subjectId: '0190a3a0-0000-7000-8000-0000000000f1',
    title: 'Why the bowl is empty',
    speaker: 'A-2',
    naming: 'named',
    language: 'art-x-tazimel',
    consent: 'clip',
    sharingLevel: 'village',
    addedBy: 'Elder A-2',
    addedAt: '2027-03-10T06:00:00.000Z',
    parts: [
      { part: 0, contentType: 'audio/webm', bytes: 900, seconds: null },
      { part: 1, contentType: 'audio/webm', bytes: 9000, seconds: 65 },
    ],
    picture: null,
    words: [],
    hasWordsAlone: false,
    may: { writeWords: true, remove: false },
    ...changes,
  };
}
