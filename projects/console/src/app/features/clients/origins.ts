import type { AbstractControl, ValidationErrors } from '@angular/forms';

/** Origins as they were typed, one to a line. */
export const originsIn = (text: string): string[] =>
  text
    .split(/\s+/)
    .map((line) => line.trim())
    .filter((line) => line !== '');

/** What is wrong with one origin; undefined when a browser would send it exactly so. */
export function originFault(text: string): string | undefined {
  if (text === '*' || text.includes('*'))
    return `“${text}” names no single origin. List each one: a page key never works from all.`;
  if (!/^[a-z][a-z0-9+.-]*:\/\//i.test(text))
    return `“${text}” has no scheme. Did you mean “https://${text.replace(/^\/+/, '')}”?`;
  if (!URL.canParse(text)) return `“${text}” cannot be read as an origin.`;
  const { protocol, origin, username } = new URL(text);
  if (protocol !== 'https:' && protocol !== 'http:')
    return `“${text}” is not a web page’s origin: it begins with https:// or http://.`;
  if (username !== '') return `“${text}” carries a user name, an origin has none.`;
  if (origin !== text) return `“${text}” is more than the browser sends. Did you mean “${origin}”?`;
  return undefined;
}

/** A page key needs its pages' origins, each of them exact. */
export function originsValidator(control: AbstractControl<string>): ValidationErrors | null {
  const origins = originsIn(control.value);
  if (origins.length === 0)
    return { origins: ['Name at least one origin: without one no page could use the key.'] };
  const faults = origins.map(originFault).filter((fault) => fault !== undefined);
  return faults.length > 0 ? { origins: faults } : null;
}
