import { PICTURE_FIELD } from '@shared/api/picture';
import type { Person } from '@shared/api/session';
import type { RequestHandler } from 'express';
import sharp from 'sharp';
import { API_ROUTES } from '../api-routes';
import { ApiError } from '../http/errors';
import type { RouteMount } from '../http/route';
import { decodingPlaces, type DecodingPlaces } from './decoding-places';
import { preparePicture } from './prepare-picture';

/** Preparing pictures. Nothing of them is kept, neither on a disk nor in memory. */
export function mountPictures(mount: RouteMount): void {
  // one thread decodes, so that the others go on answering; and no picture stays in libvips' cache
  sharp.concurrency(1);
  sharp.cache(false);
  const places = decodingPlaces();
  mount(
    API_ROUTES.preparePicture,
    async ({ upload, request }) => {
      const prepared = await places.inTurn(() => preparePicture(upload));
      if (!prepared.ok) {
        if (prepared.cause) request.log.info({ err: prepared.cause }, 'picture not decoded');
        const fields = [{ field: PICTURE_FIELD, message: prepared.refusal }];
        throw new ApiError('bad-input', `The picture ${prepared.refusal}.`, fields);
      }
      return { fileName: 'picture.png', content: prepared.png };
    },
    { beforeBody: [placeUntilAnswered(places)] },
  );
}

function placeUntilAnswered(places: DecodingPlaces): RequestHandler {
  return (request, response, next) => {
    const place = places.take((request.user as Person).id);
    response.once('close', place.giveBack);
    next();
  };
}
