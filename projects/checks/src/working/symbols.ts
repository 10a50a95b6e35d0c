import type { MathElement } from '../contract';

const GREEK: Readonly<Record<string, string>> = {
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
  chi: 'χ',
  psi: 'ψ',
};

const letter = (part: string): string => GREEK[part] ?? part;

/** A symbol that no formula stands behind, such as `f_y`, as f with the subscript y. */
export function symbolElement(symbol: string): MathElement {
  const [head = symbol, ...rest] = symbol.split('_');
  const main: MathElement = { tag: 'mi', text: letter(head) };
  const barred = rest[0] === 'bar';
  const base = barred ? { tag: 'mover', children: [main, { tag: 'mo', text: '¯' }] } : main;
  const subscripts = barred ? rest.slice(1) : rest;
  if (subscripts.length === 0) return base;
  const parts = subscripts.flatMap((part, index): MathElement[] => {
    const shown = { tag: 'mi', text: letter(part), attributes: { mathvariant: 'normal' } };
    return index === 0 ? [shown] : [{ tag: 'mo', text: ',' }, shown];
  });
  return { tag: 'msub', children: [base, { tag: 'mrow', children: parts }] };
}
