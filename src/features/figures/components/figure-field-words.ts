import { useTranslation } from 'react-i18next';
import type { Chart, FigureInput } from '#shared/contracts/figures.js';
import { listWords } from '#src/lib/list-words.js';
import type { FigurePartName } from '../model/figure-draft.js';
import { useChartNames } from './use-chart-names.js';

/** What stands in a field of a figure, as one text. */
export function useFigureFieldWords(chart: Chart): (part: FigurePartName, figure: FigureInput) => string {
  const { t, i18n } = useTranslation(['figures', 'sharing']);
  const list = (words: readonly string[]) => listWords(words, i18n.language);
  const nameOf = useChartNames();
  const starName = (hr: number) => {
    const star = chart.stars.find((one) => one.hr === hr);
    return nameOf(star ?? { hr, name: '', designation: '' });
  };
  return (part, figure) => {
    switch (part) {
      case 'names':
        return list(figure.names.map(({ name }) => name));
      case 'story':
        return figure.story === '' ? t('nothing') : figure.story;
      case 'variants':
        return figure.variants.length === 0 ? t('nothing') : list(figure.variants.map(({ text }) => text));
      case 'sky':
        if (figure.patch !== null) {
          return t('table.place', {
            rightAscension: figure.patch.rightAscensionDeg,
            declination: figure.patch.declinationDeg,
          });
        }
        return t('page.starsAndLeader', {
          stars: list(figure.memberHrs.map(starName)),
          leader: figure.indicatorHr === null ? t('nothing') : starName(figure.indicatorHr),
        });
      case 'ownDepths':
        return figure.ownDepths === null ? t('nothing') : t('page.depths', { ...figure.ownDepths });
      case 'sharingLevel':
        return t(`sharing:level.${figure.sharingLevel}.name`);
    }
  };
}
