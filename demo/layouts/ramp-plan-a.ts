import { sorrelCreekRamp } from '../../tiles/scenes';
import { arrange } from '../arrange';
import { TRUCK_KIT } from '../kits';

/** Everything meets: a tanker off the ramp's edge, the receiver in the turnout above it. */
export const rampPlanA = arrange(sorrelCreekRamp.origin, {
  name: 'Ramp, plan A',
  planned_at: '2031-05-04T14:00:00Z',
  conditions: {
    wind: { from_deg: 330, speed_mph: 8, swing_deg: 20, observed_at: '2031-05-04T13:50:00Z' },
    slope: { down_deg: 150, grade_pct: 3 },
    soil: { resistivity_ohm_m: 60, low_ohm_m: 40, high_ohm_m: 90, source: 'entered' },
  },
  liquid: { name: 'n-Hexane', un: '1208', flash_point_c: -23, boiling_point_c: 69 },
  kit: TRUCK_KIT,
  casualty: { at: [0, 0], heading_deg: 60, length_ft: 65, width_ft: 8.5 },
  receiving: {
    at: [30, 91],
    heading_deg: 60,
    length_ft: 65,
    width_ft: 8.5,
    vent: { ahead: 4, right: 0 },
  },
  pump: { at: [8, 61], heading_deg: 60 },
  leak: [10, 3],
  zone: { centre: [0, 0], hot_ft: 45, warm_ft: 100 },
  systems: {
    C: {
      rods: [
        [-39.6, 40.6],
        [-42.1, 45],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -14, right: -4.25 },
      round: [[-33, 22]],
      y: [-52.6, 80.5],
    },
    R: {
      rods: [
        [-15.4, 54.6],
        [-17.9, 58.9],
      ],
      driven_ft: 5.5,
      clamp: { ahead: -25, right: 4.25 },
      round: [[-6, 62]],
      y: [-43.4, 85.9],
    },
    P: {
      rods: [[-27.5, 47.6]],
      driven_ft: 5.5,
      clamp: { ahead: -2, right: -2 },
      round: [[-8, 51]],
      y: [-47.5, 82.4],
    },
  },
  z: [-60, 104],
  tester: [-32.5, 42.4],
  leads_for: 'C',
  bonds: {
    toReceiving: [
      { ahead: 19, right: -4.25 },
      { ahead: -15, right: 4.25 },
    ],
    toPump: [
      { ahead: 22, right: -4.25 },
      { ahead: -1, right: 2 },
    ],
  },
  hoses: {
    suction: [
      { ahead: 26, right: -4.25 },
      { ahead: 1, right: 2 },
    ],
    delivery: [
      { ahead: 2, right: -2 },
      { ahead: -6, right: 4.25 },
    ],
    diameter_in: 4,
  },
});
