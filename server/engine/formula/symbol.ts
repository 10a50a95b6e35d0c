import type { MathElement } from './mathml';

const greek: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  Delta: 'Δ',
  epsilon: 'ε',
  eta: 'η',
  theta: 'θ',
  lambda: 'λ',
  mu: 'μ',
  xi: 'ξ',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  pi: 'π',
  chi: 'χ',
  psi: 'ψ',
};

const letter = (part: string): string => greek[part] ?? part;

/** `M_c_y_Rd` as M with the subscript c,y,Rd; `lambda_bar_y` as λ with a bar and the subscript y. */
export function symbolElement(symbol: string): MathElement {
  const [head = symbol, ...rest] = symbol.split('_');
  const barred = rest[0] === 'bar';
  const main: MathElement = { tag: 'mi', text: letter(head) };
  const base: MathElement = barred
    ? { tag: 'mover', children: [main, { tag: 'mo', text: '¯' }] }
    : main;
  const subscripts = barred ? rest.slice(1) : rest;
  if (subscripts.length === 0) return base;
  const parts = subscripts.flatMap((part, index): MathElement[] => {
    const shown: MathElement = {
      tag: 'mi',
      text: letter(part),
      attributes: { mathvariant: 'normal' },
    };
    return index === 0 ? [shown] : [{ tag: 'mo', text: ',' }, shown];
  });
  return { tag: 'msub', children: [base, { tag: 'mrow', children: parts }] };
}
