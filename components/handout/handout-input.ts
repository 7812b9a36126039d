import type { LayoutAnswer } from '@/lib/api';
import {
  firstToFail,
  runChecks,
  standsFor,
  type Finding,
  type FirstToFail,
  type WindArc,
} from '@/lib/checks';
import type { Sheet } from '@/lib/layout';
import type { Limits } from '@/lib/limits';

/** What a handout is printed from: one version of a layout, with the answers for one instant. */
export type HandoutInput = {
  readonly sheet: Sheet;
  readonly limits: Limits;
  readonly findings: readonly Finding[];
  readonly arc: WindArc | null;
  readonly firstToFail: FirstToFail;
  /** The instant that the findings answer for. */
  readonly asOf: string;
  readonly agencyName: string;
  readonly siteName: string;
  readonly drawnBy: string | null;
  /** The version printed, and when it was saved. */
  readonly version: number;
  readonly savedAt: string;
};

/**
 * The checks answer for the planned start; where none is planned, for the moment of printing.
 */
export function handoutInput(answer: LayoutAnswer, now: string): HandoutInput {
  const sheet: Sheet = { layout: answer.layout, site: answer.site.ground };
  const asOf = answer.layout.planned_at ?? now;
  const asked = { layout: sheet.layout, site: sheet.site, limits: answer.limits, asOf };
  return {
    sheet,
    limits: answer.limits,
    findings: runChecks(asked),
    arc: standsFor(asked),
    firstToFail: firstToFail(asked),
    asOf,
    agencyName: answer.agency.name,
    siteName: answer.site.name,
    drawnBy: answer.drawn_by?.name ?? null,
    version: answer.version,
    savedAt: answer.saved_at,
  };
}
