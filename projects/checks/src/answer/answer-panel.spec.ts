import { TestBed } from '@angular/core/testing';
import { answerOf, verification } from '../../testing/answers';
import type { RunState } from '../api/check-runner';
import type { CheckAnswer } from '../contract';
import { barTone } from '../utilisation-bar/utilisation-bar';
import { writeDraft } from '../form/write-draft';
import { drawingModel } from '../member-drawing/drawing-model';
import { patternText } from './pattern-words';
import { AnswerPanel } from './answer-panel';
import { AnswerPanelHarness } from './testing/answer-panel-harness';

function panel(state: Partial<RunState>): AnswerPanelHarness {
  const fixture = TestBed.createComponent(AnswerPanel);
  fixture.componentRef.setInput('state', { phase: 'idle', answer: null, error: null, ...state });
  fixture.componentRef.setInput('member', drawingModel(writeDraft({ spans: [3, 3] })));
  fixture.detectChanges();
  return new AnswerPanelHarness(fixture.nativeElement as Element);
}

const answered = (change: Partial<CheckAnswer>) =>
  panel({ phase: 'answered', answer: answerOf(change) });

describe('the colour of a bar', () => {
  it('is green for a pass of the whole alone, red for what does not hold in a fail, else grey', () => {
    expect(barTone('pass', true)).toBe('pass');
    expect(barTone('fail', false)).toBe('fail');
    for (const [whole, holds] of [
      ['fail', true],
      ['incomplete', true],
      ['provisional', true],
      [null, true],
    ] as const) {
      expect(barTone(whole, holds)).toBe('none');
    }
  });
});

describe('the answer', () => {
  it('of a pass is a word, a filled circle and green bars, the most used first', () => {
    const shown = answered({});
    expect([shown.status, shown.mark]).toEqual(['Pass', 'pass']);
    expect(shown.tones).toEqual(['pass', 'pass', 'pass']);
    expect(shown.verifications[0]).toContain('Bending about y-y');
    expect(shown.text).toContain('Bending about y-y governs prop 2, x = 3.00 m, combination C2');
    expect(shown.text).toContain('1.35 earth + 1.50 surcharge on every span');
  });

  it('of a fail reddens what does not hold and nothing is green', () => {
    const shown = answered({
      status: 'fail',
      utilisation: 1.0004,
      verifications: [verification('bending-y', 1.0004), verification('shear-z', 0.4)],
    });
    expect([shown.status, shown.mark]).toEqual(['Fail', 'fail']);
    expect(shown.tones).toEqual(['fail', 'fail', 'none']);
    expect(shown.text).toContain('1.0004');
    expect(shown.text).toContain('One verification does not hold.');
  });

  it('that is incomplete says what was not verified and what it wants', () => {
    const reason = 'The end distance is not given.';
    const shown = answered({
      status: 'incomplete',
      missing: [{ pointer: '/bearing/endDistance', verification: 'transverse-force', reason }],
    });
    expect([shown.status, shown.mark]).toEqual(['Incomplete', 'incomplete']);
    expect(shown.tones).toEqual(['none', 'none', 'none']);
    expect(shown.text).toContain('Not verified: transverse force at the props.');
    expect(shown.verifications[0]).toContain(`${reason} not verified`);
  });

  it('that is provisional says why', () => {
    const profile = { ...answerOf().profile, status: 'draft', standing: 'draft' } as const;
    const unconfirmed = [{ path: 'steel.gamma_M0', value: 1, clause: 'EN 1993-1-1 6.1' }];
    const shown = answered({ status: 'provisional', profile: { ...profile, unconfirmed } });
    expect([shown.status, shown.mark]).toEqual(['Provisional', 'provisional']);
    expect(shown.tones).toEqual(['none', 'none', 'none']);
    expect(shown.text).toContain('uk-na revision 2 is a draft.');
    expect(shown.text).toContain(
      '1 value of uk-na revision 2 that this check used is not confirmed',
    );
  });

  it('prints a waiver with its reason beside the status', () => {
    const shown = answered({
      waived: [{ verification: 'deflection', reason: 'Movement is monitored.' }],
    });
    expect(shown.verifications.at(-1)).toBe('Deflection Movement is monitored. waived');
  });

  it('says why there is no utilisation', () => {
    const none = { ...verification('bending-y', 2), utilisation: null, reason: 'A mechanism.' };
    const shown = answered({ status: 'fail', utilisation: null, verifications: [none] });
    expect(shown.text).toContain('A mechanism.');
    expect(shown.text).toContain('–');
  });

  it('that belongs to the form before its last change has no colour', () => {
    const shown = panel({ phase: 'busy', answer: answerOf() });
    expect([shown.status, shown.mark]).toEqual(['Checking…', 'busy']);
    expect(shown.tones).toEqual(['none', 'none', 'none']);
    expect(shown.text).toContain('before its last change');
  });
});

describe('where variable loads stand', () => {
  const plain = { spans: 4, start: false, end: false };
  const hung = { spans: 3, start: true, end: true };

  it.each([
    ['all', plain, 'on every span'],
    ['odd', plain, 'on spans 1 and 3'],
    ['neighbours-1', plain, 'on spans 1, 2 and 4'],
    ['without-neighbours-1', plain, 'on span 3'],
    ['neighbours-1', hung, 'on the start overhang and spans 1 and 3'],
    ['odd', hung, 'on the start overhang, span 2 and the end overhang'],
    ['panels-0110', plain, 'on spans 2 and 3'],
    ['none', plain, ''],
    ['something-new', plain, 'something-new'],
  ])('%s', (pattern, panels, words) => expect(patternText(pattern, panels)).toBe(words));
});
