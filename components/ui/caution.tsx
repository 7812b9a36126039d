/** Said on every page with a verdict or a plan, on paper and in exports. */
export const CAUTION_WORDS =
  'Planning aid. The local authority, the locates, air monitoring and qualified people decide.';

/** Added wherever a screen is used in the field. */
export const FIELD_CAUTION_WORDS =
  'A phone or tablet can ignite vapour: keep it outside the hot zone unless it is rated for it.';

export function Caution({
  field = false,
  className = '',
}: {
  field?: boolean;
  className?: string;
}) {
  return (
    <p className={`font-semibold ${className}`}>
      {CAUTION_WORDS}
      {field && <span className="block text-alarm">{FIELD_CAUTION_WORDS}</span>}
    </p>
  );
}
