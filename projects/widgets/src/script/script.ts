/** What the page says by the way it loads the script. */
export interface Script {
  /** Origin of the script, where its own service is; '' where that cannot be told. */
  readonly server: string;
  /** Where the fonts are; undefined where the page wants none (`data-fonts="none"`). */
  readonly fonts: string | undefined;
  /** Of a page whose policy wants one. */
  readonly nonce: string | undefined;
}

/** Reads the script's own element; there is none when the text was run in some other way. */
export function readScript(element: HTMLOrSVGScriptElement | null): Script {
  if (!(element instanceof HTMLScriptElement) || element.src === '') {
    return { server: '', fonts: undefined, nonce: element?.nonce };
  }
  const { origin, href } = new URL(element.src);
  const fonts = element.dataset.fonts === 'none' ? undefined : new URL('fonts/', href).href;
  return { server: origin, fonts, nonce: element.nonce };
}
