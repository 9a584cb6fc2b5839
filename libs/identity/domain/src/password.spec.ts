import { checkPassword } from './password';

const codeOf = (password: string, email = 'jo@anchor.example') => {
  const result = checkPassword(password, email);
  return result.ok ? 'ok' : result.refusal.code;
};

describe('checkPassword', () => {
  it('takes twelve characters of any kind', () => {
    expect(codeOf('shoulder tie')).toBe('ok');
    expect(codeOf('鹿鹿鹿鹿鹿猪鹿鹿鹿鹿鹿羊')).toBe('ok');
  });

  it('refuses eleven, counting a character outside the basic plane once', () => {
    expect(codeOf('shouldertie')).toBe('password-short');
    expect(codeOf('🥩🥩🥩🥩🥩🍖')).toBe('password-short');
  });

  it('refuses more than two hundred', () => {
    expect(codeOf('ab1'.repeat(67))).toBe('password-long');
  });

  it('refuses the e-mail address and its name part, however written', () => {
    expect(codeOf(' Jo@Anchor.Example', 'jo@anchor.example')).toBe('password-is-email');
    expect(codeOf('Josephine.Marsh', 'josephine.marsh@anchor.example')).toBe('password-is-email');
  });

  it.each(['Password1234', 'qwertyuiop12', 'aaaaaaaaaaaa', 'abcabcabcabc'])('refuses the common %s', (password) => {
    expect(codeOf(password)).toBe('password-common');
  });

  it('points at the field and says the least length', () => {
    expect(checkPassword('short', '')).toEqual({
      ok: false,
      refusal: { code: 'password-short', params: { least: 12 }, pointer: '/password' },
    });
  });
});
