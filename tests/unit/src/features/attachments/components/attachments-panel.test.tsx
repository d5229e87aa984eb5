import 'fake-indexeddb/auto';
import { screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { WordsInput } from '#shared/contracts/attachments.js';
import { unnamedMoons } from '#shared/contracts/local-months.js';
import type { Role } from '#shared/contracts/people.js';
import type { SessionState } from '#shared/contracts/session.js';
import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { keepRecording, keepSlice } from '#src/features/attachments/model/kept-recordings.js';
import { answerWith, refusal, type Answers } from '#tests/support/answers.js';
import { attachmentOf } from '#tests/support/attachment-on-board.js';
import { keptRecording } from '#tests/support/kept-recording.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const { communityId, subjectType, subjectId, id } = attachmentOf();
const LIST = `GET /api/communities/${communityId}/attachments`;
const COMMUNITY = {
  [`GET /api/communities/${communityId}`]: {
    id: communityId,
    name: 'Upper Tazimel',
    villageLanguage: { tag: 'art-x-tazimel', name: 'Tazimeli' },
    officerLanguage: { tag: 'en', name: 'English' },
    yearStart: { date: { month: 6, day: 8 }, note: '' },
    localMonths: [],
    moonNames: unnamedMoons(),
    weatherContact: '',
    agricultureContact: '',
    signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: false },
    version: 1,
  },
};

function as(...roles: Role[]): SessionState {
  const memberships = OFFICER.memberships?.map((membership) => ({ ...membership, roles })) ?? null;
  return { ...OFFICER, memberships };
}

async function show(answers: Answers, session = as('elder')) {
  const sent = answerWith({ ...COMMUNITY, ...answers });
  const view = await renderOnBoard(
    <AttachmentsPanel communityId={communityId} subject={{ subjectType, subjectId }} />,
    { session },
  );
  return { ...view, sent };
}
const items = (...list: unknown[]) => ({ items: list, nextCursor: null });

afterEach(() => {
  vi.unstubAllGlobals();
});

