import './visuallyHidden.css';
export * from './account';
export * from './chemistry';
export * from './colour';
export * from './feedback';
export * from './help';
export * from './input';
export * from './number';
export * from './spin';
