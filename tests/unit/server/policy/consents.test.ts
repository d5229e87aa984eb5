import { describe, expect, it } from 'vitest';
import { isDue, mayUse, missingYes, shownUntil, stateOn, type ConsentFact } from '#server/policy/consents.js';
import { CONSENT_USES } from '#shared/contracts/consents.js';

const DAY = '2027-06-10';

function fact(changes: Partial<ConsentFact> = {}): ConsentFact {
  return { state: 'given', uses: ['keep', 'show'], until: null, reviewBy: '2028-01-01', ...changes };
}

describe('what a thing may be used for', () => {
  it.each(CONSENT_USES)(
    'is %s only where that one is ticked: every other tick together says nothing of it',
    (use) => {
      const others = CONSENT_USES.filter((one) => one !== use);
      expect(mayUse([fact({ uses: [use] })], use, 'farm', DAY)).toBe(true);
      expect(mayUse([fact({ uses: others })], use, 'farm', DAY)).toBe(false);
    },
  );

  it('needs a yes of everybody who was asked', () => {
    const [yes, no] = [fact({ uses: ['print'] }), fact({ uses: ['keep'] })];
    expect(mayUse([yes, yes], 'print', 'farm', DAY)).toBe(true);
    expect(mayUse([yes, no], 'print', 'farm', DAY)).toBe(false);
  });

  it.each(['asked', 'not-now', 'refused', 'withdrawn'] as const)(
    'is never printing where the word is %s',
    (state) => {
      expect(mayUse([fact({ state, uses: ['print'] })], 'print', 'farm', DAY)).toBe(false);
    },
  );

  it('stays kept and shown while the answer is open, and not once it is no', () => {
    const shown = (state: ConsentFact['state']) => mayUse([fact({ state, uses: [] })], 'show', 'farm', DAY);
    expect(['asked', 'not-now', 'refused', 'withdrawn'].map((state) => shown(state as 'asked'))).toEqual([
      true,
      true,
      false,
      false,
    ]);
  });

  it('without anybody asked is what a village does among its own, and of a belief only to keep and show it', () => {
    const allowed = (kind: 'farm' | 'belief') => CONSENT_USES.filter((use) => mayUse([], use, kind, DAY));
    expect(allowed('farm')).toEqual(['keep', 'show', 'print', 'recording', 'feed', 'message']);
    expect(allowed('belief')).toEqual(['keep', 'show', 'recording']);
  });
});

describe('which yes is missing', () => {
  const missing = (consents: ConsentFact[]) => missingYes(consents, 'open-page', 'farm', DAY);

  it('is none only where that use is ticked', () => {
    expect(missing([fact({ uses: ['keep', 'show', 'open-page'] })])).toBeNull();
    expect(missing([fact({ uses: CONSENT_USES.filter((use) => use !== 'open-page') })])).toBe('not-agreed');
  });

  it('is told apart from nobody asked, and from an answer that is still to come', () => {
    expect(missing([])).toBe('nobody-asked');
    for (const state of ['asked', 'not-now'] as const) {
      expect(missing([fact({ uses: ['open-page'] }), fact({ state, uses: [] })])).toBe('no-answer');
    }
  });
});

describe('a consent with an end', () => {
  it('holds on its last day and has lapsed on the next', () => {
    const consent = fact({ uses: ['print'], until: DAY });
    expect([stateOn(consent, DAY), mayUse([consent], 'print', 'farm', DAY)]).toEqual(['given', true]);
    expect([stateOn(consent, '2027-06-11'), mayUse([consent], 'print', 'farm', '2027-06-11')]).toEqual([
      'lapsed',
      false,
    ]);
  });

  it('ends the showing with the first that ends, and at once where keeping or showing is missing', () => {
    expect(shownUntil([])).toBeNull();
    expect(shownUntil([fact(), fact({ state: 'asked', uses: [] })])).toBeNull();
    expect(shownUntil([fact({ until: '2028-01-01' }), fact({ until: DAY })])).toBe(DAY);
    for (const hiding of [
      fact({ uses: ['keep', 'print'] }),
      fact({ uses: ['show'] }),
      fact({ state: 'refused' }),
    ]) {
      expect(shownUntil([fact(), hiding])).toBe('1000-01-01');
    }
  });
});

describe('asking again', () => {
  it('is due from thirty days before the review date on, and stays so when that is past', () => {
    const consent = fact({ reviewBy: '2027-07-10' });
    expect(['2027-06-09', '2027-06-10', '2027-08-01'].map((day) => isDue(consent, day))).toEqual([
      false,
      true,
      true,
    ]);
  });

  it('is due before an end that comes earlier than the review date, and after it', () => {
    const consent = fact({ until: '2027-07-10' });
    expect(['2027-06-09', '2027-06-10', '2027-08-01'].map((day) => isDue(consent, day))).toEqual([
      false,
      true,
      true,
    ]);
  });

  it('is never due where nobody said yes', () => {
    for (const state of ['asked', 'not-now', 'refused', 'withdrawn'] as const) {
      expect(isDue(fact({ state, reviewBy: '2020-01-01' }), DAY)).toBe(false);
    }
  });
});
