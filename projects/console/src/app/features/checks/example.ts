import type { WalerRequest } from './request-in-address';

/** A waler over four props, as the documentation asks for it. */
export const exampleRequest: WalerRequest = {
  profile: 'en-recommended',
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  loadBasis: 'characteristic',
  spans: [3, 3, 2.4],
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    {
      name: 'surcharge',
      nature: 'variable',
      category: 'surcharge',
      kind: 'uniform',
      value: 22,
    },
  ],
  restraint: 'full',
  deflectionLimit: 'span/200',
};
