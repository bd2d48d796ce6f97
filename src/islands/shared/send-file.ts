import { problemFrom, unreachable } from './problem';

/**
 * POST of a file to `/api/v1`, telling how much of it is sent (0 to 1). Only api.ts uses it: `fetch` does not tell. The
 * answer's JSON, unchecked; refusals are thrown as `ApiProblem`.
 */
export function sendFile(
  path: string,
  file: Blob,
  onSent: (part: number) => void,
): Promise<unknown> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api/v1${path}`);
    request.setRequestHeader('accept', 'application/json');
    request.setRequestHeader('content-type', 'application/octet-stream');
    request.upload.onprogress = ({ loaded, total }) => onSent(total > 0 ? loaded / total : 0);
    request.onerror = () => reject(unreachable());
    request.onload = () => {
      const answer = new Response(request.responseText, {
        status: request.status,
        headers: { 'content-type': request.getResponseHeader('content-type') ?? '' },
      });
      const settled = answer.ok
        ? answer.json()
        : problemFrom(answer).then((problem) => Promise.reject(problem));
      settled.then(resolve, reject);
    };
    request.send(file);
  });
}
