import { lengthOf, parameterAtLength, pointAt, zerosOf } from './geometry/cubic';
import type { XY } from './geometry/xy';
import { hasPoint, indexOfPoint, splitPart, type Piece, type Station } from './piece';

/** A joint nearer than this, mm, is used instead of cutting a sliver off. */
const SNAP_MM = 1e-6;

interface Where {
  readonly index: number;
  readonly t: number;
}

function whereCrossed(piece: Piece, edge: string, axis: 'x' | 'y', at: number): Where {
  for (const [index, one] of piece.parts.entries()) {
    if (one.edge !== edge) continue;
    const [t] = zerosOf(one.cubic, (point) => point[axis] - at);
    if (t !== undefined) return { index, t };
  }
  throw new RangeError(`the ${edge} of the ${piece.id} does not pass ${axis} = ${at.toFixed(1)} mm`);
}

function whereAlong(piece: Piece, edge: string, mm: number): Where {
  let left = mm;
  let last = -1;
  for (const [index, one] of piece.parts.entries()) {
    if (one.edge !== edge) continue;
    const length = lengthOf(one.cubic);
    if (left <= length) return { index, t: parameterAtLength(one.cubic, left) };
    left -= length;
    last = index;
  }
  if (last === -1) throw new RangeError(`the ${piece.id} has no edge ${edge}`);
  if (left > SNAP_MM)
    throw new RangeError(`the ${edge} of the ${piece.id} is ${left.toFixed(1)} mm too short`);
  return { index: last, t: 1 };
}

/** Reads points of an edge by millimetres along it; lengths are measured once. Beyond its ends, the nearest end. */
export function edgeReader(piece: Piece, edge: string): (mm: number) => XY {
  const parts = piece.parts
    .filter((one) => one.edge === edge)
    .map(({ cubic }) => ({ cubic, mm: lengthOf(cubic) }));
  return (mm) => {
    let left = mm;
    for (const [index, { cubic, mm: length }] of parts.entries()) {
      if (left <= length || index === parts.length - 1)
        return pointAt(cubic, parameterAtLength(cubic, left, length));
      left -= length;
    }
    throw new RangeError(`the ${piece.id} has no edge ${edge}`);
  };
}

/**
 * The piece with a joint at the station, and the index of the part that begins there. The shape does not change.
 * @throws RangeError when the outline has no such place.
 */
export function cutAt(piece: Piece, station: Station): { piece: Piece; index: number } {
  if ('point' in station) return { piece, index: indexOfPoint(piece, station.point) };
  const { index, t } = locate(piece, station);
  return cutPart(piece, index, t);
}

function locate(piece: Piece, station: Exclude<Station, { point: string }>): Where {
  const { edge } = station;
  if ('mm' in station) return whereAlong(piece, edge, station.mm);
  return 'y' in station
    ? whereCrossed(piece, edge, 'y', station.y)
    : whereCrossed(piece, edge, 'x', station.x);
}

/** As {@link cutAt}, at parameter `t` of the part at `index`. */
export function cutPart(piece: Piece, index: number, t: number): { piece: Piece; index: number } {
  const { cubic } = piece.parts[index]!;
  if (lengthOf(cubic, 0, t) < SNAP_MM) return { piece, index };
  if (lengthOf(cubic, t, 1) < SNAP_MM) return { piece, index: (index + 1) % piece.parts.length };
  return { piece: splitPart(piece, index, t), index: index + 1 };
}

/** The piece with a name given to a station, so that it can be found again after the outline has moved. A name already given stays. */
export function withPoint(piece: Piece, name: string, station: Station): Piece {
  if (hasPoint(piece, name)) return piece;
  const { piece: cut, index } = cutAt(piece, station);
  if (cut.parts[index]!.start !== undefined) throw new RangeError(`${name} falls on a point that has a name`);
  return { ...cut, parts: cut.parts.map((one, at) => (at === index ? { ...one, start: name } : one)) };
}

/** The place on paper of a station. */
export function stationPoint(piece: Piece, station: Station): XY {
  const { piece: cut, index } = cutAt(piece, station);
  return cut.parts[index]!.cubic.from;
}
