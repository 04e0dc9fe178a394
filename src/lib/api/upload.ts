import { ConnectionLost, readProblem } from './problem';
import { waitForSignIn } from './session-loss';
import { writeHeaders } from './transport';

/** How much of a file has left this computer, 0 to 1. */
export type OnProgress = (share: number) => void;

interface Upload {
  url: string;
  form: FormData;
  onProgress: OnProgress;
  signal?: AbortSignal;
}

function sendForm(
  { url, form, onProgress, signal }: Upload,
  headers: Record<string, string>,
): Promise<Response> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', url);
    Object.entries(headers).forEach(([name, value]) => request.setRequestHeader(name, value));
    request.upload.addEventListener('progress', (event) => {
      if (event.lengthComputable) onProgress(event.loaded / event.total);
    });
    request.addEventListener('load', () => {
      const body = request.status === 204 ? null : request.responseText;
      const type = request.getResponseHeader('Content-Type') ?? 'application/json';
      resolve(new Response(body, { status: request.status, headers: { 'Content-Type': type } }));
    });
    request.addEventListener('error', () => reject(new ConnectionLost(request.statusText)));
    request.addEventListener('abort', () =>
      reject(new DOMException('The upload was stopped.', 'AbortError')),
    );
    signal?.addEventListener('abort', () => request.abort());
    request.send(form);
  });
}

/**
 * Sends a form with a file and tells how far it is, which a fetch cannot. Gives the JSON answer; a session
 * that ended makes the file wait for the sign-in and then go again.
 */
export async function upload<T>(what: Upload): Promise<T> {
  const response = await sendForm(what, await writeHeaders());
  if (response.ok) return (await response.json()) as T;
  const problem = await readProblem(response);
  if (problem.status !== 401) throw problem;
  await waitForSignIn(problem);
  const again = await sendForm(what, await writeHeaders());
  if (!again.ok) throw await readProblem(again);
  return (await again.json()) as T;
}
