/** Which drawing the picture side of Size shows; held while the app is open. */
export const pictureIds = ['chart', 'orbit', 'tracks', 'map', 'sweep'] as const;
export type PictureId = (typeof pictureIds)[number];
