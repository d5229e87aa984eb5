import type { Consent, ConsentContent, ConsentItemType } from '#shared/contracts/consents.js';
import type { Client } from './api.js';

/** An answer as an officer writes it down, with a witness; nothing but what is said here is ticked. */
export function consentContent(changes: Partial<ConsentContent> = {}): ConsentContent {
  return {
    answer: 'given',
    givenAs: 'person',
    giverId: null,
    giverName: 'Old Marrun',
    spokeFor: '',
    askedOn: '2026-12-01',
    askedWhere: 'Upper terraces',
    language: 'en',
    askedHow: ['spoken'],
    explainedBy: 'Officer',
    explanation: '1',
    proof: { kind: 'witness', witness: 'Tirel', attachmentId: null },
    uses: ['keep', 'show'],
    naming: 'named',
    conditions: '',
    benefits: '',
    until: null,
    reviewBy: '2027-12-01',
    afterDeath: null,
    passTo: '',
    mayWithdraw: [],
    ...changes,
  };
}

/** Somebody was asked, and nothing more. */
export function asked(changes: Partial<ConsentContent> = {}): ConsentContent {
  return consentContent({ answer: 'asked', proof: null, uses: [], naming: null, ...changes });
}

/** What is sent together with a clip, which is its proof. */
export function spokenContent(changes: Partial<ConsentContent> = {}): Omit<ConsentContent, 'proof'> {
  const { proof: _clip, ...said } = asked(changes);
  return said;
}

export function consentsPath({ communityId }: Client, consentId = '', rest = ''): string {
  return `/api/communities/${communityId}/consents${consentId === '' ? '' : `/${consentId}`}${rest}`;
}

export async function addConsent(
  client: Client,
  itemType: ConsentItemType,
  itemId: string,
  changes: Partial<ConsentContent> = {},
): Promise<Consent> {
  const body = { ...consentContent(changes), itemType, itemId };
  return (await client.post(consentsPath(client), body).expect(201)).body as Consent;
}
