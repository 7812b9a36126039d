/** A blank's words with lines to write on and boxes to tick. */
export function BlankForm({ form }: { form: string }) {
  return form.split(/(_|\[\] [^ ,]+)/).map((part, i) => {
    if (part === '_') return <span key={i} className="write-on" role="img" aria-label="blank" />;
    if (!part.startsWith('[]')) return part;
    // A box never stands on another line than its word.
    return (
      <span key={i} className="to-tick">
        <span className="tick-box" role="img" aria-label="box to tick" />
        {part.slice(2)}
      </span>
    );
  });
}

export const BlankNumber = ({ number }: { number: number }) => (
  <strong className="blank-number">{number}</strong>
);
