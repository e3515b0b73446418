/**
 * The items of the readiness screen that the record cannot know. Each is answered yes or no by whoever
 * screens the patient, and stands for as long as the unit's policy lets it.
 */
export const SCREEN_ANSWERS = {
  causeImproving: 'The cause of the ventilation is better',
  coughAdequate: 'Cough is adequate',
  mentationAdequate: 'Awake enough to protect the airway',
  vasopressorsMinimal: 'Vasopressors none or minimal',
  heartRateStable: 'Heart rate at most 140 /min',
  bloodPressureStable: 'Systolic pressure 90 to 160 mmHg',
  temperatureNormal: 'Temperature 36 to 38 °C',
  noAcidosis: 'No significant acidosis',
} as const;
export type ScreenAnswerKey = keyof typeof SCREEN_ANSWERS;

export const SCREEN_ANSWER_KEYS = Object.keys(SCREEN_ANSWERS) as [ScreenAnswerKey, ...ScreenAnswerKey[]];
