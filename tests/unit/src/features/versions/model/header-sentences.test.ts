import { describe, expect, it } from 'vitest';
import { headerSentences, skyReasons } from '#src/features/versions/model/header-sentences.js';

const change = (field: string, before: unknown = 1, after: unknown = 2) => ({ field, before, after });

describe('what two versions rest on', () => {
  it('is said once for each thing, though several fields make it', () => {
    const keys = headerSentences([
      change('place.latitudeDeg'),
      change('place.longitudeDeg'),
      change('place.skyline', [], []),
      change('weatherContact', 'call 900', 'call 950'),
      change('order', [], []),
    ]);
    expect(keys).toEqual([
      { key: 'sentence.header.place.where', values: { before: '1', after: '2' } },
      { key: 'sentence.header.place.skyline', values: { before: '', after: '' } },
      { key: 'sentence.header.weatherContact', values: { before: 'call 900', after: 'call 950' } },
      { key: 'sentence.header.order', values: { before: '', after: '' } },
    ]);
  });

  it('is never passed over, even where the field is not known here', () => {
    expect(headerSentences([change('somethingNew')])[0]?.key).toBe('sentence.header.other');
  });

  it('explains a moved star by the place and the reckoning only', () => {
    const reasons = skyReasons([
      change('weatherContact'),
      change('place.name'),
      change('place.skyline'),
      change('place.figures', null, []),
      change('engineVersion', '1.0.0', '1.1.0'),
      change('order'),
    ]);
    expect(reasons.map(({ key }) => key)).toEqual([
      'sentence.header.place.skyline',
      'sentence.header.place.figures',
      'sentence.header.engineVersion',
    ]);
  });
});
