import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';

// Testing Library cleans up by itself only where `afterEach` is a global; here it is imported.
afterEach(() => {
  cleanup();
});
