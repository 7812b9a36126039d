import { harrowFlatCoop } from '../../tiles/scenes';
import { arrange } from '../arrange';
import { TRUCK_KIT } from '../kits';

/**
 * The plan kept for a site that is visited every season: arranged uphill of the rack, with the
 * day's wind left to be entered on the day and a locate ticket that has run out by then.
 */
export const coopStandingPlan = arrange(harrowFlatCoop.origin, {
  name: 'Standing plan, rack to north apron',
  planned_at: '2031-06-18T15:00:00Z',
  conditions: {
    slope: { down_deg: 205, grade_pct: 4 },
    soil: { resistivity_ohm_m: 85, low_ohm_m: 55, high_ohm_m: 150, source: 'entered' },
  },
  liquid: { name: 'Gasoline', un: '1203', flash_point_c: -43, boiling_point_c: 39 },
  kit: TRUCK_KIT,
  casualty: { at: [0, 0], heading_deg: 100, length_ft: 65, width_ft: 8.5 },
  receiving: {
    at: [-4, 74],
    heading_deg: 100,
    length_ft: 65,
    width_ft: 8.5,
    vent: { ahead: -2, right: 0 },
  },
  pump: { at: [-34, 52], heading_deg: 10 },
  leak: [6, -6],
  zone: { centre: [2, -4], hot_ft: 42, warm_ft: 100 },
  systems: {
    C: {
      rods: [
        [-58, 26],
        [-58, 31],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -26, right: -4.25 },
      round: [[-46, 14]],
      y: [-91.4, 43.9],
    },
    R: {
      rods: [
        [-58, 64],
        [-58, 69],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -30, right: 4.25 },
      y: [-91.4, 60.2],
    },
    P: {
      rods: [[-56, 46]],
      driven_ft: 5.5,
      clamp: { ahead: 0, right: -2 },
      y: [-90.6, 52.2],
    },
  },
  z: [-112, 56],
  tester: [-66, 38],
  leads_for: 'C',
  bonds: {
    toReceiving: [
      { ahead: -8, right: -4.25 },
      { ahead: -8, right: 4.25 },
    ],
    toPump: [
      { ahead: -14, right: -4.25 },
      { ahead: -2, right: 2 },
    ],
  },
  hoses: {
    suction: [
      { ahead: -11, right: -4.25 },
      { ahead: -3, right: 0 },
    ],
    delivery: [
      { ahead: 3, right: 0 },
      { ahead: -14, right: 4.25 },
    ],
    diameter_in: 4,
  },
});
