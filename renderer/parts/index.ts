import './visuallyHidden.css';
export * from './account';
export * from './chemistry';
export * from './colour';
export * from './feedback';
export * from './input';
export * from './number';
export * from './spin';
