import { Notice } from '@/components/ui/notice';

/**
 * What a form says when it was not accepted, read aloud when it appears. When exactly one input is wrong the sentence
 * stands beside that input already, and here it only says where to look.
 */
export function FormFailure({
  failure,
}: {
  failure: { message: string; fields: Record<string, string> } | undefined;
}) {
  if (!failure) return null;
  const beside = Object.keys(failure.fields).filter((path) => path !== '');
  return (
    <Notice tone="stop" live="assertive">
      {beside.length === 0
        ? failure.message
        : beside.length === 1
          ? 'One field needs another look. Nothing was sent off.'
          : `${beside.length} fields need another look. Nothing was sent off.`}
    </Notice>
  );
}
