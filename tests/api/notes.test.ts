import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Note } from '#shared/contracts/notes.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publish,
  reasonOf,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';
import { addPart, addRecording, attachmentsPath, recordingInput } from '#tests/support/attachment-api.js';
import { webm } from '#tests/support/media.js';
import { addFigure } from '#tests/support/figure-api.js';
import { addNote, noteInput, notesOn, notesPath } from '#tests/support/notes-api.js';
import { addGroup, details, sharingPath } from '#tests/support/sharing-api.js';

const LATE = 'Then sow the\nshort millet.';

let api: TestApi;
let village: Village;
let observer: Client;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  observer = await api.signIn('observer');
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

describe('a note', () => {
  it('is pinned to the whole, the window, the marker or a word of an entry, by whoever sees it', async () => {
    const { id } = await addEntry(village.officer, calendar.id, { ifLate: LATE });
    const pins = [
      { at: 'whole' },
      { at: 'window' },
      { at: 'marker' },
      { at: 'words', field: 'ifLate', quote: 'the short millet' },
    ] as const;
    for (const pin of pins) await addNote(village.elder, { subjectId: id, pin });
    const notes = await notesOn(village.officer, 'entry', id);
    expect(notes.map(({ pin }) => pin.at).sort()).toEqual(pins.map(({ at }) => at).sort());
    expect(notes[0]).toMatchObject({ authorName: 'Elder A-1', mine: false, closedAt: null, answers: [] });
  });

  it('is refused without words, and with a window where there is none', async () => {
    const figure = await addFigure(village.officer);
    const path = notesPath(village.elder);
    const { id } = await addEntry(village.officer, calendar.id);
    const empty = await village.elder.post(path, noteInput({ subjectId: id, text: '  ' })).expect(422);
    expect(empty.body).toMatchObject({ errors: [{ field: 'text', code: 'required' }] });
    const about = { subjectType: 'figure', subjectId: figure.id, pin: { at: 'window' } } as const;
    const window = await village.elder.post(path, noteInput(about)).expect(422);
    expect(window.body).toMatchObject({ errors: [{ field: 'pin', code: 'not-in-list' }] });
  });

  it('is answered in its thread, and closed and opened by its writer alone', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: id });
    const path = (client: Client, rest: string) => notesPath(client, `/${note.id}/${rest}`);
    const answered = await village.officer
      .post(path(village.officer, 'answers'), { text: 'Then let us ask A-2.' })
      .expect(201);
    expect(answered.body).toMatchObject({ answers: [{ text: 'Then let us ask A-2.', mine: true }] });
    expect(reasonOf(await village.officer.put(path(village.officer, 'closed')))).toBe('409 not-the-writer');
    const closed = (await village.elder.put(path(village.elder, 'closed')).expect(200)).body as Note;
    expect(closed.closedAt).not.toBeNull();
    const late = await village.officer.post(path(village.officer, 'answers'), { text: 'One thing more' });
    expect(reasonOf(late)).toBe('409 note-closed');
    const open = (await village.elder.delete(path(village.elder, 'closed')).expect(200)).body as Note;
    expect(open.closedAt).toBeNull();
  });

  it('stands on a figure and on a star, for everybody of the village', async () => {
    const figure = await addFigure(village.officer);
    await addNote(observer, { subjectType: 'figure', subjectId: figure.id, text: 'My aunt tells it so.' });
    await addNote(observer, { subjectType: 'marker', subjectId: 'pleiades', text: 'Seen late here.' });
    expect(await notesOn(village.elder2, 'figure', figure.id)).toHaveLength(1);
    expect(await notesOn(village.elder2, 'marker', 'pleiades')).toHaveLength(1);
  });
});

