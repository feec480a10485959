import { type FormSlip } from './slip';

/** θ/2 stands where θ should, in a sine, cosine or exponential. */
export const halfAngle: FormSlip = {
  type: 'form',
  id: 'half-angle',
  sentence: 'half of an angle stands where the angle should',
  change: 'half-angle',
};

/** 2θ stands where θ should. */
export const doubleAngle: FormSlip = {
  type: 'form',
  id: 'double-angle',
  sentence: 'twice an angle stands where the angle should',
  change: 'double-angle',
};
