import { z } from 'zod';

/** The parts of a JSON Schema that our contracts use. */
interface Schema {
  type?: string;
  const?: unknown;
  enum?: unknown[];
  format?: string;
  pattern?: string;
  minimum?: number;
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
  minItems?: number;
  anyOf?: Schema[];
  oneOf?: Schema[];
  allOf?: Schema[];
  $ref?: string;
  $defs?: Record<string, Schema>;
}

/** What stands in the fields: free texts, ids. */
export interface SampleTexts {
  text: string;
  id: string;
}

/**
 * Something in the shape of a contract's input with the given text in every field that takes text freely. It need not
 * be accepted: fields that must fit each other may not.
 */
export function sampleOf(schema: z.ZodType, texts: SampleTexts): unknown {
  const root = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' }) as Schema;
  return sample(root, root, texts);
}

/** Names of the members, for queries. */
export function membersOf(schema: z.ZodType): string[] {
  const root = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' }) as Schema;
  return Object.keys(root.properties ?? {});
}

function sample(schema: Schema, root: Schema, texts: SampleTexts): unknown {
  if (schema.$ref !== undefined) {
    const named = root.$defs?.[schema.$ref.split('/').at(-1) ?? ''];
    return named === undefined ? null : sample(named, root, texts);
  }
  if ('const' in schema) return schema.const;
  if (schema.enum !== undefined) return schema.enum[0];
  const choices = schema.anyOf ?? schema.oneOf ?? schema.allOf;
  if (choices !== undefined) {
    const first = choices.find(({ type }) => type !== 'null') ?? choices[0];
    return first === undefined ? null : sample(first, root, texts);
  }
  switch (schema.type) {
    case 'object':
      return Object.fromEntries(
        Object.entries(schema.properties ?? {}).map(([name, member]) => [name, sample(member, root, texts)]),
      );
    case 'array':
      return schema.items === undefined ? [] : [sample(schema.items, root, texts)];
    case 'integer':
    case 'number':
      return Math.max(schema.minimum ?? 1, 1);
    case 'boolean':
      return true;
    case 'null':
      return null;
    default:
      return schema.format === 'uuid' ? texts.id : texts.text;
  }
}
