import localFont from 'next/font/local';

// Only the subsets that the pages use. next/font measures each file and adds a size-adjusted fallback, so that text
// does not move when the file arrives. Greek is listed before its Latin sister: its range keeps it to Greek letters.

export const serif = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/stix-two-text/files/stix-two-text-latin-wght-normal.woff2',
      weight: '400 700',
      style: 'normal',
    },
    {
      path: '../node_modules/@fontsource-variable/stix-two-text/files/stix-two-text-latin-wght-italic.woff2',
      weight: '400 700',
      style: 'italic',
    },
  ],
  variable: '--face-serif',
  adjustFontFallback: 'Times New Roman',
  display: 'swap',
});

export const serifGreek = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/stix-two-text/files/stix-two-text-greek-wght-normal.woff2',
      weight: '400 700',
      style: 'normal',
    },
    {
      path: '../node_modules/@fontsource-variable/stix-two-text/files/stix-two-text-greek-wght-italic.woff2',
      weight: '400 700',
      style: 'italic',
    },
  ],
  variable: '--face-greek',
  adjustFontFallback: false,
  declarations: [
    { prop: 'unicode-range', value: 'U+0370-0377,U+037A-037F,U+0384-038A,U+038C,U+038E-03A1,U+03A3-03FF' },
  ],
  display: 'swap',
});

export const sans = localFont({
  src: '../node_modules/@fontsource-variable/hanken-grotesk/files/hanken-grotesk-latin-wght-normal.woff2',
  weight: '100 900',
  variable: '--face-sans',
  adjustFontFallback: 'Arial',
  display: 'swap',
});

export const mono = localFont({
  src: '../node_modules/@fontsource/spline-sans-mono/files/spline-sans-mono-latin-400-normal.woff2',
  weight: '400',
  variable: '--face-mono',
  adjustFontFallback: 'Arial',
  display: 'swap',
});
