'use client';
import { sideWords } from '@/components/reading/words';
import { type Edit, entryKey, type EvidenceState } from '@/components/round/evidence-state';
import type { Sign } from '@/diagnosis/garments/schema';
import { offerKey, type Offer } from '@/diagnosis/photo/offer-signs';
import { OfferAnswer } from './OfferAnswer';
import { whyWords } from './why-words';

interface Props {
  /** Every sign that this view can show, to change an offer into. */
  signs: readonly Sign[];
  names: ReadonlyMap<string, string>;
  offers: readonly Offer[];
  state: EvidenceState;
  onEdit: (edits: Edit[]) => void;
  onRefuse: (key: string) => void;
}

/** What the marks may be, best first: taken, taken as something else, or turned down. Nothing is written until one is taken. */
export function Offers({ signs, names, offers, state, onEdit, onRefuse }: Props) {
  const take = (sign: string, { side, severity }: Offer) =>
    onEdit([{ kind: 'sign', id: sign, side, value: severity }]);
  return (
    <ol className="grid gap-3">
      {offers.map((offer) => {
        const key = offerKey(offer.sign, offer.side);
        const name = `${names.get(offer.sign) ?? offer.sign}${sideWords(offer.side)}`;
        const entry = state.entries[entryKey({ kind: 'sign', id: offer.sign, side: offer.side })];
        const isTaken = entry?.kind === 'sign' && (entry.value ?? 0) > 0;
        return (
          <li key={key} className="grid gap-1 border-l-4 border-chalk bg-paper px-4 py-2">
            <p className="font-bold">{name}</p>
            <p className="text-sm text-graphite">{whyWords(offer.why)}</p>
            <OfferAnswer
              name={name}
              isTaken={isTaken}
              others={signs.filter(({ id }) => id !== offer.sign)}
              onTake={() => take(offer.sign, offer)}
              onTakeBack={() => onEdit([{ kind: 'sign', id: offer.sign, side: offer.side, value: null }])}
              onChange={(other) => {
                take(other, offer);
                onRefuse(key);
              }}
              onRefuse={() => onRefuse(key)}
            />
          </li>
        );
      })}
    </ol>
  );
}
