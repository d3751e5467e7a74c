import type * as z from 'zod';
import type { Refused } from '../planning/fault.ts';

/** One POST of the service: what it reads, what it answers, and the function between. */
export interface Operation<Request extends z.ZodType, Response extends z.ZodType> {
  readonly url: string;
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: string;
  readonly request: Request;
  readonly response: Response;
  /** one request that the document shows and that warms the service up before it says ready */
  readonly example: z.input<Request>;
  readonly answer: (question: z.output<Request>) => z.output<Response> | Refused;
}
