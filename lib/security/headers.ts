/** Sent with every answer (OWASP ASVS 5.0, chapter 3.4). */
export const SECURITY_HEADERS: Readonly<Record<string, string>> = {
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'same-origin',
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-resource-policy': 'same-origin',
  'permissions-policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=()',
};

const TWO_YEARS_S = 63_072_000;
/** Only where the product is served over TLS: on plain loopback it would lock the browser out. */
export const STRICT_TRANSPORT = `max-age=${TWO_YEARS_S}; includeSubDomains`;
