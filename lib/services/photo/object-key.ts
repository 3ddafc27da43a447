/** Where a photo is kept once it was looked at. Keys begin with the organisation's id, so that storage can be spread too. */
export const objectKey = (organisationId: string, photoId: string) => `${organisationId}/photos/${photoId}`;

/** Small copies lie beside the pictures. */
export const thumbnailKey = (organisationId: string, photoId: string) => `${organisationId}/thumbnails/${photoId}`;

/**
 * Where a browser puts it: another place, so that whoever still holds the permission to upload can't swap the picture
 * after it was looked at.
 */
export const arrivalKey = (organisationId: string, photoId: string) => `${organisationId}/arrivals/${photoId}`;
