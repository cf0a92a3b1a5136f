package tunwarden.forecast;

/** What is not exactly known about a vessel; each moves every forecast in its own way. */
enum Unknown {
  /** Pressure gauge, Pa. */
  GAUGE,
  /** Thermometer, K. */
  THERMOMETER,
  /** Atmosphere, Pa. */
  ATMOSPHERE,
  /** Liquid volume, m³. */
  FILL,
  /** Air in the headspace, Pa. */
  AIR,
  /** Solubility relation as a whole, relative. */
  RELATION,
  /** How the relation changes with temperature, relative per 20 K. */
  RELATION_SLOPE,
  /** How the relation changes with pressure, relative per pascal. */
  RELATION_CURVE,
  /** Dissolved gas, or its distance from equilibrium, kg/m³. */
  DISSOLVED,
  /** Cooling of the headspace gas while it is let out: 0 isothermal, 1 adiabatic. */
  VENT_COOLING
}
