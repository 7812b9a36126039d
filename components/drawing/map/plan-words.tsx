'use client';

import { createElement, memo, type ReactNode } from 'react';
import { svgNodes, THEMES, type DisplayList, type SvgNode, type ThemeName } from '@/lib/draw';
import type { PlanView } from './plan-view';

/**
 * Every word of the plan as SVG text, whose size follows the reader's own text size and whose
 * colours a forced-colours mode may take over. Hidden from assistive technology: the buttons over
 * the pieces say it all, and in order.
 */
export const PlanWords = memo(function PlanWords({
  list,
  view,
  theme,
}: {
  list: DisplayList;
  view: PlanView;
  theme: ThemeName;
}) {
  return (
    <svg
      aria-hidden="true"
      focusable="false"
      width={view.size.x}
      height={view.size.y}
      className="plan-words pointer-events-none absolute left-0 top-0 overflow-visible"
    >
      {svgNodes(list, { projector: view, theme: THEMES[theme] }).map(element)}
    </svg>
  );
});

/** The browser's default text size, which `rem` follows when a reader changes it. */
const PX_PER_REM = 16;

function element({ tag, attributes, children }: SvgNode, key: number): ReactNode {
  const { 'font-size': size, 'font-weight': weight, ...rest } = attributes;
  const inner = typeof children === 'string' ? children : children.map(element);
  if (tag !== 'text') return createElement(tag, { key, ...asReact(rest) }, inner);
  const style = { fontSize: `${Number(size) / PX_PER_REM}rem`, fontWeight: weight };
  return createElement('text', { key, style, ...asReact(rest) }, inner);
}

/** `stroke-width` → `strokeWidth`; data attributes stay as they are. */
const asReact = (attributes: Readonly<Record<string, string | number>>) =>
  Object.fromEntries(
    Object.entries(attributes).map(([name, value]) => [
      name.startsWith('data-')
        ? name
        : name.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase()),
      value,
    ]),
  );
