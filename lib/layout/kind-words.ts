import type { Kind } from './pieces';

/** What each kind is called in a sentence. */
export const KIND_WORDS: Record<Kind, string> = {
  'casualty-vehicle': 'casualty vehicle',
  'receiving-vehicle': 'receiving vehicle',
  pump: 'pump',
  'release-point': 'release point',
  vent: 'vent',
  pool: 'pool',
  rod: 'rod',
  jumper: 'jumper',
  'ground-cable': 'ground cable',
  'bond-cable': 'bond cable',
  hose: 'hose',
  'z-probe': 'Z probe',
  'y-probe': 'Y probe',
  tester: 'tester',
  'test-lead': 'test lead',
  'hot-zone': 'hot zone',
  'warm-zone': 'warm zone',
  note: 'note',
  'no-drive': 'no-drive ground',
  'low-ground': 'low ground',
  'buried-line': 'buried line',
  'metal-line': 'metal line',
  'overhead-line': 'overhead line',
  'fixed-point': 'fixed point',
};
