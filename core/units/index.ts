export * from './constants';
export * from './energy';
