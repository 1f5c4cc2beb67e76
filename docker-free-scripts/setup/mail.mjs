import { connect } from 'node:net';
import { join } from 'node:path';
import { PROJECT } from './places.mjs';
import { freePort } from './ports.mjs';

/**
 * Mail for the product: the server named by SMTP_URL, or a fake of our own that keeps letters in `folder`.
 * @param {import('./supervisor.mjs').Supervisor} supervisor
 * @param {string} folder
 * @param {string} name of the fake among the programs
 * @returns {Promise<Record<string, string>>} settings for the web process
 */
export async function openMail(supervisor, folder, name = 'mail') {
  const given = process.env.SMTP_URL;
  if (given !== undefined && given !== '') return { SMTP_URL: given };
  const port = await freePort();
  await supervisor.start({
    name,
    command: process.execPath,
    args: [join(PROJECT, 'docker-free-scripts/fake-mail/smtp-fake.mjs'), String(port), folder],
    isReady: () => accepts(port),
  });
  return { SMTP_URL: `smtp://127.0.0.1:${port}`, MARLWICK_OUTBOX: folder };
}

/**
 * @param {number} port
 * @returns {Promise<boolean>}
 */
const accepts = (port) =>
  new Promise((resolve) => {
    const socket = connect(port, '127.0.0.1');
    socket.once('connect', () => {
      socket.destroy();
      resolve(true);
    });
    socket.once('error', () => resolve(false));
  });
