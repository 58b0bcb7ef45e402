import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emailSchema, ownPath, passwordSchema, signUpSchema } from '@/components/account/account-schema';

const HERE = 'https://here.example.org';

describe('the path to go on to', () => {
  it('never leaves our own origin, whatever is asked for', () => {
    const nasty = fc.string({ unit: fc.constantFrom('/', '\\', '.', ':', '@', '%2f', '?', '#', 'a', 'https:', '\t', '\n', ' ', '..', '//') }); // prettier-ignore
    fc.assert(
      fc.property(fc.oneof(nasty, fc.string(), fc.webUrl()), (asked) => {
        const path = ownPath(asked);
        expect(path).toMatch(/^\/[A-Za-z0-9]/);
        expect(new URL(path, HERE).origin).toBe(HERE);
      }),
      { numRuns: 2000 },
    );
  });

  it('keeps a path of ours with its query', () => {
    expect(ownPath('/journals/7/rounds/2?view=back')).toBe('/journals/7/rounds/2?view=back');
  });

  it.each(['//elsewhere.invalid', '/a/..//elsewhere.invalid', '/\\elsewhere.invalid', 'javascript:alert(1)', undefined, ['/a'], '/'])('takes the rail in place of %s', (asked) => {
    expect(ownPath(asked)).toBe('/journals');
  }); // prettier-ignore
});

describe('a password', () => {
  const passes = (password: string) => passwordSchema.safeParse(password).success;
  it('has ten characters to two hundred bytes and is none of the commonest', () => {
    expect([passes('nine char'), passes('ten chars.'), passes('é'.repeat(100)), passes('é'.repeat(101)), passes('PasswordPassword')]).toEqual([false, true, true, false, false]); // prettier-ignore
  });

  it('does not hold the address, but may hold two letters that happen to stand before its @', () => {
    const passesFor = (email: string, password: string) =>
      signUpSchema.safeParse({ displayName: 'A', email, password }).success;
    expect(passesFor('margaret@example.org', 'Margaret1234')).toBe(false);
    expect(passesFor('al@example.org', 'al@example.org!')).toBe(false);
    expect(passesFor('al@example.org', 'chalk basting paper')).toBe(true);
  });
});

it('an address is one address, in lower case, without what would end a header', () => {
  expect(emailSchema.parse('  Ann@Example.ORG ')).toBe('ann@example.org');
  fc.assert(
    fc.property(fc.string({ unit: fc.constantFrom('a', '@', '.', '\r', '\n', ',', ';', '<', '>', ' ', 'b.org', '\u0000') }), (text) => {
      const parsed = emailSchema.safeParse(text);
      if (parsed.success) expect(parsed.data).toMatch(/^[^\s,;<>\p{C}]+@[^\s,;<>@\p{C}]+$/u);
    }),
    { numRuns: 2000 },
  ); // prettier-ignore
});
