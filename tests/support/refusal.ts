import { AppError, type ErrorCode } from '@/lib/errors';

/** Code and message of the refusal that an act meets. @throws where it was not refused, or failed otherwise */
export function refusal(act: () => unknown): [ErrorCode, string] {
  try {
    act();
  } catch (error) {
    if (error instanceof AppError) return [error.code, error.message];
    throw error;
  }
  throw new Error('the act was not refused');
}
