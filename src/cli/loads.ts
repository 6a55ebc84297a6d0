import { laneEffects, tenthPoints } from "../loads/live-load.js";
import { vehicleNamed } from "../loads/vehicles.js";
import { loadRows } from "../report/csv.js";
import { loadsJson } from "../report/json.js";
import { loadsText } from "../report/text/loads.js";
import { checkTargets, deliver } from "./deliver.js";
import { gather } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

/** `leanspan loads`: what a vehicle does to a span. */
export async function runLoads(flags: Flags, io: Io): Promise<ExitCode> {
  const { bridge, vehicles } = gather(flags, { bridge: "span", shapes: false }).question;
  await checkTargets(flags);
  const vehicle = vehicleNamed(vehicles, bridge.liveLoad.vehicle);
  const live = laneEffects(vehicle, bridge.spanFt);
  const tenths = tenthPoints(vehicle, bridge.spanFt);
  await deliver(
    {
      text: () => loadsText(bridge, live, tenths, io.style),
      json: () => loadsJson(bridge, live, tenths),
      rows: () => loadRows(tenths),
    },
    flags,
    io,
  );
  return EXIT.found;
}
