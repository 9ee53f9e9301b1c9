import { ButtonLink } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';

/** What a link shows once it was used, withdrawn or is too old. Props: `says` what to do, `href` and `button` to do it. */
export function SpentLink({ says, href, button }: { says: string; href: string; button: string }) {
  return (
    <>
      <h1 className="sr-only">This link is spent</h1>
      <EmptyState
        title="This link has been used or is too old"
        action={
          <ButtonLink href={href} look="primary">
            {button}
          </ButtonLink>
        }
      >
        {says}
      </EmptyState>
    </>
  );
}
