import { useEffect, useState } from 'preact/hooks';

/** So long nothing may change before a text is read out, so that typing is not talked over. */
const SETTLED = 1200;

/** A text for screen readers alone, told once it has settled. */
export function Announced({ text }: { readonly text: string }) {
  const [told, setTold] = useState('');
  useEffect(() => {
    const later = setTimeout(() => setTold(text), SETTLED);
    return () => clearTimeout(later);
  }, [text]);
  return (
    <p class="hidden" role="status">
      {told}
    </p>
  );
}
