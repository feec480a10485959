/** Limits of reading. Each is a constant, so that what is readable never depends on load. */

/** Longest text in code points; part of the answer language. Diagnostic `too-long`. */
export const maximumLength = 4000;

/**
 * Deepest nesting of brackets, powers, roots, functions and signs; part of the answer language. It also bounds the
 * depth of the tree, so that everything that walks a tree may recurse. Diagnostic `too-deep`.
 */
export const maximumDepth = 100;

/**
 * Most powers, daggers and the like directly after one operand. Nobody needs more than two or three; each makes the tree
 * deeper without a bracket, so that this limit keeps the depth of a tree within a small multiple of `maximumDepth`.
 * Diagnostic `too-deep`.
 */
export const maximumMarks = 8;

/**
 * Most nodes of a tree. A text yields about one node a character; superscripts can yield more. The limit bounds the
 * work of everything downstream. Diagnostic `too-many-nodes`.
 */
export const maximumNodes = 5000;

/**
 * Largest power of ten in a literal, either way. The largest that physics needs is below 10^123; far larger ones would
 * cost memory out of proportion to the text (`1e999999999`). Diagnostic `number-too-large`.
 */
export const maximumExponent = 400;

/** Longest label of a ket in characters, decoration included; longer ones are not labels. */
export const maximumLabelLength = 48;

/** Most readings reported beside the first: all combinations of four independent choices. */
export const maximumAlternatives = 15;