describe('the words that a note is pinned to', () => {
  const pinned = (quote: string) => ({ pin: { at: 'words', field: 'ifLate', quote } }) as const;

  it('stand in the text as its writer sees it, or the note is refused', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const made = await village.elder
      .post(notesPath(village.elder), noteInput({ subjectId: id, ...pinned('never said') }))
      .expect(422);
    expect(made.body).toMatchObject({ errors: [{ field: 'pin', code: 'words-not-there' }] });
  });

  it('are not guessed in a story that is not for whoever guesses', async () => {
    const figure = await addFigure(village.officer, { story: 'The quiet bowl', storyLevel: 'sealed' });
    const about = { subjectType: 'figure', subjectId: figure.id } as const;
    const pin = { at: 'words', field: 'story', quote: 'quiet bowl' } as const;
    await addNote(village.officer, { ...about, pin });
    const guess = await village.elder.post(notesPath(village.elder), noteInput({ ...about, pin }));
    expect(guess.body).toMatchObject({ errors: [{ field: 'pin', code: 'words-not-there' }] });
  });

  it('have changed since, once the text says something else', async () => {
    const entry = await addEntry(village.officer, calendar.id, { ifLate: LATE });
    await addNote(village.elder, { subjectId: entry.id, ...pinned('short millet') });
    expect((await notesOn(village.elder, 'entry', entry.id))[0]?.wordsStand).toBe(true);
    const content = { ...entry.content, ifLate: 'Sow nothing.' };
    await village.officer
      .put(`/api/calendars/${calendar.id}/entries/${entry.id}`, { content, version: entry.version })
      .expect(200);
    expect((await notesOn(village.elder, 'entry', entry.id))[0]?.wordsStand).toBe(false);
  });
});

describe('a spoken note', () => {
  const said = { subjectType: 'note', sharingLevel: 'village' } as const;

  it('is its writer’s alone until its recording has come whole', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: id, text: '', isSpoken: true });
    expect(await notesOn(village.officer, 'entry', id)).toEqual([]);
    const recording = await addRecording(village.elder, note.id, said, []);
    expect(await notesOn(village.officer, 'entry', id)).toEqual([]);
    await addPart(village.elder, recording.id, 1, 'my note');
    expect(await notesOn(village.officer, 'entry', id)).toMatchObject([{ text: '', voices: 1 }]);
    const heard = await village.officer.get(`/api/attachments/${recording.id}/parts/1`);
    expect(heard.status).toBe(200);
  });

  it('is answered by voice, by whoever reads it', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: id });
    await addRecording(village.officer, note.id, said);
    expect(await notesOn(village.elder, 'entry', id)).toMatchObject([{ voices: 1 }]);
  });

  it('is heard by nobody who does not read the note, whatever the recording says of itself', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: id, level: 'elders' });
    const recording = await addRecording(village.elder, note.id, said);
    for (const path of [`/api/attachments/${recording.id}`, `/api/attachments/${recording.id}/parts/1`]) {
      expect((await village.elder2.get(path)).status).toBe(200);
      expect(reasonOf(await village.officer.get(path))).toBe('404 not-found');
    }
    const own = recordingInput({ ...said, subjectId: note.id });
    const sent = await village.officer.upload(attachmentsPath(village.officer), own, webm({ note: 'I' }));
    expect(reasonOf(sent)).toBe('404 not-found');
  });

  it('goes with its note, and with what the note is about', async () => {
    const entry = await addEntry(village.officer, calendar.id, { giverId: village.elder.personId });
    const notes = [
      await addNote(village.elder, { subjectId: entry.id }),
      await addNote(village.elder2, { subjectId: entry.id }),
    ];
    await addRecording(village.elder, notes[0]?.id ?? '', said);
    await addRecording(village.elder2, notes[1]?.id ?? '', said);
    const takeBack = (type: string, id: string) =>
      village.elder.post(`/api/communities/${village.elder.communityId}/items/${type}/${id}/withdrawal`, {
        leavesTrace: false,
        askedById: null,
      });
    expect((await takeBack('note', notes[0]?.id ?? '')).status).toBeLessThan(300);
    expect(await api.dataSource.query('SELECT id FROM attachment')).toHaveLength(1);
    expect((await takeBack('entry', entry.id)).status).toBeLessThan(300);
    expect(await api.dataSource.query('SELECT storage_key FROM attachment_part')).toEqual([]);
  });
});

