import { Problem } from '../../middleware/problem';
import {
  isProblemCode,
  problemKinds,
  type ProblemCode,
  type ProblemKind,
} from '../../middleware/problem-codes';
import { list, ok, type Answer, type Route } from '../../middleware/route';
import { escaped, page } from '../page';

const shared = { method: 'get', policy: { kind: 'public' }, rate: 'free', logged: false } as const;
const vary = { Vary: 'Accept' };

const described = (code: ProblemCode) => {
  const { status, title, retryable, why, remedy }: ProblemKind = problemKinds[code];
  return { type: `/problems/${code}`, code, status, title, retryable, why, remedy };
};

function problemPage(code: ProblemCode): Answer {
  const { status, title, retryable, why, remedy } = described(code);
  return page(
    title,
    `<p class="quiet"><code>${code}</code></p>
<h1>${escaped(title)}</h1>
<p>${escaped(why)}</p>
<h2>What to do</h2>
<p>${escaped(remedy)}</p>
<h2>For programs</h2>
<dl>
<dt>HTTP status</dt><dd><code>${status}</code></dd>
<dt>Code</dt><dd><code>${code}</code></dd>
<dt>The same request may succeed later</dt><dd>${retryable ? 'yes' : 'no'}</dd>
</dl>
<p class="quiet">Every problem carries a requestId: the administrator finds the call in the log by it.
<a href="/problems">All problems</a> · <a href="/docs/">API documentation</a></p>`,
  );
}

function indexPage(codes: readonly ProblemCode[]): Answer {
  const lines = codes.map((code) => {
    const { status, title } = problemKinds[code];
    return `<li><code>${status}</code> <a href="/problems/${code}">${escaped(title)}</a></li>`;
  });
  return page('Problems', `<h1>Problems</h1>\n<ul>\n${lines.join('\n')}\n</ul>`);
}

const asked = (accept: boolean, forPeople: () => Answer, forPrograms: () => Answer): Answer => {
  const answer = (accept ? forPeople : forPrograms)();
  return { ...answer, headers: { ...answer.headers, ...vary } };
};

/** What each code means: a page for people, JSON for programs that ask for it. */
export function problemRoutes(): Route[] {
  const codes = Object.keys(problemKinds).filter(isProblemCode);
  return [
    {
      ...shared,
      path: '/problems',
      handler: ({ request }) =>
        asked(
          request.accepts(['html', 'json']) !== 'json',
          () => indexPage(codes),
          () => list(codes.map(described)),
        ),
    },
    {
      ...shared,
      path: '/problems/:code',
      handler: ({ request, params }) => {
        const code = params.code ?? '';
        if (!isProblemCode(code)) throw new Problem('not-found', 'There is no such problem.');
        return asked(
          request.accepts(['html', 'json']) !== 'json',
          () => problemPage(code),
          () => ok(described(code)),
        );
      },
    },
  ];
}
