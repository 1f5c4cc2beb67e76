import { createWriteStream, mkdirSync, renameSync } from 'node:fs';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { SMTPServer } from 'smtp-server';

// A mail server that delivers nothing: every letter becomes a file in the outbox, readable on the page /outbox.
// usage: smtp-fake.mjs <port> <folder>
const [port = '', folder = ''] = process.argv.slice(2);
mkdirSync(folder, { recursive: true });
let letters = 0;

const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  size: 10 * 1024 * 1024,
  onData(stream, _session, done) {
    const name = `${Date.now()}-${String(++letters).padStart(6, '0')}`;
    const part = join(folder, `${name}.part`);
    pipeline(stream, createWriteStream(part)).then(
      () => {
        // Renamed when whole, so that a reader never sees half a letter.
        renameSync(part, join(folder, `${name}.eml`));
        done();
      },
      (error) => done(error),
    );
  },
});
server.listen(Number(port), '127.0.0.1');
for (const signal of ['SIGINT', 'SIGTERM']) {
  process.on(signal, () => server.close(() => process.exit(0)));
}
