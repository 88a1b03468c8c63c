import { expect, test } from 'vitest';
import type { Happening } from '../../../src/core/cellar/entry.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';
import { logOf, vesselsOf } from './log-of.ts';

const read = (more: object): Happening => ({ kind: 'reading', vessels: ['tank 4'], ...more });
const add = (more: object): Happening => ({ kind: 'addition', vessels: ['tank 4'], mass_g: 250, ...more });
const event = (name: string, more: object = {}): Happening =>
  ({ kind: 'vessel', event: name, vessels: ['tank 4'], ...more }) as Happening;
const WHOLE = read({ ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red' });

/** What is known at the end, as plain values. */
function knownOf(vessel: Vessel | undefined): object {
  if (vessel === undefined) return { unknown: true };
  const { ph, free_mg_L, total_mg_L, volume_L, traits, voided, empty, unlanded } = vessel;
  const values = { ph, free_mg_L, total_mg_L, volume_L, style: traits.style, stage: traits.stage };
  const told = Object.entries(values).flatMap(([name, known]) => (known ? [[name, known.value]] : []));
  const gone = Object.entries(voided).map(([name, why]) => [`no_${name}`, why.event]);
  return Object.fromEntries([
    ...told,
    ...gone,
    ...(empty === undefined ? [] : [['empty', true]]),
    ...(unlanded.length > 0 ? [['unlanded', unlanded.length]] : []),
  ]);
}

test.each<[title: string, log: Happening[], tank4: object, tank9?: object]>([
  ['a reading tells what it has', [WHOLE], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red' }],
  ['a later reading changes what it has and no more', [WHOLE, read({ free_mg_L: 30 })], { ph: 3.58, free_mg_L: 30, total_mg_L: 60, volume_L: 5200, style: 'red' }],
  ['an addition has not landed', [WHOLE, add({})], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red', unlanded: 1 }],
  ['a pH alone is no landing', [WHOLE, add({}), read({ ph: 3.6 })], { ph: 3.6, free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red', unlanded: 1 }],
  ['racking makes the volume void', [WHOLE, event('racked')], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, style: 'red', no_volume_L: 'racked' }],
  ['racking with its volume tells it', [WHOLE, event('racked', { volume_L: 5000 })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 5000, style: 'red' }],
  ['topping makes the volume void', [WHOLE, event('topped', { volume_L: 20 })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, style: 'red', no_volume_L: 'topped' }],
  ['an acid makes the pH void', [WHOLE, event('acid')], { free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red', no_ph: 'acid' }],
  ['going into malolactic makes the pH void', [WHOLE, event('told', { stage: 'malolactic' })], { free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red', stage: 'malolactic', no_ph: 'malolactic' }],
  ['a pH told with the end of malolactic is of the wine after it', [event('told', { stage: 'malolactic' }), read({ ph: 3.7, stage: 'finished' })], { ph: 3.7, stage: 'finished' }],
  ['finished told of wine that was in no malolactic leaves the pH', [WHOLE, event('told', { stage: 'finished' })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 5200, style: 'red', stage: 'finished' }],
  ['emptied, nothing of the wine is known', [WHOLE, event('emptied')], { empty: true }],
  ['a reading after it is of another wine', [WHOLE, event('emptied'), read({ free_mg_L: 12 })], { free_mg_L: 12 }],
  ['forgotten', [WHOLE, event('forgotten')], { unknown: true }],
  ['moved whole, all goes along but the volume', [WHOLE, event('moved', { to: 'tank 9' })], { empty: true }, { ph: 3.58, free_mg_L: 21, total_mg_L: 60, style: 'red', no_volume_L: 'moved' }],
  ['a part moved leaves the rest', [WHOLE, event('moved', { to: 'tank 9', volume_L: 2000 })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 3200, style: 'red' }, { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 2000, style: 'red' }],
  ['more moved than there was leaves a volume that nobody knows', [WHOLE, event('moved', { to: 'tank 9', volume_L: 6000 })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, style: 'red', no_volume_L: 'moved' }, { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 6000, style: 'red' }],
  ['an addition that has not landed goes along', [WHOLE, add({}), event('moved', { to: 'tank 9' })], { empty: true }, { ph: 3.58, free_mg_L: 21, total_mg_L: 60, style: 'red', no_volume_L: 'moved', unlanded: 1 }],
  ['a move into wine is a blend', [WHOLE, { ...WHOLE, vessels: ['tank 9'], ph: 3.4, volume_L: 1000 } as Happening, event('moved', { to: 'tank 9' })], { empty: true }, { volume_L: 6200, style: 'red', no_ph: 'blended' }],
  ['a blend of two colours has none', [WHOLE, { ...WHOLE, vessels: ['tank 9'], style: 'white' } as Happening, event('blended', { to: 'tank 9', volume_L: 500 })], { ph: 3.58, free_mg_L: 21, total_mg_L: 60, volume_L: 4700, style: 'red' }, { volume_L: 5700, no_ph: 'blended' }],
])('%s', (_title, log, tank4, tank9) => {
  const vessels = vesselsOf(logOf(...log));
  expect(knownOf(vessels.get('tank 4'))).toEqual(tank4);
  expect(knownOf(vessels.get('tank 9'))).toEqual(tank9 ?? { unknown: true });
}); // prettier-ignore

test.each([
  { title: 'all of it free', after: 51, share: 0 },
  { title: 'a third bound', after: 41, share: 1 / 3 },
  { title: 'all of it bound', after: 21, share: 1 },
  { title: 'more free than went in, which no wine does', after: 60, share: -0.3 },
])('a landing: $title', ({ after, share }) => {
  const log = logOf(WHOLE, add({ added_mg_L: 20 }), add({ added_mg_L: 10, planned_free_mg_L: 48 }), read({ free_mg_L: after }));
  const [landing] = vesselsOf(log).get('tank 4')?.landings ?? [];
  expect(landing?.bound_share).toBeCloseTo(share, 12);
  expect(landing).toMatchObject({ additions: [2, 3], added_mg_L: 30, before_mg_L: 21, after_mg_L: after, planned_free_mg_L: 48 });
}); // prettier-ignore

test('an addition whose mg/L nobody knows has no landing, and is landed all the same', () => {
  const vessel = vesselsOf(logOf(WHOLE, add({}), read({ free_mg_L: 40 }))).get('tank 4');
  expect(vessel?.landings).toEqual([]);
  expect(vessel?.unlanded).toEqual([]);
});

test('barrels that share an addition get an equal part each', () => {
  const vessels = vesselsOf(logOf(add({ vessels: ['B1', 'B2'], mass_g: 24, added_mg_L: 30, volume_L: 450 })));
  expect(vessels.get('B2')?.additions).toMatchObject([{ mass_g: 12, added_mg_L: 30, volume_L: 225 }]);
});

test('an order is open until an addition carries it out', () => {
  const order: Happening = { kind: 'order', vessels: ['tank 4'], mass_g: 256 };
  const open = vesselsOf(logOf(order, add({}))).get('tank 4');
  expect(open?.orders).toMatchObject([{ entry: 1, mass_g: 256 }]);
  expect(vesselsOf(logOf(order, add({ order: 1 }))).get('tank 4')?.orders).toEqual([]);
});

test('what a vessel keeps does not grow with the log', () => {
  const many = Array.from({ length: 300 }, (_, k) => [
    add({ added_mg_L: 10 }),
    read({ free_mg_L: 20 + (k % 3) }),
  ]);
  const vessel = vesselsOf(logOf(WHOLE, ...many.flat())).get('tank 4');
  expect(JSON.stringify(vessel).length).toBeLessThan(8000);
  expect(vessel?.readings.length).toBe(12);
});
