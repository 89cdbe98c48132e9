export default {
pages: {
"account-notice": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "what", {"start":{"line":2,"column":5},"end":{"line":2,"column":9}} ), depth0))
    + " for your account at "
    + alias3(alias2(alias1(depth0, "organisation", {"start":{"line":2,"column":34},"end":{"line":2,"column":46}} ), depth0))
    + ", on "
    + alias3(lookupProperty(helpers,"moment").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"at"),{"name":"moment","hash":{},"data":data,"loc":{"start":{"line":2,"column":53},"end":{"line":2,"column":66}}}))
    + ".</p>\n<p>If it was you, there is nothing to do. If it was not, set a new password at once on the page below, end all sessions there, and tell your administrator.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(depth0,"what")},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"calibration-due": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>The calibration of "
    + alias2(lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"total"),"instrument",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":2,"column":22},"end":{"line":2,"column":50}}}))
    + " at "
    + alias2(container.lambda(container.strict(depth0, "organisation", {"start":{"line":2,"column":56},"end":{"line":2,"column":68}} ), depth0))
    + " ends soon, or has ended:</p>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"instruments"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":6,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"more"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":9,"column":7}}})) != null ? stack1 : "")
    + "</ul>\n<p>Readings taken with an instrument out of calibration do not show that a limit is met.</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + alias3(alias2(alias1(depth0, "name", {"start":{"line":5,"column":6},"end":{"line":5,"column":10}} ), depth0))
    + ", serial number "
    + alias3(alias2(alias1(depth0, "serial", {"start":{"line":5,"column":30},"end":{"line":5,"column":36}} ), depth0))
    + ": "
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"overdue"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":5,"column":40},"end":{"line":5,"column":124}}})) != null ? stack1 : "")
    + "</li>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<strong>ended on "
    + container.escapeExpression(lookupProperty(helpers,"day").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"due"),{"name":"day","hash":{},"data":data,"loc":{"start":{"line":5,"column":72},"end":{"line":5,"column":83}}}))
    + "</strong>";
},"3":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "until "
    + container.escapeExpression(lookupProperty(helpers,"day").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"due"),{"name":"day","hash":{},"data":data,"loc":{"start":{"line":5,"column":106},"end":{"line":5,"column":117}}}));
},"4":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + container.escapeExpression(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"more"),"further instrument",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":8,"column":4},"end":{"line":8,"column":39}}}))
    + " on the page</li>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(alias1,lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"total"),"instrument",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":52}}})," due for calibration",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":76}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"checkpoint": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.escapeExpression, alias3=container.strict, alias4=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>On "
    + alias2(lookupProperty(helpers,"moment").call(alias1,lookupProperty(depth0,"at"),{"name":"moment","hash":{},"data":data,"loc":{"start":{"line":2,"column":6},"end":{"line":2,"column":19}}}))
    + " the register of "
    + alias2(alias4(alias3(depth0, "organisation", {"start":{"line":2,"column":38},"end":{"line":2,"column":50}} ), depth0))
    + " held "
    + alias2(lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"size"),"entry","entries",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":2,"column":58},"end":{"line":2,"column":90}}}))
    + ". Its root is</p>\n<p>"
    + alias2(alias4(alias3(depth0, "root", {"start":{"line":3,"column":5},"end":{"line":3,"column":9}} ), depth0))
    + "</p>\n<p>Keep this mail. With it you can show later that none of these entries was altered or left out since.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(alias1,"Register of ",lookupProperty(depth0,"organisation"),": ",lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"size"),"entry","entries",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":89}}}),{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":90}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"invitation": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has set up an account for you at "
    + alias3(alias2(alias1(depth0, "organisation", {"start":{"line":2,"column":45},"end":{"line":2,"column":57}} ), depth0))
    + ", as "
    + alias3(lookupProperty(helpers,"list").call(alias4,lookupProperty(depth0,"roles"),{"name":"list","hash":{},"data":data,"loc":{"start":{"line":2,"column":64},"end":{"line":2,"column":78}}}))
    + ".</p>\n<p>The page below asks you for a password. It works once, until "
    + alias3(lookupProperty(helpers,"moment").call(alias4,lookupProperty(depth0,"until"),{"name":"moment","hash":{},"data":data,"loc":{"start":{"line":3,"column":64},"end":{"line":3,"column":80}}}))
    + ".</p>\n<p>If you do not know why you are being invited, do nothing: without a password the account stays closed.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),"Your account at ",lookupProperty(depth0,"organisation"),{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":58}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"password-reset": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>Somebody asked for a new password for your account at "
    + alias1(container.lambda(container.strict(depth0, "organisation", {"start":{"line":2,"column":59},"end":{"line":2,"column":71}} ), depth0))
    + ".</p>\n<p>The page below asks you for it. It works once, until "
    + alias1(lookupProperty(helpers,"moment").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"until"),{"name":"moment","hash":{},"data":data,"loc":{"start":{"line":3,"column":56},"end":{"line":3,"column":72}}}))
    + ".</p>\n<p>If it was not you, do nothing: your password stays as it is. If it happens again, tell your administrator.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":"A new password"},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"report-approved": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has approved "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "reference", {"start":{"line":2,"column":25},"end":{"line":2,"column":41}} ), depth0))
    + ", "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":47},"end":{"line":2,"column":59}} ), depth0))
    + ". It is not issued yet.</p>\n<p>Until it has a number and a seal, do not hand it to the customer.</p>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"remarks"),depth0,{"name":"remarks","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"report"),"reference"),": approved",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":56}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"report-issued": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has issued "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "reference", {"start":{"line":2,"column":23},"end":{"line":2,"column":39}} ), depth0))
    + ", "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":45},"end":{"line":2,"column":57}} ), depth0))
    + ", as report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":2,"column":73},"end":{"line":2,"column":79}} ), depth0))
    + ".</p>\n<p>Hand on the sealed PDF from the page, not a print or a copy of the draft: only the PDF can be checked for its seal. Anybody who holds it can check it at "
    + alias3(lookupProperty(helpers,"address").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"checkPage"),{"name":"address","hash":{},"data":data,"loc":{"start":{"line":3,"column":156},"end":{"line":3,"column":177}}}))
    + ".</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"number"),": issued",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":44}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"report-replaced": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has replaced report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":2,"column":32},"end":{"line":2,"column":38}} ), depth0))
    + " on "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":46},"end":{"line":2,"column":58}} ), depth0))
    + " by report "
    + alias3(alias2(alias1(depth0, "newNumber", {"start":{"line":2,"column":73},"end":{"line":2,"column":82}} ), depth0))
    + ".</p>\n<p>Reason: "
    + alias3(alias2(alias1(depth0, "reason", {"start":{"line":3,"column":13},"end":{"line":3,"column":19}} ), depth0))
    + "</p>\n<p><strong>Report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":4,"column":20},"end":{"line":4,"column":26}} ), depth0))
    + " no longer stands.</strong> Put "
    + alias3(alias2(alias1(depth0, "newNumber", {"start":{"line":4,"column":62},"end":{"line":4,"column":71}} ), depth0))
    + " in its place wherever you handed it on, and see whether anybody worked by the old one.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"number"),": replaced by ",lookupProperty(depth0,"newNumber"),{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":60}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"report-returned": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has returned "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "reference", {"start":{"line":2,"column":25},"end":{"line":2,"column":41}} ), depth0))
    + ", "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":47},"end":{"line":2,"column":59}} ), depth0))
    + ", with "
    + alias3(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"total"),"remark",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":2,"column":68},"end":{"line":2,"column":92}}}))
    + ". It can go on when each is answered and a new revision of the file is uploaded.</p>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"remarks"),depth0,{"name":"remarks","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"report"),"reference"),": returned",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":56}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"report-withdrawn": () => ({"0":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has withdrawn report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":2,"column":33},"end":{"line":2,"column":39}} ), depth0))
    + " on "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":47},"end":{"line":2,"column":59}} ), depth0))
    + ". No other report takes its place.</p>\n<p>Reason: "
    + alias3(alias2(alias1(depth0, "reason", {"start":{"line":3,"column":13},"end":{"line":3,"column":19}} ), depth0))
    + "</p>\n<p><strong>Do not rely on report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":4,"column":35},"end":{"line":4,"column":41}} ), depth0))
    + ".</strong> Tell whoever you handed it to, and anybody who works on the installation.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"number"),": withdrawn",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":47}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"review-asked": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " asks for a review of "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "reference", {"start":{"line":2,"column":33},"end":{"line":2,"column":49}} ), depth0))
    + ", "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":55},"end":{"line":2,"column":67}} ), depth0))
    + ".</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"failing"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":5,"column":7}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p><strong>"
    + container.escapeExpression(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"failing"),"finding",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":4,"column":11},"end":{"line":4,"column":38}}}))
    + " at failure level.</strong></p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"report"),"reference"),": for review",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":58}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"review-submitted": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(depth0, "by", {"start":{"line":2,"column":5},"end":{"line":2,"column":7}} ), depth0))
    + " has reviewed "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "reference", {"start":{"line":2,"column":25},"end":{"line":2,"column":41}} ), depth0))
    + ", "
    + alias3(alias2(alias1(lookupProperty(depth0,"report"), "title", {"start":{"line":2,"column":47},"end":{"line":2,"column":59}} ), depth0))
    + ", and made "
    + alias3(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"total"),"remark",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":2,"column":72},"end":{"line":2,"column":96}}}))
    + ".</p>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"remarks"),depth0,{"name":"remarks","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(alias1,lookupProperty(lookupProperty(depth0,"report"),"reference"),": ",lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"total"),"remark",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":1,"column":48},"end":{"line":1,"column":70}}}),{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":71}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
