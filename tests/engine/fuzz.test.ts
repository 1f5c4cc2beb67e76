import fc from 'fast-check';
import { expect, it } from 'vitest';
import { malformedLine } from './malformed';
import { answerLine } from '@/lib/engine/batch/answer-line';

/** Numbers JSON cannot write come out as null: none may, but for indices that have no meaning for a water. */
const MAY_BE_NULL =
  /"(id|langelier|pHs|precipitationPotential|ryznar|puckorius|aggressiveness|larson|chlorideSulfateMassRatio)":null/g;

it('answers any malformed line with one line: an answer or a coded error with a path', () => {
  let errors = 0;
  fc.assert(
    fc.property(malformedLine, ({ verb, line }) => {
      const answer = answerLine(verb, line);
      expect(answer.line).not.toContain('\n');
      const parsed = JSON.parse(answer.line) as Record<string, unknown>;
      expect(parsed).toHaveProperty('id');
      if (!answer.failed) {
        const rest = { ...parsed, id: 0 };
        expect(JSON.stringify(rest).replace(MAY_BE_NULL, '')).not.toContain(':null');
        return;
      }
      errors++;
      const error = parsed['error'] as Record<string, unknown>;
      expect(['badInput', 'outOfRange', 'notConverged', 'targetUnreachable']).toContain(
        error['code'],
      );
      expect(typeof error['message']).toBe('string');
      expect(typeof error['path']).toBe('string');
    }),
    { numRuns: 3000, seed: 99 },
  );
  expect(errors).toBeGreaterThan(1000);
});
