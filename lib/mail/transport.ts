import { createTransport, type Transporter } from 'nodemailer';
import { env } from '@/lib/env';
import { logger } from '@/lib/logger';

export interface Letter {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  /** For the log; no address stands there. */
  readonly kind: string;
}

let transporter: Transporter | undefined;

/** The only place that knows nodemailer. SMTP_URL names the server: a real one, or the local fake of our scripts. */
function transport(): Transporter | null {
  const { SMTP_URL } = env();
  if (SMTP_URL === undefined) return null;
  transporter ??= createTransport(SMTP_URL, {
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return transporter;
}

/** One line, whatever a name holds: header lines cannot be added through it (OWASP ASVS V1.3.11). */
const oneLine = (text: string): string => text.replaceAll(/[\r\n\u2028\u2029\0]+/g, ' ').trim();

/**
 * Sends a letter. False, with a line in the log, when no server takes it: what was written in the database stands, and
 * the person can ask for the letter again.
 */
export async function sendLetter({ to, subject, text, kind }: Letter): Promise<boolean> {
  const mailer = transport();
  if (mailer === null) {
    logger.error({ event: 'mail-without-server', kind }, 'SMTP_URL is not set: nothing was sent');
    return false;
  }
  try {
    await mailer.sendMail({
      from: env().MAIL_FROM,
      to: oneLine(to),
      subject: oneLine(subject),
      text,
      // Nobody's holiday notice should answer it (RFC 3834).
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
    logger.info({ event: 'mail-sent', kind }, 'mail sent');
    return true;
  } catch (error) {
    const { message } = error instanceof Error ? error : { message: 'unknown' };
    logger.error({ event: 'mail-failed', kind, reason: message.slice(0, 80) }, 'mail not sent');
    return false;
  }
}
