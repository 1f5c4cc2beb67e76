import type { WorksDefinition, WorksProcess } from './definition';
import { OTTERBANK } from './otterbank';
import { OTTERBANK_PROCESS } from './otterbank-process';
import { QUARREL_HILL } from './quarrel-hill';
import { QUARREL_HILL_PROCESS } from './quarrel-hill-process';
import { SALLOW_WELLS } from './sallow-wells';
import { SALLOW_WELLS_PROCESS } from './sallow-wells-process';

/** What a works is, and how it treats its water. */
export interface DemoWorks {
  readonly definition: WorksDefinition;
  readonly process: WorksProcess;
}

/** The three invented works, in the order the organisation lists them. */
export const DEMO_WORKS: readonly DemoWorks[] = [
  { definition: QUARREL_HILL, process: QUARREL_HILL_PROCESS },
  { definition: SALLOW_WELLS, process: SALLOW_WELLS_PROCESS },
  { definition: OTTERBANK, process: OTTERBANK_PROCESS },
];
