import { zoneWords } from '@/components/figure/zone-words';
import { KIND_WORDS, SEVERITY_WORDS } from '@/components/marks/model/mark-text';
import type { BodyMark } from '@/diagnosis/photo/body-mark';

const ofPath = (mark: BodyMark, index: number) => {
  const near = [...mark.closeness].find(([, samples]) => samples[index] === 1);
  return near ? zoneWords({ zone: near[0], side: null }) : null;
};

/**
 * A mark by its place on the body, for ears, search and print: "Tight line from the front fork to the front hip, clear, your
 * left, 56° from plumb".
 */
export function bodyText(mark: BodyMark): string {
  const [from, to] = [ofPath(mark, 0), ofPath(mark, mark.path.length - 1)];
  const place =
    from === null && to === null
      ? 'off the garment'
      : from !== null && to !== null && from !== to
        ? `from the ${from} to the ${to}`
        : `at the ${from ?? to}`;
  const lean = mark.angleDeg === null ? null : Math.round(Math.min(mark.angleDeg, 180 - mark.angleDeg));
  const words = [
    `${KIND_WORDS[mark.kind]} ${place}`,
    SEVERITY_WORDS[mark.severity],
    mark.side === null ? null : `your ${mark.side}`,
    lean === null ? null : `${lean}° from plumb`,
  ];
  return words.filter((word) => word !== null).join(', ');
}
