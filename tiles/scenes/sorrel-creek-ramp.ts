import { beside, bend, rectangle, stretch } from '../curves';
import type { Ft, Road, Scene } from '../scene';

/** A highway's exit ramp climbing to a county road, with a gravel turnout above it. */

const rampCentre: Ft[] = [
  [-640, -388],
  [-400, -263],
  [-260, -178],
  [-130, -93],
  [7.5, -13],
  [130, 58],
  [240, 128],
  [325, 196],
  [395, 276],
  [428, 330],
];

const ramp: Road = {
  id: 'ramp',
  centre: rampCentre,
  width_ft: 28,
  surface: 'asphalt',
  lines: [
    { offset_ft: -10, dashed: false },
    { offset_ft: 6, dashed: false },
  ],
};
const rampLine = bend(rampCentre);

const carriageway = (id: string, south: number): Road => ({
  id,
  centre: [
    [-680, -418 - south],
    [-300, -294 - south],
    [100, -164 - south],
    [680, 26 - south],
  ],
  width_ft: 38,
  surface: 'asphalt',
  lines: [
    { offset_ft: -14, dashed: false },
    { offset_ft: -2, dashed: true },
    { offset_ft: 10, dashed: false },
  ],
});

const turnoutLane: Road = {
  id: 'turnout-lane',
  centre: [
    [66, 112],
    [112, 139],
    [160, 156],
    [214, 160],
    [262, 150],
  ],
  width_ft: 13,
  surface: 'gravel',
  lines: [],
};

const crossroad: Road = {
  id: 'tollgate-road',
  centre: [
    [512, -560],
    [486, -300],
    [462, -40],
    [443, 200],
    [430, 400],
    [424, 560],
  ],
  width_ft: 26,
  surface: 'asphalt',
  lines: [
    { offset_ft: -11, dashed: false },
    { offset_ft: 0, dashed: true },
    { offset_ft: 11, dashed: false },
  ],
  over: true,
};

const fieldEdge: Ft[] = [
  [-620, -152],
  [-430, -30],
  [-260, 66],
  [-95, 163],
  [60, 253],
  [190, 326],
  [330, 410],
  [392, 520],
];

