import { rectangle } from '../curves';
import type { Ft, Road, Scene } from '../scene';

/** A farm co-op's bulk fuel yard on a hillside: tanks in a dike, a loading rack, an office. */

const harrowRoad: Road = {
  id: 'harrow-road',
  centre: [
    [-700, -330],
    [-380, -306],
    [-60, -286],
    [260, -278],
    [700, -276],
  ],
  width_ft: 24,
  surface: 'asphalt',
  lines: [
    { offset_ft: -10.5, dashed: false },
    { offset_ft: 0, dashed: true },
    { offset_ft: 10.5, dashed: false },
  ],
};

const entrance = (id: string, east: number, bendTo: number): Road => ({
  id,
  centre: [
    [east, -284],
    [east, -235],
    [east + bendTo / 3, -180],
    [east + bendTo, -120],
  ],
  width_ft: 26,
  surface: 'gravel',
  lines: [],
});

const yard: Ft[] = [
  [-46, 34],
  [-46, -128],
  [-30, -146],
  [196, -146],
  [216, -126],
  [216, 20],
  [196, 40],
  [-46, 40],
  [-46, 34],
];

/** Room north of the rack for a second truck. */
const northApron: Ft[] = [
  [-46, 28],
  [-46, 88],
  [-40, 94],
  [22, 86],
  [28, 80],
  [30, 28],
  [-46, 28],
];

const dikeCentre: Ft = [96, 92];

