import { createTheme, localStorageColorSchemeManager, type MantineColorsTuple } from '@mantine/core';

/** Around tokens.css: 7 is primer on light, 3 is primer on dark; both carry their text at 4.5 to 1 or better. */
const primer: MantineColorsTuple = [
  '#F1F4E2',
  '#DDE6BE',
  '#C2D27C',
  '#A9BC5A',
  '#93A74A',
  '#7D9138',
  '#6C7F2D',
  '#5E6F25',
  '#4B591D',
  '#394416',
];

export const theme = createTheme({
  colors: { primer },
  primaryColor: 'primer',
  primaryShade: { light: 7, dark: 3 },
  autoContrast: true,
  luminanceThreshold: 0.3,
  fontFamily: 'Lato, sans-serif',
  fontFamilyMonospace: "'IBM Plex Mono', monospace",
  headings: { fontFamily: 'Lato, sans-serif', fontWeight: '900' },
  defaultRadius: 4,
  black: '#1E262B',
  cursorType: 'pointer',
  respectReducedMotion: true,
});

export const colorSchemeManager = localStorageColorSchemeManager({ key: 'rivetside-scheme' });
