/**
 * Whether a vessel is a barrel by its name: `barrel 17`, or a code of B and a number.
 *
 * Source: common practice, no source.
 *
 * @example
 * ```ts
 * isBarrel('barrel 17') // => true
 * isBarrel('B12') // => true
 * isBarrel('tank B') // => false
 * ```
 */
export function isBarrel(vessel: string): boolean {
  return /^(barrel |B\d)/.test(vessel);
}
