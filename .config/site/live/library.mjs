// What the live page needs of the library, as one script: it says so by an event, as scripts of no module export nothing.
import { ThermosteadError } from "thermostead";
import { diagramChart, ledgerDrawing, toSVG } from "thermostead/chart";
import { appraisePlanet, toText } from "thermostead/planet";

const detail = { appraisePlanet, diagramChart, ledgerDrawing, ThermosteadError, toSVG, toText };
dispatchEvent(new CustomEvent("thermostead", { detail }));
