import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { LetterChoice, LetterChoiceInput } from '#shared/contracts/letters.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TickField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSaveLetterChoice } from '../api/letters-api.js';
import { HourField } from './hour-field.js';

const USUAL_QUIET_HOURS = { fromHour: 20, toHour: 7 };

export function LetterChoiceForm({ saved }: { saved: LetterChoice }) {
  const { t } = useTranslation('letters');
  const say = useToast();
  const words = useProblemWords();
  const save = useSaveLetterChoice();
  const { lettersOn, ...before } = saved;
  const [edited, setEdited] = useState<Partial<LetterChoiceInput>>({});
  const choice = { ...before, ...edited };
  const { quietHours } = choice;
  const set = (change: Partial<LetterChoiceInput>) => {
    setEdited({ ...edited, ...change });
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        save.mutate(choice, {
          onSuccess: () => {
            setEdited({});
            say(t('choice.saved'));
          },
        });
      }}
    >
      {save.error !== null && (
        <Care blocked role="alert">
          <p>{words.problem(save.error)}</p>
        </Care>
      )}
      {!lettersOn && <p>{t('choice.off')}</p>}
      <PickGroup
        label={t('choice.channel')}
        stacked
        value={choice.channel}
        onChange={(channel) => {
          set({ channel });
        }}
        options={[
          { value: 'e-mail', label: t('choice.email'), note: t('choice.emailNote') },
          { value: 'none', label: t('choice.none'), note: t('choice.noneNote') },
        ]}
      />
      {choice.channel === 'e-mail' && (
        <>
          <PickGroup
            label={t('choice.rhythm')}
            stacked
            value={choice.rhythm}
            onChange={(rhythm) => {
              set({ rhythm });
            }}
            options={[
              { value: 'each', label: t('choice.each'), note: t('choice.eachNote') },
              { value: 'daily', label: t('choice.daily'), note: t('choice.dailyNote') },
            ]}
          />
          <TickField
            label={t('choice.quiet')}
            hint={t('choice.quietNote')}
            checked={quietHours !== null}
            onChange={(event) => {
              set({ quietHours: event.currentTarget.checked ? USUAL_QUIET_HOURS : null });
            }}
          />
          {quietHours !== null && (
            <div className="grid grid-cols-2 gap-3">
              <HourField
                label={t('choice.quietFrom')}
                hour={quietHours.fromHour}
                onChange={(fromHour) => {
                  set({ quietHours: { ...quietHours, fromHour } });
                }}
              />
              <HourField
                label={t('choice.quietTo')}
                hour={quietHours.toHour}
                onChange={(toHour) => {
                  set({ quietHours: { ...quietHours, toHour } });
                }}
              />
            </div>
          )}
        </>
      )}
      <TickField
        label={t('choice.visitMe')}
        hint={t('choice.visitMeNote')}
        checked={choice.visitMe}
        onChange={(event) => {
          set({ visitMe: event.currentTarget.checked });
        }}
      />
      <div>
        <Button type="submit" busy={save.isPending}>
          {t('choice.save')}
        </Button>
      </div>
    </form>
  );
}
