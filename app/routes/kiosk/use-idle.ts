import { useCallback, useEffect, useRef, useState } from "react";

/** Seconds between the question and starting again. */
export const WARNING_SECONDS = 10;
const EVENTS = ["pointerdown", "keydown", "wheel"] as const;

interface Idle {
  /** Seconds left while the question stands; null otherwise. */
  warning: number | null;
  /** true: nobody has touched anything for the whole time, or it has just started again. */
  isIdle: boolean;
  stay: () => void;
}

/**
 * Watches for touches. After `idleSeconds` without one it asks (where there is anything to lose), then starts again.
 * @param touched somebody has gone somewhere: the question is worth asking
 */
export function useIdle(idleSeconds: number, touched: boolean, startAgain: () => void): Idle {
  const [warning, setWarning] = useState<number | null>(null);
  const [isIdle, setIdle] = useState(false);
  const last = useRef(Date.now());
  const stay = useCallback(() => {
    last.current = Date.now();
    setWarning(null);
    setIdle(false);
  }, []);
  useEffect(() => {
    for (const event of EVENTS) window.addEventListener(event, stay, { passive: true });
    return () => {
      for (const event of EVENTS) window.removeEventListener(event, stay);
    };
  }, [stay]);
  useEffect(() => {
    const timer = setInterval(() => {
      const over = Math.floor((Date.now() - last.current) / 1000) - idleSeconds;
      if (over < 0) return;
      if (touched && over < WARNING_SECONDS) {
        setWarning(WARNING_SECONDS - over);
        return;
      }
      setWarning(null);
      setIdle(true);
      if (touched) startAgain();
    }, 500);
    return () => clearInterval(timer);
  }, [idleSeconds, touched, startAgain]);
  return { warning, isIdle, stay };
}
