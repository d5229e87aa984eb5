import { describe, expect, it } from 'vitest';
import { translatorFor } from '#server/print/translator.js';

describe('translatorFor', () => {
  it('fills in values and plural forms, without escaping them for HTML', () => {
    const t = translatorFor('en', 'print');
    expect(t('foot.signedBy', { names: 'A & <B>' })).toBe('Signed by A & <B>.');
    expect(t('entry.lookForSome', { signs: 's', count: 1 })).not.toBe(
      t('entry.lookForSome', { signs: 's', count: 2 }),
    );
  });

  it('speaks English where a language has no texts, and for its regions', () => {
    const english = translatorFor('en', 'sky')('phenomenon.heliacal-rising');
    expect(english).toBe('first morning seen');
    expect(translatorFor('sw', 'sky')('phenomenon.heliacal-rising')).toBe(english);
    expect(translatorFor('en-GB', 'sky')('phenomenon.heliacal-rising')).toBe(english);
  });
});
