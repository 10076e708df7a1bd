/** Where a figure is drawn: on the light or the dark page of the screen, or on white paper. */
export type FigureTheme = 'light' | 'dark' | 'print';

/** Colours of a figure. `levels` run from pale to dark for ordered groups. */
export interface FigureColours {
  readonly ink: string;
  readonly secondInk: string;
  readonly line: string;
  readonly page: string;
  readonly categories: readonly string[];
  readonly levels: readonly string[];
}

const LIGHT: FigureColours = {
  ink: '#17211F',
  secondInk: '#4A524D',
  line: '#D0CABB',
  page: '#FFFEFA',
  categories: ['#1B6E5F', '#E6B24C', '#4F2750', '#7E9CC9'],
  levels: ['#CFE3D6', '#9CC6B3', '#5F9F8C', '#2B7465', '#0D4239'],
};

/**
 * The colours of each theme. Every pair of neighbours differs in lightness, so that figures also
 * read in grey; bars have an edge in ink besides.
 */
export const FIGURE_COLOURS: Readonly<Record<FigureTheme, FigureColours>> = {
  light: LIGHT,
  dark: {
    ink: '#ECE8DD',
    secondInk: '#B6BCB4',
    line: '#35403E',
    page: '#212B2A',
    categories: ['#5FB59F', '#F6D68A', '#7A4B84', '#6585BC'],
    levels: ['#24504A', '#3A7A6C', '#5FA591', '#93CBB8', '#D5EDE2'],
  },
  print: { ...LIGHT, line: '#C9C9C4', page: '#FFFFFF' },
};
