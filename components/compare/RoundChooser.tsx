import { SelectField } from '@/components/ui/SelectField';
import { Button } from '@/components/ui/Button';

interface Props {
  numbers: number[];
  a: number;
  b: number;
}

/** Which two rounds: a plain form, so that it works at once and has an address. */
export function RoundChooser({ numbers, a, b }: Props) {
  const options = numbers.map((number) => (
    <option key={number} value={number}>
      Round {number}
    </option>
  ));
  return (
    <form className="no-print flex flex-wrap items-end gap-3">
      <SelectField className="w-36" label="Before" name="a" defaultValue={a}>
        {options}
      </SelectField>
      <SelectField className="w-36" label="After" name="b" defaultValue={b}>
        {options}
      </SelectField>
      <Button type="submit">Lay side by side</Button>
    </form>
  );
}
