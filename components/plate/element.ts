/** Marks as elements with attributes: the one step that both drawers share. */
import type { Look, Mark, Paint, Pattern, Strength } from './types';

/** An SVG element as data. Attribute names are those of SVG, with hyphens. */
export interface Element {
  readonly tag: 'path' | 'circle' | 'text' | 'g' | 'pattern' | 'defs' | 'svg' | 'title' | 'rect';
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children?: readonly Element[];
  readonly text?: string;
}

/** How a drawer writes paints and strengths: as colours of a theme, or as the page's variables. */
export interface Palette {
  readonly paint: (paint: Exclude<Paint, 'none'>) => string;
  readonly strength: (strength: Strength) => string;
  readonly heat: (safeMoves: number) => string;
}

export const FONT = "'Roboto Slab', Rockwell, serif";

function lookOf(look: Look, palette: Palette): Record<string, string | number> {
  const { fill, stroke, width, dash, cap, join, miter, strength } = look;
  const attributes: Record<string, string | number> = {};
  if (fill !== undefined)
    attributes.fill =
      fill === 'none' ? 'none' : typeof fill === 'string' ? palette.paint(fill) : `url(#${fill.pattern})`;
  if (stroke !== undefined && stroke !== 'none') attributes.stroke = palette.paint(stroke);
  if (width !== undefined) attributes['stroke-width'] = width;
  if (dash !== undefined) attributes['stroke-dasharray'] = dash;
  if (cap !== undefined) attributes['stroke-linecap'] = cap;
  if (join !== undefined) attributes['stroke-linejoin'] = join;
  if (miter !== undefined) attributes['stroke-miterlimit'] = miter;
  if (strength !== undefined) {
    const value =
      typeof strength === 'number'
        ? strength
        : typeof strength === 'string'
          ? palette.strength(strength)
          : palette.heat(strength.heat);
    attributes[stroke !== undefined && fill === undefined ? 'stroke-opacity' : 'fill-opacity'] = value;
  }
  return attributes;
}

const round = (value: number): number => Math.round(value * 100) / 100;

/** The element of a mark. */
export function elementOf(mark: Mark, palette: Palette): Element {
  switch (mark.type) {
    case 'path': {
      const attributes: Record<string, string | number> = { d: mark.d, ...lookOf(mark, palette) };
      if (mark.move)
        attributes.transform = `translate(${round(mark.move.x)} ${round(mark.move.y)}) scale(${Math.round(mark.move.scale * 10000) / 10000})`;
      return { tag: 'path', attributes };
    }
    case 'circle':
      return {
        tag: 'circle',
        attributes: { cx: round(mark.x), cy: round(mark.y), r: round(mark.r), ...lookOf(mark, palette) },
      };
    case 'text': {
      const attributes: Record<string, string | number> = {
        x: round(mark.x),
        y: round(mark.y),
        'font-size': round(mark.size),
        'font-weight': mark.weight,
        fill: palette.paint(mark.fill === 'none' ? 'ink' : mark.fill),
      };
      if (mark.anchor && mark.anchor !== 'start') attributes['text-anchor'] = mark.anchor;
      if (mark.halo)
        Object.assign(attributes, {
          stroke: palette.paint('paper'),
          'stroke-width': mark.halo,
          'stroke-linejoin': 'round',
          'paint-order': 'stroke',
        });
      return { tag: 'text', attributes, text: mark.text };
    }
    case 'group':
      return {
        tag: 'g',
        attributes: mark.statement ? { 'data-statement': mark.statement } : {},
        children: mark.marks.map((child) => elementOf(child, palette)),
      };
  }
}

/** The element of a pattern. */
export function patternElement({ id, size, turned, x, y, marks }: Pattern, palette: Palette): Element {
  const shift = `translate(${round(x)} ${round(y)})`;
  return {
    tag: 'pattern',
    attributes: {
      id,
      width: round(size),
      height: round(size),
      patternUnits: 'userSpaceOnUse',
      patternTransform: turned ? `${shift} rotate(45)` : shift,
    },
    children: marks.map((mark) => elementOf(mark, palette)),
  };
}
