type Ask = () => Promise<string | null>;

let asking: Ask | null = null;

/** Whoever can ask the helped person for their PIN says so; the answer takes it back. */
export function offerElderPin(ask: Ask): () => void {
  asking = ask;
  return () => {
    if (asking === ask) asking = null;
  };
}

/** The helped person's PIN for one call; null where nobody asks or nobody types it. It is kept nowhere. */
export async function askElderPin(): Promise<string | null> {
  return asking === null ? null : asking();
}
