/** Every error leaves the service here, as problem details. */
import { STATUS_CODES } from 'node:http';
import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Problem, type ProblemDocument } from './problem.js';

@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<FastifyRequest>();
    const reply = http.getResponse<FastifyReply>();
    const problem = asProblem(error);
    if (problem.status >= 500)
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    void sendProblem(reply, request.url, problem);
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

function messageOf(error: HttpException): string {
  const response = error.getResponse();
  if (typeof response === 'object' && 'message' in response) {
    const { message } = response;
    return Array.isArray(message) ? message.join('; ') : String(message);
  }
  return error.message;
}
