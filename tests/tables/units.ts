/** Exact definitions (from memory) and conversions that a source prints (read). */
export const UNIT_DEFINITIONS = [
  { source: 'NIST Handbook 44, US gallon (from memory, exact)', from: 'galUS', to: 'L', factor: 3.785411784 },
  {
    source: 'UK Weights and Measures Act, imperial gallon (from memory, exact)',
    from: 'galUK',
    to: 'L',
    factor: 4.54609,
  },
  { source: 'international pound (from memory, exact)', from: 'lb', to: 'g', factor: 453.59237 },
  { source: 'international ounce (from memory, exact)', from: 'oz', to: 'g', factor: 28.349523125 },
] as const;

/** What was read in print, with as many digits as it prints. */
export const PRINTED_CONVERSIONS = [
  { source: '27 CFR 24.246, gum arabic row (read)', value: 0.002, from: 'lb/galUS', mg_L: 240, half: 5 },
  {
    source: 'handout on bench trials, author not named (read, not citable)',
    value: 0.001,
    from: 'lb/galUS',
    mg_L: 120,
    half: 0.5,
  },
  {
    source:
      'Practical Winery & Vineyard, Jan/Feb 2009, p. 6 (read; 50 g/L is 6.68 oz a gallon, printed as 7)',
    value: 7,
    from: 'oz/galUS',
    mg_L: 50_000,
    half: 3745,
  },
] as const;
