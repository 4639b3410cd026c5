// The thread from source, for development and tests; the build bundles check-thread.ts itself.
import { register } from 'tsx/esm/api';

register();
await import('./check-thread.ts');
