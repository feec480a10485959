import { type FormSlip } from './slip';

/** A sine stands for a cosine or the other way round. */
export const sineCosine: FormSlip = {
  type: 'form',
  id: 'sine-cosine',
  sentence: 'a sine stands for a cosine or the other way round',
  change: 'sine-cosine',
};
