import { useTranslation } from 'react-i18next';
import type { EntryWarning } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { leadingRow, type FormState } from '../model/form-state.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Advised } from '../model/use-advice.js';
import { collidingWith, waysOut, type Way } from '../model/warning-ways.js';
import { AdviceLine } from './advice-line.js';

interface EntryWarningsProps {
  form: FormState;
  entry: ShownEntry;
  all: readonly ShownEntry[];
  advice: readonly Advised[];
  onWay: (way: Way) => void;
}

/** What to look at before elders are asked: why, and ways out. None of it keeps the draft from being saved. */
export function EntryWarnings({ form, entry, all, advice, onWay }: EntryWarningsProps) {
  const { t } = useTranslation(['calendars', 'sky']);
  const say = useWarningWords(form, entry, all);
  const warnings = entry.dates?.warnings ?? [];
  if (warnings.length + advice.length === 0) return null;
  const row = leadingRow(form);
  return (
    <Care className="mt-3">
      <h3 className="text-body">{t('warning.title')}</h3>
      <ul className="grid gap-2">
        {warnings.map((warning) => (
          <li key={warning}>
            <p>{say(warning)}</p>
            <div className="ways flex flex-wrap">
              {waysOut(warning, form.draft, row).map((way) => (
                <Button
                  key={way.kind === 'otherDay' ? way.phenomenon : way.kind}
                  look="quiet"
                  onClick={() => {
                    onWay(way);
                  }}
                >
                  {way.kind === 'otherDay'
                    ? t('warning.way.otherDay', { phenomenon: t(`sky:phenomenon.${way.phenomenon}`) })
                    : t(`warning.way.${way.kind}`)}
                </Button>
              ))}
            </div>
          </li>
        ))}
        {advice.map((advised) => (
          <li key={advised.advice}>
            <AdviceLine
              advised={advised}
              marker={row ? markerName(row) : form.draft.marker.markerKey}
              onWay={onWay}
            />
          </li>
        ))}
      </ul>
      <p className="mt-1 text-small">{t('warning.stillSaves')}</p>
    </Care>
  );
}

/** A sign of the sky has no phenomenon to name. */
function isSaidOtherwise(warning: EntryWarning): warning is 'no-date-this-year' | 'one-occurrence-only' {
  return warning === 'no-date-this-year' || warning === 'one-occurrence-only';
}

function useWarningWords(
  form: FormState,
  entry: ShownEntry,
  all: readonly ShownEntry[],
): (warning: EntryWarning) => string {
  const { t, i18n } = useTranslation(['calendars', 'sky']);
  const dates = useDateWords();
  const { draft, year } = form;
  const sign = useSkySignWords();
  const row = leadingRow(form);
  const { lead } = entry.content;
  const signName = lead.type === 'sky' ? sign(lead.spec, form.markers ?? new Map()) : null;
  const lastDay = dates.day({ year, ...draft.lastDate.date });
  return (warning) =>
    t(signName !== null && isSaidOtherwise(warning) ? `warning.sign.${warning}` : `warning.${warning}`, {
      year,
      sign: signName ?? '',
      reason: t(`sky:noSign.${entry.dates?.sky?.reason ?? 'not-in-this-year'}`),
      marker: signName ?? (row ? markerName(row) : draft.marker.markerKey),
      phenomenon: t(`sky:phenomenon.${draft.marker.phenomenon}`),
      day: lastDay,
      others:
        warning === 'windows-overlap'
          ? listWords(
              collidingWith(entry, all).map(({ content }) => content.titleOfficer || t('editor.untitled')),
              i18n.language,
            )
          : '',
    });
}
