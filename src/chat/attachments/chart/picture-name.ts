/** The name of a picture's file: the vessel in plain letters, nothing that leads elsewhere. */
export function pictureName(vessel: string): string {
  const plain = vessel
    .toLowerCase()
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '');
  return `${plain === '' ? 'vessel' : plain.slice(0, 60)}.png`;
}
