import type { ReactNode } from 'react';
import { StatusShape } from './status-mark';
import type { Status } from '@/lib/checks';

export type NoticeKind = 'told' | 'caution' | 'failed';

const LOOKS: Record<NoticeKind, { box: string; status: Status | null }> = {
  told: { box: 'border-rule bg-margin', status: null },
  caution: { box: 'border-caution bg-caution-wash', status: 'caution' },
  failed: { box: 'border-alarm bg-alarm-wash', status: 'not-met' },
};

/**
 * Something to be told. A failure says what happened (`title`), what is kept and what to do next
 * (`children`); it is announced at once, the others when the reader is at rest.
 */
export function Notice({
  kind = 'told',
  title,
  children,
  className = '',
}: {
  kind?: NoticeKind;
  title: ReactNode;
  children?: ReactNode;
  className?: string;
}) {
  const { box, status } = LOOKS[kind];
  return (
    <div
      role={kind === 'failed' ? 'alert' : 'status'}
      className={`border-l-4 px-4 py-3 ${box} ${className}`}
    >
      <p className="flex items-baseline gap-2 font-bold">
        {status && <StatusShape status={status} />}
        <span>{title}</span>
      </p>
      {children && <div className="mt-1">{children}</div>}
    </div>
  );
}
