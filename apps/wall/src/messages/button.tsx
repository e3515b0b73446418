const LOOK = 'min-h-12 rounded-lg bg-ink px-6 py-3 text-body font-bold text-tile disabled:opacity-60';

/** The wall's one kind of button; without `onPress` it sends the form that it is in. */
export function Button({
  children,
  onPress,
  disabled = false,
}: {
  children: string;
  onPress?: () => void;
  disabled?: boolean;
}) {
  return (
    <button type={onPress ? 'button' : 'submit'} className={LOOK} onClick={onPress} disabled={disabled}>
      {children}
    </button>
  );
}
