import {
  closestCenter,
  DndContext,
  type DragEndEvent,
  KeyboardSensor,
  PointerSensor,
  useSensor,
  useSensors,
} from "@dnd-kit/core";
import {
  arrayMove,
  SortableContext,
  sortableKeyboardCoordinates,
  useSortable,
  verticalListSortingStrategy,
} from "@dnd-kit/sortable";
import { CSS } from "@dnd-kit/utilities";
import { type ReactNode, useEffect, useId, useState } from "react";
import { classes } from "./classes.ts";

export interface SortableItem {
  id: string;
  /** What it is called, for people who listen while they move it. */
  name: string;
}

interface SortableListProps<T extends SortableItem> {
  /** Names the list for listeners. */
  label: string;
  items: readonly T[];
  /** The new order of all ids, after a drop. */
  onOrder: (order: string[]) => void;
  children: (item: T, at: number) => ReactNode;
  /** No handles: this person may look, not move. */
  fixed?: boolean;
}

/**
 * A list that is put in order by dragging, with the pointer or with the keyboard (Space lifts, arrows move, Space drops,
 * Escape puts back). Buttons for the same belong into `children`: they work without JavaScript.
 */
export function SortableList<T extends SortableItem>({ label, items, onOrder, children, fixed }: SortableListProps<T>) {
  const [order, setOrder] = useState(items.map((item) => item.id));
  const id = useId();
  // What the server says is the order; a drop shows at once and is corrected by the answer.
  useEffect(() => setOrder(items.map((item) => item.id)), [items]);
  const sensors = useSensors(
    useSensor(PointerSensor, { activationConstraint: { distance: 4 } }),
    useSensor(KeyboardSensor, { coordinateGetter: sortableKeyboardCoordinates }),
  );
  const shown = order.flatMap((one) => items.find((item) => item.id === one) ?? []);
  const name = (of: string | number) => items.find((item) => item.id === of)?.name ?? "";
  const place = (of: string | number | undefined) => order.indexOf(String(of)) + 1;
  const drop = ({ active, over }: DragEndEvent) => {
    if (!over || active.id === over.id) return;
    const next = arrayMove(order, order.indexOf(String(active.id)), order.indexOf(String(over.id)));
    setOrder(next);
    onOrder(next);
  };
  return (
    <DndContext
      id={id}
      sensors={sensors}
      collisionDetection={closestCenter}
      onDragEnd={drop}
      accessibility={{
        screenReaderInstructions: {
          draggable: "To move it, press Space, then the arrow keys, then Space again. Escape puts it back.",
        },
        announcements: {
          onDragStart: ({ active }) => `Lifted ${name(active.id)}, place ${place(active.id)} of ${order.length}.`,
          onDragOver: ({ active, over }) => `${name(active.id)} is over place ${place(over?.id)} of ${order.length}.`,
          onDragEnd: ({ active, over }) => `${name(active.id)} dropped at place ${place(over?.id)}.`,
          onDragCancel: ({ active }) => `${name(active.id)} put back.`,
        },
      }}
    >
      <SortableContext items={order} strategy={verticalListSortingStrategy} disabled={fixed}>
        <ol aria-label={label} className="border-t border-rule">
          {shown.map((item, at) => (
            <Row key={item.id} item={item} fixed={fixed}>
              {children(item, at)}
            </Row>
          ))}
        </ol>
      </SortableContext>
    </DndContext>
  );
}

function Row({ item, fixed, children }: { item: SortableItem; fixed?: boolean; children: ReactNode }) {
  const { attributes, listeners, setNodeRef, setActivatorNodeRef, transform, transition, isDragging } = useSortable({
    id: item.id,
    disabled: fixed,
  });
  return (
    <li
      ref={setNodeRef}
      style={{ transform: CSS.Translate.toString(transform), transition }}
      className={classes(
        "flex items-start gap-2 border-b border-rule bg-paper",
        isDragging && "relative z-10 bg-paper-shade",
      )}
    >
      {fixed ? null : (
        <button
          type="button"
          ref={setActivatorNodeRef}
          {...attributes}
          {...listeners}
          aria-label={`Move ${item.name}`}
          className="tap flex w-8 shrink-0 cursor-grab touch-none items-center justify-center self-stretch text-ink-soft"
        >
          <svg aria-hidden="true" viewBox="0 0 6 14" className="h-3.5 fill-current">
            <path d="M0 0h2v2H0zM4 0h2v2H4zM0 6h2v2H0zM4 6h2v2H4zM0 12h2v2H0zM4 12h2v2H4z" />
          </svg>
        </button>
      )}
      <div className="min-w-0 grow py-3">{children}</div>
    </li>
  );
}
