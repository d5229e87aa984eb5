import { cleanup, configure } from '@testing-library/react';
import { afterEach } from 'vitest';

// Testing Library cleans up by itself only where `afterEach` is a global; here it is imported.
afterEach(() => {
  cleanup();
});

// `findBy…` waits this long for what must come; on a busy machine a second is not enough, and a pass never waits.
configure({ asyncUtilTimeout: 10_000 });

// jsdom has no CSS.escape, which dialogs ask for. Ids of React need no escaping.
Object.defineProperty(globalThis, 'CSS', { configurable: true, value: { escape: (text: string) => text } });
