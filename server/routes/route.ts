import type * as z from 'zod';
import type { StudyAction, StudyRole } from '#shared/permissions';
import type { Dependencies } from '../dependencies';
import type { Outcome } from '../errors/server-issue';
import type { Study } from '../models/study/study-store';
import type { User } from '../models/user/user-store';
import type { BrowserSession } from '../session/browser-session';
import type { LimitName } from './limits';

/** Methods that routes answer. */
export type HttpMethod = 'get' | 'post' | 'put' | 'patch' | 'delete';

/**
 * Who may call a route. On a study the role needs one of `anyOf` to be let in at all; where the
 * request decides what is needed (a step on a block), `decide` gives the actions, all needed.
 */
export type Access =
  | { readonly kind: 'public' }
  | { readonly kind: 'signedIn' }
  | { readonly kind: 'administrator' }
  | {
      readonly kind: 'study';
      readonly anyOf: readonly StudyAction[];
      readonly decide: ((call: AnyCall) => Promise<Outcome<readonly StudyAction[]>>) | null;
    };

/** What a route sends when it succeeds. */
export type Reply<Value> =
  | { readonly kind: 'json'; readonly status: number; readonly schema: z.ZodType<Value> }
  | { readonly kind: 'empty'; readonly status: number }
  | { readonly kind: 'file'; readonly contentType: string };

/** A file to download; `fileName` may hold any characters. */
export interface FileReply {
  readonly fileName: string;
  readonly bytes: Uint8Array;
}

/** A multipart field that carries the file; the other fields are the body. */
export interface UploadField {
  readonly field: string;
}

/** A file that arrived. It lies at `path` until the handler is done; move it to keep it. */
export interface UploadedFile {
  readonly path: string;
  readonly fileName: string;
  readonly sizeInBytes: number;
}

/** The names behind colons in a path, each with its text. */
export type PathParameters<Path extends string> =
  Path extends `${string}:${infer Name}/${infer Rest}`
    ? Readonly<Record<Name, string>> & PathParameters<`/${Rest}`>
    : Path extends `${string}:${infer Name}`
      ? Readonly<Record<Name, string>>
      : unknown;

/** A request, read and admitted. */
export interface Call<Parameters = unknown, Body = unknown, Query = unknown, File = unknown> {
  readonly dependencies: Dependencies;
  readonly session: BrowserSession;
  readonly params: Parameters;
  readonly body: Body;
  readonly query: Query;
  readonly file: File;
}

/** What a signed-in person adds to a call. */
export interface ByPerson {
  readonly person: User;
}

/** What a study adds to a call of a member. */
export interface OnStudy extends ByPerson {
  readonly study: Study;
  readonly role: StudyRole;
}

/** A call before its route narrows it. */
export type AnyCall = Call & Partial<OnStudy>;

/** A value that nobody changes, all the way down. */
export type Unchanging<Value> = Value extends readonly (infer Member)[]
  ? readonly Unchanging<Member>[]
  : Value extends Uint8Array
    ? Value
    : Value extends object
      ? { readonly [Key in keyof Value]: Unchanging<Value[Key]> }
      : Value;

/** A route as the register, the OpenAPI description and the tests read it. */
export interface Route {
  readonly method: HttpMethod;
  readonly path: string;
  readonly access: Access;
  readonly summary: string;
  readonly body: z.ZodType | null;
  readonly query: z.ZodType | null;
  readonly upload: UploadField | null;
  readonly reply: Reply<unknown>;
  readonly limit: LimitName | null;
  readonly handle: (call: AnyCall) => Promise<Outcome<unknown>>;
}
