import { createHash, createHmac, timingSafeEqual } from 'node:crypto';

const ALGORITHM = 'AWS4-HMAC-SHA256';
const UNSIGNED = 'UNSIGNED-PAYLOAD';
const SKEW_MS_MAX = 15 * 60_000;

const hmac = (key, text) => createHmac('sha256', key).update(text).digest();
export const sha256Hex = (bytes) => createHash('sha256').update(bytes).digest('hex');

const AUTHORIZATION =
  /^AWS4-HMAC-SHA256 Credential=([^/]+)\/(\d{8})\/([^/]+)\/([^/]+)\/aws4_request, ?SignedHeaders=([^,]+), ?Signature=([0-9a-f]{64})$/;

const encode = (text) =>
  encodeURIComponent(text).replace(/[!'()*]/g, (c) => `%${c.charCodeAt(0).toString(16).toUpperCase()}`);

const byText = (a, b) => (a < b ? -1 : Number(a > b));

/** Query parameters sorted by name, then by value, as the signature wants them. */
export function canonicalQuery(search) {
  return [...new URLSearchParams(search)]
    .map((pair) => pair.map(encode))
    .sort((a, b) => byText(a[0], b[0]) || byText(a[1], b[1]))
    .map(([name, value]) => `${name}=${value}`)
    .join('&');
}

/** The text that is hashed: AWS Signature Version 4, "Create a canonical request" (Amazon S3 API reference). */
export function canonicalRequest({ method, path, search, headers, signedHeaders, payloadHash }) {
  const lines = signedHeaders
    .map(
      (name) =>
        `${name}:${String(headers[name] ?? '')
          .trim()
          .replace(/ +/g, ' ')}\n`,
    )
    .join('');
  return [method, path, canonicalQuery(search), lines, signedHeaders.join(';'), payloadHash].join('\n');
}

export function signatureOf({ secret, day, region, service, amzDate, canonical }) {
  const scope = `${day}/${region}/${service}/aws4_request`;
  const key = [day, region, service, 'aws4_request'].reduce(hmac, `AWS4${secret}`);
  return hmac(key, [ALGORITHM, amzDate, scope, sha256Hex(canonical)].join('\n')).toString('hex');
}

const timeOf = (amzDate) =>
  Date.parse(amzDate.replace(/^(\d{4})(\d\d)(\d\d)T(\d\d)(\d\d)(\d\d)Z$/, '$1-$2-$3T$4:$5:$6Z'));

/**
 * Whether a request is signed with our key, over exactly these bytes, just now.
 * @returns null when it is, else the name of what is wrong
 */
export function faultOf({ method, url, headers, body, keyId, secret, nowMs }) {
  const found = AUTHORIZATION.exec(headers.authorization ?? '');
  if (!found) return 'AccessDenied';
  const [, key, day, region, service, names, signature] = found;
  if (key !== keyId) return 'InvalidAccessKeyId';
  const amzDate = String(headers['x-amz-date'] ?? '');
  if (!(Math.abs(timeOf(amzDate) - nowMs) <= SKEW_MS_MAX)) return 'RequestTimeTooSkewed';
  if (!amzDate.startsWith(day) || service !== 's3') return 'AuthorizationHeaderMalformed';
  const payloadHash = String(headers['x-amz-content-sha256'] ?? '');
  // A sender that streams may leave its bytes out of the signature; that it does is itself signed, so nobody else can.
  if (payloadHash !== UNSIGNED && payloadHash !== sha256Hex(body)) return 'XAmzContentSHA256Mismatch';
  const { pathname, search } = new URL(url, 'http://store');
  const signedHeaders = names.split(';');
  if (!['host', 'x-amz-content-sha256', 'x-amz-date'].every((name) => signedHeaders.includes(name)))
    return 'AccessDenied';
  const canonical = canonicalRequest({ method, path: pathname, search, headers, signedHeaders, payloadHash });
  const wanted = signatureOf({ secret, day, region, service, amzDate, canonical });
  return timingSafeEqual(Buffer.from(wanted), Buffer.from(signature)) ? null : 'SignatureDoesNotMatch';
}
