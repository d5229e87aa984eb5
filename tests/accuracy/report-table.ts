import type { Accuracy } from './statistics.js';

const BEGIN = '<!-- accuracy:begin -->';
const END = '<!-- accuracy:end -->';

const days = (value: number): string =>
  `${value < 0 ? '−' : ''}${Math.abs(value).toFixed(Math.abs(value) < 0.1 ? 3 : 1)}`;

/** The table of the readme. */
export function reportTable(report: readonly Accuracy[]): string {
  return [
    '| against | cases | mean, days | standard deviation | largest |',
    '| --- | ---: | ---: | ---: | ---: |',
    ...report.map(
      ({ name, count, meanDays, sdDays, maxDays }) =>
        `| ${name} | ${String(count)} | ${days(meanDays)} | ${days(sdDays)} | ${days(maxDays)} |`,
    ),
  ].join('\n');
}

/** The text with the table between its marks; they must be there. */
export function withReportTable(text: string, report: readonly Accuracy[]): string {
  const [begin, end] = [text.indexOf(BEGIN), text.indexOf(END)];
  if (begin < 0 || end < begin) throw new Error(`No ${BEGIN} … ${END} to write between.`);
  return `${text.slice(0, begin + BEGIN.length)}\n\n${reportTable(report)}\n\n${text.slice(end)}`;
}
