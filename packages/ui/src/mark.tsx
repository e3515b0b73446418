/** Windrow's mark: three rake lines. It stands beside words that say the name or the place. */
export function Mark({ className = 'size-8' }: { className?: string }) {
  return (
    <svg viewBox="0 0 34 32" className={className} fill="currentColor" aria-hidden="true" focusable="false">
      <path d="M1 29 12.7 4h4.6L5.6 29zM9.2 29 20.9 4h4.6L13.8 29zM17.4 29 29.1 4h4.6L22 29z" />
    </svg>
  );
}
