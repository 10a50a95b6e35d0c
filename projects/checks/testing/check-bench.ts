import type { InputSignal, Type } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { HEADTREE_FETCH } from '../src/api/api-client';
import type { CheckAnswer, ProblemItem, SectionLine } from '../src/contract';

/** What the service says when it is asked to check. */
export type Reply =
  { readonly answer: CheckAnswer } | { readonly problem: readonly ProblemItem[] } | 'away';

interface Check<Request> {
  readonly value: InputSignal<Request | null>;
}

/** A check's component with a service that says what it is told to; timers are jest's own. */
export class CheckBench<Request extends object, Component extends Check<Request>> {
  reply: Reply = 'away';
  /** The requests that were sent, the last one last. */
  readonly sent: Request[] = [];
  /** The checks that were asked for, by the last part of their address. */
  readonly asked: string[] = [];
  /** What the catalogue holds of any name. */
  sections: readonly SectionLine[] = [];
  readonly fixture: ComponentFixture<Component>;

  constructor(component: Type<Component>, value: Request | null, inputs: object = {}) {
    const useValue = (url: string, init: RequestInit) => this.respond(url, init);
    TestBed.configureTestingModule({ providers: [{ provide: HEADTREE_FETCH, useValue }] });
    this.fixture = TestBed.createComponent(component);
    const given = { value, apiKey: 'htp_x', ...inputs };
    for (const [name, input] of Object.entries(given))
      this.fixture.componentRef.setInput(name, input);
  }

  get host(): Element {
    return this.fixture.nativeElement as Element;
  }

  get check(): Component {
    return this.fixture.componentInstance;
  }

  /** Lets time pass. */
  async pass(ms = 300): Promise<void> {
    this.fixture.detectChanges();
    await jest.advanceTimersByTimeAsync(ms);
    this.fixture.detectChanges();
  }

  private respond(url: string, init: RequestInit): Promise<Response> {
    if (url.includes('/v1/formulas/')) return Promise.resolve(response({}, 404));
    if (!url.includes('/v1/checks/')) {
      const items = url.includes('/v1/sections') ? this.sections : [];
      return Promise.resolve(response({ items, nextPageToken: null }));
    }
    this.asked.push(/checks\/([\w-]+)/.exec(url)?.[1] ?? '');
    this.sent.push(JSON.parse(init.body as string) as Request);
    const { reply } = this;
    if (reply === 'away') return Promise.reject(new TypeError('network'));
    if ('answer' in reply) return Promise.resolve(response(reply.answer));
    const problem = { code: 'not-valid', detail: 'Not valid.', errors: reply.problem };
    return Promise.resolve(response(problem, 422));
  }
}

function response(body: unknown, status = 200): Response {
  const headers = new Headers();
  return { ok: status < 300, status, headers, json: () => Promise.resolve(body) } as Response;
}
