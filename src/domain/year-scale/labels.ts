import type { Anchor, Label, Segment, Tag, YearScaleInput } from './drawing';
import { round1, spanText, type YearAxis } from './axis';
import { textWidth, type Measures } from './measures';

type Side = 'left' | 'right';
type Who = 'then' | 'now';

/** Past this part of the width the price stands left of its needle. */
export const FLIP_PAST = 0.62;

const SIDE_GAP = { then: 12, now: 16 } as const;
const EDGE = 4;

interface Block {
  readonly who: Who;
  readonly x: number;
  readonly width: number;
  readonly size: number;
}

interface Placed {
  readonly side: Side;
  readonly row: number;
  readonly from: number;
  readonly to: number;
}

export interface AmountPlacement {
  readonly top: Readonly<Record<Who, number>>;
  readonly caption: Readonly<Record<Who, Label | null>>;
  readonly amount: Readonly<Record<Who, Label>>;
  readonly between: { readonly lines: readonly Segment[]; readonly labels: readonly Label[] } | null;
}

/** Font size at which a text keeps to a width. */
const fit = (text: string, size: number, most: number) => Math.min(size, round1(most / textWidth(text, 1)));

function place(block: Block, side: Side, row: number, gap: number): Placed {
  return side === 'right'
    ? { side, row, from: block.x + gap, to: block.x + gap + block.width }
    : { side, row, from: block.x - gap - block.width, to: block.x - gap };
}

/** How bad a placement is: off the edge, over the other amount, crossed by the other needle, not where one looks first. */
function badness(
  then: Placed,
  now: Placed,
  thenX: number,
  nowX: number,
  prefer: { then: Side; now: Side },
  width: number,
) {
  let bad = then.row === now.row ? 0 : 5;
  for (const box of [then, now]) {
    if (box.from < EDGE) bad += 100 + EDGE - box.from;
    if (box.to > width - EDGE) bad += 100 + box.to - (width - EDGE);
  }
  if (then.row === now.row && then.from < now.to + 12 && now.from < then.to + 12) bad += 60;
  const crossed = (box: Placed, x: number) => x > box.from - 6 && x < box.to + 6;
  if (crossed(then, nowX)) bad += 40;
  // A lower needle begins under the first row, so it cannot cross what stands there.
  if (then.row === now.row && crossed(now, thenX)) bad += 40;
  // Amounts stand in the order of their needles, where both are possible.
  if (then.row === now.row && thenX <= nowX !== then.from <= now.from) bad += 3;
  if (then.side !== prefer.then) bad += 1;
  if (now.side !== prefer.now) bad += 1;
  return bad;
}

/** Where captions and amounts stand beside the needles: never over each other as long as the width allows it. */
export function placeAmounts(
  input: YearScaleInput,
  axis: YearAxis,
  measures: Measures,
  captions: Readonly<Record<Who, string>>,
): AmountPlacement | null {
  const { amounts } = measures;
  if (!amounts) return null;
  const { width } = input;
  const plot = width - measures.left - measures.right;
  const block = (who: Who, x: number, size: number): Block => {
    const text = input[who].text;
    const fitted = fit(text, size, amounts.alwaysStacked ? plot * 0.85 : plot * 0.45);
    const captionWidth = amounts.captionSize === null ? 0 : textWidth(captions[who], amounts.captionSize);
    return { who, x, size: fitted, width: Math.max(textWidth(text, fitted), captionWidth) };
  };
  const then = block('then', axis.xOf(input.then.period), amounts.thenSize);
  const now = block('now', axis.xOf(input.now.period), amounts.nowSize);
  const share = (x: number) => (x - measures.left) / plot;
  const prefer = {
    then: share(then.x) > FLIP_PAST ? 'left' : 'right',
    now: share(now.x) < 1 - FLIP_PAST ? 'right' : 'left',
  } as const;
  const small = amounts.captionSize === null;
  const gap = { then: small ? 9 : SIDE_GAP.then, now: small ? 10 : SIDE_GAP.now };

  let best: { then: Placed; now: Placed; bad: number } | null = null;
  for (const row of amounts.alwaysStacked ? [1] : [0, 1])
    for (const thenSide of ['right', 'left'] as const)
      for (const nowSide of ['left', 'right'] as const) {
        const a = place(then, thenSide, row, gap.then);
        const b = place(now, nowSide, 0, gap.now);
        const bad = badness(a, b, then.x, now.x, prefer, width);
        if (!best || bad < best.bad) best = { then: a, now: b, bad };
      }
  if (!best) return null;

  const top = (placed: Placed) => measures.needleTop + placed.row * amounts.rowHeight;
  const label = (source: Block, placed: Placed, text: string, size: number, dy: number): Label => {
    const anchor: Anchor = placed.side === 'right' ? 'start' : 'end';
    return { x: round1(placed.side === 'right' ? placed.from : placed.to), y: top(placed) + dy, text, anchor, size };
  };
  const caption = (source: Block, placed: Placed) =>
    amounts.captionSize === null
      ? null
      : label(source, placed, captions[source.who], amounts.captionSize, amounts.captionY);
  return {
    top: { then: top(best.then), now: top(best.now) },
    caption: { then: caption(then, best.then), now: caption(now, best.now) },
    amount: {
      then: label(then, best.then, input.then.text, then.size, amounts.thenY),
      now: label(now, best.now, input.now.text, now.size, amounts.nowY),
    },
    between: measures.between ? betweenAmounts(input, best.then, best.now, measures.needleTop + 53) : null,
  };
}

