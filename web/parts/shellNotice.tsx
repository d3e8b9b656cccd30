import { useApp } from '../state/appContext';

/** The message at the lower edge, with its undo. */
export function ShellNotice() {
  const { announcer } = useApp();
  const announcement = announcer.current.value;
  const run = () => {
    announcer.dismiss();
    announcement?.action?.run();
  };
  return (
    <div role="status" aria-live="polite">
      {announcement && (
        <div class="shell-notice">
          <p>{announcement.text}</p>
          {announcement.action && (
            <button type="button" onClick={run}>
              {announcement.action.label}
            </button>
          )}
          <button type="button" class="plain" onClick={announcer.dismiss}>
            Close
          </button>
        </div>
      )}
    </div>
  );
}
