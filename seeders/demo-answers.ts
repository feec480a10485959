import type { DrawnValues } from '@/lib/templates/content';
import { magnetFields, type DemoTemplateId } from './demo-templates';

/** What students write at one part for their own numbers, by how well they did. */
export type AnswerForms = {
  /** The same right answer in the forms people write. */
  right: string[];
  /** One recognised mistake each. */
  slips: string[];
  /** Wrong without a name. */
  wrong: string[];
  /** What nobody can read. */
  unreadable: string[];
};

/** The ways in which the invented students answer a part of a question, for one draw. */
export function answerForms(template: DemoTemplateId, part: string, values: DrawnValues): AnswerForms {
  const n = Number(values.n);
  switch (template) {
    case 'commutators':
      return commutatorForms(part, n, values.A ?? '');
    case 'magnet':
      return magnetForms(part, n, values.F ?? '');
    case 'precession':
      return precessionForms(part, n);
  }
}

/** [S_k, S_x + S_y + S_z] = iħ(S_p − S_q), by the cyclic order of x, y, z. */
const partners: Record<string, readonly [string, string]> = { S_x: ['z', 'y'], S_y: ['x', 'z'], S_z: ['y', 'x'] };

function commutatorForms(part: string, n: number, operator: string): AnswerForms {
  const [p, q] = partners[operator] ?? ['z', 'y'];
  switch (part) {
    case 'a':
      return {
        right: [
          `${n} i hbar (S_${p} - S_${q})`,
          `${n}iħ(S${p} − S${q})`,
          `${n} i \\hbar \\left(\\hat{S}_${p} - \\hat{S}_${q}\\right)`,
          `(${n}i/2) ħ² (σ_${p} - σ_${q})`,
          `i ħ ${n} S_${p} - i ħ ${n} S_${q}`,
        ],
        slips: [
          `${n} i hbar (S_${q} - S_${p})`,
          `-${n}iħ(S_${p} - S_${q})`,
          `${n} hbar (S_${p} - S_${q})`,
          `${n} i (S_${p} - S_${q})`,
          `${n} i hbar (σ_${p} - σ_${q})`,
        ],
        wrong: [`${n} i hbar S_${p}`, `${n} i hbar (S_${p} + S_${q})`, '0', `i hbar^2 (S_${p} - S_${q})`],
        unreadable: [`${n} i hbar (S_${p} - S_${q}`, `${n} iħ S_${p} - ?`, `[${n}A, B] = see sheet`],
      };
    case 'b':
      return {
        right: [`${n} hbar^2/2`, `\\frac{${n}\\hbar^2}{2}\\mathbb{1}`, `${n}ħ²/2 I`, `${n}ħ²/2 [[1, 0], [0, 1]]`],
        slips: [`${n} hbar^2/4`, `${n}ħ/2`, `-${n} hbar^2/2`],
        wrong: ['0', `${n} hbar^2/2 ${operator}`, `${n * n} hbar^2/4`],
        unreadable: [`${n} hbar^2 / `, `${n} hbar^2/2 * identity`],
      };
    default:
      return {
        right: [`${n} hbar^2/4`, `${n}ħ²/4`, `\\frac{${n}}{4}\\hbar^2`, `${n} (hbar/2)^2`],
        slips: [`${n} hbar^2/2`, `${n} hbar/4`, `-${n} hbar^2/4`],
        wrong: [`${n * n} hbar^2/4`, '0', 'hbar^2/4'],
        unreadable: [`${n} hbar^2//4`, 'see page 2'],
      };
  }
}

