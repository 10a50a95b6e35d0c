import { TestBed } from '@angular/core/testing';
import { answerOf } from '../../testing/answers';
import type { Formula, MathElement } from '../contract';
import { breakable, marksIn } from './breakable';
import { mathNode } from './math-line';
import { numbersIn } from './numbers-in';
import { plainText } from './plain-text';
import { symbolElement } from './symbols';
import { WorkingSheet } from './working-sheet';

const symbol = (name: string): MathElement => ({ ...symbolElement(name), symbol: name });
const mo = (text: string): MathElement => ({ tag: 'mo', text });
const row = (...children: MathElement[]): MathElement => ({ tag: 'mrow', children });

const expression: MathElement = {
  tag: 'mfrac',
  children: [row(symbol('W_pl_y'), mo('·'), symbol('f_y')), symbol('gamma_M0')],
};
const formula = {
  id: 'M_c_y_Rd-1',
  symbol: 'M_c_y_Rd',
  elements: { tag: 'math', children: [symbolElement('M_c_y_Rd'), mo('='), expression] },
} as unknown as Formula;

const textOf = (element: MathElement): string => {
  const inner =
    element.text ?? (element.children ?? []).map(textOf).join(element.tag === 'mfrac' ? '/' : '');
  return element.tag === 'msup' ? (element.children ?? []).map(textOf).join('^') : inner;
};

describe('numbers in a formula', () => {
  it('stand in the place of their symbols with their units', () => {
    const put = numbersIn(expression, answerOf().steps?.[0]?.inputs ?? {});
    expect(textOf(put)).toBe('1\u202f224\u202f000\u00a0mm³·265\u00a0N/mm²/1');
  });

  it('get brackets under a power and behind a sign', () => {
    const squared: MathElement = { tag: 'msup', children: [symbol('h'), { tag: 'mn', text: '2' }] };
    expect(textOf(numbersIn(squared, { h: { value: 453.4, unit: 'mm' } }))).toBe(
      '(453.4\u00a0mm)^2',
    );
    const sum = row(symbol('a'), mo('+'), symbol('a'));
    expect(textOf(numbersIn(sum, { a: { value: -2, unit: '1' } }))).toBe('−2+(−2)');
    const lessProduct = row(symbol('b'), mo('−'), row(symbol('a'), mo('·'), symbol('b')));
    const inputs = { a: { value: -2, unit: '1' }, b: { value: 3, unit: '1' } };
    expect(textOf(numbersIn(lessProduct, inputs))).toBe('3−(−2)·3');
  });

  it('show the exact number on hover', () => {
    const node = mathNode(document, numbersIn(symbol('x'), { x: { value: 1 / 3, unit: '1' } }));
    expect([node?.textContent, node?.getAttribute('title')]).toEqual([
      '0.3333',
      '0.3333333333333333',
    ]);
  });
});

describe('a long formula', () => {
  it('is in pieces that begin with their sign; brackets stay whole', () => {
    const bracket = row(mo('('), row(symbol('a'), mo('+'), symbol('b')), mo(')'));
    const sum = row(
      row(row(symbol('a'), mo('·'), symbol('b')), mo('+'), bracket),
      mo('−'),
      symbol('c'),
    );
    expect(breakable(sum).map((piece) => piece.map(textOf).join(''))).toEqual([
      'a·b',
      '+(a+b)',
      '−c',
    ]);
    expect(breakable(expression)).toEqual([[expression]]);
    expect(marksIn(sum)).toBe(11);
  });
});

describe('MathML', () => {
  it('is built in its own namespace, of what a formula may hold and nothing else', () => {
    const evil = {
      tag: 'math',
      children: [
        { tag: 'script', text: 'x' },
        { tag: 'mi', text: 'y', attributes: { onclick: 'x', title: 't' } },
      ],
    };
    const node = mathNode(document, evil);
    expect(node?.namespaceURI).toBe('http://www.w3.org/1998/Math/MathML');
    expect(node?.outerHTML).not.toContain('script');
    expect(node?.outerHTML).not.toContain('onclick');
    expect(node?.querySelector('mi')?.getAttribute('title')).toBe('t');
  });
});

describe('the working', () => {
  it('writes formula, numbers, value and clause, and asks only for what is open', async () => {
    const ask = jest.fn().mockResolvedValue(formula);
    const fixture = TestBed.createComponent(WorkingSheet);
    fixture.componentRef.setInput('answer', answerOf());
    fixture.componentRef.setInput('client', { formula: ask });
    fixture.detectChanges();
    await fixture.whenStable();
    fixture.detectChanges();
    const host = fixture.nativeElement as HTMLElement;
    const pieces = Array.from(host.querySelectorAll('math'), (math) => math.textContent);
    expect(pieces).toEqual([
      'Mc,y,Rd=Wpl,y·fyγM0',
      '=1\u202f224\u202f000\u00a0mm³·265\u00a0N/mm²1',
      '=324.4\u00a0kN m',
    ]);
    expect(host.textContent).toContain('EN 1993-1-1 6.2.5(2) (6.13)');
    expect(ask).toHaveBeenCalledTimes(1);
  });

  it('shows the text of a formula while its MathML is away', async () => {
    const fixture = TestBed.createComponent(WorkingSheet);
    fixture.componentRef.setInput('answer', answerOf());
    fixture.componentRef.setInput('client', {
      formula: () => Promise.reject(new Error()),
    });
    fixture.detectChanges();
    await fixture.whenStable();
    expect((fixture.nativeElement as HTMLElement).textContent).toContain(
      '(1\u202f224\u202f000 mm³) · (265 N/mm²) / 1',
    );
  });

  it('rounds numbers and prints signs in that text', () => {
    const text = plainText('sqrt((-12.345678901234567 mm) ^ 2 + (0.5 - 1.1e-7 m^4) * x_1 ^ 10)');
    expect(text).toBe('sqrt((−12.35 mm)² + (0.5 − 110·10⁻⁹ m⁴) · x_1 ^ 10)');
  });

  it('asks for what is closed as the page is printed, and not before', async () => {
    const [first] = answerOf().steps ?? [];
    const closed = { ...first, formula: 'V_c-1', verification: 'shear-z' };
    const ask = jest.fn().mockReturnValue(new Promise(() => undefined));
    const fixture = TestBed.createComponent(WorkingSheet);
    fixture.componentRef.setInput('answer', answerOf({ steps: [closed] as never }));
    fixture.componentRef.setInput('client', { formula: ask });
    fixture.detectChanges();
    await fixture.whenStable();
    expect(ask).not.toHaveBeenCalled();
    window.dispatchEvent(new Event('beforeprint'));
    expect(ask.mock.calls).toEqual([['V_c-1']]);
  });
});
