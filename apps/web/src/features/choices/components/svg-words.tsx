import { splitFractions } from '@/components/measure.tsx';

/** A length inside a drawing, with real fractions. */
export function SvgWords({ text }: { text: string }) {
  return splitFractions(text).map(({ text: piece, fraction }, n) =>
    fraction ? (
      <tspan key={n} style={{ fontFeatureSettings: "'frac'" }}>
        {piece}
      </tspan>
    ) : (
      piece
    ),
  );
}
