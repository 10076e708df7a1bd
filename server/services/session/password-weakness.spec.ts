import { describe, expect, it } from 'vitest';
import { passwordWeakness } from './password-weakness';

const PERSON = { name: 'Robin Moss-Field', email: 'robin.moss@lab.example.org' };

describe('a weak password', () => {
  it.each([
    'aaaaaaaaaaaaaaa',
    'abababababab',
    'abcdefghijklmnop',
    '9876543210987',
    'passwordpassword',
    'Password12345',
    'evenhand2026',
    'QwertyUiop1!',
    'robin.moss@lab.example.org',
    'RobinMoss2026',
  ])('is %s', (password) => {
    expect(passwordWeakness(password, PERSON)).not.toBeNull();
  });

  it.each([
    'correct horse battery staple',
    'a long enough password',
    'Robin hunts for green beans',
    '!@#$%^&*()_+=-',
    'ünïcödé wörds hêre',
    'möbel 猫 tisch lampe',
  ])('is not %s', (password) => {
    expect(passwordWeakness(password, PERSON)).toBeNull();
  });
});
