export { demoProject, type DemoProject } from './demoProject';
export type { DemoCandidate } from './demoCandidates';
