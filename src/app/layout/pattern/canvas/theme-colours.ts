/** The theme's colours as the canvas takes them: custom properties resolved by an element that wears them. */
import type { CanvasColours } from './overlay-painting';

const TOKENS: Record<keyof CanvasColours, string> = {
  paper: '--paper',
  ink: '--ink',
  mute: '--mute',
  teal: '--teal',
  tealInk: '--teal-ink',
  stop: '--stop-ink',
};

/** The colours in force at an element, light or dark. */
export function themeColours(element: HTMLElement): CanvasColours {
  const probe = document.createElement('span');
  probe.hidden = true;
  element.append(probe);
  const colourOf = (token: string): string => {
    probe.style.color = `var(${token})`;
    return getComputedStyle(probe).color;
  };
  const colours: CanvasColours = {
    paper: colourOf(TOKENS.paper),
    ink: colourOf(TOKENS.ink),
    mute: colourOf(TOKENS.mute),
    teal: colourOf(TOKENS.teal),
    tealInk: colourOf(TOKENS.tealInk),
    stop: colourOf(TOKENS.stop),
  };
  probe.remove();
  return colours;
}
