/** Relief valves: the levels around a setting, rated flow, and what can demand it. */
package tunwarden.forecast.relief;
