import type { Status } from '@/lib/checks';
import { STATUS_INK, STATUS_WORDS } from './status';

/**
 * The shape of a status: a disc with a tick, a triangle, a filled square, a reversed block with a
 * question mark, a dash. Drawn, not typed, because the shipped font has none of these signs.
 */
export function StatusShape({ status, size = '1em' }: { status: Status; size?: string | number }) {
  return (
    <svg
      viewBox="0 0 16 16"
      width={size}
      height={size}
      aria-hidden="true"
      focusable="false"
      className={`inline-block shrink-0 align-[-0.125em] ${STATUS_INK[status]}`}
    >
      {SHAPES[status]}
    </svg>
  );
}

/** Shape and word together; `children` replaces the word where the sentence already says it. */
export function StatusMark({
  status,
  children,
  className = '',
}: {
  status: Status;
  children?: React.ReactNode;
  className?: string;
}) {
  return (
    <span className={`inline-flex items-baseline gap-1.5 ${STATUS_INK[status]} ${className}`}>
      <StatusShape status={status} />
      <span>{children ?? STATUS_WORDS[status]}</span>
    </span>
  );
}

/**
 * How many of a status. Not met and not known stand reversed, so that neither can be overlooked
 * in grey; the calm ones are plain. A count of zero is always plain.
 */
export function StatusCount({ status, count }: { status: Status; count: number }) {
  const reversed = count > 0 && (status === 'not-met' || status === 'not-known');
  const ground = status === 'not-met' ? 'bg-alarm text-on-alarm' : 'bg-ink text-paper';
  return (
    <span
      className={`inline-flex items-center gap-2 whitespace-nowrap text-lg font-bold leading-none ${
        reversed ? `${ground} border border-transparent px-3 py-1.5` : STATUS_INK[status]
      }`}
    >
      <svg viewBox="0 0 16 16" width="1em" height="1em" aria-hidden="true" focusable="false">
        {reversed && status === 'not-known' ? QUESTION : SHAPES[status]}
      </svg>
      {count} {STATUS_WORDS[status]}
    </span>
  );
}

const QUESTION = (
  <>
    <path
      d="M4.9 5.9a3.1 3.1 0 1 1 4.8 2.6C8.6 9.2 8 9.7 8 11"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.1"
    />
    <rect x="6.9" y="12.4" width="2.2" height="2.2" fill="currentColor" />
  </>
);

const SHAPES: Record<Status, React.ReactNode> = {
  meets: (
    <>
      <circle cx="8" cy="8" r="7.5" fill="currentColor" />
      <path d="M4.3 8.4l2.6 2.6 5-5.7" fill="none" className="stroke-paper" strokeWidth="2" />
    </>
  ),
  caution: <path d="M8 2.2L14.6 14H1.4Z" fill="none" stroke="currentColor" strokeWidth="1.8" />,
  'not-met': <rect x="1.5" y="1.5" width="13" height="13" fill="currentColor" />,
  'not-known': (
    <>
      <rect width="16" height="16" fill="currentColor" />
      <g className="text-paper">{QUESTION}</g>
    </>
  ),
  'n/a': <path d="M2 8h12" stroke="currentColor" strokeWidth="2" />,
};
