export default {
"iec/loop-lets-the-device-operate":{says:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
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
    + " "
    + ((stack1 = lookupProperty(helpers,"state").call(alias1,{"name":"state","hash":{},"data":data,"loc":{"start":{"line":1,"column":43},"end":{"line":1,"column":52}}})) != null ? stack1 : "")
    + "; "
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"loop_limit_measured",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":54},"end":{"line":1,"column":84}}})) != null ? stack1 : "")
    + " is the most ("
    + ((stack1 = lookupProperty(helpers,"show").call(alias1,"book.loop_reading_factor",{"name":"show","hash":{},"data":data,"loc":{"start":{"line":1,"column":98},"end":{"line":1,"column":133}}})) != null ? stack1 : "")
    + ").";
},"useData":true}),do:()=>({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "Shorten it";
},"useData":true})}
}
