'use client';
import { type ReactNode, useState } from 'react';
import { Tick } from '@/components/ui/Tick';
import type { CutChoices } from '@/db/queries/cuts';
import { type CutEdit, useCutEdit } from './CutEdits';

interface Props {
  list: 'altered' | 'leftOut' | 'ticked';
  id: string;
  isOn: boolean;
  /** The tick means that the id is not in the list. */
  isTurned?: boolean;
  label: ReactNode;
}

/** The list with or without an id; the ids come from lists of our own, and the server holds them to it. */
const listed = (now: CutChoices, list: Props['list'], id: string, isIn: boolean): CutEdit => {
  const rest = now[list].filter((one) => one !== id);
  return { [list]: isIn ? [...rest, id] : rest };
};

/** One tick of a kept list. */
export function ListTick({ list, id, isOn, isTurned = false, label }: Props) {
  const edit = useCutEdit();
  const [shown, setShown] = useState(isOn);
  return (
    <Tick
      label={label}
      checked={shown}
      onChange={(event) => {
        const next = event.target.checked;
        setShown(next);
        edit((now) => listed(now, list, id, isTurned ? !next : next));
      }}
    />
  );
}
