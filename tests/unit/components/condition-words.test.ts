import { describe, expect, it } from 'vitest';
import {
  downhillWords,
  inArc,
  seenWords,
  soilWords,
  speedWords,
  standsWords,
  swingWords,
  windFromWords,
} from '@/components/conditions/condition-words';

const judged = { judged: true, calmBelowMph: 3 };

describe('conditions in words', () => {
  it('says wind by direction, speed and swing', () => {
    const wind = { from_deg: 330, speed_mph: 8, swing_deg: 20 };
    expect(windFromWords(wind)).toBe('Wind from 330°');
    expect(windFromWords({ from_deg: 7.4 })).toBe('Wind from 007°');
    expect(speedWords(wind, 'mph')).toBe('8 mph');
    expect(speedWords(wind, 'm/s')).toBe('3.6 m/s');
    expect(swingWords(wind)).toBe('swings ±20°');
  });

  it('says nothing of what was not entered, and does not take 0 for it', () => {
    expect(windFromWords(undefined)).toBeNull();
    expect(windFromWords({ from_deg: null })).toBeNull();
    expect(windFromWords({ from_deg: 0 })).toBe('Wind from 000°');
    expect(speedWords({}, 'mph')).toBeNull();
    expect(speedWords({ speed_mph: 0 }, 'kn')).toBe('0 kn');
    expect(swingWords({ swing_deg: 0 })).toBe('swings ±0°');
    expect(soilWords({})).toBeNull();
  });

  it.each([
    ['2031-05-04T13:53:00Z', '2031-05-04T14:02:00Z', 'seen 13:53, 9 min ago', 'fresh'],
    ['2031-05-04T14:02:00Z', '2031-05-04T14:02:30Z', 'seen 14:02, just now', 'fresh'],
    ['2031-05-04T13:32:00Z', '2031-05-04T14:02:00Z', 'seen 13:32, 30 min ago', 'fresh'],
    ['2031-05-04T13:31:00Z', '2031-05-04T14:02:00Z', 'seen 13:31, 31 min ago', 'stale'],
    [
      '2031-05-03T13:00:00Z',
      '2031-05-04T14:02:00Z',
      'seen 2031-05-03 13:00, 25 h 02 min ago',
      'stale',
    ],
    ['2031-05-04T14:10:00Z', '2031-05-04T14:02:00Z', 'seen 14:10, still to come', 'ahead'],
  ])('seen %s, asked at %s', (seen, asOf, words, fresh) => {
    expect(seenWords(seen, asOf, 30, 'UTC')).toEqual({ words, fresh });
  });

  it('tells in the zone of the reader', () => {
    const seen = seenWords('2031-05-04T18:53:00Z', '2031-05-04T19:02:00Z', 30, 'America/Chicago');
    expect(seen.words).toBe('seen 13:53, 9 min ago');
  });

  it('says downhill with what is known of it', () => {
    expect(downhillWords({ down_deg: 150, grade_pct: 3 }, '%', 1)).toBe('Downhill to 150°, 3 %');
    expect(downhillWords({ down_deg: 150, grade_pct: 3 }, '°', 1)).toBe('Downhill to 150°, 1.7°');
    expect(downhillWords({ down_deg: 150 }, '%', 1)).toBe('Downhill to 150°');
    expect(downhillWords({ grade_pct: 0.5 }, '%', 1)).toBe('Level, 0.5 %');
    expect(downhillWords(null, '%', 1)).toBeNull();
  });
});

describe('what the layout stands for', () => {
  const arc = { from_deg: 266, to_deg: 17 };

  it('runs clockwise over north', () => {
    expect([266, 330, 0, 17].every((deg) => inArc(deg, arc))).toBe(true);
    expect([18, 180, 265].some((deg) => inArc(deg, arc))).toBe(false);
  });

  it('stands while the wind is in the arc', () => {
    expect(standsWords(arc, { from_deg: 330 }, judged)).toEqual({
      alarm: null,
      words: 'Stands for wind 266° through 017°',
      tone: 'stands',
    });
  });

  it('says first that it does not stand now', () => {
    expect(standsWords(arc, { from_deg: 90 }, judged)).toMatchObject({
      alarm: 'Does not stand now',
      tone: 'does-not',
    });
  });

  it('takes having no arc for an alarm only once something was judged', () => {
    expect(standsWords(null, {}, { judged: false, calmBelowMph: 3 }).tone).toBe('not-known');
    expect(standsWords(null, { from_deg: 1, speed_mph: 8 }, judged).alarm).toBe(
      'Stands for no wind',
    );
    expect(standsWords(null, { from_deg: 1, speed_mph: 2 }, judged).alarm).toBe(
      'Calm: nowhere is upwind',
    );
  });
});
