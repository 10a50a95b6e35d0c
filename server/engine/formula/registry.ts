import type { Formula } from './formula';

const formulas = new Map<string, Formula>();

/** Called by `formula()` alone. */
export function register(made: Formula<never>): void {
  // The registry only reads; values go in through the typed formula itself.
  const stored = made as unknown as Formula;
  if (formulas.has(stored.id)) {
    throw new Error(`The formula ${stored.symbol} (${stored.clause}) is declared twice.`);
  }
  formulas.set(stored.id, stored);
}

/** Every formula of the engine's loaded files, by symbol. */
export function allFormulas(): readonly Formula[] {
  return [...formulas.values()].sort((a, b) => a.symbol.localeCompare(b.symbol));
}

export function findFormula(id: string): Formula | undefined {
  return formulas.get(id);
}
