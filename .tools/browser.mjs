/**
 * Finds a Chromium, Chrome or Edge in the usual places of Linux, macOS and Windows. CHROME_PATH wins.
 * Run by itself it prints the program, and fails when there is none.
 */
import { accessSync, constants, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { editorTests, isStarted } from './paths.mjs';

const commands = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'microsoft-edge',
  'microsoft-edge-stable',
];
const applications = ['Chromium', 'Google Chrome', 'Microsoft Edge'];
const programs = [
  ['Chromium', 'Application', 'chrome.exe'],
  ['Google', 'Chrome', 'Application', 'chrome.exe'],
  ['Microsoft', 'Edge', 'Application', 'msedge.exe'],
];

/** Path of the browser's program, or nothing. */
export function findBrowser(environment = process.env, platform = process.platform) {
  if (environment.CHROME_PATH) return environment.CHROME_PATH;
  return candidates(environment, platform).find(isProgram);
}

export const browserAdvice =
  'No Chromium, Chrome or Edge was found. Install one (on Debian or Ubuntu: sudo apt-get install chromium), ' +
  'or name its program in CHROME_PATH.';

/** @returns {string[]} */
function candidates(environment, platform) {
  if (platform === 'darwin') {
    return ['/Applications', join(environment.HOME ?? '', 'Applications')].flatMap((folder) =>
      applications.map((name) => `${folder}/${name}.app/Contents/MacOS/${name}`),
    );
  }
  if (platform === 'win32') {
    return ['ProgramFiles', 'ProgramFiles(x86)', 'LocalAppData']
      .map((name) => environment[name])
      .filter((folder) => folder !== undefined)
      .flatMap((folder) => programs.map((parts) => join(folder, ...parts)));
  }
  const folders = [...(environment.PATH ?? '').split(delimiter), '/usr/bin', '/usr/local/bin', '/snap/bin'];
  return commands.flatMap((name) => folders.map((folder) => join(folder, name)));
}

function isProgram(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** A fresh profile in which the workbench's panels may use their storage, which browsers block by default. */
export function freshProfile(name) {
  const folder = join(editorTests, 'node_modules', '.workbench', `profile-${name}`);
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(join(folder, 'Default'), { recursive: true });
  const preferences = { profile: { cookie_controls_mode: 0, block_third_party_cookies: false } };
  writeFileSync(join(folder, 'Default', 'Preferences'), JSON.stringify(preferences));
  return folder;
}

if (isStarted(import.meta.url)) {
  const program = findBrowser();
  if (program === undefined) process.exitCode = 1;
  console.log(program ?? browserAdvice);
}
