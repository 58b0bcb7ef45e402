'use client';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { TextArea } from '@/components/ui/TextArea';
import type { CommentDto } from '@/db/queries/comments';
import type { Knowledge } from '@/diagnosis/garments/schema';

interface Props {
  comments: readonly CommentDto[];
  knowledge: Knowledge;
  onChanged: () => void;
}

const nameIn = (all: readonly { id: string; name: string }[], id: string) =>
  all.find((one) => one.id === id)?.name ?? id;

/** What was said, oldest first; one's own words can be put better or taken back. */
export function CommentList({ comments, knowledge, onChanged }: Props) {
  return (
    <ol className="grid gap-4">
      {comments.map((comment) => (
        <li key={comment.id} className="grid gap-1 border-l-4 border-seam pl-4">
          <span className="font-bold">{comment.isMine ? 'You' : comment.authorName}</span>
          {comment.sign ? (
            <span className="text-sm text-graphite">about: {nameIn(knowledge.signs, comment.sign)}</span>
          ) : null}
          {comment.photoId ? <span className="text-sm text-graphite">at a place on a photo</span> : null}
          <p className="max-w-prose whitespace-pre-line [overflow-wrap:anywhere]">{comment.body}</p>
          {comment.asksCheck ? (
            <span className="text-sm">asks for the test: {nameIn(knowledge.checks, comment.asksCheck)}</span>
          ) : null}
          {comment.isMine ? <OwnComment comment={comment} onChanged={onChanged} /> : null}
        </li>
      ))}
    </ol>
  );
}

function OwnComment({ comment, onChanged }: { comment: CommentDto; onChanged: () => void }) {
  const [draft, setDraft] = useState<{ body: string; version: number } | null>(null);
  const [theirs, setTheirs] = useState<CommentDto | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const url = `/api/comments/${comment.id}`;
  const save = async () => {
    if (!draft) return;
    const sent = await sendJson('PATCH', url, draft);
    onChanged();
    if (sent.ok) {
      setTheirs(null);
      return setDraft(null);
    }
    setProblem(sent.problem.message);
    if (sent.status !== 409) return;
    const now = sent.problem.theirs as CommentDto;
    setTheirs(now);
    setDraft({ ...draft, version: now.version });
  };
  const remove = async () => {
    const sent = await sendJson('DELETE', url);
    setProblem(sent.ok ? null : sent.problem.message);
    onChanged();
  };
  return (
    <div className="grid gap-2">
      {problem ? (
        <Notice tone="care" role="alert">
          {problem}
          {theirs ? <span className="block">It now says: {theirs.body}</span> : null}
        </Notice>
      ) : null}
      {draft ? (
        <>
          <TextArea
            label="Your words"
            value={draft.body}
            maxLength={2000}
            onChange={(event) => setDraft({ ...draft, body: event.target.value })}
          />
          <span className="flex flex-wrap gap-3">
            <Button onClick={() => void save()}>{theirs ? 'Keep mine' : 'Save'}</Button>
            <Button look="quiet" onClick={() => setDraft(null)}>
              Leave it as it was
            </Button>
          </span>
        </>
      ) : (
        <span className="flex flex-wrap gap-3">
          <Button look="quiet" onClick={() => setDraft({ body: comment.body, version: comment.version })}>
            Put it better
          </Button>
          <Button look="quiet" onClick={() => void remove()}>
            Take it back
          </Button>
        </span>
      )}
    </div>
  );
}
