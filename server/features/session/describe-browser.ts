import Bowser from 'bowser';
import type { SessionDevice } from '../../db/entities/session.entity.js';

const NAME_MAX_LENGTH = 40;

/** Roughly which browser and system this is: enough to tell the own phone from another one, and no more. */
export function describeBrowser(userAgent: string | undefined): Omit<SessionDevice, 'beganAt'> {
  if (userAgent === undefined || userAgent === '') return { browser: null, system: null };
  const { browser, os } = Bowser.parse(userAgent.slice(0, 500));
  return { browser: short(browser.name), system: short(os.name) };
}

function short(name: string | undefined): string | null {
  return name === undefined || name === '' ? null : name.slice(0, NAME_MAX_LENGTH);
}
