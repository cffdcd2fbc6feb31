/** Draws a plate's marks as JSX, in the page's own variables, so that the theme can change without drawing anew. */
import { createElement, type ReactElement, type ReactNode } from 'react';
import { type Element, elementOf, type Palette, patternElement } from './element';
import type { LegendItem, Mark, Plate } from './types';

/** The page's palette: CSS variables of `app/globals.css`. */
export const PAGE_PALETTE: Palette = {
  paint: (paint) => `var(--${paint})`,
  strength: (strength) => `var(--${strength})`,
  heat: (safeMoves) => `calc(0.05 + var(--heat-k) * ${safeMoves})`,
};

const camel = (name: string): string =>
  name.startsWith('data-') || name.startsWith('aria-')
    ? name
    : name.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase());

/** An element tree as JSX. Styles that hold variables are written as style, since attributes cannot hold them everywhere. */
export function jsxOf({ tag, attributes, children, text }: Element, key?: string | number): ReactElement {
  const props: Record<string, unknown> = { key };
  const style: Record<string, string> = {};
  for (const [name, value] of Object.entries(attributes)) {
    if (typeof value === 'string' && value.includes('var(')) style[camel(name)] = value;
    else props[camel(name)] = value;
  }
  if (Object.keys(style).length > 0) props.style = style;
  const content: ReactNode[] = (children ?? []).map((child, index) => jsxOf(child, index));
  return createElement(tag, props, text ?? (content.length > 0 ? content : undefined));
}

/** The patterns and marks of a plate, for an `svg` element of the page. */
export function PlateMarks({ plate }: { readonly plate: Plate }): ReactElement {
  return (
    <>
      <defs>{plate.patterns.map((pattern) => jsxOf(patternElement(pattern, PAGE_PALETTE), pattern.id))}</defs>
      {plate.marks.map((mark, index) => jsxOf(elementOf(mark, PAGE_PALETTE), index))}
    </>
  );
}

/** One figure of the legend. */
export function LegendFigure({ item }: { readonly item: LegendItem }): ReactElement {
  return (
    <svg width={24} height={16} viewBox="0 0 24 16" aria-hidden="true">
      {item.marks.map((mark: Mark, index) => jsxOf(elementOf(mark, PAGE_PALETTE), index))}
    </svg>
  );
}
