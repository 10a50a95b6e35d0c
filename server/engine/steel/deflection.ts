import { formula } from '../formula/formula';

export const deflectionLimitOfSpan = formula({
  symbol: 'w_lim',
  title: 'Limit of the deflection; an overhang counts twice its length',
  unit: 'mm',
  clause: 'EN 1990 A1.4.2(2), limit set for the job',
  expression: 'L / ratio',
  where: { L: 'mm', ratio: '1' },
});

export const deflectionCriterion = formula({
  symbol: 'utilisation',
  title: 'Deflection relative to the chord of the supports',
  unit: '1',
  clause: 'EN 1990 6.5.1(1) (6.13)',
  expression: 'w / w_lim',
  where: { w: 'mm', w_lim: 'mm' },
});
