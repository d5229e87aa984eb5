import { describe, expect, it } from 'vitest';
import { commandScan } from '#server/storage/file-scan.js';

describe('a virus scanner', () => {
  const node = process.execPath;

  it('lets a file in that it ends well on', async () => {
    expect(await commandScan([node, '-e', ''])('/some/file')).toBe(true);
  });

  it('is handed the path of the file', async () => {
    const program = 'process.exit(process.argv.at(-1) === "/some/file" ? 0 : 1)';
    expect(await commandScan([node, '-e', program])('/some/file')).toBe(true);
  });

  it('keeps a file out that it finds fault with', async () => {
    expect(await commandScan([node, '-e', 'process.exit(1)'])('/some/file')).toBe(false);
  });

  it.each([
    ['fails itself', [node, '-e', 'process.exit(2)']],
    ['is not there', ['/nowhere/scanner']],
  ])('that %s lets nothing in', async (_what, command) => {
    await expect(commandScan(command)('/some/file')).rejects.toThrow('could not look');
  });
});
