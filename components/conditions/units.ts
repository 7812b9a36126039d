'use client';

import type { SpeedUnit } from '@/lib/geo';
import type { SteepnessUnit } from './condition-words';
import { useStoredChoice } from './use-stored-choice';

export const SPEED_UNITS: readonly SpeedUnit[] = ['mph', 'kn', 'm/s', 'km/h'];
export const STEEPNESS_UNITS: readonly SteepnessUnit[] = ['%', '°'];

export const useSpeedUnit = () => useStoredChoice('stillground.speed', SPEED_UNITS, 'mph');
export const useSteepnessUnit = () =>
  useStoredChoice('stillground.steepness', STEEPNESS_UNITS, '%');
