/** The colours of the house, by day and by night. `app/globals.css` carries the same values; a test compares. */
export const TOKENS = {
  paper: { light: '#fbf8f1', night: '#0f1c24' },
  panel: { light: '#f4eedf', night: '#152733' },
  ink: { light: '#14242e', night: '#e8e4d8' },
  soft: { light: '#4a5c66', night: '#a9b6bb' },
  rule: { light: '#d8d0bd', night: '#2b414d' },
  'water-1': { light: '#e3eef1', night: '#17323f' },
  'water-2': { light: '#bfd9e2', night: '#1f4a5e' },
  'water-3': { light: '#86b5c8', night: '#2f7391' },
  'water-4': { light: '#3f7f9c', night: '#6fb3cd' },
  'water-5': { light: '#164d6b', night: '#a5d6e8' },
  land: { light: '#ecdfbe', night: '#3a3524' },
  caution: { light: '#9c2463', night: '#f08dbf' },
  'caution-tint': { light: '#f7e4ee', night: '#3a1c2d' },
} as const;

export type TokenName = keyof typeof TOKENS;
export type Theme = 'light' | 'night';
/** `auto` follows the reader's own setting. */
export type ThemeChoice = Theme | 'auto';
export const THEME_CHOICES: readonly ThemeChoice[] = ['auto', 'light', 'night'];

export const TEXT_PX = { small: 13, body: 15, lead: 18, heading: 24, title: 34 } as const;

/** Every pair of text colour and ground the interface uses; each reaches 4.5:1. */
export const TEXT_PAIRS: readonly (readonly [text: TokenName, ground: TokenName])[] = [
  ['ink', 'paper'],
  ['ink', 'panel'],
  ['ink', 'caution-tint'],
  ['ink', 'water-1'],
  ['ink', 'water-2'],
  ['soft', 'paper'],
  ['soft', 'panel'],
  ['soft', 'caution-tint'],
  ['caution', 'paper'],
  ['caution', 'panel'],
  ['caution', 'caution-tint'],
  ['paper', 'ink'],
  ['paper', 'soft'],
  ['paper', 'caution'],
  ['water-5', 'paper'],
];

/**
 * Every mark that carries meaning, on each ground it can lie on; each reaches 3:1. Pale bands and land carry
 * none by their fill: their edge lines and the shore line do.
 */
export const MARK_PAIRS: readonly (readonly [mark: TokenName, ground: TokenName])[] = [
  ['ink', 'paper'],
  ['ink', 'land'],
  ['ink', 'water-1'],
  ['ink', 'water-2'],
  ['ink', 'water-3'],
  ['soft', 'paper'],
  ['soft', 'panel'],
  ['water-4', 'paper'],
  ['water-4', 'land'],
  ['water-4', 'water-1'],
  ['water-5', 'paper'],
  ['water-5', 'panel'],
  ['water-5', 'water-1'],
  ['water-5', 'water-2'],
  ['water-5', 'water-3'],
  ['caution', 'paper'],
  ['caution', 'land'],
  ['caution', 'water-1'],
  ['caution', 'water-2'],
  ['caution', 'caution-tint'],
];
