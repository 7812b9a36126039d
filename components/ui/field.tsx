import { useId, type ComponentProps, type ReactNode } from 'react';

/** What ties a control to its label, hint and complaint; spread it on the control. */
export type FieldTies = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
};

/** A label, its control, a hint and what is wrong with what was entered, tied for screen readers. */
export function Field({
  label,
  hint,
  error,
  children,
  className = '',
}: {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  children: (ties: FieldTies) => ReactNode;
  className?: string;
}) {
  const id = useId();
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean);
  return (
    <div className={`flex flex-col gap-1 ${className}`}>
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint && (
        <span id={`${id}-hint`} className="text-ink-soft">
          {hint}
        </span>
      )}
      {children({
        id,
        'aria-describedby': described.length > 0 ? described.join(' ') : undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {error && (
        <span id={`${id}-error`} className="flex items-baseline gap-2 font-semibold text-alarm">
          <span aria-hidden="true" className="size-3 shrink-0 bg-alarm" />
          {error}
        </span>
      )}
    </div>
  );
}

const CONTROL =
  'min-h-11 w-full border-[1.5px] border-rule bg-paper px-3 py-2 text-ink hover:border-ink ' +
  'aria-invalid:border-2 aria-invalid:border-alarm disabled:border-dashed disabled:text-ink-soft';

export function Input({ className = '', ...rest }: ComponentProps<'input'>) {
  return <input className={`${CONTROL} ${className}`} {...rest} />;
}

export function TextArea({ className = '', ...rest }: ComponentProps<'textarea'>) {
  return <textarea className={`${CONTROL} min-h-24 ${className}`} {...rest} />;
}

export function Select({ className = '', ...rest }: ComponentProps<'select'>) {
  return <select className={`${CONTROL} cursor-pointer ${className}`} {...rest} />;
}
