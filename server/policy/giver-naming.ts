import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { EventRecord } from '#shared/contracts/event-record.js';
import type { Shared } from './policy.js';
import type { Viewer } from './viewer.js';

interface Given {
  giver: string;
  giverId?: string | null | undefined;
  record?: EventRecord | undefined;
}

/** A content without its giver's name: also where the record says that the giver vouches for it. */
export function withoutGiver<C extends Given>(content: C, giver = ''): C {
  const { record } = content;
  if (record === undefined || content.giver === '' || record.trust.by !== content.giver) {
    return { ...content, giver };
  }
  return { ...content, giver, record: { ...record, trust: { ...record.trust, by: '' } } };
}

/** Is the giver's name kept from this person? Givers read their own; for all others their wish holds as it is today. */
export function hidesGiver(viewer: Viewer, shared: Shared | undefined): boolean {
  if (shared === undefined || shared.details.naming === 'named') return false;
  return shared.giverId !== viewer.personId;
}

/** How somebody reads of a giver: by the name, by a code for their role, or not at all. */
export function givenName(viewer: Viewer, shared: Shared | undefined, name: string): string {
  if (shared === undefined || name === '' || !hidesGiver(viewer, shared)) return name;
  return shared.details.naming === 'role' ? GIVER_BY_ROLE : '';
}

/** Nobody in particular: whoever looks at a wall. */
export function anybody(viewer: Viewer): Viewer {
  return { ...viewer, personId: '' };
}

/** A content with its giver named as they wish: by name, as somebody of their role, or not at all. */
export function withNaming<C extends Given>(viewer: Viewer, shared: Shared | undefined, content: C): C {
  if (shared === undefined || !hidesGiver(viewer, shared)) return content;
  return {
    ...withoutGiver(content, givenName(viewer, shared, content.giver)),
    ...(content.giverId === undefined ? {} : { giverId: null }),
  };
}

/** What somebody writes over a content whose giver was kept from them: the giver stays as they are. */
export function withKeptGiver<C extends Given>(
  viewer: Viewer,
  shared: Shared | undefined,
  stored: C,
  written: C,
): C {
  if (!hidesGiver(viewer, shared)) return written;
  const { giverId: _written, ...rest } = written;
  const kept = stored.giverId === undefined ? {} : { giverId: stored.giverId };
  return { ...rest, giver: stored.giver, ...kept, ...keptRecord(stored, written) } as C;
}

function keptRecord(stored: Given, { record }: Given): Pick<Given, 'record'> {
  const hidden = stored.record?.trust.by;
  if (record?.trust.by !== '' || hidden === undefined || hidden !== stored.giver) return {};
  return { record: { ...record, trust: { ...record.trust, by: hidden } } };
}
