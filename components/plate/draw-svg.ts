/** Draws a plate as the text of an SVG file, in the colours of a theme. */
import { type Element, elementOf, FONT, type Palette, patternElement } from './element';
import { THEME, type ThemeName } from './tokens';
import type { Drawing } from './types';

/** The palette of a theme: colours written out. */
export function themePalette(name: ThemeName): Palette {
  const theme = THEME[name];
  return {
    paint: (paint) => theme.paints[paint],
    strength: (strength) => String(theme.strengths[strength]),
    heat: (safeMoves) => String(Math.round((0.05 + theme.heatStep * safeMoves) * 1000) / 1000),
  };
}

/** The whole file. Every text is escaped; nothing in it runs or fetches. */
export function drawSvg(plate: Drawing, theme: ThemeName): string {
  return write(svgElement(plate, themePalette(theme)));
}

/** The plate as one element tree, title for screen readers included. */
export function svgElement(plate: Drawing, palette: Palette): Element {
  const { width, height } = plate;
  return {
    tag: 'svg',
    attributes: {
      xmlns: 'http://www.w3.org/2000/svg',
      width,
      height,
      viewBox: `0 0 ${width} ${height}`,
      role: 'img',
      'font-family': FONT,
      'aria-label': plate.alt,
    },
    children: [
      { tag: 'title', attributes: {}, text: plate.title },
      { tag: 'defs', attributes: {}, children: plate.patterns.map((pattern) => patternElement(pattern, palette)) },
      { tag: 'rect', attributes: { width: '100%', height: '100%', fill: palette.paint('paper') } },
      ...plate.marks.map((mark) => elementOf(mark, palette)),
    ],
  };
}

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text that is safe in XML: markup escaped, characters that XML forbids left out. */
export function escaped(text: string): string {
  const allowed = [...text].filter((c) => {
    const code = c.codePointAt(0) ?? 0;
    return (
      code === 9 ||
      code === 10 ||
      code === 13 ||
      (code >= 32 && code < 0xd800) ||
      (code > 0xdfff && code !== 0xfffe && code !== 0xffff)
    );
  });
  return allowed.join('').replace(/[&<>"']/g, (character) => ESCAPES[character] ?? character);
}

function write({ tag, attributes, children, text }: Element): string {
  const list = Object.entries(attributes)
    .map(([name, value]) => ` ${name}="${escaped(String(value))}"`)
    .join('');
  if (children === undefined && text === undefined) return `<${tag}${list}/>`;
  return `<${tag}${list}>${text === undefined ? '' : escaped(text)}${(children ?? []).map(write).join('')}</${tag}>`;
}
