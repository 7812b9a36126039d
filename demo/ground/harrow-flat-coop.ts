import type { SiteGround } from '../../lib/layout';
import { harrowFlatCoop } from '../../tiles/scenes';
import { fromFeet } from '../feet';
import { groundOfScene } from '../scene-ground';
import { buriedLines, type Buried } from './buried';

const feet = fromFeet(harrowFlatCoop.origin);

const lines: Buried[] = [
  {
    id: 'elec-1',
    utility: 'electric',
    diameter_in: 3,
    depth_ft: 2.5,
    quality: 'B',
    material: 'metal',
    owner: 'Harrow Rural Electric',
    runs: [
      [
        [152, -46],
        [120, 20],
        [60, 30],
        [4, 32],
      ],
    ],
  },
  {
    id: 'product-1',
    utility: 'gas-oil-steam',
    diameter_in: 4,
    depth_ft: 2,
    quality: 'A',
    material: 'metal',
    private: true,
    owner: 'Harrow Flat Co-op, product line',
    runs: [
      [
        [44, 76],
        [36, 48],
        [20, 30],
      ],
      [
        [44, 88],
        [32, 52],
        [12, 33],
      ],
    ],
  },
  {
    id: 'water-1',
    utility: 'potable-water',
    diameter_in: 6,
    depth_ft: 5,
    quality: 'B',
    material: 'nonmetal',
    owner: 'Rural Water District 6',
    runs: [
      [
        [-540, 176],
        [-300, 160],
        [-112, 132],
        [-66, 118],
        [24, 140],
        [226, 160],
      ],
    ],
  },
  {
    id: 'comm-1',
    utility: 'communications',
    diameter_in: 1.25,
    depth_ft: 2.5,
    quality: 'C',
    material: 'unknown',
    owner: 'Plains Fibre',
    runs: [
      [
        [-540, -336],
        [-60, -304],
        [540, -294],
      ],
      [
        [158, -296],
        [160, -92],
      ],
    ],
  },
  {
    id: 'sewer-1',
    utility: 'sewer',
    diameter_in: 6,
    depth_ft: 4,
    quality: 'C',
    material: 'nonmetal',
    owner: 'Harrow Flat Co-op, septic',
    runs: [
      [
        [176, -94],
        [232, -120],
        [300, -150],
      ],
    ],
  },
];

const answered = '2031-04-29T18:00:00Z';

export const harrowFlatGround: SiteGround = {
  features: [
    ...buriedLines(lines, feet),
    ...groundOfScene(harrowFlatCoop, feet, { 'harrow-feeder': 7200, 'yard-service': 240 }),
  ],
  answers: {
    electric: { answer: 'marked', at: answered },
    'gas-oil-steam': { answer: 'clear', at: answered },
    communications: { answer: 'marked', at: answered },
    'potable-water': { answer: 'marked', at: answered },
    'reclaimed-water': { answer: 'clear', at: answered },
    sewer: { answer: 'marked', at: answered },
    private: { answer: 'marked', at: answered },
  },
  overhead_none_known_as_of: null,
  locates: [
    {
      ticket: 'QC-310428-0093',
      lawful_start: '2031-04-30T05:00:00Z',
      valid_until: '2031-05-14T05:00:00Z',
      emergency: false,
    },
  ],
};
