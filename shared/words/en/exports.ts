/** An export whose drawing was ended for its memory or time. */
export const EXPORT_TOO_HEAVY =
  'Drawing this spread takes more memory or time than the server may give it: choose the screen size, or use smaller picture files.';
