/**
 * Gathers the text of a string item (`si`, `is`): its `t` elements, also those of rich-text runs,
 * but not the reading aids of East Asian texts (`rPh`).
 */
export class TextGatherer {
  private parts: string[] = [];
  private inText = false;
  private inAid = false;

  open(name: string): void {
    if (name === 't') this.inText = true;
    else if (name === 'rPh') this.inAid = true;
  }

  text(text: string): void {
    if (this.inText && !this.inAid) this.parts.push(text);
  }

  close(name: string): void {
    if (name === 't') this.inText = false;
    else if (name === 'rPh') this.inAid = false;
  }

  /** The text gathered since the last time. */
  take(): string {
    const text = this.parts.length === 1 ? (this.parts[0] ?? '') : this.parts.join('');
    this.parts = [];
    return plainText(text);
  }
}

/** Control characters are written as "_x000D_" (ISO/IEC 29500-1, 22.9.2.19). */
export function plainText(text: string): string {
  if (!text.includes('_x')) return text;
  return text.replace(/_x([0-9A-Fa-f]{4})_/g, (_, code: string) =>
    String.fromCharCode(Number.parseInt(code, 16)),
  );
}
