import {
  CENTRE,
  FLOOR,
  bars,
  cloth,
  dial,
  disc,
  feet,
  fine,
  graduations,
  knob,
  knobs,
  line,
  range,
  rect,
  screen,
  spread,
  tube,
  type Box,
  type Pen,
  type Drawn,
} from './drawing-parts';

const LOW: Box = [160, 270, 1280, 960];
const LOW_AND_WIDE: Box = [80, 150, 1440, 1080];

function consoleRadio(pen: Pen): Drawn {
  const w = pen.vary(520, 620);
  const top = pen.vary(190, 240);
  const x = CENTRE - w / 2;
  const glass: Box = [x + 70, top + 80, w - 140, 130];
  const grille: Box = [x + 70, top + 360, w - 140, 410];
  return {
    drawing: [
      feet(pen, [x + 60, x + w - 60], 1050, 90),
      rect(x, top, w, 1055 - top, pen.body, 14),
      rect(x - 26, top - 34, w + 52, 40, pen.dark, 10),
      dial(pen, glass),
      knobs(pen, spread(pen.vary(3, 5), x + 60, w - 120), top + 280, 28),
      cloth(pen, grille),
      bars(grille[0], grille[1], grille[2], grille[3], pen.vary(3, 6)),
      line(`M${x} 1000h${w}`),
    ].join(''),
    nearer: [x + 20, top + 20, w - 40, (w - 40) * 0.75],
  };
}

function tableRadio(pen: Pen): Drawn {
  const w = pen.vary(860, 1000);
  const h = pen.vary(500, 580);
  const x = CENTRE - w / 2;
  const y = FLOOR - 24 - h;
  const half = Math.round(w * 0.46);
  const grille: Box = [x + 50, y + 60, half - 60, h - 120];
  return {
    drawing: [
      feet(pen, [x + 100, x + w - 100], FLOOR - 26, 110),
      rect(x, y, w, h, pen.body, pen.vary(20, 110)),
      cloth(pen, grille),
      bars(grille[0], grille[1], grille[2], grille[3], pen.vary(4, 9)),
      dial(pen, [x + half + 30, y + 80, w - half - 90, Math.round(h * 0.4)]),
      knobs(pen, spread(2, x + half + 20, w - half - 70), y + Math.round(h * 0.78), 48),
    ].join(''),
    whole: LOW,
    nearer: [x + half, y + 40, w - half, (w - half) * 0.75],
  };
}

function archedRadio(pen: Pen): Drawn {
  const w = pen.vary(620, 700);
  const x = CENTRE - w / 2;
  const r = w / 2;
  const y = 230 + r;
  const inner = r - 90;
  const threads = range(26).map((i) => {
    const up = i * 16;
    const reach = Math.sqrt(Math.max(0, inner ** 2 - up ** 2));
    return `M${CENTRE - reach} ${y + 30 - up}h${2 * reach}`;
  });
  return {
    drawing: [
      rect(x - 26, 1040, w + 52, 50, pen.dark, 8),
      line(`M${x} 1040V${y}A${r} ${r} 0 0 1 ${x + w} ${y}V1040z`, pen.body),
      line(`M${CENTRE - inner} ${y + 40}A${inner} ${inner} 0 0 1 ${CENTRE + inner} ${y + 40}z`, pen.light),
      fine(pen, threads.join('')),
      line(
        `M${CENTRE} ${y + 40}V${y + 40 - inner}M${CENTRE - inner / 2} ${y + 40}v${-inner * 0.8}M${CENTRE + inner / 2} ${y + 40}v${-inner * 0.8}`,
      ),
      dial(pen, [CENTRE - 110, y + 100, 220, 100]),
      knobs(pen, spread(pen.vary(3, 4), x + 50, w - 100), y + 290, 34),
    ].join(''),
    nearer: [CENTRE - 280, y + 30, 560, 420],
  };
}

function portable(pen: Pen): Drawn {
  const w = pen.vary(700, 820);
  const h = pen.vary(480, 540);
  const x = CENTRE - w / 2;
  const y = FLOOR - h;
  const r = h * 0.3;
  return {
    drawing: [
      line(`M${x + 140} ${y}v-70q0 -40 40 -40h${w - 360}q40 0 40 40v70`),
      rect(x, y, w, h, pen.body, 50),
      disc(x + w * 0.33, y + h / 2, r, pen.light),
      range(4)
        .map((i) => `<circle cx="${x + w * 0.33}" cy="${y + h / 2}" r="${r * (0.2 + i * 0.2)}"/>`)
        .join(''),
      dial(pen, [x + w * 0.6, y + 80, w * 0.32, 140]),
      knobs(pen, spread(2, x + w * 0.58, w * 0.36), y + h - 120, 44),
    ].join(''),
    whole: LOW,
    nearer: [x + w * 0.5, y + 30, w * 0.5, w * 0.375],
  };
}

