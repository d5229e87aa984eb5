import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { EventRecord } from '#shared/contracts/event-record.js';
import { More } from '#src/ui/fold.js';
import type { FormState } from '../model/form-state.js';

export interface RecordProps {
  form: FormState;
}

/** Writes some members of one group of the record; all others stay. */
export function setRecord<G extends keyof EventRecord>(
  { change }: FormState,
  group: G,
  patch: Partial<EventRecord[G]>,
): void {
  change(({ record }) => ({ record: { ...record, [group]: { ...record[group], ...patch } } }));
}

/** What a group says beside its first fields: closed, so that the form stays short. */
export function RecordMore({ children }: { children: ReactNode }) {
  const { t } = useTranslation('record');
  return (
    <More label={t('more')}>
      <div className="mt-3 grid gap-4">{children}</div>
    </More>
  );
}
