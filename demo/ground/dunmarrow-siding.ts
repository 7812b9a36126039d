import type { SiteGround } from '../../lib/layout';
import { alongTracks as by, dunmarrowSiding } from '../../tiles/scenes/dunmarrow-siding';
import { fromFeet } from '../feet';
import { groundOfScene } from '../scene-ground';
import { buriedLines, type Buried } from './buried';

const feet = fromFeet(dunmarrowSiding.origin);

const lines: Buried[] = [
  {
    // Known from an old drawing only, and its owner has not answered.
    id: 'elec-1',
    utility: 'electric',
    diameter_in: 4,
    depth_ft: 3,
    quality: 'D',
    material: 'metal',
    owner: 'Dunmarrow Light and Power',
    runs: [
      [by(275, 236), by(258, 172), by(196, 70), by(140, 50), by(-178, 50)],
      [by(70, 50), by(70, 56)],
    ],
  },
  {
    id: 'gas-1',
    utility: 'gas-oil-steam',
    diameter_in: 4,
    depth_ft: 4,
    quality: 'B',
    material: 'metal',
    owner: 'Quillan Valley Gas',
    runs: [
      [by(-600, 196), by(-200, 192), by(120, 190), by(600, 206)],
      [by(262, 194), by(276, 145)],
    ],
  },
  {
    id: 'water-1',
    utility: 'potable-water',
    diameter_in: 8,
    depth_ft: 5.5,
    quality: 'B',
    material: 'nonmetal',
    owner: 'Town of Dunmarrow',
    runs: [
      [by(-600, 290), by(600, 300)],
      [by(-24, 290), by(-24, 172)],
    ],
  },
  {
    id: 'comm-1',
    utility: 'communications',
    diameter_in: 2,
    depth_ft: 3.5,
    quality: 'C',
    material: 'nonmetal',
    owner: 'Branch line signals',
    runs: [[by(-600, -66), by(0, -64), by(600, -68)]],
  },
  {
    id: 'air-1',
    utility: 'gas-oil-steam',
    diameter_in: 2,
    depth_ft: 1.5,
    quality: 'C',
    material: 'metal',
    private: true,
    owner: 'Elevator, compressed air',
    runs: [[by(-350, 66), by(-214, 48), by(-176, 46)]],
  },
];

const answered = '2031-05-02T20:10:00Z';

export const dunmarrowGround: SiteGround = {
  features: [
    ...buriedLines(lines, feet),
    ...groundOfScene(dunmarrowSiding, feet, { 'road-feeder': 12_470, 'office-drop': 240 }),
  ],
  answers: {
    electric: { answer: 'waiting', at: '2031-05-02T14:00:00Z' },
    'gas-oil-steam': { answer: 'marked', at: answered },
    communications: { answer: 'marked', at: '2031-05-03T15:30:00Z' },
    'potable-water': { answer: 'marked', at: answered },
    'reclaimed-water': { answer: 'clear', at: answered },
    sewer: { answer: 'clear', at: answered },
    private: { answer: 'marked', at: '2031-05-03T17:45:00Z' },
  },
  overhead_none_known_as_of: null,
  locates: [
    {
      ticket: 'QC-310502-0112',
      lawful_start: '2031-05-04T05:00:00Z',
      valid_until: '2031-05-18T05:00:00Z',
      emergency: false,
    },
  ],
};
