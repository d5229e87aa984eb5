import { describe, expect, it } from 'vitest';
import { narrowedConsent } from '#server/policy/consents-of-years.js';
import { mayUse, shownUntil, type ConsentFact } from '#server/policy/consents.js';
import { CONSENT_USES, type ConsentUse } from '#shared/contracts/consents.js';

const VILLAGE: ConsentUse[] = ['keep', 'show', 'print', 'recording', 'feed', 'message'];
const fact = (
  state: ConsentFact['state'],
  uses: ConsentUse[] = [],
  until: string | null = null,
): ConsentFact => ({
  ...{ state, uses, until, reviewBy: '2029-01-01' },
});
const SOME: (ConsentFact | null)[] = [
  null,
  fact('asked'),
  fact('not-now'),
  fact('refused'),
  fact('withdrawn'),
  fact('given', ['keep', 'show', 'print']),
  fact('given', ['keep']),
  fact('given', [...CONSENT_USES]),
  fact('given', VILLAGE, '2027-06-01'),
  fact('given-with-conditions', ['keep', 'show', 'radio'], '2026-01-01'),
];

describe('an answer about the same thing in another year', () => {
  it('is never made wider, whatever is said', () => {
    for (const kind of ['farm', 'belief'] as const) {
      for (const known of SOME) {
        for (const said of SOME) {
          if (said === null) continue;
          const narrowed = narrowedConsent(known, said, kind);
          if (narrowed === null) continue;
          for (const use of CONSENT_USES) {
            const before = mayUse(known === null ? [] : [known], use, kind, '2027-01-01');
            if (!before) expect(mayUse([narrowed], use, kind, '2027-01-01')).toBe(false);
          }
        }
      }
    }
  });

  it('is a no where a no was said, an end where one was set, and fewer uses where fewer were ticked', () => {
    const yes = fact('given', ['keep', 'show', 'print', 'radio']);
    expect(narrowedConsent(yes, fact('withdrawn'), 'farm')).toMatchObject({ state: 'withdrawn', uses: [] });
    expect(narrowedConsent(yes, fact('given', ['keep', 'show']), 'farm')?.uses).toEqual(['keep', 'show']);
    const ended = narrowedConsent(yes, fact('given', [...CONSENT_USES], '2027-12-31'), 'farm');
    expect(shownUntil(ended ? [ended] : [])).toBe('2027-12-31');
    expect(narrowedConsent(yes, fact('not-now'), 'farm')?.uses).toEqual(['keep', 'show']);
  });

  it('stays where nothing narrower was said, and where nobody was asked and the village goes on as before', () => {
    const yes = fact('given', ['keep', 'show']);
    expect(narrowedConsent(yes, fact('given', [...CONSENT_USES]), 'farm')).toBeNull();
    expect(narrowedConsent(fact('refused'), fact('given', [...CONSENT_USES]), 'farm')).toBeNull();
    expect(narrowedConsent(null, fact('given', [...CONSENT_USES]), 'farm')).toBeNull();
    expect(narrowedConsent(null, fact('asked'), 'farm')).toBeNull();
    expect(narrowedConsent(null, fact('given', ['keep']), 'farm')?.uses).toEqual(['keep']);
  });
});
