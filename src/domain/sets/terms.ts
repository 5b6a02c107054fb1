export const SET_KINDS = ['radio', 'phonograph', 'combination', 'television', 'amplifier'] as const;
export type SetKind = (typeof SET_KINDS)[number];

export const SET_KIND_LABELS: Readonly<Record<SetKind, string>> = {
  radio: 'Radio',
  phonograph: 'Phonograph',
  combination: 'Radio-phonograph',
  television: 'Television',
  amplifier: 'Amplifier',
};

/** Parts whose condition is recorded, in the order of an inspection. */
export const SET_PARTS = [
  'cabinet',
  'finish',
  'grille',
  'dial',
  'knobs',
  'chassis',
  'tubes',
  'wiring',
  'speaker',
  'motor',
  'pickup',
  'picture-tube',
] as const;
export type SetPart = (typeof SET_PARTS)[number];

export const SET_PART_LABELS: Readonly<Record<SetPart, string>> = {
  cabinet: 'Cabinet',
  finish: 'Finish',
  grille: 'Grille and cloth',
  dial: 'Dial and glass',
  knobs: 'Knobs and trim',
  chassis: 'Chassis',
  tubes: 'Tubes',
  wiring: 'Wiring',
  speaker: 'Speaker',
  motor: 'Motor',
  pickup: 'Pickup or reproducer',
  'picture-tube': 'Picture tube',
};

const COMMON_PARTS = ['cabinet', 'finish', 'knobs', 'chassis'] as const;
/** The parts a set of each kind has. */
export const PARTS_OF_KIND: Readonly<Record<SetKind, readonly SetPart[]>> = {
  radio: [...COMMON_PARTS, 'grille', 'dial', 'tubes', 'wiring', 'speaker'],
  phonograph: ['cabinet', 'finish', 'grille', 'motor', 'pickup', 'speaker'],
  combination: [...COMMON_PARTS, 'grille', 'dial', 'tubes', 'wiring', 'speaker', 'motor', 'pickup'],
  television: [...COMMON_PARTS, 'tubes', 'wiring', 'speaker', 'picture-tube'],
  amplifier: [...COMMON_PARTS, 'tubes', 'wiring'],
};

/** Grades of condition, 1 to 5. */
export const GRADES = [1, 2, 3, 4, 5] as const;
export type Grade = (typeof GRADES)[number];
export const GRADE_LABELS: Readonly<Record<Grade, string>> = {
  1: 'Poor',
  2: 'Worn',
  3: 'Sound',
  4: 'Fine',
  5: 'As new',
};

export const WORTH_KINDS = ['as-found', 'as-restored'] as const;
export type WorthKind = (typeof WORTH_KINDS)[number];
export const WORTH_KIND_LABELS: Readonly<Record<WorthKind, string>> = {
  'as-found': 'Worth as found',
  'as-restored': 'Worth restored',
};

export const VALUE_TYPES = ['fair-market', 'replacement'] as const;
export type ValueType = (typeof VALUE_TYPES)[number];
export const VALUE_TYPE_LABELS: Readonly<Record<ValueType, string>> = {
  'fair-market': 'Fair market value',
  replacement: 'Replacement value',
};
