/** A list that is short enough to come whole. */
export function wholeList<T>(items: T[]): { items: T[]; nextCursor: null } {
  return { items, nextCursor: null };
}
