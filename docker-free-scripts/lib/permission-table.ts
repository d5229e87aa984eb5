import type { Access } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { ROLES } from '#shared/contracts/people.js';

/** The page that shows the table, and the marks between which it stands there. */
export const PERMISSION_GUIDE = 'DEVELOPERS.md';
const BEGIN = '<!-- permissions:begin -->';
const END = '<!-- permissions:end -->';

/** Who may call what, as a Markdown table straight from the contracts. */
export function permissionTable(): string {
  const head = ['call', 'what it does', 'visitor', ...ROLES];
  const rows = ENDPOINTS.map(({ method, path, summary, access }) => [
    `\`${method} ${path}\``,
    summary,
    mark(access.kind === 'public'),
    ...ROLES.map((role) => mark(admits(access, role))),
  ]);
  return [head, head.map(() => '---'), ...rows].map((cells) => `| ${cells.join(' | ')} |`).join('\n');
}

/** The guide's text with the table of today between its marks. */
export function withPermissionTable(guide: string): string {
  const [before, rest] = cut(guide, BEGIN);
  const [, after] = cut(rest, END);
  return `${before}${BEGIN}\n\n${permissionTable()}\n\n${END}${after}`;
}

function admits(access: Access, role: (typeof ROLES)[number]): boolean {
  return access.kind !== 'member' || access.roles.includes(role);
}

function mark(admitted: boolean): string {
  return admitted ? '●' : '–';
}

function cut(text: string, at: string): [string, string] {
  const parts = text.split(at);
  if (parts.length !== 2) throw new Error(`${PERMISSION_GUIDE} must hold the mark ${at} exactly once.`);
  return [parts[0] ?? '', parts[1] ?? ''];
}
