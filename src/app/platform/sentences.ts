/** Turns what a schema says about a field ("must not be empty") into a sentence ("The title must not be empty."). */
export function sentenceOf(subject: string, complaint: string): string {
  const sentence = `${subject} ${complaint}`.trim();
  const capital = sentence.charAt(0).toUpperCase() + sentence.slice(1);
  return /[.!?]$/.test(capital) ? capital : `${capital}.`;
}
