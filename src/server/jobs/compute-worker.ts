import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { DipwrightError } from '~/domain/errors';
import { sketchDesign } from '~/domain/report/sketch-design';
import { computeTable } from '~/domain/table/compute-table';
import { issueTable } from '~/domain/table/issue-table';
import { loadManifold } from '~/geometry/manifold';
import type { ComputeOutcome, ComputeTask } from './compute-task';
import { acceptMesh, loadMeshFiles } from './mesh-work';

// read from the package, so that a bundle finds it as well as the source does
const wasm = createRequire(import.meta.url).resolve('manifold-3d/manifold.wasm');
const ready = readFile(wasm).then((wasmBinary) => loadManifold({ wasmBinary }));

/** A thread of the compute pool: one task in, its result or refusal out. */
export default async function compute(task: ComputeTask): Promise<ComputeOutcome> {
  try {
    await ready;
    return { result: await work(task) };
  } catch (error) {
    if (!(error instanceof DipwrightError)) throw error;
    const { code, message, faults } = error;
    return { refusal: { code, message, faults } };
  }
}

async function work(task: ComputeTask) {
  if (task.work === 'mesh') return acceptMesh(task.file);
  await loadMeshFiles(task.meshes);
  switch (task.work) {
    case 'table':
      return computeTable(task.design, task.readings);
    case 'issue':
      return issueTable(task.design, task.settings, task.stepMm);
    case 'sketch':
      return sketchDesign(task.design);
  }
}
