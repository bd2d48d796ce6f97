import type { Vec3 } from '../vec3';
import { faceTriangles } from './face-triangles';
import { meshBuilder } from './mesh-builder';
import { meshCaps, spacedCount } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';
import type { MeshReader } from './mesh-reader';
import { plainNumber, quoted } from './plain-number';
import { textLines } from './text-lines';

const cornerForm = /^([-+]?\d+)(\/-?\d*){0,2}$/;

/**
 * OBJ: "v x y z" and "f" with corners as v, v/vt, v//vn or v/vt/vn, counted from 1 or, below 0, from the last;
 * faces of more than three corners are cut into triangles. Everything else is passed over: normals, textures,
 * groups, materials, lines, curves. A line may go on after a backslash.
 */
export function obj(): MeshReader {
  const builder = meshBuilder();
  // the number of a vertex in the file → its place among those that differ
  let vertices = new Uint32Array(1024);
  let places = new Float64Array(3 * 1024);
  let count = 0;
  let begun = '';

  const lines = textLines((text, number) => {
    const line = begun + text;
    begun = '';
    if (line.endsWith('\\')) {
      begun = `${line.slice(0, -1)} `;
      if (begun.length > meshCaps.lineSigns) {
        throw fault(number, `a line has at most ${spacedCount(meshCaps.lineSigns)} signs.`);
      }
      return;
    }
    if (!/^\s*[vf]\s/.test(line)) return;
    const words = line.trim().split(/\s+/);
    if (words[0] === 'v') vertex(words, line, number);
    else if (words[0] === 'f') face(words, number);
  });

  return {
    write: (bytes) => lines.write(bytes),
    end() {
      lines.end();
      return builder.mesh();
    },
  };

  function vertex(words: readonly string[], line: string, number: number): void {
    const [x, y, z] = [1, 2, 3].map((i) => plainNumber(words[i])) as [number, number, number];
    if (Number.isNaN(x + y + z)) {
      throw fault(number, `a vertex has three numbers, not ${quoted(line)}.`);
    }
    if (count === meshCaps.vertices) {
      throw fault(
        number,
        `a file has at most ${spacedCount(meshCaps.vertices)} vertices: write a coarser mesh.`,
      );
    }
    if (count === vertices.length) {
      vertices = into(new Uint32Array(2 * count), vertices);
      places = into(new Float64Array(6 * count), places);
    }
    vertices[count] = builder.vertex(x, y, z, () => `Line ${number}`);
    places.set([x, y, z], 3 * count);
    count += 1;
  }

  function face(words: readonly string[], number: number): void {
    const corners = words.slice(1).map((word) => {
      const form = cornerForm.exec(word);
      if (!form) throw fault(number, `${quoted(word)} is no corner of a face.`);
      const said = Number(form[1]);
      const index = said < 0 ? count + said : said - 1;
      if (!(index >= 0 && index < count)) {
        throw fault(number, `there is no vertex ${said} before this face: ${count} were given.`);
      }
      return index;
    });
    if (corners.length < 3) throw fault(number, 'a face has at least three corners.');
    const cut = faceTriangles(corners.map(placeOf));
    if (cut === null) {
      throw fault(
        number,
        `a face of ${corners.length} corners cannot be cut into triangles, since it is not convex and has more than ${meshCaps.concaveCorners}, or crosses itself: write the mesh in triangles.`,
      );
    }
    const at = (i: number) => vertices[corners[cut[i]!]!]!;
    for (let i = 0; i < cut.length; i += 3) builder.triangle(at(i), at(i + 1), at(i + 2));
  }

  function placeOf(index: number): Vec3 {
    return [places[3 * index]!, places[3 * index + 1]!, places[3 * index + 2]!];
  }
}

function into<T extends Uint32Array | Float64Array>(larger: T, from: T): T {
  larger.set(from);
  return larger;
}

function fault(line: number, sentence: string): MeshFileError {
  return new MeshFileError(`Line ${line}: ${sentence}`);
}
