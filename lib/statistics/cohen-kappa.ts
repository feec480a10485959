import { sharesOf, type ContingencyTable, type Shares } from './contingency-table';
import { Z_95, type Interval } from './normal';

/** Agreement weights: 1 on the diagonal, between 0 and 1 beside it. */
export type AgreementWeights = (row: number, column: number, categories: number) => number;

/** Only the same category agrees: Cohen's kappa of 1960. */
export const identityWeights: AgreementWeights = (row, column) => (row === column ? 1 : 0);

/** Agreement falls in proportion to the distance of the categories. */
export const linearWeights: AgreementWeights = (row, column, categories) =>
  categories < 2 ? 1 : 1 - Math.abs(row - column) / (categories - 1);

/** Agreement falls with the square of the distance of the categories. */
export const quadraticWeights: AgreementWeights = (row, column, categories) =>
  categories < 2 ? 1 : 1 - ((row - column) / (categories - 1)) ** 2;

/**
 * Kappa of two raters. `not defined` where there are no pairs, or where chance alone would agree always (all ratings in
 * one category), since the quotient is then 0/0.
 */
export type Kappa =
  | {
      defined: true;
      kappa: number;
      observed: number;
      expected: number;
      standardError: number;
      interval: Interval;
      pairs: number;
    }
  | { defined: false; why: 'no pairs' | 'chance agreement is 1'; observed: number | null; pairs: number };

/**
 * Cohen's kappa, weighted where weights are given, with its large-sample standard error and 95 % interval (cut at −1 and
 * 1). Sources: J. Cohen, Educ. Psychol. Meas. 20 (1960) 37 and Psychol. Bull. 70 (1968) 213; standard error by
 * J. L. Fleiss, J. Cohen and B. S. Everitt, Psychol. Bull. 72 (1969) 323.
 */
export function cohenKappa(table: ContingencyTable, weights: AgreementWeights = identityWeights): Kappa {
  const shares = sharesOf(table);
  if (shares === null) return { defined: false, why: 'no pairs', observed: null, pairs: 0 };
  const size = table.length;
  const weight = (row: number, column: number) => weights(row, column, size);
  const observed = sumOver(shares, (share, row, column) => share * weight(row, column));
  const expected = sumOver(shares, (_share, row, column) => product(shares, row, column) * weight(row, column));
  if (1 - expected < 1e-12) {
    return { defined: false, why: 'chance agreement is 1', observed, pairs: shares.total };
  }
  const kappa = (observed - expected) / (1 - expected);
  const standardError = largeSampleError(shares, weight, kappa, expected);
  return {
    defined: true,
    kappa,
    observed,
    expected,
    standardError,
    interval: {
      lower: Math.max(-1, kappa - Z_95 * standardError),
      upper: Math.min(1, kappa + Z_95 * standardError),
    },
    pairs: shares.total,
  };
}

function largeSampleError(
  shares: Shares,
  weight: (row: number, column: number) => number,
  kappa: number,
  expected: number,
): number {
  const meanOfRow = shares.rows.map((_row, row) =>
    shares.columns.reduce((sum, share, column) => sum + share * weight(row, column), 0),
  );
  const meanOfColumn = shares.columns.map((_column, column) =>
    shares.rows.reduce((sum, share, row) => sum + share * weight(row, column), 0),
  );
  const spread = sumOver(shares, (share, row, column) => {
    const means = (meanOfRow[row] ?? 0) + (meanOfColumn[column] ?? 0);
    return share * (weight(row, column) - means * (1 - kappa)) ** 2;
  });
  const variance = (spread - (kappa - expected * (1 - kappa)) ** 2) / (shares.total * (1 - expected) ** 2);
  return Math.sqrt(Math.max(0, variance));
}

function product(shares: Shares, row: number, column: number): number {
  return (shares.rows[row] ?? 0) * (shares.columns[column] ?? 0);
}

function sumOver(shares: Shares, term: (share: number, row: number, column: number) => number): number {
  return shares.cells.reduce(
    (sum, cells, row) => cells.reduce((inner, share, column) => inner + term(share, row, column), sum),
    0,
  );
}
