/** A picture's bytes and their sort. */
export interface StoredPicture {
  /** Of the bytes, hexadecimal. */
  sha256: string;
  type: string;
  contents: ArrayBuffer;
}

/** Pictures that no survey on this device shows any more; they can come back by taking a deletion back. */
export interface UnusedPictures {
  count: number;
  bytes: number;
}

/** Where the pictures of photos are kept, under the hash of their bytes. Rejects with an `AppError`. */
export interface PhotoStore {
  /** Gives the hash, once the picture is durable. One that is there already is left as it is. */
  keep(picture: Omit<StoredPicture, 'sha256'>): Promise<string>;
  /** Null where it is not on this device. */
  picture(sha256: string): Promise<StoredPicture | null>;
  unused(): Promise<UnusedPictures>;
  /** Removes the unused ones for good. */
  eraseUnused(): Promise<void>;
}
