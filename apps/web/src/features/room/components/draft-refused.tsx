import { Notice } from '@/components/notice.tsx';

/** The server read the draft and said no. */
export function DraftRefused({ message }: { message: string }) {
  return (
    <Notice tone="wont" title="The draft was not taken">
      {message} Your changes stay on this device.
    </Notice>
  );
}
