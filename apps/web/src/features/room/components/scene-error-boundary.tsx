import { Component, type ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { isMissingPart } from '@/lib/newer-version.ts';

/** A browser without WebGL still gets the whole page, only without the picture. */
export class SceneErrorBoundary extends Component<
  { children: ReactNode },
  { failure?: 'outdated' | 'no-drawing' }
> {
  override state: { failure?: 'outdated' | 'no-drawing' } = {};

  static getDerivedStateFromError(error: unknown) {
    return { failure: isMissingPart(error) ? 'outdated' : 'no-drawing' };
  }

  override render() {
    const { failure } = this.state;
    if (!failure) return this.props.children;
    if (failure === 'outdated') {
      return (
        <Notice title="A newer version is there">
          The drawing could not be fetched, as Settlewright was renewed while this page stood open. Your
          changes stay on this device.
          <p className="mt-3">
            <Button onClick={() => location.reload()}>Reload</Button>
          </p>
        </Notice>
      );
    }
    return (
      <Notice title="The drawing cannot be shown here">
        This browser offers no 3D drawing (WebGL). The pieces, the sentence, the tapes as a list and the fit
        sheet work without it.
      </Notice>
    );
  }
}
