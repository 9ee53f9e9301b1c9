import { Notice } from '@/components/ui/notice';

/**
 * What a form says when it was not accepted, read aloud when it appears. Where inputs are wrong the sentences stand beside
 * them already, and here it only says how many; a form that has no input for them (`inputs` false: a list brought in)
 * says them all here.
 */
export function FormFailure({
  failure,
  inputs = true,
}: {
  failure: { message: string; fields: Record<string, string> } | undefined;
  inputs?: boolean;
}) {
  if (!failure) return null;
  const beside = Object.keys(failure.fields).filter((path) => path !== '');
  return (
    <Notice tone="stop" live="assertive">
      {beside.length === 0
        ? failure.message
        : !inputs
          ? [...new Set(Object.values(failure.fields))].slice(0, 5).join(' ')
          : beside.length === 1
            ? 'One field needs another look. Nothing was sent off.'
            : `${beside.length} fields need another look. Nothing was sent off.`}
    </Notice>
  );
}