function receiver(pen: Pen): Drawn {
  const w = pen.vary(980, 1100);
  const h = pen.vary(500, 560);
  const x = CENTRE - w / 2;
  const y = FLOOR - 20 - h;
  const holes = spread(9, x + 60, w * 0.26).flatMap((at) => range(12).map((i) => `M${at} ${y + 90 + i * 26}v10`));
  return {
    drawing: [
      rect(x, y, w, h, pen.body, 10),
      rect(x + 26, y + 26, w - 52, h - 52, pen.light, 4),
      line(holes.join('')),
      disc(x + w * 0.5, y + h * 0.42, 130, pen.glow),
      line(`M${x + w * 0.5} ${y + h * 0.42}l${pen.vary(-80, 80)} -90`),
      dial(pen, [x + w * 0.68, y + 90, w * 0.25, 150]),
      knobs(pen, spread(pen.vary(4, 6), x + w * 0.34, w * 0.62), y + h - 110, 36),
      [
        [44, 44],
        [w - 44, 44],
        [44, h - 44],
        [w - 44, h - 44],
      ]
        .map(([dx = 0, dy = 0]) => disc(x + dx, y + dy, 9, pen.dark))
        .join(''),
      feet(pen, [x + 90, x + w - 90], FLOOR - 20, 80),
    ].join(''),
    whole: LOW_AND_WIDE,
    nearer: [x + w * 0.34, y + 40, w * 0.6, w * 0.45],
  };
}

function batteryReceiver(pen: Pen): Drawn {
  const w = pen.vary(1080, 1180);
  const h = pen.vary(380, 430);
  const x = CENTRE - w / 2;
  const y = FLOOR - 40 - h;
  const dials = spread(3, x + 60, w - 120);
  return {
    drawing: [
      rect(x - 24, FLOOR - 40, w + 48, 40, pen.dark, 6),
      rect(x, y, w, h, pen.body, 4),
      rect(x - 20, y - 30, w + 40, 34, pen.body, 6),
      rect(x + 40, y + 36, w - 80, h - 72, pen.dark, 2),
      dials
        .map(
          (at) =>
            disc(at, y + h * 0.45, 96, pen.light) +
            line(graduations(at, y + h * 0.45, 90)) +
            knob(pen, at, y + h * 0.45, 56),
        )
        .join(''),
      knobs(pen, spread(2, x + w * 0.32, w * 0.36), y + h - 74, 22),
    ].join(''),
    whole: LOW_AND_WIDE,
    nearer: [CENTRE - 240, y + 10, 480, 360],
  };
}

function horn(pen: Pen): Drawn {
  const r = pen.vary(250, 300);
  const hx = 900 + pen.vary(0, 60);
  const hy = 400;
  const petals = range(9).map((i) => {
    const angle = (i / 9) * 2 * Math.PI;
    return `M${hx} ${hy}L${(hx + r * Math.cos(angle)).toFixed(1)} ${(hy + r * 0.94 * Math.sin(angle)).toFixed(1)}`;
  });
  return {
    drawing: [
      rect(470, 1040, 660, 50, pen.dark, 8),
      rect(510, 800, 580, 240, pen.body, 10),
      line(`M510 850h580M510 990h580`),
      `<ellipse cx="740" cy="790" rx="230" ry="26" fill="${pen.dark}"/>`,
      line(`M1090 920h110v70`) + disc(1200, 1004, 16, pen.dark),
      line(`M600 790q-150 -240 60 -330q140 -60 ${hx - 700} -60l-40 90q-130 10 -190 70q-90 100 -60 230z`, pen.body),
      `<ellipse cx="${hx}" cy="${hy}" rx="${r}" ry="${r * 0.94}" fill="${pen.light}"/>`,
      fine(pen, petals.join('')),
      `<ellipse cx="${hx}" cy="${hy}" rx="${r * 0.3}" ry="${r * 0.28}" fill="${pen.dark}"/>`,
    ].join(''),
    nearer: [hx - r - 60, hy - r * 0.9, r * 2.2, r * 1.65],
  };
}