/** The dimension line between the two amounts: by how much, over how long; null without room for the words. */
function betweenAmounts(input: YearScaleInput, then: Placed, now: Placed, y: number) {
  const [left, right] = then.to <= now.from ? [then, now] : [now, then];
  const from = left.to + 30;
  const to = right.from - 30;
  if (input.factor === undefined || then.row !== now.row || to - from < 120) return null;
  const middle = round1((from + to) / 2);
  const lines: Segment[] = [];
  if (to - from > 230)
    lines.push(
      { x1: round1(from), y1: y, x2: middle - 66, y2: y },
      { x1: middle + 66, y1: y, x2: round1(to), y2: y },
      { x1: round1(from), y1: y - 6, x2: round1(from), y2: y + 6 },
      { x1: round1(to), y1: y - 6, x2: round1(to), y2: y + 6 },
    );
  const labels: Label[] = [
    { x: middle, y: y - 1, text: `× ${input.factor}`, anchor: 'middle', size: 19 },
    { x: middle, y: y + 18, text: `over ${spanText(input.then.period, input.now.period)}`, anchor: 'middle', size: 14 },
  ];
  return { lines, labels };
}

/** Boxes centred on their places, moved apart where they would touch and kept between the edges. */
export function apart(
  first: { readonly x: number; readonly width: number },
  second: { readonly x: number; readonly width: number },
  edges: { readonly from: number; readonly to: number },
  gap: number,
): readonly [number, number] {
  const [a, b, swapped] = first.x <= second.x ? [first, second, false] : [second, first, true];
  const clamp = (x: number, least: number, most: number) => Math.max(least, Math.min(x, most));
  let left = clamp(a.x - a.width / 2, edges.from, edges.to - a.width);
  let right = clamp(b.x - b.width / 2, edges.from, edges.to - b.width);
  const over = left + a.width + gap - right;
  if (over > 0) {
    left = clamp(left - over / 2, edges.from, edges.to - a.width - gap - b.width);
    right = Math.min(left + a.width + gap, edges.to - b.width);
  }
  const [x1, x2] = swapped ? [right, left] : [left, right];
  return [round1(x1), round1(x2)];
}

/** A tag of a given width at the needle's foot. */
export function tagAt(x: number, width: number, text: string, measures: Measures): Tag | null {
  if (!measures.tag) return null;
  const { height, size } = measures.tag;
  return {
    x,
    y: measures.needleFoot,
    width,
    height,
    label: {
      x: round1(x + width / 2),
      y: round1(measures.needleFoot + height / 2 + size * 0.35),
      text,
      anchor: 'middle',
      size,
    },
  };
}

/** Width of a tag around a period. */
export const tagWidth = (text: string, size: number) => round1(textWidth(text, size) + 26);
