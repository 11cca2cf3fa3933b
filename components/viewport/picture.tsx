'use client';
import { Component, lazy, type ReactNode, type RefObject, Suspense } from 'react';
import FlatPicture from './flat-picture';
import type { PictureProps } from './scene-props';

const Scene = lazy(() => import('./three/scene'));

interface Props extends PictureProps {
  readonly flat: boolean;
  readonly stage: RefObject<HTMLElement | null>;
  readonly label: string;
  readonly describedBy: string;
  readonly onLost: () => void;
}

/** Falls back to the flat picture where the 3-D one cannot be loaded or drawn. */
class Rescue extends Component<{ onFail: () => void; children: ReactNode }, { failed: boolean }> {
  override state = { failed: false };

  static getDerivedStateFromError() {
    return { failed: true };
  }

  override componentDidCatch() {
    this.props.onFail();
  }

  override render() {
    return this.state.failed ? null : this.props.children;
  }
}

export function Picture({ flat, stage, onLost, ...props }: Props) {
  if (flat) return <FlatPicture {...props} />;
  return (
    <Rescue onFail={onLost}>
      <Suspense>
        <Scene {...props} stage={stage} onLost={onLost} />
      </Suspense>
    </Rescue>
  );
}
