import { refuse } from '../refusal';
import type { Refusal } from '../types';
import { isJson, isRefusal, type Json } from './read';
import { VERBS } from './verbs';

export interface AnsweredLine {
  /** One line of JSON, without its line end. */
  readonly line: string;
  readonly failed: boolean;
}

/** Longest line read, characters. */
const LONGEST = 1_000_000;

/** Answers one line of JSON; whatever it holds, the answer is one line of JSON. */
export function answerLine(verb: keyof typeof VERBS, text: string): AnsweredLine {
  const request = parse(text);
  if (isRefusal(request)) return failure(null, request);
  const id = request['id'] ?? null;
  const answer = VERBS[verb](request);
  if (isRefusal(answer)) return failure(id, answer);
  return { line: JSON.stringify({ id, ...answer }), failed: false };
}

function parse(text: string): Json | Refusal {
  if (text.length > LONGEST) return refuse('badInput', 'The line is too long.', '');
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return refuse('badInput', 'The line is not JSON.', '');
  }
  return isJson(value) ? value : refuse('badInput', 'The line is not a JSON object.', '');
}

function failure(id: unknown, { reason, message, path }: Refusal): AnsweredLine {
  const error = { code: reason, message, path: path ?? '' };
  return { line: JSON.stringify({ id, error }), failed: true };
}
