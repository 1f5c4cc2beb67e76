import { idFrom } from '@/lib/ids';
import { createRandom } from './random';
import type { DemoPerson, DemoSignIn } from './schema';

/** The same id whatever the seed and the day, so that a second seeding finds the first one's work. */
export const DEMO_ORGANISATION = {
  id: idFrom('organisation', createRandom('organisation calverdine').bytes(16)),
  slug: 'calverdine',
  name: 'Calverdine Water Board',
} as const;

/** Invented people; the passwords open nothing but the demo and are printed with it. */
export const DEMO_SIGN_INS: readonly DemoSignIn[] = [
  {
    role: 'operator',
    name: 'Nell Harrowby',
    email: 'operator@calverdine.example',
    password: 'pelican-tarn-oboes',
    organisation: DEMO_ORGANISATION.name,
  },
  {
    role: 'consultant',
    name: 'Tomas Ryle',
    email: 'consultant@fennerlisle.example',
    password: 'marble-finch-avenue',
    organisation: DEMO_ORGANISATION.name,
  },
  {
    role: 'manager',
    name: 'Ingrid Sorley',
    email: 'manager@calverdine.example',
    password: 'copper-lantern-sedge',
    organisation: DEMO_ORGANISATION.name,
  },
  {
    role: 'owner',
    name: 'Walter Quennell',
    email: 'owner@calverdine.example',
    password: 'orchard-velvet-kettle',
    organisation: DEMO_ORGANISATION.name,
  },
];

/** Colleagues on the other shifts: they write in the log but nobody signs in as them. */
const COLLEAGUES = [
  { role: 'operator', name: 'Ruben Askwith', email: 'r.askwith@calverdine.example' },
  { role: 'operator', name: 'Jo Penmarrow', email: 'j.penmarrow@calverdine.example' },
] as const;

/** The same people with the same ids, whatever the seed and the day: a second seeding finds them. */
export const demoPeople = (): DemoPerson[] =>
  [...DEMO_SIGN_INS, ...COLLEAGUES].map(({ role, name, email }) => ({
    id: idFrom('person', createRandom(`person ${email}`).bytes(16)),
    role,
    name,
    email,
  }));
