import { rectangle, step } from '../curves';
import type { Ft, Road, Scene } from '../scene';

/** A team track beside a branch line, with a slab where rail cars are emptied into tank trucks. */

export const TRACKS_RUN_DEG = 84;

/** Feet along the tracks from the origin, eastward, and to the right (south) of the team track. */
export const alongTracks = (along: number, right: number): Ft =>
  step([0, 0], TRACKS_RUN_DEG, along, right);
const by = alongTracks;
const lot = (along: number, right: number, lengthFt: number, widthFt: number): Ft[] =>
  rectangle(by(along, right), TRACKS_RUN_DEG, lengthFt, widthFt);

const elevatorRoad: Road = {
  id: 'elevator-road',
  centre: [by(-680, 268), by(-300, 262), by(0, 262), by(320, 268), by(700, 284)],
  width_ft: 24,
  surface: 'asphalt',
  lines: [
    { offset_ft: -10.5, dashed: false },
    { offset_ft: 0, dashed: true },
    { offset_ft: 10.5, dashed: false },
  ],
};

const yardDrive: Road = {
  id: 'yard-drive',
  centre: [by(196, 268), by(196, 225), by(190, 150), by(172, 96), by(150, 52), by(120, 30)],
  width_ft: 22,
  surface: 'gravel',
  lines: [],
};

const elevatorDrive: Road = {
  id: 'elevator-drive',
  centre: [by(-420, 266), by(-418, 200), by(-392, 120), by(-330, 66), by(-240, 34), by(-160, 27)],
  width_ft: 20,
  surface: 'gravel',
  lines: [],
};

