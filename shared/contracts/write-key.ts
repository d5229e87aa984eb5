/**
 * Carries a key of the sender's own with a write that may have to be sent again. With the same key the same write counts once,
 * however often it comes; its answer is what it wrote, as that stands now.
 */
export const WRITE_KEY_HEADER = 'Idempotency-Key';
export const WRITE_KEY = /^[\w-]{16,100}$/u;
