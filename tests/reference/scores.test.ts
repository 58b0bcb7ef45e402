import { describe, expect, it } from 'vitest';
import {
  brierScore,
  calibrationCurve,
  calibrationError,
  chiSquaredTail,
  logLoss,
} from '@/diagnosis/evaluation/scores';
import { entropyBits, mutualInformationBits } from '@/diagnosis/planning/entropy';

const predictions = (came: number[], p: number[]) => came.map((yes, i) => ({ came: yes === 1, p: p[i]! }));

// What is a decision tree (IBM), and the worked homework page on the same fourteen days of weather.
describe('entropy and information gain', () => {
  it('of nine days played and five not', () => {
    expect(entropyBits([9 / 14, 5 / 14])).toBeCloseTo(0.940286, 6);
  });

  it.each<[string, number[][], number]>([
    [
      'outlook',
      [
        [2, 3],
        [4, 0],
        [3, 2],
      ],
      0.24675,
    ],
    [
      'humidity',
      [
        [3, 4],
        [6, 1],
      ],
      0.151836,
    ],
    [
      'wind',
      [
        [6, 2],
        [3, 3],
      ],
      0.048127,
    ],
    [
      'temperature',
      [
        [2, 2],
        [4, 2],
        [3, 1],
      ],
      0.029223,
    ],
  ])('of %s', (_, counts, published) => {
    expect(mutualInformationBits(counts)).toBeCloseTo(published, 6);
  });
});

describe('scores of predictions', () => {
  // scikit-learn 1.2.1, docstring of brier_score_loss; 2023.
  it('Brier score of the documented four', () => {
    expect(brierScore(predictions([0, 1, 1, 0], [0.1, 0.9, 0.8, 0.3]))).toBeCloseTo(0.0375, 12);
  });

  // scikit-learn 1.2.1, docstring of log_loss (spam .1/.9/.8/.35 against ham, spam, spam, ham); 2023.
  it('log loss of the documented four', () => {
    expect(logLoss(predictions([0, 1, 1, 0], [0.1, 0.9, 0.8, 0.35]))).toBeCloseTo(0.216162, 6);
  });

  // scikit-learn, docstring of calibration_curve; 2023. The error itself is computed, by the definition of Guo et al. 2017.
  it('calibration of the documented nine points in three bins', () => {
    const nine = predictions([0, 0, 0, 0, 1, 1, 1, 1, 1], [0.1, 0.2, 0.3, 0.4, 0.65, 0.7, 0.8, 0.9, 1]);
    const curve = calibrationCurve(nine, 3);
    expect(curve.map(({ observed }) => observed)).toEqual([0, 0.5, 1]);
    [0.2, 0.525, 0.85].forEach((predicted, i) => expect(curve[i]!.predicted).toBeCloseTo(predicted, 12));
    expect(calibrationError(nine, 3)).toBeCloseTo(0.138889, 6);
  });

  // Common tables of χ²: 5 % points at 1, 10 and 19 degrees of freedom.
  it.each([
    [3.841459, 1],
    [18.307038, 10],
    [30.143527, 19],
  ])('tail of χ² above %d with %d degrees', (value, degrees) => {
    expect(chiSquaredTail(value, degrees)).toBeCloseTo(0.05, 6);
  });
});
