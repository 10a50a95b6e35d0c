import type { Express, RequestHandler } from 'express';
import type { Send } from './answer';
import { authorise } from './authorise';
import { jsonBody } from './body';
import { callOf } from './call';
import { Problem } from './problem';
import { readQuery } from './query';
import type { Route } from './route';

interface MountDeps {
  readonly send: Send;
  readonly rate: RequestHandler;
}

const takesBody = ({ method, body }: Route): boolean =>
  (method === 'post' || method === 'patch') && body !== 'none';

const pass: RequestHandler = (_request, _response, next) => next();

/** Names the call by its route: the log never holds a path as the caller wrote it. */
const begin =
  ({ path, logged, check }: Route): RequestHandler =>
  (_request, response, next) => {
    const call = callOf(response);
    call.route = path;
    if (logged) call.logged = 'always';
    if (check !== undefined) call.note({ checkId: check });
    next();
  };

const handle =
  ({ query: allowed, handler }: Route, send: Send): RequestHandler =>
  async (request, response) => {
    const call = callOf(response);
    const answer = await handler({
      request,
      call,
      key: call.key,
      person: call.person,
      params: request.params as Readonly<Record<string, string>>,
      query: readQuery(request, allowed),
      body: request.body,
    });
    await send(request, response, answer);
  };

/** Each route's way: its name, the limit, its policy, the body, the handler, the answer. */
export function mount(app: Express, routes: readonly Route[], { send, rate }: MountDeps): void {
  for (const route of routes) {
    app[route.method](
      route.path,
      begin(route),
      route.rate === 'counted' ? rate : pass,
      authorise(route.policy),
      ...(takesBody(route) ? jsonBody : []),
      handle(route, send),
    );
  }
  app.use('/v1', rate);
  app.use(nowhere(routes));
}

/** A path of the table as an expression; the parameters of our paths never cross a slash. */
const expressionOf = (path: string): RegExp =>
  new RegExp(`^${path.replace(/[.*+?^${}()|[\]\\]/g, '\\$&').replace(/:\w+/g, '[^/]+')}$`);

/** 404; where only the method is wrong, it says which is right. */
function nowhere(routes: readonly Route[]): RequestHandler {
  const known = routes.map(({ method, path }) => ({ method, expression: expressionOf(path) }));
  return (request) => {
    const methods = known
      .filter(({ expression }) => expression.test(request.path))
      .map(({ method }) => method.toUpperCase());
    if (methods.length === 0) throw new Problem('not-found', 'There is nothing at this path.');
    throw new Problem('not-found', `This path answers ${methods.join(', ')} only.`, {
      headers: { Allow: methods.join(', ') },
    });
  };
}
