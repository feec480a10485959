import localFont from 'next/font/local';

/**
 * The Latin letters of the text face, which every page shows at once: preloaded, with a fallback of the same measures, so
 * that nothing moves when they arrive. Everything rarer is in fonts.css and comes when a page needs it.
 */
export const latinFace = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/noto-serif/files/noto-serif-latin-400-normal.woff2',
      weight: '400',
      style: 'normal',
    },
    {
      path: '../node_modules/@fontsource/noto-serif/files/noto-serif-latin-600-normal.woff2',
      weight: '600 700',
      style: 'normal',
    },
  ],
  variable: '--font-latin',
  display: 'swap',
  preload: true,
  adjustFontFallback: 'Times New Roman',
});
