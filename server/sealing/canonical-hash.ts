import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';

/**
 * SHA-256 of a value's canonical JSON (RFC 8785), 64 hexadecimal digits in lower case: the same for the same content
 * whatever the order of its fields. @throws Error for what is no JSON, so that nothing is ever signed as nothing.
 */
export function hashOfContent(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new Error('only JSON content has a hash');
  return createHash('sha256').update(text).digest('hex');
}
