import { z } from 'zod';

const COMMON = new Set(['password12', 'passwordpassword', '1234567890', '0123456789', 'qwertyuiop', 'iloveyou12', 'abcdefghij', 'letmeinletmein', 'aaaaaaaaaa', '1111111111']); // prettier-ignore
const PASSWORD_BYTES_MAX = 200;

export const emailSchema = z.preprocess(
  (value) => (typeof value === 'string' ? value.trim().toLowerCase() : value),
  z.email('Write the address like name@example.org.').max(254, 'That address is too long.'),
);

export const passwordSchema = z
  .string()
  .min(10, 'At least 10 characters; three or four words are easy to remember.')
  .refine((text) => new TextEncoder().encode(text).length <= PASSWORD_BYTES_MAX, 'At most 200 bytes.')
  .refine((text) => !COMMON.has(text.toLowerCase()), 'That one is among the first that anyone would try.');

const NAME_LETTERS_MIN = 4; // shorter names before the @ stand in many words by chance
const holdsAddress = (password: string, email: string): boolean => {
  const name = email.split('@')[0] ?? '';
  return password.includes(email) || (name.length >= NAME_LETTERS_MIN && password.includes(name));
};

export const signUpSchema = z
  .object({
    displayName: z.string().trim().min(1, 'A name, initials or a made-up name.').max(80),
    email: emailSchema,
    password: passwordSchema,
  })
  .refine(({ email, password }) => !holdsAddress(password.toLowerCase(), email), {
    path: ['password'],
    message: 'Choose one that does not hold your address.',
  });

const HERE = 'http://here.invalid';

/** Only a path of our own is followed after signing in: `//elsewhere` and `https:` are not, nor what becomes one, like `/a/..//elsewhere`. */
export const ownPath = (value: unknown): string => {
  const parsed = typeof value === 'string' ? URL.parse(value, HERE) : null;
  const path = parsed?.origin === HERE ? `${parsed.pathname}${parsed.search}` : '';
  return /^\/[A-Za-z0-9]/.test(path) ? path : '/journals';
};

export const signInSchema = z.object({
  email: emailSchema,
  password: z.string().min(1, 'Your password.').max(400),
  next: z.string().max(500).optional(),
});

export const emailOnlySchema = z.object({ email: emailSchema });
export const tokenSchema = z.object({
  token: z.string().regex(/^[A-Za-z0-9_-]{43}$/, 'This link is not whole.'),
});
export const resetSchema = z.object({ token: tokenSchema.shape.token, password: passwordSchema });

const current = signInSchema.shape.password;
export const currentPasswordSchema = z.object({ current });
export const changePasswordSchema = z.object({ current, password: passwordSchema });
export const changeEmailSchema = z.object({ current, email: emailSchema });
