/**
 * NIST Statistical Reference Datasets, nonlinear regression: data, the starting values farther off, certified parameters with
 * their standard deviations, certified residual sum of squares. Memory; a slip in any figure would not give the certified ones.
 */
export interface NistProblem {
  readonly name: string;
  readonly model: (x: number, b: Float64Array) => number;
  readonly x: readonly number[];
  readonly y: readonly number[];
  readonly starts: readonly (readonly number[])[];
  readonly certified: readonly { readonly value: number; readonly sd: number }[];
  readonly residualSumOfSquares: number;
}

export const nistStrd = {
  source: 'NIST StRD nonlinear regression [memory]',
  problems: [
    {
      name: 'Misra1a',
      model: (x, [a = 0, b = 0]) => a * (1 - Math.exp(-b * x)),
      x: [77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0],
      y: [10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.4, 75.47, 81.78],
      starts: [
        [500, 0.0001],
        [250, 0.0005],
      ],
      certified: [
        { value: 2.3894212918e2, sd: 2.7070075241 },
        { value: 5.5015643181e-4, sd: 7.2668688436e-6 },
      ],
      residualSumOfSquares: 1.2455138894e-1,
    },
    {
      name: 'BoxBOD',
      model: (x, [a = 0, b = 0]) => a * (1 - Math.exp(-b * x)),
      x: [1, 2, 3, 5, 7, 10],
      y: [109, 149, 149, 191, 213, 224],
      starts: [[100, 0.75]],
      certified: [
        { value: 2.1380940889e2, sd: 1.2354515176e1 },
        { value: 5.4723748542e-1, sd: 1.0455993237e-1 },
      ],
      residualSumOfSquares: 1.1680088766e3,
    },
    {
      name: 'Rat42',
      model: (x, [a = 0, b = 0, c = 0]) => a / (1 + Math.exp(b - c * x)),
      x: [9, 14, 21, 28, 42, 57, 63, 70, 79],
      y: [8.93, 10.8, 18.59, 22.33, 39.35, 56.11, 61.73, 64.62, 67.08],
      starts: [
        [100, 1, 0.1],
        [75, 2.5, 0.07],
      ],
      certified: [
        { value: 7.2462237576e1, sd: 1.7340283401 },
        { value: 2.6180768402, sd: 8.8295217536e-2 },
        { value: 6.7359200066e-2, sd: 3.4465663377e-3 },
      ],
      residualSumOfSquares: 8.0565229338,
    },
  ],
} as const satisfies { readonly source: string; readonly problems: readonly NistProblem[] };
