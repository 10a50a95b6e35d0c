/** What the library gives to the elements and the console; a change here is on purpose. */
export {
  ApiClient,
  HEADTREE_CSRF_TOKEN,
  HEADTREE_FETCH,
  isSecretKey,
  type ApiAccess,
  type Credentials,
  type Fetcher,
} from './api/api-client';
export { ApiError, type ApiErrorFacts, type ApiErrorKind } from './api/api-error';
export type * from './contract';
export { EnvelopeDiagram } from './envelope-diagram/envelope-diagram';
export { adoptSheetStyles, provideSheetStyles, sheetStyles } from './look/sheet-styles';
export { fontFamilies } from './look/tokens.styles';
export { MemberDrawing } from './member-drawing/member-drawing';
export { drawingModel, type DrawingModel } from './member-drawing/drawing-model';
export { ReactionsTable } from './reactions/reactions-table';
export { SectionCheck } from './section-check/section-check';
export { SectionDrawing } from './section-drawing/section-drawing';
export { answeredSection, type SectionModel } from './section-drawing/section-model';
export { StatusMark, type MarkKind } from './status-mark/status-mark';
export { StressCheck } from './stress-check/stress-check';
export { StressDrawing } from './stress-drawing/stress-drawing';
export { InteractionDiagram } from './interaction-diagram/interaction-diagram';
export { PointsTable } from './points-table/points-table';
export { TitleBlock } from './title-block/title-block';
export { barTone, UtilisationBar, type BarTone } from './utilisation-bar/utilisation-bar';
export { WalerCheck } from './waler-check/waler-check';
export { WorkingSheet } from './working/working-sheet';
