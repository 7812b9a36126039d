/**
 * One spelling an account. The column compares byte by byte, so that no second spelling that a
 * collation takes for equal reaches the account past its count of tries.
 */
export const plainEmail = (typed: string): string => typed.trim().toLowerCase();
