// Colours by meaning and line types, read by the page, the canvas and the paper alike.

export interface Palette {
  readonly board: string;
  readonly paper: string;
  readonly ink: string;
  readonly inkSoft: string;
  readonly rule: string;
  readonly petrol: string;
  readonly onPetrol: string;
  readonly tape: string;
  readonly air: string;
  readonly mass: string;
  readonly control: string;
  readonly good: string;
  readonly watch: string;
  readonly bad: string;
}

export const light: Palette = {
  board: '#EFF3F0',
  paper: '#FFFFFF',
  ink: '#16211D',
  inkSoft: '#51605A',
  rule: '#D3DCD6',
  petrol: '#0D5C5C',
  onPetrol: '#FFFFFF',
  tape: '#E5520C',
  air: '#2450C4',
  mass: '#8F5200',
  control: '#7339AC',
  good: '#187645',
  watch: '#9A5B00',
  bad: '#B8261A',
};

export const dark: Palette = {
  board: '#121A17',
  paper: '#1A2420',
  ink: '#E9F0EC',
  inkSoft: '#A3B3AB',
  rule: '#34423B',
  petrol: '#6CC4BE',
  onPetrol: '#0B1B1A',
  tape: '#FF8A4D',
  air: '#8FB0FF',
  mass: '#E0A85A',
  control: '#C79BF2',
  good: '#6CCB95',
  watch: '#E5B25C',
  bad: '#FF9186',
};

/** Spacing between lines of the 4 px grid, and the radius of a cut edge. */
export const GRID_PX = 4;
export const RADIUS_PX = 3;
