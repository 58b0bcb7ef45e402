import { Button } from './Button';

interface Props {
  action: string;
  isBusy: boolean;
  problem: string | null;
}

/** The one action of a form, and the sentence when it did not go through. */
export function FormFooter({ action, isBusy, problem }: Props) {
  return (
    <div className="grid gap-3">
      {problem ? (
        <p role="alert" className="border-l-4 border-pin bg-paper px-3 py-2 font-bold">
          {problem}
        </p>
      ) : null}
      <div>
        <Button type="submit" look="chalk" disabled={isBusy} aria-busy={isBusy}>
          {isBusy ? 'Saving…' : action}
        </Button>
      </div>
    </div>
  );
}
