import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { z } from 'zod';

/** A list that is short enough to come whole. */
export function wholeList<T>(items: T[]): { items: T[]; nextCursor: null } {
  return { items, nextCursor: null };
}

/** An answer that has been held against its schema and written out already. */
export class PreparedReply {
  constructor(
    readonly endpointId: string,
    readonly json: string,
  ) {}
}

/**
 * For large answers that stay the same for everybody who may ask: checking a table of 800 rows anew for each request
 * takes longer than anything else about it.
 */
export class PreparedReplies<E extends Endpoint & { response: z.ZodType }> {
  private readonly written = new WeakMap<object, PreparedReply>();

  constructor(private readonly endpoint: E) {}

  /** @param same what stays the very same object as long as the answer does */
  of(answer: z.input<E['response']>, same: object): PreparedReply {
    const known = this.written.get(same);
    if (known !== undefined) return known;
    const reply = new PreparedReply(this.endpoint.id, JSON.stringify(this.endpoint.response.parse(answer)));
    this.written.set(same, reply);
    return reply;
  }
}
