import type { ConsentContent } from '#shared/contracts/consents.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { ConsentEntity } from '../../db/entities/consent.entity.js';
import { invalidField } from '../../http/app-error.js';
import { givenName, hidesGiver } from '../../policy/giver-naming.js';
import type { Viewer } from '../../policy/viewer.js';
import type { ConsentThing } from './consent-things.service.js';

/** Whom to ask is known to the giver, and to the steward who keeps the register; to all others as the giver wishes. */
export function asksByName(viewer: Viewer, { shared }: ConsentThing): boolean {
  return viewer.roles.includes('steward') || !hidesGiver(viewer, shared);
}

type Row = Pick<ConsentEntity, 'giverId' | 'recordedBy' | 'details'>;

/** Whoever was asked reads their own name, and whoever wrote it down what they wrote. */
export function consentName(viewer: Viewer, row: Row, thing: ConsentThing): string {
  const { giverName } = row.details;
  const knows = row.giverId === viewer.personId || row.recordedBy === viewer.personId;
  return knows || asksByName(viewer, thing) ? giverName : givenName(viewer, thing.shared, giverName);
}

/** Somebody who writes down a new answer without having been told the name leaves it as it is. */
export function withKeptName(
  viewer: Viewer,
  row: Row,
  thing: ConsentThing,
  content: ConsentContent,
): ConsentContent {
  const { giverName } = row.details;
  if (consentName(viewer, row, thing) !== giverName) {
    return { ...content, giverName, giverId: row.giverId };
  }
  const isTakenOff = giverName === '' && content.giverName === '';
  if (!isTakenOff && (content.giverName === '' || content.giverName === GIVER_BY_ROLE)) {
    throw invalidField('content.giverName', 'required');
  }
  return isTakenOff ? { ...content, giverId: row.giverId } : content;
}
