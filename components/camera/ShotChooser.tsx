import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { bestShot, type Shot } from './take-frame';

const VERDICTS = {
  good: 'Sharp, and light enough',
  dark: 'Too dark: folds are lost. A lamp from the side helps, a flash does not.',
  glaring: 'Too bright: folds are washed out. Turn from the window, no flash.',
  blurred: 'Not sharp: lean the phone against something, and let the timer take it.',
} as const;

interface Props {
  shots: readonly Shot[];
  onUse: (shot: Shot) => void;
  onAgain: () => void;
}

/** The burst to choose from. A photo that cannot be read is said to be so before it is taken; it may be taken all the same. */
export function ShotChooser({ shots, onUse, onAgain }: Props) {
  const best = bestShot(shots);
  return (
    <div className="grid gap-3">
      {best && best.quality.verdict !== 'good' ? (
        <Notice tone="care" role="alert">
          {VERDICTS[best.quality.verdict]}
        </Notice>
      ) : null}
      <ul className="grid grid-cols-3 gap-2">
        {shots.map((shot, index) => (
          <li key={shot.url} className="grid content-start gap-2">
            <img src={shot.url} alt={`Number ${index + 1} of the burst`} className="w-full" />
            <p className="text-sm">{VERDICTS[shot.quality.verdict]}</p>
            <Button look={shot === best && shot.quality.verdict === 'good' ? 'chalk' : 'plain'} onClick={() => onUse(shot)}>
              Use number {index + 1}
            </Button>
          </li>
        ))}
      </ul>
      <div>
        <Button onClick={onAgain}>Take it again</Button>
      </div>
    </div>
  ); // prettier-ignore
}
