import { Check, CircleDashed, Clock, RotateCw, X } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { ConsentLine, ConsentState } from '#shared/contracts/consents.js';
import { Chip, type ChipTone } from '#src/ui/chip.js';

const LOOKS: Record<ConsentState, { tone: ChipTone; icon: ReactNode }> = {
  asked: { tone: 'plain', icon: <CircleDashed aria-hidden size={18} /> },
  given: { tone: 'moss', icon: <Check aria-hidden size={18} /> },
  'given-with-conditions': { tone: 'moss', icon: <Check aria-hidden size={18} /> },
  'not-now': { tone: 'plain', icon: <CircleDashed aria-hidden size={18} /> },
  refused: { tone: 'rust', icon: <X aria-hidden size={18} /> },
  withdrawn: { tone: 'rust', icon: <X aria-hidden size={18} /> },
  lapsed: { tone: 'rust', icon: <Clock aria-hidden size={18} /> },
};

/** What stands, and whether it is to be asked for again: a drawing and a word each. */
export function ConsentChips({ state, isDue }: Pick<ConsentLine, 'state' | 'isDue'>) {
  const { t } = useTranslation('consents');
  const { tone, icon } = LOOKS[state];
  return (
    <span className="flex flex-wrap gap-2">
      <Chip tone={tone} icon={icon}>
        {t(`state.${state}`)}
      </Chip>
      {isDue && (
        <Chip tone="ochre" icon={<RotateCw aria-hidden size={18} />}>
          {t('state.due')}
        </Chip>
      )}
    </span>
  );
}
