import { Canvas } from './canvas';
import type { Colour } from './canvas';
import { writeDigits } from './digits';

const earth: Colour = [74, 62, 52];
const steel: Colour = [122, 126, 130];
const dark: Colour = [28, 29, 31];
const bright: Colour = [196, 199, 201];
const tape: Colour = [226, 186, 44];
const chalk: Colour = [240, 240, 232];
const rubber: Colour = [38, 40, 44];
const lit: Colour = [176, 214, 120];
const red: Colour = [196, 48, 40];
const heat: Colour = [188, 84, 40];

/** What the instruments in a picture show. */
export interface Shown {
  /** tells pictures of the same shot apart: another grain, another place on the weld */
  seed: number;
  temperatureF: string;
  pressurePsi: number;
  fullScalePsi: number;
  headSize: string;
  ratedPsi: string;
}

type Scene = (shown: Shown) => Canvas;

function ruler(canvas: Canvas, left: number, top: number, long: number): void {
  canvas.rect(left, top, 44, long, tape);
  for (let y = 0; y < long; y += 12) canvas.rect(left, top + y, y % 96 === 0 ? 30 : y % 48 === 0 ? 20 : 11, 2, dark);
}

const stub = (seed: number): Canvas =>
  new Canvas(earth, seed).rect(190, 150, 260, 330, steel).rect(190, 150, 14, 330, bright);

function dial(seed: number, share: number): Canvas {
  const canvas = new Canvas(steel, seed).ring(320, 240, 0, 180, chalk).ring(320, 240, 176, 190, dark);
  const at = (part: number): [number, number] => {
    const turn = ((135 + 270 * part) * Math.PI) / 180;
    return [Math.cos(turn), Math.sin(turn)];
  };
  for (let tick = 0; tick <= 10; tick += 1) {
    const [x, y] = at(tick / 10);
    canvas.line(320 + 150 * x, 240 + 150 * y, 320 + 172 * x, 240 + 172 * y, 5, dark);
  }
  const [x, y] = at(share);
  return canvas.line(320 - 30 * x, 240 - 30 * y, 320 + 145 * x, 240 + 145 * y, 7, red).ring(320, 240, 0, 14, dark);
}

/** A cleaned bead along the joint: ripples on a bright band between casing and head. */
function bead(seed: number, finished: boolean): Canvas {
  const canvas = new Canvas(steel, seed).rect(0, 0, 640, 190, bright).rect(0, 300, 640, 180, steel);
  const high = finished ? 110 : 56;
  canvas.rect(0, 245 - high / 2, 640, high, finished ? [138, 130, 124] : heat);
  for (let x = -20 + ((seed * 7) % 20); x < 640; x += 20) canvas.ring(x, 245, high / 2 - 5, high / 2, dark);
  return canvas;
}

