/** Ids are opaque and never shown; random ones stay unique when two layouts are brought together. */
export const newPieceId = (): string => crypto.randomUUID();
