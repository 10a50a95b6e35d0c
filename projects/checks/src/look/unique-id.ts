let count = 0;

/** An id that no other element of the page has. */
export function uniqueId(): string {
  count += 1;
  return `ht-${count}`;
}
