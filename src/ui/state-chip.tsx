import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { VersionState } from '#shared/contracts/versions.js';
import { Chip, type ChipTone } from './chip.js';
import { StateIcon } from './icons/state-icon.js';

export type CalendarState = VersionState | 'draft';

const TONES: Record<CalendarState, ChipTone> = {
  draft: 'plain',
  'in-review': 'plain',
  'changes-asked': 'ochre',
  'signed-off': 'moss',
  published: 'solid',
  replaced: 'plain',
  recalled: 'rust',
};

/** State of a calendar's version: ring and word. Children replace the word (`Published 2027-1`). */
export function StateChip({ state, children }: { state: CalendarState; children?: ReactNode }) {
  const { t } = useTranslation('common');
  return (
    <Chip tone={TONES[state]} icon={<StateIcon state={state} size={20} />}>
      {children ?? t(`state.${state}`)}
    </Chip>
  );
}
