import { useEffect, useState } from 'react';

/** Keyboards on glass take more than this of the window's height; browser bars take less. */
const LEAST_KEYBOARD_PX = 150;

/** True while a keyboard on the glass covers part of the page. */
export function useKeyboardUp(): boolean {
  const [up, setUp] = useState(false);
  useEffect(() => {
    const viewport = window.visualViewport;
    if (!viewport) return;
    const look = () =>
      setUp(window.innerHeight - viewport.height * viewport.scale > LEAST_KEYBOARD_PX);
    viewport.addEventListener('resize', look);
    return () => viewport.removeEventListener('resize', look);
  }, []);
  return up;
}
