/**
 * What shared/ and exports/ may expect of any JavaScript host beyond the language itself. The pure type
 * gate (tsconfig.pure.json) knows nothing else: neither the browser's nor Node's names.
 */
declare function btoa(data: string): string;
declare function atob(data: string): string;
declare function structuredClone<Value>(value: Value): Value;

declare class TextEncoder {
  encode(text?: string): Uint8Array<ArrayBuffer>;
}

declare class TextDecoder {
  constructor(label?: string, options?: { fatal?: boolean; ignoreBOM?: boolean });
  decode(bytes?: Uint8Array): string;
}
