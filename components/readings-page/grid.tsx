const SQUARE_MM = 5;

/**
 * Squares to sketch on, every fifth line heavier. Lines and not a background, because browsers
 * leave backgrounds out when they print.
 */
export function Grid({ across, down }: { across: number; down: number }) {
  const width = across * SQUARE_MM;
  const height = down * SQUARE_MM;
  return (
    <svg
      viewBox={`-0.5 -0.5 ${width + 1} ${height + 1}`}
      className="block h-auto w-full stroke-rule"
      role="img"
      aria-label={`Blank grid, ${across} by ${down} squares`}
    >
      {Array.from({ length: across + 1 }, (_, i) => (
        <path
          key={`v${i}`}
          d={`M${i * SQUARE_MM} 0v${height}`}
          strokeWidth={i % 5 === 0 ? 0.3 : 0.1}
        />
      ))}
      {Array.from({ length: down + 1 }, (_, i) => (
        <path
          key={`h${i}`}
          d={`M0 ${i * SQUARE_MM}h${width}`}
          strokeWidth={i % 5 === 0 ? 0.3 : 0.1}
        />
      ))}
    </svg>
  );
}
