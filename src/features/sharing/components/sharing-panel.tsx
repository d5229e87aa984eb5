import { useQuery } from '@tanstack/react-query';
import { Users } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import { LevelChip } from '#src/lib/level-chip.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import type { SharingValue } from '#src/lib/sharing-fields.js';
import { itemSharingQuery, type ItemRef } from '#src/lib/sharing-queries.js';
import { Button } from '#src/ui/button.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { AskedWider } from './asked-wider.js';
import { ChangeSharingDialog } from './change-sharing-dialog.js';

export interface SharingPanelProps {
  item: ItemRef;
  /** A wider circle that was chosen elsewhere and cannot be saved there: it is asked for here. */
  wanted?: SharingValue | null | undefined;
  /** Called once the wanted circle was asked for, or let be. */
  onSettled?: (() => void) | undefined;
  /** Called when the person has just hidden the thing from themselves. */
  onHidden?: (() => void) | undefined;
}

/** Who may see one thing, who gave it, and the ways to make that narrower or wider. */
export function SharingPanel({ item, wanted = null, onSettled, onHidden }: SharingPanelProps) {
  const { t } = useTranslation('sharing');
  const words = useProblemWords();
  const [isChanging, setIsChanging] = useState(false);
  const { data: sharing, error, isPending, refetch } = useQuery(itemSharingQuery(item));
  const close = () => {
    setIsChanging(false);
    onSettled?.();
  };
  return (
    <>
      {isPending && <Skeleton lines={3} />}
      {error !== null && !sharing && (
        <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
      {sharing && (
        <>
          <SharingFacts sharing={sharing} />
          <AskedWider item={item} sharing={sharing} />
          {sharing.may.tighten && (
            <Button
              className="mt-3"
              icon={<Users aria-hidden size={20} />}
              onClick={() => {
                setIsChanging(true);
              }}
            >
              {t('panel.change')}
            </Button>
          )}
          {(isChanging || wanted !== null) && sharing.may.tighten && (
            <ChangeSharingDialog
              item={item}
              sharing={sharing}
              wanted={wanted}
              onClose={close}
              onHidden={onHidden}
            />
          )}
        </>
      )}
    </>
  );
}

function SharingFacts({ sharing: { sharing, giverName, successorName } }: { sharing: ItemSharing }) {
  const { t } = useTranslation('sharing');
  const { level, ...details } = sharing;
  const isNarrow = level !== 'open' && level !== 'village';
  const giver = giverName === '' && details.naming === 'role' ? t('panel.byRole') : giverName;
  return (
    <div className="grid gap-1">
      <p>
        <LevelChip level={level} details={details} />
      </p>
      <p>{t(`level.${level}.note`)}</p>
      {isNarrow && level !== 'sealed' && (
        <p>{t(details.trace === 'blank' ? 'panel.traceBlank' : 'panel.traceNone')}</p>
      )}
      {(isNarrow || details.tellingSeason !== null) && <p>{t('panel.kept')}</p>}
      {giver !== '' && <p>{t('panel.givenBy', { name: giver })}.</p>}
      {successorName !== '' && <p>{t('panel.successor', { name: successorName })}</p>}
    </div>
  );
}
