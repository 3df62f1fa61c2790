import { AppError } from '../../shared/errors';

/** What a schema cannot know, said about one field of the body. */
export const invalidField = (path: string, message: string): AppError =>
  new AppError('invalid-input', { where: 'body', fields: [{ path, message }] });
