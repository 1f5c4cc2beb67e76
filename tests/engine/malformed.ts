import fc from 'fast-check';
import { VERBS } from '@/lib/engine/batch/verbs';

/** Request lines that are wrong in every way they can be: shared by the test and the full count in the bench. */
const nasty = fc.oneof(
  fc.constantFrom<unknown>(
    NaN,
    -1,
    0,
    1e308,
    -1e308,
    5e-324,
    '12',
    '',
    null,
    true,
    [],
    {},
    [[]],
    '__proto__',
    'constructor',
  ),
  fc.double(),
  fc.integer(),
  fc.string({ maxLength: 8 }),
  fc.jsonValue({ maxDepth: 2 }),
);
const often = <T>(good: T) => fc.oneof({ weight: 4, arbitrary: fc.constant<unknown>(good) }, nasty);
const few = (...keys: string[]) =>
  fc.oneof({ weight: 4, arbitrary: fc.constantFrom<unknown>(...keys) }, nasty);

const water = fc.oneof(
  {
    weight: 6,
    arbitrary: fc.record(
      {
        temperature: often(12),
        pH: often(7.6),
        alkalinity: often(80),
        inorganicCarbon: nasty,
        pCO2: nasty,
        analytes: fc.oneof(
          {
            weight: 3,
            arbitrary: fc.record(
              { calcium: often(30), sodium: often(10), lead: nasty, gold: nasty },
              { requiredKeys: ['calcium'] },
            ),
          },
          nasty,
        ),
      },
      { requiredKeys: ['temperature'] },
    ),
  },
  nasty,
);
const reagent = few(
  'calcium-hydroxide',
  'chlorine',
  'aluminum-sulfate',
  'sodium-bisulfite',
  'toString',
);
const quantity = few('pH', 'alkalinity', 'larson', 'precipitationPotential', 'valueOf');
const list = (entry: fc.Arbitrary<unknown>) =>
  fc.oneof({ weight: 5, arbitrary: fc.array(entry, { maxLength: 3 }) }, nasty);

const request = fc.record(
  {
    id: nasty,
    water,
    equilibrateWith: list(few('calcite', 'brucite', 'gypsum', 'chalk')),
    doses: list(
      fc.record({ reagent, dose: often(5), hydrate: nasty }, { requiredKeys: ['reagent'] }),
    ),
    solids: few('equilibrium', 'complete'),
    reagent,
    target: fc.oneof(
      {
        weight: 4,
        arbitrary: fc.dictionary(fc.constantFrom('pH', 'alkalinity', 'x'), often(8), {
          maxKeys: 2,
        }),
      },
      nasty,
    ),
    max: often(20),
    reagents: list(
      fc.record(
        { reagent, max: often(20), min: nasty, costPerKg: often(1) },
        { requiredKeys: ['reagent', 'max'] },
      ),
    ),
    targets: list(
      fc.record(
        { quantity, min: often(7), max: often(9), after: nasty },
        { requiredKeys: ['quantity'] },
      ),
    ),
    reactions: list(
      fc.record({
        K: often(1e-5),
        coefficients: fc.oneof(
          fc.dictionary(
            fc.constantFrom('A', 'B', 'C'),
            few('1', '2').map((n) => (typeof n === 'string' ? Number(n) - 1.5 : n)),
            { maxKeys: 3 },
          ),
          nasty,
        ),
      }),
    ),
    initial: fc.oneof(
      fc.dictionary(fc.constantFrom('A', 'B', 'C'), often(0.1), { maxKeys: 3 }),
      nasty,
    ),
    agent: few('chlorine', 'ozone', 'toString'),
    organism: few('giardia', 'virus', 'constructor'),
    temperature: often(10),
    pH: often(7),
    residual: often(1),
    ct: often(30),
    reading: nasty,
  },
  { requiredKeys: [] },
);

/** A verb and one line for it, mostly JSON. */
export const malformedLine = fc.record({
  verb: fc.constantFrom(...(Object.keys(VERBS) as (keyof typeof VERBS)[])),
  line: fc.oneof(
    { weight: 12, arbitrary: request.map((value) => JSON.stringify(value)) },
    { weight: 1, arbitrary: fc.string() },
    { weight: 1, arbitrary: fc.jsonValue().map((value) => JSON.stringify(value)) },
    { weight: 1, arbitrary: request.map((value) => JSON.stringify(value).slice(0, -3)) },
  ),
});
