import { randomBytes } from 'node:crypto';
import pino, { type DestinationStream, type Logger } from 'pino';
import { redact, redactText } from './redact';

/** A log of JSON lines in which secrets and addresses of persons are hidden, whatever is handed to it. */
export function createLog(level: string, destination?: DestinationStream): Logger {
  return pino(
    {
      level,
      base: undefined,
      timestamp: pino.stdTimeFunctions.isoTime,
      formatters: {
        level: (label) => ({ level: label }),
        log: (fields) => redact(fields) as Record<string, unknown>,
      },
      // Errors are turned into plain fields by redact, before pino's own serializer could print them whole.
      serializers: { err: (error) => error },
      hooks: {
        logMethod(args, method) {
          const [first, ...rest] = args as unknown[];
          const fields = first instanceof Error ? { err: first } : first;
          // Without a message pino would take the error's own, as it is.
          const message = rest.length === 0 && hasError(fields) ? [fields.err.message] : rest;
          const cleaned = [fields, ...message].map((part) => (typeof part === 'string' ? redactText(part) : part));
          method.apply(this, cleaned as Parameters<typeof method>);
        },
      },
    },
    destination as DestinationStream,
  );
}

function hasError(fields: unknown): fields is { err: Error } {
  return typeof fields === 'object' && fields !== null && 'err' in fields && fields.err instanceof Error;
}

export const log = createLog(process.env.LOG_LEVEL ?? 'info');

/** Logs a surprise and returns the id under which the log has it, to be shown to the user. */
export function logSurprise(error: unknown, context: Record<string, unknown> = {}, to: Logger = log): string {
  const errorId = randomBytes(6).toString('hex');
  to.error({ errorId, err: error, ...context }, 'unexpected failure');
  return errorId;
}
