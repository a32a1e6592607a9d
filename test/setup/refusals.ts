import type { ErrorBody } from '@weighhouse/shared/contracts/errors';

/** The error that a refused request's body carries. */
export const errorOf = (body: unknown): ErrorBody['error'] => (body as ErrorBody).error;

/** The fields that it names. */
export const pathsOf = (body: unknown): string[] => errorOf(body).fields?.map(({ path }) => path) ?? [];

/** The error of a refused request. */
export const refusal = (answer: { body: unknown }): ErrorBody['error'] => errorOf(answer.body);

/** The fields that a refusal names. */
export const paths = (answer: { body: unknown }): string[] => pathsOf(answer.body);
