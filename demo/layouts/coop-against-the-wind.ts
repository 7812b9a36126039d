import { harrowFlatCoop } from '../../tiles/scenes';
import { arrange } from '../arrange';
import { TRUCK_KIT } from '../kits';

/**
 * The wind blows up the slope, so that no ground is both upwind and uphill: everything stands
 * upwind, and every check of the slope answers with a caution.
 */
export const coopAgainstTheWind = arrange(harrowFlatCoop.origin, {
  name: 'Loading rack, wind up the slope',
  planned_at: '2031-05-04T13:00:00Z',
  conditions: {
    wind: { from_deg: 190, speed_mph: 9, swing_deg: 20, observed_at: '2031-05-04T12:52:00Z' },
    slope: { down_deg: 205, grade_pct: 4 },
    soil: { resistivity_ohm_m: 85, low_ohm_m: 55, high_ohm_m: 150, source: 'entered' },
  },
  liquid: { name: 'Gasoline', un: '1203', flash_point_c: -43, boiling_point_c: 39 },
  kit: TRUCK_KIT,
  casualty: { at: [0, 0], heading_deg: 100, length_ft: 65, width_ft: 8.5 },
  receiving: {
    at: [-8, -96],
    heading_deg: 100,
    length_ft: 65,
    width_ft: 8.5,
    vent: { ahead: 2, right: 0 },
  },
  pump: { at: [-22, -56], heading_deg: 190 },
  leak: [6, -6],
  pool: [
    [2, -6],
    [9, -7],
    [10, -13],
    [4, -15],
    [1, -11],
    [2, -6],
  ],
  zone: { centre: [2, -4], hot_ft: 44, warm_ft: 100 },
  systems: {
    C: {
      rods: [
        [-62, -30],
        [-62, -35],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -24, right: 4.25 },
      round: [[-44, -12]],
      y: [-95.4, -45.8],
    },
    R: {
      rods: [
        [-62, -70],
        [-62, -75],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -30, right: -4.25 },
      y: [-95.4, -61.1],
    },
    P: {
      rods: [[-60, -50]],
      driven_ft: 5.5,
      clamp: { ahead: -2, right: 2 },
      y: [-94.6, -52.5],
    },
  },
  z: [-116, -54],
  tester: [-68, -42],
  leads_for: 'C',
  bonds: {
    toReceiving: [
      { ahead: -16, right: 4.25 },
      { ahead: -16, right: -4.25 },
    ],
    toPump: [
      { ahead: -18, right: 4.25 },
      { ahead: -2.5, right: 2 },
    ],
  },
  hoses: {
    suction: [
      { ahead: -12, right: 4.25 },
      { ahead: -3, right: 0 },
    ],
    delivery: [
      { ahead: 3, right: 0 },
      { ahead: -12, right: -4.25 },
    ],
    diameter_in: 4,
  },
});
