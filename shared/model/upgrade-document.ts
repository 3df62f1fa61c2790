import { documentSchema } from '../contracts/document';
import { SCHEMA_VERSION, type SpreadDocument } from './spread';

/** A document of version n as one of version n + 1. */
export type Upgrade = (doc: Readonly<Record<string, unknown>>) => Record<string, unknown>;

/** By the version that each starts from. Version 1 is the first, so there is none yet. */
const UPGRADES: Readonly<Record<number, Upgrade>> = {};

/**
 * A stored document as today's code reads it. Documents of today's version were held against the schema when they
 * were stored and are taken as they are; older ones are upgraded step by step and held against it again.
 *
 * @throws RangeError for a document of no known version, such as one of a newer release.
 */
export function upgradeDocument(
  stored: unknown,
  upgrades: Readonly<Record<number, Upgrade>> = UPGRADES,
  target: number = SCHEMA_VERSION,
): SpreadDocument {
  let doc = stored as Record<string, unknown>;
  let version = versionOf(doc);
  if (version === target) return stored as SpreadDocument;
  while (version !== target) {
    const upgrade = upgrades[version];
    if (!upgrade) throw new RangeError(`a spread document of version ${version} cannot be read`);
    version += 1;
    doc = { ...upgrade(doc), schemaVersion: version };
  }
  return target === SCHEMA_VERSION ? documentSchema.parse(doc) : (doc as unknown as SpreadDocument);
}

function versionOf(doc: unknown): number {
  const version = typeof doc === 'object' && doc !== null && 'schemaVersion' in doc ? doc.schemaVersion : null;
  if (typeof version !== 'number' || !Number.isInteger(version)) throw new RangeError('a spread document without a version');
  return version;
}
