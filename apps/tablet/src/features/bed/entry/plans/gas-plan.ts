import { GAS_SITES, Gas } from '@windrow/ventilation/contract/observations';
import { GAS_FIELDS } from '@windrow/ventilation/entry/fields';
import { pick } from '../entry-body.ts';
import type { NumberRow } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, measuredRow, NOTE_SECTION, numberRow, optionsOf } from '../rows.ts';
import { SITE_WORDS } from '../words.ts';

const NEEDED = ['ph', 'pco2MmHg', 'po2MmHg'] as const;
const OPTIONAL = ['bicarbonateMmolL', 'baseExcessMmolL', 'sao2Percent', 'lactateMmolL', 'hbGL'] as const;
const AT_DRAW = ['fio2Percent', 'peepCmH2O'] as const;

/**
 * A blood gas. Its numbers are never "as before"; what the patient breathed when it was drawn can be
 * taken from the check, by a press of its own.
 *
 * @param asSet the present settings, as rows of the last check know them.
 */
export function gasPlan({ earlier, asSet }: { earlier: Earlier; asSet: Earlier }): EntryPlan {
  return {
    kind: 'gas',
    title: 'Gas',
    timeLabel: 'Drawn',
    sections: [
      {
        title: 'Gas',
        rows: [
          choiceRow({
            key: 'site',
            label: 'Site',
            options: optionsOf(GAS_SITES, SITE_WORDS),
            earlier: () => ({ state: 'none' }),
            needed: true,
          }),
          ...NEEDED.map((key) => measuredRow({ key, field: GAS_FIELDS[key], earlier, needed: true })),
          ...OPTIONAL.map((key) => measuredRow({ key, field: GAS_FIELDS[key], earlier })),
        ],
      },
      { title: 'Breathed when it was drawn', rows: AT_DRAW.map((key) => atDrawRow({ key, asSet })) },
      NOTE_SECTION,
    ],
    schema: Gas,
    bodyOf: (values) => pick(values, ['site', ...NEEDED, ...OPTIONAL, ...AT_DRAW]),
  };
}

function atDrawRow({ key, asSet }: { key: (typeof AT_DRAW)[number]; asSet: Earlier }): NumberRow {
  const row = numberRow({ key, field: GAS_FIELDS[key], earlier: asSet });
  return { ...row, repeat: row.repeat && { ...row.repeat, label: 'as set' } };
}
