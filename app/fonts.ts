import localFont from 'next/font/local';

// One localFont call holds one file, and a file holds one script, so each family is several faces that share the
// page by unicode-range. globals.css joins them again in --font-archivo, --font-saira and --font-spline-mono.
// Only the Latin faces are preloaded; the others load when a letter asks for them. Licences: public/fonts/licences.

const archivoLatin = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/archivo/files/archivo-latin-wdth-normal.woff2',
      weight: '100 900',
      style: 'normal',
    },
  ],
  variable: '--face-archivo-latin',
  display: 'swap',
  adjustFontFallback: false,
  preload: true,
  declarations: [
    { prop: 'font-stretch', value: '62% 125%' },
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
});

const archivoLatinExt = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/archivo/files/archivo-latin-ext-wdth-normal.woff2',
      weight: '100 900',
      style: 'normal',
    },
  ],
  variable: '--face-archivo-latin-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    { prop: 'font-stretch', value: '62% 125%' },
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
});

const archivoVietnamese = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/archivo/files/archivo-vietnamese-wdth-normal.woff2',
      weight: '100 900',
      style: 'normal',
    },
  ],
  variable: '--face-archivo-vietnamese',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    { prop: 'font-stretch', value: '62% 125%' },
    {
      prop: 'unicode-range',
      value:
        'U+0102-0103,U+0110-0111,U+0128-0129,U+0168-0169,U+01A0-01A1,U+01AF-01B0,U+0300-0301,U+0303-0304,U+0308-0309,U+0323,U+0329,U+1EA0-1EF9,U+20AB',
    },
  ],
});

const sairaLatin = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/saira-extra-condensed/files/saira-extra-condensed-latin-800-normal.woff2',
      weight: '800',
      style: 'normal',
    },
  ],
  variable: '--face-saira-latin',
  display: 'swap',
  adjustFontFallback: false,
  preload: true,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
});

const sairaLatinExt = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/saira-extra-condensed/files/saira-extra-condensed-latin-ext-800-normal.woff2',
      weight: '800',
      style: 'normal',
    },
  ],
  variable: '--face-saira-latin-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
});

const sairaVietnamese = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/saira-extra-condensed/files/saira-extra-condensed-vietnamese-800-normal.woff2',
      weight: '800',
      style: 'normal',
    },
  ],
  variable: '--face-saira-vietnamese',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0102-0103,U+0110-0111,U+0128-0129,U+0168-0169,U+01A0-01A1,U+01AF-01B0,U+0300-0301,U+0303-0304,U+0308-0309,U+0323,U+0329,U+1EA0-1EF9,U+20AB',
    },
  ],
});

const splineLatin = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/spline-sans-mono/files/spline-sans-mono-latin-400-normal.woff2',
      weight: '400',
      style: 'normal',
    },
  ],
  variable: '--face-spline-latin',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
});

const splineLatinExt = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/spline-sans-mono/files/spline-sans-mono-latin-ext-400-normal.woff2',
      weight: '400',
      style: 'normal',
    },
  ],
  variable: '--face-spline-latin-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
});

/** The classes that put every face's variable on <html>. */
export const fontVariables = [
  archivoLatin,
  archivoLatinExt,
  archivoVietnamese,
  sairaLatin,
  sairaLatinExt,
  sairaVietnamese,
  splineLatin,
  splineLatinExt,
]
  .map((face) => face.variable)
  .join(' ');
