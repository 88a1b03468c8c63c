const SIGNS: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

/**
 * A text as it may stand in XML, between elements or in quotes: signs of markup are spelled out, and what XML forbids
 * altogether (signs that steer, halves of letters) is left out.
 */
export function escapeMarkup(text: string): string {
  return text
    .replaceAll(/\s+/g, ' ')
    .replaceAll(/[\p{Cc}\p{Cs}\p{Cn}]/gu, '')
    .replaceAll(/[&<>"']/g, (sign) => SIGNS[sign] ?? '');
}
