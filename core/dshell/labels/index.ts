export { labelLevels, type LabelledLevel, type LabelledLevels, type LabelOptions } from './labelLevels';
export { levelAccount, type ConfigurationShare, type LevelAccount } from './levelAccount';
export { electronJump, type Parentage } from './parentage';
export { fieldNamingGroup, isSymmetric, namingGroup, type NamingGroup } from './namingGroup';
export { cubicFrame, type CubicFrame } from './cubicFrame';
export { ligandGroup } from './ligandGroup';