function cabinetPhonograph(pen: Pen): Drawn {
  const w = pen.vary(460, 540);
  const x = CENTRE - w / 2;
  const top = pen.vary(170, 210);
  const slats = range(6).map((i) => `M${x + 70} ${top + 190 + i * 34}h${w - 140}`);
  return {
    drawing: [
      feet(pen, [x + 44, x + w - 44], 1040, 80),
      rect(x, top + 90, w, 950 - top, pen.body, 8),
      line(`M${x - 14} ${top + 90}q10 -90 110 -90h${w - 192}q100 0 110 90z`, pen.body),
      rect(x + 50, top + 150, w - 100, 250, pen.light, 4),
      line(slats.join('')),
      [0, 1].map((i) => rect(x + 50 + (i * (w - 100)) / 2, top + 440, (w - 100) / 2, 570 - top, pen.light, 4)).join(''),
      disc(CENTRE - 20, top + 680, 9, pen.dark) + disc(CENTRE + 20, top + 680, 9, pen.dark),
      line(`M${x + w} ${top + 230}h70v80`) + disc(x + w + 70, top + 322, 14, pen.dark),
    ].join(''),
    nearer: [x + 20, top + 110, w - 40, (w - 40) * 0.75],
  };
}

function suitcase(pen: Pen): Drawn {
  const w = pen.vary(780, 880);
  const x = CENTRE - w / 2;
  return {
    drawing: [
      line(`M${x + 30} 790L${x + 80} 330h${w - 160}l50 460z`, pen.body),
      line(`M${x + 90} 760l40 -390h${w - 260}l40 390z`, pen.light),
      rect(x, 790, w, 260, pen.body, 24),
      `<ellipse cx="${x + w * 0.42}" cy="800" rx="${w * 0.32}" ry="46" fill="${pen.dark}"/>`,
      disc(x + w * 0.42, 796, 10, pen.light),
      line(`M${x + w - 90} 780l-40 -60l-${Math.round(w * 0.26)} 50`),
      line(`M${CENTRE - 90} 920h180v50h-180z`, pen.light),
      knobs(pen, [x + w - 200, x + w - 110], 940, pen.vary(24, 34)),
      feet(pen, [x + 80, x + w - 80], 1050, 70),
    ].join(''),
    whole: LOW,
    nearer: [x + w * 0.2, 640, w * 0.6, w * 0.45],
  };
}

function combination(pen: Pen): Drawn {
  const w = pen.vary(1020, 1160);
  const top = pen.vary(430, 500);
  const x = CENTRE - w / 2;
  const third = w / 3;
  return {
    drawing: [
      feet(pen, [x + 80, x + w - 80], 1030, 80),
      rect(x, top, w, 1030 - top, pen.body, 10),
      rect(x - 20, top - 28, w + 40, 34, pen.dark, 8),
      dial(pen, [x + 50, top + 60, third - 70, 120]),
      knobs(pen, spread(pen.vary(3, 4), x + 40, third - 50), top + 250, 26),
      cloth(pen, [x + 50, top + 320, third - 70, 640 - (top - 430) - 360]),
      [1, 2].map((i) => rect(x + i * third + 6, top + 40, third - 46, 970 - top, pen.light, 6)).join(''),
      disc(x + 2 * third - 74, top + 290, 11, pen.dark) + disc(x + 2 * third + 40, top + 290, 11, pen.dark),
    ].join(''),
    whole: LOW_AND_WIDE,
    nearer: [x + 20, top + 20, third + 20, (third + 20) * 0.75],
  };
}

function televisionTable(pen: Pen): Drawn {
  const w = pen.vary(880, 980);
  const h = pen.vary(640, 700);
  const x = CENTRE - w / 2;
  const y = FLOOR - 24 - h;
  const d = h * 0.62;
  return {
    drawing: [
      feet(pen, [x + 110, x + w - 110], FLOOR - 26, 120),
      rect(x, y, w, h, pen.body, 22),
      screen(pen, [CENTRE - d / 2 - pen.vary(0, 110), y + 60, d, d], true),
      knobs(pen, spread(4, x + 80, w - 160), y + h - 90, 36),
      line(
        spread(5, x + w - 150, 110)
          .map((at) => `M${at} ${y + 120}v${h * 0.4}`)
          .join(''),
      ),
    ].join(''),
    whole: LOW,
    nearer: [CENTRE - d / 2 - 80, y + h * 0.3, d + 160, (d + 160) * 0.75],
  };
}

