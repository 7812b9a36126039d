'use client';

import { useState } from 'react';
import type { Pace } from '@/lib/client/by-keys';

const WAYS = [
  { bearing: 270, words: 'west', turn: 180 },
  { bearing: 0, words: 'north', turn: 270 },
  { bearing: 180, words: 'south', turn: 90 },
  { bearing: 90, words: 'east', turn: 0 },
] as const;

/** Moves the piece by single taps, for whoever can't drag: four ways, one foot or a tenth. */
export function StepButtons({
  name,
  roomy,
  onStep,
  onTurn,
}: {
  name: string;
  roomy: boolean;
  onStep: (bearing: number, pace: Pace) => void;
  onTurn: ((sense: 1 | -1) => void) | null;
}) {
  const [pace, setPace] = useState<Pace>('coarse');
  const button = `grid cursor-pointer place-items-center border border-ink bg-paper hover:bg-ink hover:text-paper ${
    roomy ? 'size-16' : 'size-9 pointer-coarse:size-11'
  }`;
  const step = pace === 'coarse' ? '1 ft' : '0.1 ft';
  return (
    <div className="flex flex-wrap items-center gap-1.5" role="group" aria-label={`Move ${name}`}>
      {WAYS.map(({ bearing, words, turn }) => (
        <button
          key={bearing}
          type="button"
          aria-label={`${step} ${words}`}
          className={button}
          onClick={() => onStep(bearing, pace)}
        >
          <svg viewBox="0 0 20 20" width="20" height="20" aria-hidden="true">
            <path
              d="M3 10h12M10 4.5l6 5.5-6 5.5"
              transform={`rotate(${turn} 10 10)`}
              fill="none"
              stroke="currentColor"
              strokeWidth="2.2"
            />
          </svg>
        </button>
      ))}
      <button
        type="button"
        aria-pressed={pace === 'fine'}
        className={`${button} !w-auto px-2`}
        onClick={() => setPace(pace === 'coarse' ? 'fine' : 'coarse')}
      >
        {step}
      </button>
      {onTurn && (
        <>
          <button type="button" className={`${button} !w-auto px-2`} onClick={() => onTurn(-1)}>
            5° left
          </button>
          <button type="button" className={`${button} !w-auto px-2`} onClick={() => onTurn(1)}>
            5° right
          </button>
        </>
      )}
    </div>
  );
}
