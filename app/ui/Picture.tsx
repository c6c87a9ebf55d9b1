interface PictureProps {
  /** One srcset a format, best first; the last one is for every browser. */
  sources: readonly { format: string; srcset: string }[];
  alt: string;
  width: number;
  height: number;
  /** How wide it is shown, in CSS: "(min-width: 64rem) 50vw, 100vw". */
  sizes: string;
  /** Shown under it, always. */
  credit: string;
  className?: string;
}

/** A picture with its credit, in whatever format and width suit the screen. */
export function Picture({ sources, alt, width, height, sizes, credit, className }: PictureProps) {
  const last = sources.at(-1)?.srcset ?? "";
  const plain = last.split(", ").at(-1)?.split(" ")[0] ?? "";
  return (
    <figure className={className}>
      <picture>
        {sources.slice(0, -1).map((one) => (
          <source key={one.format} type={`image/${one.format}`} srcSet={one.srcset} sizes={sizes} />
        ))}
        <img
          src={plain}
          srcSet={last}
          sizes={sizes}
          alt={alt}
          width={width}
          height={height}
          loading="lazy"
          className="h-auto w-full bg-paper-shade"
        />
      </picture>
      <figcaption className="mt-1 text-sm text-ink-soft">{credit}</figcaption>
    </figure>
  );
}
