import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild, NEXT } from './build.mjs';
import { openMail } from './mail.mjs';
import { checkNodeVersion, ensureNodeModules } from './node-modules.mjs';
import { STATE } from './places.mjs';
import { isPortFree } from './ports.mjs';
import { openProductDatabase, prepareDatabase } from './product-database.mjs';
import { PlainProblem, say } from './say.mjs';
import { ensureSecrets } from './secrets.mjs';
import { StopSignal } from './stop-signal.mjs';
import { Supervisor } from './supervisor.mjs';

const DEFAULT_PORT = 3100;
const PID_FILE = join(STATE, 'running.json');

/**
 * From a bare clone to a served product, and down again in good order.
 * @param {{ reload: boolean }} mode with `reload`, Next's development server instead of a build
 * @returns {Promise<number>} the exit code
 */
export async function serve({ reload }) {
  const supervisor = new Supervisor();
  const stop = new StopSignal(() => supervisor.kill());
  checkNodeVersion();
  const port = readPort(process.env.PORT);
  await refuseBusyPort(port);
  const secrets = ensureSecrets();
  await ensureNodeModules();
  stop.check();
  const database = await openProductDatabase(secrets);
  try {
    stop.check();
    const signIns = await prepareDatabase(database);
    stop.check();
    if (!reload) await ensureBuild('.next');
    stop.check();
    const address = `http://127.0.0.1:${port}`;
    const mail = await openMail(supervisor, join(STATE, 'outbox'));
    await supervisor.start({
      name: 'web',
      command: process.execPath,
      args: [NEXT, reload ? 'dev' : 'start', '-H', '127.0.0.1', '-p', String(port)],
      env: {
        NODE_ENV: reload ? 'development' : 'production',
        NEXT_TELEMETRY_DISABLED: '1',
        NEXTAUTH_URL: address,
        NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET ?? secrets.sessionSecret,
        DATABASE_URL: database.appUrl,
        ...mail,
      },
      healthUrl: `${address}/api/health`,
      echo: reload,
    });
    stop.check();
    writeFileSync(PID_FILE, JSON.stringify({ pid: process.pid, address }));
    announce(address, signIns, 'MARLWICK_OUTBOX' in mail);
    const why = await Promise.race([stop.told, supervisor.fallen]);
    say(why === undefined ? '\nStopping Marlwick.' : why);
    return why === undefined ? 0 : 1;
  } finally {
    await supervisor.stop();
    await database.stop();
    rmSync(PID_FILE, { force: true });
  }
}

/**
 * @param {string} address
 * @param {import('./product-database.mjs').DemoSignIn[]} signIns
 * @param {boolean} hasOutbox
 */
function announce(address, signIns, hasOutbox) {
  say(`\nMarlwick is running at ${address}\n`);
  for (const { role, email, password } of signIns) {
    say(`  ${role.padEnd(11)} ${email.padEnd(34)} ${password}`);
  }
  if (hasOutbox)
    say(`\nE-mails go nowhere but to ${address}/outbox (set SMTP_URL for a real server).`);
  say('\nThe demo is invented. Ctrl-C stops everything started here.');
}

/** @param {string | undefined} text */
export function readPort(text) {
  if (text === undefined || text === '') return DEFAULT_PORT;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new PlainProblem(`PORT=${text} is no port: use a whole number from 1 to 65535.`);
  }
  return port;
}

/** @param {number} port */
async function refuseBusyPort(port) {
  if (await isPortFree(port)) return;
  const own = existsSync(PID_FILE)
    ? /** @type {{ address: string }} */ (JSON.parse(readFileSync(PID_FILE, 'utf8'))).address
    : null;
  throw new PlainProblem(
    own !== null && own.endsWith(`:${port}`)
      ? `Marlwick is already running at ${own}; stop it there first, or set PORT to start another.`
      : `Port ${port} is used by another program: stop it, or start Marlwick elsewhere with PORT=${port + 1} npm start.`,
  );
}
