import type { LetterChoiceInput, StillToAsk } from '#shared/contracts/letters.js';
import type { LetterChoiceEntity } from '../../db/entities/letter-choice.entity.js';
import type { LetterEntity } from '../../db/entities/letter.entity.js';
import type { StillWaiting } from './still-waiting.service.js';

/** For whoever has chosen nothing: letters, but not at night. */
export const USUAL_CHOICE: LetterChoiceInput = {
  channel: 'e-mail',
  rhythm: 'each',
  visitMe: false,
  quietHours: { fromHour: 20, toHour: 7 },
  version: 0,
};

export function toLetterChoice(row: LetterChoiceEntity): LetterChoiceInput {
  const { channel, rhythm, visitMe, quietFromHour, quietToHour, version } = row;
  const quietHours =
    quietFromHour === null || quietToHour === null ? null : { fromHour: quietFromHour, toHour: quietToHour };
  return { channel, rhythm, visitMe, quietHours, version };
}

export function fromLetterChoice({ channel, rhythm, visitMe, quietHours }: LetterChoiceInput) {
  return {
    channel,
    rhythm,
    visitMe,
    quietFromHour: quietHours?.fromHour ?? null,
    quietToHour: quietHours?.toHour ?? null,
  };
}

/** `letter` is the newest one about this; null where none was written. */
export function toStillToAsk(
  { version, personId, personName, hasAddress, does }: StillWaiting & { does: StillToAsk['does'] },
  choice: LetterChoiceInput,
  letter: LetterEntity | null,
): StillToAsk {
  return {
    calendarId: version.calendarId,
    placeName: version.calendar.place.name,
    year: version.calendar.year,
    number: version.number,
    personId,
    personName,
    does,
    visitMe: choice.visitMe || !hasAddress,
    letter: letter === null ? 'none' : letterState(letter.state),
    letterAt: letter?.sentAt?.toISOString() ?? null,
  };
}

function letterState(state: LetterEntity['state']): StillToAsk['letter'] {
  if (state === 'sent' || state === 'unsure' || state === 'given-up') return state;
  return state === 'dropped' ? 'none' : 'coming';
}
