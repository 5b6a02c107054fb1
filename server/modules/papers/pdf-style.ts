import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Lato's weights as printed: then is light, now is heavy. */
export const WEIGHTS = ['light', 'regular', 'bold', 'black'] as const;
export type Weight = (typeof WEIGHTS)[number];

const FONT_FILES: Readonly<Record<Weight, string>> = {
  light: '300Light/Lato_300Light.ttf',
  regular: '400Regular/Lato_400Regular.ttf',
  bold: '700Bold/Lato_700Bold.ttf',
  black: '900Black/Lato_900Black.ttf',
};

export type FontBytes = Readonly<Record<Weight, Buffer>>;

/** Reads the four TrueType files once; `folder` is that of the font package. Throws where one is missing. */
export function readFonts(folder: string): FontBytes {
  const read = (weight: Weight) => readFileSync(join(folder, FONT_FILES[weight]));
  return { light: read('light'), regular: read('regular'), bold: read('bold'), black: read('black') };
}

/** The light theme's tokens: paper is white in every theme. */
export const INK = '#0E1B25';
export const INK_VARIANT = '#44535F';
export const INK_SOFT = '#596873';
export const RULE = '#B4C1C9';
export const OUTLINE = '#6F7E89';
export const CURVE = '#0A5C68';
export const CURVE_GROUND = '#E3EEF0';
export const NEEDLE = '#CC3A14';
export const PAPER = '#FFFFFF';
export const FOUND = '#50636F';
export const UPLIFT = CURVE;
export const UPLIFT_GROUND = '#CBE3E6';
export const COST = '#12222C';
export const COST_RANGE = '#B4C1C9';
export const GAIN = '#17663C';
export const LOSS = '#97283F';

/** Size and line height in points. */
export interface TextStyle {
  readonly weight: Weight;
  readonly size: number;
  readonly leading: number;
  readonly colour: string;
}

const style = (weight: Weight, size: number, leading: number, colour: string): TextStyle => ({
  weight,
  size,
  leading,
  colour,
});

export const STYLES = {
  practice: style('black', 15, 18, INK),
  practiceLine: style('regular', 8.6, 12, INK_VARIANT),
  reference: style('bold', 11, 18, INK),
  title: style('black', 16, 20, INK),
  subtitle: style('regular', 9.6, 13.1, INK_VARIANT),
  standing: style('bold', 9.3, 13.1, INK),
  heading: style('black', 10.4, 14, INK),
  body: style('regular', 9.3, 13.1, INK),
  strong: style('bold', 9.3, 13.1, INK),
  note: style('regular', 7.9, 10.5, INK_SOFT),
  tableHead: style('bold', 8.4, 11, INK_VARIANT),
  cell: style('regular', 9, 12, INK),
  cellStrong: style('bold', 9, 12, INK),
  cellTotal: style('black', 9, 12, INK),
  figureLabel: style('bold', 8.4, 11, INK_VARIANT),
  figureLight: style('light', 21, 26, INK),
  figureHeavy: style('black', 21, 26, INK),
  figureWords: style('bold', 11, 26, INK),
  figureRange: style('bold', 8.2, 10.8, INK),
  chart: style('regular', 7.9, 10.5, INK),
  footer: style('regular', 7.4, 10, INK_VARIANT),
} as const satisfies Record<string, TextStyle>;