function magnetForms(part: string, n: number, field: string): AnswerForms {
  const [x, y, z] = magnetFields.find(({ text }) => text === field)?.coefficients ?? [0, 0, 0];
  switch (part) {
    case 'a':
      return {
        right: [
          `±${3 * n}ħΩ/2`,
          `{${3 * n} hbar Omega/2, -${3 * n} hbar Omega/2}`,
          `\\pm\\frac{${3 * n}}{2}\\hbar\\Omega`,
          `E_+ = ${3 * n}ħΩ/2, E_- = -${3 * n}ħΩ/2`,
          `-${1.5 * n} hbar Omega, ${1.5 * n} hbar Omega`,
        ],
        slips: [`±${3 * n}ħΩ`, `±${3 * n}Ω/2`, `${3 * n}ħΩ/2, ${3 * n}ħΩ/2`],
        wrong: [`±${(x + y + z) * n}ħΩ/2 + ħΩ`, `± sqrt(5) ${n} ħΩ/2`, `0, ${3 * n}ħΩ/2`],
        unreadable: [`±${3 * n}ħΩ/2 +`, `${3 * n} hbar w/2 and minus that`],
      };
    case 'b':
      return {
        right: [
          `${n} hbar Omega/2 [[${z}, ${complex(x, -y)}], [${complex(x, y)}, ${-z}]]`,
          `\\frac{${n}\\hbar\\Omega}{2}\\begin{pmatrix}${z} & ${complex(x, -y)}\\\\ ${complex(x, y)} & ${-z}\\end{pmatrix}`,
          `${n}ħΩ/2 (${x} σ_x + (${y}) σ_y + (${z}) σ_z)`,
          `ħΩ [[${(n * z) / 2}, ${complex((n * x) / 2, (-n * y) / 2)}], [${complex((n * x) / 2, (n * y) / 2)}, ${(-n * z) / 2}]]`,
        ],
        slips: [
          `${n} hbar Omega/2 [[${z}, ${complex(x, y)}], [${complex(x, -y)}, ${-z}]]`,
          `${n} hbar Omega [[${z}, ${complex(x, -y)}], [${complex(x, y)}, ${-z}]]`,
          `${n} Omega/2 [[${z}, ${complex(x, -y)}], [${complex(x, y)}, ${-z}]]`,
          `-${n} hbar Omega/2 [[${z}, ${complex(x, -y)}], [${complex(x, y)}, ${-z}]]`,
        ],
        wrong: [
          `${n} hbar Omega/2 [[${z}, ${x}], [${x}, ${-z}]]`,
          `${n} hbar Omega/2 [[${x}, ${complex(z, -y)}], [${complex(z, y)}, ${-x + 1}]]`,
        ],
        unreadable: [
          `${n} hbar Omega/2 [[${z}, ${complex(x, -y)}], [${complex(x, y)}, ${-z}]`,
          `${n} hbar Omega/2 [${z} ${x}; ${x}]`,
        ],
      };
    default:
      return {
        right: [`${n * z} hbar Omega/2`, `\\frac{${n * z}}{2}\\hbar\\Omega`, `${(n * z) / 2} ħΩ`],
        slips: [`${-n * z} hbar Omega/2`, `${n * z} hbar Omega`, `${n * z} Omega/2`],
        wrong: [`${n * x} hbar Omega/2`, '0', `${3 * n} hbar Omega/2 + hbar Omega`],
        unreadable: [`${n * z} hbar Omega/(2`, `<H> = ⟨+|H`],
      };
  }
}

/** A complex number with small real and imaginary parts, as it is written. */
function complex(re: number, im: number): string {
  const imaginary = Math.abs(im) === 1 ? 'i' : `${Math.abs(im)}i`;
  if (im === 0) return String(re);
  return re === 0 ? `${im < 0 ? '-' : ''}${imaginary}` : `${re} ${im < 0 ? '-' : '+'} ${imaginary}`;
}

function precessionForms(part: string, n: number): AnswerForms {
  const angle = n === 1 ? 'ωt' : `${n}ωt`;
  switch (part) {
    case 'a':
      return {
        right: [
          `(e^(-i ${n} omega t/2), e^(i ${n} omega t/2))/sqrt(2)`,
          `(|+> + e^{i ${n} ω t} |->)/√2`,
          `\\frac{1}{\\sqrt2}\\left(e^{-${n}i\\omega t/2}\\ket{+} + e^{${n}i\\omega t/2}\\ket{-}\\right)`,
          `1/sqrt(2) [exp(-i*${n}*omega*t/2), exp(i*${n}*omega*t/2)]`,
        ],
        slips: [
          `(e^(-i ${n} omega t/2), e^(i ${n} omega t/2))`,
          `(e^(i ${n} omega t/2), e^(-i ${n} omega t/2))/sqrt(2)`,
          `(e^(-i ${n} omega t), e^(i ${n} omega t))/sqrt(2)`,
        ],
        wrong: [`cos(${n} ω t/2) |+> + sin(${n} ω t/2) |->`, '|+>', `(1, ${n} ω t)/sqrt(2)`],
        unreadable: [`(e^(-i ${n} omega t/2), e^(i ${n} omega t/2)/sqrt(2)`, `|+> e^(-i${n}wt/2)`],
      };
    case 'b':
      return {
        right: [
          `cos²(${angle}/2)`,
          `(1 + cos(${n} omega t))/2`,
          `1 - sin(${n} omega t/2)^2`,
          `\\cos^2\\left(\\frac{${n}\\omega t}{2}\\right)`,
        ],
        slips: [`sin²(${angle}/2)`, `cos²(${angle})`, `(1 - cos(${n} omega t))/2`],
        wrong: [`cos(${angle}/2)`, '1/2', `(1 + sin(${n} omega t))/2`],
        unreadable: [`cos²(${angle}/2`, `cos^2(${n} w t/2)`],
      };
    default:
      return {
        right: [`ħ/2 cos(${n} ω t)`, `\\frac{\\hbar}{2}\\cos(${n}\\omega t)`, `hbar cos(${n} omega t)/2`],
        slips: [`ħ cos(${n} ω t)`, `ħ/2 cos(${n} ω t/2)`, `ħ/2 sin(${n} ω t)`, `cos(${n} ω t)/2`],
        wrong: ['0', `ħ/2 (cos(${n} ω t) + sin(${n} ω t))`],
        unreadable: [`ħ/2 cos(${n} ω t`, `hbar/2 cos(${n} w t)`],
      };
  }
}
