/** A photo as it is looked at: one shot of a hold point. Addresses are URLs of the server or of a Blob on the device. */
export interface PhotoToShow {
  sha256: string;
  /** What it shows, in the reader's language: the picture's text alternative. */
  name: string;
  /** The preview, null where none could be made. */
  previewUrl: string | null;
  /** The camera's own file, fetched when somebody looks closer; null while it lies on another device. */
  originalUrl: string | null;
  /** Of the upright original, in pixels. */
  width: number;
  height: number;
  /** It has not reached the server yet. */
  unsent?: boolean;
}
