import { Component, type ReactNode } from 'react';
import { Notice } from '@/components/notice.tsx';

/** A browser without WebGL still gets the whole page, only without the picture. */
export class SceneErrorBoundary extends Component<{ children: ReactNode }, { failed: boolean }> {
  override state = { failed: false };

  static getDerivedStateFromError() {
    return { failed: true };
  }

  override render() {
    if (!this.state.failed) return this.props.children;
    return (
      <Notice title="The drawing cannot be shown here">
        This browser offers no 3D drawing (WebGL). The pieces, the sentence, the tapes as a list and the fit
        sheet work without it.
      </Notice>
    );
  }
}
