import { describe, expect, it } from 'vitest';
import { passwordProblem } from '@/lib/people/password-rules';

describe('a password', () => {
  it.each([
    'three quiet herons wade',
    'heron-tarn-oboe',
    '東京の水道は安全です今日も',
    'x'.repeat(3) + 'herons wade',
  ])('may be %j', (text) => {
    expect(passwordProblem(text)).toBeNull();
  });

  it.each([
    ['short', 'heron tarn'],
    ['eleven of twelve characters', 'abcdefghijK'],
    ['one piece over and over', 'abcabcabcabc'],
    ['one letter', 'aaaaaaaaaaaa'],
    ['a run of figures', '123456789012'],
    ['a run of letters', 'abcdefghijklmn'],
    ['a common word with figures around', 'password123456'],
    ['a common word with signs between', 'P-a-s-s-w-o-r-d!'],
    ['the product’s own name', 'Marlwick2026!'],
    ['two keyboard rows', 'qwertyuiopasdfghjkl'],
    ['too long', 'heron '.repeat(60)],
  ])('may not be %s', (_what, text) => {
    expect(passwordProblem(text)).not.toBeNull();
  });
});
