// A thread does not inherit the TypeScript loader of the process: it registers its own before the worker is loaded.
import { register } from 'tsx/esm/api';

register();
await import(new URL('./answer-worker.ts', import.meta.url).href);
