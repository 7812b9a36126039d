'use client';

import { useMemo } from 'react';
import { dateTimeWords } from '@/components/conditions/time-words';
import { useReadersZone } from '@/components/ui/when';
import { groundSeen, PAPERS, pxPerMetreAt, SCALES, scaleThatFits } from '@/lib/draw';
import { piecesOf, placeOf, planeOf } from '@/lib/layout';
import { blanksOf } from './blanks';
import type { HandoutChoice } from './handout-choice';
import type { HandoutInput } from './handout-input';
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

/** The whole handout as it comes out of the printer, one element a sheet. */
export function Handout({ input, choice }: { input: HandoutInput; choice: HandoutChoice }) {
  const zone = useReadersZone();
  const { paper, units } = choice;
  const { sheet, findings, agencyName } = input;
  const geometry = pageGeometry(paper);
  const plan = useMemo(() => {
    const plane = planeOf(sheet.layout);
    const casualty = piecesOf(sheet.layout.pieces, 'casualty-vehicle')[0];
    const extent = planExtent(sheet, plane);
    const window = pageGeometry(paper).plan;
    const scale = choice.scale ?? scaleThatFits(extent, window, SCALES[units], PLAN_MARGIN_MM);
    const centre = {
      x: (extent.min.x + extent.max.x) / 2,
      y: (extent.min.y + extent.max.y) / 2,
    };
    const seen = groundSeen(centre, window, scale);
    return {
      scale,
      seen,
      zero: casualty ? placeOf(plane, casualty) : { x: 0, y: 0 },
      beyond: piecesBeyond(sheet, plane, seen),
    };
  }, [sheet, paper, units, choice.scale]);
  const blanks = useMemo(() => blanksOf(sheet, findings), [sheet, findings]);
  const tables = useMemo(
    () =>
      tablePages(tablesOf(input, blanks, units), {
        widthMm: PAPERS[paper].widthMm - PAGE_BODY.sideMm * 2,
        heightMm: PAPERS[paper].heightMm - PAGE_BODY.topMm - PAGE_BODY.footMm,
      }),
    [input, blanks, units, paper],
  );
  // The server knows neither the reader's zone nor a browser's sines to the last digit.
  if (zone === null) return <p>Laying the plan on paper …</p>;
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
            zone={zone}
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
                version {input.version}, saved {dateTimeWords(input.savedAt, zone)}
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
