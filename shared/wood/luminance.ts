/** Relative luminance of a colour "#RRGGBB", 0 (black) to 1 (white): WCAG 2.2, "relative luminance". */
export function luminanceOf(colour: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((start) =>
    linear(Number.parseInt(colour.slice(start, start + 2), 16) / 255),
  );
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function linear(channel: number): number {
  return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
}
