/** Languages that the checks are written in, the first where none fits. */
const spoken = ['en'] as const;
export type Language = (typeof spoken)[number];

/** The language for an element, from the nearest `lang`, across shadow roots. */
export function languageOf(element: Element): Language {
  const wanted = nearestLang(element)?.toLowerCase().split('-')[0];
  return spoken.find((language) => language === wanted) ?? spoken[0];
}

function nearestLang(element: Element): string | undefined {
  const holder = element.closest<HTMLElement>('[lang]');
  if (holder) return holder.lang;
  const root = element.getRootNode();
  return root instanceof ShadowRoot ? nearestLang(root.host) : undefined;
}
