import { groundSeen, pxPerMetreAt, SCALES, scaleThatFits } from '@/lib/draw';
import { piecesOf, placeOf, planeOf, type Sheet } from '@/lib/layout';
import { blanksOf } from './blanks';
import type { HandoutChoice } from './handout-choice';
import type { HandoutInput } from './handout-input';
import { LocalDateTime } from './local-words';
import './handout.css';
import { EDGE_MM, pageGeometry, PAGE_BODY } from './page-geometry';
import { PaperPage } from './paper-page';
import { tablePages } from './paper-table';
import { PlanDrawing } from './plan-drawing';
import { piecesBeyond, planExtent } from './plan-extent';
import { Strip } from './strip';
import { PaperTablePart } from './table-part';
import { tablesOf } from './tables';

/** Room for labels and dimensions round what is placed. */
const PLAN_MARGIN_MM = 14;

/**
 * The whole handout as it comes out of the printer, one element a sheet. It is laid out on the
 * server: a browser has nothing to work out before it can print.
 */
export function Handout({ input, choice }: { input: HandoutInput; choice: HandoutChoice }) {
  const { paper, units } = choice;
  const { sheet, findings, agencyName } = input;
  const geometry = pageGeometry(paper);
  const plan = planOnPaper(sheet, choice);
  const blanks = blanksOf(sheet, findings);
  const tables = tablePages(tablesOf(input, blanks, units), {
    widthMm: geometry.widthMm - PAGE_BODY.sideMm * 2,
    heightMm: geometry.heightMm - PAGE_BODY.topMm - PAGE_BODY.footMm,
  });
  const of = 1 + tables.length;
  const foot = `${agencyName} · distances in ${units === 'ft' ? 'feet' : 'metres'}`;

  return (
    <div className="handout">
      <style>{`@page { size: ${geometry.widthMm}mm ${geometry.heightMm}mm; margin: 0 }`}</style>
      <PaperPage size={geometry} number={1} of={of} foot={foot}>
        <div className="plan-page" style={{ left: `${EDGE_MM}mm`, top: `${EDGE_MM}mm` }}>
          <PlanDrawing
            input={input}
            units={units}
            plan={geometry.plan}
            seen={plan.seen}
            pxPerMetre={pxPerMetreAt(plan.scale)}
            zero={plan.zero}
          />
          <Strip
            input={input}
            blanks={blanks}
            units={units}
            scale={plan.scale}
            heightMm={geometry.plan.heightMm}
          />
        </div>
        {plan.beyond.length > 0 && (
          <p className="beyond">
            {plan.beyond.length} {plan.beyond.length === 1 ? 'piece lies' : 'pieces lie'} beyond
            this sheet at {plan.scale.words}.
          </p>
        )}
      </PaperPage>
      {tables.map((parts, i) => (
        <PaperPage key={i} size={geometry} number={i + 2} of={of} foot={foot}>
          <div className="table-page">
            <header>
              <h2>{sheet.layout.name ?? 'Not named yet'}</h2>
              <span>
                version {input.version}, saved <LocalDateTime at={input.savedAt} />
              </span>
              <strong>NOT APPROVED</strong>
            </header>
            {parts.map((part) => (
              <PaperTablePart key={part.table.id} part={part} />
            ))}
          </div>
        </PaperPage>
      ))}
    </div>
  );
}

/** The scale, the ground that the plan's frame shows at it, and what lies outside. */
function planOnPaper(sheet: Sheet, { paper, units, scale: chosen }: HandoutChoice) {
  const plane = planeOf(sheet.layout);
  const casualty = piecesOf(sheet.layout.pieces, 'casualty-vehicle')[0];
  const { min, max } = planExtent(sheet, plane);
  const window = pageGeometry(paper).plan;
  const scale = chosen ?? scaleThatFits({ min, max }, window, SCALES[units], PLAN_MARGIN_MM);
  const seen = groundSeen({ x: (min.x + max.x) / 2, y: (min.y + max.y) / 2 }, window, scale);
  return {
    scale,
    seen,
    zero: casualty ? placeOf(plane, casualty) : { x: 0, y: 0 },
    beyond: piecesBeyond(sheet, plane, seen),
  };
}
