import { TestBed } from '@angular/core/testing';
import { answerOf } from '../../testing/answers';
import { ElementHarness } from '../../testing/element-harness';
import type { CheckAnswer } from '../contract';
import { TitleBlock } from './title-block';

function block(
  profile: Partial<CheckAnswer['profile']> = {},
  change: Partial<CheckAnswer> = {},
): string {
  const fixture = TestBed.createComponent(TitleBlock);
  const answer = answerOf(change);
  fixture.componentRef.setInput('answer', {
    ...answer,
    profile: { ...answer.profile, ...profile },
  });
  fixture.componentRef.setInput('approvedAt', '2026-10-12T00:00:00Z');
  fixture.detectChanges();
  return new ElementHarness(fixture.nativeElement as Element).text;
}

describe('the title block', () => {
  it('names factors, approval, departures, standard, engine and record', () => {
    expect(block()).toBe(
      'Factors uk-na@2 Approved 12 Oct 2026 Departures none Standard EN 1993-1-1:2005+A1:2014 Engine 1.0.0 Record not kept',
    );
  });

  it('says what a revision is worth today', () => {
    expect(block({ status: 'approved', standing: 'expired' })).toContain(
      'Approved 12 Oct 2026, expired',
    );
    expect(block({ status: 'draft', standing: 'draft' })).toContain('Approved draft');
  });

  it('lists departures with their reason and values nobody has confirmed', () => {
    const text = block({
      departures: [
        { id: 'D1', path: 'combinations.gamma_G_sup', from: 1.35, to: 1.2, reason: 'Upper bound.' },
      ],
      unconfirmed: [{ path: 'steel.gamma_M0', value: 1, clause: 'EN 1993-1-1 6.1' }],
    });
    expect(text).toContain('D1 combinations.gamma_G_sup 1.35 1.2 Upper bound.');
    expect(text).toContain('steel.gamma_M0 1 EN 1993-1-1 6.1');
    expect(text).toContain('Departures D1');
  });

  it('links a kept record', () => {
    const record = { reference: 'HT-7F3K-9QD2', url: '/records/HT-7F3K-9QD2' };
    expect(block({}, { record })).toContain('Record HT-7F3K-9QD2');
  });
});
