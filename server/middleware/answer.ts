import type { ErrorRequestHandler, Request, Response } from 'express';
import type { Logger } from 'pino';
import type { UsageLog } from '../features/usage/usage-log';
import { callOf } from './call';
import { awayProblem, problemBody, toProblem, type Problem } from './problem';
import { addressOf } from './rate-limit';
import type { Answer } from './route';

export type Send = (request: Request, response: Response, answer: Answer) => Promise<void>;

interface AnswerDeps {
  readonly usage: Pick<UsageLog, 'write'>;
  readonly logger: Logger;
  readonly onKeyUse: (keyId: string) => void;
}

const problemType = 'application/problem+json; charset=utf-8';

const instanceOf = (request: Request): string =>
  (request.originalUrl.split('?', 1)[0] ?? '').slice(0, 500);

function problemAnswer(problem: Problem, request: Request, requestId: string): Answer {
  return {
    status: problem.status,
    body: problemBody(problem, instanceOf(request), requestId),
    contentType: problemType,
    headers: { 'Cache-Control': 'no-store', ...problem.headers },
  };
}

function write(response: Response, answer: Answer, content: string | Uint8Array): void {
  response.statusCode = answer.status;
  for (const [name, value] of Object.entries(answer.headers ?? {})) response.setHeader(name, value);
  if (answer.status === 204 || answer.status === 304) return void response.end();
  response.setHeader('Content-Type', answer.contentType ?? 'application/json; charset=utf-8');
  response.setHeader('Content-Length', Buffer.byteLength(content));
  response.end(content);
}

const contentOf = ({ body }: Answer): string | Uint8Array =>
  typeof body === 'string' || body instanceof Uint8Array ? body : JSON.stringify(body);

/** The one place that writes answers: first the row of the call, committed, then the answer. */
export function answers({ usage, logger, onKeyUse }: AnswerDeps): {
  send: Send;
  fail: ErrorRequestHandler;
} {
  const sendCoded = async (
    request: Request,
    response: Response,
    answer: Answer,
    code: string | null,
  ): Promise<void> => {
    const call = callOf(response);
    const { status } = answer;
    const content = contentOf(answer);
    const ending = { method: request.method, status, code, address: addressOf(request) };
    if (call.isLogged(status)) await usage.write(call, ending);
    write(response, answer, content);
    if (call.key) onKeyUse(call.key.id);
    logger.info({
      requestId: call.id,
      method: request.method,
      route: call.route,
      status,
      code: code ?? undefined,
      selector: call.keySelector,
      person: call.person?.id,
      microseconds: call.microseconds,
    });
  };

  const sendProblem = async (
    request: Request,
    response: Response,
    problem: Problem,
  ): Promise<void> => {
    const call = callOf(response);
    if (problem.status >= 500)
      logger.error({ requestId: call.id, code: problem.code, cause: causeOf(problem) });
    try {
      const answer = problemAnswer(problem, request, call.id);
      await sendCoded(request, response, answer, problem.code);
    } catch (error) {
      sendUnlogged(request, response, error, problem);
    }
  };

  /** Nothing but a 503 ever goes out without its row. */
  const sendUnlogged = (
    request: Request,
    response: Response,
    error: unknown,
    first?: Problem,
  ): void => {
    const call = callOf(response);
    const problem = first?.status === 503 ? first : awayProblem('log-unavailable');
    logger.error({ requestId: call.id, code: problem.code, cause: messageOf(error) });
    if (response.headersSent) return void response.destroy();
    const answer = problemAnswer(problem, request, call.id);
    write(response, answer, contentOf(answer));
  };

  return {
    send: async (request, response, answer) => {
      try {
        await sendCoded(request, response, answer, null);
      } catch (error) {
        sendUnlogged(request, response, error);
      }
    },
    // Express knows an error handler by its four parameters.
    fail: (error: unknown, request, response, _next) => {
      void sendProblem(request, response, toProblem(error));
    },
  };
}

/** A driver's error object can hold a password: only its message is printed. */
const messageOf = (error: unknown): string => (error instanceof Error ? error.message : 'unknown');

function causeOf(problem: Problem): string | undefined {
  const { cause } = problem;
  if (cause === undefined) return undefined;
  return problem.code === 'unexpected' && cause instanceof Error ? cause.stack : messageOf(cause);
}
