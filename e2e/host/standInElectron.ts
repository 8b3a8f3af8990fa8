import { register } from 'node:module';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

const root = resolve(import.meta.dirname, '../..');
const standIn = pathToFileURL(resolve(root, 'main/testing/fakeElectron.ts')).href;

const hook = `
export async function resolve(specifier, context, next) {
  return specifier === 'electron' ? next(${JSON.stringify(standIn)}, context) : next(specifier, context);
}`;

/** From here on this process gets the stand-in where the built program asks for Electron. */
export function useStandIn(): void {
  register(`data:text/javascript,${encodeURIComponent(hook)}`);
}

export const builtMain = pathToFileURL(resolve(root, 'dist/main/main.js')).href;
export const builtPreload = resolve(root, 'dist/preload/preload.cjs');
