import type { Consent, ConsentContent, ConsentLine } from '#shared/contracts/consents.js';
import type { ConsentEntity } from '../../db/entities/consent.entity.js';
import { isDue, stateOn } from '../../policy/consents.js';
import type { ConsentThing } from './consent-things.service.js';

export interface ConsentFacts {
  row: ConsentEntity;
  thing: ConsentThing;
  isMine: boolean;
  /** The giver's name, a code for their role, or nothing: as far as it is for this person. */
  nameShown: string;
  may: ConsentLine['may'];
  /** Civil day of the village. */
  today: string;
}

/** A line without a word of what is not theirs to read. */
export function toConsentLine({ row, thing, isMine, may, today, nameShown }: ConsentFacts): ConsentLine {
  return {
    id: row.id,
    itemType: row.itemType,
    itemId: row.itemId,
    level: thing.shared.level,
    title: thing.title,
    giverName: may.read ? nameShown : null,
    uses: may.read ? row.uses : null,
    isMine,
    state: stateOn(row, today),
    isDue: isDue(row, today),
    until: row.until,
    reviewBy: row.reviewBy,
    may,
    version: row.version,
  };
}

/** For those who may read it. */
export function toConsent(facts: ConsentFacts, recordedByName: string): Consent {
  const { row, nameShown, thing } = facts;
  const isNamed = nameShown === row.details.giverName;
  // Their own hand may have written it down.
  const wroteIt = row.recordedBy === row.giverId || row.recordedBy === thing.shared.giverId;
  return {
    ...toConsentLine(facts),
    content: { ...contentOf(row), giverName: nameShown, ...(isNamed ? {} : { giverId: null }) },
    recordedByName: isNamed || !wroteIt ? recordedByName : '',
    recordedAt: row.recordedAt.toISOString(),
  };
}

/** As it was last said. What was taken back has no uses left and is answered anew. */
function contentOf({ state, uses, giverId, until, reviewBy, details }: ConsentEntity): ConsentContent {
  const { level: _level, ...said } = details;
  return { ...said, answer: state === 'withdrawn' ? 'refused' : state, uses, giverId, until, reviewBy };
}

/** The columns that hold what was said. */
export function toColumns(
  { answer, uses, giverId, until, reviewBy, ...said }: ConsentContent,
  { shared }: ConsentThing,
): Pick<ConsentEntity, 'state' | 'uses' | 'giverId' | 'until' | 'reviewBy' | 'details'> {
  return { state: answer, uses, giverId, until, reviewBy, details: { ...said, level: shared.level } };
}