"verification-due": () => ({"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>The next verification falls due:</p>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"installations"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":6,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"more"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":9,"column":7}}})) != null ? stack1 : "")
    + "</ul>\n<p>Agree the date with the customer: the test goes through the changeover, and the supply is off for parts of it.</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + alias3(alias2(alias1(depth0, "title", {"start":{"line":5,"column":6},"end":{"line":5,"column":11}} ), depth0))
    + ", "
    + alias3(alias2(alias1(depth0, "place", {"start":{"line":5,"column":17},"end":{"line":5,"column":22}} ), depth0))
    + ": "
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"overdue"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":5,"column":26},"end":{"line":5,"column":106}}})) != null ? stack1 : "")
    + "; last report "
    + alias3(alias2(alias1(depth0, "number", {"start":{"line":5,"column":122},"end":{"line":5,"column":128}} ), depth0))
    + "</li>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<strong>was due on "
    + container.escapeExpression(lookupProperty(helpers,"day").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"due"),{"name":"day","hash":{},"data":data,"loc":{"start":{"line":5,"column":60},"end":{"line":5,"column":71}}}))
    + "</strong>";
},"3":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression(lookupProperty(helpers,"day").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"due"),{"name":"day","hash":{},"data":data,"loc":{"start":{"line":5,"column":88},"end":{"line":5,"column":99}}}));
},"4":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + container.escapeExpression(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"more"),"further installation",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":8,"column":4},"end":{"line":8,"column":41}}}))
    + " on the page</li>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"letter"),depth0,{"name":"letter","hash":{"subject":lookupProperty(helpers,"line").call(alias1,lookupProperty(helpers,"count").call(alias1,lookupProperty(depth0,"total"),"installation",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":54}}})," due for periodic verification",{"name":"line","hash":{},"data":data,"loc":{"start":{"line":1,"column":20},"end":{"line":1,"column":88}}})},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"usePartial":true,"useData":true}),
},
partials: {
"letter": () => ({"0":function(container,depth0,helpers,partials,data) {
    return " You can switch mails like this one off in your account.";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<title>"
    + alias3(alias2(alias1(depth0, "subject", {"start":{"line":1,"column":9},"end":{"line":1,"column":16}} ), depth0))
    + "</title>\n<p>Hello "
    + alias3(alias2(alias1(depth0, "to", {"start":{"line":2,"column":11},"end":{"line":2,"column":13}} ), depth0))
    + ",</p>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"@partial-block"),depth0,{"name":"@partial-block","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<p>"
    + alias3(lookupProperty(helpers,"address").call(alias4,lookupProperty(depth0,"page"),{"name":"address","hash":{},"data":data,"loc":{"start":{"line":4,"column":3},"end":{"line":4,"column":19}}}))
    + "</p>\n<p><small>Sent by Skerry for "
    + alias3(alias2(alias1(depth0, "organisation", {"start":{"line":5,"column":31},"end":{"line":5,"column":43}} ), depth0))
    + ". Answers to this mail are not read."
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(depth0,"switchable"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":81},"end":{"line":5,"column":162}}})) != null ? stack1 : "")
    + "</small></p>\n";
},"usePartial":true,"useData":true}),
"remarks": () => ({"0":function(container,depth0,helpers,partials,data) {
    return "<blockquote>"
    + container.escapeExpression(container.lambda(container.strict(depth0, "summary", {"start":{"line":2,"column":14},"end":{"line":2,"column":21}} ), depth0))
    + "</blockquote>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"remarks"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":8,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"more"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":0},"end":{"line":11,"column":7}}})) != null ? stack1 : "")
    + "</ul>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression;

  return "<li><strong>"
    + alias3(alias2(alias1(depth0, "about", {"start":{"line":7,"column":14},"end":{"line":7,"column":19}} ), depth0))
    + "</strong>: "
    + alias3(alias2(alias1(depth0, "words", {"start":{"line":7,"column":34},"end":{"line":7,"column":39}} ), depth0))
    + "</li>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + container.escapeExpression(lookupProperty(helpers,"count").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"more"),"further remark",{"name":"count","hash":{},"data":data,"loc":{"start":{"line":10,"column":4},"end":{"line":10,"column":35}}}))
    + " on the page</li>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"summary"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":3,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"remarks"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":13,"column":7}}})) != null ? stack1 : "");
},"useData":true}),
},
}
