import { meshBuilder } from './mesh-builder';
import { MeshFileError } from './mesh-file-error';
import type { MeshReader } from './mesh-reader';
import { plainNumber, quoted } from './plain-number';
import { textLines } from './text-lines';

/**
 * STL as text: solid … facet normal … outer loop, three lines "vertex x y z", endloop, endfacet … endsolid. The
 * written normals are not used: the order of the corners counts. Several solids in a file are one mesh.
 */
export function asciiStl(): MeshReader {
  const builder = meshBuilder();
  let corners: number[] | null = null;
  let inSolid = false;
  let solids = 0;
  const lines = textLines((line, number) => {
    const where = () => `Line ${number}`;
    switch (/\S*/.exec(line.trimStart())![0].toLowerCase()) {
      case '':
      case 'facet':
      case 'endfacet':
        return;
      case 'solid':
        inSolid = true;
        solids += 1;
        return;
      case 'outer':
        if (corners !== null) throw fault(number, 'the triangle before has no endloop.');
        corners = [];
        return;
      case 'vertex': {
        if (corners === null) throw fault(number, 'a vertex stands inside "outer loop".');
        const words = line.trim().split(/\s+/);
        const [x, y, z] = [1, 2, 3].map((i) => plainNumber(words[i])) as [number, number, number];
        if (words.length !== 4 || Number.isNaN(x + y + z)) {
          throw fault(number, `a vertex has three numbers, not ${quoted(line)}.`);
        }
        corners.push(builder.vertex(x, y, z, where));
        if (corners.length > 3) throw fault(number, 'a triangle has three corners, not more.');
        return;
      }
      case 'endloop':
        if (corners?.length !== 3) throw fault(number, 'a triangle has three corners, not fewer.');
        builder.triangle(corners[0]!, corners[1]!, corners[2]!);
        corners = null;
        return;
      case 'endsolid':
        inSolid = false;
        return;
      default:
        throw fault(number, `${quoted(line)} means nothing in an STL file.`);
    }
  });
  return {
    write: (bytes) => lines.write(bytes),
    end() {
      lines.end();
      if (solids === 0 || inSolid || corners !== null) {
        throw new MeshFileError('The file ends before its "endsolid": it was cut off.');
      }
      return builder.mesh();
    },
  };
}

function fault(line: number, sentence: string): MeshFileError {
  return new MeshFileError(`Line ${line}: ${sentence}`);
}
