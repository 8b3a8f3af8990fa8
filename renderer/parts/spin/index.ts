export { SpinBar } from './SpinBar';
