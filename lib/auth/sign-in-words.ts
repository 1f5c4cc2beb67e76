/** What the form recognises to ask for the second factor. */
export const SECOND_FACTOR_NEEDED =
  'Write the six figures your authenticator shows now, or a recovery code.';
