import { SkyRangeError } from '../units/sky-range-error.js';
import { SOLAR_HOUR } from './words.js';

/** Checks of a marker's parameters. Each throws a SkyRangeError that names the field and what would be right. */

export function checkWord(field: string, value: unknown, words: readonly (string | number)[]): void {
  if (!words.some((word) => word === value)) {
    throw new SkyRangeError(field, `Give one of these: ${words.join(', ')}.`);
  }
}

export function checkNumber(field: string, value: unknown, min: number, max: number, unit: string): void {
  if (typeof value !== 'number' || !Number.isFinite(value) || value < min || value > max) {
    throw new SkyRangeError(field, `Give a number from ${min} to ${max} ${unit}.`);
  }
}

export function checkSolarHour(field: string, value: unknown): void {
  checkNumber(field, value, SOLAR_HOUR.min, SOLAR_HOUR.max, 'hours of local mean solar time');
  if (typeof value === 'number' && !Number.isInteger(value / SOLAR_HOUR.step)) {
    throw new SkyRangeError(field, 'Give a whole or a quarter hour.');
  }
}

export function checkName(field: string, value: unknown, maxLength: number): void {
  if (typeof value !== 'string' || value.length > maxLength) {
    throw new SkyRangeError(field, `Give a text of at most ${maxLength} characters; it may be empty.`);
  }
}
