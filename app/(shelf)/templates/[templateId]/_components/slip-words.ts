'use client';

import { createContext, useContext } from 'react';

/** A slip of the catalogue in the words in which it is told; the catalogue itself stays on the server. */
export type SlipWords = { id: string; sentence: string };

/** The catalogue of slips, for the fields that give them credit. */
export const SlipContext = createContext<readonly SlipWords[]>([]);

export function useSlips(): readonly SlipWords[] {
  return useContext(SlipContext);
}
