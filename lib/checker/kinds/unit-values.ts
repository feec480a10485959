import { type UnitFactor } from '../notation/answer-tree';

/** A unit as a factor to SI base units, powers of the base units, and whether it counts turns or radians. */
export interface UnitValue {
  readonly factor: number;
  /** Powers of m, kg, s, A, K, mol, cd. */
  readonly powers: readonly number[];
  /** Power of Hz, and of the radian (a degree counts as one). */
  readonly hertz: number;
  readonly radian: number;
}

type Row = readonly [factor: number, m: number, kg: number, s: number, A: number, K: number, mol: number, cd: number];

/**
 * SI Brochure, 9th edition (2019), tables 2, 4, 5 and 8, where eV is exact; the dalton is CODATA 2022.
 * Gauss is 10⁻⁴ T, bar 10⁵ Pa.
 */
const units: Readonly<Record<string, Row>> = {
  m: [1, 1, 0, 0, 0, 0, 0, 0],
  g: [1e-3, 0, 1, 0, 0, 0, 0, 0],
  s: [1, 0, 0, 1, 0, 0, 0, 0],
  A: [1, 0, 0, 0, 1, 0, 0, 0],
  K: [1, 0, 0, 0, 0, 1, 0, 0],
  mol: [1, 0, 0, 0, 0, 0, 1, 0],
  cd: [1, 0, 0, 0, 0, 0, 0, 1],
  Hz: [1, 0, 0, -1, 0, 0, 0, 0],
  rad: [1, 0, 0, 0, 0, 0, 0, 0],
  sr: [1, 0, 0, 0, 0, 0, 0, 0],
  deg: [Math.PI / 180, 0, 0, 0, 0, 0, 0, 0],
  N: [1, 1, 1, -2, 0, 0, 0, 0],
  Pa: [1, -1, 1, -2, 0, 0, 0, 0],
  J: [1, 2, 1, -2, 0, 0, 0, 0],
  W: [1, 2, 1, -3, 0, 0, 0, 0],
  C: [1, 0, 0, 1, 1, 0, 0, 0],
  V: [1, 2, 1, -3, -1, 0, 0, 0],
  F: [1, -2, -1, 4, 2, 0, 0, 0],
  ohm: [1, 2, 1, -3, -2, 0, 0, 0],
  S: [1, -2, -1, 3, 2, 0, 0, 0],
  Wb: [1, 2, 1, -2, -1, 0, 0, 0],
  T: [1, 0, 1, -2, -1, 0, 0, 0],
  H: [1, 2, 1, -2, -2, 0, 0, 0],
  lm: [1, 0, 0, 0, 0, 0, 0, 1],
  lx: [1, -2, 0, 0, 0, 0, 0, 1],
  Bq: [1, 0, 0, -1, 0, 0, 0, 0],
  Gy: [1, 2, 0, -2, 0, 0, 0, 0],
  kat: [1, 0, 0, -1, 0, 0, 1, 0],
  eV: [1.602176634e-19, 2, 1, -2, 0, 0, 0, 0],
  u: [1.66053906892e-27, 0, 1, 0, 0, 0, 0, 0],
  Da: [1.66053906892e-27, 0, 1, 0, 0, 0, 0, 0],
  G: [1e-4, 0, 1, -2, -1, 0, 0, 0],
  bar: [1e5, -1, 1, -2, 0, 0, 0, 0],
  L: [1e-3, 3, 0, 0, 0, 0, 0, 0],
  min: [60, 0, 0, 1, 0, 0, 0, 0],
};

const prefixes: Readonly<Record<string, number>> = {
  '': 0,
  Q: 30,
  R: 27,
  Y: 24,
  Z: 21,
  E: 18,
  P: 15,
  T: 12,
  G: 9,
  M: 6,
  k: 3,
  h: 2,
  da: 1,
  d: -1,
  c: -2,
  m: -3,
  u: -6,
  n: -9,
  p: -12,
  f: -15,
  a: -18,
  z: -21,
  y: -24,
  r: -27,
  q: -30,
};

/** The value of a product of units; null where a unit is not in the table. */
export function unitValue(unit: readonly UnitFactor[]): UnitValue | null {
  let factor = 1;
  let hertz = 0;
  let radian = 0;
  let tens = 0;
  const powers = [0, 0, 0, 0, 0, 0, 0];
  for (const { prefix, unit: name, power } of unit) {
    const row = units[name];
    const exponent = prefixes[prefix];
    if (!row || exponent === undefined) return null;
    factor *= row[0] ** power;
    tens += exponent * power;
    for (let k = 0; k < 7; k++) powers[k]! += row[k + 1]! * power;
    if (name === 'Hz') hertz += power;
    if (name === 'rad' || name === 'deg') radian += power;
  }
  return { factor: tens < 0 ? factor / 10 ** -tens : factor * 10 ** tens, powers, hertz, radian };
}

/** Whether two units measure the same dimension; turns and radians are numbers there. */
export const sameDimension = (x: UnitValue, y: UnitValue): boolean =>
  x.powers.every((power, k) => power === y.powers[k]);

/** Whether one is a frequency in Hz and the other an angular one with the radian written. */
export const isHertzAgainstRadian = (x: UnitValue, y: UnitValue): boolean =>
  x.hertz !== 0 && x.radian === 0 && y.radian !== 0 && y.hertz === 0;
