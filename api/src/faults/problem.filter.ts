/** Every error leaves the service here, as problem details. */
import { STATUS_CODES } from 'node:http';
import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { databaseDown, Problem, type ProblemDocument } from './problem.js';

@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  /** @param databaseAnswers asked after a failure that nothing in the service accounts for */
  constructor(private readonly databaseAnswers: () => Promise<boolean>) {}

  async catch(error: unknown, host: ArgumentsHost): Promise<void> {
    const http = host.switchToHttp();
    const request = http.getRequest<FastifyRequest>();
    const reply = http.getResponse<FastifyReply>();
    const problem = await this.problemOf(error);
    if (problem.status >= 500) this.logger.error(logged(error, problem));
    await sendProblem(reply, request.url, problem);
  }

  private async problemOf(error: unknown): Promise<Problem> {
    const problem = asProblem(error);
    return problem.status === 500 && problem !== error && !(await this.databaseAnswers()) ? databaseDown() : problem;
  }
}

export function sendProblem(reply: FastifyReply, url: string, problem: Problem): FastifyReply {
  const document: ProblemDocument = {
    type: 'about:blank',
    title: STATUS_CODES[problem.status] ?? 'Error',
    status: problem.status,
    detail: problem.message,
    instance: url.split('?')[0] ?? url,
    code: problem.code,
    ...(problem.extra.faults === undefined ? {} : { faults: [...problem.extra.faults] }),
    ...(problem.extra.current === undefined ? {} : { current: problem.extra.current }),
  };
  return reply.status(problem.status).header('content-type', 'application/problem+json').send(JSON.stringify(document));
}

export function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof HttpException) {
    const status = error.getStatus();
    if (status === 413) return tooLarge();
    return new Problem(
      status,
      status === 404 ? 'not-found' : status === 400 ? 'wrong-request' : 'refused',
      messageOf(error),
    );
  }
  if (
    error instanceof Error &&
    'statusCode' in error &&
    typeof error.statusCode === 'number' &&
    error.statusCode < 500
  ) {
    return error.statusCode === 413 ? tooLarge() : new Problem(error.statusCode, 'wrong-request', error.message);
  }
  return new Problem(500, 'internal', 'The service failed; the failure is in its log. Nothing was saved.');
}

function tooLarge(): Problem {
  return new Problem(413, 'too-large', 'The body is larger than 20 MB.');
}

/** A database that is away needs no stack; what nobody expected does. */
function logged(error: unknown, problem: Problem): string {
  return problem.status !== 503 && error instanceof Error ? (error.stack ?? error.message) : problem.message;
}

function messageOf(error: HttpException): string {
  const response = error.getResponse();
  if (typeof response === 'object' && 'message' in response) {
    const { message } = response;
    return Array.isArray(message) ? message.join('; ') : String(message);
  }
  return error.message;
}
