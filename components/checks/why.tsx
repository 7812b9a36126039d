'use client';

import type { Finding, Gate } from '@/lib/checks';
import { useDrawing } from '@/lib/client/use-drawing';
import { MARK_WORDS } from '@/lib/limits';
import { allowedWords } from './measure-words';

const GATE_WORDS: Record<Gate, string> = {
  stop: 'Nothing clears it at approval but putting it right.',
  deviation: 'At approval a safety officer, never the one who drew it, may accept it in writing.',
  ack: 'At approval it is acknowledged by itself.',
};

/** The rule, the limit and whose it is, how far the number can be trusted, where it comes from. */
export function Why({ finding, title, id }: { finding: Finding; title: string; id: string }) {
  const limitsName = useDrawing((s) => s.limits.name);
  const agency = useDrawing((s) => s.meta.agencyName);
  const allowed = finding.allowed && allowedWords(finding.allowed);
  const open = finding.status === 'not-met' || finding.status === 'not-known';
  return (
    <dl
      id={id}
      className="my-1 ml-6 grid grid-cols-[auto_1fr] gap-x-3 border-l-2 border-rule pl-3 [&_dt]:text-ink-soft"
    >
      <dt>Rule</dt>
      <dd>
        {title} <span className="text-sm text-ink-soft">({finding.rule})</span>
      </dd>
      {allowed && (
        <>
          <dt>Limit</dt>
          <dd>
            {allowed}, {limitsName ? `${limitsName}, ` : ''}
            {agency}
          </dd>
        </>
      )}
      <dt>Mark</dt>
      <dd>{MARK_WORDS[finding.mark]}</dd>
      <dt>Source</dt>
      <dd>{finding.source}</dd>
      {open && (
        <>
          <dt>Gate</dt>
          <dd>{GATE_WORDS[finding.gate]}</dd>
        </>
      )}
    </dl>
  );
}
