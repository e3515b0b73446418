/** The label of a bed on the floor plan; longer ones are set smaller, never cut. */
export function BedLabel({ label }: { label: string }) {
  return (
    <strong className="tile-label" data-long={label.length > 3}>
      <span className="sr-only">Bed </span>
      {label}
    </strong>
  );
}
