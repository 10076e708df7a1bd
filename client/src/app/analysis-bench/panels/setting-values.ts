import { failure, type Result, success } from '#shared/core';

/** A confidence level as a person types it, in percent; gives it as a share, as in 0.95. */
export function parsedLevel(text: string): Result<number, string> {
  const percent = Number(text.trim().replace('%', '').replace(',', '.'));
  if (text.trim() === '' || !Number.isFinite(percent)) {
    return failure('Give a number of percent, such as 95.');
  }
  if (percent <= 50 || percent >= 100) return failure('It lies between 50 and 100.');
  return success(Number((percent / 100).toPrecision(12)));
}

/** A trend score as a person types it: any number. */
export function parsedScore(text: string): Result<number, string> {
  const bare = text.trim().replace('\u2212', '-').replace(',', '.');
  const score = Number(bare);
  return bare === '' || !Number.isFinite(score) ? failure('Give a number.') : success(score);
}

/** Members or share of a stratum in a standard population, as a person types it: 0 or more. */
export function parsedShare(text: string): Result<number, string> {
  const share = parsedScore(text.replaceAll(/[\s\u00a0\u202f]/g, ''));
  return share.ok && share.value < 0 ? failure('Give 0 or more.') : share;
}
