import type { components } from '@headtree/checks/contract';

type Schemas = components['schemas'];

/** The body of `POST /v1/checks/waler`. */
export type WalerRequest = Schemas['WalerRequest'];
/** The body of `POST /v1/checks/section`. */
export type SectionRequest = Schemas['SectionRequest'];
/** The body of `POST /v1/checks/stress`. */
export type StressRequest = Schemas['StressRequest'];
/** Design effects at one cross-section. */
export type SectionEffects = Schemas['SectionEffects'];
/** Name of a check in its address. */
export type CheckId = Schemas['CheckId'];
/** What a check answers. */
export type CheckAnswer = Schemas['CheckAnswer'];
/** The word of an answer; only `pass` is a pass. */
export type CheckStatus = Schemas['CheckStatus'];
/** One verification of an answer. */
export type Verification = Schemas['Verification'];
/** Name of a verification, the same in every check. */
export type VerificationId = Schemas['VerificationId'];
/** One line of the working. */
export type Step = Schemas['Step'];
/** One combination of actions. */
export type CombinationLine = Schemas['CombinationLine'];
/** Reaction of one support. */
export type Reaction = Schemas['Reaction'];
/** Envelopes along the member. */
export type Diagrams = Schemas['Diagrams'];
/** One point of an envelope. */
export type DiagramPoint = Schemas['DiagramPoint'];
/** The revision that an answer stands on. */
export type ProfileStamp = Schemas['ProfileStamp'];
/** One factor profile of the list. */
export type ProfileSummary = Schemas['ProfileSummary'];
/** The text and the MathML of one formula. */
export type Formula = Schemas['Formula'];
/** One load across the member. */
export type Load = Schemas['Load'];
/** Compression along the member from one source. */
export type AxialLoad = Schemas['AxialLoad'];
/** How a request names its section. */
export type SectionInput = Schemas['SectionInput'];
/** What a member is made of. */
export type MaterialInput = Schemas['MaterialInput'];
/** Steel by its grade. */
export type SteelByGrade = Schemas['SteelByGrade'];
/** What a drawing of the section needs. */
export type SectionSketch = Schemas['SectionSketch'];
/** A strip of a plate that does not count. */
export type IneffectiveStrip = Schemas['IneffectiveStrip'];
/** Stress at one named point, or a state of stress. */
export type StressPoint = Schemas['StressPoint'];
/** Stress along one wall of a section. */
export type StressWall = Schemas['StressWall'];
/** What two effects may be together. */
export type InteractionCurve = Schemas['InteractionCurve'];
/** A verification the caller takes upon themselves. */
export type Waiver = Schemas['Waiver'];
/** A number in the field's unit, or text with a unit. */
export type QuantityInput = Schemas['QuantityInput'];
/** A problem as the service writes it. */
export type ProblemBody = Schemas['Problem'];
/** One thing in a problem that the caller can mend. */
export type ProblemItem = Schemas['ProblemItem'];

/** An element of MathML as data, so that a page may build it node by node. */
export interface MathElement {
  readonly tag: string;
  readonly text?: string;
  readonly children?: readonly MathElement[];
  /** The symbol the element stands for, so that its number can take its place. */
  readonly symbol?: string;
  readonly attributes?: Readonly<Record<string, string>>;
}

/** A shape that the catalogue knows. */
export type CatalogueShape = Schemas['CatalogueShape'];

/** A length or a mass of the catalogue. */
interface SectionFact {
  readonly value: number;
}

/** What a search of the catalogue shows of a section. */
export interface SectionLine {
  readonly designation: string;
  readonly family?: string;
  readonly shape?: string;
  /** Of a hollow section. */
  readonly forming?: string;
  readonly mass?: SectionFact | null;
  readonly dimensions?: Readonly<Record<string, SectionFact>>;
}
