import { ChevronDown, Delete, Minus, Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import './keypad.css';

/** What a key of the pad says. What becomes of the text is for the one who holds it. */
export type KeypadKey =
  | '0'
  | '1'
  | '2'
  | '3'
  | '4'
  | '5'
  | '6'
  | '7'
  | '8'
  | '9'
  | 'point'
  | 'plus'
  | 'minus'
  | 'sign'
  | 'erase'
  | 'clear';

const DIGITS = ['7', '8', '9', '4', '5', '6', '1', '2', '3', '0'] as const;

export type KeypadProps = {
  /** The field it writes into, and what stands there. */
  label: string;
  echo: string;
  unit: string;
  /** Beside the echo: what it means, or how it differs from the last value. */
  aside?: string | undefined;
  onPress: (key: KeypadKey) => void;
  /** Takes the last value over; null where there is none to take. */
  repeat: { label: string; onPress: () => void } | null;
  /** A key that only some fields have: a sign, or "off". */
  special: { label: string; name: string; onPress: () => void } | null;
  hasPoint: boolean;
  onNext: () => void;
  onHide: () => void;
};

/** The docked pad. Keys act on release and leave the focus where it is, in the field. */
export function Keypad({
  label,
  echo,
  unit,
  aside,
  onPress,
  repeat,
  special,
  hasPoint,
  onNext,
  onHide,
}: KeypadProps) {
  return (
    <section aria-label={`Keypad for ${label}`} className="flex flex-col gap-2">
      <KeypadEcho label={label} echo={echo} unit={unit} aside={aside} onHide={onHide} />
      <div className="keypad-keys">
        {DIGITS.map((digit) => (
          <Key key={digit} area={`k${digit}`} onPress={() => onPress(digit)}>
            {digit}
          </Key>
        ))}
        <Key area="point" name="point" isDisabled={!hasPoint} onPress={() => onPress('point')}>
          .
        </Key>
        {special && (
          <Key area="special" name={special.name} isDeed onPress={special.onPress}>
            {special.label}
          </Key>
        )}
        <Key area="erase" name="erase one" isDeed onPress={() => onPress('erase')}>
          <Delete aria-hidden="true" />
        </Key>
        <Key area="clear" isDeed onPress={() => onPress('clear')}>
          clear
        </Key>
        <Key area="plus" name="one step up" isDeed onPress={() => onPress('plus')}>
          <Plus aria-hidden="true" />
        </Key>
        <Key area="minus" name="one step down" isDeed onPress={() => onPress('minus')}>
          <Minus aria-hidden="true" />
        </Key>
        <Key area="repeat" isDeed isDisabled={repeat === null} onPress={() => repeat?.onPress()}>
          {repeat?.label ?? 'as before'}
        </Key>
        <Key area="next" isDeed onPress={onNext}>
          next
        </Key>
      </div>
    </section>
  );
}

function KeypadEcho({
  label,
  echo,
  unit,
  aside,
  onHide,
}: Pick<KeypadProps, 'label' | 'echo' | 'unit' | 'aside' | 'onHide'>) {
  return (
    <div className="flex min-h-12 items-center justify-between gap-3">
      <p className="flex min-w-0 flex-wrap items-baseline gap-x-2">
        <span className="w-full truncate text-ink text-sm">{label}</span>
        <output className="font-bold text-3xl text-ink tabular-nums leading-none">{echo || '–'}</output>
        <span className="text-ink-muted">
          {unit}
          {aside ? ` · ${aside}` : ''}
        </span>
      </p>
      <button
        type="button"
        aria-label="Put the keypad away"
        className="inline-flex size-12 shrink-0 items-center justify-center rounded-lg text-ink"
        onPointerDown={(event) => event.preventDefault()}
        onClick={onHide}
      >
        <ChevronDown aria-hidden="true" />
      </button>
    </div>
  );
}

function Key({
  area,
  name,
  isDeed = false,
  isDisabled = false,
  onPress,
  children,
}: {
  area: string;
  /** What it is called, where what is drawn on it is no word. */
  name?: string;
  isDeed?: boolean;
  isDisabled?: boolean;
  onPress: () => void;
  children: ReactNode;
}) {
  const look = isDeed ? 'bg-block-soft text-lg' : 'bg-ground text-2xl';
  return (
    <button
      type="button"
      style={{ gridArea: area }}
      aria-label={name}
      disabled={isDisabled}
      className={`inline-flex items-center justify-center rounded-lg font-bold text-ink tabular-nums disabled:opacity-40 ${look}`}
      onPointerDown={(event) => event.preventDefault()}
      onClick={onPress}
    >
      {children}
    </button>
  );
}
