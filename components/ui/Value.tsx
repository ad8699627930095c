/** A number with its unit in a lighter tone, in columns that line up. */
export function Value({
  text,
  unit,
  large = false,
}: {
  readonly text: string;
  readonly unit: string;
  readonly large?: boolean;
}) {
  return (
    <span className="whitespace-nowrap">
      <span className={`figure ${large ? 'text-lg' : ''}`}>{text}</span>
      {unit === '' ? null : <span className="figure text-ink-soft">{` ${unit}`}</span>}
    </span>
  );
}
