import { FontDisplay, useFonts as useExpoFonts } from 'expo-font';

const swap = (uri: number) => ({ uri, display: FontDisplay.SWAP });

/** Loads the type. Text stands in a fallback of the same width until it arrives, so nothing waits. */
export function useFonts(): void {
  useExpoFonts({
    'Barlow-Regular': swap(require('@/assets/fonts/barlow-400.woff2')),
    'Barlow-Medium': swap(require('@/assets/fonts/barlow-500.woff2')),
    'Barlow-SemiBold': swap(require('@/assets/fonts/barlow-600.woff2')),
    'BarlowCondensed-SemiBold': swap(require('@/assets/fonts/barlow-condensed-600.woff2')),
  });
}
