import { z } from 'zod';

export const id = z.uuid();

/** Trimmed, NFC, one line. */
export function line(maxLength: number, minLength = 0) {
  return z
    .string()
    .transform((text) => text.normalize('NFC').trim())
    .pipe(
      z
        .string()
        .min(minLength, minLength > 0 ? 'required' : undefined)
        .max(maxLength, 'too-long')
        .regex(/^[^\u0000-\u001f\u007f]*$/u, 'one-line'),
    );
}

/** Trimmed, NFC, may hold line breaks. */
export function text(maxLength: number) {
  return z
    .string()
    .transform((value) => value.normalize('NFC').replace(/\r\n?/g, '\n').trim())
    .pipe(
      z
        .string()
        .max(maxLength, 'too-long')
        .regex(/^[^\u0000-\u0009\u000b-\u001f\u007f]*$/u, 'no-control-characters'),
    );
}

/** Gregorian civil date of a calendar or a sheet: `YYYY-MM-DD`. */
export const isoDate = z.string().regex(/^\d{4}-\d{2}-\d{2}$/u);

/** Any date the engine offers: astronomical year with an optional sign, e.g. `-0043-07-19`. */
export const anyDate = z.string().regex(/^-?\d{4}-\d{2}-\d{2}$/u);

export const instant = z.iso.datetime();

/** A number in an address. Empty text is no number: it must not be read as zero. */
export function queryNumber<T extends z.ZodType<number>>(schema: (number: z.ZodCoercedNumber) => T) {
  return z.preprocess(
    (value) => (typeof value === 'string' && value.trim() === '' ? undefined : value),
    schema(z.coerce.number('not-a-number')),
  );
}

export const pageQuery = z.strictObject({
  cursor: z.string().max(200).optional(),
  limit: queryNumber((number) => number.int().min(1).max(200)).optional(),
});
export type PageQuery = z.infer<typeof pageQuery>;

/** Every list answers in this shape. */
export function listOf<T extends z.ZodType>(item: T) {
  return z.strictObject({ items: z.array(item), nextCursor: z.string().nullable() });
}

/** The row's version that the writer saw; a write over a newer one answers 409. */
export const rowVersion = z.number().int().min(1);

/** A month and a day that exist in every year. */
export const monthDay = z
  .strictObject({ month: z.number().int().min(1).max(12), day: z.number().int().min(1).max(31) })
  .refine(({ month, day }) => day <= daysInMonth(month), { path: ['day'], error: 'no-such-day' });
export type MonthDay = z.infer<typeof monthDay>;

/** 28 for February: a yearly date must exist every year. */
function daysInMonth(month: number): number {
  return [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1] ?? 31;
}
