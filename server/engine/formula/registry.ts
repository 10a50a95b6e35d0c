import type { Formula } from './formula';

const formulas = new Map<string, Formula>();

/** Called by `formula()` alone. */
export function register(made: Formula): void {
  if (formulas.has(made.id)) {
    throw new Error(`The formula ${made.symbol} (${made.clause}) is declared twice.`);
  }
  formulas.set(made.id, made);
}

/** Every formula of the engine's loaded files, by symbol. */
export function allFormulas(): readonly Formula[] {
  return [...formulas.values()].sort((a, b) => a.symbol.localeCompare(b.symbol));
}

export function findFormula(id: string): Formula | undefined {
  return formulas.get(id);
}
