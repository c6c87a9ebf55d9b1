import { Component, type ReactNode } from "react";

interface StillOnFailureProps {
  /** Told when what it holds has failed: the still comes back. */
  onFailure: () => void;
  children: ReactNode;
}

/**
 * Holds what draws. When its code does not come over the network, or drawing fails, only this part goes: the still, the
 * words and the rest of the page stay. React has no hook for this, hence a class.
 */
export class StillOnFailure extends Component<StillOnFailureProps, { failed: boolean }> {
  override state = { failed: false };

  static getDerivedStateFromError() {
    return { failed: true };
  }

  override componentDidCatch() {
    this.props.onFailure();
  }

  override render() {
    return this.state.failed ? null : this.props.children;
  }
}
