export default {
"iec/inspection-ends-after-it-began":{title:"The inspection ends after it began",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The inspection is said to run from "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"inspected_from",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":60}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"inspected_to",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":64},"end":{"line":1,"column":87}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct the dates.";
},"useData":true})},
"iec/next-verification-lies-ahead":{title:"The next verification falls after this one",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The next verification is due on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"next_due",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + ", and this one began on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"inspected_from",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":75},"end":{"line":1,"column":100}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct the date of the next verification.";
},"useData":true})},
"iec/instrument-is-in-calibration":{title:"The instrument was in calibration while it was used",cite:"ISO/IEC 17025:2017, 6.4.13",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The calibration of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":27}}})) != null ? stack1 : "")
    + " was due on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"due",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":39},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + ", before the inspection ended.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Repeat the readings with an instrument in calibration, or have this one calibrated as found and state the result.";
},"useData":true})},
"iec/instrument-was-calibrated-before":{title:"The instrument was calibrated before it was used",cite:"ISO/IEC 17025:2017, 6.4.13",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " was calibrated on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"calibrated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":48}}})) != null ? stack1 : "")
    + ", after the inspection began.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Give the calibration that was in force on the day.";
},"useData":true})},
"iec/calibration-runs-forward":{title:"The calibration is due after it was made",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " was calibrated on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"calibrated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":48}}})) != null ? stack1 : "")
    + " and due on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"due",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":60},"end":{"line":1,"column":74}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check which of the two dates was written where.";
},"useData":true})},
"iec/every-circuit-was-tested":{title:"Every circuit has readings",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These circuits have no readings: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"circuits_untested",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":33},"end":{"line":1,"column":61}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Test them, or write not_tested with the reason.";
},"useData":true})},
"iec/every-residual-current-device-was-tested":{title:"Every residual-current device has readings",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These residual-current devices have no readings: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"residual_untested",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":49},"end":{"line":1,"column":77}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Test them in each state in which they are live.";
},"useData":true})},
"iec/every-array-was-tested":{title:"Every array has readings",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These arrays have no readings: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"arrays_untested",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":57}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Test them in daylight, or write not_tested with the reason and the date when it will be done.";
},"useData":true})},
"iec/fault-current-agrees-with-the-loop":{title:"The supply's fault current agrees with its loop impedance",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The supply's fault current reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":33},"end":{"line":1,"column":57}}})) != null ? stack1 : "")
    + ", and its loop of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_impedance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":75},"end":{"line":1,"column":100}}})) != null ? stack1 : "")
    + " alone gives "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"earth_fault_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":113},"end":{"line":1,"column":143}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write the larger of the line-neutral and the line-earth reading.";
},"useData":true})},
"iec/operator-states-the-poles":{title:"The operator's demand on the poles to be opened is on record",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The operator's demand on the poles is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"separation_required",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":68}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Ask the operator whether all poles or only the line poles are to be opened, and write the answer under separation.";
},"useData":true})},
"iec/operators-demand-has-a-source":{title:"It is on record where the operator states the poles",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The operator is said to want "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"separation_required",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":29},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + " opened; where it says so reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"separation_stated_in",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":91},"end":{"line":1,"column":122}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Name the document, sheet and date under stated_in, so that the next person can check it.";
},"useData":true})},
"iec/changeover-breaks-the-neutral-where-the-book-says-so":{title:"The changeover opens the neutral",cite:"BS 7671:2018, 551.4.3.2.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover opens "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"switched_poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + "; this rule book asks for all poles, the neutral included.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a two-pole device on single-phase, a four-pole device on three-phase supply.";
},"useData":true})},
"iec/changeover-keeps-the-neutral-where-the-book-says-so":{title:"The changeover leaves the neutral connected",cite:"AS/NZS 3000:2018, 7.3.8.1.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover opens "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"switched_poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + "; this rule book asks for a neutral that is never opened.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device that opens the line poles only, and keep the neutral through.";
},"useData":true})},
"iec/changeover-opens-every-line":{title:"The changeover opens every line conductor",cite:"IEC 60364-5-55, 551.6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "A changeover with "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":34}}})) != null ? stack1 : "")
    + " poles cannot open the "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"phases",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":57},"end":{"line":1,"column":74}}})) != null ? stack1 : "")
    + " lines of this supply.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device with a pole for each line conductor.";
},"useData":true})},
"iec/changeover-carries-its-upstream-protection":{title:"The changeover carries the rating of its upstream overcurrent protection",cite:"IEC 60364-5-53, 536.4.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":23},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + "; the device upstream of it lets "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_rating",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":80},"end":{"line":1,"column":106}}})) != null ? stack1 : "")
    + " through.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit upstream protection no larger than the changeover, a larger changeover, or lead further loads past it on the grid side.";
},"useData":true})},
"iec/changeover-carries-the-backed-up-load":{title:"The changeover carries the backed-up load",cite:"IEC 60364-5-53, 536.4.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The backed-up loads draw "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"through_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + " on the most loaded line; the changeover carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":100},"end":{"line":1,"column":124}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Lead loads past the changeover on the grid side, spread them over the lines, or fit a larger device.";
},"useData":true})},
"iec/changeover-carries-the-inverter":{title:"The changeover carries what the inverter feeds through it",cite:"IEC 60364-5-53, 536.4.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The inverter feeds "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"inverter_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + " a line through the changeover; it carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":89},"end":{"line":1,"column":113}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a larger changeover, or limit the inverter's feed.";
},"useData":true})},
"iec/changeover-withstands-the-fault-current":{title:"The changeover withstands the fault current until the upstream device clears it",cite:"IEC 60947-6-1, 5.3.6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover withstands "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"short_circuit_rating",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":57}}})) != null ? stack1 : "")
    + " with its upstream device; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current_at_device",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":84},"end":{"line":1,"column":118}}})) != null ? stack1 : "")
    + " can flow.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit the upstream device that the datasheet names for this fault current, or a changeover with a higher rating.";
},"useData":true})},
"iec/changeover-states-its-fault-rating":{title:"The changeover's conditional short-circuit current is on record",cite:"IEC 60947-6-1, 5.3.6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The conditional short-circuit current of the changeover is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"short_circuit_rating",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":90}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take it from the datasheet, with the upstream device that it holds for.";
},"useData":true})},
"iec/neutral-is-earthed-in-each-state":{title:"The neutral is linked to earth",cite:"IET Wiring Matters 84, March 2021, island mode earthing arrangements",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Nothing links the neutral to earth "
    + ((stack1 = lookupProperty(helpers,"state").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Let the changeover or the inverter close a link between neutral and earth in the island, and prove it by measurement.";
},"useData":true})},
"iec/neutral-is-earthed-once":{title:"The neutral is linked to earth in one place only",cite:"IET Wiring Matters 84, March 2021",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The neutral is linked to earth in "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_earth_links",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":34},"end":{"line":1,"column":64}}})) != null ? stack1 : "")
    + " places "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":72},"end":{"line":1,"column":81}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Open all but one link. A link that closes in the island must open before the grid returns.";
},"useData":true})},
"iec/changeover-is-interlocked":{title:"The changeover is interlocked against parallel closing",cite:"IEC 60364-5-55, 551.6.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The changeover has no interlock on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit and prove a mechanical or electrical interlock, and write it under interlock.";
},"useData":true})},
"iec/nothing-joins-island-and-grid":{title:"Nothing joins the island to the grid while the changeover is open",cite:"IEC 60364-5-55, 551.6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"island_joins",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":23}}})) != null ? stack1 : "")
    + " would join the island to the grid while the changeover is open.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take the second way of supply out, or interlock it so that it cannot be closed in the island.";
},"useData":true})},
"iec/island-has-a-source":{title:"An inverter feeds the backed-up side",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No inverter feeds the backed-up side of the changeover.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Connect the inverter that forms the island to the backed-up side, and write that under its fed_from.";
},"useData":true})},
"iec/signals-are-all-named":{title:"Command, confirmation and the state of the grid contactor are wired",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These signals between changeover and inverter are not on record: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"signals_missing",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":65},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Wire and test each signal, and write its terminal under signals.";
},"useData":true})},
"iec/signals-sit-where-they-are-configured":{title:"Each signal is configured to the terminal that it is wired to",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These signals are wired to one terminal and configured to another: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"signals_swapped",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":67},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Set the inverter to the terminals as labelled, keep the defaults where they equal the labels, and test both states of each signal.";
},"useData":true})},
"iec/signals-have-terminals-of-their-own":{title:"No two signals share a terminal",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These terminals are used for more than one signal: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"terminals_shared",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":51},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Give each signal a terminal of its own.";
},"useData":true})},
"iec/island-has-its-own-electrode":{title:"The island has an electrode of its own",cite:"IEC 60364-5-55, 551.4.3.2.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The building has no electrode of its own on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Install or find an electrode, measure it, and write it under earthing.";
},"useData":true})},
"iec/tt-building-has-an-electrode":{title:"In a TT system the building has an electrode",cite:"IEC 60364-4-41:2005+A1:2017, 411.5.3",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The supply is a TT system, and the building has no electrode on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Install an electrode, measure it, and write it under earthing.";
},"useData":true})},
"iec/electrode-is-measured":{title:"The electrode's resistance is measured",cite:"IEC 60364-6:2016, 6.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The electrode's resistance is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"electrode_resistance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":30},"end":{"line":1,"column":61}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Measure the electrode while it is disconnected from the supply's earth.";
},"useData":true})},
"iec/earthing-conductor-is-large-enough":{title:"The earthing conductor is large enough",cite:"IEC 60364-5-54, 542.3.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The earthing conductor has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"earthing_conductor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":56}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"earthing_conductor_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":58},"end":{"line":1,"column":95}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run a larger earthing conductor.";
},"useData":true})},
"iec/main-bonding-is-large-enough":{title:"The main bonding conductors are large enough",cite:"IEC 60364-5-54, 544.1.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The smallest main bonding conductor has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"bonding_smallest",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":40},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"bonding_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":95}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run larger main bonding conductors.";
},"useData":true})},
"iec/main-bonding-is-continuous":{title:"The main bonding is continuous",cite:"IEC 60364-6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The main bonding reads up to "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"bonding_continuity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":29},"end":{"line":1,"column":58}}})) != null ? stack1 : "")
    + "; a sound clamp and conductor read a few hundredths of an ohm.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Clean and tighten the clamp, follow the conductor, and read again. Where it is very long, say so in a departure.";
},"useData":true})},
"iec/every-main-bond-was-read":{title:"Where main bonds were read, none was left out",cite:"IEC 60364-6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These main bonds have no reading: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"bonding_unread",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":34},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the continuity of each bond, or state why it was not tested.";
},"useData":true})},
"iec/transfer-to-the-island-was-tried":{title:"The transfer to the island was tried",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No transfer to the island is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Open the supply upstream of the changeover with the loads on, and write down what happens under transfers.";
},"useData":true})},
"iec/transfer-back-to-the-grid-was-tried":{title:"The transfer back to the grid was tried",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No transfer back to the grid is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Close the supply again, watch the waiting time and the gap, and write them under transfers.";
},"useData":true})},
"iec/outage-is-made-upstream":{title:"The outage was made upstream of the changeover",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The outage was made like this: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"cause",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Repeat it by opening the supply upstream of the changeover, and say so in the cause.";
},"useData":true})},
"iec/every-grid-pole-was-read":{title:"The voltage left on every grid terminal was read in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "With the island running, these grid terminals were not read: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"poles_not_read",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":61},"end":{"line":1,"column":86}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read every line and the neutral of the grid side to earth while the island runs.";
},"useData":true})},
"iec/grid-terminals-are-dead":{title:"No voltage is left on the grid terminals in the island",cite:"IEC 60364-4-41:2005+A1:2017, 411.5.3",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "With the island running, the grid terminals read L1 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L1",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":70}}})) != null ? stack1 : "")
    + ", L2 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L2",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":75},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + ", L3 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L3",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":98},"end":{"line":1,"column":116}}})) != null ? stack1 : "")
    + ", N "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_N",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":120},"end":{"line":1,"column":137}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.touch_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":139},"end":{"line":1,"column":168}}})) != null ? stack1 : "")
    + " is the most that may stand.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Find what feeds back through the changeover before anything else. Lock the island off until it is found.";
},"useData":true})},
"iec/grid-terminals-carry-next-to-nothing":{title:"The grid terminals carry no more than a trace of voltage in the island",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "With the island running, the grid terminals read L1 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L1",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":70}}})) != null ? stack1 : "")
    + ", L2 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L2",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":75},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + ", L3 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_L3",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":98},"end":{"line":1,"column":116}}})) != null ? stack1 : "")
    + ", N "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"grid_N",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":120},"end":{"line":1,"column":137}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Find out where the voltage comes from; a loaded tester tells coupling from feedback.";
},"useData":true})},
"iec/transfer-times-were-taken":{title:"The times to dark and to restored supply were taken",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The supply was dark after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"dark_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + " and restored after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"restored_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":67},"end":{"line":1,"column":92}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take both times, and write them under the transfer.";
},"useData":true})},
"iec/supply-is-restored-after-it-went-dark":{title:"The restored supply follows the dark moment",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The supply is said to be restored after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"restored_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":40},"end":{"line":1,"column":65}}})) != null ? stack1 : "")
    + " and dark only after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"dark_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":86},"end":{"line":1,"column":107}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check which of the two times was written where.";
},"useData":true})},
"iec/return-waits-as-set":{title:"The return to the grid waits as long as is set",cite:"EN 50549-1:2019",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The building returned to the grid after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"observed",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":40},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + "; the inverter is set to watch it for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"reconnect_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":97},"end":{"line":1,"column":123}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the setting back, check the country profile, and repeat the test.";
},"useData":true})},
"iec/gap-on-return-was-taken":{title:"The interruption on return to the grid was observed",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The interruption on return is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"gap",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":30},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Watch the loads while the grid returns, and write the gap; 0 s where there is none.";
},"useData":true})},
"iec/load-stays-within-the-device":{title:"The design current is no more than the device's rating",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The load of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " draws "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"design_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":52}}})) != null ? stack1 : "")
    + "; its device is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"device_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":74},"end":{"line":1,"column":97}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Split the load, or fit a larger device if the cable bears it.";
},"useData":true})},
"iec/device-stays-within-the-cable":{title:"The device's rating is no more than the cable's capacity",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The device of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":14},"end":{"line":1,"column":22}}})) != null ? stack1 : "")
    + " is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"device_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":55}}})) != null ? stack1 : "")
    + "; its cable as installed carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"capacity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":88},"end":{"line":1,"column":107}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a smaller device, a larger cable, or install it so that it sheds more heat.";
},"useData":true})},
"iec/overload-stays-within-the-cable":{title:"The device trips before an overload harms the cable",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The device of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":14},"end":{"line":1,"column":22}}})) != null ? stack1 : "")
    + " is sure to trip only from "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"conventional_operating_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":49},"end":{"line":1,"column":90}}})) != null ? stack1 : "")
    + "; its cable bears "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"overload_limit",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":108},"end":{"line":1,"column":133}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a smaller device or a larger cable. A fuse asks for more cable than a breaker of the same rating.";
},"useData":true})},
"iec/device-breaks-the-fault-current":{title:"The circuit's device can break the fault current",cite:"IEC 60364-4-43, 434.5.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The device of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":14},"end":{"line":1,"column":22}}})) != null ? stack1 : "")
    + " breaks "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"breaking_capacity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":30},"end":{"line":1,"column":58}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current_at_device",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":60},"end":{"line":1,"column":94}}})) != null ? stack1 : "")
    + " can flow where it sits.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device with a higher breaking capacity, or show that a device upstream backs it up.";
},"useData":true})},
"iec/protective-conductor-is-run":{title:"A protective conductor is run with the circuit",cite:"IEC 60364-4-41:2005+A1:2017, 411.3.1.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The cable of "
    + ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":13},"end":{"line":1,"column":21}}})) != null ? stack1 : "")
    + " has no protective conductor.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run one, or state in the long form of the cable where it is.";
},"useData":true})},
"iec/protective-conductor-bears-the-fault":{title:"The protective conductor bears the fault until it is cut off",cite:"IEC 60364-5-54, 543.1.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The protective conductor of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"protective_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"protective_conductor_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":108}}})) != null ? stack1 : "")
    + " is the least for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current_grid",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":126},"end":{"line":1,"column":155}}})) != null ? stack1 : "")
    + " during "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"disconnection_time",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":163},"end":{"line":1,"column":192}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run a larger protective conductor, or take the device's let-through energy from its datasheet.";
},"useData":true})},
"iec/protective-conductor-follows-the-table":{title:"The protective conductor has the size that the table gives without calculation",cite:"IEC 60364-5-54:2011, Table 54.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The protective conductor of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"protective_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + "; the table gives "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"protective_conductor_table",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":85},"end":{"line":1,"column":122}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Nothing where the calculation shows that it is enough; keep the calculation.";
},"useData":true})},
"iec/lighting-keeps-its-voltage":{title:"The voltage drop to lighting stays within the limit",cite:"IEC 60364-5-52:2009, Table G.52.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The voltage falls by "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_drop_total_percent",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":58}}})) != null ? stack1 : "")
    + " on the way to "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":81}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.voltage_drop_lighting",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":83},"end":{"line":1,"column":120}}})) != null ? stack1 : "")
    + " is the most for lighting.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run a larger cable, or shorten it.";
},"useData":true})},
"iec/loads-keep-their-voltage":{title:"The voltage drop to other loads stays within the limit",cite:"IEC 60364-5-52:2009, Table G.52.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The voltage falls by "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_drop_total_percent",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":58}}})) != null ? stack1 : "")
    + " on the way to "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":81}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.voltage_drop_other",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":83},"end":{"line":1,"column":117}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run a larger cable, or shorten it.";
},"useData":true})},
"iec/cable-has-enough-cores":{title:"The cable has a core for each line, the neutral and the protective conductor",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The cable of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":13},"end":{"line":1,"column":21}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"cable_cores",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":48}}})) != null ? stack1 : "")
    + " cores; its lines, a neutral and a protective conductor need "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"cores_needed",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":109},"end":{"line":1,"column":132}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check phases and type of the cable. A three-phase load without neutral is right with one core less.";
},"useData":true})},
"iec/circuit-uses-lines-of-the-supply":{title:"The circuit uses only lines that the supply has",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " uses "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"lines",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":14},"end":{"line":1,"column":30}}})) != null ? stack1 : "")
    + "; the supply has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"supply_phases",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":47},"end":{"line":1,"column":71}}})) != null ? stack1 : "")
    + " line.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct the phases of the circuit, or of the supply.";
},"useData":true})},
"iec/backed-up-load-is-stated":{title:"The load of each backed-up circuit is stated",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The load of "
    + ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " is not stated, so the island's budget leaves it out.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "State power, or current, and the energy of a day.";
},"useData":true})},
"iec/conductors-are-not-too-thin":{title:"Copper conductors have at least 1.5 mm²",cite:"IEC 60364-5-52, Table 52.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The line conductor of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":22},"end":{"line":1,"column":30}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"line_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":55}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run at least 1.5 mm².";
},"useData":true})},
"iec/neutral-is-large-enough":{title:"The neutral is as large as the line conductors, or as large as it has to be",cite:"IEC 60364-5-52:2009, 524.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The neutral of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":23}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + " beside "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"line_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":79}}})) != null ? stack1 : "")
    + " of line; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":89},"end":{"line":1,"column":115}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run a neutral as large as the lines.";
},"useData":true})},
"iec/smaller-neutral-was-thought-about":{title:"A neutral smaller than the lines is as large as its load asks for",cite:"IEC 60364-5-52:2009, 524.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The neutral of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":23}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + " beside "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"line_size",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":79}}})) != null ? stack1 : "")
    + " of line.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Work out what it carries, harmonics included, and protect it against overcurrent; state both as a departure. Or run it as large as the lines.";
},"useData":true})},
"iec/protective-conductor-is-continuous":{title:"The continuity of the circuit's conductors was measured",cite:"IEC 60364-6:2016, 6.4.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The conductors of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " read "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"continuity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + "; their length and size give "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"continuity_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":82},"end":{"line":1,"column":112}}})) != null ? stack1 : "")
    + ", and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"continuity_highest",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":118},"end":{"line":1,"column":147}}})) != null ? stack1 : "")
    + " with terminals.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look for a loose terminal, a wrong length or a thinner conductor.";
},"useData":true})},
"iec/continuity-is-not-too-good":{title:"The continuity reading is no lower than the conductors can be",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The conductors of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " read "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"continuity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + "; their length and size give "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"continuity_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":82},"end":{"line":1,"column":112}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the length, whether the leads were nulled, and whether a parallel path was measured.";
},"useData":true})},
"iec/insulation-is-high-enough":{title:"The insulation resistance is high enough",cite:"IEC 60364-6:2016, Table 6.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The insulation of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":33},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":56},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Disconnect loads, surge protection and electronics, and find the damp or damaged part.";
},"useData":true})},
"iec/insulation-is-tested-at-the-right-voltage":{title:"The insulation is tested at the right voltage",cite:"IEC 60364-6:2016, Table 6.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The insulation of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " was tested at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_tested_at",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":72}}})) != null ? stack1 : "")
    + "; the circuit asks for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_test_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":95},"end":{"line":1,"column":129}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Repeat the test at "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"insulation_test_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + ". Where equipment cannot be disconnected, 250 V is allowed; state the reason as a departure.";
},"useData":true})},
"iec/polarity-is-correct":{title:"The polarity is correct",cite:"IEC 60364-6, order of tests",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The polarity of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":16},"end":{"line":1,"column":24}}})) != null ? stack1 : "")
    + " is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"polarity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct it, and repeat the tests that it may have spoilt.";
},"useData":true})},
"iec/upstream-device-stays-within-its-cables":{title:"An overcurrent device is no larger than the cables behind it bear",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":34}}})) != null ? stack1 : "")
    + "; the weakest cable behind it carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"smallest_cable_capacity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":72},"end":{"line":1,"column":106}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a smaller device or a larger cable.";
},"useData":true})},
"iec/upstream-device-carries-its-load":{title:"An overcurrent device carries the load behind it",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loads behind "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":17},"end":{"line":1,"column":25}}})) != null ? stack1 : "")
    + " draw "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"through_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":57}}})) != null ? stack1 : "")
    + " on the most loaded line; it is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":95},"end":{"line":1,"column":111}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Spread the loads over the lines, or share them out.";
},"useData":true})},
"iec/upstream-device-breaks-the-fault-current":{title:"An overcurrent device can break the fault current where it sits",cite:"IEC 60364-4-43, 434.5.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " breaks "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"breaking_capacity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":16},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current_at_device",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":46},"end":{"line":1,"column":80}}})) != null ? stack1 : "")
    + " can flow where it sits.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device with a higher breaking capacity.";
},"useData":true})},
"iec/upstream-device-is-smaller-than-the-one-above":{title:"Each overcurrent device is smaller than the one above it",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":34}}})) != null ? stack1 : "")
    + ", and the device above it "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_rating",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":60},"end":{"line":1,"column":86}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Step the ratings so that a fault is cut off near itself.";
},"useData":true})},
"iec/main-protection-breaks-the-fault-current":{title:"The main protection can break the fault current of the supply",cite:"IEC 60364-4-43, 434.5.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The supply delivers "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + "; the main protection breaks "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"main_breaking",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":97}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Ask the operator for the fault current, and fit protection for it.";
},"useData":true})},
"iec/supply-is-measured":{title:"The supply's loop impedance and fault current are on record",cite:"IEC CDV 60364-6:2015, model report",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The supply reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_impedance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":17},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + " and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":47},"end":{"line":1,"column":71}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Measure both at the origin, and write them under supply.";
},"useData":true})},
"iec/main-protection-suits-the-supply":{title:"The main protection is no larger than what the operator provides for",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The main protection is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"main_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":29},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + "; the operator provides for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":78},"end":{"line":1,"column":102}}})) != null ? stack1 : "")
    + " a line.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit smaller main protection, or agree on a larger connection with the operator.";
},"useData":true})},
"iec/main-protection-carries-the-load":{title:"The main protection carries the load of the building",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loads that are stated draw "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"through_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":57}}})) != null ? stack1 : "")
    + " on the most loaded line, all at once; the main protection is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"main_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":125},"end":{"line":1,"column":146}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Spread the loads over the lines, or state as a departure which of them never run together.";
},"useData":true})},
"iec/main-protection-stays-within-its-cables":{title:"The main protection is no larger than the cables behind it bear",cite:"IEC 60364-4-43, 433.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The main protection is rated "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"main_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":29},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + "; the weakest cable behind it carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"smallest_cable_capacity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":88},"end":{"line":1,"column":122}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a larger cable, smaller main protection, or an overcurrent device at the start of the cable.";
},"useData":true})},
"iec/fault-is-cut-off-on-the-grid":{title:"On the grid something would cut off a fault in time, as designed",cite:"IEC 60364-4-41:2005+A1:2017, 411.3.2, 411.4.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "On the grid nothing would cut off a fault in "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":45},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + " within "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"disconnection_time",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":61},"end":{"line":1,"column":90}}})) != null ? stack1 : "")
    + "; supply and cables give a loop of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":125},"end":{"line":1,"column":149}}})) != null ? stack1 : "")
    + ", and the device needs "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_limit_measured",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":172},"end":{"line":1,"column":202}}})) != null ? stack1 : "")
    + " or less.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Lower the loop, fit another characteristic, or add residual-current protection.";
},"useData":true})},
"iec/loop-was-read-on-the-grid":{title:"The fault loop was read on the grid and trips the overcurrent device",cite:"IEC 60364-6:2016, Annex D, 6.4.3.7.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loop of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + " on the grid; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_limit_measured",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":56},"end":{"line":1,"column":86}}})) != null ? stack1 : "")
    + " is the most for a cold reading.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the loop at the far end of the circuit; if it is too high, lower it or fit another device.";
},"useData":true})},
"iec/loop-suits-the-device-even-with-residual-protection":{title:"The fault loop suits the overcurrent device even where residual-current protection cuts off",cite:"IEC 60364-4-41:2005+A1:2017, 411.4.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loop of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + "; its overcurrent device would need "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_limit_measured",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":78},"end":{"line":1,"column":108}}})) != null ? stack1 : "")
    + " or less. Residual-current protection alone cuts off a fault.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look for a bad joint. Accept it only where the length of the circuit explains the reading.";
},"useData":true})},
"iec/loop-agrees-with-the-cable":{title:"The loop reading agrees with the supply and the cables",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loop of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + "; supply and cables give "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":67},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the length, the supply's loop impedance, and whether the reading was taken at the far end.";
},"useData":true})},
"iec/fault-is-cut-off-in-the-island":{title:"In the island something cuts off a fault in time",cite:"IEC 60364-4-41:2005+A1:2017, 411.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "In the island nothing cuts off a fault in "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":42},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + "; the inverter feeds "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fault_current_island",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":71},"end":{"line":1,"column":102}}})) != null ? stack1 : "")
    + ", and the device needs "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"operating_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":125},"end":{"line":1,"column":153}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Place residual-current protection downstream of the changeover, or show that the inverter shuts down in time.";
},"useData":true})},
"iec/loop-of-the-grid-does-not-count-in-the-island":{title:"Where a breaker must trip in the island, the loop was read in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The loop of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":20}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + " in the island; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_limit_measured",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":58},"end":{"line":1,"column":88}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the loop while the island is running, with an instrument that the inverter bears, or rely on residual-current protection.";
},"useData":true})},
"iec/residual-protection-needs-an-earthed-island":{title:"Residual-current protection in the island has a neutral that is linked to earth",cite:"IET Wiring Matters 84, March 2021",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The residual-current protection of "
    + ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":43}}})) != null ? stack1 : "")
    + " cannot work in the island, since nothing links its neutral to earth.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Close a link between neutral and earth on the source's side of the device while the island runs.";
},"useData":true})},
"iec/electrode-suits-the-residual-protection":{title:"The electrode lets the residual-current protection cut off in time",cite:"IEC 60364-4-41:2005+A1:2017, 411.5.3",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The electrode reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"electrode_resistance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + "; with a residual current of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"largest_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":80},"end":{"line":1,"column":107}}})) != null ? stack1 : "")
    + " it may have "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"electrode_limit",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":120},"end":{"line":1,"column":146}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Improve the electrode, or fit a more sensitive device.";
},"useData":true})},
"iec/electrode-is-stable":{title:"The electrode is low enough to be stable",cite:"BS 7671:2018, Table 41.5, note",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The electrode reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"electrode_resistance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + "; above "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.electrode_stable",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + " it may not be stable.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Drive it deeper, add a second one, or measure again in a dry month.";
},"useData":true})},
"iec/tt-circuits-have-residual-protection":{title:"In a TT system each circuit has residual-current protection",cite:"IEC 60364-4-41:2005+A1:2017, 411.5.3",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " has no residual-current protection "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":44},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + ", and the system is TT.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Feed it through a residual-current device that works in this state.";
},"useData":true})},
"iec/half-the-residual-current-does-not-trip":{title:"The device does not trip at half its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " tripped at half its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":61}}})) != null ? stack1 : "")
    + ", after "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"half",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":84}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Measure what leaks already, take loads off, and test again; replace the device if it still trips.";
},"useData":true})},
"iec/rated-residual-current-trips-in-time":{title:"The device trips in time at its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":31}}})) != null ? stack1 : "")
    + " at its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":62},"end":{"line":1,"column":71}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_limit_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":100}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Replace the device. In the island, prove the link between neutral and earth first.";
},"useData":true})},
"iec/delayed-device-waits-at-its-rated-residual-current":{title:"The time-delayed device waits long enough at its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " took only "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":35}}})) != null ? stack1 : "")
    + " at its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":66},"end":{"line":1,"column":75}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_minimum_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":77},"end":{"line":1,"column":106}}})) != null ? stack1 : "")
    + " is the least for a time-delayed device.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check that the device is time-delayed; replace it if it is.";
},"useData":true})},
"iec/double-residual-current-trips-in-time":{title:"The device trips in time at twice its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"double",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":32}}})) != null ? stack1 : "")
    + " at twice its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_limit_double",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":80},"end":{"line":1,"column":108}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Replace the device.";
},"useData":true})},
"iec/delayed-device-waits-at-double-residual-current":{title:"The time-delayed device waits long enough at twice its rated residual current",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " took only "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"double",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " at twice its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":82}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_minimum_double",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":84},"end":{"line":1,"column":114}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check that the device is time-delayed.";
},"useData":true})},
"iec/five-times-the-residual-current-trips-at-once":{title:"The device trips at once at five times its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " at five times its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":78},"end":{"line":1,"column":87}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_limit_five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":89},"end":{"line":1,"column":121}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Replace the device.";
},"useData":true})},
"iec/delayed-device-waits-at-five-times":{title:"The time-delayed device waits long enough at five times its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " took only "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":40}}})) != null ? stack1 : "")
    + " at five times its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":82},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_minimum_five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":93},"end":{"line":1,"column":127}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check that the device is time-delayed.";
},"useData":true})},
"iec/rising-residual-current-trips-soon-enough":{title:"Under a rising residual current the device trips soon enough",cite:"EN 61008-1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " tripped only at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"ramp",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":40}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"ramp_maximum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":75}}})) != null ? stack1 : "")
    + " is the most for type "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"type",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":97},"end":{"line":1,"column":112}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Replace the device.";
},"useData":true})},
"iec/rising-residual-current-does-not-trip-too-soon":{title:"Under a rising residual current the device does not trip too soon",cite:"EN 61008-1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " tripped already at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"ramp",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":43}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":44},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"ramp_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":55},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + " is the least for type "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"type",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":101},"end":{"line":1,"column":116}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Measure what leaks already, take loads off, and test again.";
},"useData":true})},
"iec/device-has-the-type-that-the-inverter-asks-for":{title:"The device has the type that the inverter's datasheet asks for",cite:"Energy Safe Victoria, EIS-008",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is of type "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"type",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":35}}})) != null ? stack1 : "")
    + "; the inverter's datasheet asks for "
    + ((stack1 = lookupProperty(helpers,"list").call(alias1,"types_needed",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":71},"end":{"line":1,"column":94}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit the type that the datasheet asks for at the backed-up output.";
},"useData":true})},
"iec/inverter-without-separation-asks-for-type-b":{title:"Behind an inverter without separation the device is of type B, unless its datasheet says otherwise",cite:"IEC 60364-7-712, 712.530.3.101",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is of type "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"type",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":35}}})) != null ? stack1 : "")
    + "; the inverter has no separation, and its datasheet's demand is not on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look in the datasheet whether type A is enough, and write it under residual_type_needed.";
},"useData":true})},
"iec/device-is-more-than-type-ac":{title:"The device knows pulsating direct current",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is of type "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"type",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":35}}})) != null ? stack1 : "")
    + ", which knows sinusoidal current only.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit type A or better where anything with electronics is connected.";
},"useData":true})},
"iec/device-carries-its-upstream-protection":{title:"The residual-current device carries the rating of the overcurrent device upstream",cite:"IEC 60364-5-53, 536.4.3.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":17},"end":{"line":1,"column":41}}})) != null ? stack1 : "")
    + "; the overcurrent device upstream lets "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_rating",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":80},"end":{"line":1,"column":106}}})) != null ? stack1 : "")
    + " through.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device with a higher rated current, or smaller protection upstream.";
},"useData":true})},
"iec/sockets-have-additional-protection":{title:"Socket circuits have additional protection",cite:"IEC 60364-4-41:2005+A1:2017, 411.3.3, 415.1.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The sockets of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":23}}})) != null ? stack1 : "")
    + " have a lowest residual current of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"smallest_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":58},"end":{"line":1,"column":86}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":87},"end":{"line":1,"column":96}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.additional_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":98},"end":{"line":1,"column":133}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Feed them through a device of "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"book.additional_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":30},"end":{"line":1,"column":65}}})) != null ? stack1 : "")
    + " that works in this state.";
},"useData":true})},
"iec/lighting-in-dwellings-has-additional-protection":{title:"Lighting circuits of dwellings have additional protection",cite:"IEC 60364-4-41:2005+A1:2017, 411.3.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The lights of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":14},"end":{"line":1,"column":22}}})) != null ? stack1 : "")
    + " have a lowest residual current of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"smallest_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":57},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":86},"end":{"line":1,"column":95}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Feed them through a device of "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"book.additional_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":30},"end":{"line":1,"column":65}}})) != null ? stack1 : "")
    + " that works in this state.";
},"useData":true})},
"iec/protection-of-the-grid-goes-on-in-the-island":{title:"A circuit with residual-current protection on the grid has it in the island too",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " has residual-current protection on the grid, and none in the island.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Place the device downstream of the changeover and of the link between neutral and earth.";
},"useData":true})},
"iec/device-does-not-stand-before-the-changeover-alone":{title:"A residual-current device upstream of the changeover is not relied on in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " stands upstream of the changeover: in the island it protects nothing.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Keep it only where another device stands downstream of the changeover.";
},"useData":true})},
"iec/devices-in-series-are-selective":{title:"Residual-current devices in series are selective",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":13},"end":{"line":1,"column":32}}})) != null ? stack1 : "")
    + " behind a device of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_residual",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":80}}})) != null ? stack1 : "")
    + " (time-delayed: "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_delayed",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":96},"end":{"line":1,"column":123}}})) != null ? stack1 : "")
    + "); at least "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"upstream_residual_needed",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":135},"end":{"line":1,"column":170}}})) != null ? stack1 : "")
    + " and a time delay make them selective.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a time-delayed device with at least three times the residual current upstream.";
},"useData":true})},
"iec/array-voltage-stays-below-the-input-limit":{title:"The array's highest voltage stays below the inverter's limit",cite:"NEC 690.7(A)",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "At "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"lowest_temperature",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":3},"end":{"line":1,"column":32}}})) != null ? stack1 : "")
    + " the array reaches "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc_maximum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":51},"end":{"line":1,"column":73}}})) != null ? stack1 : "")
    + "; the inverter takes "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"max_input_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":94},"end":{"line":1,"column":122}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take modules out of the string, or fit an inverter with a higher input voltage.";
},"useData":true})},
"iec/lowest-temperature-is-stated":{title:"The lowest temperature at the site is on record",cite:"NEC 690.7(A)",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The lowest temperature at the site is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"lowest_temperature",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take it from the local weather record, and write it under site.";
},"useData":true})},
"iec/voltage-coefficient-comes-from-the-datasheet":{title:"The temperature coefficient of the open-circuit voltage is on record",cite:"NEC 690.7(A)",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The temperature coefficient of the open-circuit voltage is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"voc_coefficient",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take it from the module's datasheet, in %/K and negative. A value in V/K or mV/K must be divided by the open-circuit voltage.";
},"useData":true})},
"iec/array-voltage-stays-in-the-tracking-window":{title:"The hot array's voltage stays above the start of the tracking window",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "On the hottest day the array falls to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"vmp_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":60}}})) != null ? stack1 : "")
    + "; the inverter tracks from "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"mpp_minimum_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":87},"end":{"line":1,"column":117}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Put more modules in series, or fit an inverter that tracks from a lower voltage.";
},"useData":true})},
"iec/string-fuses-are-fitted-where-needed":{title:"String fuses are fitted where the other strings could overload a module",cite:"IEC 62548:2016",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"show").call(alias1,"strings",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":18}}})) != null ? stack1 : "")
    + " strings in parallel can feed back more than the "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"module_max_fuse",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":67},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + " that a module takes, and no string fuse is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit string fuses within the range that the module allows.";
},"useData":true})},
"iec/string-fuse-does-not-trip-in-sunshine":{title:"The string fuse is large enough for full sunshine",cite:"IEC 62548:2016",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The string fuse has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"string_fuse",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fuse_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":44},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a larger string fuse, within what the module allows.";
},"useData":true})},
"iec/string-fuse-protects-the-module":{title:"The string fuse is no larger than the module allows",cite:"IEC 62548:2016",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The string fuse has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"string_fuse",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"fuse_maximum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":44},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a string fuse within what the module's datasheet allows.";
},"useData":true})},
"iec/module-figures-agree":{title:"The module's power agrees with its voltage and current",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Voltage times current at maximum power differs by "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_power_deviation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":50},"end":{"line":1,"column":82}}})) != null ? stack1 : "")
    + " from the module's "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"module_pmax",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":101},"end":{"line":1,"column":123}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the module's figures against its datasheet.";
},"useData":true})},
"iec/every-string-was-read":{title:"Every string was read",cite:"IEC 62446-1:2016+A1:2018, 6.4 and 6.5",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"show").call(alias1,"strings_read",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":23}}})) != null ? stack1 : "")
    + " of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"strings",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":45}}})) != null ? stack1 : "")
    + " strings have readings.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read each string on its own before it is joined to the others.";
},"useData":true})},
"iec/string-polarity-is-correct":{title:"The string's polarity is correct",cite:"IEC 62446-1:2016+A1:2018, 6.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The polarity of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":16},"end":{"line":1,"column":24}}})) != null ? stack1 : "")
    + " is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"polarity",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct the polarity before the string is connected to anything.";
},"useData":true})},
"iec/string-voltage-is-read":{title:"The string's open-circuit voltage is as expected on the day",cite:"IEC 62446-1:2016+A1:2018, 6.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":29}}})) != null ? stack1 : "")
    + ", "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc_from_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + " from the "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":92}}})) != null ? stack1 : "")
    + " that its modules give at this temperature.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Count the modules, look for a bypassed one, and check the datasheet's figures and the cell temperature.";
},"useData":true})},
"iec/string-has-all-its-modules":{title:"No module is missing from the string",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc_from_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":43}}})) != null ? stack1 : "")
    + " from what is expected; one module short would be −"
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"missing_module_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":94},"end":{"line":1,"column":127}}})) != null ? stack1 : "")
    + ". That fits "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"modules_missing_estimate",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":139},"end":{"line":1,"column":174}}})) != null ? stack1 : "")
    + " missing or bypassed.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Count the modules of the string on the roof and in the layout plan.";
},"useData":true})},
"iec/string-voltages-agree":{title:"The string's voltage agrees with the other strings",cite:"IEC 62446-1:2016+A1:2018, 6.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":29}}})) != null ? stack1 : "")
    + ", "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voc_deviation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":55}}})) != null ? stack1 : "")
    + " from the median of its array.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Compare count, type and direction of the modules; read the strings again under steady light.";
},"useData":true})},
"iec/string-current-is-as-expected":{title:"The string's short-circuit current is as expected on the day",cite:"IEC 62446-1:2016+A1:2018, 6.5.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"isc",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":29}}})) != null ? stack1 : "")
    + ", "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"isc_from_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + " from the "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"isc_expected",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":92}}})) != null ? stack1 : "")
    + " that its modules give under this light.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look for shade and dirt, and measure irradiance in the plane of the modules at the same moment.";
},"useData":true})},
"iec/string-currents-agree":{title:"The string's current agrees with the other strings",cite:"IEC 62446-1:2016+A1:2018, 6.5",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"isc",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":29}}})) != null ? stack1 : "")
    + ", "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"isc_deviation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":55}}})) != null ? stack1 : "")
    + " from the median of its array.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look for shade on this string, and read all strings again under steady light.";
},"useData":true})},
"iec/string-insulation-is-high-enough":{title:"The string's insulation resistance is high enough",cite:"IEC 62446-1:2016+A1:2018, 6.7",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The insulation of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":33},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_minimum",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":56},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Find the damp connector or the pinched cable before the array is connected.";
},"useData":true})},
"iec/string-insulation-is-tested-at-the-right-voltage":{title:"The string's insulation is tested at the voltage that its system voltage asks for",cite:"IEC 62446-1:2016+A1:2018, 6.7",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The insulation of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":26}}})) != null ? stack1 : "")
    + " was tested at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_tested_at",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":72}}})) != null ? stack1 : "")
    + "; its system voltage of "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"system_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":96},"end":{"line":1,"column":121}}})) != null ? stack1 : "")
    + " asks for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"insulation_test_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":131},"end":{"line":1,"column":165}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Repeat the test at the right voltage, with the inverter and surge protection disconnected.";
},"useData":true})},
"iec/light-was-strong-enough":{title:"The light was strong enough for a reading of current",cite:"IEC 62446-1:2016+A1:2018, 7.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " was read at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"irradiance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the currents again at 400 W/m² or more, or state why not.";
},"useData":true})},
"iec/string-was-read-by-daylight":{title:"The sun was up when the string was read",cite:"Meeus, Astronomical Algorithms",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " is said to have been read at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"taken",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; the sun stood at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"sun_elevation",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":97}}})) != null ? stack1 : "")
    + " then.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Correct the time, its offset from universal time, or the position of the site.";
},"useData":true})},
"iec/interface-protection-is-on-record":{title:"The settings of the interface protection are on record",cite:"VDE-AR-N 4105:2018-11, form E.8",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The interface protection is on record as: overvoltage "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"u_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":54},"end":{"line":1,"column":71}}})) != null ? stack1 : "")
    + ", undervoltage "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"u_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":86},"end":{"line":1,"column":102}}})) != null ? stack1 : "")
    + ", overfrequency "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"f_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":118},"end":{"line":1,"column":135}}})) != null ? stack1 : "")
    + ", underfrequency "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"f_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":152},"end":{"line":1,"column":168}}})) != null ? stack1 : "")
    + ", waiting time "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"reconnect_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":183},"end":{"line":1,"column":209}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read all five settings back from the inverter, and write them under interface_protection.";
},"useData":true})},
"iec/overvoltage-setting-follows-the-book":{title:"The overvoltage setting is the one that the rule book states",cite:"VDE-AR-N 4105:2018-11",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The overvoltage protection is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"u_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":37},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; the rule book states "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.interface_u_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":77},"end":{"line":1,"column":109}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the country profile with the operator, and set it.";
},"useData":true})},
"iec/undervoltage-setting-follows-the-book":{title:"The undervoltage setting is the one that the rule book states",cite:"VDE-AR-N 4105:2018-11",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The undervoltage protection is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"u_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; the rule book states "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.interface_u_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":77},"end":{"line":1,"column":108}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the country profile with the operator, and set it.";
},"useData":true})},
"iec/frequency-settings-follow-the-book":{title:"The frequency settings are the ones that the rule book states",cite:"VDE-AR-N 4105:2018-11",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The frequency protection is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"f_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":52}}})) != null ? stack1 : "")
    + " and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"f_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":57},"end":{"line":1,"column":73}}})) != null ? stack1 : "")
    + "; the rule book states "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.interface_f_high",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":96},"end":{"line":1,"column":128}}})) != null ? stack1 : "")
    + " and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.interface_f_low",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":133},"end":{"line":1,"column":164}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check the country profile with the operator, and set it.";
},"useData":true})},
"iec/reconnection-waits-long-enough":{title:"The inverter waits long enough before it reconnects",cite:"EN 50549-1:2019",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The inverter waits "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"reconnect_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":45}}})) != null ? stack1 : "")
    + "; the rule book asks for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.reconnect_after",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":70},"end":{"line":1,"column":101}}})) != null ? stack1 : "")
    + " or more.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Set the waiting time of the operator's conditions.";
},"useData":true})},
"iec/unbalance-stays-within-the-book":{title:"The unbalance between the lines stays within what the rule book allows",cite:"VDE-AR-N 4100",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The lines differ by "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"unbalance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":40}}})) != null ? stack1 : "")
    + " of load and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"feed_in_unbalance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":53},"end":{"line":1,"column":81}}})) != null ? stack1 : "")
    + " of feed; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.unbalance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":91},"end":{"line":1,"column":116}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Spread the loads over the lines, or use an inverter that feeds all three.";
},"useData":true})},
"iec/inverter-monitors-residual-current":{title:"Residual current on the d.c. side is monitored",cite:"IEC 62109-2, 4.8.3.5",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The residual-current monitoring of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":43}}})) != null ? stack1 : "")
    + " is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"residual_monitoring",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":47},"end":{"line":1,"column":77}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Use an inverter with a residual-current monitor, or fit one.";
},"useData":true})},
"iec/battery-keeps-out-of-forbidden-places":{title:"The battery keeps out of sleeping rooms, escape routes and roof spaces",cite:"PAS 63100:2024",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The battery stands in a place called “"
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"place",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "”.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move it out of sleeping rooms, escape routes, lofts and voids, or show that local rules allow the place.";
},"useData":true})},
"iec/battery-keeps-clear-of-openings":{title:"A battery outdoors keeps clear of doors, windows and vents",cite:"PAS 63100:2024",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The battery stands "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"distance_to_opening",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":49}}})) != null ? stack1 : "")
    + " from the nearest opening.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Keep 1 m from doors, windows and vents.";
},"useData":true})},
"iec/lead-battery-ventilation-is-known":{title:"The ventilation that a lead-acid battery needs is computed",cite:"IEC 62485-2:2010, 7.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The ventilation of this "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"chemistry",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":24},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + " battery cannot be computed.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Give cells, capacity and gas_current from the datasheet.";
},"useData":true})},
"iec/meter-sits-at-the-connection-point":{title:"The meter that steers the inverter sits at the connection point",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The meter sits at "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"place",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":34}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move it to the connection point, where everything that the building draws and feeds passes.";
},"useData":true})},
"iec/meter-counts-the-right-way":{title:"The meter's direction was checked",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The meter's direction is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"direction",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":45}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Switch a load and watch the sign follow; turn the meter or its transformers round if it does not.";
},"useData":true})},
"iec/meter-carries-the-main-protection":{title:"The direct-connected meter carries the rating of the main protection",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The meter carries "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"rated_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":42}}})) != null ? stack1 : "")
    + "; the main protection lets "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"main_rated",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":90}}})) != null ? stack1 : "")
    + " through.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Use a meter with current transformers, or smaller main protection.";
},"useData":true})},
"iec/bus-is-terminated-at-both-ends":{title:"The bus is terminated at its two ends",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The bus has "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"terminators",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":34}}})) != null ? stack1 : "")
    + " terminating resistors.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit one resistor of 120 Ω at each end of the line, and take all others out.";
},"useData":true})},
"iec/bus-resistance-fits-its-terminators":{title:"The resistance across the bus is that of two terminators",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "With the power off, the pair reads "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"measured_across",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":61}}})) != null ? stack1 : "")
    + "; two resistors of 120 Ω give 60 Ω.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Near 120 Ω one terminator is missing, near 40 Ω there is one too many. Find it.";
},"useData":true})},
"iec/bus-address-is-valid":{title:"The address on the bus is valid",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The address is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"address",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":33}}})) != null ? stack1 : "")
    + "; 1 to 247 are valid.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Give the device an address from 1 to 247.";
},"useData":true})},
"iec/bus-address-is-its-own":{title:"No other device on the bus has the same address",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The address "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"address",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":12},"end":{"line":1,"column":30}}})) != null ? stack1 : "")
    + " is used by another device on the bus.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Give each device an address of its own.";
},"useData":true})},
"iec/bus-is-short-enough":{title:"The bus is no longer than its devices allow",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The bus is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"length",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":11},"end":{"line":1,"column":28}}})) != null ? stack1 : "")
    + " long; its devices allow "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"length_limit",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":53},"end":{"line":1,"column":76}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Shorten it, or use a repeater.";
},"useData":true})},
"iec/bus-idles-at-a-defined-level":{title:"The idle bus is held at a defined level",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The idle bus is biased to "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"bias_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":49}}})) != null ? stack1 : "")
    + "; receivers need 200 mV to be sure.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Use smaller bias resistors, in one place only.";
},"useData":true})},
"iec/each-line-fits-the-inverter":{title:"The load of each line stays within what the inverter gives it",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The most loaded line draws "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"largest_phase_load",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":56}}})) != null ? stack1 : "")
    + "; the inverter gives "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"phase_limit",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":77},"end":{"line":1,"column":99}}})) != null ? stack1 : "")
    + " a line.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move loads to another line or to the grid side.";
},"useData":true})},
"iec/whole-load-fits-the-inverter":{title:"The whole backed-up load stays within the inverter's continuous power",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The backed-up loads draw "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"total_load",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + " together; the inverter gives "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"island_continuous",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":76},"end":{"line":1,"column":104}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move loads to the grid side, or fit a larger inverter.";
},"useData":true})},
"iec/every-loaded-line-is-fed":{title:"Each line with backed-up load is fed in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "No inverter feeds these lines in the island, and backed-up circuits are on them: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"unfed_lines",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":81},"end":{"line":1,"column":103}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move the circuits to a line that is fed, or use an inverter that feeds all lines.";
},"useData":true})},
"iec/starts-fit-the-peak":{title:"The largest start fits the inverter's peak",cite:"IEC 60034-12",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Starting the largest load takes "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"starting_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + " on its line; the inverter's peak gives "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"phase_peak_limit",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":99},"end":{"line":1,"column":126}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a soft starter, move the load to another line, or keep it on the grid side.";
},"useData":true})},
"iec/peak-is-on-record":{title:"The inverter's peak power in the island is on record",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The inverter's peak power in the island is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"island_peak",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":43},"end":{"line":1,"column":65}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take peak and peak time from the datasheet.";
},"useData":true})},
"iec/fault-current-in-the-island-is-on-record":{title:"The fault current that the inverter feeds in the island is on record",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The fault current of "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":29}}})) != null ? stack1 : "")
    + " in the island is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"island_fault_current",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":47},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take it from the datasheet or measure it; there is no figure that holds for all.";
},"useData":true})},
"iec/battery-can-give-the-load":{title:"The batteries can give the power of the backed-up loads",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The backed-up loads draw "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"backed_up_load",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + " together; what the batteries and their inverters give without sun is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"discharge_limit_together",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":120},"end":{"line":1,"column":155}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Tell the customer which loads may run together at night, or move some to the grid side.";
},"useData":true})},
"iec/must-run-loads-fit-the-battery":{title:"The batteries can give the power of what must run",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "What must run draws "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"must_run_load",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + "; what the batteries and their inverters give without sun is "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"discharge_limit_together",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":105},"end":{"line":1,"column":140}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit more discharge power, or agree with the customer on what really must run.";
},"useData":true})},
"iec/must-run-loads-are-marked":{title:"It is marked which circuits must run in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No backed-up circuit is marked as one that must run.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Ask the customer what must not fail, and write must_run true under the load of those circuits.";
},"useData":true})},
"iec/hours-of-supply-are-known":{title:"It is known how long the held-back charge lasts",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "How long the held-back charge lasts cannot be computed.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "State the charge that is held back in the inverter's settings, and power or daily energy of each backed-up load.";
},"useData":true})},
"iec/charge-is-held-back":{title:"Charge is held back for the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"held_back_charge",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":27}}})) != null ? stack1 : "")
    + " of the charge is held back for the island.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Set the charge that the customer wants to have left when the grid fails.";
},"useData":true})},
"iec/alarm-comes-before-the-end":{title:"The low-charge alarm comes while held-back charge is left",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The alarm is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"low_charge_alarm",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":47}}})) != null ? stack1 : "")
    + ", and "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"held_back_charge",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":53},"end":{"line":1,"column":80}}})) != null ? stack1 : "")
    + " is held back.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Set the alarm below the charge that is held back, and above the end of discharge.";
},"useData":true})},
"iec/island-voltage-is-set-to-nominal":{title:"The island voltage is set to the nominal voltage",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The island voltage is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"island_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":29},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; the building runs at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"nominal_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":77},"end":{"line":1,"column":103}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Set it with the installer's account, and read it back.";
},"useData":true})},
"iec/settings-were-read-back":{title:"The settings were read back after they were made",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "Settings read back from "
    + ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":24},"end":{"line":1,"column":32}}})) != null ? stack1 : "")
    + ": "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"read_back",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":34},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read every setting back from the device, and write read_back true.";
},"useData":true})},
"iec/voltages-are-within-the-yardstick":{title:"The voltages lie within the yardstick of the public supply",cite:"EN 50160",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The lines read L1 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L1",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":18},"end":{"line":1,"column":39}}})) != null ? stack1 : "")
    + ", L2 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L2",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":44},"end":{"line":1,"column":65}}})) != null ? stack1 : "")
    + " and L3 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L3",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":73},"end":{"line":1,"column":94}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":95},"end":{"line":1,"column":104}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_floor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":106},"end":{"line":1,"column":130}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_ceiling",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":134},"end":{"line":1,"column":160}}})) != null ? stack1 : "")
    + " are usual.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "On the grid ask the operator; in the island check the setting, the load of each line and the neutral.";
},"useData":true})},
"iec/voltage-is-within-the-yardstick":{title:"The voltage of a single-phase supply lies within the yardstick of the public supply",cite:"EN 50160",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The line reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L1",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":37},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_floor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":48},"end":{"line":1,"column":72}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_ceiling",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":76},"end":{"line":1,"column":102}}})) != null ? stack1 : "")
    + " are usual.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "On the grid ask the operator; in the island check the setting and the load.";
},"useData":true})},
"iec/island-keeps-to-its-setting":{title:"The voltages in the island lie near the inverter's setting",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "In the island the lines read L1 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L1",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":53}}})) != null ? stack1 : "")
    + ", L2 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L2",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":58},"end":{"line":1,"column":79}}})) != null ? stack1 : "")
    + " and L3 "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_L3",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":87},"end":{"line":1,"column":108}}})) != null ? stack1 : "")
    + "; the inverter is set to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"island_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":133},"end":{"line":1,"column":158}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Read the setting back, look at the load while the reading was taken, and check the neutral's terminals.";
},"useData":true})},
"iec/frequency-is-within-the-yardstick":{title:"The frequency lies within the yardstick of the public supply",cite:"EN 50160",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The frequency reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"frequency",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":40}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"frequency_floor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"frequency_ceiling",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":82},"end":{"line":1,"column":110}}})) != null ? stack1 : "")
    + " are usual.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "In the island, look whether the inverter throttles an array by its frequency, and whether the loads bear it.";
},"useData":true})},
"iec/neutral-stays-near-earth":{title:"The neutral stays near earth",cite:"IEC 60364-4-41:2005+A1:2017, 411.5.3",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The neutral stands at "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_to_earth",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":22},"end":{"line":1,"column":49}}})) != null ? stack1 : "")
    + " to earth "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":68}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Prove the link between neutral and earth, and look for a lost neutral.";
},"useData":true})},
"iec/link-in-the-island-was-measured":{title:"The link between neutral and earth was measured in the island",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The link between neutral and earth reads "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"link_resistance",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":41},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + " in the island.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Measure from the neutral bar to the earth bar with the island formed, and find the loose terminal.";
},"useData":true})},
"iec/rotation-stays-the-same":{title:"The direction of rotation is the same in both states",cite:"IEC 60364-6",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The direction of rotation changes between the grid and the island.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Swap two lines of the inverter, and measure again in both states.";
},"useData":true})},
"iec/load-steps-were-tried":{title:"A load step was tried in the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No load step in the island is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Start the largest motor and the largest heater in the island, and write the lowest voltage and frequency under load_steps.";
},"useData":true})},
"iec/load-step-does-not-trip-the-island":{title:"The load step does not trip the island",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The island tripped at this step: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"step",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":33},"end":{"line":1,"column":48}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move the load to the grid side, or start it softly.";
},"useData":true})},
"iec/load-step-keeps-the-voltage-up":{title:"The voltage stays up during the load step",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The voltage fell to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"lowest_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":45}}})) != null ? stack1 : "")
    + " during this step: "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"step",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":64},"end":{"line":1,"column":79}}})) != null ? stack1 : "")
    + ". "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"voltage_floor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":81},"end":{"line":1,"column":105}}})) != null ? stack1 : "")
    + " is the usual floor.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Start the load softly, or share the lines out differently.";
},"useData":true})},
"iec/load-step-keeps-the-frequency-up":{title:"The frequency stays up during the load step",cite:"EN 50160",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The frequency fell to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"lowest_frequency",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":22},"end":{"line":1,"column":49}}})) != null ? stack1 : "")
    + " during this step: "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"step",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":68},"end":{"line":1,"column":83}}})) != null ? stack1 : "")
    + ". "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"frequency_floor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":85},"end":{"line":1,"column":111}}})) != null ? stack1 : "")
    + " is the usual floor.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Ask the inverter's datasheet what it does at this step, and start the load softly.";
},"useData":true})},
"iec/notices-warn-of-two-sources":{title:"A notice at the boards warns of two sources",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “dual-supply notices” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_dual_supply_notices",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":42},"end":{"line":1,"column":77}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fix a notice at every board that two sources feed, and at the meter. Then add the item with its result.";
},"useData":true})},
"iec/backed-up-circuits-are-labelled":{title:"The backed-up circuits are labelled",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “backed-up circuits labelled” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_backed_up_circuits_labelled",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":50},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Label each backed-up circuit at its board. Then add the item with its result.";
},"useData":true})},
"iec/diagram-hangs-at-the-board":{title:"A single-line diagram is at the board",cite:"DIN VDE 0100",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “single-line diagram at the board” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_single_line_diagram_at_the_board",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":55},"end":{"line":1,"column":103}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Put a single-line diagram with both states at the board. Then add the item with its result.";
},"useData":true})},
"iec/fire-sealing-was-inspected":{title:"Fire sealing was inspected",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “fire sealing” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_fire_sealing",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":63}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look at every passage of a cable through a wall or into a board. Then add the item with its result.";
},"useData":true})},
"iec/conductors-are-identified":{title:"The identification of conductors was inspected",cite:"IEC 60445",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “conductor identification” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_conductor_identification",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":47},"end":{"line":1,"column":87}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look at colours and marks at every termination. Then add the item with its result.";
},"useData":true})},
"iec/terminals-are-tight":{title:"The terminals were inspected for tightness",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “terminals tight” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_terminals_tight",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":69}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Tighten to the torque of the datasheet, and mark what was tightened. Then add the item with its result.";
},"useData":true})},
"iec/barriers-were-inspected":{title:"Barriers and enclosures were inspected",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “barriers and enclosures” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_barriers_and_enclosures",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":46},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look for missing blanks, covers and cable glands. Then add the item with its result.";
},"useData":true})},
"iec/isolation-was-inspected":{title:"Isolation and switching were inspected",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “isolation and switching” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_isolation_and_switching",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":46},"end":{"line":1,"column":85}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Try every isolator, and see that it can be locked and reached. Then add the item with its result.";
},"useData":true})},
"iec/array-wiring-was-inspected":{title:"Array cables and connectors were inspected",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “array cables and connectors” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_array_cables_and_connectors",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":50},"end":{"line":1,"column":93}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look at every connector pair, and lift every cable off the roof. Then add the item with its result.";
},"useData":true})},
"iec/battery-mounting-was-inspected":{title:"Battery mounting and clearances were inspected",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The item “battery mounting and clearances” stands as: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"item_battery_mounting_and_clearances",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":54},"end":{"line":1,"column":101}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Look at wall, fixings, clearances and the way to it. Then add the item with its result.";
},"useData":true})},
"iec/notices-are-photographed":{title:"The notices are photographed",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The notices were inspected, and no photo of them is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take a photo of each notice in its place.";
},"useData":true})},
"iec/labels-are-photographed":{title:"The labels of the backed-up circuits are photographed",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The labels of the backed-up circuits were inspected, and no photo of them is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take a photo of the labelled board.";
},"useData":true})},
"iec/no-defect-is-left":{title:"No defect is left open",cite:"IEC 60364-6, 6.4.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These items have a defect: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"items_with_defect",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":27},"end":{"line":1,"column":55}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Mend the defect, inspect again, and change the result.";
},"useData":true})},
"iec/defects-are-described":{title:"Each defect is described",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These defects have no note: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"defects_without_note",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":28},"end":{"line":1,"column":59}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Say what is wrong and where, so that somebody else can mend it.";
},"useData":true})},
"iec/everything-was-inspected":{title:"No item of the inspection was left out",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These items were not inspected: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"items_not_inspected",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":62}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Inspect them, or say in the extent of the report that they are left out, and why.";
},"useData":true})},
"iec/tester-is-named":{title:"The person who tested is named",cite:"IEC CDV 60364-6:2015, model report",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Nobody is named who tested.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Name the person who took the readings under tested_by.";
},"useData":true})},
"iec/installer-is-named":{title:"The person who installed is named",cite:"IEC CDV 60364-6:2015, model report",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Nobody is named who installed.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Name the person who is responsible for the construction under installed_by.";
},"useData":true})},
"iec/licence-is-stated":{title:"Each person's licence is stated",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " has no licence on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write the number of the licence or registration, or say under remarks why none is needed.";
},"useData":true})},
"iec/days-of-the-inspection-are-stated":{title:"The days of the inspection are stated",cite:"ISO/IEC 17020:2012, 7.4.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The days of the inspection are "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"inspected_from",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":31},"end":{"line":1,"column":56}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write the first and the last day under inspected.";
},"useData":true})},
"iec/next-verification-is-stated":{title:"The next verification is stated",cite:"IEC 60364-6, 6.4.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The next verification is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"next_due",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":25},"end":{"line":1,"column":44}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write the date that the kind of premises and local rules ask for under next_due.";
},"useData":true})},
"iec/next-verification-comes-within-the-usual-interval":{title:"The next verification comes within the interval that is usual for the premises",cite:"IEE Guidance Note 3, table of intervals",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The next verification is due on "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"next_due",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":32},"end":{"line":1,"column":51}}})) != null ? stack1 : "")
    + "; for "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"premises",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":57},"end":{"line":1,"column":76}}})) != null ? stack1 : "")
    + " premises "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"usual_interval",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":86},"end":{"line":1,"column":111}}})) != null ? stack1 : "")
    + " is the usual interval at most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Bring the date forward, or say which local rule allows a longer time.";
},"useData":true})},
"iec/extent-is-stated":{title:"It is stated what the report covers",cite:"IEC 60364-6, 6.4.4",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "What the report covers is "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"extent",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":43}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write in a sentence what was verified and what was left out under extent.";
},"useData":true})},
"iec/instruments-are-named":{title:"The instruments are named",cite:"ISO/IEC 17025:2017, 7.5.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "No instrument is on record.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Write kind, serial number and calibration of each instrument under instruments.";
},"useData":true})},
"iec/customer-was-instructed":{title:"The installation was explained to the customer",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "It is not on record that the installation was explained to anybody.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Show the customer what lives on, for how long, and how to restart after an empty battery; write to whom under handover.";
},"useData":true})},
"iec/diagram-was-handed-over":{title:"The single-line diagram was handed over",cite:"IEC 62446-1, documentation",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "These documents were handed over: "
    + ((stack1 = lookupProperty(helpers,"list").call(depth0 != null ? depth0 : (container.nullContext || {}),"documents",{"name":"list","hash":{},"data":data,"loc":{"start":{"line":1,"column":34},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "; a single-line diagram is not among them.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Hand over the diagram, the datasheets, the operating instructions and the list of settings.";
},"useData":true})},
"iec/second-person-looks-at-own-work":{title:"The tester is not the installer",cite:"common practice",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "The person who installed also tested.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Nothing, where local rules allow it. A second competent person reviews the report in any case.";
},"useData":true})},
"au/no-link-closes-beside-the-main-one":{title:"The changeover closes no second link between neutral and earth",cite:"AS/NZS 3000:2018, 7.3.8.1.1(c)",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover's link between neutral and earth is: "
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"neutral_link",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":75}}})) != null ? stack1 : "")
    + "; the link at the main switchboard stays closed.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take the changeover's link out of service.";
},"useData":true})},
"iec/changeover-opens-the-poles-demanded":{title:"The changeover opens the poles that the operator demands",cite:"BS 7671:2018, 551.4.3.2.1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover opens "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"switched_poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + " with its "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":56},"end":{"line":1,"column":72}}})) != null ? stack1 : "")
    + " poles; the operator demands "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"separation_required",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":101},"end":{"line":1,"column":131}}})) != null ? stack1 : "")
    + ".";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device with the poles that the operator demands, or get the operator's consent in writing.";
},"useData":true})},
"iec/neutral-opens-no-sooner-than-the-lines":{title:"The neutral contact opens no sooner than the lines",cite:"from memory",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The neutral contact opens "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"neutral_opens",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":50}}})) != null ? stack1 : "")
    + ". On these loads a lost neutral puts up to "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"lost_neutral_voltage",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":93},"end":{"line":1,"column":124}}})) != null ? stack1 : "")
    + " on one line.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Take the sequence from the datasheet. Fit a device whose neutral opens last and closes first, or with the lines.";
},"useData":true})},
"de/diagram-hangs-at-the-board":{title:"A single-line diagram is at the board or handed over",cite:"DIN VDE 0100",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "A single-line diagram is neither at the board nor among what was handed over.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Put one at the board, or hand it over and name it under documents.";
},"useData":true})},
"de/neutral-is-opened-in-tn-s-and-tt":{title:"In TN-S and TT systems the changeover opens all poles",cite:"VDE-AR-E 2510-2:2021-02, 6.410.2",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The changeover opens "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"switched_poles",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":21},"end":{"line":1,"column":46}}})) != null ? stack1 : "")
    + " in a "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"earthing_system",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":52},"end":{"line":1,"column":78}}})) != null ? stack1 : "")
    + " system.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Fit a device that opens the neutral too.";
},"useData":true})},
"gb/five-times-the-residual-current-trips-at-once":{title:"Where it was read, the device trips at once at five times its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " reads "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":15},"end":{"line":1,"column":36}}})) != null ? stack1 : "")
    + " at five times its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":78},"end":{"line":1,"column":87}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_limit_five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":89},"end":{"line":1,"column":121}}})) != null ? stack1 : "")
    + " is the most.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Replace the device.";
},"useData":true})},
"gb/delayed-device-waits-at-five-times":{title:"Where it was read, the time-delayed device waits long enough at five times its rated residual current",cite:"IEC 61008-1, Table 1",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"name").call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":8}}})) != null ? stack1 : "")
    + " took only "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":19},"end":{"line":1,"column":40}}})) != null ? stack1 : "")
    + " at five times its rated residual current "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":82},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"time_minimum_five_times",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":93},"end":{"line":1,"column":127}}})) != null ? stack1 : "")
    + " is the least.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Check that the device is time-delayed.";
},"useData":true})},
"gb/battery-keeps-out-of-forbidden-places":{title:"The battery keeps out of sleeping rooms, escape routes and roof spaces",cite:"PAS 63100:2024",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The battery stands in a place called “"
    + ((stack1 = lookupProperty(helpers,"show").call(depth0 != null ? depth0 : (container.nullContext || {}),"place",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":38},"end":{"line":1,"column":54}}})) != null ? stack1 : "")
    + "”.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Move it out of sleeping rooms, escape routes, lofts and voids.";
},"useData":true})},
"gb/bonding-suits-a-combined-supply":{title:"With a combined neutral and earth the main bonding conductors are large enough",cite:"BS 7671:2018, Table 54.8",says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "The smallest main bonding conductor has "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"bonding_smallest",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":40},"end":{"line":1,"column":67}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.bonding_minimum_combined",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":69},"end":{"line":1,"column":109}}})) != null ? stack1 : "")
    + " is the least with a combined neutral and earth.";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Run larger main bonding conductors.";
},"useData":true})}
}
