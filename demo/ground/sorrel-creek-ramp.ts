import type { SiteGround } from '../../lib/layout';
import { sorrelCreekRamp } from '../../tiles/scenes';
import { fromFeet } from '../feet';
import { groundOfScene } from '../scene-ground';
import { buriedLines, type Buried } from './buried';

const feet = fromFeet(sorrelCreekRamp.origin);

const lines: Buried[] = [
  {
    id: 'gas-1',
    utility: 'gas-oil-steam',
    diameter_in: 2,
    depth_ft: 3.5,
    quality: 'B',
    material: 'metal',
    owner: 'Quillan Valley Gas',
    runs: [
      [
        [-300, 480],
        [-168, 188],
        [-122, 91],
        [-55, -50],
        [20, -214],
        [96, -400],
      ],
    ],
  },
  {
    id: 'water-1',
    utility: 'potable-water',
    diameter_in: 8,
    depth_ft: 5,
    quality: 'B',
    material: 'nonmetal',
    owner: 'Rural Water District 6',
    runs: [
      [
        [-590, -118],
        [-410, -4],
        [-180, 124],
        [-72, 188],
        [70, 270],
        [240, 372],
        [380, 470],
      ],
    ],
  },
  {
    id: 'elec-1',
    utility: 'electric',
    diameter_in: 2,
    depth_ft: 2.5,
    quality: 'C',
    material: 'metal',
    owner: 'County lighting',
    runs: [
      [
        [118, 78],
        [226, 150],
        [306, 214],
        [380, 300],
        [473, 330],
      ],
    ],
  },
  {
    id: 'comm-1',
    utility: 'communications',
    diameter_in: 1.5,
    depth_ft: 3,
    quality: 'C',
    material: 'nonmetal',
    owner: 'Plains Fibre',
    runs: [
      [
        [-590, -440],
        [-300, -346],
        [100, -216],
        [590, -56],
      ],
    ],
  },
];

const answered = '2031-05-02T19:20:00Z';

export const sorrelCreekGround: SiteGround = {
  features: [
    ...buriedLines(lines, feet),
    ...groundOfScene(sorrelCreekRamp, feet, { 'tollgate-feeder': 7200 }),
  ],
  answers: {
    electric: { answer: 'marked', at: answered },
    'gas-oil-steam': { answer: 'marked', at: '2031-05-02T16:05:00Z' },
    communications: { answer: 'marked', at: '2031-05-03T13:40:00Z' },
    'potable-water': { answer: 'marked', at: answered },
    'reclaimed-water': { answer: 'clear', at: answered },
    sewer: { answer: 'clear', at: answered },
    private: { answer: 'clear', at: answered },
  },
  overhead_none_known_as_of: null,
  locates: [
    {
      ticket: 'QC-310501-0417',
      lawful_start: '2031-05-03T05:00:00Z',
      valid_until: '2031-05-17T05:00:00Z',
      emergency: false,
    },
  ],
};
