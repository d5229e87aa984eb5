import { Undo2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ItemState } from '#shared/contracts/withdrawals.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { useWithdraw, type Item } from '../api/withdrawals-api.js';
import { ForWhom } from './for-whom.js';
import { SureButton } from '#src/lib/sure-button.js';

interface WithdrawBoardProps {
  item: Item;
  state: ItemState;
  onGone: () => void;
}

const ALWAYS = ['vanishes', 'prints', 'walls', 'devices', 'backups'] as const;

/** For good: what will happen is said before anything does. */
export function WithdrawBoard({ item, state, onGone }: WithdrawBoardProps) {
  const { t } = useTranslation('withdrawals');
  const withdraw = useWithdraw(item);
  const [askedById, setAskedById] = useState<string | null>(null);
  const [leavesTrace, setLeavesTrace] = useState(true);
  const isEntry = item.itemType === 'entry';
  const lines = item.itemType === 'figure' ? [...ALWAYS, 'figure' as const] : ALWAYS;
  return (
    <Board title={t('gone.title')}>
      <div className="grid gap-4">
        <div>
          <p>{t('gone.what')}</p>
          <ul className="mt-2 grid list-disc gap-2 ps-6">
            {lines.map((line) => (
              <li key={line}>{t(`gone.${line}`)}</li>
            ))}
          </ul>
        </div>
        {isEntry && (
          <PickGroup
            label={t('gone.trace')}
            stacked
            value={leavesTrace ? 'yes' : 'no'}
            onChange={(choice) => {
              setLeavesTrace(choice === 'yes');
            }}
            options={(['yes', 'no'] as const).map((value) => ({
              value,
              label: t(`gone.traces.${value}.name`),
              note: t(`gone.traces.${value}.note`),
            }))}
          />
        )}
        {!state.isMine && <ForWhom value={askedById} onChange={setAskedById} />}
        <div>
          <SureButton
            label={t('gone.ask')}
            icon={<Undo2 aria-hidden size={20} className="turns" />}
            question={t('gone.sure')}
            what={
              <>
                {state.title !== null && <p className="own-words">{state.title}</p>}
                <p>{t('gone.cannot')}</p>
              </>
            }
            yes={t('gone.yes')}
            tick={{ label: t('gone.tick'), reason: t('gone.tickFirst') }}
            act={async () => {
              await withdraw.mutateAsync({ leavesTrace: isEntry && leavesTrace, askedById });
              onGone();
            }}
          />
        </div>
      </div>
    </Board>
  );
}
