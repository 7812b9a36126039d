import type { ReactNode } from 'react';
import type { Kind } from '@/lib/layout';

/** How each kind looks in the case or on the plan, in the ink of its words. */
export function KitSymbol({ kind, size = 34 }: { kind: Kind; size?: number }) {
  return (
    <svg
      viewBox="-20 -16 40 32"
      width={size}
      height={(size * 4) / 5}
      aria-hidden="true"
      focusable="false"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      className="shrink-0"
    >
      {SYMBOLS[kind]}
    </svg>
  );
}

const ring = (r: number, width: number) => (
  <>
    <circle r={r} strokeWidth={width} />
    <path d={`M${-r * 0.5} ${-r * 0.42}H${r * 0.5}M0 ${-r * 0.42}V${r * 0.56}`} />
  </>
);

const vehicle = (line: string) => (
  <>
    <rect x="-19" y="-6.5" width="38" height="13" />
    <path d={`M11 -6.5V6.5M14 -2.5L16.5 0L14 2.5 ${line}`} strokeWidth="1.5" />
  </>
);

const area = (more: ReactNode) => (
  <>
    <path d="M-13 -6L2 -12L14 -4L11 9L-8 11Z" />
    {more}
  </>
);

const SYMBOLS: Record<Kind, ReactNode> = {
  rod: (
    <>
      <circle r="9" fill="currentColor" stroke="none" />
      <path d="M-5 0H5M0 -5V5" className="stroke-margin" />
    </>
  ),
  jumper: (
    <>
      <path d="M-15 7C-10 -11 10 -11 15 7" />
      <circle cx="-15" cy="8" r="3.5" fill="currentColor" />
      <circle cx="15" cy="8" r="3.5" fill="currentColor" />
    </>
  ),
  'ground-cable': (
    <path d="M-14 -4C-14 -14 -5 -14 -5 -4V7C-5 15 3 15 3 7V-4C3 -14 12 -14 12 -4V9" />
  ),
  'bond-cable': (
    <path
      d="M-14 -4C-14 -14 -5 -14 -5 -4V7C-5 15 3 15 3 7V-4C3 -14 12 -14 12 -4V9"
      strokeDasharray="0.1 4.5"
      strokeWidth="2.75"
      strokeLinecap="round"
    />
  ),
  hose: (
    <>
      <path d="M-15 9C-11 -13 11 -13 15 9" strokeWidth="9" />
      <path d="M-15 9C-11 -13 11 -13 15 9" strokeWidth="5" className="stroke-margin" />
    </>
  ),
  'test-lead': <path d="M-16 4C-11 -12 -8 -10 -4 1S3 11 6 0S12 -8 16 -3" />,
  'z-probe': ring(13, 2),
  'y-probe': ring(9.5, 1.75),
  tester: (
    <>
      <rect x="-13" y="-10" width="26" height="20" />
      <path d="M-6.5 4A6.5 6.5 0 0 1 6.5 4Z" strokeWidth="1.5" />
    </>
  ),
  'casualty-vehicle': vehicle('M-16 0H-7L-4 -4L0 4L3 0H8'),
  'receiving-vehicle': vehicle('M-16 0H-8M-5 0H-3M0 0H8'),
  pump: (
    <>
      <circle r="12" />
      <path d="M-6 -10.4L12 0L-6 10.4Z" strokeWidth="1.75" />
    </>
  ),
  'release-point': (
    <path
      d="M0 -13C3 -7 8 -2 8 4A8 8 0 0 1 -8 4C-8 -2 -3 -7 0 -13Z"
      fill="currentColor"
      stroke="none"
      className="text-alarm"
    />
  ),
  pool: (
    <path
      d="M-14 1C-14 -8 -4 -9 2 -8S15 -5 14 3S4 10 -3 9S-14 8 -14 1Z"
      strokeDasharray="2 3"
      strokeLinecap="round"
      className="stroke-alarm"
    />
  ),
  vent: (
    <g className="stroke-alarm">
      <circle r="11" />
      <path d="M-6 3L0 -5L6 3M-6 6.5H6" strokeWidth="1.75" />
    </g>
  ),
  'hot-zone': (
    <g className="stroke-alarm">
      <circle r="12" />
      <path
        d="M0 -12V-8M0 12V8M-12 0H-8M12 0H8M8.5 -8.5L5.7 -5.7M-8.5 8.5L-5.7 5.7M8.5 8.5L5.7 5.7M-8.5 -8.5L-5.7 -5.7"
        strokeWidth="1.5"
      />
    </g>
  ),
  'warm-zone': <circle r="12" strokeDasharray="7 4" className="stroke-caution" />,
  note: (
    <>
      <path d="M-10 -11H10V6L5 11H-10Z" />
      <path d="M-5 -5H5M-5 1H2" strokeWidth="1.5" />
    </>
  ),
  'buried-line': (
    <>
      <path d="M-17 8L17 -8" strokeWidth="12" className="opacity-20" />
      <path d="M-17 8L17 -8" strokeWidth="3" />
    </>
  ),
  'overhead-line': (
    <>
      <path d="M-16 8L16 -8" strokeDasharray="10 3 2 3" />
      <path d="M-11 0L-6 10M6 -10L11 0" strokeWidth="1.5" />
    </>
  ),
  'metal-line': (
    <path d="M-16 4L16 -6M-16 9L16 -1M-11 1L-9 9M-2 -2L0 6M7 -5L9 3" strokeWidth="1.5" />
  ),
  'no-drive': area(<path d="M-9 5L3 -9M-3 9L10 -6M5 9L12 1" strokeWidth="1.25" />),
  'low-ground': area(<path d="M-6 -1C-3 3 5 3 7 -2M-3 5C0 7 3 7 5 5" strokeWidth="1.5" />),
  'fixed-point': (
    <>
      <circle r="6.5" />
      <path d="M-12 0H12M0 -12V12" strokeWidth="1.5" />
    </>
  ),
};
