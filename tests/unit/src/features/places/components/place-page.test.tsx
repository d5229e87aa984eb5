import { act, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Place, PlaceInput } from '#shared/contracts/places.js';
import { PlacePage } from '#src/features/places/components/place-page.js';
import { answerWith, refusal, type Answers } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { skylineEffects, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over real years of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

const placePath = `/api/places/${TAZIMEL.id}`;
const communityPath = `/api/communities/${TAZIMEL.communityId}`;

/** A server that keeps one place. */
function server(saved: { place: Place }): Answers {
  return {
    [`GET ${placePath}`]: () => saved.place,
    [`GET ${communityPath}/places`]: () => ({ items: [saved.place], nextCursor: null }),
    [`GET ${placePath}/skyline-effects`]: () => ({
      items: skylineEffects(2027, saved.place),
      nextCursor: null,
    }),
    [`POST ${communityPath}/skyline-effects`]: ({ body }: { body: unknown }) => {
      const { place } = body as { place: PlaceInput };
      return { items: skylineEffects(2027, { ...TAZIMEL, ...place }), nextCursor: null };
    },
    'GET /api/time-zone': { timeZone: 'Africa/Addis_Ababa' },
    [`PUT ${placePath}`]: ({ body }: { body: unknown }) => {
      const { version, ...input } = body as PlaceInput & { version: number };
      if (version !== saved.place.version) return refusal('stale', 409, { current: saved.place, sent: body });
      saved.place = { ...saved.place, ...input, version: version + 1 };
      return saved.place;
    },
  };
}

const open = (session = OFFICER) =>
  renderOnBoard(<PlacePage />, { session, path: `/places/${TAZIMEL.id}`, pattern: '/places/:placeId' });
const save = () => screen.getByRole('button', { name: /Save the place/ });
const puts = (log: readonly { method: string; body: unknown }[]) =>
  log.filter(({ method }) => method === 'PUT').map(({ body }) => body);

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
  vi.stubGlobal('scrollTo', vi.fn());
  localStorage.clear();
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

async function write(user: Awaited<ReturnType<typeof open>>['user'], label: string, text: string) {
  const field = screen.getByLabelText(label);
  await user.clear(field);
  await user.click(field);
  await user.paste(text);
}

describe('the form of a place', () => {
  it('cannot be saved while nothing has changed, and says so', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await screen.findByLabelText('Latitude');
    await user.click(save());
    expect(screen.getByText('Nothing has changed yet.')).toBeTruthy();
    expect(puts(log)).toEqual([]);
  });

  it('takes coordinates as people write them and sends degrees', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await screen.findByLabelText('Latitude');
    await write(user, 'Latitude', '12° 30′ S');
    await write(user, 'Height, metres', '2,010 m');
    await user.click(save());
    await screen.findByText(/is saved/);
    expect(puts(log)).toMatchObject([{ latitudeDeg: -12.5, elevationM: 2010, version: 3 }]);
  });

  it('takes the months of rain and cloud as switches, and moves no date by them', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    const board = (await screen.findByRole('heading', { name: 'Months of rain and cloud' })).closest(
      'section',
    );
    const month = (name: string) => within(board as HTMLElement).getByRole('button', { name });
    expect(month('July').getAttribute('aria-pressed')).toBe('true');
    await user.click(month('July'));
    await user.click(month('October'));
    await user.click(save());
    await screen.findByText(/is saved/);
    const wet = [5, 7, 8, 9];
    expect(puts(log)).toMatchObject([
      { rainMonths: Array.from({ length: 12 }, (_, index) => wet.includes(index)) },
    ]);
    expect(skylineEffects(2027, { ...TAZIMEL, rainMonths: [] })).toEqual(skylineEffects(2027, TAZIMEL));
  });

  it('says what to change, keeps what was typed and goes to the field', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await screen.findByLabelText('Latitude');
    await write(user, 'Latitude', '12° 75′ N');
    await user.click(save());
    const field = screen.getByLabelText<HTMLInputElement>('Latitude');
    expect(screen.getByText('Minutes go up to 59. What you typed is still here; change 75.')).toBeTruthy();
    expect(field.value).toBe('12° 75′ N');
    expect(document.activeElement).toBe(field);
    expect(puts(log)).toEqual([]);
  });

  it('brings back what was typed after a reload, until it is thrown away', async () => {
    answerWith(server({ place: TAZIMEL }));
    const first = await open();
    await screen.findByLabelText('Latitude');
    await write(first.user, 'Name of the place', 'Half written');
    await act(() => vi.advanceTimersByTimeAsync(1000));
    first.unmount();

    const { user } = await open();
    expect((await screen.findByLabelText<HTMLInputElement>('Name of the place')).value).toBe('Half written');
    await user.click(screen.getByRole('button', { name: 'Throw it away' }));
    expect(screen.getByLabelText<HTMLInputElement>('Name of the place').value).toBe(TAZIMEL.name);
  });
});

describe('an undo', () => {
  it('puts a point back and leaves alone what was typed since', async () => {
    answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await screen.findByRole('button', { name: /^110°/ });
    await user.click(screen.getByRole('button', { name: 'Take it away' }));
    expect(screen.queryByRole('button', { name: /^110°/ })).toBeNull();
    await write(user, 'Name of the place', 'Typed since');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getByRole('button', { name: /^110°.* 3.5° high/ })).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('Name of the place').value).toBe('Typed since');
  });
});