export const dunmarrowSiding: Scene = {
  pack: 'dunmarrow-siding',
  name: 'Dunmarrow siding',
  attribution: 'Invented ground, drawn for Stillground',
  origin: [-100.93381, 42.16042],
  extent: { west: -600, south: -470, east: 600, north: 430 },
  close_up: { west: -190, south: -190, east: 150, north: 60 },
  ground: {
    height_ft: 588.4,
    down_deg: 20,
    grade_pct: 2,
    working_radius_ft: 150,
    swells: [
      { length_ft: 520, toward_deg: 100, height_ft: 0.5, phase_deg: 60 },
      { length_ft: 700, toward_deg: 50, height_ft: 0.7, phase_deg: 210 },
      { length_ft: 260, toward_deg: 150, height_ft: 0.12, phase_deg: 10 },
    ],
  },
  roads: [elevatorRoad, yardDrive, elevatorDrive],
  hardstands: [
    { id: 'transload-slab', outline: lot(-20, 27, 300, 33), surface: 'concrete' },
    { id: 'elevator-yard', outline: lot(-350, 118, 150, 110), surface: 'gravel' },
    { id: 'office-lot', outline: lot(262, 132, 124, 76), surface: 'gravel' },
  ],
  rails: [
    {
      id: 'main-track',
      centre: [by(-700, -44), by(-300, -44), by(0, -44), by(300, -44), by(700, -44)],
    },
    {
      id: 'siding-2',
      centre: [
        by(-700, -16),
        by(-200, -16),
        by(150, -16),
        by(380, -16),
        by(470, -22),
        by(560, -36),
        by(640, -44),
      ],
    },
    {
      id: 'team-track',
      centre: [by(-520, -16), by(-430, -14), by(-330, -4), by(-260, 0), by(0, 0), by(214, 0)],
    },
  ],
  buildings: [
    { id: 'office', outline: lot(284, 128, 52, 34) },
    { id: 'scale-house', outline: lot(152, 128, 16, 12) },
    { id: 'elevator', outline: lot(-350, 92, 46, 30) },
    { id: 'elevator-annex', outline: lot(-398, 92, 34, 22) },
    { id: 'pump-shed', outline: lot(-214, 66, 18, 14) },
  ],
  tanks: [
    { at: by(-388, 140), diameter_ft: 32 },
    { at: by(-350, 140), diameter_ft: 32 },
    { at: by(-312, 140), diameter_ft: 32 },
    { at: by(-294, 92), diameter_ft: 20 },
  ],
  walls: [{ id: 'bumper', path: [by(216, -5), by(216, 5)] }],
  ditches: [
    {
      id: 'north-ditch',
      centre: [by(-640, -84), by(-300, -80), by(0, -82), by(300, -80), by(640, -86)],
      width_ft: 14,
    },
    {
      id: 'slab-swale',
      centre: [by(-236, 104), by(-190, 92), by(-140, 84), by(-96, 66), by(-72, 54)],
      width_ft: 10,
    },
  ],
  fences: [
    {
      id: 'yard-fence',
      path: [by(180, 214), by(60, 214), by(-120, 214), by(-290, 214), by(-402, 214)],
    },
    {
      id: 'yard-fence-east',
      path: [by(210, 214), by(350, 214), by(352, 66), by(352, 20)],
    },
  ],
  guardrails: [],
  culverts: [
    { id: 'drive-culvert', path: [by(180, 246), by(212, 246)] },
    { id: 'track-culvert', path: [by(-248, 30), by(-252, -86)] },
  ],
  overhead: [
    {
      id: 'road-feeder',
      path: [
        by(-660, 238),
        by(-500, 236),
        by(-345, 236),
        by(-190, 236),
        by(-35, 236),
        by(120, 236),
        by(275, 240),
        by(430, 246),
        by(590, 254),
        by(700, 260),
      ],
    },
    { id: 'office-drop', path: [by(275, 240), by(284, 146)] },
  ],
  fields: [
    {
      outline: [by(-700, 300), by(700, 320), by(700, 700), by(-700, 700)],
      rows_toward_deg: 84,
    },
    {
      outline: [by(-700, -112), by(700, -112), by(700, -560), by(-700, -560)],
      rows_toward_deg: 174,
    },
  ],
  trees: [
    { at: by(-250, 236), crown_ft: 24 },
    { at: by(-224, 230), crown_ft: 18 },
    { at: by(34, 236), crown_ft: 22 },
    { at: by(62, 232), crown_ft: 26 },
    { at: by(92, 237), crown_ft: 20 },
    { at: by(322, 178), crown_ft: 26 },
    { at: by(338, 156), crown_ft: 18 },
    { at: by(232, 184), crown_ft: 20 },
    { at: by(-458, 150), crown_ft: 28 },
    { at: by(-470, 122), crown_ft: 22 },
    { at: by(-452, 96), crown_ft: 20 },
    { at: by(430, 110), crown_ft: 26 },
    { at: by(456, 126), crown_ft: 22 },
    { at: by(444, 152), crown_ft: 18 },
  ],
  fixed: [
    { id: 'F1', name: 'Hydrant 12', at: by(-24, 172), looks: 'hydrant' },
    { id: 'F2', name: 'Scale sign post', at: by(128, 110), looks: 'sign' },
    { id: 'F3', name: 'Yard light 4', at: by(70, 56), looks: 'light' },
    { id: 'F4', name: 'Yard light 6', at: by(-178, 56), looks: 'light' },
  ],
  names: [
    { text: 'Main track', at: by(150, -60), toward_deg: 84, weight: 'thing', from_zoom: 19 },
    { text: 'Siding 2', at: by(-110, -30), toward_deg: 84, weight: 'thing', from_zoom: 19 },
    { text: 'Team track', at: by(178, 14), toward_deg: 84, weight: 'thing', from_zoom: 20 },
    {
      text: 'Transload slab',
      at: by(90, 34),
      toward_deg: 84,
      weight: 'thing',
      on: 'concrete',
      from_zoom: 19,
    },
    {
      text: 'Elevator Road',
      at: by(-110, 262),
      toward_deg: 84,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    { text: 'Scale', at: by(152, 146), weight: 'thing', from_zoom: 20 },
    {
      text: 'Office',
      at: by(284, 155),
      toward_deg: 84,
      weight: 'thing',
      on: 'gravel',
      from_zoom: 19,
    },
    {
      text: 'Elevator',
      at: by(-350, 115),
      toward_deg: 84,
      weight: 'thing',
      on: 'gravel',
      from_zoom: 19,
    },
    { text: 'Dunmarrow siding', at: by(-300, -200), weight: 'place', from_zoom: 17 },
  ],
};
