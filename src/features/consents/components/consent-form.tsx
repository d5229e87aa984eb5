import { Check } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { CONSENT_ANSWERS, type Consent, type ItemConsents } from '#shared/contracts/consents.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';
import { ThumbBar } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { askedAgain, blankConsent, isYes } from '../model/consent-draft.js';
import { useConsentForm } from '../model/use-consent-form.js';
import { HowFields } from './how-fields.js';
import { ProofFields } from './proof-fields.js';
import { RuleFields } from './rule-fields.js';
import { UseTicks } from './use-ticks.js';
import { WhoFields } from './who-fields.js';

/** The day on this device: a consent is written down where it is given. */
function dayHere(): string {
  const now = new Date();
  return [now.getFullYear(), now.getMonth() + 1, now.getDate()]
    .map((part) => String(part).padStart(2, '0'))
    .join('-');
}

/** One person's word about one thing. Nothing is ticked before they have said it. */
export function ConsentForm({
  thing,
  over,
  onDone,
}: {
  thing: ItemConsents;
  over: Consent | null;
  onDone: () => void;
}) {
  const { t } = useTranslation('consents');
  const say = useToast();
  const { communityId } = useCurrentCommunity();
  const personId = useSession().person?.id ?? '';
  const { itemType, itemId } = thing;
  const isAnotherWord = over === null && thing.items.some(({ content }) => content.giverId === thing.giverId);
  const blank = blankConsent(isAnotherWord ? { giverId: null, giverName: '' } : thing, dayHere());
  const form = useConsentForm(
    { communityId, itemType, itemId },
    over,
    over === null ? blank : askedAgain(over.content, dayHere()),
  );
  const { draft, change, at } = form;
  const isMine = draft.giverId === personId;
  // What was answered once cannot be asked as if for the first time.
  const wasAnswered = over !== null && !['asked', 'not-now'].includes(over.content.answer);
  const answers = CONSENT_ANSWERS.filter((one) => !wasAnswered || (one !== 'asked' && one !== 'not-now'));
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void form.save(() => {
          say(t('sheet.saved'));
          onDone();
        });
      }}
    >
      {form.overall !== undefined && (
        <Care blocked role="alert">
          <p>{form.overall}</p>
        </Care>
      )}
      {form.newer !== null && (
        <Care role="alert">
          <p>{t('form.newer', { state: t(`state.${form.newer.state}`) })}</p>
        </Care>
      )}
      <WhoFields form={form} />
      <HowFields form={form} isMine={isMine} />
      <Board title={t('form.answer')}>
        <div className="grid gap-5">
          <PickGroup
            label={t('form.answer')}
            labelForEars
            stacked
            value={draft.answer}
            problem={at('answer')}
            onChange={(answer) => {
              change({ answer });
            }}
            options={answers.map((value) => ({ value, label: t(`answer.${value}`) }))}
          />
          {isYes(draft.answer) && (
            <UseTicks
              chosen={draft.uses}
              before={over?.uses ?? []}
              problem={at('uses')}
              onChange={(uses) => {
                change({ uses });
              }}
            />
          )}
          {(isYes(draft.answer) || draft.conditions !== '') && (
            <TextAreaField
              label={t('form.conditions')}
              hint={t('form.conditionsHint')}
              rows={3}
              value={draft.conditions}
              problem={at('conditions')}
              onChange={(event) => {
                change({ conditions: event.currentTarget.value });
              }}
            />
          )}
        </div>
      </Board>
      {isYes(draft.answer) && <RuleFields form={form} />}
      {isYes(draft.answer) && !isMine && (
        <ProofFields form={form} communityId={communityId} consentId={over?.id ?? null} />
      )}
      <ThumbBar>
        <Button look="main" type="submit" busy={form.busy} icon={<Check aria-hidden size={20} />}>
          {t('form.save')}
        </Button>
        <Button
          onClick={() => {
            form.drop();
            onDone();
          }}
        >
          {t('sheet.stop')}
        </Button>
      </ThumbBar>
    </form>
  );
}
