import {
  canInstallDebianPackages,
  findProgram,
  installDebianPackages,
} from '../../server/scripts/debian-packages.mjs';
import { runCommand, say } from '../../server/scripts/run-command.mjs';

/** What reads exported files, or recomputes numbers, without any code of ours. */
const READERS = {
  'LibreOffice Writer': { debianPackage: 'libreoffice-writer', isThere: () => has('lowriter') },
  'LibreOffice Calc': { debianPackage: 'libreoffice-calc', isThere: () => has('localc') },
  'Poppler tools': { debianPackage: 'poppler-utils', isThere: () => has('pdftoppm') },
  R: { debianPackage: 'r-base-core', isThere: () => has('Rscript') },
  'python-docx': { debianPackage: 'python3-docx', isThere: () => pythonHas('docx') },
  openpyxl: { debianPackage: 'python3-openpyxl', isThere: () => pythonHas('openpyxl') },
};

/** Installs the missing ones from Debian when this is root; true when all are there. */
export async function ensureOutsideReaders() {
  const missing = await missingReaders();
  if (missing.length > 0 && canInstallDebianPackages()) {
    await installDebianPackages(missing.map((name) => READERS[name].debianPackage));
  }
  const stillMissing = await missingReaders();
  say(`Outside readers: ${stillMissing.length === 0 ? 'all there' : describe(stillMissing)}.`);
  return stillMissing.length === 0;
}

async function missingReaders() {
  const names = Object.keys(READERS);
  const there = await Promise.all(names.map((name) => READERS[name].isThere()));
  return names.filter((_, position) => !there[position]);
}

function describe(names) {
  return `missing are ${names.join(', ')} (their tests are skipped here and fail in CI)`;
}

async function has(program) {
  return findProgram(program) !== undefined;
}

async function pythonHas(module) {
  return (await runCommand('/usr/bin/python3', ['-c', `import ${module}`], { quiet: true })) === 0;
}
