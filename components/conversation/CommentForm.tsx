'use client';
import { type FormEvent, useState } from 'react';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { FormFooter } from '@/components/ui/FormFooter';
import { SelectField } from '@/components/ui/SelectField';
import { TextArea } from '@/components/ui/TextArea';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { CommentForm as Form } from './conversation-schema';

interface Props {
  roundId: string;
  knowledge: Knowledge;
  onSaid: () => void;
}

const ROUND = '';

/** Says something about the whole round or one sign of it, and may ask for a test. What was typed stays until it is taken in. */
export function CommentForm({ roundId, knowledge, onSaid }: Props) {
  const [id, setId] = useState(() => v7());
  const [body, setBody] = useState('');
  const [sign, setSign] = useState(ROUND);
  const [check, setCheck] = useState(ROUND);
  const [isBusy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const send = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    const comment: Form = { id, body, place: null, sign: sign || null, asksCheck: check || null };
    const sent = await sendJson('POST', `/api/rounds/${roundId}/comments`, comment);
    setBusy(false);
    setProblem(sent.ok ? null : (sent.problem.fields?.body?.[0] ?? sent.problem.message));
    if (!sent.ok) return;
    setId(v7());
    setBody('');
    setCheck(ROUND);
    onSaid();
  };
  return (
    <form onSubmit={(event) => void send(event)} noValidate className="grid gap-4">
      <TextArea
        label="Say something about this round"
        value={body}
        maxLength={2000}
        onChange={(event) => setBody(event.target.value)}
      />
      <SelectField label="About" value={sign} onChange={(event) => setSign(event.target.value)}>
        <option value={ROUND}>The whole round</option>
        {knowledge.signs.map(({ id: signId, name }) => (
          <option key={signId} value={signId}>
            {name}
          </option>
        ))}
      </SelectField>
      <SelectField label="Ask for a test" value={check} onChange={(event) => setCheck(event.target.value)}>
        <option value={ROUND}>None</option>
        {knowledge.checks.map(({ id: checkId, name }) => (
          <option key={checkId} value={checkId}>
            {name}
          </option>
        ))}
      </SelectField>
      <FormFooter action="Say it" isBusy={isBusy} problem={problem} />
    </form>
  );
}
