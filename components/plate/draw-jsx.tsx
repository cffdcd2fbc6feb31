/** Draws a plate's marks as JSX, in the page's own variables, so that the theme can change without drawing anew. */
import { createElement, memo, type ReactElement, type ReactNode } from 'react';
import { type Element, elementOf, type Palette, patternElement } from './element';
import type { Drawing, LegendItem, Mark } from './types';

/** The page's palette: CSS variables of `app/globals.css`. */
export const PAGE_PALETTE: Palette = {
  paint: (paint) => `var(--${paint})`,
  strength: (strength) => `var(--${strength})`,
  heat: (safeMoves) => `calc(0.05 + var(--heat-k) * ${safeMoves})`,
};

const camelNames = new Map<string, string>();

/** The name of an attribute as React has it. */
function camel(name: string): string {
  let found = camelNames.get(name);
  if (found === undefined) {
    const keeps = name.startsWith('data-') || name.startsWith('aria-');
    found = keeps ? name : name.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase());
    camelNames.set(name, found);
  }
  return found;
}

/** An element tree as JSX. Variables stand in presentation attributes, which are CSS values (SVG 2, section 6.6). */
export function jsxOf({ tag, attributes, children, text }: Element, key?: string | number): ReactElement {
  const props: Record<string, unknown> = { key };
  for (const name in attributes) props[camel(name)] = attributes[name];
  const content: ReactNode[] | undefined = children?.map((child, index) => jsxOf(child, index));
  return createElement(tag, props, text ?? (content && content.length > 0 ? content : undefined));
}

type GroupMark = Extract<Mark, { type: 'group' }>;

/** A group that is drawn anew only when its stamp is another. */
const StampedGroup = memo(
  ({ mark }: { readonly mark: GroupMark }) => <g>{jsxOfMarks(mark.marks)}</g>,
  (before, after) => before.mark.stamp === after.mark.stamp,
);
StampedGroup.displayName = 'StampedGroup';

/** Marks as JSX; groups keep their keys, stamped ones what they were. */
function jsxOfMarks(marks: readonly Mark[]): ReactNode[] {
  return marks.map((mark, index) => {
    if (mark.type !== 'group') return jsxOf(elementOf(mark, PAGE_PALETTE), index);
    const key = mark.key ?? mark.statement ?? index;
    if (mark.stamp !== undefined) return <StampedGroup key={key} mark={mark} />;
    return (
      <g key={key} data-statement={mark.statement}>
        {jsxOfMarks(mark.marks)}
      </g>
    );
  });
}

/** The patterns and marks of a plate, for an `svg` element of the page. */
export function PlateMarks({ plate }: { readonly plate: Pick<Drawing, 'patterns' | 'marks'> }): ReactElement {
  return (
    <>
      <defs>{plate.patterns.map((pattern) => jsxOf(patternElement(pattern, PAGE_PALETTE), pattern.id))}</defs>
      {jsxOfMarks(plate.marks)}
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
