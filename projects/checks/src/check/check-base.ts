import { booleanAttribute, Directive, input, output } from '@angular/core';
import type { Credentials } from '../api/api-client';
import type { ApiError } from '../api/api-error';
import type { CheckAnswer } from '../contract';
import { CheckSession, type CheckKind, type Draft } from './check-session';

/** What every check of the library takes and tells. */
@Directive()
export abstract class CheckBase<Request extends object, Typed extends Draft> {
  /** The request as JSON, numbers with a decimal point; null for an empty form. */
  readonly value = input<Request | null>(null);
  /** A page key (`htp_…`). A secret key is refused before anything is sent. */
  readonly apiKey = input('');
  /** Base address of the service; '' for the page's own origin. */
  readonly server = input('');
  /** The factor profile where the request names none, such as `uk-na` or `uk-na@2`. */
  readonly profile = input('');
  /** What is checked, in the words of the drawing: "north face, level 2". */
  readonly label = input('');
  /** Whether calls carry the page key or the console's own session. */
  readonly credentials = input<Credentials>('key');
  /** Whether the fields can only be read. */
  readonly readonly = input(false, { transform: booleanAttribute });

  /** The request after each change that can be read. */
  readonly valueChange = output<Request>();
  /** Once when the fields, by what was typed, hold nothing any more that can be sent. */
  readonly unread = output();
  /** Each new answer. */
  readonly result = output<CheckAnswer>();
  /** Why there is no answer. */
  readonly failed = output<ApiError>();

  /** How this check's form is written and read. */
  protected abstract readonly kind: CheckKind<Request, Typed>;

  protected readonly session = new CheckSession<Request, Typed>(() => this.kind, {
    value: this.value,
    apiKey: this.apiKey,
    server: this.server,
    profile: this.profile,
    credentials: this.credentials,
    onChange: (request) => this.valueChange.emit(request),
    onUnread: () => this.unread.emit(),
    onAnswer: (answer) => this.result.emit(answer),
    onFailed: (error) => this.failed.emit(error),
  });

  /** Checks at once; undefined where there is nothing that can be sent, or no answer. */
  check(): Promise<CheckAnswer | undefined> {
    return this.session.check();
  }

  /** Puts the form back to the value that was last set from outside. */
  reset(): void {
    this.session.reset();
  }
}
