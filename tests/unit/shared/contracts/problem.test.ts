import { describe, expect, it } from 'vitest';
import { problem, PROBLEM_TYPES, problemTypeUri, type ProblemSlug } from '#shared/contracts/problem.js';
import { texts } from '#shared/locales/en/problems.js';

const slugs = Object.keys(PROBLEM_TYPES) as ProblemSlug[];

describe('the problem types', () => {
  it('each have a status of refusal, a title and a sentence', () => {
    for (const slug of slugs) {
      const { status, title } = PROBLEM_TYPES[slug];
      expect(status).toBeGreaterThanOrEqual(400);
      expect(status).toBeLessThan(600);
      expect(title).not.toBe('');
      expect(texts.type[slug].endsWith('.')).toBe(true);
    }
  });

  it('never call anything an error, and are addressed below /problems', () => {
    for (const slug of slugs) {
      expect(`${PROBLEM_TYPES[slug].title} ${texts.type[slug]}`).not.toMatch(/\berror\b/i);
      expect(problemTypeUri(slug)).toBe(`/problems/${slug}`);
    }
  });
});

describe('a problem', () => {
  it('has the members of RFC 9457 and ours, and no others', () => {
    const minimal = { type: '/problems/stale', title: 'T', status: 409, detail: 'D.' };
    expect(problem.parse(minimal)).toEqual(minimal);
    expect(problem.safeParse({ ...minimal, stack: 'secret' }).success).toBe(false);
    expect(problem.safeParse({ ...minimal, detail: undefined }).success).toBe(false);
  });
});
