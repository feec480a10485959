/** Characters and LaTeX commands that are spellings of the same thing. Tables only. */

/** Greek letters by their English name, as in `\omega` or the ASCII spelling `omega`. */
export const greekByName: ReadonlyMap<string, string> = new Map(
  (
    'alpha α beta β gamma γ delta δ epsilon ε zeta ζ eta η theta θ iota ι kappa κ lambda λ mu μ nu ν xi ξ omicron ο ' +
    'pi π rho ρ sigma σ tau τ upsilon υ phi φ chi χ psi ψ omega ω ' +
    'Gamma Γ Delta Δ Theta Θ Lambda Λ Xi Ξ Pi Π Sigma Σ Upsilon Υ Phi Φ Psi Ψ Omega Ω'
  )
    .split(' ')
    .reduce<[string, string][]>((pairs, word, index, words) => {
      if (index % 2 === 0) pairs.push([word, words[index + 1] ?? word]);
      return pairs;
    }, []),
);

/** English names by Greek letter. */
export const greekNames: ReadonlyMap<string, string> = new Map(
  [...greekByName].map(([name, letter]) => [letter, name]),
);

/** Letters read as another letter: variants, the micro, ohm and Planck signs, double-struck i and e. */
export const letterVariants: ReadonlyMap<string, string> = new Map([
  ['ϕ', 'φ'],
  ['ϑ', 'θ'],
  ['ϵ', 'ε'],
  ['ϖ', 'π'],
  ['ϱ', 'ρ'],
  ['ς', 'σ'],
  ['ϰ', 'κ'],
  ['µ', 'μ'],
  ['Ω', 'Ω'],
  ['K', 'K'],
  ['ℏ', 'ħ'],
  ['ℎ', 'h'],
  ['ⅈ', 'i'],
  ['ⅇ', 'e'],
  ['ı', 'i'],
  ['Ŝ', 'S'],
]);

/** Commands that stand for one letter, besides the Greek names. */
export const letterCommands: ReadonlyMap<string, string> = new Map([
  ['varphi', 'φ'],
  ['varepsilon', 'ε'],
  ['vartheta', 'θ'],
  ['varpi', 'π'],
  ['varrho', 'ρ'],
  ['varsigma', 'σ'],
  ['varkappa', 'κ'],
  ['hbar', 'ħ'],
  ['hslash', 'ħ'],
  ['imath', 'i'],
  ['ell', 'ℓ'],
]);

const superscripts = '⁰0¹1²2³3⁴4⁵5⁶6⁷7⁸8⁹9⁺+⁻-ⁿnⁱiᵀT';
const subscripts = '₀0₁1₂2₃3₄4₅5₆6₇7₈8₉9₊+₋-ₓxₐaₑeₕhᵢiⱼjₖkₗlₘmₙnₒoₚpᵣrₛsₜtᵤuᵥv';

function pairsOf(text: string): ReadonlyMap<string, string> {
  const characters = [...text];
  const map = new Map<string, string>();
  for (let index = 0; index + 1 < characters.length; index += 2) {
    map.set(characters[index] ?? '', characters[index + 1] ?? '');
  }
  return map;
}

/** Superscript characters and what they stand for. */
export const superscriptOf = pairsOf(superscripts);

/** Subscript characters and what they stand for. */
export const subscriptOf = pairsOf(subscripts);

/** Vulgar fractions as numerator and denominator. */
export const vulgarFractions: ReadonlyMap<string, readonly [number, number]> = new Map([
  ['½', [1, 2]],
  ['⅓', [1, 3]],
  ['⅔', [2, 3]],
  ['¼', [1, 4]],
  ['¾', [3, 4]],
  ['⅕', [1, 5]],
  ['⅖', [2, 5]],
  ['⅗', [3, 5]],
  ['⅘', [4, 5]],
  ['⅙', [1, 6]],
  ['⅚', [5, 6]],
  ['⅐', [1, 7]],
  ['⅛', [1, 8]],
  ['⅜', [3, 8]],
  ['⅝', [5, 8]],
  ['⅞', [7, 8]],
  ['⅑', [1, 9]],
  ['⅒', [1, 10]],
]);

