import type { ButtonHTMLAttributes, Ref } from 'react';

/** `main`: the one thing to do here. `plain`: other things. `quiet`: inside rows and bars. */
export type ButtonTone = 'main' | 'plain' | 'quiet';

const SHAPE =
  'inline-flex min-h-12 min-w-12 items-center justify-center gap-2 rounded-lg px-4 font-bold text-base leading-tight text-center no-underline disabled:opacity-60 aria-disabled:opacity-60';

const TONES: Record<ButtonTone, string> = {
  main: 'bg-ink text-ground border-2 border-ink',
  plain: 'bg-tile text-ink border-2 border-ink',
  quiet: 'bg-transparent text-ink border-2 border-line-strong',
};

/** The look of a button, for links that are one to the eye. */
export function buttonClass(tone: ButtonTone = 'plain'): string {
  return `${SHAPE} ${TONES[tone]}`;
}

type ButtonProps = ButtonHTMLAttributes<HTMLButtonElement> & {
  tone?: ButtonTone;
  ref?: Ref<HTMLButtonElement>;
};

/** At least 48 px in both directions, for gloved hands. */
export function Button({ tone = 'plain', type = 'button', className = '', ...rest }: ButtonProps) {
  return <button type={type} className={`${buttonClass(tone)} ${className}`} {...rest} />;
}
