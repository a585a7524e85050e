/** Pictures that are sent to be laid as tiles. */

/** What is taken: by content, never by name. */
export const PICTURE_TYPES = ['image/png', 'image/jpeg', 'image/webp'] as const;
export type PictureType = (typeof PICTURE_TYPES)[number];

export const PICTURE_BOUNDS = {
  /** Greatest file, 10 MB. */
  bytes: 10 * 1024 * 1024,
  /** Greatest picture, 40 megapixels. */
  pixels: 40_000_000,
} as const;

/** The name of the file in the multipart body. */
export const PICTURE_FIELD = 'picture';

/** The longer side of the picture that comes back, at most. */
export const PREPARED_SIDE_PX = 1024;

/** What is transparent shows this: the paper of the screens. */
export const PAPER_COLOUR = '#F4F1EA';
