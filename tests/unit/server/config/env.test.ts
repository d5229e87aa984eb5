import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { ConfigError, parseConfig, VARIABLE_NAMES } from '#server/config/env.js';
import { defaults } from '../../../../docker-free-scripts/lib/settings.mjs';

const needed = { DB_PASSWORD: 'a password', SESSION_SECRET: 's'.repeat(32) };
const production = {
  ...needed,
  NODE_ENV: 'production',
  PUBLIC_URL: 'https://calendar.example',
  TRUST_PROXY: '1',
};

function refusal(values: Record<string, string>): ConfigError {
  try {
    parseConfig(values);
  } catch (error) {
    if (error instanceof ConfigError) return error;
    throw error;
  }
  throw new Error('nothing was refused');
}

describe('the settings', () => {
  it('have a default for everything but the two secrets, on this machine only, with the demo villages', () => {
    expect(parseConfig(needed)).toMatchObject({
      nodeEnv: 'development',
      host: '127.0.0.1',
      port: 4173,
      publicUrl: 'http://127.0.0.1:4173',
      secureCookies: false,
      trustProxy: 0,
      demo: true,
      fixedNow: null,
    });
  });

  it('are without a demo in production, and send cookies over https only', () => {
    expect(parseConfig(production)).toMatchObject({ demo: false, secureCookies: true, trustProxy: 1 });
  });

  it('cannot be changed after they were read', () => {
    const config = parseConfig(needed);
    expect(Object.isFrozen(config) && Object.isFrozen(config.database)).toBe(true);
  });

  it('take an empty value for one that is not set', () => {
    expect(parseConfig({ ...needed, PORT: ' ', PUBLIC_URL: '' }).port).toBe(4173);
  });

  it('keep the public address without a slash at its end, so that paths can follow', () => {
    expect(parseConfig({ ...production, PUBLIC_URL: 'https://calendar.example/' }).publicUrl).toBe(
      'https://calendar.example',
    );
  });

  const bad: [variable: string, values: Record<string, string>][] = [
    ['DB_PASSWORD', { SESSION_SECRET: needed.SESSION_SECRET }],
    ['SESSION_SECRET', { DB_PASSWORD: 'a password' }],
    ['SESSION_SECRET', { ...needed, SESSION_SECRET: 'short' }],
    ['NODE_ENV', { ...needed, NODE_ENV: 'live' }],
    ['HOST', { ...needed, HOST: 'two words' }],
    ['PORT', { ...needed, PORT: '0' }],
    ['PORT', { ...needed, PORT: '65536' }],
    ['PORT', { ...needed, PORT: '80a' }],
    ['DB_PORT', { ...needed, DB_PORT: '-1' }],
    ['DB_SOCKET', { ...needed, DB_SOCKET: 'mariadb.sock' }],
    ['DB_NAME', { ...needed, DB_NAME: 'a`b' }],
    ['PUBLIC_URL', { ...needed, PUBLIC_URL: 'calendar.example' }],
    ['TRUST_PROXY', { ...needed, TRUST_PROXY: 'yes' }],
    ['LOG_LEVEL', { ...needed, LOG_LEVEL: 'loud' }],
    ['SMTP_URL', { ...needed, SMTP_URL: 'http://mail.example.org' }],
    ['MAIL_FROM', { ...needed, MAIL_FROM: 'nobody' }],
    ['INBOX_PORT', { ...needed, INBOX_PORT: '70000' }],
    ['LETTER_ROUND_SECONDS', { ...needed, LETTER_ROUND_SECONDS: '0' }],
    ['DEMO', { ...needed, DEMO: 'maybe' }],
    ['FIXED_NOW', { ...needed, FIXED_NOW: '2027-03-10' }],
    // Fine one by one, unsafe together:
    ['DEMO', { ...production, DEMO: '1' }],
    ['FIXED_NOW', { ...production, FIXED_NOW: '2027-03-10T06:00:00Z' }],
    ['HOST', { ...needed, HOST: '0.0.0.0' }],
    ['MAIL_FROM', { ...production, SMTP_URL: 'smtp://mail.example.org' }],
    ['SMTP_URL', { ...needed, SMTP_URL: 'smtp://mail.example.org' }],
    ['PUBLIC_URL', { ...production, PUBLIC_URL: '' }],
    ['PUBLIC_URL', { ...production, PUBLIC_URL: 'http://calendar.example' }],
    ['TRUST_PROXY', { ...production, TRUST_PROXY: '0' }],
  ];
  it.each(bad)('refuse a bad %s in one sentence that begins with its name (%j)', (variable, values) => {
    const { message } = refusal(values);
    expect(message).toMatch(new RegExp(`^${variable} .{10,}\\.$`));
    expect(message.split('\n')).toHaveLength(1);
  });

  it('never repeat a secret in a refusal', () => {
    expect(refusal({ ...needed, SESSION_SECRET: 'hunter2' }).message).not.toContain('hunter2');
  });

  it('are each explained in .env.example, and nothing else is', () => {
    const example = readFileSync(new URL('../../../../.env.example', import.meta.url), 'utf8');
    const named = [...example.matchAll(/^# ([A-Z_]+)=/gm)].map((match) => match[1]);
    expect(named.sort()).toEqual([...VARIABLE_NAMES].sort());
  });

  it('have the same defaults as the scripts, which read them before anything is built', () => {
    const scripts = parseConfig({ ...needed, ...defaults });
    expect(scripts).toEqual(parseConfig(needed));
  });
});
