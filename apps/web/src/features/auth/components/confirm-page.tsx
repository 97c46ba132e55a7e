import { useParams } from 'react-router-dom';
import { Button, LinkButton } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { useConfirmEmail } from '../api.ts';
import { EntranceHeading } from './entrance-heading.tsx';

/** Confirming takes a press: mail scanners open links, and opening must change nothing. */
export function ConfirmPage() {
  const { token = '' } = useParams();
  const confirm = useConfirmEmail();
  if (confirm.isSuccess) {
    return (
      <>
        <EntranceHeading title="Address confirmed" tab="Address confirmed">
          You can now invite people and send orders.
        </EntranceHeading>
        <LinkButton to="/" look="main">
          Go to the workshop
        </LinkButton>
      </>
    );
  }
  return (
    <>
      <EntranceHeading title="Is this your address?" tab="Confirm the address">
        Confirm it once; invitations and orders are then sent in your name.
      </EntranceHeading>
      {confirm.isError && (
        <Notice tone="wont" className="mb-5">
          {sayProblem(confirm.error)} A new link can be asked for on your account page.
        </Notice>
      )}
      <Button
        look="main"
        busy={confirm.isPending}
        busyWords="Confirming"
        onClick={() => confirm.mutate(token)}
      >
        Confirm the address
      </Button>
    </>
  );
}