function televisionConsole(pen: Pen): Drawn {
  const w = pen.vary(700, 800);
  const x = CENTRE - w / 2;
  const top = pen.vary(170, 220);
  const tube: Box = [x + 80, top + 80, w - 160, Math.round((w - 160) * 0.76)];
  const below = tube[1] + tube[3] + 60;
  return {
    drawing: [
      feet(pen, [x + 70, x + w - 70], 1040, 90),
      rect(x, top, w, 1040 - top, pen.body, 12),
      screen(pen, tube, false),
      knobs(pen, spread(pen.vary(2, 4), x + 90, w - 180), below + 30, 30),
      cloth(pen, [x + 80, below + 90, w - 160, 1010 - below - 100]),
    ].join(''),
    nearer: [x + 30, top + 30, w - 60, (w - 60) * 0.75],
  };
}

function amplifierAt(pen: Pen, x: number, w: number): string {
  const deck = 900;
  const iron = w * 0.24;
  return [
    tube(pen, x + w * 0.42, deck, w * 0.14, 250),
    tube(pen, x + w * 0.6, deck, w * 0.14, 250),
    tube(pen, x + w * 0.74, deck, w * 0.08, 150),
    rect(x + 20, deck - 220, iron, 220, pen.dark, 8),
    rect(x + w - iron * 0.7 - 16, deck - 180, iron * 0.7, 180, pen.dark, 8),
    rect(x, deck, w, 160, pen.body, 8),
    knobs(pen, spread(pen.vary(2, 4), x + 40, w - 80), deck + 80, 26),
    feet(pen, [x + 60, x + w - 60], 1060, 60),
  ].join('');
}

const amplifier = (pen: Pen): Drawn => {
  const w = pen.vary(820, 960);
  return { drawing: amplifierAt(pen, CENTRE - w / 2, w), whole: LOW, nearer: [CENTRE - 240, 640, 480, 360] };
};

const amplifierPair = (pen: Pen): Drawn => ({
  drawing: amplifierAt(pen, 160, 600) + amplifierAt(pen, 840, 600),
  whole: LOW_AND_WIDE,
  nearer: [160, 620, 600, 450],
});

/** A chassis from above: cans, tubes, transformer and tuning gang as plain circles and boxes. */
export function drawChassis(pen: Pen): Drawn {
  const tubes = pen.vary(5, 10);
  const row = spread(Math.ceil(tubes / 2), 520, 760);
  const plates = spread(14, 270, 180).map((at) => `M${at} 250v180`);
  return {
    drawing: [
      rect(180, 160, 1240, 860, pen.body, 16),
      line('M180 960h1240'),
      rect(240, 600, 230, 280, pen.dark, 10) + line('M290 600v280M420 600v280'),
      rect(250, 230, 220, 220, pen.light, 6) + line(plates.join('')),
      range(tubes)
        .map((i) => {
          const x = row[Math.floor(i / 2)] ?? CENTRE;
          const y = i % 2 === 0 ? 330 : 700;
          return disc(x, y, 66, pen.light) + disc(x, y, 40, pen.glow) + disc(x, y, 12, pen.dark);
        })
        .join(''),
      spread(pen.vary(2, 4), 520, 760)
        .map((x) => rect(x - 44, 470, 88, 88, pen.light, 12))
        .join(''),
      spread(2, 1270, 120)
        .map((x) => disc(x, 840, 34, pen.dark))
        .join(''),
      line(`M1300 700c${pen.vary(40, 90)} -60 -60 -140 20 -220M470 760c60 40 90 ${pen.vary(40, 110)} 160 110`),
    ].join(''),
    nearer: [480, 220, 640, 480],
  };
}

/** What a set looks like from the front. */
export const FRONTS = {
  console: consoleRadio,
  table: tableRadio,
  arched: archedRadio,
  portable,
  receiver,
  'battery-receiver': batteryReceiver,
  horn,
  'cabinet-phonograph': cabinetPhonograph,
  suitcase,
  combination,
  'television-table': televisionTable,
  'television-console': televisionConsole,
  amplifier,
  'amplifier-pair': amplifierPair,
} satisfies Record<string, (pen: Pen) => Drawn>;

export type Shape = keyof typeof FRONTS;
