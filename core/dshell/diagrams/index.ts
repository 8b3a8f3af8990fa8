export { type DiagramParameter } from './parameter';
export {
  levelDiagram,
  type DiagramCurve,
  type DiagramRange,
  type GroundChange,
  type LevelDiagram,
} from './levelDiagram';
