'use client';

import { useDeferredValue, useMemo, useRef, useState } from 'react';
import { CHECKS, type Missing, type Status } from '@/lib/checks';
import { useDrawing } from '@/lib/client/use-drawing';
import { ChecksHead } from './checks-head';
import { countFindings } from './count-findings';
import { firstToFailWords } from './first-to-fail-words';
import { FindingRow } from './finding-row';
import { FoldedRow } from './folded-row';
import { groupFindings, type Show } from './group-findings';
import { NotApplicable } from './not-applicable';
import { offerFields } from './offer-fields';

const NOTHING_OFFERED: ReadonlySet<Missing> = new Set();

/** Every check's answer: counts, what fails first, then the findings by question, worst first. */
export function ChecksPanel() {
  // The plan comes first: while a piece is dragged the list follows as time is left.
  const findings = useDeferredValue(useDrawing((s) => s.findings));
  const firstWords = useDrawing((s) => firstToFailWords(s.firstToFail, s.asOf));
  const [show, setShow] = useState<Show>('all');
  const list = useRef<HTMLDivElement>(null);
  const counts = useMemo(() => countFindings(findings), [findings]);
  const { groups, notApplicable } = useMemo(
    () => groupFindings(findings, CHECKS, show),
    [findings, show],
  );
  const offers = useMemo(() => offerFields(groups), [groups]);

  const goTo = (status: Status): void => {
    if (status === 'meets' && show === 'attention') setShow('all');
    const row = list.current?.querySelector(`li[data-status="${status}"]`);
    row?.scrollIntoView({ block: 'start' });
    row?.querySelector('button')?.focus();
  };

  return (
    <section aria-label="Checks" className="flex min-h-0 flex-col px-4 pt-2.5">
      <ChecksHead counts={counts} show={show} onGoTo={goTo} onShow={setShow} />
      <p className="border-b border-rule pb-1.5 pt-1 leading-snug">
        <strong>First to fail:</strong> {firstWords}
      </p>
      <div
        ref={list}
        className="relative min-h-0 grow scroll-py-2 overflow-y-auto overscroll-contain pb-3"
      >
        {groups.length === 0 && (
          <p className="py-3">
            {show === 'attention' && findings.length > 0
              ? 'Nothing needs attention.'
              : 'No check has answered yet.'}
          </p>
        )}
        {groups.map(({ question, rows }) => (
          <section key={question} aria-label={question}>
            <h3 className="mt-3 border-b-[1.5px] border-rule pb-0.5 font-bold">{question}</h3>
            <ul className="pt-1">
              {rows.map((row) =>
                row.findings.length === 1 ? (
                  <FindingRow
                    key={row.key}
                    finding={row.findings[0]}
                    title={row.title}
                    offered={offers.get(row.key) ?? NOTHING_OFFERED}
                  />
                ) : (
                  <FoldedRow
                    key={row.key}
                    row={row}
                    offered={offers.get(row.key) ?? NOTHING_OFFERED}
                  />
                ),
              )}
            </ul>
          </section>
        ))}
        {show === 'all' && <NotApplicable findings={notApplicable} />}
      </div>
    </section>
  );
}
