import { useWindowDimensions } from 'react-native';

export type Breakpoint = 'phone' | 'wide phone' | 'desk' | 'broad';

export function breakpointOf(width: number): Breakpoint {
  if (width < 600) return 'phone';
  if (width < 900) return 'wide phone';
  return width < 1200 ? 'desk' : 'broad';
}

export function useBreakpoint(): Breakpoint {
  return breakpointOf(useWindowDimensions().width);
}

/** From 900 px on: rail at the left, lists as tables. */
export function useIsWide(): boolean {
  const at = useBreakpoint();
  return at === 'desk' || at === 'broad';
}
