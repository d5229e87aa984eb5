import { describe, expect, it } from 'vitest';
import {
  isOut,
  mayBecome,
  VERSION_STATES,
  versionLabel,
  wasPublished,
} from '#shared/calendar/version-state.js';

describe('the states of a submission', () => {
  it('follow each other in these steps and in no other', () => {
    const steps = VERSION_STATES.flatMap((from) =>
      VERSION_STATES.filter((to) => mayBecome(from, to)).map((to) => `${from} > ${to}`),
    );
    expect(steps).toEqual([
      'in-review > changes-asked',
      'in-review > signed-off',
      'signed-off > changes-asked',
      'signed-off > published',
      'published > replaced',
      'published > recalled',
    ]);
  });

  it('lock the draft while the submission is in review or signed off', () => {
    expect(VERSION_STATES.filter(isOut)).toEqual(['in-review', 'signed-off']);
  });

  it('are open to the whole village once the version was published', () => {
    expect(VERSION_STATES.filter(wasPublished)).toEqual(['published', 'replaced', 'recalled']);
  });

  it('label published versions by year and count', () => {
    expect([versionLabel(2027, 1), versionLabel(2027, 2)]).toEqual(['2027-1', '2027-2']);
  });
});
