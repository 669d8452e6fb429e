declare module 'wink-porter2-stemmer' {
  /** Stem of one English word by the Porter2 algorithm. */
  export default function stem(word: string): string;
}
