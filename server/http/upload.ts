import { createHash } from 'node:crypto';
import type { Request, Response } from 'express';
import multer, { MulterError } from 'multer';
import { Problem } from '@/shared/problems/problems';
import type { UploadedFile } from './route';

export const largestFileBytes = 10 * 1024 * 1024;
export const mostFiles = 6;

const receive = multer({
  storage: multer.memoryStorage(),
  limits: {
    fileSize: largestFileBytes,
    files: mostFiles,
    fields: 20,
    fieldSize: 100_000,
    parts: 30,
    headerPairs: 20,
  },
  defParamCharset: 'utf8',
}).any();

/** Reads a multipart form: text fields into request.body, files into memory up to the limit, nothing to disk. */
export function readUpload(request: Request, response: Response): Promise<UploadedFile[]> {
  return new Promise((resolve, reject) => {
    receive(request, response, (error: unknown) => {
      if (error) {
        reject(uploadProblem(error));
        return;
      }
      const received = Array.isArray(request.files) ? request.files : [];
      resolve(
        received.map((file) => ({
          field: file.fieldname,
          name: safeName(file.originalname),
          mediaType: file.mimetype,
          bytes: file.buffer,
          sha256: createHash('sha256').update(file.buffer).digest('hex'),
        })),
      );
    });
  });
}

function uploadProblem(error: unknown): Problem {
  if (error instanceof MulterError && error.code.startsWith('LIMIT_FILE')) {
    return new Problem('too large', {
      data: { megabytes: largestFileBytes / 1024 / 1024, files: mostFiles },
    });
  }
  return new Problem('not valid', {
    fields: [{ path: 'files', message: 'The upload broke off or is not a form with files' }],
  });
}

/** The last part of the name without control characters or path signs, at most 120 characters, its ending kept. */
export function safeName(name: string): string {
  const last = name.split(/[\\/]/).pop() ?? '';
  const plain = last.replace(/[\u0000-\u001f\u007f-\u009f\u200e\u200f\u202a-\u202e"<>|*?:]/g, '').trim();
  if (plain.length <= 120) return plain || 'file';
  const ending = /\.[A-Za-z0-9]{1,8}$/.exec(plain)?.[0] ?? '';
  return plain.slice(0, 120 - ending.length) + ending;
}