describe('what is typed while a save is on its way', () => {
  it('stays, and can be saved after it', async () => {
    const saved = { place: TAZIMEL };
    const answers = server(saved);
    const put = answers[`PUT ${placePath}`] as (sent: { body: unknown }) => unknown;
    let go: () => void = () => undefined;
    const gate = new Promise<void>((resolve) => {
      go = resolve;
    });
    let isFirst = true;
    const log = answerWith({
      ...answers,
      [`PUT ${placePath}`]: async (sent: { body: unknown }) => {
        if (isFirst) await gate;
        isFirst = false;
        return put(sent);
      },
    });
    const { user } = await open();
    await screen.findByLabelText('Latitude');
    await write(user, 'Name of the place', 'First');
    await user.click(save());
    await write(user, 'Height, metres', '2222');
    go();
    await screen.findByText('First is saved. Its dates are computed anew.');
    expect(screen.getByLabelText<HTMLInputElement>('Height, metres').value).toBe('2222');
    await user.click(save());
    await vi.waitFor(() => expect(saved.place.elevationM).toBe(2222));
    expect(puts(log).at(-1)).toMatchObject({ name: 'First', elevationM: 2222, version: 4 });
  });
});

describe('a save over a newer state', () => {
  it('shows both states field by field and saves what the person chose', async () => {
    const saved = { place: TAZIMEL };
    const log = answerWith(server(saved));
    const { user } = await open();
    await screen.findByLabelText('Latitude');
    await write(user, 'Name of the place', 'Mine');
    saved.place = { ...TAZIMEL, name: 'Theirs', elevationM: 7, version: 4 };
    await user.click(save());

    const name = within(await screen.findByRole('group', { name: /Name of the place/ }));
    expect(name.getByText('Theirs')).toBeTruthy();
    expect(name.getByText('Mine')).toBeTruthy();
    const height = within(screen.getByRole('group', { name: /Height, metres/ }));
    expect(height.getByRole<HTMLInputElement>('radio', { name: /Saved meanwhile/ }).checked).toBe(true);
    await user.click(name.getByRole('radio', { name: /Yours/ }));
    await user.click(screen.getByRole('button', { name: 'Go on with this choice' }));
    await user.click(save());
    await screen.findByText(/is saved/);
    expect(puts(log).at(-1)).toMatchObject({ name: 'Mine', elevationM: 7, version: 4 });
    expect(saved.place).toMatchObject({ name: 'Mine', elevationM: 7, version: 5 });
  });
});

describe('the skyline', () => {
  it('is stepped by keyboard: arrows move the ring, Page Down goes to the next one', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    const ring = await screen.findByRole('button', { name: /^110°, a little south of east, 3.5° high/ });
    ring.focus();
    await user.keyboard('{ArrowUp}{ArrowUp}{ArrowRight}');
    expect(screen.getByRole('button', { name: /^111°.* 4.5° high/ })).toBe(document.activeElement);
    await user.keyboard('{PageDown}');
    expect(document.activeElement?.getAttribute('aria-label')).toMatch(/^135°/);
    await user.click(save());
    await screen.findByText(/is saved/);
    const [sent] = puts(log) as PlaceInput[];
    expect(sent?.skyline).toContainEqual({ azimuthDeg: 111, altitudeDeg: 4.5 });
  });

  it('is not saved from a table until every line is right', async () => {
    const log = answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await user.click(await screen.findByRole('button', { name: 'Paste or load a table instead' }));
    await write(user, 'Skyline table', '90, thirty\n100, 2');
    expect(
      screen.getByText('Line 1: “thirty” is no height. Use a number from −5 to 60.', { exact: false }),
    ).toBeTruthy();
    await user.click(save());
    expect(puts(log)).toEqual([]);
    await write(user, 'Skyline table', '90, 3\n100, 2');
    await user.click(screen.getByRole('button', { name: 'Use this table' }));
    await user.click(save());
    await screen.findByText(/is saved/);
    expect(puts(log)).toMatchObject([
      {
        skyline: [
          { azimuthDeg: 90, altitudeDeg: 3 },
          { azimuthDeg: 100, altitudeDeg: 2 },
        ],
      },
    ]);
  });

  it('moves the dates beside the flat ones before it is saved', async () => {
    answerWith(server({ place: TAZIMEL }));
    const { user } = await open();
    await user.click(await screen.findByRole('button', { name: 'Paste or load a table instead' }));
    await write(user, 'Skyline table', '0, 12');
    await act(() => vi.advanceTimersByTimeAsync(1000));
    await screen.findByText(/as it stands on this screen/);
    await user.click(await screen.findByRole('button', { name: /^Show \d+ more$/ }));
    const canopus = await screen.findByRole('heading', { name: /Canopus, first morning seen/ });
    const card = canopus.closest('section');
    expect(card?.textContent).toMatch(/The hills make it \d+ days later\./);
  });
});

describe('who may change a place', () => {
  it('is an officer; everybody else reads it', async () => {
    answerWith(server({ place: TAZIMEL }));
    const observer = {
      ...OFFICER,
      memberships: [{ ...OFFICER.memberships?.[0], roles: ['observer' as const] }],
    } as typeof OFFICER;
    await open(observer);
    await screen.findByText('Officers of the village can change this place.');
    expect(screen.queryByRole('button', { name: /Save the place/ })).toBeNull();
    expect(screen.getByText('12° 0′ N')).toBeTruthy();
  });
});
