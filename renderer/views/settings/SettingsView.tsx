import { ViewHeader } from '../../app/shell/ViewHeader';
import { AppearanceSection } from './AppearanceSection';
import { ConditionsSection } from './ConditionsSection';
import { DataSection } from './DataSection';
import { KeyboardSection } from './KeyboardSection';
import './SettingsView.css';

export default function SettingsView() {
  return (
    <>
      <ViewHeader title="Settings" summary="Kept on this machine, each as soon as you change it." />
      <div className="settings">
        <AppearanceSection />
        <ConditionsSection />
        <KeyboardSection />
        <DataSection />
      </div>
    </>
  );
}
