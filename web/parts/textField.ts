/** Whether something is a place to type a text into. */
export const isTextField = (target: EventTarget | null): boolean =>
  target instanceof HTMLTextAreaElement || (target instanceof HTMLInputElement && target.type !== 'radio');