const scenes: Record<string, Scene> = {
  'meter-at-cellar': ({ seed }) => {
    const canvas = new Canvas(earth, seed).rect(150, 60, 340, 380, tape).rect(180, 100, 280, 220, dark);
    for (const [index, value] of ['20.9', '0', '0', '2'].entries()) {
      writeDigits(canvas, value, 200 + (index % 2) * 165, 125 + Math.floor(index / 2) * 100, 56, lit);
    }
    return canvas;
  },
  nameplate: ({ seed, headSize, ratedPsi }) => {
    const canvas = new Canvas(steel, seed).rect(90, 110, 460, 260, bright);
    for (const [x, y] of [
      [110, 130],
      [530, 130],
      [110, 350],
      [530, 350],
    ] as const)
      canvas.ring(x, y, 0, 9, dark);
    writeDigits(canvas, headSize, 160, 150, 80, dark);
    writeDigits(canvas, ratedPsi, 160, 265, 80, dark);
    return canvas;
  },
  'tape-on-head': ({ seed }) => {
    const canvas = new Canvas(earth, seed).rect(120, 60, 400, 60, steel).rect(190, 120, 260, 300, bright);
    ruler(canvas, 300, 60, 360);
    return canvas;
  },
  'tape-at-string': ({ seed }) => {
    const canvas = stub(seed).line(0, 80, 640, 80, 4, chalk);
    ruler(canvas, 430, 80, 330);
    return canvas.rect(190, 380, 260, 5, chalk);
  },
  'wraparound-on-mark': ({ seed }) => stub(seed).rect(180, 300, 280, 70, rubber).rect(190, 370, 260, 5, chalk),
  'finished-cut': ({ seed }) => new Canvas(earth, seed).ring(320, 240, 128, 150, bright).ring(320, 240, 0, 127, dark),
  bevel: ({ seed }) => {
    const canvas = new Canvas(dark, seed).rect(0, 240, 640, 240, bright);
    for (let row = 0; row < 70; row += 1) canvas.rect(row, 170 + row, 640 - 2 * row, 1, chalk);
    return canvas;
  },
  'seal-area': ({ seed }) => new Canvas(earth, seed).rect(150, 0, 340, 480, bright).rect(150, 0, 10, 480, chalk),
  'seal-before': ({ seed }) =>
    new Canvas(steel, seed).ring(320, 240, 150, 190, rubber).ring(320, 240, 158, 163, bright),
  'seal-after': ({ seed }) =>
    new Canvas(dark, seed)
      .ring(320, 240, 150, 215, steel)
      .ring(320, 240, 132, 150, rubber)
      .ring(320, 240, 118, 132, bright),
  'valve-and-reference': ({ seed }) => {
    const canvas = new Canvas([92, 116, 140], seed).rect(0, 330, 640, 150, earth).rect(240, 200, 120, 190, steel);
    canvas.rect(360, 260, 130, 50, steel).ring(500, 285, 26, 36, red);
    return canvas.rect(540, 150, 100, 180, tape).line(500, 285, 560, 285, 6, chalk);
  },
  'level-on-flange': ({ seed }) => {
    const canvas = new Canvas(earth, seed).rect(60, 300, 520, 80, steel).rect(120, 240, 400, 60, red);
    canvas.rect(270, 252, 100, 32, lit).ring(322, 268, 0, 13, chalk);
    return canvas.rect(298, 252, 3, 32, dark).rect(342, 252, 3, 32, dark);
  },
  'open-port': ({ seed }) => {
    const canvas = new Canvas(steel, seed).ring(320, 240, 0, 120, bright).ring(320, 240, 0, 84, dark);
    for (let radius = 84; radius < 116; radius += 8) canvas.ring(320, 240, radius, radius + 2, dark);
    return canvas;
  },
  'plug-kept': ({ seed }) =>
    new Canvas([60, 66, 78], seed)
      .rect(80, 90, 480, 300, dark)
      .rect(250, 180, 60, 120, bright)
      .rect(310, 205, 110, 70, steel),
  'instrument-on-metal': ({ seed, temperatureF }) => {
    const canvas = new Canvas(heat, seed).rect(300, 40, 300, 170, tape).rect(330, 70, 240, 100, dark);
    canvas.line(330, 210, 170, 390, 10, bright);
    writeDigits(canvas, temperatureF, 370, 85, 70, lit);
    return canvas;
  },
  'pass-side-a': ({ seed }) => bead(seed, false),
  'pass-side-b': ({ seed }) => bead(seed + 500, false),
  'finished-weld': ({ seed }) => bead(seed, true),
  'gauge-start': ({ seed, pressurePsi, fullScalePsi }) => dial(seed, (pressurePsi + 20) / fullScalePsi),
  'gauge-end': ({ seed, pressurePsi, fullScalePsi }) => dial(seed, (pressurePsi + 10) / fullScalePsi),
};

/** A picture for a named shot that shows what the shot asks for, as a PNG; of a shot that is not known, bare steel. */
export const pictureOf = (shot: string, shown: Shown): Buffer =>
  (scenes[shot]?.(shown) ?? new Canvas(steel, shown.seed)).png();
