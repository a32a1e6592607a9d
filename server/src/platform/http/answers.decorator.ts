import { applyDecorators, HttpCode, SerializeOptions } from '@nestjs/common';
import { ApiResponse } from '@nestjs/swagger';
import { errorBodySchema } from '@weighhouse/shared/contracts/errors';
import type { z } from 'zod';

/**
 * The one declaration of what a route answers: rows leave only through this schema (what it does not list is
 * stripped), and the OpenAPI document shows it.
 */
export const Answers = (schema: z.ZodType, status = 200) =>
  applyDecorators(
    HttpCode(status),
    SerializeOptions({ schema }),
    ApiResponse({ status, standardSchema: schema }),
    ApiResponse({ status: '4XX', description: 'Refused, with the reason', standardSchema: errorBodySchema }),
  );

/** A route that answers a file and no JSON. */
export const AnswersFile = (...mediaTypes: string[]) =>
  applyDecorators(
    ApiResponse({
      status: 200,
      content: Object.fromEntries(
        mediaTypes.map((type) => [type, { schema: { type: 'string', format: 'binary' } }]),
      ),
    }),
    ApiResponse({ status: '4XX', description: 'Refused, with the reason', standardSchema: errorBodySchema }),
  );
