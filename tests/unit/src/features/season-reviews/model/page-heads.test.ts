import { describe, expect, it } from 'vitest';
import { PAGE, PAGES, pageHeads } from '#src/features/season-reviews/model/page-heads.js';

describe('the heads of a printed year’s pages', () => {
  it('number every page in the words of the language, and repeat the title from the second page on', () => {
    const rules = pageHeads({ running: 'Looking back at 2026', number: `${PAGES} pages, this is ${PAGE}` });
    expect(rules).toContain('@bottom-right { content: counter(pages) " pages, this is " counter(page) }');
    expect(rules).toContain('@top-left { content: "Looking back at 2026" }');
    expect(rules).toContain('@page season:first { @top-left { content: none } }');
  });

  it('hold any name of a place as words, whatever signs are in it', () => {
    const rules = pageHeads({ running: 'The "upper"\\ field\n</style>', number: PAGE });
    expect(rules).toContain('content: "The \\22 upper\\22 \\5c  field\\a \\3c /style>" }');
  });
});
