import { z } from 'zod';

// The server's configuration. It holds secrets, so nothing under components/ or client/ may import it.

const Env = z.object({
  /** Public address, e.g. "https://foldspar.example". Unset: this machine's own addresses, over plain http. */
  FOLDSPAR_URL: z.url({ protocol: /^https?$/ }).optional(),
  /** Signs sessions and mail tokens. */
  FOLDSPAR_SECRET: z.string().min(32).optional(),
  BETTER_AUTH_SECRET: z.string().min(32).optional(),
  SMTP_URL: z
    .string()
    .regex(/^smtps?:\/\//)
    .optional(),
  MAIL_FROM: z.string().min(3).optional(),
  /** Addresses or CIDR ranges of reverse proxies, separated by commas, whose X-Forwarded-For is believed. */
  FOLDSPAR_TRUSTED_PROXIES: z.string().optional(),
  /** The address the server listens on; the start script passes on what it was told in HOST. */
  FOLDSPAR_HOST: z.string().optional(),
  HOST: z.string().optional(),
});

export interface ServerEnv {
  readonly url: string | null;
  readonly secret: string;
  readonly smtpUrl: string | null;
  readonly mailFrom: string;
  readonly trustedProxies: readonly string[];
  readonly host: string;
}

/** Reads the configuration from the environment; throws with the variable's name when one is wrong or missing. */
export function env(source: Readonly<Record<string, string | undefined>> = process.env): ServerEnv {
  const filled = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== undefined && value !== ''));
  const parsed = Env.safeParse(filled);
  if (!parsed.success) {
    const wrong = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ');
    throw new RangeError(`the server's configuration is wrong: ${wrong}`);
  }
  const values = parsed.data;
  const secret = values.FOLDSPAR_SECRET ?? values.BETTER_AUTH_SECRET;
  if (secret === undefined)
    throw new RangeError('FOLDSPAR_SECRET is not set; it signs the sessions and needs at least 32 characters');
  return {
    url: values.FOLDSPAR_URL === undefined ? null : new URL(values.FOLDSPAR_URL).origin,
    secret,
    smtpUrl: values.SMTP_URL ?? null,
    mailFrom: values.MAIL_FROM ?? 'Foldspar <foldspar@localhost>',
    trustedProxies: (values.FOLDSPAR_TRUSTED_PROXIES ?? '')
      .split(',')
      .map((entry) => entry.trim())
      .filter((entry) => entry !== ''),
    host: values.FOLDSPAR_HOST ?? values.HOST ?? '127.0.0.1',
  };
}
