import { z } from 'zod/v4';
import type { SignIn, SignUp } from '~/domain/access/account';
import { handover } from '~/domain/access/handover';
import { me, member } from '~/domain/access/member';
import { installation, type NewInstallation } from '~/domain/installation/installation';
import { reading, type NewReading } from '~/domain/reading/reading';
import { depthAnswer } from '~/domain/table/depth-answer';
import { computedTable, issuedRow } from '~/domain/table/request';
import { uploadedMesh, type MeshUnit, type UploadedMesh } from '~/domain/tank/kinds/mesh/uploaded';
import { tankDocument, type TankDocument } from '~/domain/tank/document';
import {
  lookUp,
  revisionSummary,
  tank,
  type NewRevision,
  type NewTank,
  type TankChange,
} from '~/domain/tank/tank';
import { call, callBytes, type Answered } from './call';
import { sendFile } from './send-file';

/** The only caller of `/api/v1` in the browser. Refusals are thrown as `ApiProblem`. */

const issuedTable = z.object({ revision: revisionSummary, rows: z.array(issuedRow) });

const tankPath = (id: string): string => `/tanks/${encodeURIComponent(id)}`;
const revisionPath = (id: string): string => `/revisions/${encodeURIComponent(id)}`;
const valueOf = async <T>(answered: Promise<Answered<T>>): Promise<T> => (await answered).value;

export const signIn = (body: SignIn) => valueOf(call('/session', { method: 'POST', body }));
export const signOut = () => valueOf(call('/session', { method: 'DELETE' }));
export const signUp = (body: SignUp) =>
  valueOf(
    call('/workshops', { method: 'POST', body, answer: z.object({ workshopId: z.string() }) }),
  );
export const readMe = () => valueOf(call('/me', { answer: me }));
export const listMembers = () => valueOf(call('/members', { answer: z.array(member) }));

export const listInstallations = () =>
  valueOf(call('/installations', { answer: z.array(installation) }));
export const createInstallation = (body: NewInstallation) =>
  valueOf(call('/installations', { method: 'POST', body, answer: installation }));

export const listTanks = () => valueOf(call('/tanks', { answer: z.array(tank) }));
export const createTank = (body: NewTank) =>
  valueOf(call('/tanks', { method: 'POST', body, answer: tank }));
export const readTank = (id: string) => valueOf(call(tankPath(id), { answer: tank }));
export const changeTank = (id: string, body: TankChange) =>
  valueOf(call(tankPath(id), { method: 'PATCH', body, answer: tank }));

/** The draft and its version: give the etag back when saving. */
export const readDesign = (id: string) => call(`${tankPath(id)}/design`, { answer: tankDocument });
/** 412 (`precondition-failed`) when somebody saved first; its facts hold their document. */
export const saveDesign = (id: string, body: TankDocument, etag: string) =>
  call(`${tankPath(id)}/design`, {
    method: 'PUT',
    body,
    headers: { 'if-match': etag },
    answer: tankDocument,
  });

/** A mesh as it is kept (mesh-bytes.ts). */
export const readMesh = async (id: string): Promise<Uint8Array> =>
  new Uint8Array(await callBytes(`/meshes/${encodeURIComponent(id)}`));
export const uploadMesh = async (
  file: File,
  unit: MeshUnit,
  onSent: (part: number) => void,
): Promise<UploadedMesh> => {
  const query = new URLSearchParams({ unit, name: file.name.slice(0, 120) || 'mesh' });
  return uploadedMesh.parse(await sendFile(`/meshes?${query}`, file, onSent));
};

export const issueRevision = (id: string, body: NewRevision) =>
  valueOf(call(`${tankPath(id)}/revisions`, { method: 'POST', body, answer: revisionSummary }));
export const listRevisions = (id: string) =>
  valueOf(call(`${tankPath(id)}/revisions`, { answer: z.array(revisionSummary) }));
export const readRevision = (id: string) =>
  valueOf(call(revisionPath(id), { answer: revisionSummary }));
export const readTable = (id: string) =>
  valueOf(call(`${revisionPath(id)}/table`, { answer: issuedTable }));
export const lookUpVolume = (id: string, at: { depthMm: number } | { ullageMm: number }) =>
  valueOf(
    call(
      'depthMm' in at
        ? `${revisionPath(id)}/volume?depthMm=${at.depthMm}`
        : `${revisionPath(id)}/volume?ullageMm=${at.ullageMm}`,
      { answer: lookUp },
    ),
  );
export const lookUpDepth = (id: string, volumeL: number) =>
  valueOf(call(`${revisionPath(id)}/depth?volumeL=${volumeL}`, { answer: depthAnswer }));

export const listHandovers = (id: string) =>
  valueOf(call(`${tankPath(id)}/handovers`, { answer: z.array(handover) }));
export const handOver = (id: string, userId: string) =>
  valueOf(call(`${tankPath(id)}/handovers`, { method: 'POST', body: { userId } }));

export const listReadings = (id: string) =>
  valueOf(call(`${tankPath(id)}/readings`, { answer: z.array(reading) }));
/** Sent again with the same key, a reading is stored once. */
export const recordReading = (id: string, body: NewReading, idempotencyKey: string) =>
  valueOf(
    call(`${tankPath(id)}/readings`, {
      method: 'POST',
      body,
      headers: { 'idempotency-key': idempotencyKey },
      answer: reading,
    }),
  );

export const compute = (
  body:
    { design: TankDocument; stepMm: number } | { design: TankDocument; atMm: readonly number[] },
  signal?: AbortSignal,
) =>
  valueOf(
    call('/compute', {
      method: 'POST',
      body,
      answer: computedTable,
      ...(signal === undefined ? {} : { signal }),
    }),
  );
