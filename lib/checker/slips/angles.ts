import { type AnswerTree } from '../notation/answer-tree';
import { type CallNode, type Expression, type ReferenceNode } from '../notation/tree';
import { type FormSlip } from './slip';
import { everywhereAndEach, timesNumber } from './tree-changes';

const ofAngles: ReadonlySet<CallNode['name']> = new Set(['sin', 'cos', 'tan', 'sec', 'csc', 'cot', 'exp']);

/** Places of the angles among the arguments of reference functions. */
const anglesOfReferences: Partial<Record<ReferenceNode['name'], readonly number[]>> = {
  spinor: [0],
  rotation: [1],
  propagator: [1],
  evolve: [1],
  heisenberg: [2],
  rabi: [2],
};

const changeAngles =
  (change: (angle: Expression) => Expression) =>
  (tree: AnswerTree): AnswerTree[] =>
    everywhereAndEach(tree, (node) => {
      if (node.node === 'call' && ofAngles.has(node.name)) return { ...node, arguments: node.arguments.map(change) };
      const places = node.node === 'reference' ? anglesOfReferences[node.name] : undefined;
      if (node.node !== 'reference' || !places) return node;
      return { ...node, arguments: node.arguments.map((x, k) => (places.includes(k) ? change(x) : x)) };
    });

/** θ/2 stands where θ should. */
export const halfAngle: FormSlip = {
  type: 'form',
  id: 'half-angle',
  sentence: 'half of an angle stands where the angle should',
  change: changeAngles((angle) => timesNumber(angle, 2n, true)),
};

/** 2θ stands where θ should. */
export const doubleAngle: FormSlip = {
  type: 'form',
  id: 'double-angle',
  sentence: 'twice an angle stands where the angle should',
  change: changeAngles((angle) => timesNumber(angle, 2n, false)),
};
