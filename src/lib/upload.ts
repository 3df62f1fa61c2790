import type { z } from 'zod';
import { errorFromAnswer, parseJson, readAnswer, unreachable } from './api';

export interface UploadOptions {
  /** 0 to 1 of the bytes sent; 1 means that the server now works on them. */
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
}

/**
 * Sends one form with a file. XMLHttpRequest, because fetch does not tell how much was sent.
 *
 * @throws ApiError as `api` does; an AbortError when the signal is aborted.
 */
export function upload<T>(
  path: string,
  form: FormData,
  schema: z.ZodType<T, unknown>,
  { onProgress, signal }: UploadOptions = {},
): Promise<T> {
  return new Promise((resolve, reject) => {
    const xhr = new XMLHttpRequest();
    xhr.open('POST', `/api${path}`);
    xhr.setRequestHeader('Accept', 'application/json');
    xhr.upload.onprogress = (event) => {
      if (event.lengthComputable) onProgress?.(event.loaded / event.total);
    };
    xhr.upload.onload = () => onProgress?.(1);
    xhr.onerror = () => reject(unreachable());
    xhr.onabort = () => reject(new DOMException('Stopped', 'AbortError'));
    xhr.onload = () => {
      const answer = parseJson(xhr.responseText);
      if (xhr.status < 200 || xhr.status > 299) return reject(errorFromAnswer(xhr.status, answer));
      try {
        resolve(readAnswer(schema, answer, xhr.status));
      } catch (error) {
        reject(error);
      }
    };
    if (signal?.aborted) return reject(new DOMException('Stopped', 'AbortError'));
    signal?.addEventListener('abort', () => xhr.abort(), { once: true });
    xhr.send(form);
  });
}
