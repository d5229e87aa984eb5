import { useTranslation } from 'react-i18next';
import type { CommunityInput, CommunityPerson, Language } from '#shared/contracts/people.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import type { SettingGroup } from './settings-form.js';

/** Any year that is no leap year: a yearly date exists in every year. */
const ORDINARY_YEAR = 2027;

/** Settings as a person says them. */
export interface SettingWords {
  label: (field: SettingGroup) => string;
  value: (field: SettingGroup, settings: CommunityInput) => string;
}

const LABELS = {
  name: 'settings.name',
  villageLanguage: 'settings.villageLanguage',
  officerLanguage: 'settings.officerLanguage',
  yearStart: 'settings.yearStart',
  localMonths: 'settings.localMonths',
  moonNames: 'settings.moonNames',
  weatherContact: 'settings.weather',
  agricultureContact: 'settings.agriculture',
  signOffRule: 'settings.rule',
} as const satisfies Record<SettingGroup, string>;

export function useSettingWords(elders: readonly CommunityPerson[]): SettingWords {
  const { t, i18n } = useTranslation('people');
  const dates = useDateWords();
  const names = (ids: readonly string[]) =>
    listWords(
      ids.map((id) => elders.find((elder) => elder.id === id)?.displayName ?? t('settings.unknownElder')),
      i18n.language,
    );

  const ruleWords = ({ minElders, mustSign, oneOf, steward }: CommunityInput['signOffRule']) =>
    [
      t('settings.ruleMin', { count: minElders }),
      mustSign.length > 0 ? t('settings.ruleMust', { names: names(mustSign) }) : '',
      oneOf.length > 0 ? t('settings.ruleOneOf', { names: names(oneOf) }) : '',
      steward ? t('settings.ruleSteward') : '',
    ]
      .filter((sentence) => sentence !== '')
      .join(' ');
  const saidOr = (said: string[]) =>
    said.length === 0 ? t('settings.notSet') : listWords(said, i18n.language);
  const language = ({ name, tag }: Language) => t('settings.language', { name, tag });

  return {
    label: (field) => t(LABELS[field]),
    value: (field, settings) => {
      switch (field) {
        case 'villageLanguage':
        case 'officerLanguage':
          return language(settings[field]);
        case 'yearStart': {
          const day = dates.day({ year: ORDINARY_YEAR, ...settings.yearStart.date });
          const { note } = settings.yearStart;
          return note === '' ? day : t('settings.yearStartSaid', { day, note });
        }
        case 'localMonths':
          return saidOr(
            settings.localMonths.map(({ name, begins }) =>
              t('settings.monthSaid', { name, day: dates.day({ year: ORDINARY_YEAR, ...begins }) }),
            ),
          );
        case 'moonNames':
          return saidOr(
            settings.moonNames.flatMap((name, index) =>
              name === '' ? [] : [t('settings.moonSaid', { nth: index + 1, name })],
            ),
          );
        case 'signOffRule':
          return ruleWords(settings.signOffRule);
        default:
          return settings[field] === '' ? t('settings.notSet') : settings[field];
      }
    },
  };
}
