import type { Paint } from '@/components/viewport/types';

/** How the part is looked at; no part of the design, so neither undone nor in the link. */
export interface ViewState {
  readonly paint: Paint;
  readonly dimensions: boolean;
  readonly cut: boolean;
  readonly onBed: boolean;
  readonly flex: number;
}

export const FIRST_VIEW: ViewState = {
  paint: 'strain',
  dimensions: true,
  cut: false,
  onBed: false,
  flex: 0.7,
};
