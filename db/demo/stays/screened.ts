import { SCREEN_ANSWER_KEYS, type ScreenAnswerKey } from '@windrow/ventilation/readiness/screen-answers';

/** A screen on which every item that only a person can answer is met. */
export const EVERY_ANSWER_YES: Partial<Record<ScreenAnswerKey, boolean>> = Object.fromEntries(
  SCREEN_ANSWER_KEYS.map((key) => [key, true]),
);