export const sorrelCreekRamp: Scene = {
  pack: 'sorrel-creek-ramp',
  name: 'Sorrel Creek ramp',
  attribution: 'Invented ground, drawn for Stillground',
  origin: [-100.87214, 42.21853],
  extent: { west: -600, south: -500, east: 600, north: 500 },
  close_up: { west: -170, south: -110, east: 150, north: 190 },
  ground: {
    height_ft: 613.2,
    down_deg: 150,
    grade_pct: 3,
    working_radius_ft: 150,
    swells: [
      { length_ft: 420, toward_deg: 70, height_ft: 0.55, phase_deg: 20 },
      { length_ft: 610, toward_deg: 25, height_ft: 0.8, phase_deg: 130 },
      { length_ft: 230, toward_deg: 115, height_ft: 0.16, phase_deg: 260 },
    ],
  },
  roads: [turnoutLane, carriageway('eastbound', 0), carriageway('westbound', 80), ramp, crossroad],
  hardstands: [
    { id: 'turnout', outline: rectangle([34, 93], 60, 88, 25), surface: 'gravel' },
    {
      id: 'gore',
      outline: [
        [-640, -405],
        [-420, -325],
        [-330, -290],
        [-300, -207],
        [-420, -272],
        [-640, -388],
        [-640, -405],
      ],
      surface: 'asphalt',
    },
    {
      id: 'ramp-mouth',
      outline: [
        [392, 262],
        [420, 286],
        [437, 250],
        [432, 392],
        [420, 352],
        [386, 290],
        [392, 262],
      ],
      surface: 'asphalt',
    },
  ],
  rails: [],
  buildings: [{ id: 'salt-shed', outline: rectangle([226, 262], 58, 46, 30) }],
  tanks: [{ at: [262, 296], diameter_ft: 14 }],
  walls: [
    {
      id: 'bridge-west',
      path: beside(stretch(bend(crossroad.centre), 330, 600), -14),
    },
    {
      id: 'bridge-east',
      path: beside(stretch(bend(crossroad.centre), 330, 600), 14),
    },
  ],
  ditches: [
    {
      id: 'ramp-ditch',
      centre: beside(stretch(rampLine, 300, 860), 33),
      width_ft: 11,
    },
    {
      id: 'outfall',
      centre: [
        [150, 33],
        [160, -20],
        [186, -70],
        [192, -112],
      ],
      width_ft: 7,
    },
  ],
  fences: [
    { id: 'right-of-way', path: fieldEdge },
    {
      id: 'east-field',
      path: [
        [620, 148],
        [499, 148],
        [486, 330],
        [478, 520],
      ],
    },
  ],
  guardrails: [{ id: 'ramp-guardrail', path: beside(stretch(rampLine, 560, 950), 17) }],
  culverts: [
    {
      id: 'outfall-culvert',
      path: [
        [192, -112],
        [216, -236],
      ],
    },
  ],
  overhead: [
    {
      id: 'tollgate-feeder',
      path: [
        [552, -560],
        [534, -400],
        [520, -260],
        [506, -110],
        [494, 40],
        [482, 190],
        [473, 330],
        [466, 470],
        [462, 560],
      ],
    },
  ],
  fields: [
    {
      outline: [
        ...fieldEdge.map(([e, n]): Ft => [e - 5, n + 9]),
        [386, 560],
        [-640, 560],
        [-640, -150],
      ],
      rows_toward_deg: 60,
    },
    {
      outline: [
        [500, 150],
        [640, 150],
        [640, 560],
        [478, 560],
        [488, 330],
      ],
      rows_toward_deg: 172,
    },
  ],
  trees: [
    { at: [-246, 96], crown_ft: 26 },
    { at: [-222, 104], crown_ft: 20 },
    { at: [-196, 126], crown_ft: 24 },
    { at: [262, 232], crown_ft: 22 },
    { at: [284, 250], crown_ft: 28 },
    { at: [300, 274], crown_ft: 18 },
    { at: [300, 330], crown_ft: 24 },
    { at: [196, 282], crown_ft: 20 },
    { at: [226, -78], crown_ft: 24 },
    { at: [244, -62], crown_ft: 18 },
    { at: [142, -96], crown_ft: 20 },
    { at: [-470, -2], crown_ft: 26 },
    { at: [-452, 12], crown_ft: 20 },
    { at: [372, 60], crown_ft: 22 },
    { at: [392, 44], crown_ft: 26 },
    { at: [380, 100], crown_ft: 18 },
  ],
  fixed: [
    { id: 'F1', name: 'Exit 41 sign post', at: [-62, -17], looks: 'sign' },
    { id: 'F2', name: 'Turnout sign post', at: [-16, 88], looks: 'sign' },
    { id: 'F3', name: 'Light pole 3', at: [118, 78], looks: 'light' },
    { id: 'F4', name: 'Gas marker post', at: [-113, 72], looks: 'marker' },
  ],
  names: [
    {
      text: 'Exit 41 ramp',
      at: [182, 92],
      toward_deg: 58,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    {
      text: 'Highway 9 east',
      at: [-60, -214],
      toward_deg: 72,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    {
      text: 'Highway 9 west',
      at: [-40, -287],
      toward_deg: 72,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    {
      text: 'Tollgate Road',
      at: [446, 160],
      toward_deg: 175,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    { text: 'Turnout', at: [72, 142], weight: 'thing', from_zoom: 20 },
    { text: 'Salt shed', at: [226, 232], weight: 'thing', from_zoom: 19 },
    { text: 'to Sorrel Creek', at: [206, -60], toward_deg: 160, weight: 'water', from_zoom: 19 },
    { text: 'Sorrel Creek ramp', at: [-190, 300], weight: 'place', from_zoom: 17 },
  ],
};
