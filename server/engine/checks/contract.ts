import type { components } from '../../../openapi/generated/types';

type Schemas = components['schemas'];

/** The contract's types by the names the checks use. */
export type WalerRequest = Schemas['WalerRequest'];
export type SectionRequest = Schemas['SectionRequest'];
export type StressRequest = Schemas['StressRequest'];
export type SectionEffects = Schemas['SectionEffects'];
export type LoadInput = Schemas['Load'];
export type LoadSetInput = Schemas['LoadSet'];
export type SectionInput = Schemas['SectionInput'];
export type MaterialInput = Schemas['MaterialInput'];
export type WaiverInput = NonNullable<WalerRequest['waive']>[number];
export type CheckAnswer = Schemas['CheckAnswer'];
export type VerificationAnswer = Schemas['Verification'];
export type VerificationId = Schemas['VerificationId'];
export type MissingItem = Schemas['MissingItem'];
export type CombinationLine = Schemas['CombinationLine'];
export type ReactionAnswer = Schemas['Reaction'];
export type Diagrams = Schemas['Diagrams'];
export type AdvisoryAnswer = Schemas['Advisory'];
