import { describe, expect, it } from 'vitest';
import { withoutSign } from '#src/features/calendars/model/record-signs.js';
import { wholeRecord } from '#tests/support/event-record.js';

describe('taking a sign out of the list', () => {
  const { signs } = wholeRecord();

  it('keeps the one that must be there, wherever it stands then', () => {
    const left = withoutSign({ ...signs, mustHave: 1 }, 0);
    expect(left.list[left.mustHave ?? -1]?.name).toBe(signs.list[1]?.name);
    expect(withoutSign({ ...signs, mustHave: 0 }, 0).mustHave).toBeNull();
  });

  it('needs no more than are left', () => {
    expect(withoutSign(signs, 1).needed).toBe(1);
    expect(withoutSign({ ...signs, list: signs.list.slice(0, 1) }, 0).needed).toBeNull();
  });
});
