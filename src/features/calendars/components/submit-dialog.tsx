import { Send } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { Care, Well } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSubmitDraft } from '../api/entry-mutations.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { submitChecks, type Missing, type SubmitChecks } from '../model/submit-checks.js';
import type { Editor } from '../model/use-editor.js';

interface SubmitDialogProps {
  editor: Editor;
  isOpen: boolean;
  onClose: () => void;
}

/** Before the draft goes to the elders: what is missing, what goes, and that it is frozen. */
export function SubmitDialog({ editor, isOpen, onClose }: SubmitDialogProps) {
  const { t } = useTranslation('calendars');
  return (
    <Dialog title={t('submit.title')} isOpen={isOpen} onClose={onClose}>
      <SubmitQuestion editor={editor} onClose={onClose} />
    </Dialog>
  );
}

function SubmitQuestion({ editor, onClose }: Omit<SubmitDialogProps, 'isOpen'>) {
  const { t } = useTranslation('calendars');
  const words = useProblemWords();
  const navigate = useNavigate();
  const say = useToast();
  const { calendar, community, shown } = editor;
  const submit = useSubmitDraft(calendar.id);
  const checks = submitChecks(shown, community, calendar.outNumber);
  const isReady = checks.missing.length === 0 && checks.incomplete.length === 0;
  return (
    <div className="grid gap-4">
      {isReady && <WhatGoes editor={editor} checks={checks} />}
      {checks.missing.length > 0 && <WhatIsMissing editor={editor} checks={checks} />}
      {checks.incomplete.length > 0 && (
        <WhatEntriesNeed checks={checks} calendarId={calendar.id} onOpen={onClose} />
      )}
      {isReady && <Remarks checks={checks} calendarId={calendar.id} onOpen={onClose} />}
      {submit.error !== null && (
        <Care blocked role="alert">
          <p>{words.problem(submit.error)}</p>
        </Care>
      )}
      {isReady && (
        <div>
          <Button
            look="main"
            full
            icon={<Send aria-hidden className="turns" size={22} />}
            busy={submit.isPending}
            onClick={() => {
              submit.mutate(undefined, {
                onSuccess: ({ number }) => {
                  say(t('submit.done', { number }));
                  void navigate(paths.version(calendar.id, number));
                },
              });
            }}
          >
            {t('submit.go')}
          </Button>
        </div>
      )}
    </div>
  );
}

function WhatGoes({ editor, checks }: { editor: Editor; checks: SubmitChecks }) {
  const { t } = useTranslation('calendars');
  const { calendar, community } = editor;
  return (
    <div>
      <p>{t('submit.ready')}</p>
      <ul className="list-disc ps-6">
        <li>{t('submit.entries', { count: checks.entryCount })}</li>
        <li>{t('submit.place', { place: calendar.placeName })}</li>
        {checks.markerCount > 0 && <li>{t('submit.stars', { count: checks.markerCount })}</li>}
        {community && (
          <li>
            {t('submit.contacts', {
              weather: community.weatherContact,
              agriculture: community.agricultureContact,
            })}
          </li>
        )}
        <li>{t('submit.engine')}</li>
      </ul>
      <Well className="mt-3">
        <p>{t('submit.frozen')}</p>
      </Well>
    </div>
  );
}

const MISSING_TEXTS = {
  'no-entries': 'submit.noEntries',
  'no-weather': 'submit.noWeather',
  'no-agriculture': 'submit.noAgriculture',
  'already-out': 'submit.alreadyOut',
} as const satisfies Record<Missing, string>;

function WhatIsMissing({ editor, checks }: { editor: Editor; checks: SubmitChecks }) {
  const { t } = useTranslation('calendars');
  const needsSteward = checks.missing.some((each) => each === 'no-weather' || each === 'no-agriculture');
  return (
    <Care blocked>
      <p>
        <strong>{t('submit.missing')}</strong>
      </p>
      <ul>
        {checks.missing.map((each) => (
          <li key={each}>{t(MISSING_TEXTS[each], { number: editor.calendar.outNumber ?? 0 })}</li>
        ))}
      </ul>
      {needsSteward && (
        <>
          <p>{t('submit.stewardFills')}</p>
          <Link className="link-line" to={paths.villageSettings()}>
            {t('submit.toSettings')}
          </Link>
        </>
      )}
    </Care>
  );
}

/** Entries whose record does not say yet what their kind needs: each with what is missing, in words. */
function WhatEntriesNeed({ checks: { incomplete }, calendarId, onOpen }: RemarksProps) {
  const { t, i18n } = useTranslation(['record', 'calendars']);
  return (
    <Care blocked>
      <p>
        <strong>{t('needs.submitBlocked', { count: incomplete.length })}</strong>
      </p>
      <ul>
        {incomplete.map(({ entry, needs }) => (
          <li key={entry.id}>
            <Link className="link-line" to={paths.calendar(calendarId, { entry: entry.id })} onClick={onOpen}>
              {entry.content.titleOfficer || t('calendars:editor.untitled')}
            </Link>{' '}
            <span>
              {listWords(
                needs.map((need) => t(`needs.need.${need}`)),
                i18n.language,
              )}
            </span>
          </li>
        ))}
      </ul>
    </Care>
  );
}

interface RemarksProps {
  checks: SubmitChecks;
  calendarId: string;
  onOpen: () => void;
}

function Remarks({ checks, calendarId, onOpen }: RemarksProps) {
  const { t } = useTranslation(['calendars', 'record']);
  const each = [
    { key: 'unsaved', entries: checks.unsaved },
    { key: 'remarks', entries: checks.remarked },
    { key: 'noLate', entries: checks.withoutLate },
  ] as const;
  const hint =
    checks.withoutRecord.length > 0
      ? t('record:needs.submitHint', { count: checks.withoutRecord.length })
      : null;
  const cares = each
    .filter(({ entries }) => entries.length > 0)
    .map(({ key, entries }) => (
      <Care key={key}>
        <p>{t(`submit.${key}`, { count: entries.length })}</p>
        <EntryLinks entries={entries} calendarId={calendarId} onOpen={onOpen} />
      </Care>
    ));
  return (
    <>
      {cares}
      {hint !== null && <p className="text-small text-umber-soft">{hint}</p>}
    </>
  );
}

function EntryLinks({
  entries,
  calendarId,
  onOpen,
}: {
  entries: readonly ShownEntry[];
  calendarId: string;
  onOpen: () => void;
}) {
  const { t } = useTranslation('calendars');
  return (
    <ul>
      {entries.map((entry) => (
        <li key={entry.id}>
          <Link className="link-line" to={paths.calendar(calendarId, { entry: entry.id })} onClick={onOpen}>
            {entry.content.titleOfficer || t('editor.untitled')}
          </Link>
        </li>
      ))}
    </ul>
  );
}
