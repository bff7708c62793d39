import { useNavigate } from "react-router";
import { useWedgeScanner } from "~/hooks/use-wedge-scanner";
import { findAddress } from "./find-address";

/** Opens what a wedge scanner reads while no field has the focus. Shows nothing. */
export function ScannerEar() {
  const navigate = useNavigate();
  useWedgeScanner((text) => navigate(findAddress(text)));
  return null;
}
