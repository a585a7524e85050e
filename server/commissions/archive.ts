import { ApiError } from '../http/errors';

/** Why nothing in an archived commission can be changed. */
export function archivedRefusal(): ApiError {
  return new ApiError(
    'not-allowed',
    'This commission is in the archive, so it can be read but not changed. Take it out first.',
  );
}
