/**
 * Whether clocks can be told by this name: one of the IANA time zone database, in any case. A bare offset (`+02:00`)
 * is none, as nobody can tell when its clocks are changed.
 *
 * @example
 * ```ts
 * isZone('Europe/Madrid') // => true
 * isZone('+02:00') // => false
 * isZone('Madrid') // => false
 * ```
 */
export function isZone(name: string): boolean {
  if (!/^[A-Za-z]/.test(name)) return false;
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}
