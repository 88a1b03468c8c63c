/** A name as it is compared: letters of any case, with or without accents. */
export function fold(name: string): string {
  return name.normalize('NFKD').replaceAll(/\p{M}/gu, '').toLowerCase().replaceAll(/\s+/g, ' ').trim();
}
