import { describe, expect, it } from 'vitest';
import { CARD_ROLES, isCardRole, personInput, ROLES } from '#shared/contracts/people.js';

describe('an e-mail address', () => {
  const saidOf = (input: object) => {
    const parsed = personInput.safeParse({ displayName: 'Talu', ...input });
    return parsed.success
      ? parsed.data.email
      : parsed.error.issues.map(({ path, message }) => [path.join('.'), message]);
  };

  it('may stay empty for whoever comes in with a card, and for nobody else', () => {
    for (const role of ROLES) {
      const expected = isCardRole(role) ? '' : [['email', 'address-needed']];
      expect([role, saidOf({ email: ' ', roles: [role] })]).toEqual([role, expected]);
    }
    expect(saidOf({ email: '', roles: ['elder', 'officer'] })).toEqual([['email', 'address-needed']]);
    expect(CARD_ROLES).toEqual(['elder', 'observer']);
  });

  it('is one where it is given, whatever its capitals', () => {
    expect(saidOf({ email: ' Talu@Example.org ', roles: ['elder'] })).toBe('talu@example.org');
    expect(saidOf({ email: 'talu at example', roles: ['elder'] })).toEqual([['email', 'not-an-email']]);
  });
});
