/** How the browser tests start Chromium: quiet on the network, and able to run as root without a display. */
export const chromiumPath = process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium';

export const chromiumFlags = [
  '--headless=new',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
