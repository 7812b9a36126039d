import { PlanShapes } from '@/components/plan/plan-svg';
import { flatProjector, legendOf } from '@/lib/draw';
import type { Sheet } from '@/lib/layout';

const AT_ZERO = flatProjector({ x: 0, y: 0 }, 1);

/** The symbols that are on the plan, each with its word. */
export function Legend({ sheet }: { sheet: Sheet }) {
  return (
    <ul className="legend">
      {legendOf(sheet, true).map(({ id, words, marks }) => (
        <li key={id}>
          <svg viewBox="-20 -15 40 30" aria-hidden="true">
            <PlanShapes
              list={{ groups: [{ id: `~legend-${id}`, layer: 'piece', marks }] }}
              projector={AT_ZERO}
              theme="print"
            />
          </svg>
          {words}
        </li>
      ))}
    </ul>
  );
}
