/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length. */

/** Texts by number, kept as UTF-8 bytes one after the other. */
export class TextList {
  length = 0;
  private bytes: Buffer = Buffer.alloc(4096);
  private ends = new Uint32Array(256);

  /** Adds a text at the end. */
  push(text: string): void {
    const start = this.byteLength;
    const most = start + text.length * 3;
    if (most > this.bytes.length) this.bytes = larger(this.bytes, most);
    if (this.length === this.ends.length) this.growEnds();
    this.ends[this.length] = start + this.bytes.write(text, start, 'utf8');
    this.length += 1;
  }

  /** Bytes that the texts take up together. */
  get byteLength(): number {
    return this.length === 0 ? 0 : this.ends[this.length - 1]!;
  }

  /** The bytes of a text; none for a number that is not in the list. */
  at(index: number): Uint8Array {
    if (!(index >= 0 && index < this.length)) return EMPTY;
    const start = index === 0 ? 0 : this.ends[index - 1]!;
    return this.bytes.subarray(start, this.ends[index]);
  }

  private growEnds(): void {
    const ends = new Uint32Array(this.ends.length * 2);
    ends.set(this.ends);
    this.ends = ends;
  }
}

const EMPTY = new Uint8Array();

function larger(bytes: Buffer, needed: number): Buffer {
  const buffer = Buffer.alloc(Math.max(needed, bytes.length * 2));
  bytes.copy(buffer);
  return buffer;
}
