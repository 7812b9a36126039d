export { AddPiece } from './add-piece';
export { PiecesTable } from './pieces-table';
export { TellLayout } from './tell-layout';
