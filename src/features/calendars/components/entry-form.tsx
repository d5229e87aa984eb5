import { Copy, Trash2 } from 'lucide-react';
import { useEffect, useId, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useEntryFacts } from '#src/lib/entry-facts.js';
import { Button, IconButton } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { Care } from '#src/ui/surfaces.js';
import { groupsWithProblems, type FieldGroup } from '../model/field-problems.js';
import type { FormState } from '../model/form-state.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import type { SaveEntry } from '../model/use-save-entry.js';
import type { Way } from '../model/warning-ways.js';
import { ElderRequests } from './elder-requests.js';
import { EntryHeading } from './entry-heading.js';
import { EntryWarnings } from './entry-warnings.js';
import { MarkerDialog } from './marker-dialog.js';
import { LateFields, SignsFields, WhoseFields } from './other-fields.js';
import { StaleChoice } from './stale-choice.js';
import { UnsavedLine } from './unsaved-line.js';
import { WhatFields } from './what-fields.js';
import { WhenFields } from './when-fields.js';

interface EntryFormProps {
  editor: Editor;
  entry: ShownEntry;
  form: FormState;
  saving: SaveEntry;
  actions: EntryActions;
}

const GROUPS: readonly FieldGroup[] = ['what', 'when', 'signs', 'late', 'whose'];

/** One entry as a form whose groups close to one line. */
export function EntryForm({ editor, entry, form, saving, actions }: EntryFormProps) {
  const { t } = useTranslation('calendars');
  const headingId = useId();
  const board = useRef<HTMLElement>(null);
  const isNew = entry.saved === null;
  const [opened, setOpened] = useState<ReadonlySet<FieldGroup>>(
    () => new Set(isNew ? ['what', 'when'] : ['when']),
  );
  const [isChoosing, setIsChoosing] = useState(false);
  const lines = useFoldLines(form);
  useFirstProblemInSight(board, saving, setOpened);

  const openGroup = (group: FieldGroup) => {
    setOpened((before) => new Set(before).add(group));
    // The fold opens with the next drawing; only then can the focus go into it.
    requestAnimationFrame(() => {
      board.current
        ?.querySelector<HTMLElement>(`[data-group="${group}"] :is(input, textarea, select)`)
        ?.focus();
    });
  };
  const goWay = (way: Way) => {
    switch (way.kind) {
      case 'otherStar':
        setIsChoosing(true);
        return;
      case 'fixedDate':
        form.change({ leadType: 'fixed-date' });
        openGroup('when');
        return;
      case 'otherDay':
        form.change(({ marker }) => ({ marker: { ...marker, phenomenon: way.phenomenon, occurrence: 1 } }));
        return;
      case 'useFirst':
        form.change(({ marker }) => ({ marker: { ...marker, occurrence: 1 } }));
        return;
      case 'agreed':
        form.change({ agreedToPrint: true });
        return;
      case 'writeSigns':
        openGroup('signs');
        return;
      case 'changeDays':
      case 'changeLastDate':
        openGroup('when');
    }
  };
  const { saved } = entry;
  const answers = editor.answers.get(entry.id);
  const edit = editor.edits.all.get(entry.id);
  const fields: Record<FieldGroup, React.ReactNode> = {
    what: <WhatFields form={form} />,
    when: (
      <WhenFields
        form={form}
        onSearch={() => {
          setIsChoosing(true);
        }}
      />
    ),
    signs: <SignsFields form={form} />,
    late: <LateFields form={form} />,
    whose: <WhoseFields form={form} />,
  };

  return (
    <section ref={board} className="board @container" aria-labelledby={headingId}>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <EntryHeading id={headingId} content={entry.content} villageLanguage={form.villageLanguage} />
        {saved && (
          <div className="flex gap-2">
            <IconButton
              label={t('editor.duplicate')}
              icon={<Copy aria-hidden size={22} />}
              closed={actions.isBusy}
              onClick={() => {
                actions.duplicate(saved);
              }}
            />
            <IconButton
              label={t('editor.takeOut')}
              icon={<Trash2 aria-hidden size={22} />}
              closed={actions.isBusy}
              onClick={() => {
                actions.takeOut(saved);
              }}
            />
          </div>
        )}
      </div>
      {answers && saved && editor.lastNumber !== null && (
        <ElderRequests
          answers={answers}
          calendarId={editor.calendar.id}
          number={editor.lastNumber}
          entryId={entry.id}
          ways={{
            changeDays: () => {
              openGroup('when');
            },
            changeWords: () => {
              openGroup('what');
            },
            takeOut: () => {
              actions.takeOut(saved);
            },
          }}
        />
      )}
      {saving.overall !== null && (
        <Care blocked role="alert" className="mt-3">
          <p>{saving.overall}</p>
        </Care>
      )}
      {editor.stale && saved && edit ? (
        <StaleChoice
          key={saved.version}
          base={edit.base}
          theirs={saved}
          mine={entry.content}
          markers={form.markers ?? new Map()}
          isSaving={saving.isSaving}
          onSave={(content) => void saving.saveJoined(content, saved.version)}
          onTakeTheirs={() => {
            actions.throwAway(entry);
          }}
        />
      ) : (
        <>
          <EntryWarnings form={form} entry={entry} all={editor.shown} onWay={goWay} />
          <div className="mt-3">
            {GROUPS.map((group) => (
              <div key={group} data-group={group}>
                <Fold
                  title={t(`form.group.${group}`)}
                  line={lines[group] || t('form.nothing')}
                  open={opened.has(group)}
                  onToggle={(isOpen) => {
                    setOpened((before) => toggled(before, group, isOpen));
                  }}
                >
                  {fields[group]}
                </Fold>
              </div>
            ))}
          </div>
          <UnsavedLine editor={editor} entry={entry} actions={actions} />
        </>
      )}
      <MarkerDialog
        isOpen={isChoosing}
        onClose={() => {
          setIsChoosing(false);
        }}
        rows={editor.markers.data?.rows ?? []}
        year={form.year}
        phenomenon={form.draft.marker.phenomenon}
        chosen={form.draft.marker.markerKey}
        inUse={form.inUse}
        onChoose={(markerKey) => {
          form.change(({ marker }) => ({
            leadType: 'marker',
            marker: { ...marker, markerKey, occurrence: 1 },
          }));
        }}
      />
      {!saved && (
        <Button
          look="quiet"
          onClick={() => {
            actions.throwAway(entry);
          }}
        >
          {t('editor.throwNewAway')}
        </Button>
      )}
    </section>
  );
}

