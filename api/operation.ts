/**
 * One operation of the API: the record that mounts it, checks its requests, says who may use it, and describes it to others.
 * A route that is not such a record does not exist, so the description can't fall behind.
 */
import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Access } from './middleware/access';
import type { ProblemKind } from './middleware/problem';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

export interface Answer {
  readonly status: number;
  readonly says: string;
  readonly schema?: z.ZodType;
  /** Media type, JSON unless said otherwise. */
  readonly type?: string;
}

type Parsed<S> = S extends z.ZodType ? z.output<S> : undefined;

export interface Call<Q, B> {
  readonly request: Request;
  readonly response: Response;
  readonly params: Readonly<Record<string, string>>;
  readonly query: Parsed<Q>;
  readonly body: Parsed<B>;
}

interface OperationOf<Q, B> {
  readonly method: Method;
  /** In Express's notation: `/api/parts/:id`. */
  readonly path: string;
  readonly access: Access;
  readonly summary: string;
  readonly query?: Q;
  readonly body?: B;
  /** Bytes that the body may have, where that is less than for others. */
  readonly bodyLimit?: number;
  readonly answer: Answer;
  /** What it may refuse beyond what its access, query and body imply. */
  readonly refuses?: readonly ProblemKind[];
  handle(call: Call<Q, B>): Promise<void> | void;
}

export type Operation = OperationOf<z.ZodType | undefined, z.ZodType | undefined>;

export const operation = <Q extends z.ZodType | undefined = undefined, B extends z.ZodType | undefined = undefined>(
  record: OperationOf<Q, B>,
): Operation => record as unknown as Operation;

export const changes = (method: Method): boolean => method !== 'get';
