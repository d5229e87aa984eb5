import { afterEach, beforeEach, expect } from 'vitest';

/**
 * A warning nobody reads hides the next one. Every test fails when something wrote to the console, unless
 * the test itself replaced that method (`vi.spyOn(console, 'error')`) and so says that it expects the text.
 */
const methods = ['debug', 'info', 'log', 'warn', 'error'] as const;

const noise: string[] = [];

for (const method of methods) {
  // eslint-disable-next-line no-console -- this is the one place that takes the console over
  console[method] = (...words: unknown[]) => {
    noise.push(`console.${method}: ${words.map(asText).join(' ')}`);
  };
}

function asText(word: unknown): string {
  if (word instanceof Error) return word.stack ?? word.message;
  return typeof word === 'string' ? word : JSON.stringify(word);
}

beforeEach(() => {
  noise.length = 0;
});

afterEach(() => {
  expect(noise.splice(0), 'nothing may be written to the console during a test').toEqual([]);
});
