import type { FigureView } from '../figure/figure';
import type { Side } from '../figure/point';
import type { Sign } from '../garments/schema';
import type { BodyMark } from './body-mark';
import { meetingOf } from './bundle';
import type { ReadFigure } from './read-figure';
import { fitTemplate, landmarksFor, type Fit, type Reason, type Template } from './template-fit';

/** A sign that some marks may be, for the person to take or leave; nothing is evidence until they take it. */
export type Offer = {
  readonly sign: string;
  readonly side: Side | 'both';
  /** The marks that speak for it, strongest first. */
  readonly markIds: readonly string[];
  readonly views: readonly FigureView[];
  /** The strongest of its marks. */
  readonly severity: 1 | 2 | 3;
  /** Natural logarithm of how much likelier the marks are under this sign than as strays. */
  readonly score: number;
  readonly why: readonly Reason[];
};

export const OFFERS_MAX = 7;
/** A mark that no template explains: the person drew a seam, a shadow, or something that is known by no sign. */
const STRAY_SHARE = 0.25;
/** Below a factor of two over a stray a sign is not worth a line on the screen. */
const LEAST_SCORE = Math.log(2);
/** The same place in another view speaks for the same sign once more, but it is the same fold. */
const OTHER_VIEW_SHARE = 0.25;
/** Lines that meet at the sign's own landmark: within this of it, in crotch depths. */
const MEETING_REACH = 0.22;
const MEETING_GAIN = Math.log(1.5);

type Supported = { readonly mark: BodyMark; readonly fit: Fit };
type InView = {
  readonly view: FigureView;
  readonly score: number;
  readonly support: readonly Supported[];
  readonly why: Reason[];
};

function meetingReason(figure: ReadFigure, marks: readonly BodyMark[], template: Template): Reason | null {
  if (marks.length < 2) return null;
  const meeting = meetingOf(marks);
  if (meeting.kind === 'refused') return null;
  const names = [template.target, template.anchor].filter((name) => name !== null);
  const met = names.find((name) =>
    landmarksFor(figure, name, marks[0]!.side).some(
      ({ at }) => Math.hypot(at.x - meeting.point.x, at.y - meeting.point.y) < MEETING_REACH,
    ),
  );
  return met === undefined ? null : { kind: 'meeting', landmark: met, lines: marks.length };
}

function readView(figure: ReadFigure, marks: readonly BodyMark[], sign: Sign, template: Template): InView {
  const fits = marks.map((mark): Supported => ({ mark, fit: fitTemplate(figure, mark, sign, template) }));
  const support = fits.filter(({ fit }) => fit.odds > 1).sort((a, b) => b.fit.odds - a.fit.odds);
  const sum = fits.reduce(
    (total, { fit }) => total + Math.log(STRAY_SHARE + (1 - STRAY_SHARE) * fit.odds),
    0,
  );
  const meeting = meetingReason(
    figure,
    support.map(({ mark }) => mark),
    template,
  );
  const why = [...(support[0]?.fit.reasons ?? []), ...(meeting ? [meeting] : [])];
  return { view: figure.view, score: sum + (meeting ? MEETING_GAIN : 0), support, why };
}

type Read = { readonly sign: Sign; readonly score: number; readonly views: readonly InView[] };

/** One sign over all marks of all views. A sided sign is read over both legs, so that it neither gains nor loses by having sides. */
function readSign(figures: readonly ReadFigure[], marks: readonly BodyMark[], sign: Sign): Read | null {
  const { template } = sign;
  if (template === null) return null;
  const views = figures
    .map((figure) =>
      readView(
        figure,
        marks.filter(({ view }) => view === figure.view),
        sign,
        template,
      ),
    )
    .filter(({ support }) => support.length > 0)
    .sort((a, b) => b.score - a.score);
  if (views.length === 0) return null;
  const others = views.slice(1).reduce((sum, { score }) => sum + Math.max(0, score), 0);
  return { sign, score: views[0]!.score + OTHER_VIEW_SHARE * others, views };
}

function offerOn({ sign, score, views }: Read, side: Side | 'both'): Offer {
  const isOwn = ({ mark }: Supported) => side === 'both' || mark.side === null || mark.side === side;
  const own = views.filter(({ support }) => support.some(isOwn));
  const support = own.flatMap((one) => one.support).filter(isOwn);
  const seen = own.map(({ view }) => view);
  const why = own[0]!.why;
  return {
    sign: sign.id,
    side,
    markIds: support.map(({ mark }) => mark.id),
    views: seen,
    severity: Math.max(...support.map(({ mark }) => mark.severity)) as 1 | 2 | 3,
    score,
    why: seen.length > 1 ? [...why, { kind: 'views', views: seen }] : why,
  };
}

/** One offer, or for a sided sign one on each leg that marks speak for; a mark on the centre line alone leaves it open. */
function offersOf(read: Read): Offer[] {
  if (!read.sign.sided) return [offerOn(read, 'both')];
  const marks = read.views.flatMap(({ support }) => support.map(({ mark }) => mark));
  const sides = (['left', 'right'] as const).filter((side) => marks.some((mark) => mark.side === side));
  return sides.length > 0 ? sides.map((side) => offerOn(read, side)) : [offerOn(read, 'both')];
}

export type OfferOptions = {
  /** `sign side` pairs that the person has said "not this one" to. */
  readonly refused?: ReadonlySet<string>;
  readonly most?: number;
};

export const offerKey = (sign: string, side: Side | 'both') => `${sign} ${side}`;

/**
 * Reads marks as signs: each sign's template is laid on each mark in figure coordinates, and the best few are offered with
 * what speaks for them. A mixture of "this sign" and "a stray" for every mark, so that one odd line neither makes nor breaks
 * a reading. The same place seen in several views is one sign; left and right stay apart. Pins are never read.
 * @param figures the drawn figure of each view that has marks, for this wearer
 * @returns at most `most` offers (7 unless told), best first
 */
export function offerSigns(
  signs: readonly Sign[],
  figures: readonly ReadFigure[],
  marks: readonly BodyMark[],
  { refused = new Set(), most = OFFERS_MAX }: OfferOptions = {},
): Offer[] {
  const read = marks.filter(({ kind }) => kind !== 'pin');
  return signs
    .map((sign) => readSign(figures, read, sign))
    .filter((one) => one !== null && one.score > LEAST_SCORE)
    .flatMap((one) => offersOf(one!))
    .filter(({ sign, side }) => !refused.has(offerKey(sign, side)))
    .sort((a, b) => b.score - a.score || (a.sign < b.sign ? -1 : 1))
    .slice(0, most);
}
