'use client';

import { CHECKS, type Finding } from '@/lib/checks';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing } from '@/lib/client/use-drawing';
import { lineWords } from './line-words';

const TITLES = new Map(CHECKS.map(({ id, title }) => [id, title]));

/** What does not apply here, put away but never left out: a reader may doubt it. */
export function NotApplicable({ findings }: { findings: readonly Finding[] }) {
  const sheet = useDrawing((s) => s.sheet);
  if (findings.length === 0) return null;
  return (
    <details className="mt-3">
      <summary className="pointer-coarse:min-h-11 min-h-8 cursor-pointer py-1 text-ink-soft">
        {findings.length} {findings.length === 1 ? 'does' : 'do'} not apply
      </summary>
      <ul>
        {findings.map((finding) => (
          <li key={finding.id} className="flex items-baseline gap-1.5 py-0.5">
            <StatusShape status="n/a" />
            <span>
              {TITLES.get(finding.rule)}: {lineWords(sheet, finding)}
            </span>
          </li>
        ))}
      </ul>
    </details>
  );
}
