/**
 * Whether a text is being typed into in some box, so that the page can make room for the on-screen keyboard.
 *
 * The end is held back while a finger is down: a page that moved between the touch and the click would take the tap
 * away from the button under the finger.
 */
import { useEffect, useRef, useState } from 'preact/hooks';
import { isTextField } from './textField';

export function useTyping<Box extends HTMLElement>() {
  const box = useRef<Box>(null);
  const [isTyping, setTyping] = useState(false);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    let fingerIsDown = false;
    const look = () => setTyping(isTextField(document.activeElement) && element.contains(document.activeElement));
    // After the click that ends the touch.
    const later = () => setTimeout(() => !fingerIsDown && look());
    const down = () => {
      fingerIsDown = true;
    };
    const up = () => {
      fingerIsDown = false;
      later();
    };
    const onIn = ({ target }: FocusEvent) => (isTextField(target) ? look() : later());
    const onOut = () => later();
    element.addEventListener('focusin', onIn);
    element.addEventListener('focusout', onOut);
    document.addEventListener('pointerdown', down, true);
    document.addEventListener('pointerup', up, true);
    document.addEventListener('pointercancel', up, true);
    return () => {
      element.removeEventListener('focusin', onIn);
      element.removeEventListener('focusout', onOut);
      document.removeEventListener('pointerdown', down, true);
      document.removeEventListener('pointerup', up, true);
      document.removeEventListener('pointercancel', up, true);
    };
  }, []);
  return { box, isTyping };
}
