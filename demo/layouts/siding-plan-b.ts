import {
  alongTracks as by,
  dunmarrowSiding,
  TRACKS_RUN_DEG,
} from '../../tiles/scenes/dunmarrow-siding';
import { arrange } from '../arrange';
import { TRAILER_KIT } from '../kits';

/**
 * Drawn in a hurry and failing several ways: the tester stands in the hot zone, R1 sits in the
 * doubt of an old electric line, R2 is too far from R1, Y for C is off its line, the cables in
 * the trailer are short, the wind reading is old and an owner hasn't answered.
 */
export const sidingPlanB = arrange(dunmarrowSiding.origin, {
  name: 'Team track, plan B',
  planned_at: '2031-05-04T12:30:00Z',
  conditions: {
    wind: { from_deg: 205, speed_mph: 6, swing_deg: 25, observed_at: '2031-05-04T11:40:00Z' },
    slope: { down_deg: 20, grade_pct: 2 },
    soil: { resistivity_ohm_m: 140, low_ohm_m: 90, high_ohm_m: 260, source: 'entered' },
  },
  liquid: { name: 'Ethanol', un: '1170', flash_point_c: 13, boiling_point_c: 78 },
  kit: TRAILER_KIT,
  casualty: { at: by(0, 0), heading_deg: TRACKS_RUN_DEG, length_ft: 59.5, width_ft: 10.5 },
  receiving: {
    at: by(-94, 31),
    heading_deg: TRACKS_RUN_DEG,
    length_ft: 65,
    width_ft: 8.5,
    vent: { ahead: 0, right: 0 },
  },
  pump: { at: by(-46, 39), heading_deg: TRACKS_RUN_DEG },
  leak: by(8, 4),
  pool: [by(3, 6), by(14, 5.5), by(19, 9), by(15, 14), by(6, 13), by(3, 6)],
  zone: { centre: by(6, 5), hot_ft: 50, warm_ft: 120 },
  systems: {
    C: {
      rods: [by(-30, 62), by(-30, 66.5)],
      driven_ft: 5,
      clamp: { ahead: -20, right: 5.25 },
      round: [by(-27, 40)],
      y: by(-36, 97),
    },
    R: {
      rods: [by(-78, 58), by(-78, 65.4)],
      driven_ft: 5,
      clamp: { ahead: 20, right: 4.25 },
      y: by(-68.1, 100.2),
    },
    P: {
      rods: [by(-54, 63), by(-54, 68)],
      driven_ft: 5,
      clamp: { ahead: -2, right: 2 },
      y: by(-58.9, 101.7),
    },
  },
  z: by(-62, 124),
  tester: by(-20, 44),
  leads_for: 'C',
  bonds: {
    toReceiving: [
      { ahead: -26, right: 5.25 },
      { ahead: 28, right: -4.25 },
    ],
    toPump: [
      { ahead: -23, right: 5.25 },
      { ahead: 2, right: -2 },
    ],
  },
  hoses: {
    suction: [
      { ahead: -17, right: 5.25 },
      { ahead: 3, right: 0 },
    ],
    delivery: [
      { ahead: -3, right: 0 },
      { ahead: 30, right: 4.25 },
    ],
    diameter_in: 3,
  },
  note: { at: by(-120, 60), text: 'Ask Light and Power again for the feeder behind the slab.' },
});
