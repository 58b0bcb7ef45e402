/** A place on the photo in nine words, as one would point at it: "upper left", "middle". */
export function placeWords({ x, y }: { x: number; y: number }): string {
  const row = y < 1 / 3 ? 'upper' : y < 2 / 3 ? 'middle' : 'lower';
  const column = x < 1 / 3 ? 'left' : x < 2 / 3 ? 'centre' : 'right';
  return row === 'middle' && column === 'centre' ? 'middle' : `${row} ${column}`;
}
