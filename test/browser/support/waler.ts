/** Walers whose answers are known by their status. */
export const passing = {
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  spans: [3, 3, 2.4],
  loadBasis: 'characteristic',
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 60 },
    { name: 'surcharge', nature: 'variable', category: 'surcharge', kind: 'uniform', value: 15 },
  ],
  restraint: 'full',
  bearing: { length: 0.2, endDistance: 0.1 },
  deflectionLimit: 'span/200',
  waive: [{ verification: 'transverse-force', reason: 'stiffeners at every prop' }],
};

export const failing = {
  ...passing,
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 400 }],
};

/** Without a limit the deflection that the check owes is not verified. */
export const incomplete = { ...passing, deflectionLimit: undefined };

export const profile = 'en-recommended';
