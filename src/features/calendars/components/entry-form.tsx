import { useEffect, useId, useRef, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useEntryFacts } from '#src/lib/entry-facts.js';
import { SignsInLine } from '#src/lib/signs-in-line.js';
import { Button } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { classNames } from '#src/ui/class-names.js';
import { Care } from '#src/ui/surfaces.js';
import type { FieldGroup } from '../model/field-problems.js';
import type { FormState } from '../model/form-state.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { useAdvice } from '../model/use-advice.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import type { SaveEntry } from '../model/use-save-entry.js';
import type { Way } from '../model/warning-ways.js';
import { ActualDaysPanel } from '#src/lib/actual-days-panel.js';
import { ChooseLead } from './choose-lead.js';
import { ElderRequests } from './elder-requests.js';
import { EntryHeading } from './entry-heading.js';
import { EntryTools } from './entry-tools.js';
import { EntryWarnings } from './entry-warnings.js';
import { LateFields, SignsFields, WhoseFields } from './other-fields.js';
import { RecordSigns } from './record-signs.js';
import { RecordNeeds } from './record-needs.js';
import { RecordTrust } from './record-trust.js';
import { RecordHeard, RecordWhat, RecordWhen } from './record-short.js';
import { RecordWork } from './record-work.js';
import { StaleChoice } from './stale-choice.js';
import { UnsavedLine } from './unsaved-line.js';
import { useGroups, type Groups } from './use-groups.js';
import { VariantsPanel } from './variants-panel.js';
import { WhatFields } from './what-fields.js';
import { WhenFields } from './when-fields.js';

export interface EntryFormProps {
  editor: Editor;
  entry: ShownEntry;
  form: FormState;
  saving: SaveEntry;
  actions: EntryActions;
}

/** One entry to be written: what elders asked, what to look at, and groups that close to one line. */
export function EntryForm({ editor, entry, form, saving, actions }: EntryFormProps) {
  const { t } = useTranslation('calendars');
  const headingId = useId();
  const board = useRef<HTMLElement>(null);
  const [isChoosing, setIsChoosing] = useState(false);
  const { saved } = entry;
  const groups = useGroups(board, firstGroups(form, saved !== null), saving);
  const { isWide } = editor.selection;
  useFocusOnNew(groups, saved === null && isWide);
  const advice = useAdvice(editor, entry);
  const answers = editor.answers.get(entry.id);
  const edit = editor.edits.all.get(entry.id);
  const search = () => {
    setIsChoosing(true);
  };
  useChoiceAtFirst(editor.stale, () => saving.choose(entry.id));

  return (
    <section
      ref={board}
      className={classNames('board @container', form.isKeepers && 'big-words')}
      aria-labelledby={headingId}
    >
      <div className="flex items-center justify-between gap-2">
        <EntryHeading id={headingId} content={entry.content} villageLanguage={form.villageLanguage} />
        {saved && isWide && <EntryTools entry={saved} actions={actions} />}
      </div>
      {answers && saved && editor.lastNumber !== null && (
        <ElderRequests
          answers={answers}
          calendarId={editor.calendar.id}
          number={editor.lastNumber}
          entryId={entry.id}
          ways={{
            changeDays: () => groups.goTo('when'),
            changeWords: () => groups.goTo('what'),
            takeOut: () => actions.takeOut(saved),
          }}
        />
      )}
      {saving.overall !== null && (
        <Care blocked role="alert" className="mt-3">
          <p>{saving.overall}</p>
        </Care>
      )}
      {editor.stale && saved && edit && saving.choosingId === entry.id ? (
        <StaleChoice
          key={saved.id}
          base={edit.base}
          theirs={saved}
          mine={entry.content}
          markers={form.markers ?? new Map()}
          isSaving={saving.isSaving}
          onSave={(content) => void saving.saveJoined(content, saved)}
          onTakeTheirs={() => actions.throwAway(entry)}
        />
      ) : (
        <>
          {editor.stale && saved && (
            <Care role="status" className="mt-3">
              <p>{t('live.bothWrite', { name: saved.updatedBy })}</p>
              <Button onClick={() => saving.choose(entry.id)}>{t('live.seeBoth')}</Button>
            </Care>
          )}
          <EntryWarnings
            form={form}
            entry={entry}
            all={editor.shown}
            advice={advice}
            onWay={(way) => goWay(way, form, groups, search)}
          />
          <SignsInLine
            record={entry.content.record}
            window={entry.dates?.window ?? null}
            year={editor.calendar.year}
            home={saved ? { calendarId: editor.calendar.id, entryId: saved.id } : undefined}
          />
          <GroupFolds form={form} groups={groups} onSearch={search} />
          <RecordNeeds form={form} isOlder={saved?.isOlder ?? false} />
          {saved && (
            <ActualDaysPanel calendarId={editor.calendar.id} year={editor.calendar.year} entry={saved} />
          )}
          {saved && <VariantsPanel editor={editor} form={form} />}
          <UnsavedLine editor={editor} entry={entry} actions={actions} />
        </>
      )}
      {saved && !isWide && <EntryTools entry={saved} actions={actions} inWords />}
      {!saved && (
        <Button look="quiet" onClick={() => actions.throwAway(entry)}>
          {t('editor.throwNewAway')}
        </Button>
      )}
      <ChooseLead editor={editor} form={form} isOpen={isChoosing} onClose={() => setIsChoosing(false)} />
    </section>
  );
}

