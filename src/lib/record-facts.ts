import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import {
  EMPTY_RECORD,
  type EventRecord,
  type RecordSign,
  type TextCheck,
} from '#shared/contracts/event-record.js';
import { useDateWords } from './date-words.js';

export interface RecordFact {
  key: string;
  label: string;
  value: string;
}

type RecordGroup = 'what' | 'when' | 'signs' | 'work' | 'trust' | 'whose';

/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;

/** What a record says, by the groups of the form; what is not said is left out. */
export function useRecordFacts(): (record: EventRecord | undefined) => Record<RecordGroup, RecordFact[]> {
  const { t } = useTranslation('record');
  const dates = useDateWords();
  return useMemo(() => {
    const told = (facts: RecordFact[]) => facts.filter(({ value }) => value !== '');
    const days = (count: number | null) => (count === null ? '' : t('days', { count, days: count }));
    const monthDay = (day: RecordSignDay) => dates.day({ year: PLAIN_YEAR, ...day });
    const what = ({ what: { operation, ownOperation, operationWord, variety, land } }: EventRecord) => [
      {
        key: 'operation',
        label: t('operation.label'),
        value:
          operation === null
            ? ''
            : (operationWord?.word ?? (operation === 'other' ? ownOperation : t(`operation.${operation}`))),
      },
      {
        key: 'variety',
        label: t('varietyName'),
        value:
          variety.fromDays !== null && variety.toDays !== null
            ? t('varietyDays', { name: variety.name, from: variety.fromDays, to: variety.toDays }).trim()
            : variety.name,
      },
      { key: 'land', label: t('land'), value: land },
    ];
    const when = ({ when: { leadDays, graceDays, repeats, everyYears, rule } }: EventRecord) => [
      { key: 'leadDays', label: t('leadDays'), value: days(leadDays) },
      { key: 'graceDays', label: t('graceDays'), value: days(graceDays) },
      {
        key: 'repeats',
        label: t('repeats.label'),
        value:
          repeats === 'yearly'
            ? ''
            : repeats === 'some-years'
              ? rule
              : t('everyYearsSaid', { count: everyYears ?? 0 }),
      },
    ];
    const oneSign = ({ name, type, look, where, usual, stillSeen }: RecordSign) =>
      [
        look,
        where,
        usual ? t('signs.usualSaid', { from: monthDay(usual.from), to: monthDay(usual.to) }) : '',
        stillSeen === null || stillSeen === 'yes' ? '' : t(`signs.stillSeen.${stillSeen}`),
      ]
        .filter((said) => said !== '')
        .join('; ') || `${name}, ${t(`signs.type.${type}`)}`;
    const signs = ({ signs: { list, needed, mustHave } }: EventRecord) => [
      ...list.map((sign, index) => ({ key: `sign-${index}`, label: sign.name, value: oneSign(sign) })),
      {
        key: 'needed',
        label: t('signs.needed'),
        value: needed === null ? '' : t('signs.neededOf', { needed, count: list.length }),
      },
      { key: 'mustHave', label: t('signs.mustHave'), value: list[mustHave ?? -1]?.name ?? '' },
    ];
    const work = ({ work: { stop, ...words } }: EventRecord) => [
      ...WORK.map((field) => ({ key: field, label: t(field), value: words[field] })),
      {
        key: 'stop',
        label: t('stop'),
        value: stop === null ? '' : t('stopSaid', { day: monthDay(stop.date), source: stop.source }),
      },
    ];
    const check = (of: TextCheck | null) =>
      of === null || of.day === '' || of.name === ''
        ? ''
        : t('check.said', { ...of, day: dates.day(of.day) });
    const trust = ({ trust: { confidence, by, basis, sinceYear }, checked }: EventRecord) => [
      {
        key: 'confidence',
        label: t('confidence.label'),
        value: confidence === null ? '' : t(`confidence.${confidence}`),
      },
      { key: 'by', label: t('confidenceBy'), value: by },
      { key: 'basis', label: t('basis.label'), value: basis === null ? '' : t(`basis.${basis}`) },
      {
        key: 'sinceYear',
        label: t('sinceYear'),
        value: sinceYear === undefined ? '' : t('sinceYearSaid', { year: String(sinceYear) }),
      },
      { key: 'checkedWork', label: t('check.work'), value: check(checked.work) },
      { key: 'checkedSafety', label: t('check.safety'), value: check(checked.safety) },
      { key: 'checkedLate', label: t('check.late'), value: check(checked.late) },
    ];
    const whose = ({ heard: { where, day, language } }: EventRecord) => [
      { key: 'heardWhere', label: t('heardWhere'), value: where },
      { key: 'heardDay', label: t('heardDay'), value: day === null ? '' : dates.day(day) },
      { key: 'heardLanguage', label: t('heardLanguage'), value: language },
    ];
    return (record = EMPTY_RECORD) => ({
      what: told(what(record)),
      when: told(when(record)),
      signs: told(signs(record)),
      work: told(work(record)),
      trust: told(trust(record)),
      whose: told(whose(record)),
    });
  }, [t, dates]);
}

type RecordSignDay = NonNullable<RecordSign['usual']>['from'];

const WORK = [
  'responsible',
  'helpers',
  'decides',
  'owns',
  'inputs',
  'ifEarly',
  'ifLaterStill',
  'askWhom',
] as const;
