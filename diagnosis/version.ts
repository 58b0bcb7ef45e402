import type { Knowledge } from './garments/schema';

/** Raised by hand when the engine would answer differently. */
export const ENGINE_SEMVER = '1.0.0';

const versions = new WeakMap<Knowledge, string>();

/** Semver of the engine and a hash of the knowledge: two readings with the same version had the same rules. */
export function engineVersion(knowledge: Knowledge): string {
  const version = versions.get(knowledge) ?? `${ENGINE_SEMVER}+${hashOf(JSON.stringify(knowledge))}`;
  versions.set(knowledge, version);
  return version;
}

/** Two 32-bit FNV-1a hashes with different offsets, 16 hex digits; to tell versions apart, not to keep secrets. */
export function hashOf(text: string): string {
  let a = 0x811c9dc5;
  let b = 0x9747b28c;
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i);
    a = Math.imul(a ^ code, 0x01000193);
    b = Math.imul(b ^ (code + i), 0x01000193);
  }
  return [a, b].map((part) => (part >>> 0).toString(16).padStart(8, '0')).join('');
}
