import { createElement, type ReactNode } from 'react';
import {
  svgNodes,
  THEMES,
  type DisplayList,
  type Layer,
  type Projector,
  type SvgNode,
  type Theme,
  type ThemeName,
} from '@/lib/draw';

/** A display list as SVG elements, for wherever no canvas is wanted: paper, previews, pictures. */
export function PlanShapes({
  list,
  projector,
  theme,
  layers,
}: {
  list: DisplayList;
  projector: Projector;
  /** A theme by name, or inks of one's own. */
  theme: ThemeName | Theme;
  layers?: readonly Layer[];
}) {
  return svgNodes(list, {
    projector,
    theme: typeof theme === 'string' ? THEMES[theme] : theme,
    layers,
  }).map(elementOf);
}

function elementOf({ tag, attributes, children }: SvgNode, key: number): ReactNode {
  return createElement(
    tag,
    { key, ...asReact(attributes) },
    typeof children === 'string' ? children : children.map(elementOf),
  );
}

/** `stroke-width` → `strokeWidth`; data attributes stay as they are. */
const asReact = (attributes: SvgNode['attributes']) =>
  Object.fromEntries(
    Object.entries(attributes).map(([name, value]) => [
      name.startsWith('data-')
        ? name
        : name.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase()),
      value,
    ]),
  );
