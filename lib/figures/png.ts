/** An SVG figure as a PNG, with the fonts that the project ships. */
import { join } from 'node:path';
import { Resvg } from '@resvg/resvg-js';

/** Widest PNG that is drawn, px. */
export const PNG_WIDTH_MAX = 4000;

const FACES = [
  '300Light/RobotoSlab_300Light',
  '400Regular/RobotoSlab_400Regular',
  '500Medium/RobotoSlab_500Medium',
  '700Bold/RobotoSlab_700Bold',
];
let fontFiles: readonly string[] | undefined;

/** The bytes of a PNG, `width` pixels wide at most PNG_WIDTH_MAX; the height follows. */
export function pngOf(svg: string, width: number): Uint8Array {
  fontFiles ??= FACES.map((face) =>
    join(/*turbopackIgnore: true*/ process.cwd(), 'node_modules/@expo-google-fonts/roboto-slab', `${face}.ttf`),
  );
  const drawing = new Resvg(svg, {
    fitTo: { mode: 'width', value: Math.min(PNG_WIDTH_MAX, Math.round(width)) },
    font: { fontFiles: [...fontFiles], loadSystemFonts: false, defaultFontFamily: 'Roboto Slab' },
  });
  return drawing.render().asPng();
}
