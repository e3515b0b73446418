import {
  INFECTION_SIGNS,
  InfectionSign,
  type InfectionSignKind,
} from '@windrow/ventilation/contract/observations';
import { SIGN_FIELDS } from '@windrow/ventilation/entry/fields';
import { pick } from '../entry-body.ts';
import type { EntryRow } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, measuredRow, NOTE_SECTION, optionsOf, textRow } from '../rows.ts';

const SIGN_WORDS: Readonly<Record<InfectionSignKind, string>> = {
  temperature: 'Temperature',
  'white-cells': 'White cells',
  antimicrobial: 'Antimicrobial day',
  extracorporeal: 'Extracorporeal support day',
};

const TIME_LABELS: Readonly<Record<InfectionSignKind, string>> = {
  temperature: 'Measured',
  'white-cells': 'Drawn',
  // The day stands in a row of its own.
  antimicrobial: 'Entered',
  extracorporeal: 'Entered',
};

/** A sign of infection, or a day of treatment, for surveillance; what is asked follows from which it is. */
export function infectionSignPlan({ sign, earlier }: { sign: string; earlier: Earlier }): EntryPlan {
  const known = INFECTION_SIGNS.find((one) => one === sign) ?? null;
  const rows = known === null ? [] : rowsOf(known, earlier);
  return {
    kind: 'infection-sign',
    title: known === null ? 'Infection sign' : SIGN_WORDS[known],
    timeLabel: known === null ? 'Observed' : TIME_LABELS[known],
    sections: [
      {
        title: 'For surveillance',
        rows: [
          choiceRow({
            key: 'sign',
            label: 'What is entered',
            options: optionsOf(INFECTION_SIGNS, SIGN_WORDS),
            earlier,
            needed: true,
          }),
          ...rows,
        ],
      },
      NOTE_SECTION,
    ],
    schema: InfectionSign,
    bodyOf: (values) => pick(values, ['sign', ...rows.map(({ key }) => key)]),
  };
}

function rowsOf(sign: InfectionSignKind, earlier: Earlier): EntryRow[] {
  switch (sign) {
    case 'temperature':
      return [measuredRow({ key: 'temperatureC', field: SIGN_FIELDS.temperatureC, earlier, needed: true })];
    case 'white-cells':
      return [
        measuredRow({ key: 'whiteCellsPerMm3', field: SIGN_FIELDS.whiteCellsPerMm3, earlier, needed: true }),
      ];
    case 'antimicrobial':
      return [
        textRow({
          key: 'agent',
          label: 'Agent',
          hint: 'One drug, always by the same name; only agents that the manual lists count',
          needed: true,
        }),
        textRow({ key: 'day', label: 'Given on', needed: true, isDay: true }),
      ];
    case 'extracorporeal':
      return [
        textRow({
          key: 'day',
          label: 'Day',
          hint: 'Only a day wholly on extracorporeal support; of a day partly on it the other hours count',
          needed: true,
          isDay: true,
        }),
      ];
  }
}
