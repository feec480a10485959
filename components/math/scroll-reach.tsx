'use client';

import { type ReactNode, useEffect, useRef } from 'react';

const scrollers = '.tex-display, .typeset-display';

/**
 * Wraps formulas that may be wider than the page. One that really is gets a tab stop, so that the keyboard can scroll it;
 * the others get none, so that the tab key does not halt at every formula.
 */
export function ScrollReach({ inline = false, children }: { inline?: boolean; children: ReactNode }) {
  const frame = useRef<HTMLDivElement & HTMLSpanElement>(null);
  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const measure = () => {
      for (const formula of element.querySelectorAll<HTMLElement>(scrollers)) {
        if (formula.scrollWidth > formula.clientWidth + 1) formula.tabIndex = 0;
        else formula.removeAttribute('tabindex');
      }
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    // Widths are final once the fonts are there; a DOM without a font set has no widths either.
    void document.fonts?.ready.then(measure);
    return () => observer.disconnect();
  });
  const Frame = inline ? 'span' : 'div';
  return (
    <Frame ref={frame} className={inline ? 'block' : undefined}>
      {children}
    </Frame>
  );
}
