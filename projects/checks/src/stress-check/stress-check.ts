import { ChangeDetectionStrategy, Component, computed, ViewEncapsulation } from '@angular/core';
import { CheckBase } from '../check/check-base';
import { CheckSheet } from '../check/check-sheet';
import type { StressRequest } from '../contract';
import { ChoiceField } from '../fields/choice-field';
import { gradeOptions } from '../form/material';
import { uniqueId } from '../look/unique-id';
import { DrawnSection } from '../section-figures/drawn-section';
import { SectionAndStress } from '../section-figures/section-and-stress';
import { SectionFigures } from '../section-figures/section-figures';
import { SectionForm } from '../section-form/section-form';
import { StateTable } from '../state-table/state-table';
import { stressKind, type StressDraft, type StressWay } from './stress-request';

/** A check of stresses: states as they are given, or those at the named points of a section. */
@Component({
  selector: 'htc-stress',
  templateUrl: './stress-check.html',
  imports: [CheckSheet, ChoiceField, SectionAndStress, SectionFigures, SectionForm, StateTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class StressCheck extends CheckBase<StressRequest, StressDraft> {
  protected readonly kind = stressKind;
  protected readonly drawn = new DrawnSection(this.session, () => this.session.draft().section);

  protected readonly name = uniqueId();
  protected readonly ways: readonly { readonly value: StressWay; readonly label: string }[] = [
    { value: 'section', label: 'a section under design effects' },
    { value: 'states', label: 'states of stress' },
  ];
  protected readonly grades = computed(() => {
    const { kept, grade } = this.session.draft();
    return gradeOptions(kept.material, grade);
  });

  protected choose(way: StressWay): void {
    this.session.set({ way });
    // A designation that was being typed has left with its field.
    this.session.wait(false);
  }
}
