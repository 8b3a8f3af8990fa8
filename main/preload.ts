import { contextBridge, ipcRenderer } from 'electron';
import {
  callChannel,
  callNames,
  type DesktopApi,
  eventChannel,
  eventFunctions,
  eventNames,
} from '../renderer/host/contract';

/**
 * The page gets one function per call and one per event of the contract, and nothing else: no channel of its own choice,
 * no event object of Electron's.
 */
const calls = callNames.map((name) => [
  name,
  (payload: unknown): Promise<unknown> => ipcRenderer.invoke(callChannel(name), payload),
]);
const events = eventNames.map((name) => [
  eventFunctions[name],
  (listener: (value: unknown) => void): (() => void) => {
    const pass = (_event: unknown, value: unknown): void => listener(value);
    ipcRenderer.on(eventChannel(name), pass);
    return () => ipcRenderer.removeListener(eventChannel(name), pass);
  },
]);

contextBridge.exposeInMainWorld('spinhue', Object.fromEntries([...calls, ...events]) as DesktopApi);
