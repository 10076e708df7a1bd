import type { Request } from 'express';
import type { User } from '../models/user/user-store';

/** Who is signed in on this request, or null. */
export function personOf(request: Request): User | null {
  return (request.user as User | undefined) ?? null;
}
