import localFont from 'next/font/local'

// One family a file, chained in tailwind.config.ts. No metric fallback on any of them: it would stand before the next font of the chain.
// The ranges keep a browser from fetching a subset for a sign it does not hold. Only what every page shows is preloaded.

const sansLatin = localFont({ src: '../public/fonts/source-sans-3-latin-wght-normal.woff2', variable: '--font-sans-latin', weight: '200 900', display: 'swap', adjustFontFallback: false })
const sansItalic = localFont({ src: '../public/fonts/source-sans-3-latin-wght-italic.woff2', variable: '--font-sans-italic', weight: '200 900', style: 'italic', display: 'swap', preload: false, adjustFontFallback: false })
const sansLatinExt = localFont({
  src: '../public/fonts/source-sans-3-latin-ext-wght-normal.woff2', variable: '--font-sans-latin-ext', weight: '200 900', display: 'swap', preload: false, adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+1D00-1DBF, U+1E00-1E9F, U+1EF2-1EFF, U+2020, U+20A0-20AB, U+20AD-20C4, U+2113, U+2C60-2C7F, U+A720-A7FF' }],
})
const sansGreek = localFont({
  src: '../public/fonts/source-sans-3-greek-wght-normal.woff2', variable: '--font-sans-greek', weight: '200 900', display: 'swap', preload: false, adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0370-03FF' }],
})

const serifLatin = localFont({ src: '../public/fonts/stix-two-text-latin-wght-normal.woff2', variable: '--font-serif-latin', weight: '400 700', display: 'swap', adjustFontFallback: false })
const serifItalic = localFont({ src: '../public/fonts/stix-two-text-latin-wght-italic.woff2', variable: '--font-serif-italic', weight: '400 700', style: 'italic', display: 'swap', preload: false, adjustFontFallback: false })
const serifLatinExt = localFont({
  src: '../public/fonts/stix-two-text-latin-ext-wght-normal.woff2', variable: '--font-serif-latin-ext', weight: '400 700', display: 'swap', preload: false, adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+1D00-1DBF, U+1E00-1E9F, U+1EF2-1EFF, U+2020, U+20A0-20AB, U+20AD-20C0, U+2113, U+2C60-2C7F, U+A720-A7FF' }],
})
const serifGreek = localFont({
  src: '../public/fonts/stix-two-text-greek-wght-normal.woff2', variable: '--font-serif-greek', weight: '400 700', display: 'swap', preload: false, adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0370-03FF' }],
})

const math = localFont({ src: '../public/fonts/noto-sans-math-subset.woff2', variable: '--font-math', weight: '400', display: 'swap', preload: false, adjustFontFallback: false })

/** Formulas: its table of measures is what the browser sets fractions, roots and brackets by. */
const formula = localFont({ src: '../public/fonts/stix-two-math-subset.woff2', variable: '--font-formula', weight: '400', display: 'swap', preload: false, adjustFontFallback: false })

/** Class names for the root element: each defines one --font-… property. */
export const fontVariables = [sansLatin, sansItalic, sansLatinExt, sansGreek, serifLatin, serifItalic, serifLatinExt, serifGreek, math, formula].map((font) => font.variable).join(' ')
