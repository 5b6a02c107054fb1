import sharp from 'sharp';
import type { Box, Pen } from './drawing-parts';
import { drawChassis, FRONTS, type Shape } from './drawing-shapes';

/** Of the picture, in pixels; shapes are drawn on a sheet of 1600 × 1200 units. */
const WIDTH = 1280;
const HEIGHT = 960;
const SHEET: Box = [0, 0, 1600, 1200];

/** The product's own inks (light theme of the design tokens). */
const INK = '#0E1B25';
const SOFT = '#6F7E89';
const GROUNDS = ['#F3F5F6', '#EAEFF1', '#E1E8EB'] as const;
const BODIES = ['#D7E0E4', '#DFE7EB', '#DCE2E5', '#D2DADE'] as const;
const LIGHT = '#FFFFFF';
const GLOW = '#FFECC4';
const DARK = '#435866';

/**
 * A drawn stand-in for a photograph, as JPEG bytes of 1280 × 960 px. The same shape, view and seed always give the same
 * picture; another seed gives other proportions, knobs and shades.
 */
export async function drawPicture(options: {
  readonly shape: Shape;
  readonly view: 'front' | 'detail' | 'chassis';
  readonly seed: number;
}): Promise<Buffer> {
  return sharp(Buffer.from(drawSvg(options)), { density: 72 })
    .jpeg({ quality: 82 })
    .toBuffer();
}

export function drawSvg({ shape, view, seed }: Parameters<typeof drawPicture>[0]): string {
  const vary = varier(seed);
  const pen: Pen = {
    ink: INK,
    soft: SOFT,
    body: pick(BODIES, vary),
    light: LIGHT,
    glow: GLOW,
    dark: DARK,
    vary,
  };
  const ground = pick(GROUNDS, vary);
  const { drawing, nearer, whole } = view === 'chassis' ? drawChassis(pen) : FRONTS[shape](pen);
  const [x, y, w, h] = view === 'detail' ? nearer : (whole ?? SHEET);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" viewBox="${x} ${y} ${w} ${h}" preserveAspectRatio="xMidYMid slice">`,
    `<rect x="-800" y="-600" width="3200" height="2400" fill="${ground}"/>`,
    `<path d="M-800 1090H2400V1800H-800z" fill="${BODIES[1]}"/><path d="M-800 1090H2400" stroke="${SOFT}" stroke-width="3"/>`,
    `<g fill="none" stroke="${INK}" stroke-width="5" stroke-linejoin="round" stroke-linecap="round">${drawing}</g>`,
    '</svg>',
  ].join('');
}

/** Whole numbers from `least` to `most`, a fixed sequence for each seed (linear congruential, modulus 2³²). */
function varier(seed: number): (least: number, most: number) => number {
  let state = (seed * 2654435761) >>> 0;
  return (least, most) => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return least + Math.floor((state / 2 ** 32) * (most - least + 1));
  };
}

function pick<T>(choices: readonly T[], vary: (least: number, most: number) => number): T {
  return choices[vary(0, choices.length - 1)] as T;
}
