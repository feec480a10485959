import { type FormSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

/** A sine stands for a cosine or the other way round. */
export const sineCosine: FormSlip = {
  type: 'form',
  id: 'sine-cosine',
  sentence: 'a sine stands for a cosine or the other way round',
  change: (tree) =>
    everywhereAndEach(tree, (node) => {
      if (node.node !== 'call') return node;
      if (node.name === 'sin') return { ...node, name: 'cos' };
      return node.name === 'cos' ? { ...node, name: 'sin' } : node;
    }),
};
