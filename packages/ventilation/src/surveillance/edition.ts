import type { SurveillanceEdition } from '../contract/surveillance.ts';

/**
 * The definition that the day table follows, in words for a screen.
 *
 * @source CDC NHSN, definitions of ventilator-associated events in adult locations: supplement, questions and
 *   answers, tier tables. Not every page of the manual could be read; those parts say so.
 */
export const SURVEILLANCE_EDITION: SurveillanceEdition = {
  name: 'CDC NHSN ventilator-associated event (VAE) definitions for adult locations: ventilator-associated condition (VAC) and infection-related ventilator-associated complication (IVAC). The third tier, possible pneumonia, is not judged here. The text was not compared with this year’s manual.',
  purpose:
    'A screening aid: it finds days to look at in the record. It is not a diagnosis, does not guide treatment, and does not replace the review by whoever reports events.',
  toBeChecked: [
    'A daily minimum is the lowest setting held for more than an hour; where none was, the lowest of the day.',
    'The first day of ventilation is the calendar day on which it starts here, also for a patient who came ventilated.',
    'One full calendar day off the ventilator ends an episode; days are then counted from 1 again.',
    'A whole day on high-frequency ventilation or, for adults, on extracorporeal support has no minimum.',
    'The four antimicrobial days in a row must begin in the window; only agents and routes that the manual lists count.',
  ],
};
