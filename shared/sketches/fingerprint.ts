// Fowler, Noll and Vo's FNV-1a, 64 bits: offset basis and prime as they publish them.
const OFFSET = 0xcbf29ce484222325n;
const PRIME = 0x100000001b3n;
const MASK = 0xffffffffffffffffn;

/** FNV-1a hash of an ASCII text as 16 hex digits: the same on every machine, not meant to keep secrets. */
export function fingerprint(text: string): string {
  let hash = OFFSET;
  for (let i = 0; i < text.length; i++) hash = ((hash ^ BigInt(text.charCodeAt(i))) * PRIME) & MASK;
  return hash.toString(16).padStart(16, '0');
}
