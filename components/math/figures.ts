/** How far apart two figures of a picture may be and still count as the same: rounding of doubles, not a tolerance of marks. */
const rounding = 1e-9;

/** Whether two figures are the same but for rounding. */
export function sameFigure(first: number, second: number): boolean {
  return Math.abs(first - second) <= rounding * Math.max(1, Math.abs(first), Math.abs(second));
}

/** A figure as it stands in a picture: three significant digits, a true minus, no trailing zeros. */
export function figureText(value: number): string {
  const rounded = Number(value.toPrecision(3));
  return String(Math.abs(rounded) < 1e-12 ? 0 : rounded).replace('-', '−');
}
