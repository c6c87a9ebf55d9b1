import { lazy, Suspense, useCallback, useEffect, useId, useMemo, useRef, useState } from "react";
import type { Language } from "#app/figures/language.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import type { CastMember } from "#app/scene/member.ts";
import type { Orbit } from "./camera.ts";
import { moved, STEP, TURN_DEG, turned } from "./orbit.ts";
import { StageButtons } from "./StageButtons.tsx";
import type { PickRecord } from "./StageCanvas.tsx";
import { StageHelp } from "./StageHelp.tsx";
import { StageRegion } from "./StageRegion.tsx";
import { StillOnFailure } from "./StillOnFailure.tsx";
import { stageKeys } from "./stage-keys.ts";
import { useHydrated } from "./use-hydrated.ts";
import { STAGE_WORDS } from "./words.ts";

// three and the rasteriser come only where a stage is shown, and only to a browser that runs scripts.
const StageCanvas = lazy(() => import("./StageCanvas.tsx"));

export interface VolumeStageProps {
  document: SceneDocument;
  members: readonly CastMember[];
  language: Language;
  /** Shown until the stage can draw, and where it never can. */
  stillUrl?: string | null;
  stillAlt: string;
  selectedId?: string | null;
  onSelect?: (recordId: string | null) => void;
  /** A new value puts the view back to the document's. */
  resetKey?: string | number;
  /** Where the visitor has turned to. */
  onView?: (orbit: Orbit) => void;
  /** "kiosk": letters grow with the screen, fingers hit from farther, the wheel is the stage's. */
  controls?: "office" | "kiosk";
  className?: string;
}

/** A volume scene to turn, to come near to and to choose from, by pointer, finger, key or button. Nothing moves by itself. */
export function VolumeStage(props: VolumeStageProps) {
  const { document, members, language, stillUrl, stillAlt, controls = "office", className = "" } = props;
  const words = STAGE_WORDS[language];
  const kiosk = controls === "kiosk";
  const hydrated = useHydrated();
  const pick = useRef<PickRecord | null>(null);
  const [ready, setReady] = useState(false);
  const layout = useMemo(() => layoutVolume(document, members, language), [document, members, language]);
  const [orbit, changeOrbit, reset] = useOrbit(props);
  const [selectedId, select] = useSelection(props);
  const keysId = useId();
  const onReady = useCallback((picker: PickRecord) => {
    pick.current = picker;
    setReady(true);
  }, []);
  const onTap = (x: number, y: number) => select(pick.current?.(x, y, kiosk ? 48 : 24) ?? null);
  const selected = layout.stars.find(({ recordId }) => recordId === selectedId);

  const onKeyDown = stageKeys({
    orbit,
    changeOrbit,
    reset,
    recordIds: layout.stars.map(({ recordId }) => recordId),
    selectedId,
    select,
    middleStar: ({ clientWidth: width, clientHeight: height }) =>
      pick.current?.(width / 2, height / 2, Math.hypot(width, height)) ?? null,
  });

  return (
    <div className={`night group flex min-h-0 flex-col ${className}`}>
      <div className="relative min-h-0 grow overflow-hidden">
        {!ready && stillUrl && (
          <img src={stillUrl} alt={stillAlt} className="absolute inset-0 size-full object-contain" />
        )}
        {hydrated && (
          <StillOnFailure onFailure={() => setReady(false)}>
            <Suspense fallback={null}>
              <div className="absolute inset-0">
                <StageCanvas {...{ document, layout, language, selectedId, orbit, onReady }} large={kiosk} />
              </div>
            </Suspense>
          </StillOnFailure>
        )}
        {ready && (
          <StageRegion name={words.stage} keysId={keysId} wheelAlways={kiosk} {...{ onKeyDown, onTap, changeOrbit }} />
        )}
      </div>
      {ready && (
        <>
          <StageHelp id={keysId} {...{ words, stillAlt, kiosk }} />
          <p aria-live="polite" className="sr-only">
            {selected ? words.chosen(selected.name, selected.distanceText) : words.nothingChosen}
          </p>
          <StageButtons
            words={words}
            kiosk={kiosk}
            onTurn={(direction) => changeOrbit((now) => turned(now, direction * TURN_DEG, 0))}
            onMove={(direction) => changeOrbit((now) => moved(now, direction === "nearer" ? 1 / STEP : STEP))}
            onReset={reset}
          />
        </>
      )}
    </div>
  );
}

function orbitOf({ camera: { azimuthDeg, elevationDeg, distance } }: SceneDocument): Orbit {
  return { azimuthDeg, elevationDeg, distance };
}

/** The view, the document's at first and again whenever the document's own view or the reset key changes. */
function useOrbit({ document, resetKey, onView }: VolumeStageProps) {
  const start = orbitOf(document);
  const startKey = `${resetKey} ${start.azimuthDeg} ${start.elevationDeg} ${start.distance}`;
  const [kept, setKept] = useState({ startKey, orbit: start });
  const orbit = kept.startKey === startKey ? kept.orbit : start;
  if (kept.startKey !== startKey) setKept({ startKey, orbit: start });
  const change = useCallback((next: (orbit: Orbit) => Orbit) => {
    setKept((now) => ({ ...now, orbit: next(now.orbit) }));
  }, []);
  const told = useRef(orbit);
  useEffect(() => {
    if (told.current === orbit) return;
    told.current = orbit;
    onView?.(orbit);
  }, [orbit, onView]);
  return [orbit, change, () => change(() => start)] as const;
}

/** Who is chosen: the caller's to say when it says so, else kept here. */
function useSelection({ selectedId, onSelect }: VolumeStageProps) {
  const [own, setOwn] = useState<string | null>(null);
  const chosen = selectedId === undefined ? own : selectedId;
  const select = (recordId: string | null) => {
    setOwn(recordId);
    onSelect?.(recordId);
  };
  return [chosen, select] as const;
}
