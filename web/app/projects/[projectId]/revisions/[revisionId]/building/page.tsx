import { buildingSchema } from '@groundward/engine/building/json-schema';
import { BuildingEditor } from '@/parts/building-editor';

export default function BuildingPage() {
  return <BuildingEditor schema={buildingSchema()} />;
}
