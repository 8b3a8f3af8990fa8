import { schemaV1 } from './v1';

/** Every schema version ever shipped, oldest first. */
export const schemaVersions = [{ version: 1, stores: schemaV1 }] as const;

export const currentSchemaVersion = schemaVersions.at(-1)!.version;

/** IndexedDB counts in tens of Dexie's versions, so that others may slip steps in between. */
export const nativeVersion = (version: number): number => version * 10;
