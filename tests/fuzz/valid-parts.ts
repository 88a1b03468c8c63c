import fc from 'fast-check';

/** A number as a person may write it: with a point or a comma, grouped, with blanks, sometimes absurd. */
const numeral: fc.Arbitrary<string> = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: 0, max: 3000 }).map(String) },
  {
    weight: 6,
    arbitrary: fc
      .tuple(fc.integer({ min: 0, max: 99 }), fc.constantFrom('.', ','), fc.integer({ min: 0, max: 99 }))
      .map(([whole, mark, rest]) => `${whole}${mark}${rest}`),
  },
  {
    weight: 2,
    arbitrary: fc
      .tuple(fc.integer({ min: 1, max: 99 }), fc.constantFrom(',', '.', ' ', '\u00a0', '\u202f', "'"))
      .map(([whole, mark]) => `${whole}${mark}200`),
  },
  {
    weight: 1,
    arbitrary: fc.constantFrom(
      '-5',
      '0',
      '1e9',
      '½',
      '1 1/2',
      '1/3',
      '18-20',
      '3. 61',
      '99999999999',
      '0.0000001',
    ),
  },
);

/** Decimals in the range of a wine's pH, and a little beyond. */
const ph = fc.integer({ min: 230, max: 500 }).map((hundredths) => (hundredths / 100).toFixed(2));
const small = fc.integer({ min: 0, max: 80 }).map(String);

const part = (number: fc.Arbitrary<string>, ...forms: string[]): fc.Arbitrary<string> =>
  fc.tuple(number, fc.constantFrom(...forms)).map(([value, form]) => form.replace('#', value));

/** One part of a message that means something on its own. */
export const validPart: fc.Arbitrary<string> = fc.oneof(
  part(
    small,
    'T#',
    'tank #',
    'barrel #',
    'FV#',
    'cuve #',
    'depósito #',
    'B1-B#',
    'barrels 2 to #',
    '# barrels',
  ),
  part(
    numeral,
    '# gal',
    '# L',
    '# hl',
    '#k L',
    '# m3',
    '# imp gal',
    '# litros',
    '# x 225 L',
    'Fass # l',
    '# bbl',
  ),
  part(ph, 'pH #', 'ph#', '# pH', 'pH=#', '#', 'pH-#'),
  part(
    small,
    'free #',
    '# free',
    'fSO2 # ppm',
    'FSO2: # mg/L',
    'libre #',
    '#/60',
    'SO2 #',
    '# ppm',
    '#',
    'F # T 60',
  ),
  part(numeral, 'total #', 'TSO2 #', 'TA #', 'VA #', 'RS # g/L', '# %', '# g/hl', "'#", '#°', 'Brix #'),
  part(small, '#C', '# °C', '#F', 'alc #', '#% vol', 'temp #'),
  fc.constantFrom('red', 'white', 'rosé', 'sweet', 'sparkling', 'port', 'cider', 'organic', 'tinto', 'blanc'),
  fc.constantFrom(
    'must',
    'fermenting',
    'ML done',
    'no ML',
    'ML bugs tomorrow',
    'base wine',
    'bottled',
    'Most',
  ),
  part(
    numeral,
    'kmbs',
    'smbs',
    '#% kmbs',
    '#% so2',
    'KHSO3 # g/L',
    'campden',
    '# campden 0.44 g potassium',
    '# g tabs',
    'SO2 gas',
    'sulfites',
    'sulfate',
    'NH4HSO3 #%',
    'meta',
    'sulfurous acid #%',
    'kmbs #%',
  ),
  part(
    numeral,
    'target #',
    'to # ppm',
    '-> #',
    '# molecular',
    'mol #',
    'add # ppm',
    '+# ppm',
    'up #',
    'up to #',
  ),
  part(small, '+#%', '#% bind', 'no binding', '1/3 binds', 'half gets bound', 'from 18 to #', 'needs # ppm'),
  part(
    numeral,
    '# g',
    '# kg',
    '# lb',
    '# oz',
    '# mL',
    '# g per 10 L kmbs',
    '# lb/1000 gal kmbs',
    '# tsp',
    '# G',
  ),
  fc.constantFrom(
    'added',
    'reading',
    'now',
    'measured',
    'done',
    'not added',
    'if I added',
    'ajouté',
    'zugegeben',
  ),
  fc.constantFrom(
    'to make 5 L of 10% kmbs',
    'holding solution',
    'soak',
    'how much?',
    '?',
    'help',
    'thanks',
    'hi',
  ),
  fc.constantFrom(
    'gas leak',
    'eyes',
    'in my eyes',
    'went in the tank and doesnt answer',
    'swallowed',
    'collapsed',
  ),
);
