import 'server-only';
import { InvalidInput, NotFound, TooLarge } from '@/lib/errors';
import { KernelError } from '@/lib/geometry/kernel';
import type { PackedError } from './export.types';

/** The error as it was thrown in the thread, so that callers can tell a bad input from a fault. */
export function unpack(packed: PackedError): Error {
  const { name, message, issues, what, operation, status } = packed;
  if (name === 'InvalidInput') return new InvalidInput(issues as InvalidInput['issues']);
  if (name === 'NotFound') return new NotFound(String(what));
  if (name === 'TooLarge') return new TooLarge(message);
  if (name === 'KernelError') return new KernelError(String(operation), String(status));
  return new Error(message);
}
