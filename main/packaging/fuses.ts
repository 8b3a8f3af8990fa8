import { FuseV1Options } from '@electron/fuses';

/**
 * How the switches in Electron's binary are set, each by its place in the wire. They close what the program does not use:
 * running the binary as plain Node, its environment variable and its inspector, code beside the archive, `file:` powers.
 */
export const wantedFuses: Readonly<Record<FuseV1Options, boolean>> = {
  [FuseV1Options.RunAsNode]: false,
  [FuseV1Options.EnableCookieEncryption]: true,
  [FuseV1Options.EnableNodeOptionsEnvironmentVariable]: false,
  [FuseV1Options.EnableNodeCliInspectArguments]: false,
  [FuseV1Options.EnableEmbeddedAsarIntegrityValidation]: true,
  [FuseV1Options.OnlyLoadAppFromAsar]: true,
  [FuseV1Options.LoadBrowserProcessSpecificV8Snapshot]: false,
  [FuseV1Options.GrantFileProtocolExtraPrivileges]: false,
};
