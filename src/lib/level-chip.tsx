import { Eye, House, Lock, LockKeyhole, Users } from 'lucide-react';
import type { ReactNode } from 'react';
import type { SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import { Chip } from '#src/ui/chip.js';
import { useSharingWords } from './sharing-words.js';

const SIZE = 18;
const ICONS: Record<SharingLevel, ReactNode> = {
  open: <Eye aria-hidden size={SIZE} />,
  village: <House aria-hidden size={SIZE} />,
  group: <Users aria-hidden size={SIZE} />,
  elders: <Lock aria-hidden size={SIZE} />,
  sealed: <LockKeyhole aria-hidden size={SIZE} />,
};

export interface LevelChipProps {
  level: SharingLevel;
  details?: SharingDetails | undefined;
}

/** Who may see a thing: "Elders", "Group: Weavers", "Village, told from 1 August to 31 August". */
export function LevelChip({ level, details }: LevelChipProps) {
  const words = useSharingWords();
  return <Chip icon={ICONS[level]}>{words(level, details)}</Chip>;
}

/** The same where it says something: of what is open or the village's all year round nothing needs to be said. */
export function KeptChip({ level, details }: LevelChipProps) {
  const isPlain = (level === 'open' || level === 'village') && !details?.tellingSeason;
  return isPlain ? null : <LevelChip level={level} details={details} />;
}
