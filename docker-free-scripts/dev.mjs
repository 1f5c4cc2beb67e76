import { runPlainly } from './setup/say.mjs';
import { serve } from './setup/serve.mjs';

await runPlainly(() => serve({ reload: true }));
