import type { ErrorBody } from '@weighhouse/shared/contracts/errors';

/** The error of a refused request. */
export const refusal = (answer: { body: unknown }): ErrorBody['error'] => (answer.body as ErrorBody).error;

/** The fields that a refusal names. */
export const paths = (answer: { body: unknown }): string[] | undefined =>
  refusal(answer).fields?.map((field) => field.path);
