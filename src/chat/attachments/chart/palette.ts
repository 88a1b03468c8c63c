/**
 * Colours that people tell apart however they see them. Source: Okabe & Ito, Color Universal Design (2008), from memory.
 * Beside it each sign has a shape of its own, so that no colour says anything alone.
 */
export const PALETTE = {
  black: '#000000',
  sky: '#56B4E9',
  green: '#009E73',
  blue: '#0072B2',
  vermilion: '#D55E00',
  purple: '#CC79A7',
} as const;

/** What is no data: paper, letters, lines that help the eye. */
export const INK = {
  paper: '#FFFFFF',
  text: '#222222',
  aside: '#555555',
  grid: '#E2E2E2',
  strip: '#F5F5F5',
} as const;
