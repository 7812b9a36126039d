/** A blank's words with lines to write on and boxes to tick. */
export function BlankForm({ form }: { form: string }) {
  return form.split(/(_|\[\])/).map((part, i) => {
    if (part === '_') return <span key={i} className="write-on" aria-label="blank" />;
    return part === '[]' ? <span key={i} className="tick-box" aria-label="box" /> : part;
  });
}

export const BlankNumber = ({ number }: { number: number }) => (
  <strong className="blank-number">{number}</strong>
);
