import type { MirrorFolder } from '../files/mirror/mirrorFolder';
import type { Handlers } from './answerCalls';

export type MirrorHandlers = Pick<
  Handlers,
  | 'mirrorStatus'
  | 'mirrorWrite'
  | 'mirrorProjects'
  | 'mirrorRead'
  | 'mirrorSnapshots'
  | 'mirrorReadSnapshot'
  | 'mirrorTakeSnapshot'
>;

/** The calls that a folder of copies answers; which folder may change while the program runs. */
export function mirrorHandlers(current: () => MirrorFolder) {
  return {
    mirrorStatus: () => current().status(),
    mirrorWrite: (copy) => current().write(copy),
    mirrorProjects: () => current().projects(),
    mirrorRead: ({ projectId }) => current().read(projectId),
    mirrorSnapshots: ({ projectId }) => current().snapshots(projectId),
    mirrorReadSnapshot: ({ projectId, snapshotId }) => current().readSnapshot(projectId, snapshotId),
    mirrorTakeSnapshot: ({ copy, reason }) => current().takeSnapshot(copy, reason),
  } as const satisfies {
    readonly [N in keyof MirrorHandlers]: (payload: Parameters<MirrorHandlers[N]>[0]) => unknown;
  };
}
