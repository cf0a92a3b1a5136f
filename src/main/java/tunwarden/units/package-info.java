/**
 * Units, gauge against absolute, and the text form of quantities. Everything inside the program is
 * SI: Pa, K, m³, kg, mol, s; this package is where other units enter and leave.
 */
package tunwarden.units;