/** Two texts that are there when the entry is opened are shown at once; those that come while somebody writes wait. */
function useChoiceAtFirst(isStale: boolean, choose: () => void): void {
  const first = useRef({ isStale, choose });
  useEffect(() => {
    if (first.current.isStale) first.current.choose();
  }, []);
}

/** A new entry begins in its first field; a phone keeps its heading, so that no keyboard covers the view. */
function useFocusOnNew({ goTo }: Groups, isWanted: boolean): void {
  const go = useRef(goTo);
  useEffect(() => {
    if (isWanted) go.current('what');
  }, [isWanted]);
}

/** What stands open at first: of an elder's own entry its words alone. */
function firstGroups({ isKeepers }: FormState, isSaved: boolean): FieldGroup[] {
  if (isKeepers) return ['what'];
  return isSaved ? ['when'] : ['what', 'when'];
}

const GROUPS: readonly FieldGroup[] = ['what', 'when', 'signs', 'work', 'trust', 'whose'];

interface GroupFoldsProps {
  form: FormState;
  groups: Groups;
  onSearch: () => void;
}

function GroupFolds({ form, groups, onSearch }: GroupFoldsProps) {
  const { t } = useTranslation('calendars');
  const facts = useEntryFacts().groups(form.content, form.dates, form.year, form.markers ?? new Map());
  const fields: Record<FieldGroup, ReactNode> = {
    what: withMore(<WhatFields form={form} />, <RecordWhat form={form} />),
    when: withMore(<WhenFields form={form} onSearch={onSearch} />, <RecordWhen form={form} />),
    signs: withMore(<SignsFields form={form} />, <RecordSigns form={form} />),
    work: withMore(<LateFields form={form} />, <RecordWork form={form} />),
    trust: <RecordTrust form={form} />,
    whose: withMore(<WhoseFields form={form} />, <RecordHeard form={form} />),
  };
  return (
    <div className="mt-3">
      {GROUPS.map((group) => (
        <div key={group} data-group={group}>
          <Fold
            title={t(`form.group.${group}`)}
            line={facts[group].map(({ value }) => value).join(' · ') || t('form.nothing')}
            open={groups.opened.has(group)}
            onToggle={(isOpen) => groups.toggle(group, isOpen)}
          >
            {fields[group]}
          </Fold>
        </div>
      ))}
    </div>
  );
}

function withMore(first: ReactNode, more: ReactNode): ReactNode {
  return (
    <div className="grid gap-4">
      {first}
      {more}
    </div>
  );
}

/** Does what a way out of a warning says. */
function goWay(way: Way, form: FormState, groups: Groups, search: () => void): void {
  switch (way.kind) {
    case 'otherStar':
    case 'otherSign':
      search();
      return;
    case 'fixedDate':
      form.change({ leadType: 'fixed-date' });
      groups.goTo('when');
      return;
    case 'byPlanned':
      form.change({ leadType: 'entry-planned' });
      groups.goTo('when');
      return;
    case 'otherDay':
      form.change(({ marker }) => ({ marker: { ...marker, phenomenon: way.phenomenon, occurrence: 1 } }));
      return;
    case 'useFirst':
      form.change(({ marker }) => ({ marker: { ...marker, occurrence: 1 } }));
      return;
    case 'writeSigns':
      groups.goTo('signs');
      return;
    case 'otherPeople':
      groups.goTo('work');
      return;
    case 'writeCaution':
      groups.goTo('what');
      return;
    case 'changeDays':
    case 'changeLastDate':
      groups.goTo('when');
  }
}