export const harrowFlatCoop: Scene = {
  pack: 'harrow-flat-coop',
  name: 'Harrow Flat Co-op fuel yard',
  attribution: 'Invented ground, drawn for Stillground',
  origin: [-100.79466, 42.12717],
  extent: { west: -560, south: -460, east: 560, north: 440 },
  close_up: { west: -190, south: -170, east: 130, north: 110 },
  ground: {
    height_ft: 641.7,
    down_deg: 205,
    grade_pct: 4,
    working_radius_ft: 150,
    swells: [
      { length_ft: 480, toward_deg: 120, height_ft: 0.8, phase_deg: 320 },
      { length_ft: 640, toward_deg: 170, height_ft: 0.9, phase_deg: 80 },
      { length_ft: 240, toward_deg: 80, height_ft: 0.2, phase_deg: 150 },
    ],
  },
  roads: [harrowRoad, entrance('west-entrance', -20, 34), entrance('east-entrance', 190, -30)],
  hardstands: [
    { id: 'fuel-yard', outline: yard, surface: 'gravel' },
    { id: 'north-apron', outline: northApron, surface: 'gravel' },
    { id: 'rack-slab', outline: rectangle([0, 0], 100, 86, 34), surface: 'concrete' },
    { id: 'dike-floor', outline: rectangle(dikeCentre, 100, 124, 72), surface: 'concrete' },
  ],
  rails: [],
  buildings: [
    { id: 'office', outline: rectangle([152, -70], 100, 74, 44) },
    { id: 'rack-canopy', outline: rectangle([4, 25], 100, 34, 9) },
    { id: 'drum-store', outline: rectangle([186, -6], 10, 34, 22) },
    { id: 'farm-house', outline: rectangle([-420, -210], 95, 46, 30) },
    { id: 'farm-shed', outline: rectangle([-346, -186], 95, 60, 36) },
  ],
  tanks: [
    { at: [58, 107], diameter_ft: 24 },
    { at: [88, 102], diameter_ft: 24 },
    { at: [118, 97], diameter_ft: 24 },
    { at: [66, 78], diameter_ft: 15 },
    { at: [90, 74], diameter_ft: 15 },
    { at: [114, 70], diameter_ft: 15 },
    { at: [252, 96], diameter_ft: 36 },
    { at: [294, 90], diameter_ft: 36 },
    { at: [336, 84], diameter_ft: 36 },
  ],
  walls: [{ id: 'dike', path: rectangle(dikeCentre, 100, 124, 72) }],
  ditches: [
    {
      id: 'west-swale',
      centre: [
        [-128, 150],
        [-146, 60],
        [-158, -40],
        [-170, -140],
        [-188, -240],
        [-196, -282],
      ],
      width_ft: 12,
    },
  ],
  fences: [
    {
      id: 'yard-fence',
      path: [
        [60, -166],
        [150, -166],
      ],
    },
    {
      id: 'yard-fence-east',
      path: [
        [186, -166],
        [236, -166],
        [236, 62],
        [214, 150],
        [30, 166],
      ],
    },
    {
      id: 'pasture-fence',
      path: [
        [-236, 330],
        [-252, 100],
        [-270, -120],
        [-286, -296],
      ],
    },
  ],
  guardrails: [],
  culverts: [
    {
      id: 'swale-culvert',
      path: [
        [-195, -276],
        [-200, -326],
      ],
    },
    {
      id: 'entrance-culvert',
      path: [
        [-40, -266],
        [0, -264],
      ],
    },
  ],
  overhead: [
    {
      id: 'harrow-feeder',
      path: [
        [-660, -298],
        [-500, -287],
        [-340, -276],
        [-180, -265],
        [-20, -256],
        [140, -251],
        [300, -249],
        [460, -248],
        [660, -248],
      ],
    },
    {
      id: 'yard-service',
      path: [
        [140, -251],
        [150, -158],
        [152, -92],
      ],
    },
  ],
  fields: [
    {
      outline: [
        [-640, 480],
        [-244, 480],
        [-257, 100],
        [-275, -120],
        [-290, -260],
        [-640, -290],
      ],
      rows_toward_deg: 5,
    },
    {
      outline: [
        [-640, -350],
        [-380, -330],
        [-60, -308],
        [260, -300],
        [640, -298],
        [640, -560],
        [-640, -560],
      ],
      rows_toward_deg: 92,
    },
  ],
  trees: [
    { at: [-452, -176], crown_ft: 30 },
    { at: [-428, -160], crown_ft: 24 },
    { at: [-466, -206], crown_ft: 22 },
    { at: [-380, -236], crown_ft: 24 },
    { at: [-470, -240], crown_ft: 28 },
    { at: [40, 206], crown_ft: 26 },
    { at: [72, 214], crown_ft: 22 },
    { at: [102, 206], crown_ft: 28 },
    { at: [136, 212], crown_ft: 22 },
    { at: [168, 202], crown_ft: 26 },
    { at: [198, 208], crown_ft: 20 },
    { at: [260, -206], crown_ft: 26 },
    { at: [284, -216], crown_ft: 20 },
    { at: [-214, 210], crown_ft: 24 },
    { at: [-200, 236], crown_ft: 18 },
    { at: [-232, -190], crown_ft: 22 },
  ],
  fixed: [
    { id: 'F1', name: 'Hydrant 3', at: [-66, 118], looks: 'hydrant' },
    { id: 'F2', name: 'Yard sign post', at: [-62, -140], looks: 'sign' },
    { id: 'F3', name: 'Yard light 1', at: [-49, 100], looks: 'light' },
    { id: 'F4', name: 'Water marker post', at: [-112, 132], looks: 'marker' },
  ],
  names: [
    {
      text: 'Loading rack',
      at: [48, 22],
      toward_deg: 100,
      weight: 'thing',
      on: 'gravel',
      from_zoom: 20,
    },
    { text: 'Tank dike', at: [102, 142], toward_deg: 100, weight: 'thing', from_zoom: 19 },
    {
      text: 'Office',
      at: [150, -81],
      toward_deg: 100,
      weight: 'thing',
      on: 'building',
      from_zoom: 19,
    },
    { text: 'Drum store', at: [186, 24], weight: 'thing', on: 'gravel', from_zoom: 20 },
    { text: 'Grain bins', at: [294, 122], weight: 'thing', from_zoom: 19 },
    { text: 'Swale', at: [-176, 20], toward_deg: 186, weight: 'water', from_zoom: 19 },
    {
      text: 'Harrow Road',
      at: [100, -281],
      toward_deg: 89,
      weight: 'way',
      on: 'asphalt',
      from_zoom: 18,
    },
    { text: 'Harrow Flat Co-op', at: [-60, 290], weight: 'place', from_zoom: 17 },
  ],
};
