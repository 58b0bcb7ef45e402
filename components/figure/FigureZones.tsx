'use client';

import { useRef, useState, type KeyboardEvent } from 'react';
import { figureZones, type FigureView, type ZoneAt } from '@/diagnosis/figure/figure';
import type { ZoneRegion } from '@/diagnosis/figure/mesh';
import { neighbourIndex, type Heading } from '@/diagnosis/figure/neighbour';
import { figurePoint } from '@/diagnosis/figure/point';
import { innerPoint } from '@/diagnosis/figure/polygon';
import type { Proportions } from '@/diagnosis/figure/proportions';
import type { DrawingSpace } from './drawing-space';
import { polygonPath } from './polygon-path';
import { zoneWords } from './zone-words';

type Props = {
  view: FigureView;
  proportions: Proportions;
  space: DrawingSpace;
  selected: readonly ZoneAt[];
  onTapZone: (zone: ZoneAt) => void;
};

const ARROWS: Partial<Record<string, Heading>> = {
  ArrowUp: 'up',
  ArrowDown: 'down',
  ArrowLeft: 'left',
  ArrowRight: 'right',
};

const isSame = (a: ZoneAt, b: ZoneAt) => a.zone === b.zone && a.side === b.side;

/** The zones as buttons. The figure is one stop for Tab; arrows move over the body, Enter or Space chooses. */
export function FigureZones({ view, proportions, space, selected, onTapZone }: Props) {
  const zones = figureZones(view, proportions);
  const [current, setCurrent] = useState(0);
  const buttons = useRef<(SVGPathElement | null)[]>([]);
  const reachable = Math.min(current, zones.length - 1);
  const places = zones.map(({ polygon }) => {
    const { x, y } = innerPoint(polygon);
    return space.place(figurePoint(x, y));
  });

  const handleKey = (event: KeyboardEvent, index: number, region: ZoneRegion) => {
    const heading = ARROWS[event.key];
    if (heading !== undefined) {
      event.preventDefault();
      const next = neighbourIndex(places, index, heading);
      setCurrent(next);
      buttons.current[next]?.focus();
    } else if (event.key === 'Enter' || event.key === ' ') {
      event.preventDefault();
      onTapZone({ zone: region.zone, side: region.side });
    }
  };

  return zones.map((region, index) => {
    const isSelected = selected.some((one) => isSame(one, region));
    return (
      <path
        key={`${region.zone}-${region.side}`}
        ref={(element) => {
          buttons.current[index] = element;
        }}
        className="figure-zone"
        d={polygonPath(region.polygon, space)}
        role="button"
        aria-pressed={isSelected}
        aria-label={zoneWords(region)}
        tabIndex={index === reachable ? 0 : -1}
        onFocus={() => setCurrent(index)}
        onClick={() => onTapZone({ zone: region.zone, side: region.side })}
        onKeyDown={(event) => handleKey(event, index, region)}
      />
    );
  });
}
