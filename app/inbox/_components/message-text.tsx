import { TextLink } from '@/components/ui/text-link';

/** A letter's plain text; addresses of this installation can be followed, all others stay text. */
export function MessageText({ text, origin }: { text: string; origin: string }) {
  return (
    <div className="max-w-[70ch] break-words whitespace-pre-wrap">
      {text.split(/(https?:\/\/[^\s<>"]+)/).map((piece, at) =>
        piece.startsWith(`${origin}/`) ? (
          <TextLink key={at} href={piece.slice(origin.length)} className="break-all">
            {piece}
          </TextLink>
        ) : (
          piece
        ),
      )}
    </div>
  );
}