describe('who sees a note', () => {
  it('sees what it is about now: an entry made narrower takes its notes along', async () => {
    const entry = await addEntry(village.officer, calendar.id, { giverId: village.elder.personId });
    const note = await addNote(village.officer, { subjectId: entry.id });
    const sharing = { level: 'elders', ...details() };
    await village.elder
      .put(sharingPath(village.elder, 'entry', entry.id), { sharing, version: 1 })
      .expect(200);
    const query = `?subjectType=entry&subjectId=${entry.id}`;
    expect(reasonOf(await village.officer.get(notesPath(village.officer, query)))).toBe('404 not-found');
    expect(reasonOf(await village.officer.put(notesPath(village.officer, `/${note.id}/closed`)))).toBe(
      '404 not-found',
    );
    expect(await notesOn(village.elder2, 'entry', entry.id)).toHaveLength(1);
  });

  it('may be fewer than see its subject: one for the elders is the elders’ and its writer’s', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: id, level: 'elders' });
    expect(await notesOn(village.officer, 'entry', id)).toEqual([]);
    expect(await notesOn(village.elder2, 'entry', id)).toHaveLength(1);
    const answer = await village.officer.post(notesPath(village.officer, `/${note.id}/answers`), {
      text: 'I see nothing',
    });
    expect(reasonOf(answer)).toBe('404 not-found');
  });

  it('is not the observer while the entry stands in a draft only, unless it is their group’s', async () => {
    const plain = await addEntry(village.officer, calendar.id);
    const group = await addGroup(village.elder, 'Lamp-makers', [village.elder, observer]);
    const kept = await addEntry(village.elder, calendar.id, {
      sharingLevel: 'group',
      sharing: details({ groupId: group.id }),
    });
    const query = `?subjectType=entry&subjectId=${plain.id}`;
    expect(reasonOf(await observer.get(notesPath(observer, query)))).toBe('404 not-found');
    await addNote(observer, { subjectId: kept.id });
    expect(await notesOn(village.elder, 'entry', kept.id)).toHaveLength(1);
  });

  it('is everybody of the village once the entry is published', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    await publish(village, await submit(village.officer, calendar.id));
    await addNote(observer, { subjectId: id, text: 'We saw it on the fifth.' });
    expect(await notesOn(village.officer, 'entry', id)).toHaveLength(1);
  });
});

describe('the records of notes', () => {
  it('say who pinned one to what, without its words', async () => {
    const { id } = await addEntry(village.officer, calendar.id, { titleOfficer: 'Sow long millet' });
    await addNote(village.elder, { subjectId: id, text: 'Quiet words' });
    const path = `/api/communities/${village.officer.communityId}/audit`;
    const { items } = (await village.officer.get(path).expect(200)).body as { items: AuditEvent[] };
    expect(items[0]).toMatchObject({ action: 'note-added', subjectName: 'Sow long millet' });
    expect(JSON.stringify(items)).not.toContain('Quiet words');
  });

  it('are silent about notes on what leaves no trace', async () => {
    const { id } = await addEntry(village.elder, calendar.id, { sharingLevel: 'sealed' });
    await addNote(village.elder, { subjectId: id });
    const path = `/api/communities/${village.officer.communityId}/audit`;
    expect((await village.officer.get(path).expect(200)).text).not.toContain('note-added');
  });
});

describe('what is withdrawn', () => {
  it('takes the notes on it along', async () => {
    const entry = await addEntry(village.officer, calendar.id, { giverId: village.elder.personId });
    await addNote(village.officer, { subjectId: entry.id });
    await village.elder
      .post(`/api/communities/${village.elder.communityId}/items/entry/${entry.id}/withdrawal`, {
        leavesTrace: false,
        askedById: null,
      })
      .expect((answer) => {
        expect(answer.status).toBeLessThan(300);
      });
    expect(await api.dataSource.query('SELECT id FROM note')).toEqual([]);
  });
});
