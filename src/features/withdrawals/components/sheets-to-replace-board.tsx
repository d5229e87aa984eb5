import { useQuery } from '@tanstack/react-query';
import { Printer } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { SheetToReplace } from '#shared/contracts/withdrawals.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { sheetsToReplaceQuery, useSheetReplaced } from '../api/withdrawals-api.js';
import { SureButton } from '#src/lib/sure-button.js';

/** For whoever prints: a sheet hangs that holds something taken back. It says which sheet, never what was on it. */
export function SheetsToReplaceBoard() {
  const { t } = useTranslation('withdrawals');
  const { communityId } = useCurrentCommunity();
  const { is } = useRoles();
  const prints = is('staff', 'officer', 'steward');
  const { data = [] } = useQuery({ ...sheetsToReplaceQuery(communityId), enabled: prints });
  if (!prints || data.length === 0) return null;
  return (
    <Board title={t('sheets.title')}>
      <p>{t('sheets.lead')}</p>
      <ul className="mt-3 grid gap-4">
        {data.map((sheet) => (
          <li key={`${sheet.withdrawalId} ${sheet.calendarId} ${sheet.number}`}>
            <SheetLine communityId={communityId} sheet={sheet} />
          </li>
        ))}
      </ul>
    </Board>
  );
}

function SheetLine({ communityId, sheet }: { communityId: string; sheet: SheetToReplace }) {
  const { t } = useTranslation('withdrawals');
  const dates = useDateWords();
  const say = useToast();
  const replaced = useSheetReplaced(communityId);
  const { withdrawalId, calendarId, placeName, year, number, at } = sheet;
  return (
    <>
      <p>
        <strong>{t('sheets.line', { place: placeName, year: String(year), number: String(number) })}</strong>
        <span className="block text-umber-soft">{t('sheets.since', { when: dates.moment(at) })}</span>
      </p>
      <div className="mt-2 flex flex-wrap gap-3">
        <ButtonLink to={paths.sheet(calendarId, { number })} icon={<Printer aria-hidden size={20} />}>
          {t('sheets.print')}
        </ButtonLink>
        <SureButton
          label={t('sheets.down')}
          question={t('sheets.sure')}
          what={<p>{t('sheets.sureWhat')}</p>}
          yes={t('sheets.yes')}
          act={async () => {
            await replaced.mutateAsync(withdrawalId);
            say(t('sheets.done'));
          }}
        />
      </div>
    </>
  );
}
