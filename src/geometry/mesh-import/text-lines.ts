import { meshCaps, spacedCount } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';

/** Cuts pieces of a text file into lines; never holds more than a piece and a line. */
export interface TextLines {
  write(bytes: Uint8Array): void;
  end(): void;
}

/** Any way to end a line is taken. Throws for a line longer, or for more lines, than the caps. `onLine` counts from 1 and is not told of empty ones. */
export function textLines(onLine: (line: string, number: number) => void): TextLines {
  const decoder = new TextDecoder('latin1');
  let rest = '';
  let number = 0;
  const tell = (line: string) => {
    number += 1;
    if (number > meshCaps.lines) {
      throw new MeshFileError(
        `The file has more than ${spacedCount(meshCaps.lines)} lines, the most that is taken: write a coarser mesh.`,
      );
    }
    if (line !== '') onLine(line, number);
  };
  return {
    write(bytes) {
      for (let from = 0; from < bytes.length; from += meshCaps.lineSigns) {
        const text = rest + decoder.decode(bytes.subarray(from, from + meshCaps.lineSigns));
        const lines = text.split(/\r\n|\n|\r/);
        rest = lines.pop()!;
        // whether this is the end of a line or half of one shows in the next piece
        if (text.endsWith('\r')) rest = `${lines.pop()!}\r`;
        for (const line of lines) tell(line);
        if (rest.length > meshCaps.lineSigns) {
          throw new MeshFileError(
            `Line ${number + 1}: a line has at most ${spacedCount(meshCaps.lineSigns)} signs.`,
          );
        }
      }
    },
    end() {
      if (rest !== '') tell(rest.endsWith('\r') ? rest.slice(0, -1) : rest);
    },
  };
}
