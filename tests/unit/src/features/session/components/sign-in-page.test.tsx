import { screen } from '@testing-library/react';
import type { UserEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SignInPage } from '#src/features/session/components/sign-in-page.js';
import { OFFICER, renderOnBoard, VISITOR } from '#tests/support/on-board.js';

const sent: unknown[] = [];

function answerWith(response: () => Response) {
  vi.stubGlobal('fetch', (_url: string, init: RequestInit) => {
    if (init.method === 'POST') {
      sent.push(typeof init.body === 'string' ? JSON.parse(init.body) : null);
      return Promise.resolve(response());
    }
    return Promise.resolve(Response.json(VISITOR));
  });
}

afterEach(() => {
  sent.length = 0;
  vi.unstubAllGlobals();
});

const open = (path = '/sign-in') =>
  renderOnBoard(<SignInPage />, { session: VISITOR, path, pattern: '/sign-in' });
const email = () => screen.getByLabelText<HTMLInputElement>('E-mail address');
const password = () => screen.getByLabelText<HTMLInputElement>('Password');

async function write(user: UserEvent, field: HTMLInputElement, text: string) {
  await user.click(field);
  await user.paste(text);
}

describe('signing in', () => {
  it('brings the person to the page they wanted', async () => {
    answerWith(() => Response.json(OFFICER));
    const { user, address } = await open('/sign-in?next=%2Fstars%3Fyear%3D2027');
    await write(user, email(), 'Officer@dawnpeg.example');
    await write(user, password(), 'limewash-and-pegs');
    await user.keyboard('{Enter}');
    await vi.waitFor(() => expect(address()).toBe('/stars?year=2027'));
    expect(sent).toEqual([{ email: 'officer@dawnpeg.example', password: 'limewash-and-pegs' }]);
  });

  it('does not follow an address of another site', async () => {
    answerWith(() => Response.json(OFFICER));
    const { user, address } = await open('/sign-in?next=%2F%2Felsewhere.example');
    await write(user, email(), 'a@dawnpeg.example');
    await write(user, password(), 'x');
    await user.keyboard('{Enter}');
    await vi.waitFor(() => expect(address()).toBe('/'));
  });

  it('says what to do when address and password do not match, and keeps both', async () => {
    const refusal = { type: '/problems/wrong-credentials', title: 'x', status: 401, detail: 'x' };
    answerWith(
      () =>
        new Response(JSON.stringify(refusal), {
          status: 401,
          headers: { 'Content-Type': 'application/problem+json' },
        }),
    );
    const { user } = await open();
    await write(user, email(), 'a@dawnpeg.example');
    await write(user, password(), 'wrong');
    await user.keyboard('{Enter}');
    expect((await screen.findByRole('alert')).textContent).toContain('does not match');
    expect(email().value).toBe('a@dawnpeg.example');
    expect(password().value).toBe('wrong');
  });

  it('asks for what is missing at its field before anything is sent', async () => {
    answerWith(() => Response.json(OFFICER));
    const { user } = await open();
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('Fill this in.')).toBeDefined();
    expect(sent).toEqual([]);
    expect(document.activeElement).toBe(email());
  });

  it('lets the password be looked at', async () => {
    const { user } = await open();
    expect(password().type).toBe('password');
    await user.click(screen.getByRole('button', { name: 'Show the password' }));
    expect(password().type).toBe('text');
  });
});
