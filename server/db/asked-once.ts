import { AsyncLocalStorage } from 'node:async_hooks';
import type { EntityManager } from 'typeorm';

/** Answers of the database by question, for as long as one call that only reads is being answered. */
const asked = new AsyncLocalStorage<Map<string, Promise<unknown>>>();

/** Whoever asks, as far as it counts here: in a transaction or not. */
type Asker = Pick<EntityManager, 'queryRunner'>;

/** Within `read` nothing changes: the same question to the database is asked once, whoever in the product asks it. */
export function askingOnce<T>(read: () => T): T {
  return asked.run(new Map(), read);
}

/**
 * The answer to a question that has a name of its own. Outside of a call that only reads, and in a transaction, it is
 * asked each time. Whoever gets an answer leaves it as it is: others get the same one.
 */
export function askedOnce<T>(manager: Asker, question: string, ask: () => Promise<T>): Promise<T> {
  const known = knownTo(manager);
  if (known === undefined) return ask();
  // Under one name there is one kind of answer.
  const before = known.get(question) as Promise<T> | undefined;
  if (before !== undefined) return before;
  const answer = ask();
  known.set(question, answer);
  return answer;
}

/** The same for things by id: only those are asked for that nobody has asked for yet. Ids without a thing are missing. */
export async function askedOnceEach<T>(
  manager: Asker,
  question: string,
  ids: readonly string[],
  ask: (ids: readonly string[]) => Promise<ReadonlyMap<string, T>>,
): Promise<Map<string, T>> {
  const wanted = [...new Set(ids)];
  const known = knownTo(manager);
  const unknown = wanted.filter((id) => known?.has(`${question} ${id}`) !== true);
  const answer = unknown.length === 0 ? Promise.resolve(new Map<string, T>()) : ask(unknown);
  for (const id of unknown) known?.set(`${question} ${id}`, answer);
  const found = new Map<string, T>();
  for (const id of wanted) {
    const things = await ((known?.get(`${question} ${id}`) as typeof answer | undefined) ?? answer);
    const thing = things.get(id);
    if (thing !== undefined) found.set(id, thing);
  }
  return found;
}

function knownTo(manager: Asker): Map<string, Promise<unknown>> | undefined {
  return manager.queryRunner === undefined ? asked.getStore() : undefined;
}
