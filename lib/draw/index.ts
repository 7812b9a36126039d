export { paint, paintMark, type PaintOptions, type Surface } from './paint';
export * from './projector';
export { drawLayout, drawSheet, drawSite, joined, type SheetInput } from './sheet';
export { svgDocument, svgNodes, svgText, type SvgNode, type SvgOptions } from './svg';
export * from './themes';
export * from './types';
