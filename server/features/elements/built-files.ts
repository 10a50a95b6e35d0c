import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';

/** What `npm start` builds: beside the bundle of the server, or seen from this source. */
export const builtFolder: string = ((): string => {
  const beside = join(__dirname, '../elements');
  const bundled = existsSync(join(__dirname, 'main.js'));
  return bundled ? beside : join(__dirname, '../../../dist/elements');
})();

export interface BuiltFile {
  readonly bytes: Uint8Array;
  readonly etag: string;
  /** How the bytes are packed, where they are. */
  readonly encoding?: 'br' | 'gzip';
}

const packings = [
  ['br', '.br'],
  ['gzip', '.gz'],
] as const;

/** Whether the caller takes this packing: named and not refused by `q=0`. */
const takes = (accepted: string, packing: string): boolean =>
  accepted.split(',').some((each) => {
    const [name = '', weight = ''] = each.trim().toLowerCase().split(';');
    return name.trim() === packing && !/^\s*q=0(\.0*)?\s*$/.test(weight);
  });

interface Remembered {
  readonly changed: number;
  readonly file: BuiltFile;
}

/** Reads built files, each once until it is built anew. */
export class BuiltFiles {
  private readonly remembered = new Map<string, Remembered>();

  constructor(private readonly folder: string) {}

  /**
   * The file, packed in the best way that the caller takes and the build has made.
   *
   * @returns undefined when it is not built.
   */
  async read(name: string, accepted = ''): Promise<BuiltFile | undefined> {
    for (const [encoding, extension] of packings) {
      if (!takes(accepted, encoding)) continue;
      const packed = await this.load(`${name}${extension}`);
      if (packed) return { ...packed, encoding };
    }
    return this.load(name);
  }

  private async load(name: string): Promise<BuiltFile | undefined> {
    const path = join(this.folder, name);
    try {
      const { mtimeMs } = await stat(path);
      const known = this.remembered.get(name);
      if (known?.changed === mtimeMs) return known.file;
      const bytes = await readFile(path);
      const etag = `"${createHash('sha256').update(bytes).digest('base64url').slice(0, 22)}"`;
      const file = { bytes, etag };
      this.remembered.set(name, { changed: mtimeMs, file });
      return file;
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code === 'ENOENT') return undefined;
      throw error;
    }
  }
}
