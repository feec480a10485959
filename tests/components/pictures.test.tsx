// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { BlochSphere } from '@/components/math/bloch-sphere';
import { figureText } from '@/components/math/figures';
import { LevelDiagram } from '@/components/math/level-diagram';
import { PauliBars, type PauliFigures } from '@/components/math/pauli-bars';
import { formatTime } from '@/components/ui/time-stamp';

afterEach(cleanup);

const real = (...values: [number, number, number, number]): PauliFigures => {
  const [a0, x, y, z] = values;
  return [
    { re: a0, im: 0 },
    { re: x, im: 0 },
    { re: y, im: 0 },
    { re: z, im: 0 },
  ];
};
const picture = () => screen.getByRole('img');
const tableRows = () =>
  [...document.querySelectorAll('tr')].map((row) =>
    [...row.querySelectorAll('th, td')].map((cell) => cell.textContent),
  );

describe('PauliBars', () => {
  it('names what differs, in the picture and in the table behind it', () => {
    render(<PauliBars reference={real(0, 2, -1, 2)} answer={real(0, 2, 1, 2)} unit="ħΩ/2" />);
    expect(picture().querySelector('desc')?.textContent).toBe('Reference and answer differ in y (−1 against 1).');
    expect(picture().querySelectorAll('.fill-madder.figure-answer')).toHaveLength(1);
    expect(tableRows()).toContainEqual(['y', '−1', '1']);
    expect(screen.getByText('answer, differs')).toBeTruthy();
  });

  it('has a row for an imaginary part only where there is one', () => {
    render(<PauliBars reference={real(1, 0, 0, 0)} />);
    expect(tableRows()).toHaveLength(5);
    cleanup();
    const [, x, y, z] = real(1, 0, 0, 0);
    const complex: PauliFigures = [{ re: 1, im: 0.5 }, x, y, z];
    render(<PauliBars reference={real(1, 0, 0, 0)} answer={complex} />);
    expect(tableRows()).toContainEqual(['1, imaginary', '0', '0.5']);
  });
});

describe('LevelDiagram', () => {
  it('takes levels in any order', () => {
    render(<LevelDiagram reference={[1.5, -1.5]} answer={[-1.5, 1.5]} />);
    expect(picture().querySelector('desc')?.textContent).toBe(
      'reference: 1.5 and −1.5; answer: 1.5 and −1.5. They agree.',
    );
  });

  it('says that a level is there twice, and that one of two is not enough', () => {
    render(<LevelDiagram reference={[2, 2]} answer={[2, 1]} />);
    expect(picture().textContent).toContain('2 (twice)');
    expect(picture().querySelector('desc')?.textContent).toContain('They differ.');
  });
});

describe('BlochSphere', () => {
  it('says where both point', () => {
    render(<BlochSphere reference={{ x: 0, y: 1, z: 0 }} answer={{ x: 0, y: -1, z: 0 }} />);
    expect(picture().querySelector('desc')?.textContent).toBe(
      'Reference at (0, 1, 0); answer at (0, −1, 0). They differ.',
    );
  });
});

describe('figures and times in words', () => {
  it('rounds to three figures with a true minus and no minus nought', () => {
    expect([1 / 3, -2, -1e-15, 1234.5, -0].map(figureText)).toEqual(['0.333', '−2', '0', '1230', '0']);
  });

  it('writes a moment in the zone of the course', () => {
    const at = new Date('2026-12-04T17:00:00Z');
    expect(formatTime(at, 'Europe/Oslo', 'full')).toBe('Friday 4 December, 18:00');
    expect(formatTime(at, 'America/New_York', 'short')).toBe('4 Dec, 12:00');
    expect(formatTime(new Date('2026-12-04T23:30:00Z'), 'Europe/Oslo', 'date')).toBe('5 December 2026');
    expect(formatTime(new Date('2026-12-04T23:00:00Z'), 'Europe/Oslo', 'clock')).toBe('00:00');
  });
});
