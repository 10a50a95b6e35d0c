import type { SectionRequest, StressRequest, WalerRequest } from '@headtree/checks';

/** A waler over four props, as the documentation asks for it. */
export const walerExample: WalerRequest = {
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

/** The waler's cross-section at a prop. */
export const sectionExample: SectionRequest = {
  profile: 'en-recommended',
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  effects: { compression: 250, My: 180, Vz: 300 },
  vonMises: true,
};

/** The same cross-section, for its stresses alone. */
export const stressExample: StressRequest = {
  profile: 'en-recommended',
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  effects: { compression: 250, My: 180, Vz: 300 },
};