function toggled(
  groups: ReadonlySet<FieldGroup>,
  group: FieldGroup,
  isOpen: boolean,
): ReadonlySet<FieldGroup> {
  if (groups.has(group) === isOpen) return groups;
  const next = new Set(groups);
  if (isOpen) next.add(group);
  else next.delete(group);
  return next;
}

/** What each closed group says in one line. */
function useFoldLines(form: FormState): Record<FieldGroup, string> {
  const facts = useEntryFacts().groups(form.content, form.dates, form.year, form.markers ?? new Map());
  const line = (group: FieldGroup) => facts[group].map(({ value }) => value).join(' · ');
  return {
    what: line('what'),
    when: line('when'),
    signs: line('signs'),
    late: line('late'),
    whose: line('whose'),
  };
}

/** After a try to save that was refused: opens the groups concerned and brings the first field into sight. */
function useFirstProblemInSight(
  board: React.RefObject<HTMLElement | null>,
  { attempt, problems }: SaveEntry,
  setOpened: (change: (before: ReadonlySet<FieldGroup>) => ReadonlySet<FieldGroup>) => void,
): void {
  const newest = useRef(problems);
  useEffect(() => {
    newest.current = problems;
  });
  useEffect(() => {
    if (attempt === 0) return undefined;
    setOpened((before) => new Set([...before, ...groupsWithProblems(newest.current)]));
    const frame = requestAnimationFrame(() => {
      board.current?.querySelector<HTMLElement>(':is([aria-invalid="true"], button[data-invalid])')?.focus();
    });
    return () => {
      cancelAnimationFrame(frame);
    };
  }, [attempt, board, setOpened]);
}
