import {
  inject,
  makeEnvironmentProviders,
  provideEnvironmentInitializer,
  type EnvironmentProviders,
} from '@angular/core';
import { DOCUMENT } from '@angular/common';
import { answerStyles } from '../answer/answer.styles';
import { diagramStyles } from '../envelope-diagram/envelope-diagram.styles';
import { fieldStyles } from '../fields/fields.styles';
import { loadTableStyles } from '../load-table/load-table.styles';
import { drawingStyles } from '../member-drawing/member-drawing.styles';
import { sectionPickerStyles } from '../section-picker/section-picker.styles';
import { statusMarkStyles } from '../status-mark/status-mark.styles';
import { interactionStyles } from '../interaction-diagram/interaction-diagram.styles';
import { pointsTableStyles } from '../points-table/points-table.styles';
import { sectionDrawingStyles } from '../section-drawing/section-drawing.styles';
import { stateTableStyles } from '../state-table/state-table.styles';
import { stressDrawingStyles } from '../stress-drawing/stress-drawing.styles';
import { titleBlockStyles } from '../title-block/title-block.styles';
import { barStyles } from '../utilisation-bar/utilisation-bar.styles';
import { workingStyles } from '../working/working.styles';
import { base } from './base.styles';
import { sheet } from './sheet.styles';
import { tokens } from './tokens.styles';

/** The whole look as one style sheet, for `adoptedStyleSheets` of a shadow root or a document. */
export const sheetStyles = [
  tokens,
  base,
  fieldStyles,
  sectionPickerStyles,
  loadTableStyles,
  drawingStyles,
  statusMarkStyles,
  barStyles,
  answerStyles,
  diagramStyles,
  sectionDrawingStyles,
  stressDrawingStyles,
  interactionStyles,
  pointsTableStyles,
  stateTableStyles,
  workingStyles,
  titleBlockStyles,
  sheet,
].join('\n');

const adopted = new WeakSet<Document | ShadowRoot>();

/** Adopts the look in a shadow root or a document, once; needs no style tag and no nonce. */
export function adoptSheetStyles(root: Document | ShadowRoot): void {
  if (adopted.has(root)) return;
  const view = ('defaultView' in root ? root : root.ownerDocument).defaultView;
  if (!view?.CSSStyleSheet) return;
  const made = new view.CSSStyleSheet();
  made.replaceSync(sheetStyles);
  root.adoptedStyleSheets = [...root.adoptedStyleSheets, made];
  adopted.add(root);
}

/** For applications that show checks outside a shadow root: the document adopts the look. */
export function provideSheetStyles(): EnvironmentProviders {
  return makeEnvironmentProviders([
    provideEnvironmentInitializer(() => adoptSheetStyles(inject(DOCUMENT))),
  ]);
}
