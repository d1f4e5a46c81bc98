import type { MultipartFile } from '@fastify/multipart';
import type { FastifyRequest } from 'fastify';
import { BadInput, TooLarge, WrongType } from '../../common/errors/app-error.js';

type WithFile = FastifyRequest & { isMultipart(): boolean; file(): Promise<MultipartFile | undefined> };

/** The one file of a multipart request, whole in memory: its size is bounded by the parser. */
export async function readUpload(request: FastifyRequest): Promise<Buffer> {
  const multipart = request as WithFile;
  if (!multipart.isMultipart())
    throw new WrongType('Send the photo as multipart/form-data, in the field `file`.');
  try {
    const file = await multipart.file();
    if (file?.fieldname !== 'file')
      throw new BadInput([{ path: 'file', message: 'Send one photo, in the field `file`.' }]);
    return await file.toBuffer();
  } catch (error) {
    if ((error as { code?: string }).code === 'FST_REQ_FILE_TOO_LARGE')
      throw new TooLarge('A photo has at most 12 MB.');
    if (error instanceof BadInput) throw error;
    throw new BadInput([{ path: 'file', message: 'The upload broke off or could not be read: try again.' }]);
  }
}
