import { CheckField } from '@windrow/ui/controls/check-field';
import { Notice } from '@windrow/ui/controls/notice';

/** Asked once: the weight that every volume is judged by hangs on it. */
export function OddHeight({
  heightCm,
  isKept,
  onKeep,
}: {
  heightCm: number;
  isKept: boolean;
  onKeep: (kept: boolean) => void;
}) {
  return (
    <Notice tone="attention" isNews title={`Height ${heightCm} cm is unusual`}>
      <CheckField
        label={`Keep ${heightCm} cm`}
        checked={isKept}
        onChange={(event) => onKeep(event.target.checked)}
      />
    </Notice>
  );
}
