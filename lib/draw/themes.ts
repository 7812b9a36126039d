/** What a colour is for. Marks name these; only a theme knows the colour. */
export type Token =
  | 'ink'
  | 'ink-soft'
  | 'rule'
  | 'paper'
  | 'spruce'
  | 'alarm'
  | 'on-alarm'
  | 'caution'
  | 'casing'
  | 'steel'
  | 'water-low'
  | UtilityToken
  | `${UtilityToken}-word`;

/** One token a class of buried line, by its APWA colour. */
export type UtilityToken =
  'electric' | 'gas' | 'communications' | 'potable' | 'reclaimed' | 'sewer';

export type Theme = Readonly<Record<Token, string>>;
export type ThemeName = 'paper' | 'night' | 'print';

const PAPER: Theme = {
  ink: '#16232a',
  'ink-soft': '#4c5a60',
  rule: '#858987',
  paper: '#fbf9f3',
  spruce: '#1b5a47',
  alarm: '#951f17',
  'on-alarm': '#fffefa',
  caution: '#764100',
  casing: '#2b2a24',
  steel: '#5b5148',
  'water-low': '#2f6671',
  electric: '#d22b2b',
  gas: '#b08a00',
  communications: '#d96a00',
  potable: '#2a6fc4',
  reclaimed: '#8a4bb5',
  sewer: '#2c8a3f',
  'electric-word': '#a81d1d',
  'gas-word': '#735a00',
  'communications-word': '#954700',
  'potable-word': '#1d559c',
  'reclaimed-word': '#6d3594',
  'sewer-word': '#1d682d',
};

/** Amber on near-black: no pure white, and nothing said by red or yellow alone. */
const NIGHT: Theme = {
  ink: '#f0c987',
  'ink-soft': '#b8976a',
  rule: '#7e6e4c',
  paper: '#0d1211',
  spruce: '#8cc7a3',
  alarm: '#ff8d7a',
  'on-alarm': '#1a0d0a',
  caution: '#ffb54a',
  casing: '#000000',
  steel: '#a2937d',
  'water-low': '#79b3bd',
  electric: '#e8574f',
  gas: '#cfa820',
  communications: '#ec8a33',
  potable: '#5f9be6',
  reclaimed: '#b482db',
  sewer: '#58b06b',
  'electric-word': '#ff8f86',
  'gas-word': '#e6c44f',
  'communications-word': '#f7a45c',
  'potable-word': '#8fbcf5',
  'reclaimed-word': '#cda7ea',
  'sewer-word': '#86cf95',
};

/** One ink on white paper: everything is told apart by shape, dash, weight and word. */
const PRINT: Theme = {
  ink: '#000000',
  'ink-soft': '#3a3a3a',
  rule: '#777777',
  paper: '#ffffff',
  spruce: '#000000',
  alarm: '#000000',
  'on-alarm': '#ffffff',
  caution: '#000000',
  casing: '#000000',
  steel: '#3a3a3a',
  'water-low': '#3a3a3a',
  electric: '#000000',
  gas: '#000000',
  communications: '#000000',
  potable: '#000000',
  reclaimed: '#000000',
  sewer: '#000000',
  'electric-word': '#000000',
  'gas-word': '#000000',
  'communications-word': '#000000',
  'potable-word': '#000000',
  'reclaimed-word': '#000000',
  'sewer-word': '#000000',
};

export const THEMES: Readonly<Record<ThemeName, Theme>> = {
  paper: PAPER,
  night: NIGHT,
  print: PRINT,
};
