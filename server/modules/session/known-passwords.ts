/**
 * Passwords that are too common to be accepted (OWASP ASVS 6.2.4 asks for a list). Written down from memory as
 * obvious choices, and joined with what belongs to the person: it is short, and says so.
 */
const common = new Set([
  'password',
  'password1',
  'passw0rd',
  '12345678',
  '123456789',
  '1234567890',
  '11111111',
  '00000000',
  'qwertyui',
  'qwertyuiop',
  'qwerty123',
  'iloveyou',
  'sunshine',
  'princess',
  'football',
  'baseball',
  'letmein1',
  'welcome1',
  'abcdefgh',
  'abcd1234',
  'asdfghjk',
  'administrator',
  'changeme',
  'trustno1',
  'whatever',
  'computer',
  'tarekeep',
]);

export function isTooCommon(password: string, own: readonly string[]): boolean {
  const lower = password.toLowerCase();
  return common.has(lower) || new Set(lower).size < 3 || own.some((word) => word.toLowerCase() === lower);
}
