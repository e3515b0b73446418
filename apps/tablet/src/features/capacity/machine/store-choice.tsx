import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import type { VentilatorState } from '@windrow/ventilation/contract/fleet';
import type { MoveDraft } from './move-draft.ts';
import type { UnitNames } from './place-words.ts';

const WORDS: Partial<Record<VentilatorState, { label: string; hint: string }>> = {
  'on-loan': { label: 'To whom, until when', hint: 'so that it can be found and asked back' },
  held: { label: 'Where', hint: 'such as the workshop' },
  cleaning: { label: 'Where', hint: 'such as the sluice' },
};

/** Where a machine stands that is not at a bed. */
export function StoreChoice({
  state,
  units,
  entered,
  error,
  onChange,
}: {
  state: VentilatorState;
  units: UnitNames;
  entered: Pick<MoveDraft, 'unitId' | 'words'>;
  error: string | undefined;
  onChange: (part: Partial<MoveDraft>) => void;
}) {
  const { label, hint } = WORDS[state] ?? { label: 'Where', hint: '' };
  const isInHouse = state !== 'on-loan' && state !== 'retired';
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {isInHouse && (
        <SelectField
          label="Unit"
          empty="no unit"
          options={[...units].map(([value, name]) => ({ value, label: name }))}
          value={entered.unitId}
          onChange={(event) => onChange({ unitId: event.target.value })}
        />
      )}
      <TextField
        label={label}
        hint={hint || undefined}
        maxLength={80}
        value={entered.words}
        error={error}
        onChange={(event) => onChange({ words: event.target.value })}
      />
    </div>
  );
}
