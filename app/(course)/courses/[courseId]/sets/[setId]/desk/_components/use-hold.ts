'use client';

import { useEffect, useState } from 'react';
import { keepHold } from '../actions';

const signOfLifeEvery = 60_000;

/**
 * Keeps the hold on an answer while its desk is in sight, and tells when it was lost: to the clock, or to another grader.
 * A server that cannot be reached loses nothing before the hold itself runs out.
 */
export function useHold(queueItemId: string, heldUntil: string): { lost: boolean } {
  const [lost, setLost] = useState(false);
  useEffect(() => {
    let until = Date.parse(heldUntil);
    let ended = false;
    const show = async () => {
      if (ended || document.visibilityState !== 'visible') return;
      try {
        const result = await keepHold(queueItemId);
        if (result.ok) until = Date.parse(result.value.heldUntil);
        else if (result.code === 'lease-lost' || result.code === 'not-found') end();
      } catch {
        if (Date.now() > until) end();
      }
    };
    const end = () => {
      ended = true;
      setLost(true);
    };
    const timer = setInterval(() => void show(), signOfLifeEvery);
    const seen = () => void show();
    document.addEventListener('visibilitychange', seen);
    return () => {
      ended = true;
      clearInterval(timer);
      document.removeEventListener('visibilitychange', seen);
    };
  }, [queueItemId, heldUntil]);
  return { lost };
}
