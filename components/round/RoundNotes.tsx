'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Section } from '@/components/ui/Section';
import { TextArea } from '@/components/ui/TextArea';
import type { DeskRoundDto } from '@/db/queries/desk';

interface Props {
  round: DeskRoundDto;
  isOwner: boolean;
}

/** What the wearer felt, in their own words, and the sentence that ends the work: it hangs clean. */
export function RoundNotes({ round, isOwner }: Props) {
  const router = useRouter();
  const [note, setNote] = useState(round.note);
  const [version, setVersion] = useState(round.version);
  const [isClean, setClean] = useState(round.hangsCleanAt !== null);
  const [words, setWords] = useState('');
  const save = async (edit: { note?: string; hangsClean?: boolean }) => {
    const sent = await sendJson<{ version: number }>('PATCH', `/api/rounds/${round.id}`, {
      version,
      ...edit,
    });
    setWords(sent.ok ? 'Saved' : sent.problem.message);
    if (!sent.ok) return;
    setVersion(sent.value.version);
    if (edit.hangsClean !== undefined) setClean(edit.hangsClean);
    router.refresh();
  };
  if (!isOwner) return round.note ? <Section title="Notes">{round.note}</Section> : null;
  return (
    <Section title="Notes">
      <TextArea
        label="What it felt like to walk, sit and bend"
        value={note}
        maxLength={4000}
        onChange={(event) => setNote(event.target.value)}
        onBlur={() => note !== round.note && void save({ note })}
      />
      <p className="max-w-prose text-sm text-graphite">
        A round hangs clean when no tight line is above faint and no slack fold above clear in two of three
        standing photos, and sitting, bending and a step show nothing pulling. Folds that vanish when you move
        may stay.
      </p>
      <div className="flex flex-wrap items-center gap-4">
        <Button aria-pressed={isClean} onClick={() => void save({ hangsClean: !isClean })}>
          {isClean ? 'Hangs clean: take that back' : 'This round hangs clean'}
        </Button>
        <span role="status">{words}</span>
      </div>
    </Section>
  );
}
