/** A line drawn on a photo: points in fractions of its width and height, so that any size of it can carry them. */
export interface Stroke {
  points: [x: number, y: number][];
}
