/** A scheme's picture in pixels; on a wider card it is stretched. */
export const PICTURE_SIZE = { width: 356, height: 150 } as const;
