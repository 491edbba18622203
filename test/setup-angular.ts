import { setupZonelessTestEnv } from 'jest-preset-angular/setup-env/zoneless';

// Every browser has it; jsdom hides it. Test data is plain JSON.
globalThis.structuredClone ??= <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;

setupZonelessTestEnv();
