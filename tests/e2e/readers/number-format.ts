/**
 * What a spreadsheet shows for a number under a format. Knows what tables need: literals, decimals,
 * thousands by comma, and sections for positive, negative and zero.
 *
 * Source: ISO/IEC 29500-1, 18.8.31 (numFmts).
 */
export function showNumber(value: number, format: string): string {
  if (format === 'General' || format === '@') return String(value);
  const sections = format.split(/;(?=(?:[^"]*"[^"]*")*[^"]*$)/);
  const [positive = '', negative, zero] = sections;
  if (value < 0 && negative !== undefined) return fill(-value, negative);
  if (value === 0 && zero !== undefined) return fill(0, zero);
  return (value < 0 ? '-' : '') + fill(Math.abs(value), positive);
}

/** Fills the digits into one section; what stands between digits parts thousands. */
function fill(value: number, section: string): string {
  const pattern = /[#0](?:[#0,]|"[^"]*"(?=[#0]))*(?:\.0+)?/;
  const [digits] = pattern.exec(section) ?? [];
  if (digits === undefined) return literals(section);
  const [before = '', after = ''] = section.split(digits);
  const [whole = '', decimals = ''] = digits.split('.');
  const [units = '', part] = roundHalfUp(value, decimals.length).split('.');
  const figure = grouped(units, whole) + (part === undefined ? '' : `.${part}`);
  return literals(before) + figure + literals(after);
}

function literals(text: string): string {
  return text.replaceAll('"', '').replaceAll('\\', '');
}

function grouped(units: string, whole: string): string {
  const [, separator] = /"([^"]*)"/.exec(whole) ?? [];
  const between = separator ?? (whole.includes(',') ? ',' : '');
  return units.replace(/\B(?=(\d{3})+$)/g, between);
}

/** Rounds what is shown, from the fifteen digits that a spreadsheet keeps. */
function roundHalfUp(value: number, decimals: number): string {
  const [mantissa = '0', exponent = '0'] = value.toExponential(14).split('e');
  const shift = Number(exponent) - 14 + decimals;
  const digits = BigInt(mantissa.replace('.', ''));
  const units =
    shift >= 0
      ? digits * 10n ** BigInt(shift)
      : (digits * 2n + 10n ** BigInt(-shift)) / (2n * 10n ** BigInt(-shift));
  const text = units.toString().padStart(decimals + 1, '0');
  if (decimals === 0) return text;
  return `${text.slice(0, -decimals)}.${text.slice(-decimals)}`;
}
