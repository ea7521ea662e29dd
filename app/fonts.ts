import localFont from 'next/font/local'

/*
 * Each face comes as two files so that a page of plain English loads only the Latin one; the
 * ranges are those of the packages' own style sheets.
 */

/** Besley, a Clarendon: titles and shade names. */
export const besley = localFont({
  variable: '--font-besley',
  display: 'swap',
  adjustFontFallback: 'Times New Roman',
  src: [
    {
      path: '../node_modules/@fontsource-variable/besley/files/besley-latin-wght-normal.woff2',
      weight: '400 900',
      style: 'normal',
    },
    {
      path: '../node_modules/@fontsource-variable/besley/files/besley-latin-wght-italic.woff2',
      weight: '400 900',
      style: 'italic',
    },
  ],
})

/** Besley's extended Latin letters, loaded only where a name needs them. */
export const besleyExtended = localFont({
  variable: '--font-besley-ext',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  src: '../node_modules/@fontsource-variable/besley/files/besley-latin-ext-wght-normal.woff2',
  weight: '400 900',
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
})

/** Hanken Grotesk: everything else. */
export const hanken = localFont({
  variable: '--font-hanken',
  display: 'swap',
  src: '../node_modules/@fontsource-variable/hanken-grotesk/files/hanken-grotesk-latin-wght-normal.woff2',
  weight: '100 900',
})

/** Hanken Grotesk's extended Latin letters, loaded only where a text needs them. */
export const hankenExtended = localFont({
  variable: '--font-hanken-ext',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  src: '../node_modules/@fontsource-variable/hanken-grotesk/files/hanken-grotesk-latin-ext-wght-normal.woff2',
  weight: '100 900',
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
})
