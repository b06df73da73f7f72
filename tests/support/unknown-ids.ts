/** The id of nothing. */
export const UNKNOWN_ID = '3fa85f64-5717-4562-b3fc-2c963f66afa6';
/** The number of no building. */
export const UNKNOWN_NUMBER = 2_000_000_000;
