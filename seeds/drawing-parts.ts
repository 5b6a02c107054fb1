/** x, y, width, height. */
export type Box = readonly [x: number, y: number, width: number, height: number];

export interface Pen {
  readonly ink: string;
  readonly soft: string;
  readonly body: string;
  readonly light: string;
  readonly glow: string;
  readonly dark: string;
  /** A whole number between the two, differing by seed. */
  readonly vary: (least: number, most: number) => number;
}

export interface Drawn {
  readonly drawing: string;
  /** The part a nearer view shows. */
  readonly nearer: Box;
  /** What the front view shows; the whole sheet unless the set is low. */
  readonly whole?: Box;
}

export const FLOOR = 1090;
export const CENTRE = 800;

export const rect = (x: number, y: number, w: number, h: number, fill: string, corner = 0) =>
  `<rect x="${x}" y="${y}" width="${w}" height="${h}" rx="${corner}" fill="${fill}"/>`;
export const disc = (x: number, y: number, r: number, fill: string) =>
  `<circle cx="${x}" cy="${y}" r="${r}" fill="${fill}"/>`;
export const line = (d: string, fill = 'none') => `<path d="${d}" fill="${fill}"/>`;
export const fine = (pen: Pen, d: string) => `<path d="${d}" stroke="${pen.soft}" stroke-width="2.5"/>`;
export const range = (count: number) => Array.from({ length: count }, (_, i) => i);

/** A knob with its pointer turned somewhere. */
export function knob(pen: Pen, x: number, y: number, r: number): string {
  const turn = pen.vary(-120, 120);
  return (
    disc(x, y, r, pen.dark) +
    disc(x, y, r * 0.62, pen.light) +
    `<path d="M${x} ${y}v${-r * 0.6}" transform="rotate(${turn} ${x} ${y})"/>`
  );
}

export const knobs = (pen: Pen, xs: readonly number[], y: number, r: number) =>
  xs.map((x) => knob(pen, x, y, r)).join('');

/** `count` places spread evenly over the width, the outer ones half a step in. */
export const spread = (count: number, left: number, width: number) =>
  range(count).map((i) => Math.round(left + (width * (i + 0.5)) / count));

/** Cloth: fine lines behind a frame. */
export function cloth(pen: Pen, [x, y, w, h]: Box): string {
  const step = pen.vary(13, 19);
  const threads = range(Math.floor(h / step)).map((i) => `M${x} ${y + (i + 0.5) * step}h${w}`);
  return rect(x, y, w, h, pen.light, 6) + fine(pen, threads.join(''));
}

export function bars(x: number, y: number, w: number, h: number, count: number): string {
  return line(
    spread(count, x, w)
      .map((at) => `M${at} ${y}v${h}`)
      .join(''),
  );
}

/** A dial: glowing glass with ticks and one pointer. */
export function dial(pen: Pen, [x, y, w, h]: Box): string {
  const ticks = spread(30, x + 16, w - 32).map((at, i) => `M${at} ${y + h * 0.3}v${i % 5 === 0 ? h * 0.28 : h * 0.14}`);
  const pointer = x + Math.round((w * pen.vary(15, 85)) / 100);
  return (
    rect(x, y, w, h, pen.glow, 8) +
    line(ticks.join('')) +
    line(`M${x + 16} ${y + h * 0.72}H${x + w - 16}`) +
    `<path d="M${pointer} ${y + 8}V${y + h - 8}" stroke-width="8"/>`
  );
}

/** A round or rounded screen with one reflection. */
export function screen(pen: Pen, [x, y, w, h]: Box, round: boolean): string {
  const corner = round ? w / 2 : 60;
  return (
    rect(x - 24, y - 24, w + 48, h + 48, pen.light, round ? corner + 24 : 70) +
    rect(x, y, w, h, pen.dark, corner) +
    `<path d="M${x + w * 0.2} ${y + h * 0.42}Q${x + w * 0.24} ${y + h * 0.2} ${x + w * 0.46} ${y + h * 0.16}" stroke="${pen.light}" stroke-width="10"/>`
  );
}

export const feet = (pen: Pen, xs: readonly number[], y: number, w: number) =>
  xs.map((x) => line(`M${x - w / 2} ${y}h${w}l${-w * 0.2} ${FLOOR - y}h${-w * 0.6}z`, pen.dark)).join('');

/** The graduations of a round dial's upper half. */
export function graduations(x: number, y: number, r: number): string {
  return range(21)
    .map((i) => {
      const angle = Math.PI * (1 + i / 20);
      const at = (radius: number) =>
        `${(x + radius * Math.cos(angle)).toFixed(1)} ${(y + radius * Math.sin(angle)).toFixed(1)}`;
      return `M${at(r)}L${at(r - 14)}`;
    })
    .join('');
}

/** A tube seen from the side, standing on the chassis. */
export const tube = (pen: Pen, x: number, y: number, w: number, h: number) =>
  line(
    `M${x - w * 0.36} ${y}v${-h * 0.18}q${-w * 0.14} ${-h * 0.1} ${-w * 0.14} ${-h * 0.3}q0 ${-h * 0.52} ${w / 2} ${-h * 0.52}q${w / 2} 0 ${w / 2} ${h * 0.52}q0 ${h * 0.2} ${-w * 0.14} ${h * 0.3}v${h * 0.18}z`,
    pen.light,
  ) + rect(x - w * 0.16, y - h * 0.66, w * 0.32, h * 0.44, pen.glow, 4);
