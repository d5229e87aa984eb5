import { useTranslation } from 'react-i18next';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { useGiverWords } from '#src/lib/giver-words.js';
import { signed } from '#src/lib/signed.js';
import type { CompareWords } from '../model/entry-sentences.js';
import type { ShownField } from '../model/shown-fields.js';

/** One field of an entry as words; empty where there is nothing. */
export function useFieldValue(words: CompareWords): (field: ShownField, body: VersionEntryBody) => string {
  const { t } = useTranslation(['versions', 'calendars']);
  const giverWords = useGiverWords();
  const yesNo = (is: boolean) => t(is ? 'value.yes' : 'value.no');
  return (field, body) => {
    const { content, dates } = body;
    switch (field) {
      case 'lead':
        return words.lead(content.lead);
      case 'marker':
        return dates.marker ? words.about(dates.marker) : '';
      case 'window':
        return words.window(body);
      case 'offsets':
        return t('calendars:stale.offsetsAre', {
          earliest: signed(content.offsets.earliestDays),
          bestFrom: signed(content.offsets.bestFromDays),
          bestTo: signed(content.offsets.bestToDays),
          lastAdvised: signed(content.offsets.lastAdvisedDays),
        });
      case 'lastDate':
        return content.lastDate ? words.lastDate(content.lastDate) : '';
      case 'kind':
        return words.kind(content);
      case 'icon':
        return words.icon(content.icon);
      case 'giver':
        return giverWords(content.giver);
      case 'sharingLevel':
        return words.level(content.sharingLevel);
      case 'agreedToPrint':
      case 'protectiveWatch':
        return yesNo(content[field]);
      default:
        return content[field];
    }
  };
}
