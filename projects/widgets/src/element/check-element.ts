import { reflectComponentType, type Injector, type Type } from '@angular/core';
import { createCustomElement } from '@angular/elements';
import { isSecretKey, type ApiError, type CheckAnswer } from '@headtree/checks';
import { addFonts } from '../script/fonts';
import type { Script } from '../script/script';
import { version } from '../script/version';
import { errorDetail, type ErrorDetail } from './details';
import { adoptStyles } from './element-styles';
import { KeptStrategyFactory, type CheckComponent, type KeptStrategy } from './kept-strategy';
import { languageOf } from './language';

/** All that is ever kept of a secret key: enough for the check to say why it is refused. */
const SECRET_KEY = 'htk_';

/** What `createCustomElement` returns, with the strategy that it is given here. */
type KeptElement = new (injector: Injector) => HTMLElement & {
  readonly ngElementStrategy: KeptStrategy;
  connectedCallback(): void;
  attributeChangedCallback(name: string, old: string | null, text: string | null): void;
};

const texts = ['server', 'profile', 'label'] as const;

/** The element of one check: `<headtree-waler>` and its kin. */
export function makeCheckElement(
  component: Type<CheckComponent>,
  script: Script,
  injector: Injector,
): CustomElementConstructor {
  const selector = reflectComponentType(component)?.selector ?? 'div';
  const strategyFactory = new KeptStrategyFactory(component);
  const Base = createCustomElement(component, {
    injector,
    strategyFactory,
  }) as unknown as KeptElement;
  // How a page shows who it is is settled: by its page key, under the name `key`.
  for (const name of ['apiKey', 'credentials'])
    Reflect.deleteProperty(Base.prototype as object, name);

  return class CheckElement extends Base {
    /** For a second copy of the script to name. */
    static readonly headtreeVersion = version;
    static readonly formAssociated = true;
    static readonly observedAttributes = ['key', 'value', 'readonly', 'lang', ...texts];

    readonly #internals = this.attachInternals();
    readonly #root = this.attachShadow({ mode: 'open' });
    readonly #said = document.createElement('p');
    readonly #place = document.createElement(selector);
    #answer: CheckAnswer | null = null;

    constructor() {
      super(injector);
      adoptStyles(this.#root);
      this.#said.className = 'said';
      this.#said.setAttribute('role', 'alert');
      this.#place.classList.add('frame');
      this.#root.append(this.#said, this.#place);
      this.#strategy.listen({
        place: this.#place,
        onInput: (value) => this.#onInput(value),
        onResult: (answer) => this.#onResult(answer),
        onFailed: (error) => this.#onFailed(error),
      });
      this.#strategy.setInputValue('server', script.server);
      this.#takeBack('key');
      this.#takeBack('value');
    }

    /** The page key. Of a secret key nothing but its kind is kept. */
    get key(): string {
      const key = this.#strategy.getInputValue('apiKey');
      return typeof key === 'string' ? key : '';
    }
    set key(key: string | null) {
      const text = (key ?? '').trim();
      this.#strategy.setInputValue('apiKey', isSecretKey(text) ? SECRET_KEY : text);
    }

    /**
     * The request in the fields: what was last set, or typed since; null for empty fields and
     * while something typed cannot be sent.
     */
    get value(): object | null {
      return (this.#strategy.getInputValue('value') as object | null | undefined) ?? null;
    }
    set value(value: object | null) {
      this.#said.textContent = '';
      if (value && value === this.value) return;
      this.#strategy.setInputValue('value', value ?? null);
      this.#forget();
    }

    /** The last answer; null until there is one for what the fields now hold. */
    get result(): CheckAnswer | null {
      return this.#answer;
    }

    get form(): HTMLFormElement | null {
      return this.#internals.form;
    }

    /** Checks at once; undefined where the fields cannot be sent or there is no answer. */
    check(): Promise<CheckAnswer | undefined> {
      return this.#strategy.instance().check();
    }

    /** Puts the fields back to the value that was last set from outside. */
    reset(): void {
      this.#strategy.reset();
      this.#forget();
    }

    /** Where a page sends the focus on purpose: to the first field. */
    override focus(options?: FocusOptions): void {
      this.#root.querySelector<HTMLElement>('input, select, button')?.focus(options);
    }

    override connectedCallback(): void {
      if (script.fonts !== undefined) addFonts(this.ownerDocument, script.fonts);
      this.#place.lang = languageOf(this);
      super.connectedCallback();
    }

    adoptedCallback(): void {
      adoptStyles(this.#root);
    }

    override attributeChangedCallback(
      name: string,
      _old: string | null,
      text: string | null,
    ): void {
      if (name === 'key') this.#takeKey(text);
      else if (name === 'value') this.#takeValue(text);
      else if (name === 'lang') this.#place.lang = languageOf(this);
      else if (name === 'readonly') this.#strategy.setInputValue(name, text !== null);
      else if (name === 'server') this.#strategy.setInputValue(name, text ?? script.server);
      else this.#strategy.setInputValue(name, text ?? '');
    }

    formResetCallback(): void {
      this.reset();
    }

    formDisabledCallback(isDisabled: boolean): void {
      this.#strategy.setInputValue('readonly', isDisabled || this.hasAttribute('readonly'));
    }

    formStateRestoreCallback(state: unknown): void {
      if (typeof state === 'string') this.#takeValue(state);
    }

    get #strategy(): KeptStrategy {
      return this.ngElementStrategy;
    }

    /** What a page set before the script had come lies on the element itself, over ours. */
    #takeBack(name: 'key' | 'value'): void {
      if (!Object.hasOwn(this, name)) return;
      const early: unknown = this[name];
      Reflect.deleteProperty(this, name);
      Reflect.set(this, name, early);
    }

    /** A secret key must not stay where anyone can read it, not even in the attribute. */
    #takeKey(text: string | null): void {
      if (text !== null && isSecretKey(text) && text !== SECRET_KEY)
        this.setAttribute('key', SECRET_KEY);
      else this.key = text;
    }

    #takeValue(text: string | null): void {
      const value = text === null || text.trim() === '' ? null : readJson(text);
      if (value === undefined) {
        const message = 'The value of this element is no JSON object, so it was left out.';
        this.#said.textContent = message;
        this.#tell('headtree-error', { kind: 'not-valid', code: 'value-not-json', message });
        return;
      }
      this.value = value;
    }

    /** The fields hold something else: the answer is none to it. */
    #forget(): void {
      this.#answer = null;
      this.#internals.states.clear();
      const { value } = this;
      this.#internals.setFormValue(value && JSON.stringify(value));
    }

    #onInput(value: object | null): void {
      this.#said.textContent = '';
      this.#forget();
      this.#tell('headtree-input', { value });
    }

    #onResult(answer: CheckAnswer): void {
      this.#answer = answer;
      this.#internals.states.clear();
      this.#internals.states.add(answer.status);
      const value = this.#strategy.getInputValue('value') ?? null;
      this.#tell('headtree-result', { result: answer, value });
    }

    #onFailed(error: ApiError): void {
      this.#answer = null;
      this.#internals.states.clear();
      this.#tell('headtree-error', errorDetail(error));
    }

    #tell(name: string, detail: object | ErrorDetail): void {
      this.dispatchEvent(new CustomEvent(name, { bubbles: true, composed: true, detail }));
    }
  };
}

function readJson(text: string): object | undefined {
  try {
    const value: unknown = JSON.parse(text);
    return typeof value === 'object' && value !== null && !Array.isArray(value) ? value : undefined;
  } catch {
    return undefined;
  }
}
