import { z } from 'zod';
import { snapshotReasons } from './bridge';
import type { CallName, Calls } from './contract';
import { externalLinks, type LinkId } from './links';

/** Limits on what the page may send; above the largest honest payload, far below what would exhaust the memory. */
export const payloadLimits = { bytes: 400e6, extras: 500, name: 150, recent: 20 } as const;

const windowsDevice = /^(con|prn|aux|nul|com\d|lpt\d)(\.|$)/i;

/** A file name that every system accepts and that cannot leave its folder. */
export const fileNameSchema = z
  .string()
  .min(1)
  .max(payloadLimits.name)
  .regex(
    /^[^\\/:*?"<>|\u0000-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]+$/u,
    'holds a character that is not allowed',
  )
  .refine((name) => !/^[.\s-]|[.\s]$/.test(name), 'begins or ends with a dot, a dash or a space')
  .refine((name) => !windowsDevice.test(name), 'is the name of a device on Windows');

const dataSchema = z.union([
  z.string().max(payloadLimits.bytes),
  z.instanceof(Uint8Array).refine((bytes) => bytes.byteLength <= payloadLimits.bytes, 'is too large'),
]);
const kindSchema = z.enum(['bundle', 'spectrum', 'json', 'csv', 'text', 'html', 'svg', 'png', 'pdf', 'any']);
/** Never becomes part of a path: folders are named after its hash. */
export const idSchema = z.string().min(1).max(100);
export const snapshotIdSchema = z
  .string()
  .regex(/^\d{8}T\d{9}Z-[a-z-]{1,30}$/, 'is not the id of a snapshot');
const handleSchema = z.string().max(60) as unknown as z.ZodType<Calls['saveAgain']['payload']['handle']>;
const lineSchema = z.string().max(300);

export const projectCopySchema = z.strictObject({
  projectId: idSchema,
  projectName: z.string().min(1).max(200),
  bundle: z.string().min(2).max(payloadLimits.bytes),
  extras: z
    .array(z.strictObject({ name: fileNameSchema, data: dataSchema }))
    .max(payloadLimits.extras)
    .optional(),
});
export const snapshotRequestSchema = z.strictObject({
  copy: projectCopySchema,
  reason: z.enum(snapshotReasons),
});

const nothing = z.null();

/** One schema per call; whatever does not fit is refused before a handler sees it. */
export const payloadSchemas: { readonly [N in CallName]: z.ZodType<Calls[N]['payload']> } = {
  hostInfo: nothing,
  saveFile: z.strictObject({ kind: kindSchema, suggestedName: fileNameSchema, data: dataSchema }),
  saveAgain: z.strictObject({ handle: handleSchema, data: dataSchema }),
  openFiles: z.strictObject({ kind: kindSchema, many: z.boolean() }),
  dragOut: z.strictObject({ name: fileNameSchema, data: dataSchema }),
  print: nothing,
  printToPdf: z.strictObject({
    suggestedName: fileNameSchema,
    pageSize: z.enum(['A4', 'Letter']),
    landscape: z.boolean(),
  }),
  setMenuState: z.strictObject({
    projectOpen: z.boolean(),
    undo: lineSchema.nullable(),
    redo: lineSchema.nullable(),
    recent: z.array(z.strictObject({ projectId: idSchema, name: lineSchema })).max(payloadLimits.recent),
  }),
  reload: nothing,
  setUnsaved: z.strictObject({ what: lineSchema.nullable() }),
  theme: nothing,
  setTheme: z.strictObject({ choice: z.enum(['system', 'light', 'dark']) }),
  openExternal: z.strictObject({ link: z.enum(Object.keys(externalLinks) as [LinkId, ...LinkId[]]) }),
  mirrorStatus: nothing,
  mirrorChooseFolder: nothing,
  mirrorRevealFolder: nothing,
  mirrorWrite: projectCopySchema,
  mirrorProjects: nothing,
  mirrorRead: z.strictObject({ projectId: idSchema }),
  mirrorSnapshots: z.strictObject({ projectId: idSchema }),
  mirrorReadSnapshot: z.strictObject({ projectId: idSchema, snapshotId: snapshotIdSchema }),
  mirrorTakeSnapshot: snapshotRequestSchema,
  pageReady: nothing,
  flushed: z.strictObject({
    request: z.int().nonnegative(),
    answer: z.union([
      z.strictObject({ state: z.literal('saved') }),
      z.strictObject({ state: z.literal('unsaved'), what: lineSchema }),
    ]),
  }),
};
