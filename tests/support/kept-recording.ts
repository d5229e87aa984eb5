import { randomUUID } from 'node:crypto';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import type { KeptRecording } from '#src/features/attachments/model/kept-recordings.js';

/** A recording as it lies on a device before it is sent. */
export function keptRecording(changes: Partial<KeptRecording> = {}): KeptRecording {
  return {
    clientId: randomUUID(),
    personId: 'elder',
    communityId: '0190a3a0-0000-7000-8000-0000000000a1',
    subjectType: 'figure',
    subjectId: 'a figure',
    title: '',
    speaker: 'A-2',
    language: 'art-x-tazimel',
    sharingLevel: 'elders',
    sharing: PLAIN_DETAILS,
    giverId: null,
    mimeType: 'audio/webm',
    beganAt: '2027-03-10T06:00:00.000Z',
    ...changes,
  };
}
