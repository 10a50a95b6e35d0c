import {
  ApplicationRef,
  createComponent,
  type ComponentRef,
  type Injector,
  type OutputRef,
  type Type,
} from '@angular/core';
import type {
  NgElementStrategy,
  NgElementStrategyEvent,
  NgElementStrategyFactory,
} from '@angular/elements';
import type { ApiError, CheckAnswer } from '@headtree/checks';
import { EMPTY, type Observable } from 'rxjs';
import { linger, stay, type Lingering } from './lingering';

/** What every check of the library offers to its element. */
export interface CheckComponent {
  readonly valueChange: OutputRef<object>;
  readonly unread: OutputRef<void>;
  readonly result: OutputRef<CheckAnswer>;
  readonly failed: OutputRef<ApiError>;
  check(): Promise<CheckAnswer | undefined>;
  reset(): void;
}

/** What an element is told by its check. */
export interface CheckListener {
  /** Where the check is drawn. */
  readonly place: Element;
  /** A change by the user; null where the fields hold nothing any more that can be sent. */
  onInput(value: object | null): void;
  onResult(answer: CheckAnswer): void;
  onFailed(error: ApiError): void;
}

/**
 * Keeps the check of an element through moves. Angular's own strategy destroys it 10 ms after it
 * left the page and forgets its inputs; this one lets it linger, and makes it anew with the same
 * inputs when the element comes back even later.
 */
export class KeptStrategy implements NgElementStrategy, Lingering {
  /** The element sends its events itself, so that they bubble. */
  readonly events: Observable<NgElementStrategyEvent> = EMPTY;
  /** As they were set from outside. */
  private readonly inputs = new Map<string, unknown>();
  /** The value as the user has changed it since, as far as it could be sent. */
  private typed: object | undefined;
  /** Whether the fields hold nothing that can be sent, by what the user typed. */
  private unread = false;
  /** The value that the check was given last. */
  private shown: unknown;
  private made: ComponentRef<CheckComponent> | undefined;
  private listener: CheckListener | undefined;

  constructor(
    private readonly component: Type<CheckComponent>,
    private readonly injector: Injector,
  ) {}

  /** Before anything is drawn. */
  listen(listener: CheckListener): void {
    this.listener = listener;
  }

  connect(): void {
    stay(this);
    this.instance();
  }

  disconnect(): void {
    if (this.made) linger(this);
  }

  /** The check itself, made when it is first asked for. */
  instance(): CheckComponent {
    return (this.made ??= this.make()).instance;
  }

  /** Out of the page for long: only what was put in is kept. */
  end(): void {
    this.made?.destroy();
    this.made = undefined;
  }

  /** Puts the fields back to the value that was last set from outside. */
  reset(): void {
    this.typed = undefined;
    this.unread = false;
    if (this.made) this.show(this.made, this.inputs.get('value') ?? null);
  }

  getInputValue(name: string): unknown {
    if (name !== 'value') return this.inputs.get(name);
    return this.unread ? null : this.held();
  }

  setInputValue(name: string, value: unknown): void {
    this.inputs.set(name, value);
    if (name !== 'value') return this.made?.setInput(name, value);
    this.typed = undefined;
    this.unread = false;
    if (this.made) this.show(this.made, value);
  }

  /** The last value that could be sent. */
  private held(): unknown {
    return this.typed ?? this.inputs.get('value');
  }

  private show(made: ComponentRef<CheckComponent>, value: unknown): void {
    // The same again is no change to the check, whatever was typed over it.
    if (this.shown === value) {
      made.instance.reset();
      return;
    }
    this.shown = value;
    made.setInput('value', value);
  }

  private make(): ComponentRef<CheckComponent> {
    const { listener } = this;
    if (!listener) throw new Error('A check needs its element.');
    const application = this.injector.get(ApplicationRef);
    const made = createComponent(this.component, {
      environmentInjector: application.injector,
      hostElement: listener.place,
    });
    for (const [name, value] of this.inputs) if (name !== 'value') made.setInput(name, value);
    this.shown = this.held() ?? null;
    this.unread = false;
    made.setInput('value', this.shown);
    const { valueChange, unread, result, failed } = made.instance;
    valueChange.subscribe((value) => {
      this.typed = value;
      this.unread = false;
      listener.onInput(value);
    });
    unread.subscribe(() => {
      this.unread = true;
      listener.onInput(null);
    });
    result.subscribe((answer) => listener.onResult(answer));
    failed.subscribe((error) => listener.onFailed(error));
    application.attachView(made.hostView);
    made.changeDetectorRef.detectChanges();
    return made;
  }
}

/** Gives each element a strategy of its own. */
export class KeptStrategyFactory implements NgElementStrategyFactory {
  constructor(private readonly component: Type<CheckComponent>) {}

  create(injector: Injector): KeptStrategy {
    return new KeptStrategy(this.component, injector);
  }
}
