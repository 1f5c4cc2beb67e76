import { COMMON_PASSWORDS } from './common-passwords';

export const LEAST_PASSWORD_CHARACTERS = 12;
export const MOST_PASSWORD_CHARACTERS = 256;

/**
 * Why a password will not do, or null. Length counts, composition does not (NIST SP 800-63B 5.1.1.2; OWASP ASVS V6.2):
 * no rule about figures or signs, no regular change, nothing from the list of the most used.
 */
export function passwordProblem(text: string): string | null {
  const characters = Array.from(text).length;
  if (characters < LEAST_PASSWORD_CHARACTERS) {
    return `Use at least ${LEAST_PASSWORD_CHARACTERS} characters; three or four words do well.`;
  }
  if (characters > MOST_PASSWORD_CHARACTERS) {
    return `A password has at most ${MOST_PASSWORD_CHARACTERS} characters.`;
  }
  if (isCommon(text)) return 'This password is among those tried first. Choose another.';
  return null;
}

/** A listed password, with whatever figures and signs were put around it, or one short piece over and over. */
function isCommon(text: string): boolean {
  const plain = text.toLowerCase().normalize('NFKC');
  const core = plain.replaceAll(/[^\p{L}]/gu, '');
  if (COMMON_PASSWORDS.has(plain) || (core !== '' && COMMON_PASSWORDS.has(core))) return true;
  return /^(.{1,4})\1+.{0,3}$/u.test(plain) || isRun(plain);
}

/** Only neighbours on the keyboard or in the alphabet: abcdefghijkl, 123456789012. */
function isRun(plain: string): boolean {
  const codes = Array.from(plain, (letter) => letter.codePointAt(0) ?? 0);
  return codes.every((code, i) => {
    const step = code - (codes[i - 1] ?? code - 1);
    return step === 1 || step === -1 || step === -9 || step === 9;
  });
}
