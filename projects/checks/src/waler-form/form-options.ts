import type { Option } from '../fields/choice-field';
import type { WalerDraft } from '../form/draft';

/** How the flanges are held. */
export function restraintOptions({ kept }: WalerDraft): readonly Option[] {
  const faces = typeof kept.restraint === 'object' && !('spacing' in kept.restraint);
  return [
    { value: 'at-supports', label: 'at the props' },
    { value: 'spacing', label: 'at a spacing' },
    { value: 'full', label: 'all along' },
    ...(faces ? [{ value: 'kept', label: 'by face, as given' }] : []),
  ];
}

/** Which part of the member the load pushes on. */
export const levelOptions: readonly Option[] = [
  { value: 'top', label: 'soil face' },
  { value: 'shear-centre', label: 'mid-depth' },
  { value: 'bottom', label: 'prop face' },
];

/** What the values of the loads are. */
export const basisOptions: readonly Option[] = [
  { value: 'characteristic', label: 'characteristic, to be factored' },
  { value: 'design', label: 'design, counted once' },
];

/** Whether a prop holds against lifting. */
export const supportOptions: readonly Option[] = [
  { value: 'compression-only', label: 'only push' },
  { value: 'both-ways', label: 'push and hold' },
];

/** Single or twin. */
export const countOptions: readonly Option[] = [
  { value: '1', label: 'one member' },
  { value: '2', label: 'twin members' },
];

/** What a waler owes and its engineer may take upon themselves. */
export function waiverOptions(chosen: string): readonly Option[] {
  const known = [
    { value: 'transverse-force', label: 'transverse force at the props' },
    { value: 'lateral-torsional-buckling', label: 'lateral torsional buckling' },
    { value: 'deflection', label: 'deflection' },
  ];
  const own = known.some(({ value }) => value === chosen) ? [] : [{ value: chosen, label: chosen }];
  return [...known, ...own];
}
