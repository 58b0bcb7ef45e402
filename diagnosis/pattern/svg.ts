import type { PieceDrawing } from './drawing';

const escaped = (text: string) =>
  text.replace(/[&<>"]/g, (sign) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' })[sign]!);

/**
 * The whole piece as an SVG document at full size: one unit is one millimetre, so that it prints to scale. Stitching line,
 * cutting line, what it was before, darts and grain; the title says what it is.
 */
export function svgDocument(drawing: PieceDrawing, title: string): string {
  const { x, y, width, height } = drawing.whole;
  const path = (d: string, look: string) => (d ? `<path d="${d}" fill="none" ${look}/>` : '');
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width.toFixed(1)}mm" height="${height.toFixed(1)}mm" viewBox="${[x, y, width, height].map((value) => value.toFixed(2)).join(' ')}">`,
    `<title>${escaped(title)}</title>`,
    path(drawing.cutting, 'stroke="#555" stroke-width="0.4"'),
    path(drawing.before, 'stroke="#999" stroke-width="0.4" stroke-dasharray="4 3"'),
    path(drawing.after, 'stroke="#000" stroke-width="0.6"'),
    path(drawing.darts, 'stroke="#000" stroke-width="0.4"'),
    path(drawing.notches, 'stroke="#000" stroke-width="0.4"'),
    path(drawing.grain, 'stroke="#000" stroke-width="0.4"'),
    '</svg>',
  ].join('\n');
}
