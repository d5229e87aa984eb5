import { useTranslation } from 'react-i18next';
import { PersonSelect } from '#src/lib/sharing-fields.js';

interface ForWhomProps {
  value: string | null;
  problem?: string | undefined;
  onChange: (personId: string | null) => void;
}

/** Who asked for it, where somebody else does it for them. */
export function ForWhom({ value, problem, onChange }: ForWhomProps) {
  const { t } = useTranslation('withdrawals');
  return (
    <PersonSelect
      label={t('forWhom')}
      hint={t('forWhomHint')}
      nobody={t('forMe')}
      value={value}
      problem={problem}
      onChange={onChange}
    />
  );
}
