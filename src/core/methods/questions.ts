import type { Question } from '../model/settings';

/** The six questions, for methods that answer them all. */
export const allQuestions: readonly Question[] = [
  'differs',
  'higher',
  'lower',
  'equivalent',
  'not-lower',
  'not-higher',
];
