import { Component, type ReactNode } from 'react';
import { ErrorPanel } from '../../parts';

interface Props {
  readonly children: ReactNode;
}

/** A fault in one view leaves the frame standing, so that the others can still be reached. */
export class ViewErrorBoundary extends Component<Props, { readonly error: Error | null }> {
  override state: { readonly error: Error | null } = { error: null };

  static getDerivedStateFromError(error: Error): { readonly error: Error } {
    return { error };
  }

  override render(): ReactNode {
    const { error } = this.state;
    if (error === null) return this.props.children;
    return (
      <ErrorPanel
        title="This view stopped working"
        problems={[
          {
            code: 'integrity',
            field: '',
            message: error.message,
            remedy: 'What was saved is safe. Try again, or go to another view.',
          },
        ]}
      >
        <button type="button" onClick={() => this.setState({ error: null })}>
          Try again
        </button>
      </ErrorPanel>
    );
  }
}
