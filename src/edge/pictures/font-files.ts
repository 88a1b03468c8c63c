import { createRequire } from 'node:module';

/** The font of pictures: it comes with the program, as a machine may have none, and then every label would vanish. */
export function fontFiles(): string[] {
  const { resolve } = createRequire(import.meta.url);
  return [resolve('@expo-google-fonts/noto-sans/400Regular/NotoSans_400Regular.ttf')];
}
