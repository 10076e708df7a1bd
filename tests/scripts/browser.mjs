import { existsSync } from 'node:fs';
import {
  canInstallDebianPackages,
  findProgram,
  installDebianPackages,
} from '../../server/scripts/debian-packages.mjs';
import { say } from '../../server/scripts/run-command.mjs';

const PROGRAMS = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'chrome',
];
const USUAL_PLACES = [
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
];

/** The path of an installed Chrome or Chromium, or undefined; EVENHAND_CHROMIUM goes first. */
export function findBrowser() {
  const named = process.env.EVENHAND_CHROMIUM;
  if (named) return existsSync(named) ? named : undefined;
  return PROGRAMS.map(findProgram).find(Boolean) ?? USUAL_PLACES.find((path) => existsSync(path));
}

/** Installs Debian's Chromium when there is no browser and this is root; true when there is one. */
export async function ensureBrowser() {
  if (!findBrowser() && canInstallDebianPackages()) await installDebianPackages(['chromium']);
  const browser = findBrowser();
  say(browser ? `Browser: ${browser}` : NO_BROWSER);
  return browser !== undefined;
}

const NO_BROWSER =
  'Browser: none found. Install Chrome or Chromium (on Debian: apt-get install chromium), ' +
  'or name one in EVENHAND_CHROMIUM.';
