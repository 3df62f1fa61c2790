/**
 * Runs before `npm start` and `npm test`, on a fresh clone too: plain Node and node: modules only.
 * Brings in what is missing (npm packages, MariaDB and, with --with-browser, Chromium) and nothing else.
 */
import { spawn, spawnSync } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { findChromium, findMariadbd, findMariadbInstallDb, findPrintDefaults, findProgram } from './find-program.mjs';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const OLDEST_NODE = [20, 19];
const TAIL_LINES = 15;

/** A step that failed, in words for the person at the terminal. */
class SetupFailure extends Error {
  constructor(what, advice, output = '') {
    super(what);
    this.advice = advice;
    this.output = output;
  }
}

/** Runs a command quietly, with one line before and one after; its output is shown only when it fails. */
async function longStep(label, advice, command, args, options = {}) {
  const began = Date.now();
  process.stdout.write(`${label} …\n`);
  const heartbeat = setInterval(() => process.stdout.write(`  still at it after ${seconds(began)}\n`), 30_000);
  const { code, output } = await run(command, args, options).finally(() => clearInterval(heartbeat));
  if (code !== 0) throw new SetupFailure(`${label}: failed.`, advice, output);
  process.stdout.write(`  done in ${seconds(began)}\n`);
}

function run(command, args, options) {
  return new Promise((resolve) => {
    let output = '';
    const child = spawn(command, args, { cwd: ROOT, stdio: ['inherit', 'pipe', 'pipe'], ...options });
    const collect = (chunk) => (output = (output + chunk).slice(-20_000));
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.on('error', (error) => resolve({ code: 1, output: output + error.message }));
    child.on('close', (code) => resolve({ code: code ?? 1, output }));
  });
}

const seconds = (began) => `${((Date.now() - began) / 1000).toFixed(0)} s`;

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > OLDEST_NODE[0] || (major === OLDEST_NODE[0] && minor >= OLDEST_NODE[1])) return;
  throw new SetupFailure(
    `Pairleaf needs Node.js ${OLDEST_NODE.join('.')} or newer; this is ${process.versions.node}.`,
    'Install a newer Node.js and run the command again.',
  );
}

/**
 * Whether node_modules holds what the lock file asks for. npm keeps its own list of what it installed, and
 * writes it only when an installation is complete, so an interrupted one counts as missing.
 */
function arePackagesInstalled(withDev) {
  const wanted = readLock('package-lock.json');
  const present = readLock('node_modules/.package-lock.json');
  if (!wanted || !present) return false;
  return Object.entries(wanted).every(([path, entry]) => {
    if (path === '' || entry.link) return true;
    const found = present[path];
    if (found) return found.version === entry.version && found.integrity === entry.integrity;
    return Boolean(entry.optional || entry.devOptional || (entry.dev && !withDev));
  });
}

function readLock(path) {
  try {
    return JSON.parse(readFileSync(join(ROOT, path), 'utf8')).packages;
  } catch {
    return null;
  }
}

async function installPackages() {
  const npm = process.env.npm_execpath;
  const [command, first] = npm ? [process.execPath, [npm]] : ['npm', []];
  await longStep(
    'Installing the npm packages (about a minute)',
    'Check that this machine reaches the npm registry and has 1 GB of free disk, then run the command again.',
    command,
    // Vite and the types are development packages for some: NODE_ENV=production would leave them out.
    [...first, 'ci', '--include=dev', '--no-audit', '--no-fund'],
  );
}

/** How this process may install Debian packages: as root, through sudo, or not at all (null). */
function findAptCommand() {
  if (!findProgram('apt-get')) return null;
  const env = ['env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-o', 'DPkg::Lock::Timeout=300'];
  if (process.getuid?.() === 0) return env;
  if (!findProgram('sudo')) return null;
  if (spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' }).status === 0) return ['sudo', '-n', ...env];
  return process.stdin.isTTY ? ['sudo', ...env] : null;
}

async function installDebianPackages(what, packages) {
  const byHand = `Install it by hand (on Debian or Ubuntu: apt-get install ${packages.join(' ')}) and run the command again.`;
  const apt = findAptCommand();
  if (!apt) throw new SetupFailure(`${what} is missing, and this account cannot install it.`, byHand);
  const [command, ...args] = apt;
  const install = [...args, 'install', '-y', '--no-install-recommends', ...packages];
  const update = () => longStep('Reading the lists of Debian packages', byHand, command, [...args, 'update']);
  let areListsFresh = false;
  if (!hasPackageLists()) {
    await update();
    areListsFresh = true;
  }
  const label = `Installing ${what} (Debian packages ${packages.join(', ')})`;
  try {
    await longStep(label, byHand, command, install);
  } catch (failure) {
    if (areListsFresh) throw failure;
    // An old list names versions that the archive no longer has.
    await update();
    await longStep(label, byHand, command, install);
  }
}

function hasPackageLists() {
  try {
    return readdirSync('/var/lib/apt/lists').some((name) => name.includes('_Packages'));
  } catch {
    return false;
  }
}

async function prepare({ withBrowser }) {
  checkNode();
  if (!arePackagesInstalled(withBrowser)) await installPackages();
  // The core packages hold the programs alone: no system-wide server is set up or started.
  const hasMariadb = findMariadbd() && findMariadbInstallDb() && findPrintDefaults();
  if (!hasMariadb && (withBrowser || !process.env.DATABASE_URL)) {
    await installDebianPackages('MariaDB', ['mariadb-server-core', 'mariadb-client-core']);
  }
  if (withBrowser && !findChromium()) await installDebianPackages('Chromium', ['chromium']);
}

try {
  await prepare({ withBrowser: process.argv.includes('--with-browser') });
} catch (error) {
  if (!(error instanceof SetupFailure)) throw error;
  const tail = error.output.trim().split('\n').slice(-TAIL_LINES).join('\n');
  process.stderr.write(`\n${error.message}\n${tail ? `${tail}\n\n` : ''}${error.advice}\n`);
  process.exitCode = 1;
}