/** Single characters that are a token of their own, and that token's kind. */
export const punctuation: ReadonlyMap<string, string> = new Map([
  ['+', '+'],
  ['-', '-'],
  ['−', '-'],
  ['‐', '-'],
  ['‑', '-'],
  ['‒', '-'],
  ['–', '-'],
  ['—', '-'],
  ['﹣', '-'],
  ['－', '-'],
  ['＋', '+'],
  ['±', '±'],
  ['∓', '∓'],
  ['*', '*'],
  ['·', '*'],
  ['⋅', '*'],
  ['∙', '*'],
  ['•', '*'],
  ['∗', '*'],
  ['×', '*'],
  ['/', '/'],
  ['÷', '/'],
  ['∕', '/'],
  ['⁄', '/'],
  ['^', '^'],
  ['(', '('],
  [')', ')'],
  ['[', '['],
  [']', ']'],
  ['{', '{'],
  ['}', '}'],
  ['（', '('],
  ['）', ')'],
  [',', ','],
  ['，', ','],
  [';', ';'],
  [':', ':'],
  ['=', '='],
  ['≠', '!='],
  ['≤', '<='],
  ['⩽', '<='],
  ['≥', '>='],
  ['⩾', '>='],
  ['<', '<'],
  ['⟨', '<'],
  ['〈', '<'],
  ['〈', '<'],
  ['>', '>'],
  ['⟩', '>'],
  ['〉', '>'],
  ['〉', '>'],
  ['|', 'bar'],
  ['∣', 'bar'],
  ['ǀ', 'bar'],
  ['_', '_'],
  ["'", 'prime'],
  ['’', 'prime'],
  ['′', 'prime'],
  ['†', 'dagger'],
  ['√', 'root'],
  ['&', '&'],
  ['↑', 'arrow'],
  ['↓', 'arrow'],
  ['°', 'degree'],
  ['𝟙', 'identity'],
  ['𝟏', 'identity'],
  ['𝕀', 'identity'],
  ['𝐈', 'identity'],
]);

/** Commands that are a token of their own, and that token's kind; an empty kind is decoration. */
export const commandTokens: ReadonlyMap<string, string> = new Map(
  (
    'cdot * times * ast * cdotp * star * div / pm ± mp ∓ dagger dagger dag dagger top transpose ' +
    'frac frac tfrac frac dfrac frac cfrac frac sqrt root overline overline bar overline ' +
    'lvert bar-open rvert bar-close vert bar mid bar lbrace { rbrace } lbrack [ rbrack ] langle < rangle > lt < gt > ' +
    'ne != neq != le <= leq <= leqslant <= ge >= geq >= geqslant >= prime prime colon : circ degree degree degree uparrow arrow downarrow arrow land and lor or lnot not neg not'
  )
    .split(' ')
    .reduce<[string, string][]>((pairs, word, index, words) => {
      if (index % 2 === 0) pairs.push([word, words[index + 1] ?? '']);
      return pairs;
    }, []),
);

/** Commands without meaning: they count as white space. */
export const decorationCommands: ReadonlySet<string> = new Set(
  (
    'quad qquad enspace thinspace displaystyle textstyle scriptstyle limits nolimits middle big Big bigg Bigg bigl ' +
    'bigr Bigl Bigr biggl biggr Biggl Biggr bigm Bigm rm nobreak mathstrut null relax'
  ).split(' '),
);

/** Commands whose braces only set a type face. */
export const faceCommands: ReadonlySet<string> = new Set(
  'mathrm text textrm textup mathsf textsf operatorname mbox mathit textit mathnormal boldsymbol bm mathbf textbf vec'.split(
    ' ',
  ),
);

/** Faces in which a 1 or an I is the identity operator. */
export const identityFaces: ReadonlySet<string> = new Set('mathbb mathds mathbf boldsymbol bm Bbb'.split(' '));

/** Matrix environments. */
export const matrixEnvironments: ReadonlySet<string> = new Set(
  'pmatrix bmatrix matrix smallmatrix array Bmatrix psmallmatrix bsmallmatrix'.split(' '),
);
