export { polyhedra, polyhedron, vertexAngles, type Place, type Polyhedron } from './polyhedra/polyhedra';
export { angleBetween, anglesOf, direction } from './polyhedra/direction';
export { arrangementGroup } from '../symmetry';
export { isomersOf, type Isomer } from './isomers/isomersOf';
export { type Arrangement, type Site } from './isomers/site';
export { distort, type Distortion, type PlacedVertex } from './distortion/distort';
export { ligandPositions, type LigandPosition } from './ligandPositions';