describe('voices and pictures of a thing', () => {
  it('say that there are none yet, and offer whoever may the ways to add one', async () => {
    await show({ [LIST]: items() });
    expect(await screen.findByText('Nobody has added a voice or a picture yet.')).toBeTruthy();
    expect(screen.getAllByRole('button').map((button) => button.textContent)).toEqual([
      'Record a voice',
      'Add a picture',
    ]);
  });

  it('are there to be heard by an observer, who adds nothing and changes nothing', async () => {
    const heard = attachmentOf({
      hasWordsAlone: false,
      may: { writeWords: false, remove: false },
      parts: attachmentOf().parts.slice(1),
    });
    await show({ [LIST]: items(heard) }, as('observer'));
    const card = await screen.findByRole('article', { name: 'Why the bowl is empty' });
    expect(
      within(card)
        .getAllByRole('button')
        .map((button) => button.textContent),
    ).toEqual(['Listen', 'From the beginning']);
    expect(screen.queryByRole('button', { name: 'Record a voice' })).toBeNull();
    expect(within(card).getByText(/1 part, 1:05/u)).toBeTruthy();
  });

  it('can be asked for again when they did not come through', async () => {
    let turn = 0;
    const { user } = await show({ [LIST]: () => (turn++ === 0 ? refusal('something-broke', 500) : items()) });
    await user.click(await screen.findByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Nobody has added a voice or a picture yet.')).toBeTruthy();
  });

  it('tell of a recording that is still on this device', async () => {
    const personId = OFFICER.person?.id ?? '';
    const kept = keptRecording({ personId, subjectType, subjectId, communityId });
    await keepRecording(kept);
    await keepSlice(kept.clientId, { part: 0, index: 0, content: new Blob(['I agree']), seconds: 2 });
    await keepSlice(kept.clientId, { part: 1, index: 0, content: new Blob(['a voice']), seconds: 65 });
    const { user } = await show({ [LIST]: items() });
    expect(await screen.findByText('An unsent recording is here')).toBeTruthy();
    expect(screen.getByText(/^A-2, .*: 1:05\. It is on this device only\.$/u)).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Listen to it' }));
    expect(await screen.findByRole('heading', { name: 'Listen to it' })).toBe(document.activeElement);
    await user.click(screen.getByRole('button', { name: 'Throw it away' }));
    expect(await screen.findByText('The recording is thrown away.')).toBeTruthy();
    expect(screen.queryByText('An unsent recording is here')).toBeNull();
  });

  it('do not offer to record where the page is not safe for it', async () => {
    vi.stubGlobal('isSecureContext', false);
    const { user } = await show({ [LIST]: items() });
    await user.click(await screen.findByRole('button', { name: 'Record a voice' }));
    expect(await screen.findByText(/Recording needs a page that comes over https/u)).toBeTruthy();
  });
});

describe('written-out words', () => {
  it('show both texts when somebody saved meanwhile; nothing typed is lost', async () => {
    const theirs = {
      kind: 'words',
      language: 'art-x-tazimel',
      text: 'Theirs',
      authorName: 'Beyno',
      checkedBySpeaker: false,
      updatedAt: '2027-03-10T06:00:00.000Z',
      version: 1,
    };
    const saves: WordsInput[] = [];
    const { user } = await show({
      [LIST]: items(attachmentOf()),
      [`PUT /api/attachments/${id}/words`]: ({ body }: { body: WordsInput }) => {
        saves.push(body);
        return saves.length === 1
          ? refusal('stale', 409, { current: theirs, sent: body })
          : attachmentOf({ words: [{ ...theirs, kind: 'words', text: body.text, version: 2 }] });
      },
    });
    await user.click(await screen.findByRole('button', { name: 'Write it out' }));
    await user.click(screen.getByRole('button', { name: 'Save the text' }));
    expect(await screen.findByText('Fill this in.')).toBeTruthy();
    await user.type(screen.getByRole('textbox', { name: 'Text' }), 'Mine');
    await user.click(screen.getByRole('button', { name: 'Save the text' }));
    expect(await screen.findByText('Theirs')).toBeTruthy();
    expect(screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Text' }).value).toBe('Mine');
    await user.click(screen.getByRole('button', { name: 'Save mine instead' }));
    expect(await screen.findByText('The text is saved.')).toBeTruthy();
    expect(saves.map(({ text, version, language }) => [text, version, language])).toEqual([
      ['Mine', null, 'art-x-tazimel'],
      ['Mine', 1, 'art-x-tazimel'],
    ]);
  });
});

describe('adding a picture', () => {
  it('tells the limit before, looks at the file before, and asks about the people in it', async () => {
    vi.stubGlobal(
      'URL',
      Object.assign(class extends URL {}, { createObjectURL: () => 'blob:x', revokeObjectURL: vi.fn() }),
    );
    const { user, sent } = await show({ [LIST]: items() });
    await user.click(await screen.findByRole('button', { name: 'Add a picture' }));
    expect(screen.getByText(/JPEG, PNG or WebP, up to 12 MB/u)).toBeTruthy();
    expect(screen.getByText(/Everybody who can be made out has to agree first/u)).toBeTruthy();
    const input = screen.getByLabelText('Choose a picture');
    await user.upload(input, new File([new Uint8Array(13 * 1024 * 1024)], 'a.jpg', { type: 'image/jpeg' }));
    expect(await screen.findByText(/This picture has 13\.0 MB/u)).toBeTruthy();
    await user.upload(input, new File(['small'], 'b.jpg', { type: 'image/jpeg' }));
    expect(screen.queryByText(/This picture has/u)).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Keep it' }));
    expect(screen.getByText('Fill this in.')).toBeTruthy();
    expect(screen.getByText('Choose one of the two.')).toBeTruthy();
    expect(sent.some(({ method }) => method === 'POST')).toBe(false);
  });
});
