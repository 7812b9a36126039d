import { StatusShape } from '@/components/ui/status-mark';
import { BlankForm, BlankNumber } from './blank-form';
import type { Cell, Column, TablePart } from './paper-table';

export function PaperTablePart({ part: { table, rows, continued } }: { part: TablePart }) {
  const whole = table.columns.reduce((sum, { share }) => sum + share, 0);
  return (
    <section>
      <h3>
        {table.title}
        {continued && ' (continued)'}
      </h3>
      {table.lead && !continued && <p>{table.lead}</p>}
      <table className={table.rowMm ? 'to-fill' : undefined}>
        <colgroup>
          {table.columns.map(({ title, share }, i) => (
            <col key={`${title}${i}`} style={{ width: `${(share / whole) * 100}%` }} />
          ))}
        </colgroup>
        <thead>
          <tr>
            {table.columns.map((column, i) => (
              <th key={`${column.title}${i}`} scope="col" className={sideOf(column)}>
                {column.title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, cells }) => (
            <tr key={key} style={table.rowMm ? { height: `${table.rowMm}mm` } : undefined}>
              {cells.map((cell, i) => (
                <td key={i} className={sideOf(table.columns[i])}>
                  <CellWords cell={cell} numbered={table.id === 'blanks' && i === 0} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

const sideOf = (column: Column | undefined): string | undefined =>
  column?.right ? 'right' : undefined;

function CellWords({ cell, numbered }: { cell: Cell; numbered: boolean }) {
  if (numbered) return <BlankNumber number={Number(cell.text)} />;
  if (cell.form) return <BlankForm form={cell.text} />;
  if (cell.status) {
    return (
      <span className="answer">
        <StatusShape status={cell.status} /> {cell.text}
      </span>
    );
  }
  return cell.strong ? <strong>{cell.text}</strong> : cell.text;
}
