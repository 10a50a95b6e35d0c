import { ChangeDetectionStrategy, Component, ViewEncapsulation } from '@angular/core';
import { CheckBase } from '../check/check-base';
import { CheckSheet } from '../check/check-sheet';
import type { SectionRequest } from '../contract';
import { TextField } from '../fields/text-field';
import { DrawnSection } from '../section-figures/drawn-section';
import { SectionAndStress } from '../section-figures/section-and-stress';
import { SectionFigures } from '../section-figures/section-figures';
import { SectionForm } from '../section-form/section-form';
import { sectionKind, type SectionCheckDraft } from './section-request';

/** A cross-section's check: its effects, its drawing, stress and interaction, the answer and the working. */
@Component({
  selector: 'htc-section',
  templateUrl: './section-check.html',
  imports: [CheckSheet, SectionAndStress, SectionFigures, SectionForm, TextField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionCheck extends CheckBase<SectionRequest, SectionCheckDraft> {
  protected readonly kind = sectionKind;
  protected readonly drawn = new DrawnSection(this.session, () => this.session.draft().section);

  protected ticked(event: Event): boolean {
    return (event.target as HTMLInputElement).checked;
  }
}
