import { Button } from '@/components/ui/Button';
import { SelectField } from '@/components/ui/SelectField';
import type { Sign } from '@/diagnosis/garments/schema';

interface Props {
  name: string;
  isTaken: boolean;
  others: readonly Sign[];
  onTake: () => void;
  onTakeBack: () => void;
  onChange: (sign: string) => void;
  onRefuse: () => void;
}

/** What a person says to one offer. */
export function OfferAnswer({ name, isTaken, others, onTake, onTakeBack, onChange, onRefuse }: Props) {
  if (isTaken)
    return (
      <div className="flex flex-wrap items-center gap-3">
        <p role="status">Taken: it counts in the reading.</p>
        <Button look="quiet" aria-label={`Take it back: ${name}`} onClick={onTakeBack}>
          Take it back
        </Button>
      </div>
    );
  return (
    <div className="flex flex-wrap items-end gap-3">
      <Button aria-label={`Yes, this one: ${name}`} onClick={onTake}>
        Yes, this one
      </Button>
      <Button look="quiet" aria-label={`Not this one: ${name}`} onClick={onRefuse}>
        Not this one
      </Button>
      <SelectField
        className="min-w-0 max-w-72"
        label="It is rather"
        value=""
        onChange={(event) => event.target.value && onChange(event.target.value)}
      >
        <option value="">Choose another</option>
        {others.map((sign) => (
          <option key={sign.id} value={sign.id}>
            {sign.name}
          </option>
        ))}
      </SelectField>
    </div>
  );
}
