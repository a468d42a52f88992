var pq=Object.create;var wi=Object.defineProperty;var vq=Object.getOwnPropertyDescriptor;var mq=Object.getOwnPropertyNames;var dq=Object.getPrototypeOf,hq=Object.prototype.hasOwnProperty;var g=(e,r)=>()=>{try{return r||e((r={exports:{}}).exports,r),r.exports}catch(t){throw r=0,t}},gq=(e,r)=>{for(var t in r)wi(e,t,{get:r[t],enumerable:!0})},_q=(e,r,t,n)=>{if(r&&typeof r=="object"||typeof r=="function")for(let i of mq(r))!hq.call(e,i)&&i!==t&&wi(e,i,{get:()=>r[i],enumerable:!(n=vq(r,i))||n.enumerable});return e};var Be=(e,r,t)=>(t=e!=null?pq(dq(e)):{},_q(r||!e||!e.__esModule?wi(t,"default",{value:e,enumerable:!0}):t,e));var ua=g((gV,sa)=>{"use strict";var yq=typeof Object.defineProperty=="function"?Object.defineProperty:null;sa.exports=yq});var ca=g((_V,aa)=>{"use strict";var bq=ua();function wq(){try{return bq({},"x",{}),!0}catch{return!1}}aa.exports=wq});var la=g((yV,fa)=>{"use strict";var qq=Object.defineProperty;fa.exports=qq});var qi=g((bV,pa)=>{"use strict";function Pq(e){return typeof e=="number"}pa.exports=Pq});var Pi=g((wV,ma)=>{"use strict";function Iq(e){return e[0]==="-"}function va(e){var r="",t;for(t=0;t<e;t++)r+="0";return r}function $q(e,r,t){var n=!1,i=r-e.length;return i<0||(Iq(e)&&(n=!0,e=e.substr(1)),e=t?e+va(i):va(i)+e,n&&(e="-"+e)),e}ma.exports=$q});var _a=g((qV,ga)=>{"use strict";var kq=qi(),da=Pi(),Aq=String.prototype.toLowerCase,ha=String.prototype.toUpperCase;function Oq(e){var r,t,n;switch(e.specifier){case"b":r=2;break;case"o":r=8;break;case"x":case"X":r=16;break;default:r=10;break}if(t=e.arg,n=parseInt(t,10),!isFinite(n)){if(!kq(t))throw new Error("invalid integer. Value: "+t);n=0}return n<0&&(e.specifier==="u"||r!==10)&&(n=4294967295+n+1),n<0?(t=(-n).toString(r),e.precision&&(t=da(t,e.precision,e.padRight)),t="-"+t):(t=n.toString(r),!n&&!e.precision?t="":e.precision&&(t=da(t,e.precision,e.padRight)),e.sign&&(t=e.sign+t)),r===16&&(e.alternate&&(t="0x"+t),t=e.specifier===ha.call(e.specifier)?ha.call(t):Aq.call(t)),r===8&&e.alternate&&t.charAt(0)!=="0"&&(t="0"+t),t}ga.exports=Oq});var ba=g((PV,ya)=>{"use strict";function Eq(e){return typeof e=="string"}ya.exports=Eq});var Pa=g((IV,qa)=>{"use strict";var Nq=Math.abs,zq=String.prototype.toLowerCase,wa=String.prototype.toUpperCase,Fr=String.prototype.replace,Tq=/e\+(\d)$/,Zq=/e-(\d)$/,Rq=/^(\d+)$/,Fq=/^(\d+)e/,Lq=/\.0$/,Cq=/\.0*e/,Sq=/(\..*[^0])0*e/;function Dq(e,r){var t,n;switch(r.specifier){case"e":case"E":n=e.toExponential(r.precision);break;case"f":case"F":n=e.toFixed(r.precision);break;case"g":case"G":Nq(e)<1e-4?(t=r.precision,t>0&&(t-=1),n=e.toExponential(t)):n=e.toPrecision(r.precision),r.alternate||(n=Fr.call(n,Sq,"$1e"),n=Fr.call(n,Cq,"e"),n=Fr.call(n,Lq,""));break;default:throw new Error("invalid double notation. Value: "+r.specifier)}return n=Fr.call(n,Tq,"e+0$1"),n=Fr.call(n,Zq,"e-0$1"),r.alternate&&(n=Fr.call(n,Rq,"$1."),n=Fr.call(n,Fq,"$1.e")),e>=0&&r.sign&&(n=r.sign+n),n=r.specifier===wa.call(r.specifier)?wa.call(n):zq.call(n),n}qa.exports=Dq});var ka=g(($V,$a)=>{"use strict";function Ia(e){var r="",t;for(t=0;t<e;t++)r+=" ";return r}function Bq(e,r,t){var n=r-e.length;return n<0||(e=t?e+Ia(n):Ia(n)+e),e}$a.exports=Bq});var Oa=g((kV,Aa)=>{"use strict";var xq=_a(),Uq=ba(),Hq=qi(),Gq=Pa(),Wq=ka(),Vq=Pi(),Mq=String.fromCharCode,Jq=Array.isArray;function Tn(e){return e!==e}function Xq(e){var r={};return r.specifier=e.specifier,r.precision=e.precision===void 0?1:e.precision,r.width=e.width,r.flags=e.flags||"",r.mapping=e.mapping,r}function Kq(e){var r,t,n,i,s,f,a,o,u,c;if(!Jq(e))throw new TypeError("invalid argument. First argument must be an array. Value: `"+e+"`.");for(f="",a=1,u=0;u<e.length;u++)if(n=e[u],Uq(n))f+=n;else{if(r=n.precision!==void 0,n=Xq(n),!n.specifier)throw new TypeError("invalid argument. Token is missing `specifier` property. Index: `"+u+"`. Value: `"+n+"`.");for(n.mapping&&(a=n.mapping),t=n.flags,c=0;c<t.length;c++)switch(i=t.charAt(c),i){case" ":n.sign=" ";break;case"+":n.sign="+";break;case"-":n.padRight=!0,n.padZeros=!1;break;case"0":n.padZeros=t.indexOf("-")<0;break;case"#":n.alternate=!0;break;default:throw new Error("invalid flag: "+i)}if(n.width==="*"){if(n.width=parseInt(arguments[a],10),a+=1,Tn(n.width))throw new TypeError("the argument for * width at position "+a+" is not a number. Value: `"+n.width+"`.");n.width<0&&(n.padRight=!0,n.width=-n.width)}if(r&&n.precision==="*"){if(n.precision=parseInt(arguments[a],10),a+=1,Tn(n.precision))throw new TypeError("the argument for * precision at position "+a+" is not a number. Value: `"+n.precision+"`.");n.precision<0&&(n.precision=1,r=!1)}switch(n.arg=arguments[a],n.specifier){case"b":case"o":case"x":case"X":case"d":case"i":case"u":r&&(n.padZeros=!1),n.arg=xq(n);break;case"s":n.maxWidth=r?n.precision:-1,n.arg=String(n.arg);break;case"c":if(!Tn(n.arg)){if(s=parseInt(n.arg,10),s<0||s>127)throw new Error("invalid character code. Value: "+n.arg);n.arg=Tn(s)?String(n.arg):Mq(s)}break;case"e":case"E":case"f":case"F":case"g":case"G":if(r||(n.precision=6),o=parseFloat(n.arg),!isFinite(o)){if(!Hq(n.arg))throw new Error("invalid floating-point number. Value: "+f);o=n.arg,n.padZeros=!1}n.arg=Gq(o,n);break;default:throw new Error("invalid specifier: "+n.specifier)}n.maxWidth>=0&&n.arg.length>n.maxWidth&&(n.arg=n.arg.substring(0,n.maxWidth)),n.padZeros?n.arg=Vq(n.arg,n.width||n.precision,n.padRight):n.width&&(n.arg=Wq(n.arg,n.width,n.padRight)),f+=n.arg||"",a+=1}return f}Aa.exports=Kq});var Na=g((AV,Ea)=>{"use strict";var Qq=Oa();Ea.exports=Qq});var Ta=g((OV,za)=>{"use strict";var Zn=/%(?:([1-9]\d*)\$)?([0 +\-#]*)(\*|\d+)?(?:(\.)(\*|\d+)?)?[hlL]?([%A-Za-z])/g;function Yq(e){var r={mapping:e[1]?parseInt(e[1],10):void 0,flags:e[2],width:e[3],precision:e[5],specifier:e[6]};return e[4]==="."&&e[5]===void 0&&(r.precision="1"),r}function jq(e){var r,t,n,i;for(t=[],i=0,n=Zn.exec(e);n;)r=e.slice(i,Zn.lastIndex-n[0].length),r.length&&t.push(r),n[6]==="%"?t.push("%"):t.push(Yq(n)),i=Zn.lastIndex,n=Zn.exec(e);return r=e.slice(i),r.length&&t.push(r),t}za.exports=jq});var Ra=g((EV,Za)=>{"use strict";var eP=Ta();Za.exports=eP});var La=g((NV,Fa)=>{"use strict";function rP(e){return typeof e=="string"}Fa.exports=rP});var Da=g((zV,Sa)=>{"use strict";var tP=Na(),nP=Ra(),oP=La();function Ca(e){var r,t;if(!oP(e))throw new TypeError(Ca("invalid argument. First argument must be a string. Value: `%s`.",e));for(r=[nP(e)],t=1;t<arguments.length;t++)r.push(arguments[t]);return tP.apply(null,r)}Sa.exports=Ca});var xa=g((TV,Ba)=>{"use strict";var iP=Da();Ba.exports=iP});var Ma=g((ZV,Va)=>{"use strict";var Ua=xa(),nt=Object.prototype,Ha=nt.toString,Ga=nt.__defineGetter__,Wa=nt.__defineSetter__,sP=nt.__lookupGetter__,uP=nt.__lookupSetter__;function aP(e,r,t){var n,i,s,f;if(typeof e!="object"||e===null||Ha.call(e)==="[object Array]")throw new TypeError(Ua("invalid argument. First argument must be an object. Value: `%s`.",e));if(typeof t!="object"||t===null||Ha.call(t)==="[object Array]")throw new TypeError(Ua("invalid argument. Property descriptor must be an object. Value: `%s`.",t));if(i="value"in t,i&&(sP.call(e,r)||uP.call(e,r)?(n=e.__proto__,e.__proto__=nt,delete e[r],e[r]=t.value,e.__proto__=n):e[r]=t.value),s="get"in t,f="set"in t,i&&(s||f))throw new Error("invalid argument. Cannot specify one or more accessors and a value or writable attribute in the property descriptor.");return s&&Ga&&Ga.call(e,r,t.get),f&&Wa&&Wa.call(e,r,t.set),e}Va.exports=aP});var Xa=g((RV,Ja)=>{"use strict";var cP=ca(),fP=la(),lP=Ma(),Ii;cP()?Ii=fP:Ii=lP;Ja.exports=Ii});var Qa=g((FV,Ka)=>{"use strict";var pP=Xa();function vP(e,r,t){pP(e,r,{configurable:!1,enumerable:!1,writable:!1,value:t})}Ka.exports=vP});var rr=g((LV,Ya)=>{"use strict";var mP=Qa();Ya.exports=mP});var ec=g((CV,ja)=>{"use strict";function dP(e){return e!==e}ja.exports=dP});var R=g((SV,rc)=>{"use strict";var hP=ec();rc.exports=hP});var $i=g((DV,tc)=>{"use strict";function gP(e,r){var t,n;if(n=e.length,n<2||r===0)return n===0?0:e[0];for(n-=1,t=e[n]*r+e[n-1],n-=2;n>=0;)t=t*r+e[n],n-=1;return t}tc.exports=gP});var oc=g((BV,nc)=>{"use strict";var _P=Function;nc.exports=_P});var sc=g((xV,ic)=>{"use strict";var yP=oc();ic.exports=yP});var ac=g((UV,uc)=>{"use strict";var bP=sc(),wP=$i();function qP(e){var r,t,n,i;if(e.length>500)return s;if(r="return function evalpoly(x){",t=e.length,t===0)r+="return 0.0;";else if(t===1)r+="return "+e[0]+";";else{for(r+="if(x===0.0){return "+e[0]+";}",r+="return "+e[0],n=t-1,i=1;i<t;i++)r+="+x*",i<n&&(r+="("),r+=e[i];for(i=0;i<n-1;i++)r+=")";r+=";"}return r+="}",r+="//# sourceURL=evalpoly.factory.js",new bP(r)();function s(f){return wP(e,f)}}uc.exports=qP});var tr=g((HV,fc)=>{"use strict";var PP=rr(),cc=$i(),IP=ac();PP(cc,"factory",IP);fc.exports=cc});var pc=g((GV,lc)=>{"use strict";function $P(){return typeof Symbol=="function"&&typeof Symbol("foo")=="symbol"}lc.exports=$P});var mc=g((WV,vc)=>{"use strict";var kP=pc();vc.exports=kP});var hc=g((VV,dc)=>{"use strict";var AP=mc(),OP=AP();function EP(){return OP&&typeof Symbol.toStringTag=="symbol"}dc.exports=EP});var _c=g((MV,gc)=>{"use strict";var NP=hc();gc.exports=NP});var ki=g((JV,yc)=>{"use strict";var zP=Object.prototype.toString;yc.exports=zP});var wc=g((XV,bc)=>{"use strict";var TP=ki();function ZP(e){return TP.call(e)}bc.exports=ZP});var Pc=g((KV,qc)=>{"use strict";var RP=Object.prototype.hasOwnProperty;function FP(e,r){return e==null?!1:RP.call(e,r)}qc.exports=FP});var $c=g((QV,Ic)=>{"use strict";var LP=Pc();Ic.exports=LP});var Ac=g((YV,kc)=>{"use strict";var CP=typeof Symbol=="function"?Symbol:void 0;kc.exports=CP});var Ec=g((jV,Oc)=>{"use strict";var SP=Ac();Oc.exports=SP});var Tc=g((eM,zc)=>{"use strict";var Nc=Ec(),DP=typeof Nc=="function"?Nc.toStringTag:"";zc.exports=DP});var Rc=g((rM,Zc)=>{"use strict";var BP=$c(),Rt=Tc(),Ai=ki();function xP(e){var r,t,n;if(e==null)return Ai.call(e);t=e[Rt],r=BP(e,Rt);try{e[Rt]=void 0}catch{return Ai.call(e)}return n=Ai.call(e),r?e[Rt]=t:delete e[Rt],n}Zc.exports=xP});var Ft=g((tM,Fc)=>{"use strict";var UP=_c(),HP=wc(),GP=Rc(),Oi;UP()?Oi=GP:Oi=HP;Fc.exports=Oi});var Cc=g((nM,Lc)=>{"use strict";var WP=Ft(),VP=typeof Uint32Array=="function";function MP(e){return VP&&e instanceof Uint32Array||WP(e)==="[object Uint32Array]"}Lc.exports=MP});var Dc=g((oM,Sc)=>{"use strict";var JP=Cc();Sc.exports=JP});var xc=g((iM,Bc)=>{"use strict";var XP=4294967295;Bc.exports=XP});var Hc=g((sM,Uc)=>{"use strict";var KP=typeof Uint32Array=="function"?Uint32Array:null;Uc.exports=KP});var Vc=g((uM,Wc)=>{"use strict";var QP=Dc(),Ei=xc(),Gc=Hc();function YP(){var e,r;if(typeof Gc!="function")return!1;try{r=[1,3.14,-3.14,Ei+1,Ei+2],r=new Gc(r),e=QP(r)&&r[0]===1&&r[1]===3&&r[2]===Ei-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}Wc.exports=YP});var Jc=g((aM,Mc)=>{"use strict";var jP=Vc();Mc.exports=jP});var Kc=g((cM,Xc)=>{"use strict";var eI=typeof Uint32Array=="function"?Uint32Array:void 0;Xc.exports=eI});var Yc=g((fM,Qc)=>{"use strict";function rI(){throw new Error("not implemented")}Qc.exports=rI});var Lr=g((lM,jc)=>{"use strict";var tI=Jc(),nI=Kc(),oI=Yc(),Ni;tI()?Ni=nI:Ni=oI;jc.exports=Ni});var rf=g((pM,ef)=>{"use strict";var iI=Ft(),sI=typeof Float64Array=="function";function uI(e){return sI&&e instanceof Float64Array||iI(e)==="[object Float64Array]"}ef.exports=uI});var nf=g((vM,tf)=>{"use strict";var aI=rf();tf.exports=aI});var sf=g((mM,of)=>{"use strict";var cI=typeof Float64Array=="function"?Float64Array:null;of.exports=cI});var cf=g((dM,af)=>{"use strict";var fI=nf(),uf=sf();function lI(){var e,r;if(typeof uf!="function")return!1;try{r=new uf([1,3.14,-3.14,NaN]),e=fI(r)&&r[0]===1&&r[1]===3.14&&r[2]===-3.14&&r[3]!==r[3]}catch{e=!1}return e}af.exports=lI});var lf=g((hM,ff)=>{"use strict";var pI=cf();ff.exports=pI});var vf=g((gM,pf)=>{"use strict";var vI=typeof Float64Array=="function"?Float64Array:void 0;pf.exports=vI});var df=g((_M,mf)=>{"use strict";function mI(){throw new Error("not implemented")}mf.exports=mI});var Cr=g((yM,hf)=>{"use strict";var dI=lf(),hI=vf(),gI=df(),zi;dI()?zi=hI:zi=gI;hf.exports=zi});var _f=g((bM,gf)=>{"use strict";var _I=Ft(),yI=typeof Uint8Array=="function";function bI(e){return yI&&e instanceof Uint8Array||_I(e)==="[object Uint8Array]"}gf.exports=bI});var bf=g((wM,yf)=>{"use strict";var wI=_f();yf.exports=wI});var qf=g((qM,wf)=>{"use strict";var qI=255;wf.exports=qI});var If=g((PM,Pf)=>{"use strict";var PI=typeof Uint8Array=="function"?Uint8Array:null;Pf.exports=PI});var Af=g((IM,kf)=>{"use strict";var II=bf(),Ti=qf(),$f=If();function $I(){var e,r;if(typeof $f!="function")return!1;try{r=[1,3.14,-3.14,Ti+1,Ti+2],r=new $f(r),e=II(r)&&r[0]===1&&r[1]===3&&r[2]===Ti-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}kf.exports=$I});var Ef=g(($M,Of)=>{"use strict";var kI=Af();Of.exports=kI});var zf=g((kM,Nf)=>{"use strict";var AI=typeof Uint8Array=="function"?Uint8Array:void 0;Nf.exports=AI});var Zf=g((AM,Tf)=>{"use strict";function OI(){throw new Error("not implemented")}Tf.exports=OI});var Ff=g((OM,Rf)=>{"use strict";var EI=Ef(),NI=zf(),zI=Zf(),Zi;EI()?Zi=NI:Zi=zI;Rf.exports=Zi});var Cf=g((EM,Lf)=>{"use strict";var TI=Ft(),ZI=typeof Uint16Array=="function";function RI(e){return ZI&&e instanceof Uint16Array||TI(e)==="[object Uint16Array]"}Lf.exports=RI});var Df=g((NM,Sf)=>{"use strict";var FI=Cf();Sf.exports=FI});var xf=g((zM,Bf)=>{"use strict";var LI=65535;Bf.exports=LI});var Hf=g((TM,Uf)=>{"use strict";var CI=typeof Uint16Array=="function"?Uint16Array:null;Uf.exports=CI});var Vf=g((ZM,Wf)=>{"use strict";var SI=Df(),Ri=xf(),Gf=Hf();function DI(){var e,r;if(typeof Gf!="function")return!1;try{r=[1,3.14,-3.14,Ri+1,Ri+2],r=new Gf(r),e=SI(r)&&r[0]===1&&r[1]===3&&r[2]===Ri-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}Wf.exports=DI});var Jf=g((RM,Mf)=>{"use strict";var BI=Vf();Mf.exports=BI});var Kf=g((FM,Xf)=>{"use strict";var xI=typeof Uint16Array=="function"?Uint16Array:void 0;Xf.exports=xI});var Yf=g((LM,Qf)=>{"use strict";function UI(){throw new Error("not implemented")}Qf.exports=UI});var el=g((CM,jf)=>{"use strict";var HI=Jf(),GI=Kf(),WI=Yf(),Fi;HI()?Fi=GI:Fi=WI;jf.exports=Fi});var tl=g((SM,rl)=>{"use strict";var VI=Ff(),MI=el(),JI={uint16:MI,uint8:VI};rl.exports=JI});var sl=g((DM,il)=>{"use strict";var nl=tl(),ol;function XI(){var e,r;return e=new nl.uint16(1),e[0]=4660,r=new nl.uint8(e.buffer),r[0]===52}ol=XI();il.exports=ol});var Sr=g((BM,ul)=>{"use strict";var KI=sl();ul.exports=KI});var cl=g((xM,al)=>{"use strict";var QI=Sr(),Li;QI===!0?Li=1:Li=0;al.exports=Li});var pl=g((UM,ll)=>{"use strict";var YI=Lr(),jI=Cr(),e$=cl(),fl=new jI(1),r$=new YI(fl.buffer);function t$(e){return fl[0]=e,r$[e$]}ll.exports=t$});var _e=g((HM,vl)=>{"use strict";var n$=pl();vl.exports=n$});var dl=g((GM,ml)=>{"use strict";var o$=Sr(),Ci;o$===!0?Ci=1:Ci=0;ml.exports=Ci});var gl=g((WM,hl)=>{"use strict";var i$=Lr(),s$=Cr(),u$=dl(),Si=new s$(1),a$=new i$(Si.buffer);function c$(e,r){return Si[0]=e,a$[u$]=r>>>0,Si[0]}hl.exports=c$});var ot=g((VM,_l)=>{"use strict";var f$=gl();_l.exports=f$});var wl=g((MM,bl)=>{"use strict";var l$=Sr(),yl,Di,Bi;l$===!0?(Di=1,Bi=0):(Di=0,Bi=1);yl={HIGH:Di,LOW:Bi};bl.exports=yl});var kl=g((JM,$l)=>{"use strict";var p$=Lr(),v$=Cr(),Pl=wl(),Il=new v$(1),ql=new p$(Il.buffer),m$=Pl.HIGH,d$=Pl.LOW;function h$(e,r){return ql[m$]=e,ql[d$]=r,Il[0]}$l.exports=h$});var Lt=g((XM,Al)=>{"use strict";var g$=kl();Al.exports=g$});var ee=g((KM,Ol)=>{"use strict";var _$=Number.POSITIVE_INFINITY;Ol.exports=_$});var Nl=g((QM,El)=>{"use strict";El.exports=Number});var Tl=g((YM,zl)=>{"use strict";var y$=Nl();zl.exports=y$});var fe=g((jM,Zl)=>{"use strict";var b$=Tl(),w$=b$.NEGATIVE_INFINITY;Zl.exports=w$});var hr=g((eJ,Rl)=>{"use strict";var q$=1023;Rl.exports=q$});var Ll=g((rJ,Fl)=>{"use strict";var P$=.34657359027997264;Fl.exports=P$});var Sl=g((tJ,Cl)=>{"use strict";function I$(e){return e===0?-.03333333333333313:-.03333333333333313+e*(.0015873015872548146+e*(-793650757867488e-19+e*(4008217827329362e-21+e*-20109921818362437e-23)))}Cl.exports=I$});var Gl=g((nJ,Hl)=>{"use strict";var $$=R(),Dl=_e(),xi=ot(),k$=Lt(),Bl=ee(),A$=fe(),xl=hr(),O$=Ll(),E$=Sl(),N$=709.782712893384,Ui=.6931471803691238,Hi=19082149292705877e-26,Ul=1.4426950408889634,z$=38.816242111356935,T$=1.0397207708399179;function Z$(e){var r,t,n,i,s,f,a,o,u,c,l,p,v;if(e===Bl||$$(e))return e;if(e===A$)return-1;if(e===0)return e;if(e<0?(n=!0,o=-e):(n=!1,o=e),o>=z$){if(n)return-1;if(o>=N$)return Bl}if(f=Dl(o)|0,o>O$)o<T$?n?(i=e+Ui,s=-Hi,v=-1):(i=e-Ui,s=Hi,v=1):(n?v=Ul*e-.5:v=Ul*e+.5,v|=0,l=v,i=e-l*Ui,s=l*Hi),e=i-s,c=i-e-s;else{if(f<1016070144)return e;v=0}return r=.5*e,u=e*r,a=1+u*E$(u),l=3-a*r,p=u*((a-l)/(6-e*l)),v===0?e-(e*p-u):(t=k$(xl+v<<20,0),p=e*(p-c)-c,p-=u,v===-1?.5*(e-p)-.5:v===1?e<-.25?-2*(p-(e+.5)):1+2*(e-p):v<=-2||v>56?(o=1-(p-e),v===1024?(i=Dl(o)+(v<<20)|0,o=xi(o,i)):o*=t,o-1):(l=1,v<20?(i=1072693248-(2097152>>v)|0,l=xi(l,i),o=l-(p-e)):(i=xl-v<<20|0,l=xi(l,i),o=e-(p+l),o+=1),o*=t,o))}Hl.exports=Z$});var Dr=g((oJ,Wl)=>{"use strict";var R$=Gl();Wl.exports=R$});var Ml=g((iJ,Vl)=>{"use strict";var F$=Math.floor;Vl.exports=F$});var ye=g((sJ,Jl)=>{"use strict";var L$=Ml();Jl.exports=L$});var Kl=g((uJ,Xl)=>{"use strict";function C$(e){return e===0?.6666666666666735:.6666666666666735+e*(.3999999999940942+e*(.2857142874366239+e*(.22222198432149784+e*(.1818357216161805+e*(.15313837699209373+e*.14798198605116586)))))}Xl.exports=C$});var r1=g((aJ,e1)=>{"use strict";var S$=R(),Ql=_e(),Yl=ot(),D$=ee(),B$=fe(),jl=hr(),x$=Kl(),Gi=.6931471803691238,Wi=19082149292705877e-26,U$=.41421356237309503,H$=-.2928932188134525,G$=1862645149230957e-24,W$=5551115123125783e-32,V$=9007199254740992,M$=.6666666666666666;function J$(e){var r,t,n,i,s,f,a,o,u,c;if(e<-1||S$(e))return NaN;if(e===-1)return B$;if(e===D$||e===0)return e;if(e<0?n=-e:n=e,c=1,n<U$){if(n<G$)return n<W$?e:e-e*e*.5;e>H$&&(c=0,i=e,t=1)}return c!==0&&(n<V$?(u=1+e,t=Ql(u),c=(t>>20)-jl,c>0?s=1-(u-e):s=e-(u-1),s/=u):(u=e,t=Ql(u),c=(t>>20)-jl,s=0),t&=1048575,t<434334?u=Yl(u,t|1072693248):(c+=1,u=Yl(u,t|1071644672),t=1048576-t>>2),i=u-1),r=.5*i*i,t===0?i===0?(s+=c*Wi,c*Gi+s):(o=r*(1-M$*i),c*Gi-(o-(c*Wi+s)-i)):(f=i/(2+i),a=f*f,o=a*x$(a),c===0?i-(r-f*(r+o)):c*Gi-(r-(f*(r+o)+(c*Wi+s))-i))}e1.exports=J$});var xe=g((cJ,t1)=>{"use strict";var X$=r1();t1.exports=X$});var o1=g((fJ,n1)=>{"use strict";var K$=Math.sqrt;n1.exports=K$});var M=g((lJ,i1)=>{"use strict";var Q$=o1();i1.exports=Q$});var Vi=g((pJ,s1)=>{"use strict";var Y$=.7853981633974483;s1.exports=Y$});var a1=g((vJ,u1)=>{"use strict";function j$(e){var r,t,n;return e===0?.16666666666666713:(e<0?r=-e:r=e,r<=1?(t=-8.198089802484825+e*(19.562619833175948+e*(-16.262479672107002+e*(5.444622390564711+e*(-.6019598008014124+e*.004253011369004428)))),n=-49.18853881490881+e*(139.51056146574857+e*(-147.1791292232726+e*(70.49610280856842+e*(-14.740913729888538+e*1))))):(e=1/e,t=.004253011369004428+e*(-.6019598008014124+e*(5.444622390564711+e*(-16.262479672107002+e*(19.562619833175948+e*-8.198089802484825)))),n=1+e*(-14.740913729888538+e*(70.49610280856842+e*(-147.1791292232726+e*(139.51056146574857+e*-49.18853881490881))))),t/n)}u1.exports=j$});var f1=g((mJ,c1)=>{"use strict";function ek(e){var r,t,n;return e===0?.08333333333333809:(e<0?r=-e:r=e,r<=1?(t=28.536655482610616+e*(-25.56901049652825+e*(6.968710824104713+e*(-.5634242780008963+e*.002967721961301243))),n=342.43986579130785+e*(-383.8770957603691+e*(147.0656354026815+e*(-21.947795316429207+e*1)))):(e=1/e,t=.002967721961301243+e*(-.5634242780008963+e*(6.968710824104713+e*(-25.56901049652825+e*28.536655482610616))),n=1+e*(-21.947795316429207+e*(147.0656354026815+e*(-383.8770957603691+e*342.43986579130785)))),t/n)}c1.exports=ek});var v1=g((dJ,p1)=>{"use strict";var rk=R(),tk=M(),l1=Vi(),nk=a1(),ok=f1(),ik=6123233995736766e-32;function sk(e){var r,t,n,i,s;if(rk(e))return NaN;if(e>0?n=e:(r=!0,n=-e),n>1)return NaN;if(n>.625)t=1-n,i=t*ok(t),t=tk(t+t),s=l1-t,t=t*i-ik,s-=t,s+=l1;else{if(n<1e-8)return e;t=n*n,s=t*nk(t),s=n*s+n}return r?-s:s}p1.exports=sk});var Rn=g((hJ,m1)=>{"use strict";var uk=v1();m1.exports=uk});var h1=g((gJ,d1)=>{"use strict";function ak(e){return Math.abs(e)}d1.exports=ak});var S=g((_J,g1)=>{"use strict";var ck=h1();g1.exports=ck});var y1=g((yJ,_1)=>{"use strict";var fk=Math.ceil;_1.exports=fk});var w1=g((bJ,b1)=>{"use strict";var lk=y1();b1.exports=lk});var P1=g((wJ,q1)=>{"use strict";var pk=ye(),vk=w1();function mk(e){return e<0?vk(e):pk(e)}q1.exports=mk});var Fn=g((qJ,I1)=>{"use strict";var dk=P1();I1.exports=dk});var k1=g((PJ,$1)=>{"use strict";var hk=1023;$1.exports=hk});var O1=g((IJ,A1)=>{"use strict";var gk=-1023;A1.exports=gk});var N1=g(($J,E1)=>{"use strict";var _k=-1074;E1.exports=_k});var T1=g((kJ,z1)=>{"use strict";var yk=ee(),bk=fe();function wk(e){return e===yk||e===bk}z1.exports=wk});var Br=g((AJ,Z1)=>{"use strict";var qk=T1();Z1.exports=qk});var F1=g((OJ,R1)=>{"use strict";var Pk=2147483648;R1.exports=Pk});var gr=g((EJ,L1)=>{"use strict";var Ik=2147483647;L1.exports=Ik});var D1=g((NJ,S1)=>{"use strict";var $k=Sr(),C1,Mi,Ji;$k===!0?(Mi=1,Ji=0):(Mi=0,Ji=1);C1={HIGH:Mi,LOW:Ji};S1.exports=C1});var Xi=g((zJ,H1)=>{"use strict";var kk=Lr(),Ak=Cr(),x1=D1(),U1=new Ak(1),B1=new kk(U1.buffer),Ok=x1.HIGH,Ek=x1.LOW;function Nk(e,r,t,n){return U1[0]=e,r[n]=B1[Ok],r[n+t]=B1[Ek],r}H1.exports=Nk});var W1=g((TJ,G1)=>{"use strict";var zk=Xi();function Tk(e){return zk(e,[0,0],1,0)}G1.exports=Tk});var Ln=g((ZJ,M1)=>{"use strict";var Zk=rr(),V1=W1(),Rk=Xi();Zk(V1,"assign",Rk);M1.exports=V1});var X1=g((RJ,J1)=>{"use strict";var Fk=F1(),Lk=gr(),Ck=Ln(),Sk=_e(),Dk=Lt(),Ki=[0,0];function Bk(e,r){var t,n;return Ck.assign(e,Ki,1,0),t=Ki[0],t&=Lk,n=Sk(r),n&=Fk,t|=n,Dk(t,Ki[1])}J1.exports=Bk});var Cn=g((FJ,K1)=>{"use strict";var xk=X1();K1.exports=xk});var _r=g((LJ,Q1)=>{"use strict";var Uk=22250738585072014e-324;Q1.exports=Uk});var Qi=g((CJ,Y1)=>{"use strict";var Hk=_r(),Gk=Br(),Wk=R(),Vk=S(),Mk=4503599627370496;function Jk(e,r,t,n){return Wk(e)||Gk(e)?(r[n]=e,r[n+t]=0,r):e!==0&&Vk(e)<Hk?(r[n]=e*Mk,r[n+t]=-52,r):(r[n]=e,r[n+t]=0,r)}Y1.exports=Jk});var ep=g((SJ,j1)=>{"use strict";var Xk=Qi();function Kk(e){return Xk(e,[0,0],1,0)}j1.exports=Kk});var np=g((DJ,tp)=>{"use strict";var Qk=rr(),rp=ep(),Yk=Qi();Qk(rp,"assign",Yk);tp.exports=rp});var Ct=g((BJ,op)=>{"use strict";var jk=2146435072;op.exports=jk});var sp=g((xJ,ip)=>{"use strict";var eA=_e(),rA=Ct(),tA=hr();function nA(e){var r=eA(e);return r=(r&rA)>>>20,r-tA|0}ip.exports=nA});var ap=g((UJ,up)=>{"use strict";var oA=sp();up.exports=oA});var fp=g((HJ,cp)=>{"use strict";var iA=ee(),sA=fe(),uA=hr(),aA=k1(),cA=O1(),fA=N1(),lA=R(),pA=Br(),vA=Cn(),mA=np().assign,dA=ap(),hA=Ln(),gA=Lt(),_A=2220446049250313e-31,yA=2148532223,Yi=[0,0],ji=[0,0];function bA(e,r){var t,n;return r===0||e===0||lA(e)||pA(e)?e:(mA(e,Yi,1,0),e=Yi[0],r+=Yi[1],r+=dA(e),r<fA?vA(0,e):r>aA?e<0?sA:iA:(r<=cA?(r+=52,n=_A):n=1,hA.assign(e,ji,1,0),t=ji[0],t&=yA,t|=r+uA<<20,n*gA(t,ji[1])))}cp.exports=bA});var xr=g((GJ,lp)=>{"use strict";var wA=fp();lp.exports=wA});var vp=g((WJ,pp)=>{"use strict";function qA(e){return e===0?.16666666666666602:.16666666666666602+e*(-.0027777777777015593+e*(6613756321437934e-20+e*(-16533902205465252e-22+e*41381367970572385e-24)))}pp.exports=qA});var dp=g((VJ,mp)=>{"use strict";var PA=xr(),IA=vp();function $A(e,r,t){var n,i,s,f;return n=e-r,i=n*n,s=n-i*IA(i),f=1-(r-n*s/(2-s)-e),PA(f,t)}mp.exports=$A});var wp=g((MJ,bp)=>{"use strict";var kA=R(),hp=Fn(),AA=fe(),gp=ee(),OA=dp(),EA=.6931471803691238,NA=19082149292705877e-26,_p=1.4426950408889634,zA=709.782712893384,TA=-745.1332191019411,yp=1/(1<<28),ZA=-yp;function RA(e){var r,t,n;return kA(e)||e===gp?e:e===AA?0:e>zA?gp:e<TA?0:e>ZA&&e<yp?1+e:(e<0?n=hp(_p*e-.5):n=hp(_p*e+.5),r=e-n*EA,t=n*NA,OA(r,t,n))}bp.exports=RA});var H=g((JJ,qp)=>{"use strict";var FA=wp();qp.exports=FA});var Ip=g((XJ,Pp)=>{"use strict";var LA=ye();function CA(e){return LA(e)===e}Pp.exports=CA});var Ur=g((KJ,$p)=>{"use strict";var SA=Ip();$p.exports=SA});var Ap=g((QJ,kp)=>{"use strict";var DA=Ur();function BA(e){return DA(e/2)}kp.exports=BA});var Ep=g((YJ,Op)=>{"use strict";var xA=Ap();Op.exports=xA});var Tp=g((jJ,zp)=>{"use strict";var Np=Ep();function UA(e){return e>0?Np(e-1):Np(e+1)}zp.exports=UA});var Sn=g((eX,Zp)=>{"use strict";var HA=Tp();Zp.exports=HA});var Fp=g((rX,Rp)=>{"use strict";var GA=Sr(),es;GA===!0?es=0:es=1;Rp.exports=es});var Cp=g((tX,Lp)=>{"use strict";var WA=Lr(),VA=Cr(),MA=Fp(),rs=new VA(1),JA=new WA(rs.buffer);function XA(e,r){return rs[0]=e,JA[MA]=r>>>0,rs[0]}Lp.exports=XA});var it=g((nX,Sp)=>{"use strict";var KA=Cp();Sp.exports=KA});var Bp=g((oX,Dp)=>{"use strict";function QA(e){return e|0}Dp.exports=QA});var ts=g((iX,xp)=>{"use strict";var YA=Bp();xp.exports=YA});var Gp=g((sX,Hp)=>{"use strict";var Up=Sn(),jA=Cn(),eO=fe(),Dn=ee();function rO(e,r){return r===eO?Dn:r===Dn?0:r>0?Up(r)?e:0:Up(r)?jA(Dn,e):Dn}Hp.exports=rO});var Vp=g((uX,Wp)=>{"use strict";var tO=gr(),nO=_e(),oO=1072693247,Bn=1e300,xn=1e-300;function iO(e,r){var t,n;return n=nO(e),t=n&tO,t<=oO?r<0?Bn*Bn:xn*xn:r>0?Bn*Bn:xn*xn}Wp.exports=iO});var Xp=g((aX,Jp)=>{"use strict";var sO=S(),Mp=ee();function uO(e,r){return e===-1?(e-e)/(e-e):e===1?1:sO(e)<1==(r===Mp)?0:Mp}Jp.exports=uO});var ns=g((cX,Kp)=>{"use strict";var aO=20;Kp.exports=aO});var Yp=g((fX,Qp)=>{"use strict";function cO(e){return e===0?.5999999999999946:.5999999999999946+e*(.4285714285785502+e*(.33333332981837743+e*(.272728123808534+e*(.23066074577556175+e*.20697501780033842))))}Qp.exports=cO});var tv=g((lX,rv)=>{"use strict";var fO=_e(),Un=it(),jp=ot(),lO=hr(),pO=ns(),vO=Yp(),mO=1048575,ev=1048576,dO=1072693248,hO=536870912,gO=524288,_O=9007199254740992,yO=.9617966939259756,bO=.9617967009544373,wO=-7028461650952758e-24,qO=[1,1.5],PO=[0,.5849624872207642],IO=[0,1350039202129749e-23];function $O(e,r,t){var n,i,s,f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P,I,A;return P=0,t<ev&&(r*=_O,P-=53,t=fO(r)),P+=(t>>pO)-lO|0,I=t&mO|0,t=I|dO|0,I<=235662?A=0:I<767610?A=1:(A=0,P+=1,t-=ev),r=jp(r,t),c=qO[A],w=r-c,q=1/(r+c),i=w*q,f=Un(i,0),n=(t>>1|hO)+gO,n+=A<<18,o=jp(0,n),u=r-(o-c),a=q*(w-f*o-f*u),s=i*i,b=s*s*vO(s),b+=a*(f+i),s=f*f,o=3+s+b,o=Un(o,0),u=b-(o-3-s),w=f*o,q=a*o+u*i,p=w+q,p=Un(p,0),v=q-(p-w),m=bO*p,h=wO*p+v*yO+IO[A],l=PO[A],y=P,_=m+h+l+y,_=Un(_,0),d=h-(_-y-l-m),e[0]=_,e[1]=d,e}rv.exports=$O});var ov=g((pX,nv)=>{"use strict";function kO(e){return e===0?.5:.5+e*(-.3333333333333333+e*.25)}nv.exports=kO});var sv=g((vX,iv)=>{"use strict";var AO=it(),OO=ov(),EO=1.4426950408889634,NO=1.4426950216293335,zO=19259629911266175e-24;function TO(e,r){var t,n,i,s,f,a;return i=r-1,s=i*i*OO(i),f=NO*i,a=i*zO-s*EO,n=f+a,n=AO(n,0),t=a-(n-f),e[0]=n,e[1]=t,e}iv.exports=TO});var av=g((mX,uv)=>{"use strict";var ZO=.6931471805599453;uv.exports=ZO});var os=g((dX,cv)=>{"use strict";var RO=1048575;cv.exports=RO});var lv=g((hX,fv)=>{"use strict";function FO(e){return e===0?.16666666666666602:.16666666666666602+e*(-.0027777777777015593+e*(6613756321437934e-20+e*(-16533902205465252e-22+e*41381367970572385e-24)))}fv.exports=FO});var _v=g((gX,gv)=>{"use strict";var LO=_e(),pv=ot(),CO=it(),SO=ts(),DO=xr(),BO=av(),vv=hr(),mv=gr(),dv=os(),St=ns(),xO=lv(),hv=1048576,UO=1071644672,HO=.6931471824645996,GO=-1904654299957768e-24;function WO(e,r,t){var n,i,s,f,a,o,u,c,l,p,v;return p=e&mv|0,v=(p>>St)-vv|0,l=0,p>UO&&(l=e+(hv>>v+1)>>>0,v=((l&mv)>>St)-vv|0,n=(l&~(dv>>v))>>>0,s=pv(0,n),l=(l&dv|hv)>>St-v>>>0,e<0&&(l=-l),r-=s),s=t+r,s=CO(s,0),a=s*HO,o=(t-(s-r))*BO+s*GO,c=a+o,u=o-(c-a),s=c*c,i=c-s*xO(s),f=c*i/(i-2)-(u+c*u),c=1-(f-c),e=LO(c),e=SO(e),e+=l<<St>>>0,e>>St<=0?c=DO(c,l):c=pv(c,e),c}gv.exports=WO});var Ev=g((_X,Ov)=>{"use strict";var yv=R(),bv=Sn(),wv=Br(),VO=Ur(),qv=M(),MO=S(),is=Ln(),JO=it(),Pv=ts(),XO=fe(),KO=ee(),ss=gr(),QO=Gp(),YO=Vp(),jO=Xp(),eE=tv(),rE=sv(),tE=_v(),nE=1072693247,oE=1105199104,iE=1139802112,Iv=1083179008,sE=1072693248,uE=1083231232,aE=3230714880,$v=31,yr=1e300,br=1e-300,cE=8008566259537294e-32,nr=[0,0],kv=[0,0];function Av(e,r){var t,n,i,s,f,a,o,u,c,l,p,v,m,h,_,d;if(yv(e)||yv(r))return NaN;if(is.assign(r,nr,1,0),a=nr[0],o=nr[1],o===0){if(r===0)return 1;if(r===1)return e;if(r===-1)return 1/e;if(r===.5)return qv(e);if(r===-.5)return 1/qv(e);if(r===2)return e*e;if(r===3)return e*e*e;if(r===4)return e*=e,e*e;if(wv(r))return jO(e,r)}if(is.assign(e,nr,1,0),s=nr[0],f=nr[1],f===0){if(s===0)return QO(e,r);if(e===1)return 1;if(e===-1&&bv(r))return-1;if(wv(e))return e===XO?Av(-0,-r):r<0?0:KO}if(e<0&&VO(r)===!1)return(e-e)/(e-e);if(i=MO(e),t=s&ss|0,n=a&ss|0,u=s>>>$v|0,c=a>>>$v|0,u&&bv(r)?u=-1:u=1,n>oE){if(n>iE)return YO(e,r);if(t<nE)return c===1?u*yr*yr:u*br*br;if(t>sE)return c===0?u*yr*yr:u*br*br;m=rE(kv,i)}else m=eE(kv,i,t);if(l=JO(r,0),v=(r-l)*m[0]+r*m[1],p=l*m[0],h=v+p,is.assign(h,nr,1,0),_=Pv(nr[0]),d=Pv(nr[1]),_>=Iv){if((_-Iv|d)!==0||v+cE>h-p)return u*yr*yr}else if((_&ss)>=uE&&((_-aE|d)!==0||v<=h-p))return u*br*br;return h=tE(_,p,v),u*h}Ov.exports=Av});var re=g((yX,Nv)=>{"use strict";var fE=Ev();Nv.exports=fE});var Hr=g((bX,zv)=>{"use strict";var lE=2.718281828459045;zv.exports=lE});var Ze=g((wX,Tv)=>{"use strict";var pE=2220446049250313e-31;Tv.exports=pE});var Rv=g((qX,Zv)=>{"use strict";function vE(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=709811.662581658+e*(679979.8474157227+e*(293136.7857211597+e*(74887.54032914672+e*(12555.290582413863+e*(1443.4299244417066+e*(115.24194596137347+e*(6.309239205732627+e*(.22668404630224365+e*(.004826466289237662+e*4624429436045379e-20))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=4624429436045379e-20+e*(.004826466289237662+e*(.22668404630224365+e*(6.309239205732627+e*(115.24194596137347+e*(1443.4299244417066+e*(12555.290582413863+e*(74887.54032914672+e*(293136.7857211597+e*(679979.8474157227+e*709811.662581658))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}Zv.exports=vE});var Cv=g((PX,Lv)=>{"use strict";var Fv=R(),mE=xe(),dE=M(),hE=S(),gE=H(),us=re(),_E=Hr(),as=Ze(),cs=Rv(),fs=10.900511;function yE(e,r){var t,n,i,s,f,a,o;return Fv(e)||Fv(r)?NaN:e<0||r<0?NaN:r===1?1/e:e===1?1/r:(o=e+r,o<as?(f=o/e,f/=r,f):o===e&&r<as?1/r:o===r&&e<as?1/e:(e<r&&(a=r,r=e,e=a),n=e+fs-.5,i=r+fs-.5,s=o+fs-.5,f=cs(e)*(cs(r)/cs(o)),t=e-.5-r,hE(r*t)<s*100&&e>100?f*=gE(t*mE(-r/s)):f*=us(n/s,t),s>1e10?f*=us(n/s*(i/s),r):f*=us(n*i/(s*s),r),f*=dE(_E/i),f))}Lv.exports=yE});var ls=g((IX,Sv)=>{"use strict";var bE=Cv();Sv.exports=bE});var Bv=g(($X,Dv)=>{"use strict";var wE=ee();function qE(e){return e===0&&1/e===wE}Dv.exports=qE});var Uv=g((kX,xv)=>{"use strict";var PE=Bv();xv.exports=PE});var Wv=g((AX,Gv)=>{"use strict";var IE=Uv(),Hv=R(),ps=ee();function $E(e,r){return Hv(e)||Hv(r)?NaN:e===ps||r===ps?ps:e===r&&e===0?IE(e)?e:r:e>r?e:r}Gv.exports=$E});var or=g((OX,Vv)=>{"use strict";var kE=Wv();Vv.exports=kE});var Jv=g((EX,Mv)=>{"use strict";var AE=fe();function OE(e){return e===0&&1/e===AE}Mv.exports=OE});var vs=g((NX,Xv)=>{"use strict";var EE=Jv();Xv.exports=EE});var Yv=g((zX,Qv)=>{"use strict";var NE=vs(),Kv=R(),ms=fe();function zE(e,r){return Kv(e)||Kv(r)?NaN:e===ms||r===ms?ms:e===r&&e===0?NE(e)?e:r:e<r?e:r}Qv.exports=zE});var Ue=g((TX,jv)=>{"use strict";var TE=Yv();jv.exports=TE});var wr=g((ZX,e2)=>{"use strict";var ZE=17976931348623157e292;e2.exports=ZE});var ds=g((RX,r2)=>{"use strict";var RE=2147483647;r2.exports=RE});var Hn=g((FX,t2)=>{"use strict";var FE=1.5707963267948966;t2.exports=FE});var ir=g((LX,n2)=>{"use strict";var LE=3.141592653589793;n2.exports=LE});var i2=g((CX,o2)=>{"use strict";function CE(e){return e===0?.0416666666666666:.0416666666666666+e*(-.001388888888887411+e*2480158728947673e-20)}o2.exports=CE});var u2=g((SX,s2)=>{"use strict";function SE(e){return e===0?-27557314351390663e-23:-27557314351390663e-23+e*(2087572321298175e-24+e*-11359647557788195e-27)}s2.exports=SE});var c2=g((DX,a2)=>{"use strict";var DE=i2(),BE=u2();function xE(e,r){var t,n,i,s;return s=e*e,i=s*s,n=s*DE(s),n+=i*i*BE(s),t=.5*s,i=1-t,i+(1-i-t+(s*n-e*r))}a2.exports=xE});var hs=g((BX,f2)=>{"use strict";var UE=c2();f2.exports=UE});var v2=g((xX,p2)=>{"use strict";var l2=-.16666666666666632,HE=.00833333333332249,GE=-.0001984126982985795,WE=27557313707070068e-22,VE=-25050760253406863e-24,ME=158969099521155e-24;function JE(e,r){var t,n,i,s;return s=e*e,i=s*s,t=HE+s*(GE+s*WE)+s*i*(VE+s*ME),n=s*e,r===0?e+n*(l2+s*t):e-(s*(.5*r-n*t)-r-n*l2)}p2.exports=JE});var gs=g((UX,m2)=>{"use strict";var XE=v2();m2.exports=XE});var h2=g((HX,d2)=>{"use strict";var KE=Sr(),_s;KE===!0?_s=0:_s=1;d2.exports=_s});var y2=g((GX,_2)=>{"use strict";var QE=Lr(),YE=Cr(),jE=h2(),g2=new YE(1),eN=new QE(g2.buffer);function rN(e){return g2[0]=e,eN[jE]}_2.exports=rN});var w2=g((WX,b2)=>{"use strict";var tN=y2();b2.exports=tN});var P2=g((VX,q2)=>{"use strict";function nN(e,r){var t,n;for(t=[],n=0;n<r;n++)t.push(e);return t}q2.exports=nN});var $2=g((MX,I2)=>{"use strict";var oN=P2();I2.exports=oN});var A2=g((JX,k2)=>{"use strict";var iN=$2();function sN(e){return iN(0,e)}k2.exports=sN});var E2=g((XX,O2)=>{"use strict";var uN=A2();O2.exports=uN});var R2=g((KX,Z2)=>{"use strict";var aN=ye(),Gn=xr(),Mn=E2(),z2=[10680707,7228996,1387004,2578385,16069853,12639074,9804092,4427841,16666979,11263675,12935607,2387514,4345298,14681673,3074569,13734428,16653803,1880361,10960616,8533493,3062596,8710556,7349940,6258241,3772886,3769171,3798172,8675211,12450088,3874808,9961438,366607,15675153,9132554,7151469,3571407,2607881,12013382,4155038,6285869,7677882,13102053,15825725,473591,9065106,15363067,6271263,9264392,5636912,4652155,7056368,13614112,10155062,1944035,9527646,15080200,6658437,6231200,6832269,16767104,5075751,3212806,1398474,7579849,6349435,12618859],cN=[1.570796251296997,7549789415861596e-23,5390302529957765e-30,3282003415807913e-37,1270655753080676e-44,12293330898111133e-52,27337005381646456e-60,21674168387780482e-67],ys=16777216,bs=5960464477539063e-23,Wn=Mn(20),N2=Mn(20),Vn=Mn(20),ae=Mn(20);function T2(e,r,t,n,i,s,f,a,o){var u,c,l,p,v,m,h,_,d;for(p=s,d=n[t],_=t,v=0;_>0;v++)c=bs*d|0,ae[v]=d-ys*c|0,d=n[_-1]+c,_-=1;if(d=Gn(d,i),d-=8*aN(d*.125),h=d|0,d-=h,l=0,i>0?(v=ae[t-1]>>24-i,h+=v,ae[t-1]-=v<<24-i,l=ae[t-1]>>23-i):i===0?l=ae[t-1]>>23:d>=.5&&(l=2),l>0){for(h+=1,u=0,v=0;v<t;v++)_=ae[v],u===0?_!==0&&(u=1,ae[v]=16777216-_):ae[v]=16777215-_;if(i>0)switch(i){case 1:ae[t-1]&=8388607;break;case 2:ae[t-1]&=4194303;break}l===2&&(d=1-d,u!==0&&(d-=Gn(1,i)))}if(d===0){for(_=0,v=t-1;v>=s;v--)_|=ae[v];if(_===0){for(m=1;ae[s-m]===0;m++);for(v=t+1;v<=t+m;v++){for(o[a+v]=z2[f+v],c=0,_=0;_<=a;_++)c+=e[_]*o[a+(v-_)];n[v]=c}return t+=m,T2(e,r,t,n,i,s,f,a,o)}for(t-=1,i-=24;ae[t]===0;)t-=1,i-=24}else d=Gn(d,-i),d>=ys?(c=bs*d|0,ae[t]=d-ys*c|0,t+=1,i+=24,ae[t]=c):ae[t]=d|0;for(c=Gn(1,i),v=t;v>=0;v--)n[v]=c*ae[v],c*=bs;for(v=t;v>=0;v--){for(c=0,m=0;m<=p&&m<=t-v;m++)c+=cN[m]*n[v+m];Vn[t-v]=c}for(c=0,v=t;v>=0;v--)c+=Vn[v];for(l===0?r[0]=c:r[0]=-c,c=Vn[0]-c,v=1;v<=t;v++)c+=Vn[v];return l===0?r[1]=c:r[1]=-c,h&7}function fN(e,r,t,n){var i,s,f,a,o,u,c,l,p;for(s=4,a=n-1,f=(t-3)/24|0,f<0&&(f=0),u=t-24*(f+1),l=f-a,p=a+s,c=0;c<=p;c++)l<0?Wn[c]=0:Wn[c]=z2[l],l+=1;for(c=0;c<=s;c++){for(i=0,l=0;l<=a;l++)i+=e[l]*Wn[a+(c-l)];N2[c]=i}return o=s,T2(e,r,o,N2,u,s,f,a,Wn)}Z2.exports=fN});var L2=g((QX,F2)=>{"use strict";var lN=Math.round;F2.exports=lN});var ws=g((YX,C2)=>{"use strict";var pN=L2();C2.exports=pN});var x2=g((jX,B2)=>{"use strict";var vN=ws(),S2=_e(),mN=.6366197723675814,dN=1.5707963267341256,hN=6077100506506192e-26,gN=6077100506303966e-26,_N=20222662487959506e-37,yN=20222662487111665e-37,bN=84784276603689e-45,D2=2047;function wN(e,r,t){var n,i,s,f,a,o,u;return i=vN(e*mN),f=e-i*dN,a=i*hN,u=r>>20|0,t[0]=f-a,n=S2(t[0]),o=u-(n>>20&D2),o>16&&(s=f,a=i*gN,f=s-a,a=i*_N-(s-f-a),t[0]=f-a,n=S2(t[0]),o=u-(n>>20&D2),o>49&&(s=f,a=i*yN,f=s-a,a=i*bN-(s-f-a),t[0]=f-a)),t[1]=f-t[0]-a,i}B2.exports=wN});var H2=g((eK,U2)=>{"use strict";var qN=gr(),PN=Ct(),IN=os(),$N=_e(),kN=w2(),AN=Lt(),ON=R2(),Jn=x2(),EN=0,NN=16777216,qr=1.5707963267341256,Gr=6077100506506192e-26,Xn=2*Gr,Kn=3*Gr,Qn=4*Gr,zN=598523,TN=1072243195,ZN=1073928572,RN=1074752122,FN=1074977148,LN=1075183036,CN=1075388923,SN=1075594811,DN=1094263291,Dt=[0,0,0],Bt=[0,0];function BN(e,r){var t,n,i,s,f,a,o,u;if(i=$N(e)|0,s=i&qN|0,s<=TN)return r[0]=e,r[1]=0,0;if(s<=RN)return(s&IN)===zN?Jn(e,s,r):s<=ZN?i>0?(u=e-qr,r[0]=u-Gr,r[1]=u-r[0]-Gr,1):(u=e+qr,r[0]=u+Gr,r[1]=u-r[0]+Gr,-1):i>0?(u=e-2*qr,r[0]=u-Xn,r[1]=u-r[0]-Xn,2):(u=e+2*qr,r[0]=u+Xn,r[1]=u-r[0]+Xn,-2);if(s<=SN)return s<=LN?s===FN?Jn(e,s,r):i>0?(u=e-3*qr,r[0]=u-Kn,r[1]=u-r[0]-Kn,3):(u=e+3*qr,r[0]=u+Kn,r[1]=u-r[0]+Kn,-3):s===CN?Jn(e,s,r):i>0?(u=e-4*qr,r[0]=u-Qn,r[1]=u-r[0]-Qn,4):(u=e+4*qr,r[0]=u+Qn,r[1]=u-r[0]+Qn,-4);if(s<DN)return Jn(e,s,r);if(s>=PN)return r[0]=NaN,r[1]=NaN,0;for(t=kN(e),n=(s>>20)-1046,u=AN(s-(n<<20|0),t),a=0;a<2;a++)Dt[a]=u|0,u=(u-Dt[a])*NN;for(Dt[2]=u,f=3;Dt[f-1]===EN;)f-=1;return o=ON(Dt,Bt,n,f,1),i<0?(r[0]=-Bt[0],r[1]=-Bt[1],-o):(r[0]=Bt[0],r[1]=Bt[1],o)}U2.exports=BN});var qs=g((rK,G2)=>{"use strict";var xN=H2();G2.exports=xN});var M2=g((tK,V2)=>{"use strict";var UN=gr(),HN=Ct(),GN=_e(),W2=hs(),Ps=gs(),WN=qs(),VN=1072243195,MN=1045430272,sr=[0,0];function JN(e){var r,t;if(r=GN(e),r&=UN,r<=VN)return r<MN?e:Ps(e,0);if(r>=HN)return NaN;switch(t=WN(e,sr),t&3){case 0:return Ps(sr[0],sr[1]);case 1:return W2(sr[0],sr[1]);case 2:return-Ps(sr[0],sr[1]);default:return-W2(sr[0],sr[1])}}V2.exports=JN});var st=g((nK,J2)=>{"use strict";var XN=M2();J2.exports=XN});var xt=g((oK,X2)=>{"use strict";var KN=2.5066282746310007;X2.exports=KN});var Q2=g((iK,K2)=>{"use strict";function QN(e){return e===0?.08333333333334822:.08333333333334822+e*(.0034722222160545866+e*(-.0026813261780578124+e*(-.00022954996161337813+e*.0007873113957930937)))}K2.exports=QN});var em=g((sK,j2)=>{"use strict";var YN=xt(),Y2=re(),jN=H(),ez=Q2(),rz=143.01608;function tz(e){var r,t,n;return r=1/e,r=1+r*ez(r),t=jN(e),e>rz?(n=Y2(e,.5*e-.25),t=n*(n/t)):t=Y2(e,e-.5)/t,YN*t*r}j2.exports=tz});var tm=g((uK,rm)=>{"use strict";var nz=.5772156649015329;rm.exports=nz});var om=g((aK,nm)=>{"use strict";var oz=tm();function iz(e,r){return r/((1+oz*e)*e)}nm.exports=iz});var sm=g((cK,im)=>{"use strict";function sz(e){var r,t,n;return e===0?1:(e<0?r=-e:r=e,r<=1?(t=1+e*(.4942148268014971+e*(.20744822764843598+e*(.04763678004571372+e*(.010421379756176158+e*(.0011913514700658638+e*(.00016011952247675185+e*0)))))),n=1+e*(.0714304917030273+e*(-.23459179571824335+e*(.035823639860549865+e*(.011813978522206043+e*(-.004456419138517973+e*(.0005396055804933034+e*-23158187332412014e-21))))))):(e=1/e,t=0+e*(.00016011952247675185+e*(.0011913514700658638+e*(.010421379756176158+e*(.04763678004571372+e*(.20744822764843598+e*(.4942148268014971+e*1)))))),n=-23158187332412014e-21+e*(.0005396055804933034+e*(-.004456419138517973+e*(.011813978522206043+e*(.035823639860549865+e*(-.23459179571824335+e*(.0714304917030273+e*1))))))),t/n)}im.exports=sz});var mm=g((fK,vm)=>{"use strict";var uz=R(),az=Ur(),cz=vs(),um=S(),fz=ye(),lz=st(),am=ee(),cm=fe(),fm=ir(),lm=em(),pm=om(),pz=sm();function vz(e){var r,t,n,i;if(az(e)&&e<0||e===cm||uz(e))return NaN;if(e===0)return cz(e)?cm:am;if(e>171.61447887182297)return am;if(e<-170.5674972726612)return 0;if(t=um(e),t>33)return e>=0?lm(e):(n=fz(t),(n&1)===0?r=-1:r=1,i=t-n,i>.5&&(n+=1,i=t-n),i=t*lz(fm*i),r*fm/(um(i)*lm(t)));for(i=1;e>=3;)e-=1,i*=e;for(;e<0;){if(e>-1e-9)return pm(e,i);i/=e,e+=1}for(;e<2;){if(e<1e-9)return pm(e,i);i/=e,e+=1}return e===2?i:(e-=2,i*pz(e))}vm.exports=vz});var He=g((lK,dm)=>{"use strict";var mz=mm();dm.exports=mz});var Ut=g((pK,hm)=>{"use strict";var dz=170;hm.exports=dz});var gm=g((vK,hz)=>{hz.exports=[1,1,2,6,24,120,720,5040,40320,362880,3628800,39916800,479001600,6227020800,87178291200,1307674368e3,20922789888e3,355687428096e3,6402373705728e3,121645100408832e3,243290200817664e4,5109094217170944e4,11240007277776077e5,2585201673888498e7,6204484017332394e8,15511210043330986e9,40329146112660565e10,10888869450418352e12,30488834461171387e13,8841761993739702e15,26525285981219107e16,8222838654177922e18,2631308369336935e20,8683317618811886e21,29523279903960416e22,10333147966386145e24,37199332678990125e25,13763753091226346e27,5230226174666011e29,20397882081197444e30,8159152832478977e32,3345252661316381e34,140500611775288e37,6041526306337383e37,2658271574788449e39,11962222086548019e40,5502622159812089e42,25862324151116818e43,12413915592536073e45,6082818640342675e47,30414093201713376e48,15511187532873822e50,8065817517094388e52,42748832840600255e53,2308436973392414e56,12696403353658276e57,7109985878048635e59,40526919504877214e60,23505613312828785e62,13868311854568984e64,832098711274139e67,5075802138772248e68,3146997326038794e70,198260831540444e73,12688693218588417e73,8247650592082472e75,5443449390774431e77,3647111091818868e79,24800355424368305e80,1711224524281413e83,11978571669969892e84,8504785885678623e86,61234458376886085e87,44701154615126844e89,3307885441519386e92,248091408113954e95,18854947016660504e95,14518309202828587e97,11324281178206297e99,8946182130782976e101,7156945704626381e103,5797126020747368e105,4753643337012842e107,3945523969720659e109,3314240134565353e111,281710411438055e114,24227095383672734e114,2107757298379528e117,18548264225739844e118,1650795516090846e121,14857159644817615e122,1352001527678403e125,12438414054641308e126,11567725070816416e128,1087366156656743e131,1032997848823906e133,9916779348709496e134,9619275968248212e136,9426890448883248e138,9332621544394415e140,9332621544394415e142,942594775983836e145,9614466715035127e146,990290071648618e149,10299016745145628e150,1081396758240291e153,11462805637347084e154,1226520203196138e157,1324641819451829e159,14438595832024937e160,1588245541522743e163,17629525510902446e164,1974506857221074e167,22311927486598138e168,25435597334721877e170,2925093693493016e173,3393108684451898e175,3969937160808721e177,4684525849754291e179,5574585761207606e181,6689502913449127e183,8094298525273444e185,9875044200833601e187,1214630436702533e190,1506141741511141e192,1882677176888926e194,2372173242880047e196,30126600184576594e197,3856204823625804e200,4974504222477287e202,6466855489220474e204,847158069087882e207,11182486511960043e208,14872707060906857e210,19929427461615188e212,26904727073180504e214,3659042881952549e217,5012888748274992e219,6917786472619489e221,9615723196941089e223,13462012475717526e225,1898143759076171e228,2695364137888163e230,3854370717180073e232,55502938327393044e233,8047926057471992e236,11749972043909107e238,1727245890454639e241,25563239178728654e242,380892263763057e246,5713383956445855e247,862720977423324e250,13113358856834524e251,20063439050956823e253,30897696138473508e255,4789142901463394e258,7471062926282894e260,11729568794264145e262,1853271869493735e265,29467022724950384e266,47147236359920616e268,7590705053947219e271,12296942187394494e273,20044015765453026e275,3287218585534296e278,5423910666131589e280,9003691705778438e282,1503616514864999e285,25260757449731984e286,4269068009004705e289,7257415615307999e291]});var ym=g((mK,_m)=>{"use strict";var gz=R(),_z=Ur(),yz=He(),bz=ee(),wz=Ut(),qz=gm();function Pz(e){return gz(e)?NaN:_z(e)?e<0?NaN:e<=wz?qz[e]:bz:yz(e+1)}_m.exports=Pz});var Is=g((dK,bm)=>{"use strict";var Iz=ym();bm.exports=Iz});var qm=g((hK,wm)=>{"use strict";function $z(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=3847467039331777e-5+e*(3685766504351951e-5+e*(1588920245372942e-5+e*(4059208354298835e-6+e*(6805476611834733e-7+e*(7823975500312005e-8+e*(6246580776401795e-9+e*(341986.3488721347+e*(12287.194511824551+e*(261.61404416416684+e*2.5066282746310007))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=2.5066282746310007+e*(261.61404416416684+e*(12287.194511824551+e*(341986.3488721347+e*(6246580776401795e-9+e*(7823975500312005e-8+e*(6805476611834733e-7+e*(4059208354298835e-6+e*(1588920245372942e-5+e*(3685766504351951e-5+e*3847467039331777e-5))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}wm.exports=$z});var Im=g((gK,Pm)=>{"use strict";var kz=qm();Pm.exports=kz});var km=g((_K,$m)=>{"use strict";var Az=Im();$m.exports=Az});var ut=g((yK,Am)=>{"use strict";var Oz=10.900511;Am.exports=Oz});var Lm=g((bK,Fm)=>{"use strict";var Om=km(),Ez=He(),Nz=xe(),Em=S(),Nm=H(),zm=re(),Tm=Ze(),zz=Hr(),Tz=ut(),Zm=Ut(),Zz=4269068009004705e289;function Rm(e,r){var t,n,i;return e<Tm?r>=Zm?(n=Rm(r,Zm-r),n*=e,n*=Zz,1/n):1/(e*Ez(e+r)):(i=e+Tz-.5,e+r===e?Em(r/i)<Tm?t=Nm(-r):t=1:(Em(r)<10?t=Nm((.5-e)*Nz(r/i)):t=zm(i/(i+r),e-.5),t*=Om(e)/Om(e+r)),t*=zm(zz/(i+r),r),t)}Fm.exports=Rm});var Um=g((wK,xm)=>{"use strict";var Rz=S(),Cm=ye(),Sm=He(),Dm=Is(),Bm=Ut(),Fz=Lm();function Lz(e,r){var t,n,i;if(e<=0||e+r<=0)return Sm(e)/Sm(e+r);if(n=Cm(r),n===r){if(i=Cm(e),i===e&&e<=Bm&&e+r<=Bm)return Dm(i-1)/Dm(n+i-1);if(Rz(r)<20){if(r===0)return 1;if(r<0){for(e-=1,t=e,r+=1;r!==0;)e-=1,t*=e,r+=1;return t}for(t=1/e,r-=1;r!==0;)e+=1,t/=e,r-=1;return t}}return Fz(e,r)}xm.exports=Lz});var Yn=g((qK,Hm)=>{"use strict";var Cz=Um();Hm.exports=Cz});var Wm=g((PK,Gm)=>{"use strict";function Sz(e){return e===0?.3999999999940942:.3999999999940942+e*(.22222198432149784+e*.15313837699209373)}Gm.exports=Sz});var Mm=g((IK,Vm)=>{"use strict";function Dz(e){return e===0?.6666666666666735:.6666666666666735+e*(.2857142874366239+e*(.1818357216161805+e*.14798198605116586))}Vm.exports=Dz});var Qm=g(($K,Km)=>{"use strict";var Jm=_e(),Bz=ot(),xz=R(),Uz=hr(),Hz=fe(),Gz=Wm(),Wz=Mm(),jn=.6931471803691238,eo=19082149292705877e-26,Vz=0x40000000000000,Mz=.3333333333333333,Xm=1048575,Jz=2146435072,Xz=1048576,Kz=1072693248;function Qz(e){var r,t,n,i,s,f,a,o,u,c,l,p;return e===0?Hz:xz(e)||e<0?NaN:(t=Jm(e),s=0,t<Xz&&(s-=54,e*=Vz,t=Jm(e)),t>=Jz?e+e:(s+=(t>>20)-Uz|0,t&=Xm,o=t+614244&1048576|0,e=Bz(e,t|o^Kz),s+=o>>20|0,a=e-1,(Xm&2+t)<3?a===0?s===0?0:s*jn+s*eo:(f=a*a*(.5-Mz*a),s===0?a-f:s*jn-(f-s*eo-a)):(c=a/(2+a),p=c*c,o=t-398458|0,l=p*p,u=440401-t|0,i=l*Gz(l),n=p*Wz(l),o|=u,f=n+i,o>0?(r=.5*a*a,s===0?a-(r-c*(r+f)):s*jn-(r-(c*(r+f)+s*eo)-a)):s===0?a-c*(a-f):s*jn-(c*(a-f)-s*eo-a))))}Km.exports=Qz});var x=g((kK,Ym)=>{"use strict";var Yz=Qm();Ym.exports=Yz});var rd=g((AK,ed)=>{"use strict";var jz=_e(),$s=hs(),jm=gs(),eT=qs(),rT=gr(),tT=Ct(),ur=[0,0],nT=1072243195,oT=1044381696;function iT(e){var r,t;if(r=jz(e),r&=rT,r<=nT)return r<oT?1:$s(e,0);if(r>=tT)return NaN;switch(t=eT(e,ur),t&3){case 0:return $s(ur[0],ur[1]);case 1:return-jm(ur[0],ur[1]);case 2:return-$s(ur[0],ur[1]);default:return jm(ur[0],ur[1])}}ed.exports=iT});var ro=g((OK,td)=>{"use strict";var sT=rd();td.exports=sT});var id=g((EK,od)=>{"use strict";var uT=R(),aT=Br(),nd=ro(),ks=st(),cT=S(),Ht=Cn(),Gt=ir();function fT(e){var r,t;return uT(e)?NaN:aT(e)?NaN:(t=e%2,r=cT(t),r===0||r===1?Ht(0,t):r<.25?ks(Gt*t):r<.75?(r=.5-r,Ht(nd(Gt*r),t)):r<1.25?(t=Ht(1,t)-t,ks(Gt*t)):r<1.75?(r-=1.5,-Ht(nd(Gt*r),t)):(t-=Ht(2,t),ks(Gt*t)))}od.exports=fT});var ud=g((NK,sd)=>{"use strict";var lT=id();sd.exports=lT});var cd=g((zK,ad)=>{"use strict";function pT(e){return e===0?.06735230105312927:.06735230105312927+e*(.007385550860814029+e*(.0011927076318336207+e*(.00022086279071390839+e*25214456545125733e-21)))}ad.exports=pT});var ld=g((TK,fd)=>{"use strict";function vT(e){return e===0?.020580808432516733:.020580808432516733+e*(.0028905138367341563+e*(.0005100697921535113+e*(.00010801156724758394+e*44864094961891516e-21)))}fd.exports=vT});var vd=g((ZK,pd)=>{"use strict";function mT(e){return e===0?1.3920053346762105:1.3920053346762105+e*(.7219355475671381+e*(.17193386563280308+e*(.01864591917156529+e*(.0007779424963818936+e*7326684307446256e-21))))}pd.exports=mT});var dd=g((RK,md)=>{"use strict";function dT(e){return e===0?.21498241596060885:.21498241596060885+e*(.325778796408931+e*(.14635047265246445+e*(.02664227030336386+e*(.0018402845140733772+e*3194753265841009e-20))))}md.exports=dT});var gd=g((FK,hd)=>{"use strict";function hT(e){return e===0?-.032788541075985965:-.032788541075985965+e*(.006100538702462913+e*(-.0014034646998923284+e*.00031563207090362595))}hd.exports=hT});var yd=g((LK,_d)=>{"use strict";function gT(e){return e===0?.01797067508118204:.01797067508118204+e*(-.0036845201678113826+e*(.000881081882437654+e*-.00031275416837512086))}_d.exports=gT});var wd=g((CK,bd)=>{"use strict";function _T(e){return e===0?-.010314224129834144:-.010314224129834144+e*(.0022596478090061247+e*(-.0005385953053567405+e*.0003355291926355191))}bd.exports=_T});var Pd=g((SK,qd)=>{"use strict";function yT(e){return e===0?.6328270640250934:.6328270640250934+e*(1.4549225013723477+e*(.9777175279633727+e*(.22896372806469245+e*.013381091853678766)))}qd.exports=yT});var $d=g((DK,Id)=>{"use strict";function bT(e){return e===0?2.4559779371304113:2.4559779371304113+e*(2.128489763798934+e*(.7692851504566728+e*(.10422264559336913+e*.003217092422824239)))}Id.exports=bT});var Ad=g((BK,kd)=>{"use strict";function wT(e){return e===0?.08333333333333297:.08333333333333297+e*(-.0027777777772877554+e*(.0007936505586430196+e*(-.00059518755745034+e*(.0008363399189962821+e*-.0016309293409657527))))}kd.exports=wT});var Nd=g((xK,Ed)=>{"use strict";var qT=R(),PT=Br(),IT=S(),at=x(),$T=Fn(),kT=ud(),AT=ir(),As=ee(),OT=cd(),ET=ld(),NT=vd(),zT=dd(),TT=gd(),ZT=yd(),RT=wd(),FT=Pd(),LT=$d(),CT=Ad(),ST=.07721566490153287,DT=.3224670334241136,BT=1,xT=-.07721566490153287,UT=.48383612272381005,HT=-.1475877229945939,GT=.06462494023913339,WT=-.07721566490153287,VT=1,MT=.4189385332046727,to=1.4616321449683622,JT=4503599627370496,XT=72057594037927940,KT=13877787807814457e-33,Od=1.4616321449683622,QT=-.12148629053584961,YT=-3638676997039505e-33;function jT(e){var r,t,n,i,s,f,a,o,u,c,l,p,v;if(qT(e)||PT(e))return e;if(e===0)return As;if(e<0?(r=!0,e=-e):r=!1,e<KT)return-at(e);if(r){if(e>=JT||(u=kT(e),u===0))return As;t=at(AT/IT(u*e))}if(e===1||e===2)return 0;if(e<2)switch(e<=.9?(v=-at(e),e>=to-1+.27?(l=1-e,n=0):e>=to-1-.27?(l=e-(Od-1),n=1):(l=e,n=2)):(v=0,e>=to+.27?(l=2-e,n=0):e>=to-.27?(l=e-Od,n=1):(l=e-1,n=2)),n){case 0:p=l*l,f=ST+p*OT(p),s=p*(DT+p*ET(p)),a=l*f+s,v+=a-.5*l;break;case 1:p=l*l,c=p*l,f=UT+c*TT(c),s=HT+c*ZT(c),i=GT+c*RT(c),a=p*f-(YT-c*(s+l*i)),v+=QT+a;break;case 2:f=l*(WT+l*FT(l)),s=VT+l*LT(l),v+=-.5*l+f/s;break}else if(e<8)switch(n=$T(e),l=e-n,a=l*(xT+l*zT(l)),o=BT+l*NT(l),v=.5*l+a/o,p=1,n){case 7:p*=l+6;case 6:p*=l+5;case 5:p*=l+4;case 4:p*=l+3;case 3:p*=l+2,v+=at(p)}else e<XT?(u=at(e),p=1/e,l=p*p,c=MT+p*CT(l),v=(e-.5)*(u-1)+c):v=e*(at(e)-1);return r&&(v=t-v),v}Ed.exports=jT});var Wr=g((UK,zd)=>{"use strict";var eZ=Nd();zd.exports=eZ});var ar=g((HK,Td)=>{"use strict";var rZ=709.782712893384;Td.exports=rZ});var Rd=g((GK,Zd)=>{"use strict";var tZ=14901161193847656e-24;Zd.exports=tZ});var Ld=g((WK,Fd)=>{"use strict";var nZ=eval;Fd.exports=nZ});var Sd=g((VK,Cd)=>{"use strict";var oZ=Ld();function iZ(){var e;try{oZ('"use strict"; (function* () {})'),e=!0}catch{e=!1}return e}Cd.exports=iZ});var Os=g((MK,Dd)=>{"use strict";var sZ=Sd();Dd.exports=sZ});var xd=g((JK,Bd)=>{"use strict";var no=S(),uZ=Ze(),aZ=1e6;function cZ(e,r){var t,n,i,s,f,a;if(a={},arguments.length>1&&(a=r),n=a.tolerance||uZ,s=a.maxTerms||aZ,f=a.initialValue||0,t=typeof e.next=="function",t===!0){for(i of e)if(f+=i,no(n*f)>=no(i)||--s===0)break}else do i=e(),f+=i;while(no(n*f)<no(i)&&--s);return f}Bd.exports=cZ});var Gd=g((XK,Hd)=>{"use strict";var Ud=S(),fZ=Ze(),lZ=1e6;function pZ(e,r){var t,n,i,s,f;f={},arguments.length>1&&(f=r),t=f.tolerance||fZ,i=f.maxTerms||lZ,s=f.initialValue||0;do n=e(),s+=n;while(Ud(t*s)<Ud(n)&&--i);return s}Hd.exports=pZ});var ct=g((KK,Wd)=>{"use strict";var vZ=Os(),mZ=xd(),dZ=Gd(),Es;vZ()?Es=mZ:Es=dZ;Wd.exports=Es});var Md=g((QK,Vd)=>{"use strict";function hZ(e,r){var t=1,n=e,i=r;return s;function s(){var f=t;return t*=n/i,n-=1,f}}Vd.exports=hZ});var Xd=g((YK,Jd)=>{"use strict";var gZ=ct(),_Z=Md();function yZ(e,r){var t,n;return n=_Z(e,r),t=gZ(n),t}Jd.exports=yZ});var Qd=g((jK,Kd)=>{"use strict";var bZ=H();function wZ(e,r){var t,n,i,s;if(i=bZ(-r),n=i,n!==0)for(t=n,s=1;s<e;++s)t/=s,t*=r,n+=t;return n}Kd.exports=wZ});var jd=g((eQ,Yd)=>{"use strict";function qZ(e){return e===0?-.3250421072470015:-.3250421072470015+e*(-.02848174957559851+e*(-.005770270296489442+e*-23763016656650163e-21))}Yd.exports=qZ});var r3=g((rQ,e3)=>{"use strict";function PZ(e){return e===0?.39791722395915535:.39791722395915535+e*(.0650222499887673+e*(.005081306281875766+e*(.00013249473800432164+e*-3960228278775368e-21)))}e3.exports=PZ});var n3=g((tQ,t3)=>{"use strict";function IZ(e){return e===0?.41485611868374833:.41485611868374833+e*(-.3722078760357013+e*(.31834661990116175+e*(-.11089469428239668+e*(.035478304325618236+e*-.002166375594868791))))}t3.exports=IZ});var i3=g((nQ,o3)=>{"use strict";function $Z(e){return e===0?.10642088040084423:.10642088040084423+e*(.540397917702171+e*(.07182865441419627+e*(.12617121980876164+e*(.01363708391202905+e*.011984499846799107))))}o3.exports=$Z});var u3=g((oQ,s3)=>{"use strict";function kZ(e){return e===0?-.6938585727071818:-.6938585727071818+e*(-10.558626225323291+e*(-62.375332450326006+e*(-162.39666946257347+e*(-184.60509290671104+e*(-81.2874355063066+e*-9.814329344169145)))))}s3.exports=kZ});var c3=g((iQ,a3)=>{"use strict";function AZ(e){return e===0?19.651271667439257:19.651271667439257+e*(137.65775414351904+e*(434.56587747522923+e*(645.3872717332679+e*(429.00814002756783+e*(108.63500554177944+e*(6.570249770319282+e*-.0604244152148581))))))}a3.exports=AZ});var l3=g((sQ,f3)=>{"use strict";function OZ(e){return e===0?-.799283237680523:-.799283237680523+e*(-17.757954917754752+e*(-160.63638485582192+e*(-637.5664433683896+e*(-1025.0951316110772+e*-483.5191916086514))))}f3.exports=OZ});var v3=g((uQ,p3)=>{"use strict";function EZ(e){return e===0?30.33806074348246:30.33806074348246+e*(325.7925129965739+e*(1536.729586084437+e*(3199.8582195085955+e*(2553.0504064331644+e*(474.52854120695537+e*-22.44095244658582)))))}p3.exports=EZ});var g3=g((aQ,h3)=>{"use strict";var NZ=R(),m3=H(),zZ=it(),TZ=ee(),ZZ=fe(),RZ=jd(),FZ=r3(),LZ=n3(),CZ=i3(),SZ=u3(),DZ=c3(),BZ=l3(),xZ=v3(),oo=1e-300,UZ=13877787807814457e-33,d3=.8450629115104675,HZ=.12837916709551256,GZ=1,WZ=-.0023621185607526594,VZ=1,MZ=-.009864944034847148,JZ=1,XZ=-.0098649429247001,KZ=1;function QZ(e){var r,t,n,i,s,f,a,o;if(NZ(e))return NaN;if(e===TZ)return 0;if(e===ZZ)return 2;if(e===0)return 1;if(e<0?(r=!0,t=-e):(r=!1,t=e),t<.84375)return t<UZ?1-e:(n=e*e,i=HZ+n*RZ(n),s=GZ+n*FZ(n),f=i/s,e<.25?1-(e+e*f):(i=e*f,i+=e-.5,.5-i));if(t<1.25)return s=t-1,a=WZ+s*LZ(s),o=VZ+s*CZ(s),r?1+d3+a/o:1-d3-a/o;if(t<28){if(s=1/(t*t),t<2.857142857142857)i=MZ+s*SZ(s),s=JZ+s*DZ(s);else{if(e<-6)return 2-oo;i=XZ+s*BZ(s),s=KZ+s*xZ(s)}return n=zZ(t,0),i=m3(-(n*n)-.5625)*m3((n-t)*(n+t)+i/s),r?2-i/t:i/t}return r?2-oo:oo*oo}h3.exports=QZ});var io=g((cQ,_3)=>{"use strict";var YZ=g3();_3.exports=YZ});var w3=g((fQ,b3)=>{"use strict";var jZ=io(),y3=M(),eR=H(),rR=ir();function tR(e,r){var t,n,i,s,f;if(s=jZ(y3(r)),s!==0&&e>1){for(n=eR(-r)/y3(rR*r),n*=r,t=.5,n/=t,i=n,f=2;f<e;++f)n/=f-t,n*=r,i+=n;s+=i}return s}b3.exports=tR});var Vr=g((lQ,q3)=>{"use strict";var nR=-708.3964185322641;q3.exports=nR});var k3=g((pQ,$3)=>{"use strict";var ft=H(),so=re(),oR=x(),P3=ar(),I3=Vr();function iR(e,r){var t,n;return n=e*oR(r),r>=1?n<P3&&-r>I3?t=so(r,e)*ft(-r):e>=1?t=so(r/ft(r/e),e):t=ft(n-r):n>I3?t=so(r,e)*ft(-r):r/e<P3?t=so(r/ft(r/e),e):t=ft(n-r),t}$3.exports=iR});var O3=g((vQ,A3)=>{"use strict";function sR(e){var r=-e,t=-1,n=0;return i;function i(){return t*=r,n+=1,t/n}}A3.exports=sR});var N3=g((mQ,E3)=>{"use strict";var uR=S(),aR=x(),cR=Ze(),fR=ct(),lR=O3();function pR(e){var r,t;return e<=-1?NaN:(t=uR(e),t>.95?aR(1+e)-e:t<cR?-e*e/2:(r={initialValue:-e},fR(lR(e),r)))}E3.exports=pR});var Ns=g((dQ,z3)=>{"use strict";var vR=N3();z3.exports=vR});var zs=g((hQ,T3)=>{"use strict";var mR=6.283185307179586;T3.exports=mR});var R3=g((gQ,Z3)=>{"use strict";function dR(e){return e===0?-.3333333333333333:-.3333333333333333+e*(.08333333333333333+e*(-.014814814814814815+e*(.0011574074074074073+e*(.0003527336860670194+e*(-.0001787551440329218+e*(3919263178522438e-20+e*(-21854485106799924e-22+e*(-185406221071516e-20+e*(8296711340953087e-22+e*(-17665952736826078e-23+e*(6707853543401498e-24+e*(10261809784240309e-24+e*(-4382036018453353e-24+e*914769958223679e-24)))))))))))))}Z3.exports=dR});var L3=g((_Q,F3)=>{"use strict";function hR(e){return e===0?-.001851851851851852:-.001851851851851852+e*(-.003472222222222222+e*(.0026455026455026454+e*(-.0009902263374485596+e*(.00020576131687242798+e*(-4018775720164609e-22+e*(-18098550334489977e-21+e*(764916091608111e-20+e*(-16120900894563446e-22+e*(4647127802807434e-24+e*(1378633446915721e-22+e*(-5752545603517705e-23+e*11951628599778148e-24)))))))))))}F3.exports=hR});var S3=g((yQ,C3)=>{"use strict";function gR(e){return e===0?.004133597883597883:.004133597883597883+e*(-.0026813271604938273+e*(.0007716049382716049+e*(20093878600823047e-22+e*(-.00010736653226365161+e*(52923448829120125e-21+e*(-12760635188618728e-21+e*(3423578734096138e-23+e*(13721957309062932e-22+e*(-6298992138380055e-22+e*14280614206064242e-23)))))))))}C3.exports=gR});var B3=g((bQ,D3)=>{"use strict";function _R(e){return e===0?.0006494341563786008:.0006494341563786008+e*(.00022947209362139917+e*(-.0004691894943952557+e*(.00026772063206283885+e*(-7561801671883977e-20+e*(-2396505113867297e-22+e*(11082654115347302e-21+e*(-56749528269915965e-22+e*14230900732435883e-22)))))))}D3.exports=_R});var U3=g((wQ,x3)=>{"use strict";function yR(e){return e===0?-.0008618882909167117:-.0008618882909167117+e*(.0007840392217200666+e*(-.0002990724803031902+e*(-14638452578843418e-22+e*(6641498215465122e-20+e*(-3968365047179435e-20+e*11375726970678419e-21)))))}x3.exports=yR});var G3=g((qQ,H3)=>{"use strict";function bR(e){return e===0?-.00033679855336635813:-.00033679855336635813+e*(-6972813758365858e-20+e*(.0002772753244959392+e*(-.00019932570516188847+e*(6797780477937208e-20+e*(1419062920643967e-22+e*(-13594048189768693e-21+e*(8018470256334202e-21+e*-2291481176508095e-21)))))))}H3.exports=bR});var V3=g((PQ,W3)=>{"use strict";function wR(e){return e===0?.0005313079364639922:.0005313079364639922+e*(-.0005921664373536939+e*(.0002708782096718045+e*(7902353232660328e-22+e*(-8153969367561969e-20+e*(561168275310625e-19+e*-18329116582843375e-21)))))}W3.exports=wR});var J3=g((IQ,M3)=>{"use strict";function qR(e){return e===0?.00034436760689237765:.00034436760689237765+e*(5171790908260592e-20+e*(-.00033493161081142234+e*(.0002812695154763237+e*-.00010976582244684731)))}M3.exports=qR});var K3=g(($Q,X3)=>{"use strict";function PR(e){return e===0?-.0006526239185953094:-.0006526239185953094+e*(.0008394987206720873+e*-.000438297098541721)}X3.exports=PR});var Y3=g((kQ,Q3)=>{"use strict";var IR=tr(),$R=Ns(),kR=io(),Ts=M(),AR=H(),OR=zs(),ER=R3(),NR=L3(),zR=S3(),TR=B3(),ZR=U3(),RR=G3(),FR=V3(),LR=J3(),CR=K3(),Re=[0,0,0,0,0,0,0,0,0,0];function SR(e,r){var t,n,i,s,f;return n=(r-e)/e,i=-$R(n),s=e*i,f=Ts(2*i),r<e&&(f=-f),Re[0]=ER(f),Re[1]=NR(f),Re[2]=zR(f),Re[3]=TR(f),Re[4]=ZR(f),Re[5]=RR(f),Re[6]=FR(f),Re[7]=LR(f),Re[8]=CR(f),Re[9]=-.0005967612901927463,t=IR(Re,1/e),t*=AR(-s)/Ts(OR*e),r<e&&(t=-t),t+=kR(Ts(s))/2,t}Q3.exports=SR});var e6=g((AQ,j3)=>{"use strict";function DR(e,r){var t=1,n=e,i=r;return s;function s(){var f=t;return n+=1,t*=i/n,f}}j3.exports=DR});var Zs=g((OQ,r6)=>{"use strict";var BR=ct(),xR=e6();function UR(e,r,t){var n,i;return t=t||0,i=xR(e,r),n=BR(i,{initialValue:t}),n}r6.exports=UR});var n6=g((EQ,t6)=>{"use strict";function HR(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=709811.662581658+e*(679979.8474157227+e*(293136.7857211597+e*(74887.54032914672+e*(12555.290582413863+e*(1443.4299244417066+e*(115.24194596137347+e*(6.309239205732627+e*(.22668404630224365+e*(.004826466289237662+e*4624429436045379e-20))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=4624429436045379e-20+e*(.004826466289237662+e*(.22668404630224365+e*(6.309239205732627+e*(115.24194596137347+e*(1443.4299244417066+e*(12555.290582413863+e*(74887.54032914672+e*(293136.7857211597+e*(679979.8474157227+e*709811.662581658))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}t6.exports=HR});var i6=g((NQ,o6)=>{"use strict";var GR=n6();o6.exports=GR});var Wt=g((zQ,s6)=>{"use strict";var WR=i6();s6.exports=WR});var c6=g((TQ,a6)=>{"use strict";var VR=Wt(),MR=Wr(),JR=He(),XR=Ns(),KR=M(),QR=S(),Pr=H(),Vt=re(),Rs=or(),Fs=Ue(),u6=x(),YR=wr(),uo=ar(),Mt=Vr(),Ls=ut(),jR=Hr();function eF(e,r){var t,n,i,s,f,a,o;return i=e+Ls-.5,o=(r-e-Ls+.5)/i,e<1?r<=Mt||e<1/YR?Pr(e*u6(r)-r-MR(e)):Vt(r,e)*Pr(-r)/JR(e):(QR(o*o*e)<=100&&e>150?(t=e*XR(o)+r*(.5-Ls)/i,t=Pr(t)):(s=e*u6(r/i),f=e-r,Fs(s,f)<=Mt||Rs(s,f)>=uo?(n=f/e,Fs(s,f)/2>Mt&&Rs(s,f)/2<uo?(a=Vt(r/i,e/2)*Pr(f/2),t=a*a):Fs(s,f)/4>Mt&&Rs(s,f)/4<uo&&r>e?(a=Vt(r/i,e/4)*Pr(f/4),t=a*a,t*=t):n>Mt&&n<uo?t=Vt(r*Pr(n)/i,e):t=Pr(s+f)):t=Vt(r/i,e)*Pr(f)),t*=KR(i/jR)/VR(e),t)}a6.exports=eF});var p6=g((ZQ,l6)=>{"use strict";var Cs=R(),rF=Br(),f6=S(),tF=Dr(),nF=x(),oF=re(),iF=Fn();function sF(e,r){var t,n;if(Cs(e)||Cs(r))return NaN;if(r===0)return 0;if(e===0)return-1;if(e<0&&r%2===0&&(e=-e),e>0){if((f6(r*(e-1))<.5||f6(r)<.2)&&(n=nF(e)*r,n<.5))return tF(n)}else if(iF(r)!==r)return NaN;return t=oF(e,r)-1,rF(t)||Cs(t)?NaN:t}l6.exports=sF});var m6=g((RQ,v6)=>{"use strict";var uF=p6();v6.exports=uF});var h6=g((FQ,d6)=>{"use strict";function aF(e){var r,t,n;return e===0?-.01803556856784494:(e<0?r=-e:r=e,r<=1?(t=-.01803556856784494+e*(.02512664961998968+e*(.049410315156753225+e*(.0172491608709614+e*(-.0002594535632054381+e*(-.0005410098692152044+e*(-3245886498259485e-20+e*0)))))),n=1+e*(1.962029871977952+e*(1.4801966942423133+e*(.5413914320717209+e*(.09885042511280101+e*(.008213096746488934+e*(.00022493629192211576+e*-22335276320861708e-23))))))):(e=1/e,t=0+e*(-3245886498259485e-20+e*(-.0005410098692152044+e*(-.0002594535632054381+e*(.0172491608709614+e*(.049410315156753225+e*(.02512664961998968+e*-.01803556856784494)))))),n=-22335276320861708e-23+e*(.00022493629192211576+e*(.008213096746488934+e*(.09885042511280101+e*(.5413914320717209+e*(1.4801966942423133+e*(1.962029871977952+e*1))))))),t/n)}d6.exports=aF});var _6=g((LQ,g6)=>{"use strict";function cF(e){var r,t,n;return e===0?.04906224540690395:(e<0?r=-e:r=e,r<=1?(t=.04906224540690395+e*(-.09691175301595212+e*(-.4149833583594954+e*(-.4065671242119384+e*(-.1584135863906922+e*(-.024014982064857155+e*-.0010034668769627955))))),n=1+e*(3.0234982984646304+e*(3.4873958536072385+e*(1.9141558827442668+e*(.5071377386143635+e*(.05770397226904519+e*.001957681026011072)))))):(e=1/e,t=-.0010034668769627955+e*(-.024014982064857155+e*(-.1584135863906922+e*(-.4065671242119384+e*(-.4149833583594954+e*(-.09691175301595212+e*.04906224540690395))))),n=.001957681026011072+e*(.05770397226904519+e*(.5071377386143635+e*(1.9141558827442668+e*(3.4873958536072385+e*(3.0234982984646304+e*1)))))),t/n)}g6.exports=cF});var b6=g((CQ,y6)=>{"use strict";function fF(e){var r,t,n;return e===0?-.029232972183027003:(e<0?r=-e:r=e,r<=1?(t=-.029232972183027003+e*(.14421626775719232+e*(-.14244039073863127+e*(.05428096940550536+e*(-.008505359768683364+e*(.0004311713426792973+e*0))))),n=1+e*(-1.5016935605448505+e*(.846973248876495+e*(-.22009515181499575+e*(.02558279715597587+e*(-.0010066679553914337+e*-8271935218912905e-22)))))):(e=1/e,t=0+e*(.0004311713426792973+e*(-.008505359768683364+e*(.05428096940550536+e*(-.14244039073863127+e*(.14421626775719232+e*-.029232972183027003))))),n=-8271935218912905e-22+e*(-.0010066679553914337+e*(.02558279715597587+e*(-.22009515181499575+e*(.846973248876495+e*(-1.5016935605448505+e*1)))))),t/n)}y6.exports=fF});var q6=g((SQ,w6)=>{"use strict";var Ss=x(),lF=Ze(),pF=h6(),vF=_6(),mF=b6(),dF=.15896368026733398,hF=.5281534194946289,gF=.45201730728149414;function _F(e,r,t){var n,i,s,f;if(e<lF)return-Ss(e);if(r===0||t===0)return 0;if(i=0,e>2){if(e>=3){do e-=1,t-=1,i+=Ss(e);while(e>=3);t=e-2}return s=t*(e+1),f=pF(t),i+=s*dF+s*f,i}return e<1&&(i+=-Ss(e),t=r,r=e,e+=1),e<=1.5?(s=vF(r),n=r*t,i+=n*hF+n*s,i):(s=t*r,f=mF(-t),i+=s*gF+s*f,i)}w6.exports=_F});var A6=g((DQ,k6)=>{"use strict";var P6=He(),I6=Dr(),yF=xe(),bF=R(),$6=q6();function wF(e){return bF(e)?NaN:e<0?e<-.5?P6(1+e)-1:I6(-yF(e)+$6(e+2,e+1,e)):e<2?I6($6(e+1,e,e-1)):P6(1+e)-1}k6.exports=wF});var E6=g((BQ,O6)=>{"use strict";var qF=A6();O6.exports=qF});var z6=g((xQ,N6)=>{"use strict";function PF(e,r){var t,n,i,s;return t=-r,r=-r,n=e+1,i=1,f;function f(){return s=t/n,t*=r,i+=1,t/=i,n+=1,s}}N6.exports=PF});var Z6=g((UQ,T6)=>{"use strict";var IF=m6(),$F=ct(),kF=E6(),AF=z6();function OF(e,r,t){var n,i,s,f,a;return i=kF(e),s=(i+1)/e,f=IF(r,e),i-=f,i/=e,a=AF(e,r),f+=1,n=t?s:0,i=-f*$F(a,{initialValue:(n-i)/f}),t&&(i=-i),[i,s]}T6.exports=OF});var Jt=g((HQ,R6)=>{"use strict";var EF=11754943508222875e-54;R6.exports=EF});var L6=g((GQ,F6)=>{"use strict";var ao=S(),Ge=Jt(),NF=Ze(),zF=1e6;function TF(e,r,t){var n,i,s,f,a,o,u;if(n=typeof e.next=="function",u=n?e.next().value:e(),f=u[1],s=u[0],f===0&&(f=Ge),a=f,o=0,n===!0)do u=e.next().value,u&&(o=u[1]+u[0]*o,o===0&&(o=Ge),a=u[1]+u[0]/a,a===0&&(a=Ge),o=1/o,i=a*o,f*=i);while(ao(i-1)>r&&--t);else do u=e(),u&&(o=u[1]+u[0]*o,o===0&&(o=Ge),a=u[1]+u[0]/a,a===0&&(a=Ge),o=1/o,i=a*o,f*=i);while(u&&ao(i-1)>r&&--t);return s/f}function ZF(e,r,t){var n,i,s,f,a,o;if(n=typeof e.next=="function",o=n?e.next().value:e(),s=o[1],s===0&&(s=Ge),f=s,a=0,n===!0)do o=e.next().value,o&&(a=o[1]+o[0]*a,a===0&&(a=Ge),f=o[1]+o[0]/f,f===0&&(f=Ge),a=1/a,i=f*a,s*=i);while(o&&ao(i-1)>r&&--t);else do o=e(),o&&(a=o[1]+o[0]*a,a===0&&(a=Ge),f=o[1]+o[0]/f,f===0&&(f=Ge),a=1/a,i=f*a,s*=i);while(o&&ao(i-1)>r&&--t);return s}function RF(e,r){var t,n,i;return n={},arguments.length>1&&(n=r),t=n.maxIter||zF,i=n.tolerance||NF,n.keep?ZF(e,i,t):TF(e,i,t)}F6.exports=RF});var D6=g((WQ,S6)=>{"use strict";var C6=S(),FF=Ze(),lt=Jt(),LF=1e6;function CF(e,r,t){var n,i,s,f,a,o;o=e(),a=o[1],i=o[0],a===0&&(a=lt),s=a,f=0;do o=e(),o&&(f=o[1]+o[0]*f,f===0&&(f=lt),s=o[1]+o[0]/s,s===0&&(s=lt),f=1/f,n=s*f,a*=n);while(o&&C6(n-1)>r&&--t);return i/a}function SF(e,r,t){var n,i,s,f,a;a=e(),f=a[1],f===0&&(f=lt),i=f,s=0;do a=e(),a&&(s=a[1]+a[0]*s,s===0&&(s=lt),i=a[1]+a[0]/i,i===0&&(i=lt),s=1/s,n=i*s,f*=n);while(a&&C6(n-1)>r&&--t);return f}function DF(e,r){var t,n,i;return n={},arguments.length>1&&(n=r),i=n.tolerance||FF,t=n.maxIter||LF,n.keep?SF(e,i,t):CF(e,i,t)}S6.exports=DF});var Bs=g((VQ,B6)=>{"use strict";var BF=Os(),xF=L6(),UF=D6(),Ds;BF()?Ds=xF:Ds=UF;B6.exports=Ds});var U6=g((MQ,x6)=>{"use strict";function HF(e,r){var t=r-e+1,n=e,i=0;return s;function s(){return i+=1,t+=2,[i*(n-i),t]}}x6.exports=HF});var xs=g((JQ,H6)=>{"use strict";var GF=Bs(),WF=U6();function VF(e,r){var t=WF(e,r);return 1/(r-e+1+GF(t))}H6.exports=VF});var M6=g((XQ,V6)=>{"use strict";var MF=ye(),Xt=He(),Us=S(),G6=re(),JF=x(),XF=Rd(),W6=wr(),KF=ar(),QF=Xd(),YF=Qd(),jF=w3(),Hs=k3(),eL=Y3(),rL=Zs(),Gs=c6(),tL=Z6(),nL=xs();function oL(e,r,t,n){var i,s,f,a,o,u,c,l,p,v,m,h,_,d;switch(c=0,l=n,u=r<30&&r<=e+1&&e<KF,u?(_=MF(r),p=_===r,f=p?!1:Us(_-r)===.5):(p=!1,f=!1),p&&e>.6?(l=!l,s=0):f&&e>.2?(l=!l,s=1):e<XF&&r>1?s=6:e>1e3&&(r<e||Us(r-50)/e<1)?(l=!l,s=7):e<.5?-.4/JF(e)<r?s=2:s=3:e<1.1?e*.75<r?s=2:s=3:(o=!1,t&&r>20&&(v=Us((e-r)/r),r>200?20/r>v*v&&(o=!0):v<.4&&(o=!0)),o?s=5:e-1/(3*e)<r?s=2:(s=4,l=!l)),s){case 0:c=YF(r,e),t===!1&&(c*=Xt(r));break;case 1:c=jF(r,e),t===!1&&(c*=Xt(r));break;case 2:c=t?Gs(r,e):Hs(r,e),c!==0&&(a=0,i=!1,l&&(a=t?1:Xt(r),t||c>=1||W6*c>a?(a/=c,t||r<1||W6/r>a?(a*=-r,i=!0):a=0):a=0),c*=rL(r,e,a)/r,i&&(l=!1,c=-c));break;case 3:l=!l,m=tL(r,e,l),c=m[0],d=m[1],l=!1,t&&(c/=d);break;case 4:c=t?Gs(r,e):Hs(r,e),c!==0&&(c*=nL(r,e));break;case 5:c=eL(r,e),e>=r&&(l=!l);break;case 6:c=t?G6(e,r)/Xt(r+1):G6(e,r)/r,c*=1-r*e/(r+1);break;case 7:c=t?Gs(r,e):Hs(r,e),c/=e,c!==0&&(c*=QF(r,e));break}return t&&c>1&&(c=1),l&&(h=t?1:Xt(r),c=h-c),c}V6.exports=oL});var Q6=g((KQ,K6)=>{"use strict";var iL=Wr(),sL=H(),We=x(),uL=xt(),aL=ar(),cL=ee(),fL=Ut(),J6=M6(),X6=Zs(),lL=xs();function pL(e,r,t,n){var i,s,f,a;return e<0||r<=0?NaN:(i=t===void 0?!0:t,f=n,r>=fL&&!i?(f&&r*4<e?(a=r*We(e)-e,a+=We(lL(r,e))):!f&&r>4*e?(a=r*We(e)-e,s=0,a+=We(X6(r,e,s)/r)):(a=J6(e,r,!0,f),a===0?f?(a=1+1/(12*r)+1/(288*r*r),a=We(a)-r+(r-.5)*We(r),a+=We(uL)):(a=r*We(e)-e,s=0,a+=We(X6(r,e,s)/r)):a=We(a)+iL(r)),a>aL?cL:sL(a)):J6(e,r,i,f))}K6.exports=pL});var Ws=g((QQ,Y6)=>{"use strict";var vL=Q6();Y6.exports=vL});var t4=g((YQ,r4)=>{"use strict";var pt=H(),co=re(),mL=x(),j6=ar(),e4=Vr();function dL(e,r){var t,n;return n=e*mL(r),r>=1?n<j6&&-r>e4?t=co(r,e)*pt(-r):e>=1?t=co(r/pt(r/e),e):t=pt(n-r):n>e4?t=co(r,e)*pt(-r):r/e<j6?t=co(r/pt(r/e),e):t=pt(n-r),t}r4.exports=dL});var i4=g((jQ,o4)=>{"use strict";var hL=Wt(),gL=Wr(),_L=He(),yL=xe(),bL=M(),wL=S(),Ir=H(),Kt=re(),Vs=or(),Ms=Ue(),n4=x(),fo=ar(),Qt=Vr(),Js=ut(),qL=Hr();function PL(e,r){var t,n,i,s,f,a,o;return i=e+Js-.5,o=(r-e-Js+.5)/i,e<1?r<=Qt?Ir(e*n4(r)-r-gL(e)):Kt(r,e)*Ir(-r)/_L(e):(wL(o*o*e)<=100&&e>150?(t=e*(yL(o)-o)+r*(.5-Js)/i,t=Ir(t)):(s=e*n4(r/i),f=e-r,Ms(s,f)<=Qt||Vs(s,f)>=fo?(n=f/e,Ms(s,f)/2>Qt&&Vs(s,f)/2<fo?(a=Kt(r/i,e/2)*Ir(f/2),t=a*a):Ms(s,f)/4>Qt&&Vs(s,f)/4<fo&&r>e?(a=Kt(r/i,e/4)*Ir(f/4),t=a*a,t*=t):n>Qt&&n<fo?t=Kt(r*Ir(n)/i,e):t=Ir(s+f)):t=Kt(r/i,e)*Ir(f)),t*=bL(i/qL)/hL(e),t)}o4.exports=PL});var f4=g((eY,c4)=>{"use strict";var IL=Yn(),s4=Is(),$L=Ws(),kL=xe(),lo=S(),u4=re(),AL=x(),OL=_r(),a4=Ze(),EL=t4(),NL=i4(),$r=new Array(30);function zL(e,r,t,n,i,s,f){var a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P,I,A;if(p=r-1,I=e+p/2,n<.35?_=kL(-n):_=AL(t),A=-I*_,y=NL(r,A),y<=OL)return i;for(f?(a=y/IL(e,r),a/=u4(I,r)):a=EL(r,A)/u4(I,r),a*=s,$r[0]=1,b=$L(A,r,!0,!0),b/=y,c=i+a*b,u=1,v=_/2,v*=v,m=1,d=4*I*I,l=r,q=1;q<$r.length;++q){for(u+=2,$r[q]=0,h=r-q,o=3,w=1;w<q;++w)h=w*r-q,$r[q]+=h*$r[q-w]/s4(o),o+=2;if($r[q]/=q,$r[q]+=p/s4(u),b=(l*(l+1)*b+(A+l+1)*m)/d,m*=v,l+=2,P=a*$r[q]*b,c+=P,P>1){if(lo(P)<lo(a4*c))break}else if(lo(P/a4)<lo(c))break}return c}c4.exports=zL});var p4=g((rY,l4)=>{"use strict";function TL(e,r,t){var n,i;if(t===0)return 1;for(n=1,i=0;i<t;i++)n*=(e+i)/(r+i);return n}l4.exports=TL});var d4=g((tY,m4)=>{"use strict";var v4=S(),ZL=or();function RL(e,r){return ZL(v4(e),v4(r))}m4.exports=RL});var g4=g((nY,h4)=>{"use strict";var FL=d4();h4.exports=FL});var b4=g((oY,y4)=>{"use strict";var _4=S(),LL=Ue();function CL(e,r){return LL(_4(e),_4(r))}y4.exports=CL});var q4=g((iY,w4)=>{"use strict";var SL=b4();w4.exports=SL});var vo=g((sY,$4)=>{"use strict";var Xs=Wt(),DL=g4(),BL=q4(),P4=Dr(),kr=xe(),I4=M(),po=S(),Ve=H(),Me=re(),xL=Ue(),Pe=x(),Je=ar(),vt=Vr(),Ks=ut(),UL=Hr();function HL(e,r,t,n,i){var s,f,a,o,u,c,l,p,v,m,h,_,d,y;if(!i)return Me(t,e)*Me(n,r);if(d=e+r,o=e+Ks-.5,u=r+Ks-.5,c=d+Ks-.5,s=Xs(d),s/=Xs(e)*Xs(r),s*=I4(u/UL),s*=I4(o/c),l=(t*r-n*o)/o,p=(n*e-t*u)/u,BL(l,p)<.2)if(l*p>0||xL(e,r)<1)po(l)<.1?s*=Ve(e*kr(l)):s*=Me(t*c/o,e),po(p)<.1?s*=Ve(r*kr(p)):s*=Me(n*c/u,r);else if(DL(l,p)<.5)f=e<r,a=r/e,f&&a*p<.1||!f&&l/a>.1?(v=P4(a*kr(p)),v=l+v+v*l,v=e*kr(v),s*=Ve(v)):(v=P4(kr(l)/a),v=p+v+v*p,v=r*kr(v),s*=Ve(v));else if(po(l)<po(p))if(y=e*kr(l)+r*Pe(n*c/u),y<=vt||y>=Je){if(y+=Pe(s),y>=Je)return NaN;s=Ve(y)}else s*=Ve(y);else if(y=r*kr(p)+e*Pe(t*c/o),y<=vt||y>=Je){if(y+=Pe(s),y>=Je)return NaN;s=Ve(y)}else s*=Ve(y);else if(h=t*c/o,_=n*c/u,l=e*Pe(h),p=r*Pe(_),l>=Je||l<=vt||p>=Je||p<=vt)if(e<r)if(m=Me(_,r/e),v=e*(Pe(h)+Pe(m)),v<Je&&v>vt)s*=Me(m*h,e);else{if(p+=l+Pe(s),p>=Je)return NaN;s=Ve(p)}else if(m=Me(h,e/r),v=(Pe(m)+Pe(_))*r,v<Je&&v>vt)s*=Me(m*_,r);else{if(p+=l+Pe(s),p>=Je)return NaN;s=Ve(p)}else s*=Me(h,e)*Me(_,r);return s}$4.exports=HL});var A4=g((uY,k4)=>{"use strict";var GL=Bs(),WL=vo(),VL={keep:!0,maxIter:1e3};function ML(e,r,t,n){var i=0;return s;function s(){var f,a,o;return a=(e+i-1)*(e+r+i-1)*i*(r-i)*t*t,f=e+2*i-1,a/=f*f,o=i,o+=i*(r-i)*t/(e+2*i-1),o+=(e+i)*(e*n-r*t+1+i*(2-t))/(e+2*i+1),i+=1,[a,o]}}function JL(e,r,t,n,i,s){var f,a,o;return f=WL(e,r,t,n,i),s&&(s[1]=f),f===0?f:(o=ML(e,r,t,n),a=GL(o,VL),f/a)}k4.exports=JL});var E4=g((aY,O4)=>{"use strict";var XL=9007199254740991;O4.exports=XL});var z4=g((cY,N4)=>{"use strict";function KL(e,r){var t=0,n;if(e===0)return r;if(r===0)return e;for(;(e&1)===0&&(r&1)===0;)e>>>=1,r>>>=1,t+=1;for(;(e&1)===0;)e>>>=1;for(;r;){for(;(r&1)===0;)r>>>=1;e>r&&(n=r,r=e,e=n),r-=e}return e<<t}N4.exports=KL});var Z4=g((fY,T4)=>{"use strict";function QL(e,r){var t=1,n;if(e===0)return r;if(r===0)return e;for(;e%2===0&&r%2===0;)e/=2,r/=2,t*=2;for(;e%2===0;)e/=2;for(;r;){for(;r%2===0;)r/=2;e>r&&(n=r,r=e,e=n),r-=e}return t*e}T4.exports=QL});var B4=g((lY,D4)=>{"use strict";var R4=R(),F4=Ur(),L4=ee(),C4=fe(),S4=ds(),YL=z4(),jL=Z4();function eC(e,r){return R4(e)||R4(r)?NaN:e===L4||r===L4||e===C4||r===C4?NaN:F4(e)&&F4(r)?(e<0&&(e=-e),r<0&&(r=-r),e<=S4&&r<=S4?YL(e,r):jL(e,r)):NaN}D4.exports=eC});var U4=g((pY,x4)=>{"use strict";var rC=B4();x4.exports=rC});var V4=g((vY,W4)=>{"use strict";var tC=E4(),nC=ee(),H4=Ur(),G4=R(),oC=Sn(),iC=ye(),sC=U4();function Qs(e,r){var t,n,i,s,f,a,o;if(G4(e)||G4(r))return NaN;if(!H4(e)||!H4(r))return NaN;if(r<0||(n=1,e<0&&(e=-e+r-1,oC(r)&&(n*=-1)),r>e))return 0;if(r===0||r===e)return n;if(r===1||r===e-1)return n*e;for(e-r<r&&(r=e-r),o=iC(tC/e),t=1,f=1;f<=r&&!(t>o);f++)t*=e,t/=f,e-=1;return f>r?n*t:(i=Qs(e,r-f+1),i===nC?n*i:(s=Qs(r,r-f+1),a=sC(i,s),i/=a,s/=a,t/=s,n*t*i))}W4.exports=Qs});var J4=g((mY,M4)=>{"use strict";var uC=V4();M4.exports=uC});var Q4=g((dY,K4)=>{"use strict";var X4=J4(),Mr=ye(),Yt=re(),aC=_r();function cC(e,r,t,n){var i,s,f,a,o;if(s=Yt(t,e),s>aC)for(a=s,o=Mr(e-1);o>r;o--)a*=(o+1)*n/((e-o)*t),s+=a;else if(f=Mr(e*t),f<=r+1&&(f=Mr(r+2)),s=Yt(t,f)*Yt(n,e-f),s*=X4(Mr(e),Mr(f)),s===0)for(o=f-1;o>r;o--)s+=Yt(t,o)*Yt(n,e-o),s*=X4(Mr(e),Mr(o));else{for(a=s,i=s,o=f-1;o>r;o--)a*=(o+1)*n/((e-o)*t),s+=a;for(a=i,o=f+1;o<=e;o++)a*=(e-o+1)*t/(o*n),s+=a}return s}K4.exports=cC});var j4=g((hY,Y4)=>{"use strict";var fC=vo();function lC(e,r,t,n,i,s,f){var a,o,u,c;if(a=fC(e,r,t,n,s),f&&(f[1]=a),a/=e,a===0)return a;for(u=1,o=1,c=0;c<i-1;++c)o*=(e+r+c)*t/(e+c+1),u+=o;return a*=u,a}Y4.exports=lC});var o5=g((gY,n5)=>{"use strict";var Ys=Wt(),pC=ct(),vC=xe(),mC=M(),js=H(),mo=re(),jt=x(),dC=_r(),e5=ar(),r5=Vr(),eu=ut(),hC=Hr(),t5={maxTerms:100};function gC(e,r,t,n){var i=1-r,s=1;return f;function f(){var a=n/e;return e+=1,n*=i*t/s,s+=1,i+=1,a}}function _C(e,r,t,n,i,s,f){var a,o,u,c,l,p,v,m;return i?(v=e+r,o=e+eu-.5,u=r+eu-.5,c=v+eu-.5,a=Ys(v)/(Ys(e)*Ys(r)),l=jt(c/u)*(r-.5),p=jt(t*c/o)*e,l>r5&&l<e5&&p>r5&&p<e5?(e*r<u*10?a*=js((r-.5)*vC(e/u)):a*=mo(c/u,r-.5),a*=mo(t*c/o,e),a*=mC(o/hC),s&&(s[1]=a*mo(f,r))):(a=jt(a)+l+p+(jt(o)-1)/2,s&&(s[1]=js(a+r*jt(f))),a=js(a))):a=mo(t,e),a<dC?n:(m=gC(e,r,t,a),t5.initialValue=n,pC(m,t5))}n5.exports=_C});var nu=g((_Y,l5)=>{"use strict";var yC=R(),bC=Dr(),ho=ye(),i5=xe(),s5=Rn(),Ie=ls(),ru=M(),wC=H(),en=re(),qC=or(),u5=Ue(),go=wr(),a5=_r(),PC=ds(),IC=Hn(),f5=ir(),Ar=f4(),tu=p4(),$C=vo(),c5=A4(),kC=Q4(),rn=j4(),Xe=o5(),AC=1/f5;function OC(e,r,t,n,i,s,f,a){var o,u,c,l,p,v,m,h,_,d,y,b;if(b=1-e,m=a,h=a+f,s[h]=-1,yC(e)||e<0||e>1)return s[m]=NaN,s[h]=NaN,s;if(n){if(r<0||t<0)return s[m]=NaN,s[h]=NaN,s;if(r===0){if(t===0)return s[m]=NaN,s[h]=NaN,s;if(t>0)return s[m]=i?0:1,s}else if(t===0&&r>0)return s[m]=i?1:0,s}else if(r<=0||t<=0)return s[m]=NaN,s[h]=NaN,s;return e===0?(r===1?s[h]=1:s[h]=r<1?go/2:a5*2,i?(s[m]=n?1:Ie(r,t),s):(s[m]=0,s)):e===1?(t===1?s[h]=1:s[h]=t<1?go/2:a5*2,i?s[m]=0:s[m]=n?1:Ie(r,t),s):r===.5&&t===.5?(s[h]=AC*ru(b*e),y=s5(ru(i?b:e)),y/=IC,n||(y*=f5),s[m]=y,s):(r===1&&(v=t,t=r,r=v,v=b,b=e,e=v,i=!i),t===1?r===1?(s[m]=i?b:e,s[h]=1,s):(s[h]=r*en(e,r-1),b<.5?y=i?-bC(r*i5(-b)):wC(r*i5(-b)):y=i?-(en(e,r)-1):en(e,r),n||(y/=r),s[m]=y,s):(u5(r,t)<=1?(e>.5&&(v=t,t=r,r=v,v=b,b=e,e=v,i=!i),qC(r,t)<=1?r>=u5(.2,t)||en(e,r)<=.9?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Xe(r,t,e,c,n,s,b)):c=Xe(r,t,e,0,n,s,b):(v=t,t=r,r=v,v=b,b=e,e=v,i=!i,b>=.3?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Xe(r,t,e,c,n,s,b)):c=Xe(r,t,e,0,n,s,b):(n?u=1:u=tu(r+t,r,20),c=rn(r,t,e,b,20,n,s),i?(c-=n?1:Ie(r,t),i=!1,c=-Ar(r+20,t,e,b,c,u,n)):c=Ar(r+20,t,e,b,c,u,n))):t<=1||e<.1&&en(t*e,r)<=.7?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Xe(r,t,e,c,n,s,b)):c=Xe(r,t,e,0,n,s,b):(v=t,t=r,r=v,v=b,b=e,e=v,i=!i,b>=.3?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Xe(r,t,e,c,n,s,b)):c=Xe(r,t,e,0,n,s,b):r>=15?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Ar(r,t,e,b,c,1,n)):c=Ar(r,t,e,b,0,1,n):(n?u=1:u=tu(r+t,r,20),c=rn(r,t,e,b,20,n,s),i?(c-=n?1:Ie(r,t),i=!1,c=-Ar(r+20,t,e,b,c,u,n)):c=Ar(r+20,t,e,b,c,u,n)))):(r<t?o=r-(r+t)*e:o=(r+t)*b-t,o<0&&(v=t,t=r,r=v,v=b,b=e,e=v,i=!i),t<40?ho(r)===r&&ho(t)===t&&r<PC-100?(_=r-1,d=t+_,c=kC(d,_,e,b),n||(c*=Ie(r,t))):t*e<=.7?i?(c=-(n?1:Ie(r,t)),i=!1,c=-Xe(r,t,e,c,n,s,b)):c=Xe(r,t,e,0,n,s,b):r>15?(d=ho(t),d===t&&(d-=1),l=t-d,n?u=1:u=tu(r+l,l,d),c=rn(l,r,b,e,d,n),c=Ar(r,l,e,b,c,1,n),c/=u):n?(d=ho(t),l=t-d,l<=0&&(d-=1,l+=1),c=rn(l,r,b,e,d,n),c+=rn(r,l,e,b,20,n),i&&(c-=1),c=Ar(r+20,l,e,b,c,1,n),i&&(c=-c,i=!1)):c=c5(r,t,e,b,n,s):c=c5(r,t,e,b,n,s)),s[h]<0&&(s[h]=$C(r,t,e,b,!0)),p=b*e,s[h]!==0&&(go*p<s[h]?s[h]=go/2:s[h]/=p),s[m]=i?(n?1:Ie(r,t))-c:c,s))}l5.exports=OC});var v5=g((yY,p5)=>{"use strict";var EC=nu();function NC(e,r,t,n,i){return EC(e,r,t,n,i,[0,0],1,0)}p5.exports=NC});var ou=g((bY,d5)=>{"use strict";var zC=rr(),m5=v5(),TC=nu();zC(m5,"assign",TC);d5.exports=m5});var g5=g((wY,h5)=>{"use strict";var ZC=ou().assign;function RC(e,r,t,n,i){var s=[0,0];return n=n!==!1,i=i===!0,ZC(e,r,t,n,i,s,1,0),s[0]}h5.exports=RC});var mt=g((qY,_5)=>{"use strict";var FC=g5();_5.exports=FC});var b5=g((PY,y5)=>{"use strict";function LC(e){var r,t,n;return e===0?-.0005087819496582806:(e<0?r=-e:r=e,r<=1?(t=-.0005087819496582806+e*(-.008368748197417368+e*(.03348066254097446+e*(-.012692614766297404+e*(-.03656379714117627+e*(.02198786811111689+e*(.008226878746769157+e*(-.005387729650712429+e*(0+e*0)))))))),n=1+e*(-.9700050433032906+e*(-1.5657455823417585+e*(1.5622155839842302+e*(.662328840472003+e*(-.7122890234154284+e*(-.05273963823400997+e*(.07952836873415717+e*(-.0023339375937419+e*.0008862163904564247))))))))):(e=1/e,t=0+e*(0+e*(-.005387729650712429+e*(.008226878746769157+e*(.02198786811111689+e*(-.03656379714117627+e*(-.012692614766297404+e*(.03348066254097446+e*(-.008368748197417368+e*-.0005087819496582806)))))))),n=.0008862163904564247+e*(-.0023339375937419+e*(.07952836873415717+e*(-.05273963823400997+e*(-.7122890234154284+e*(.662328840472003+e*(1.5622155839842302+e*(-1.5657455823417585+e*(-.9700050433032906+e*1))))))))),t/n)}y5.exports=LC});var q5=g((IY,w5)=>{"use strict";function CC(e){var r,t,n;return e===0?-.20243350835593876:(e<0?r=-e:r=e,r<=1?(t=-.20243350835593876+e*(.10526468069939171+e*(8.3705032834312+e*(17.644729840837403+e*(-18.851064805871424+e*(-44.6382324441787+e*(17.445385985570866+e*(21.12946554483405+e*-3.6719225470772936))))))),n=1+e*(6.242641248542475+e*(3.971343795334387+e*(-28.66081804998+e*(-20.14326346804852+e*(48.560921310873994+e*(10.826866735546016+e*(-22.643693341313973+e*1.7211476576120028)))))))):(e=1/e,t=-3.6719225470772936+e*(21.12946554483405+e*(17.445385985570866+e*(-44.6382324441787+e*(-18.851064805871424+e*(17.644729840837403+e*(8.3705032834312+e*(.10526468069939171+e*-.20243350835593876))))))),n=1.7211476576120028+e*(-22.643693341313973+e*(10.826866735546016+e*(48.560921310873994+e*(-20.14326346804852+e*(-28.66081804998+e*(3.971343795334387+e*(6.242641248542475+e*1)))))))),t/n)}w5.exports=CC});var I5=g(($Y,P5)=>{"use strict";function SC(e){var r,t,n;return e===0?-.1311027816799519:(e<0?r=-e:r=e,r<=1?(t=-.1311027816799519+e*(-.16379404719331705+e*(.11703015634199525+e*(.38707973897260434+e*(.3377855389120359+e*(.14286953440815717+e*(.029015791000532906+e*(.0021455899538880526+e*(-6794655751811263e-22+e*(28522533178221704e-24+e*-681149956853777e-24))))))))),n=1+e*(3.4662540724256723+e*(5.381683457070069+e*(4.778465929458438+e*(2.5930192162362027+e*(.848854343457902+e*(.15226433829533179+e*(.011059242293464892+e*(0+e*(0+e*0)))))))))):(e=1/e,t=-681149956853777e-24+e*(28522533178221704e-24+e*(-6794655751811263e-22+e*(.0021455899538880526+e*(.029015791000532906+e*(.14286953440815717+e*(.3377855389120359+e*(.38707973897260434+e*(.11703015634199525+e*(-.16379404719331705+e*-.1311027816799519))))))))),n=0+e*(0+e*(0+e*(.011059242293464892+e*(.15226433829533179+e*(.848854343457902+e*(2.5930192162362027+e*(4.778465929458438+e*(5.381683457070069+e*(3.4662540724256723+e*1)))))))))),t/n)}P5.exports=SC});var k5=g((kY,$5)=>{"use strict";function DC(e){var r,t,n;return e===0?-.0350353787183178:(e<0?r=-e:r=e,r<=1?(t=-.0350353787183178+e*(-.0022242652921344794+e*(.018557330651423107+e*(.009508047013259196+e*(.0018712349281955923+e*(.00015754461742496055+e*(460469890584318e-20+e*(-2304047769118826e-25+e*26633922742578204e-28))))))),n=1+e*(1.3653349817554064+e*(.7620591645536234+e*(.22009110576413124+e*(.03415891436709477+e*(.00263861676657016+e*(7646752923027944e-20+e*(0+e*0)))))))):(e=1/e,t=26633922742578204e-28+e*(-2304047769118826e-25+e*(460469890584318e-20+e*(.00015754461742496055+e*(.0018712349281955923+e*(.009508047013259196+e*(.018557330651423107+e*(-.0022242652921344794+e*-.0350353787183178))))))),n=0+e*(0+e*(7646752923027944e-20+e*(.00263861676657016+e*(.03415891436709477+e*(.22009110576413124+e*(.7620591645536234+e*(1.3653349817554064+e*1)))))))),t/n)}$5.exports=DC});var O5=g((AY,A5)=>{"use strict";function BC(e){var r,t,n;return e===0?-.016743100507663373:(e<0?r=-e:r=e,r<=1?(t=-.016743100507663373+e*(-.0011295143874558028+e*(.001056288621524929+e*(.00020938631748758808+e*(14962478375834237e-21+e*(44969678992770644e-23+e*(4625961635228786e-24+e*(-2811287356288318e-29+e*9905570997331033e-32))))))),n=1+e*(.5914293448864175+e*(.1381518657490833+e*(.016074608709367652+e*(.0009640118070051656+e*(27533547476472603e-21+e*(282243172016108e-21+e*(0+e*0)))))))):(e=1/e,t=9905570997331033e-32+e*(-2811287356288318e-29+e*(4625961635228786e-24+e*(44969678992770644e-23+e*(14962478375834237e-21+e*(.00020938631748758808+e*(.001056288621524929+e*(-.0011295143874558028+e*-.016743100507663373))))))),n=0+e*(0+e*(282243172016108e-21+e*(27533547476472603e-21+e*(.0009640118070051656+e*(.016074608709367652+e*(.1381518657490833+e*(.5914293448864175+e*1)))))))),t/n)}A5.exports=BC});var T5=g((OY,z5)=>{"use strict";var xC=R(),E5=M(),N5=x(),UC=ee(),HC=fe(),GC=b5(),WC=q5(),VC=I5(),MC=k5(),JC=O5(),XC=.08913147449493408,KC=2.249481201171875,QC=.807220458984375,YC=.9399557113647461,jC=.9836282730102539;function eS(e){var r,t,n,i,s;return xC(e)?NaN:e===0?UC:e===2?HC:e===1?0:e>2||e<0?NaN:(e>1?(r=-1,n=2-e):(r=1,n=e),e=1-n,e<=.5?(i=e*(e+10),s=GC(e),r*(i*XC+i*s)):n>=.25?(i=E5(-2*N5(n)),n-=.25,s=WC(n),r*(i/(KC+s))):(n=E5(-N5(n)),n<3?(t=n-1.125,s=VC(t),r*(QC*n+s*n)):n<6?(t=n-3,s=MC(t),r*(YC*n+s*n)):(t=n-6,s=JC(t),r*(jC*n+s*n))))}z5.exports=eS});var dt=g((EY,Z5)=>{"use strict";var rS=T5();Z5.exports=rS});var C5=g((NY,L5)=>{"use strict";var tS=R(),R5=Rn(),nS=M(),F5=Vi(),oS=6123233995736766e-32;function iS(e){var r;return tS(e)?NaN:e<-1||e>1?NaN:e>.5?2*R5(nS(.5-.5*e)):(r=F5-R5(e),r+=oS,r+=F5,r)}L5.exports=iS});var D5=g((zY,S5)=>{"use strict";var sS=C5();S5.exports=sS});var _o=g((TY,B5)=>{"use strict";var uS=1.4142135623730951;B5.exports=uS});var U5=g((ZY,x5)=>{"use strict";function aS(e){return e===0?.16666666666666666:.16666666666666666+e*.16666666666666666}x5.exports=aS});var G5=g((RY,H5)=>{"use strict";function cS(e){return e===0?.058333333333333334:.058333333333333334+e*(.06666666666666667+e*.008333333333333333)}H5.exports=cS});var V5=g((FY,W5)=>{"use strict";function fS(e){return e===0?.0251984126984127:.0251984126984127+e*(.026785714285714284+e*(.0017857142857142857+e*.0001984126984126984))}W5.exports=fS});var J5=g((LY,M5)=>{"use strict";function lS(e){return e===0?.012039792768959435:.012039792768959435+e*(.010559964726631394+e*(-.0011078042328042327+e*(.0003747795414462081+e*27557319223985893e-22)))}M5.exports=lS});var K5=g((CY,X5)=>{"use strict";function pS(e){return e===0?.003837005972422639:.003837005972422639+e*(.00610392115600449+e*(-.0016095979637646305+e*(.0005945867404200738+e*(-6270542728876062e-20+e*2505210838544172e-23))))}X5.exports=pS});var Y5=g((SY,Q5)=>{"use strict";function vS(e){return e===0?.0032177478835464946:.0032177478835464946+e*(.0010898206731540065+e*(-.0012579159844784845+e*(.0006908420797309686+e*(-.00016376804137220805+e*(154012654012654e-19+e*16059043836821613e-26)))))}Q5.exports=vS});var e7=g((DY,j5)=>{"use strict";function mS(e){return e===0?.001743826229834001:.001743826229834001+e*(3353097688001788e-20+e*(-.0007624513544032393+e*(.0006451304695145635+e*(-.000249472580470431+e*(49255746366361444e-21+e*(-39851014346715405e-22+e*7647163731819816e-28))))))}j5.exports=mS});var t7=g((BY,r7)=>{"use strict";function dS(e){return e===0?.0009647274732138864:.0009647274732138864+e*(-.0003110108632631878+e*(-.00036307660358786886+e*(.0005140660578834113+e*(-.00029133414466938067+e*(9086710793521991e-20+e*(-15303004486655377e-21+e*(10914179173496788e-22+e*28114572543455206e-31)))))))}r7.exports=dS});var o7=g((xY,n7)=>{"use strict";function hS(e){return e===0?.0005422926281312969:.0005422926281312969+e*(-.0003694266780000966+e*(-.00010230378073700413+e*(.00035764655430568635+e*(-.00028690924218514614+e*(.00012645437628698076+e*(-33202652391372056e-21+e*(4890304529197534e-21+e*(-3123956959982987e-22+e*822063524662433e-32))))))))}n7.exports=hS});var s7=g((UY,i7)=>{"use strict";var gS=Yn(),_S=tr(),yS=M(),bS=ir(),wS=U5(),qS=G5(),PS=V5(),IS=J5(),$S=K5(),kS=Y5(),AS=e7(),OS=t7(),ES=o7(),NS=0,Ke=[1,0,0,0,0,0,0,0,0,0];function zS(e,r){var t,n;return n=gS(e/2,.5)*yS(e*bS)*(r-.5),t=1/e,Ke[1]=wS(t),Ke[2]=qS(t),Ke[3]=PS(t),Ke[4]=IS(t),Ke[5]=$S(t),Ke[6]=kS(t),Ke[7]=AS(t),Ke[8]=OS(t),Ke[9]=ES(t),NS+n*_S(Ke,n*n)}i7.exports=zS});var c7=g((HY,a7)=>{"use strict";var TS=Yn(),ZS=tr(),u7=M(),RS=re(),FS=ir(),Or=[0,0,0,0,0,0,0];function LS(e,r){var t,n,i,s,f,a,o,u;return u=TS(e/2,.5)*u7(e*FS)*r,s=e+2,f=e+4,a=e+6,Or[0]=1,Or[1]=-(e+1)/(2*s),s*=e+2,Or[2]=-e*(e+1)*(e+3)/(8*s*f),s*=e+2,Or[3]=-e*(e+1)*(e+5)*((3*e+7)*e-2)/(48*s*f*a),s*=e+2,f*=e+4,Or[4]=-e*(e+1)*(e+7)*(((((15*e+154)*e+465)*e+286)*e-336)*e+64)/(384*s*f*a*(e+8)),s*=e+2,Or[5]=-e*(e+1)*(e+3)*(e+9)*((((((35*e+452)*e+1573)*e+600)*e-2020)*e+928)*e-128)/(1280*s*f*a*(e+8)*(e+10)),s*=e+2,f*=e+4,a*=e+6,Or[6]=-e*(e+1)*(e+11)*(((((((((((945*e+31506)*e+425858)*e+2980236)*e+11266745)*e+20675018)*e+7747124)*e-22574632)*e-8565600)*e+18108416)*e-7099392)*e+884736)/(46080*s*f*a*(e+8)*(e+10)*(e+12)),o=u7(e),i=RS(o*u,1/e),n=i*i,t=ZS(Or,n),t*=o,t/=i,-t}a7.exports=LS});var m7=g((GY,v7)=>{"use strict";var f7=dt(),CS=Dr(),l7=M(),SS=re(),DS=Hn(),p7=_o();function BS(e,r){var t,n,i,s,f,a,o;return e>1e20?-f7(2*r)*p7:(t=1/(e-.5),n=48/(t*t),i=((20700*t/n-98)*t-16)*t+96.36,s=((94.5/(n+i)-3)/n+1)*l7(t*DS)*e,o=SS(s*2*r,2/e),o>.05+t?(a=-f7(2*r)*p7,o=a*a,e<5&&(i+=.3*(e-4.5)*(a+.6)),i+=(((.05*s*a-5)*a-7)*a-2)*a+n,o=(((((.4*o+6.3)*o+36)*o+94.5)/i-o-3)/n+1)*a,o=CS(t*o*o)):o=((1/(((e+6)/(e*o)-.089*s-.822)*(e+2)*3)+.5/(e+4))*o-1)*(e+1)/(e+2)+1/o,f=l7(e*o),-f)}v7.exports=BS});var I7=g((WY,P7)=>{"use strict";var d7=dt(),h7=ye(),iu=xr(),g7=ws(),xS=D5(),yo=M(),US=S(),_7=ro(),HS=re(),GS=st(),y7=_o(),b7=ir(),w7=s7(),bo=c7(),su=m7(),q7=268435456,WS=1/3,VS=106/3,MS=.8549879733383485;function JS(e,r,t){var n,i,s,f,a,o,u,c,l,p,v,m,h,_,d,y;if(a=0,r>t?(u=t,t=r,r=u,f=!0):f=!1,h7(e)===e&&e<20)switch(i=iu(1,VS),h7(e)){case 1:r===.5?a=0:a=-_7(b7*r)/GS(b7*r);break;case 2:a=(2*r-1)/yo(2*r*t);break;case 4:o=4*r*t,s=yo(o),h=4*_7(xS(s)/3)/s,_=yo(h-4),a=r-.5<0?-_:_;break;case 6:if(r<1e-150)return(f?-1:1)*su(e,r);d=4*(r-r*r),y=HS(d,WS),m=6*(1+MS*(1/y-1));do l=m*m,p=l*l,v=m*p,c=m,m=2*(8*d*v-270*l+2187)/(5*(4*d*p-216*m-243));while(US((m-c)/m)>i);m=yo(m-e),a=r-.5<0?-m:m;break;default:e>q7?a=d7(2*r)*y7:e<3?(n=.2742-e*.0242143,r>n?a=w7(e,r):a=bo(e,r)):(n=iu(1,g7(e/-.654)),r>n?a=su(e,r):a=bo(e,r))}else e>q7?a=-d7(2*r)*y7:e<3?(n=.2742-e*.0242143,r>n?a=w7(e,r):a=bo(e,r)):(n=iu(1,g7(e/-.654)),r>n?a=su(e,r):a=bo(e,r));return f?-a:a}P7.exports=JS});var k7=g((VY,$7)=>{"use strict";var XS=I7();function KS(e,r,t){var n,i,s,f;return i=r/2,s=1-i,n=e*2,f=XS(n,i,s),t&&(t.value=f*f/(n+f*f)),n/(n+f*f)}$7.exports=KS});var E7=g((MY,O7)=>{"use strict";var wo=tr(),QS=dt(),A7=M(),YS=H(),cr=_o(),J=[0,0,0,0,0,0,0],tn=[0,0,0,0];function jS(e,r,t){var n,i,s,f,a,o,u;return n=QS(2*t),n/=-A7(e/2),tn[0]=n,o=r-e,f=o*o,a=f*o,J[0]=-o*cr/2,J[1]=(1-2*o)/8,J[2]=-(o*cr/48),J[3]=-1/192,J[4]=-o*cr/3840,J[5]=0,J[6]=0,tn[1]=wo(J,n),J[0]=o*cr*(3*o-2)/12,J[1]=(20*f-12*o+1)/128,J[2]=o*cr*(20*o-1)/960,J[3]=(16*f+30*o-15)/4608,J[4]=o*cr*(21*o+32)/53760,J[5]=(-(32*f)+63)/368640,J[6]=-o*cr*(120*o+17)/25804480,tn[2]=wo(J,n),J[0]=o*cr*(-75*f+80*o-16)/480,J[1]=(-1080*a+868*f-90*o-45)/9216,J[2]=o*cr*(-1190*f+84*o+373)/53760,J[3]=(-2240*a-2508*f+2100*o-165)/368640,J[4]=0,J[5]=0,J[6]=0,tn[3]=wo(J,n),s=wo(tn,1/e),i=s*s,u=-YS(-i/2),i===0?.5:(1+s*A7((1+u)/i))/2}O7.exports=jS});var uu=g((JY,z7)=>{"use strict";var N7=x(),eD=wr(),qo=eD/4;function rD(e,r){return t;function t(n){var i,s,f;return f=1-n,f===0?[-qo,-qo]:n===0?[-qo,-qo]:(s=N7(n)+r*N7(f)+e,i=1/n-r/f,[s,i])}}z7.exports=rD});var Z7=g((XY,T7)=>{"use strict";var tD=R();function nD(e){return e===0||tD(e)?e:e<0?-1:1}T7.exports=nD});var nn=g((KY,R7)=>{"use strict";var oD=Z7();R7.exports=oD});var cu=g((QY,L7)=>{"use strict";var F7=nn(),Po=S(),iD=xr(),au=wr();function sD(e,r,t,n,i,s){var f,a,o,u,c,l,p,v,m,h;m=0,f=0,c=r,u=iD(1,1-i),p=au,a=au,o=au,l=s;do{if(f=m,o=a,a=p,v=e(c),m=v[0],h=v[1],l-=1,m===0)break;if(h===0?(f===0&&(c===t?r=n:r=t,f=e(r),p=r-c),F7(f)*F7(m)<0?p<0?p=(c-t)/2:p=(c-n)/2:p<0?p=(c-n)/2:p=(c-t)/2):p=m/h,Po(p*2)>Po(o)&&(p=p>0?(c-t)/2:(c-n)/2),r=c,c-=p,c<=t){if(p=.5*(r-t),c=r-p,c===t||c===n)break}else if(c>=n&&(p=.5*(r-n),c=r-p,c===t||c===n))break;p>0?n=r:t=r}while(l&&Po(c*u)<Po(p));return c}L7.exports=sD});var S7=g((YY,C7)=>{"use strict";function uD(e){return e===0?-1:-1+e*(-5+e*5)}C7.exports=uD});var B7=g((jY,D7)=>{"use strict";function aD(e){return e===0?1:1+e*(21+e*(-69+e*46))}D7.exports=aD});var U7=g((ej,x7)=>{"use strict";function cD(e){return e===0?7:7+e*(-2+e*(33+e*(-62+e*31)))}x7.exports=cD});var G7=g((rj,H7)=>{"use strict";function fD(e){return e===0?25:25+e*(-52+e*(-17+e*(88+e*(-115+e*46))))}H7.exports=fD});var V7=g((tj,W7)=>{"use strict";function lD(e){return e===0?7:7+e*(12+e*(-78+e*52))}W7.exports=lD});var J7=g((nj,M7)=>{"use strict";function pD(e){return e===0?-7:-7+e*(2+e*(183+e*(-370+e*185)))}M7.exports=pD});var K7=g((oj,X7)=>{"use strict";function vD(e){return e===0?-533:-533+e*(776+e*(-1835+e*(10240+e*(-13525+e*5410))))}X7.exports=vD});var Y7=g((ij,Q7)=>{"use strict";function mD(e){return e===0?-1579:-1579+e*(3747+e*(-3372+e*(-15821+e*(45588+e*(-45213+e*15071)))))}Q7.exports=mD});var e9=g((sj,j7)=>{"use strict";function dD(e){return e===0?449:449+e*(-1259+e*(-769+e*(6686+e*(-9260+e*3704))))}j7.exports=dD});var t9=g((uj,r9)=>{"use strict";function hD(e){return e===0?63149:63149+e*(-151557+e*(140052+e*(-727469+e*(2239932+e*(-2251437+e*750479)))))}r9.exports=hD});var o9=g((aj,n9)=>{"use strict";function gD(e){return e===0?29233:29233+e*(-78755+e*(105222+e*(146879+e*(-1602610+e*(3195183+e*(-2554139+e*729754))))))}n9.exports=gD});var s9=g((cj,i9)=>{"use strict";function _D(e){return e===0?1:1+e*(-13+e*13)}i9.exports=_D});var a9=g((fj,u9)=>{"use strict";function yD(e){return e===0?1:1+e*(21+e*(-69+e*46))}u9.exports=yD});var l9=g((lj,f9)=>{"use strict";var ht=tr(),bD=dt(),wD=S(),qD=H(),c9=x(),PD=M(),ID=st(),$D=ro(),kD=uu(),AD=cu(),OD=S7(),ED=B7(),ND=U7(),zD=G7(),TD=V7(),ZD=J7(),RD=K7(),FD=Y7(),LD=e9(),CD=t9(),SD=o9(),DD=s9(),BD=a9(),F=[0,0,0,0,0,0],on=[0,0,0,0];function xD(e,r,t){var n,i,s,f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P;return a=bD(2*e)/-PD(r/2),w=ID(t),b=$D(t),on[0]=a,d=w*w,y=b*b,h=w*b,m=h*h,v=m*h,p=m*m,l=m*v,c=v*v,u=p*v,F[0]=(2*d-1)/(3*h),F[1]=-OD(d)/(36*m),F[2]=ED(d)/(1620*v),F[3]=ND(d)/(6480*p),F[4]=zD(d)/(90720*l),F[5]=0,on[1]=ht(F,a),F[0]=-TD(d)/(405*v),F[1]=ZD(d)/(2592*p),F[2]=-RD(d)/(204120*l),F[3]=-FD(d)/(2099520*c),F[4]=0,F[5]=0,on[2]=ht(F,a),F[0]=LD(d)/(102060*l),F[1]=-CD(d)/(20995200*c),F[2]=SD(d)/(36741600*u),F[3]=0,F[4]=0,F[5]=0,on[3]=ht(F,a),o=ht(on,1/r),s=b/w,s*=s,_=-(o*o)/(2*d)+c9(d)+y*c9(y)/d,wD(o)<.7?(F[0]=d,F[1]=h,F[2]=(1-2*d)/3,F[3]=DD(d)/(36*h),F[4]=BD(d)/(270*m),F[5]=0,P=ht(F,o)):(q=qD(_),F[0]=q,F[1]=s,F[2]=0,F[3]=3*s*(3*s+1)/6,F[4]=4*s*(4*s+1)*(4*s+2)/24,F[5]=5*s*(5*s+1)*(5*s+2)*(5*s+3)/120,P=ht(F,q),(P-d)*o<0&&(P=1-P)),o<0?(i=0,n=d):(i=d,n=1),(P<i||P>n)&&(P=(i+n)/2),f=kD(-_,s),P=AD(f,P,i,n,32,100),P}f9.exports=xD});var v9=g((pj,p9)=>{var sn=1e3,un=sn*60,an=un*60,cn=an*24,UD=cn*365.25;p9.exports=function(e,r){r=r||{};var t=typeof e;if(t==="string"&&e.length>0)return HD(e);if(t==="number"&&isNaN(e)===!1)return r.long?WD(e):GD(e);throw new Error("val is not a non-empty string or a valid number. val="+JSON.stringify(e))};function HD(e){if(e=String(e),!(e.length>100)){var r=/^((?:\d+)?\.?\d+) *(milliseconds?|msecs?|ms|seconds?|secs?|s|minutes?|mins?|m|hours?|hrs?|h|days?|d|years?|yrs?|y)?$/i.exec(e);if(r){var t=parseFloat(r[1]),n=(r[2]||"ms").toLowerCase();switch(n){case"years":case"year":case"yrs":case"yr":case"y":return t*UD;case"days":case"day":case"d":return t*cn;case"hours":case"hour":case"hrs":case"hr":case"h":return t*an;case"minutes":case"minute":case"mins":case"min":case"m":return t*un;case"seconds":case"second":case"secs":case"sec":case"s":return t*sn;case"milliseconds":case"millisecond":case"msecs":case"msec":case"ms":return t;default:return}}}}function GD(e){return e>=cn?Math.round(e/cn)+"d":e>=an?Math.round(e/an)+"h":e>=un?Math.round(e/un)+"m":e>=sn?Math.round(e/sn)+"s":e+"ms"}function WD(e){return Io(e,cn,"day")||Io(e,an,"hour")||Io(e,un,"minute")||Io(e,sn,"second")||e+" ms"}function Io(e,r,t){if(!(e<r))return e<r*1.5?Math.floor(e/r)+" "+t:Math.ceil(e/r)+" "+t+"s"}});var d9=g((B,m9)=>{B=m9.exports=lu.debug=lu.default=lu;B.coerce=KD;B.disable=JD;B.enable=MD;B.enabled=XD;B.humanize=v9();B.names=[];B.skips=[];B.formatters={};var fu;function VD(e){var r=0,t;for(t in e)r=(r<<5)-r+e.charCodeAt(t),r|=0;return B.colors[Math.abs(r)%B.colors.length]}function lu(e){function r(){if(r.enabled){var t=r,n=+new Date,i=n-(fu||n);t.diff=i,t.prev=fu,t.curr=n,fu=n;for(var s=new Array(arguments.length),f=0;f<s.length;f++)s[f]=arguments[f];s[0]=B.coerce(s[0]),typeof s[0]!="string"&&s.unshift("%O");var a=0;s[0]=s[0].replace(/%([a-zA-Z%])/g,function(u,c){if(u==="%%")return u;a++;var l=B.formatters[c];if(typeof l=="function"){var p=s[a];u=l.call(t,p),s.splice(a,1),a--}return u}),B.formatArgs.call(t,s);var o=r.log||B.log||console.log.bind(console);o.apply(t,s)}}return r.namespace=e,r.enabled=B.enabled(e),r.useColors=B.useColors(),r.color=VD(e),typeof B.init=="function"&&B.init(r),r}function MD(e){B.save(e),B.names=[],B.skips=[];for(var r=(typeof e=="string"?e:"").split(/[\s,]+/),t=r.length,n=0;n<t;n++)r[n]&&(e=r[n].replace(/\*/g,".*?"),e[0]==="-"?B.skips.push(new RegExp("^"+e.substr(1)+"$")):B.names.push(new RegExp("^"+e+"$")))}function JD(){B.enable("")}function XD(e){var r,t;for(r=0,t=B.skips.length;r<t;r++)if(B.skips[r].test(e))return!1;for(r=0,t=B.names.length;r<t;r++)if(B.names[r].test(e))return!0;return!1}function KD(e){return e instanceof Error?e.stack||e.message:e}});var pu=g((le,g9)=>{le=g9.exports=d9();le.log=jD;le.formatArgs=YD;le.save=eB;le.load=h9;le.useColors=QD;le.storage=typeof chrome<"u"&&typeof chrome.storage<"u"?chrome.storage.local:rB();le.colors=["lightseagreen","forestgreen","goldenrod","dodgerblue","darkorchid","crimson"];function QD(){return typeof window<"u"&&window.process&&window.process.type==="renderer"?!0:typeof document<"u"&&document.documentElement&&document.documentElement.style&&document.documentElement.style.WebkitAppearance||typeof window<"u"&&window.console&&(window.console.firebug||window.console.exception&&window.console.table)||typeof navigator<"u"&&navigator.userAgent&&navigator.userAgent.toLowerCase().match(/firefox\/(\d+)/)&&parseInt(RegExp.$1,10)>=31||typeof navigator<"u"&&navigator.userAgent&&navigator.userAgent.toLowerCase().match(/applewebkit\/(\d+)/)}le.formatters.j=function(e){try{return JSON.stringify(e)}catch(r){return"[UnexpectedJSONParseError]: "+r.message}};function YD(e){var r=this.useColors;if(e[0]=(r?"%c":"")+this.namespace+(r?" %c":" ")+e[0]+(r?"%c ":" ")+"+"+le.humanize(this.diff),!!r){var t="color: "+this.color;e.splice(1,0,t,"color: inherit");var n=0,i=0;e[0].replace(/%[a-zA-Z%]/g,function(s){s!=="%%"&&(n++,s==="%c"&&(i=n))}),e.splice(i,0,t)}}function jD(){return typeof console=="object"&&console.log&&Function.prototype.apply.call(console.log,console,arguments)}function eB(e){try{e==null?le.storage.removeItem("debug"):le.storage.debug=e}catch{}}function h9(){var e;try{e=le.storage.debug}catch{}return!e&&typeof process<"u"&&"env"in process&&(e=process.env.DEBUG),e}le.enable(h9());function rB(){try{return window.localStorage}catch{}}});var fn=g((vj,_9)=>{"use strict";var tB=34028234663852886e22;_9.exports=tB});var P9=g((mj,q9)=>{"use strict";var nB=pu(),y9=Ws(),oB=S(),iB=H(),b9=x(),sB=fn(),w9=nB("gammaincinv:higher_newton");function uB(e,r,t,n,i,s,f,a){var o,u,c,l,p,v,m,h,_,d,y,b,w,q;q=e,y=1,b=1,v=r*r,u=e;do{if(q=e,m=q*q,t===0){if(o=(1-r)*b9(q)+q+s,o>b9(sB))return w9("Warning: overflow problems in one or more steps of the computation. The initial approximation to the root is returned."),u;w=iB(o)}else w=-f*q;a?(h=y9(q,r,!0,!1),c=-w*(h-n)):(_=y9(q,r,!0,!0),c=w*(_-i)),w=c,n>1e-120||b>1?(l=.5*(q-r+1)/q,p=(2*m-4*q*r+4*q+2*v-3*r+1)/m,p/=6,e=q+w*(1+w*(l+w*p))):e=q+w,y=oB(q/e-1),b+=1,q=e,q<0&&(q=u,b=100)}while(y>2e-14&&b<35);return(y>2e-14||b>99)&&w9("Warning: the number of iterations in the Newton method reached the upper limit N=35. The last value obtained for the root is given as output."),d=q||0,d}q9.exports=uB});var $9=g((dj,I9)=>{"use strict";function aB(e){return e===0?0:0+e*(1+e*(1+e*(1.5+e*(2.6666666666666665+e*(5.208333333333333+e*10.8)))))}I9.exports=aB});var A9=g((hj,k9)=>{"use strict";function cB(e){return e===0?1:1+e*(1+e*(.3333333333333333+e*(.027777777777777776+e*(-.003703703703703704+e*(.0002314814814814815+e*5878894767783657e-20)))))}k9.exports=cB});var vu=g((gj,E9)=>{"use strict";var fB=S(),lB=H(),O9=x(),pB=tr(),vB=$9(),mB=A9(),dB=1e-8,hB=.08333333333333333,gB=.008333333333333333,gt=[1,0,0,0,0,0];function _B(e){var r,t,n,i,s,f,a,o,u;if(u=e*e*.5,e===0?s=0:e<-1?(o=lB(-1-u),s=vB(o)):e<1?(o=e,s=mB(o)):(o=11+u,f=O9(o),s=o+f,o=1/o,r=f*f,t=r*f,n=t*f,i=n*f,gt[1]=(2-f)*.5,gt[2]=(-9*f+6+2*r)/6,gt[3]=-(3*t+36*f-22*r-12)*hB,gt[4]=(60+350*r-300*f-125*t+12*n)/60,gt[5]=-(-120-274*n+900*f-1700*r+1125*t+20*i)*gB,s+=f*o*pB(gt,o)),o=1,e>-3.5&&e<-.03||e>.03&&e<40){o=1,a=s;do s=a*(u+O9(a))/(a-1),o=fB(a/s-1),a=s;while(o>dB)}return s}E9.exports=_B});var z9=g((_j,N9)=>{"use strict";var yB=.9189385332046728;N9.exports=yB});var Z9=g((yj,T9)=>{"use strict";var bB=[1.9963790515900766,-.0017971032528832887,13129285796384672e-21,-2340875228178749e-22,72291210671127e-22,-3280997607821e-22,19875070901e-21,-1509214183e-21,1375340084e-22,-145728923e-22,17532367e-22,-2351465e-22,346551e-22,-55471e-22,9548e-22,-1748e-22,332e-22,-58e-22];function wB(e,r){var t,n,i,s,f;n=0,i=0,t=r+r,f=e;do s=i,i=n,n=t*i-s+bB[f],f-=1;while(f>=0);return(n-s)/2}T9.exports=wB});var F9=g((bj,R9)=>{"use strict";function qB(e){return e===0?.025721014990011306:.025721014990011306+e*(.08247596616699963+e*(-.0025328157302663564+e*(.0006099292666946337+e*(-.00033543297638406+e*.000250505279903))))}R9.exports=qB});var C9=g((wj,L9)=>{"use strict";function PB(e){return e===0?.08333333333333333:.08333333333333333+e*(-.002777777777777778+e*(.0007936507936507937+e*-.0005952380952380953))}L9.exports=PB});var D9=g((qj,S9)=>{"use strict";var mu=Wr(),$o=x(),du=z9(),IB=Jt(),$B=fn(),kB=Z9(),AB=F9(),OB=C9(),EB=.30865217988013566;function NB(e){var r;return e<IB?$B:e<1?mu(e+1)-(e+.5)*$o(e)+e-du:e<2?mu(e)-(e-.5)*$o(e)+e-du:e<3?mu(e-1)-(e-.5)*$o(e)+e-du+$o(e-1):e<12?(r=18/(e*e)-1,kB(17,r)/(12*e)):(r=1/(e*e),e<1e3?AB(r)/(EB+r)/e:OB(r)/e)}S9.exports=NB});var U9=g((Pj,x9)=>{"use strict";var B9=H(),zB=He(),TB=x(),ZB=fn(),RB=xt(),FB=D9();function LB(e){return e>=3?B9(FB(e)):e>0?zB(e)/(B9(-e+(e-.5)*TB(e))*RB):ZB}x9.exports=LB});var G9=g((Ij,H9)=>{"use strict";function CB(e){var r,t,n;return e===0?-.3333333333438:(e<0?r=-e:r=e,r<=1?(t=-.3333333333438+e*(-.2070740359969+e*(-.05041806657154+e*(-.004923635739372+e*-4293658292782e-17))),n=1+e*(.7045554412463+e*(.2118190062224+e*(.03048648397436+e*.001605037988091)))):(e=1/e,t=-4293658292782e-17+e*(-.004923635739372+e*(-.05041806657154+e*(-.2070740359969+e*-.3333333333438))),n=.001605037988091+e*(.03048648397436+e*(.2118190062224+e*(.7045554412463+e*1)))),t/n)}H9.exports=CB});var V9=g(($j,W9)=>{"use strict";var SB=S(),DB=x(),BB=vu(),xB=G9();function UB(e){var r;return SB(e)<1?xB(e):(r=BB(e),DB(e/(r-1))/e)}W9.exports=UB});var J9=g((kj,M9)=>{"use strict";function HB(e){var r,t,n;return e===0?-.0172847633523:(e<0?r=-e:r=e,r<=1?(t=-.0172847633523+e*(-.0159372646475+e*(-.00464910887221+e*(-.00060683488776+e*-614830384279e-17))),n=1+e*(.764050615669+e*(.297143406325+e*(.0579490176079+e*.00574558524851)))):(e=1/e,t=-614830384279e-17+e*(-.00060683488776+e*(-.00464910887221+e*(-.0159372646475+e*-.0172847633523))),n=.00574558524851+e*(.0579490176079+e*(.297143406325+e*(.764050615669+e*1)))),t/n)}M9.exports=HB});var K9=g((Aj,X9)=>{"use strict";function GB(e){var r,t,n;return e===0?-.0172839517431:(e<0?r=-e:r=e,r<=1?(t=-.0172839517431+e*(-.0146362417966+e*(-.00357406772616+e*(-.000391032032692+e*249634036069e-17))),n=1+e*(.690560400696+e*(.249962384741+e*(.0443843438769+e*.00424073217211)))):(e=1/e,t=249634036069e-17+e*(-.000391032032692+e*(-.00357406772616+e*(-.0146362417966+e*-.0172839517431))),n=.00424073217211+e*(.0443843438769+e*(.249962384741+e*(.690560400696+e*1)))),t/n)}X9.exports=GB});var Y9=g((Oj,Q9)=>{"use strict";function WB(e){var r,t,n;return e===0?.99994466948:(e<0?r=-e:r=e,r<=1?(t=.99994466948+e*(104.649839762+e*(857.204033806+e*(731.901559577+e*45.5174411671))),n=1+e*(104.526456943+e*(823.313447808+e*(3119.93802124+e*3970.03311219)))):(e=1/e,t=45.5174411671+e*(731.901559577+e*(857.204033806+e*(104.649839762+e*.99994466948))),n=3970.03311219+e*(3119.93802124+e*(823.313447808+e*(104.526456943+e*1)))),t/n)}Q9.exports=WB});var eh=g((Ej,j9)=>{"use strict";var VB=x(),MB=J9(),JB=K9(),XB=Y9();function KB(e){var r,t;return e<-5?(t=e*e,r=VB(-e),(12-t-6*(r*r))/(12*t*e)):e<-2?MB(e):e<2?JB(e):e<1e3?(t=1/e,XB(e)/(-12*e)):-1/(12*e)}j9.exports=KB});var th=g((Nj,rh)=>{"use strict";function QB(e){var r,t,n;return e===0?.0495346498136:(e<0?r=-e:r=e,r<=1?(t=.0495346498136+e*(.0299521337141+e*(.00688296911516+e*(.000512634846317+e*-201411722031e-16))),n=1+e*(.759803615283+e*(.261547111595+e*(.0464854522477+e*.00403751193496)))):(e=1/e,t=-201411722031e-16+e*(.000512634846317+e*(.00688296911516+e*(.0299521337141+e*.0495346498136))),n=.00403751193496+e*(.0464854522477+e*(.261547111595+e*(.759803615283+e*1)))),t/n)}rh.exports=QB});var oh=g((zj,nh)=>{"use strict";function YB(e){var r,t,n;return e===0?.00452313583942:(e<0?r=-e:r=e,r<=1?(t=.00452313583942+e*(.00120744920113+e*(-789724156582e-16+e*(-504476066942e-16+e*-535770949796e-17))),n=1+e*(.912203410349+e*(.405368773071+e*(.0901638932349+e*.00948935714996)))):(e=1/e,t=-535770949796e-17+e*(-504476066942e-16+e*(-789724156582e-16+e*(.00120744920113+e*.00452313583942))),n=.00948935714996+e*(.0901638932349+e*(.405368773071+e*(.912203410349+e*1)))),t/n)}nh.exports=YB});var sh=g((Tj,ih)=>{"use strict";function jB(e){var r,t,n;return e===0?.00439937562904:(e<0?r=-e:r=e,r<=1?(t=.00439937562904+e*(.000487225670639+e*(-.000128470657374+e*(529110969589e-17+e*15716677175e-17))),n=1+e*(.794435257415+e*(.333094721709+e*(.0703527806143+e*.00806110846078)))):(e=1/e,t=15716677175e-17+e*(529110969589e-17+e*(-.000128470657374+e*(.000487225670639+e*.00439937562904))),n=.00806110846078+e*(.0703527806143+e*(.333094721709+e*(.794435257415+e*1)))),t/n)}ih.exports=jB});var ah=g((Zj,uh)=>{"use strict";function ex(e){var r,t,n;return e===0?-.0011481191232:(e<0?r=-e:r=e,r<=1?(t=-.0011481191232+e*(-.112850923276+e*(1.51623048511+e*(-.218472031183+e*.0730002451555))),n=1+e*(14.2482206905+e*(69.7360396285+e*(218.938950816+e*277.067027185)))):(e=1/e,t=.0730002451555+e*(-.218472031183+e*(1.51623048511+e*(-.112850923276+e*-.0011481191232))),n=277.067027185+e*(218.938950816+e*(69.7360396285+e*(14.2482206905+e*1)))),t/n)}uh.exports=ex});var fh=g((Rj,ch)=>{"use strict";function rx(e){var r,t,n;return e===0?-.000145727889667:(e<0?r=-e:r=e,r<=1?(t=-.000145727889667+e*(-.290806748131+e*(-13.308504545+e*(199.722374056+e*-11.4311378756))),n=1+e*(139.612587808+e*(2189.01116348+e*(7115.24019009+e*45574.6081453)))):(e=1/e,t=-11.4311378756+e*(199.722374056+e*(-13.308504545+e*(-.290806748131+e*-.000145727889667))),n=45574.6081453+e*(7115.24019009+e*(2189.01116348+e*(139.612587808+e*1)))),t/n)}ch.exports=rx});var vh=g((Fj,ph)=>{"use strict";var lh=x(),tx=th(),nx=oh(),ox=sh(),ix=ah(),sx=fh();function ux(e){var r,t;return e<-8?(r=e*e,t=lh(-e)/e,(-30+e*t*(6*r*t*t-12+r))/(12*e*r*r)):e<-4?tx(e)/(e*e):e<-2?nx(e):e<2?ox(e):e<10?(r=1/e,ix(r)/(e*e)):e<100?(r=1/e,sx(r)/(e*e)):-lh(e)/(12*e*e*e)}ph.exports=ux});var qh=g((Lj,wh)=>{"use strict";var ax=pu(),mh=tr(),Fe=Wr(),cx=dt(),dh=He(),ko=M(),hh=S(),_t=H(),fx=Ue(),lx=re(),$e=x(),px=xt(),vx=fn(),mx=zs(),dx=P9(),gh=vu(),_h=U9(),hx=V9(),gx=eh(),_x=vh(),yx=ax("gammaincinv:compute"),Er=.5,hu=.3333333333333333,bx=.25,yh=.2,bh=.16666666666666666,wx=.08333333333333333,qx=.041666666666666664,ke=[0,0,0,0,0];function Px(e,r,t){var n,i,s,f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P,I,A,O,C,L,Z,V,ne,k,T,se,me,de,qe,ue,Q,U,Rr,j,er,Te,_i,yi,bi;if(r<Er?(f=!0,a=r,_i=-1):(f=!1,a=t,_i=1),j=0,hh(e-1)<1e-4&&(er=0,f?r<.001?(me=r*r,ne=me*r,se=ne*r,P=se*r,q=P*r,I=r+me*Er+ne*hu+se*bx+P*yh+q*bh):I=-$e(1-r):I=-$e(t),e===1?(j=2,qe=I):(s=Fe(e),j=1)),t<1e-30&&e<Er&&(er=0,I=-$e(t*dh(e))+(e-1)*$e(-$e(t*dh(e))),j=1,s=Fe(e)),e>1&&e<500&&r<1e-80){for(er=0,o=1/e,n=1/(e+1),I=(Fe(e+1)+$e(r))*o,I=_t(I),_=I,Rr=0;Rr<10;Rr++)I=_*_t(I*o)*lx(1-I*n,o);j=1,s=Fe(e)}if(u=1/e*($e(r)+Fe(e+1)),u<$e(yh*(1+e))&&j===0&&(Te=_t(u),er=0,A=e*e,de=A*e,k=de*e,d=e+1,v=d*d,p=d*v,l=v*v,y=e+2,c=y*y,b=e+3,ke[0]=1,ke[1]=1/d,ke[2]=Er*(3*e+5)/(v*y),ke[3]=hu*(31+8*A+33*e)/(p*y*b),ke[4]=qx*(2888+1179*de+125*k+3971*A+5661*e)/(l*c*b*(e+4)),I=Te*mh(ke,Te),s=Fe(e),j=1),e<10&&j===0&&(m=ko(e)/(_h(e)*px),h=fx(.02,m),t<h&&(er=0,Q=1-e,Z=Q*Q,V=Z*Q,w=ko(-2/e*$e(t/m)),I=e*gh(w),U=$e(I),I>5?(O=U*U,C=O*U,L=C*U,Te=1/I,ke[0]=U-1,ke[1]=(3*Q-2*Q*U+O-2*U+2)*Er,ke[2]=(24*Q*U-11*Z-24*Q-6*O+12*U-12-9*Q*O+6*Z*U+2*C)*bh,ke[3]=(-12*V*U+8.04*Q*O-114*Z*U+(72+36*O)+(3*L-72*U+162)*(Q-168*Q*U)-(12*C+25*V)-(22*Q*C+36*Z*O+120*Z))*wx,ke[4]=0,I=I-U+Q*Te*mh(ke,Te)):(Te=1/I,O=U*U,ue=U-1,yi=U-Q*Te*ue,yi<I&&(I-=yi)),s=Fe(e),j=1)),hh(a-Er)<1e-5&&j===0&&(er=0,o=1/e,I=e-hu+(.019753086419753086+.007211444248481286*o)*o,s=Fe(e),j=1),e<1&&j===0&&(er=0,f?I=_t(1/e*($e(a)+Fe(e+1))):I=_t(1/e*($e(1-a)+Fe(e+1))),s=Fe(e),j=1),j===0)if(er=1,o=1/e,Te=cx(2*a),w=_i*Te/ko(e*Er),Te<vx)w+=(hx(w)+(gx(w)+_x(w)*o)*o)*o,I=e*gh(w),bi=w,T=-ko(e/mx)*_t(-Er*e*bi*bi)/_h(e),i=1/T;else return yx("Warning: Overflow problems in one or more steps of the computation."),NaN;return j<2&&(qe=dx(I,e,er,r,t,s,i,f)),qe}wh.exports=Px});var Ah=g((Cj,kh)=>{"use strict";var Ph=R(),Ix=Jt(),Ih=ee(),$h=qh();function $x(e,r,t){return Ph(e)||Ph(r)?NaN:r<Ix?NaN:e>1||e<0?NaN:t===!0?e===0?Ih:e===1?0:$h(r,1-e,e):e===0?0:e===1?Ih:$h(r,e,1-e)}kh.exports=$x});var Eh=g((Sj,Oh)=>{"use strict";var kx=Ah();Oh.exports=kx});var zh=g((Dj,Nh)=>{"use strict";var Ax=5e-324;Nh.exports=Ax});var Fh=g((Bj,Rh)=>{"use strict";var Th=Eh(),Zh=x(),Ox=M(),Ex=zh(),Nx=uu(),zx=cu();function Tx(e,r,t,n){var i,s,f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P,I,A,O,C,L,Z,V,ne,k,T,se;return t<n?o=Th(t,r,!0):o=Th(n,r,!1),o/=e,d=r/e,k=Ox(1+d),q=k*k,P=q*k,I=q*q,A=P*q,O=P*P,C=I*P,L=I*I,Z=A*I,c=A*A,ne=o-d,y=ne*ne,b=y*ne,w=y*y,V=k+1,l=V*V,p=V*l,v=l*l,m=(k+2)*(k-1)/(3*k),m+=(P+9*q+21*k+5)*ne/(36*q*V),m-=(I-13*P+69*q+167*k+46)*y/(1620*l*P),m-=(7*A+21*I+70*P+26*q-93*k-31)*b/(6480*p*I),m-=(75*O+202*A+188*I-888*P-1345*q+118*k+138)*w/(272160*v*A),h=(28*I+131*P+402*q+581*k+208)*(k-1)/(1620*V*P),h-=(35*O-154*A-623*I-1636*P-3983*q-3514*k-925)*ne/(12960*l*I),h-=(2132*C+7915*O+16821*A+35066*I+87490*P+141183*q+95993*k+21640)*y/(816480*A*p),h-=(11053*L+53308*C+117010*O+163924*A+116188*I-258428*P-677042*q-481940*k-105497)*b/(14696640*v*O),_=-((3592*C+8375*O-1323*A-29198*I-89578*P-154413*q-116063*k-29632)*(k-1))/(816480*A*l),_-=(442043*Z+2054169*L+3803094*C+3470754*O+2141568*A-2393568*I-19904934*P-34714674*q-23128299*k-5253353)*ne/(146966400*O*p),_-=(116932*c+819281*Z+2378172*L+4341330*C+6806004*O+10622748*A+18739500*I+30651894*P+30869976*q+15431867*k+2919016)*y/(146966400*v*C),u=o+m/e+h/(e*e)+_/(e*e*e),u<=0&&(u=Ex),T=u-d*Zh(u)+(1+d)*Zh(1+d)-d,i=1/(1+d),f=u<d?i:0,a=u<d?1:i,se=(f+a)/2,s=Nx(T,d),zx(s,se,f,a,32,100)}Rh.exports=Tx});var Ch=g((xj,Lh)=>{"use strict";var oe=S(),Zx=xr(),gu=nn(),Rx=or(),_u=wr();function Fx(e,r,t,n,i,s){var f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q;b=0,a=!1,l=r,c=Zx(1,1-i),m=Rx(1e7*r,1e7),p=0,o=m,u=m,v=s;do{if(p=b,u=o,o=m,y=e(l),b=y[0],w=y[1],q=y[2],v-=1,b===0)break;if(w===0?(p===0&&(l===t?r=n:r=t,p=e(r),m=r-l),gu(p)*gu(b)<0?m<0?m=(l-t)/2:m=(l-n)/2:m<0?m=(l-n)/2:m=(l-t)/2):q===0?m=b/w:(h=2*b,d=2*w-b*(q/w),oe(d)<1&&oe(h)>=oe(d)*_u?m=b/w:m=h/d,m*w/b<0&&(m=b/w,oe(m)>2*oe(r)&&(m=(m<0?-1:1)*2*oe(r)))),f=oe(m/u),f>.8&&f<2&&(m=m>0?(l-t)/2:(l-n)/2,oe(m)>l&&(m=gu(m)*l),u=m*3),r=l,l-=m,l<t){if(oe(t)<1&&oe(l)>1&&_u/oe(l)<oe(t)?_=1e3:_=l/t,oe(_)<1&&(_=1/_),!a&&_>0&&_<3)m=.99*(r-t),l=r-m,a=!0;else if(m=(r-t)/2,l=r-m,l===t||l===n)break}else if(l>n){if(oe(n)<1&&oe(l)>1&&_u/oe(l)<oe(n)?_=1e3:_=l/n,oe(_)<1&&(_=1/_),!a&&_>0&&_<3)m=.99*(r-n),l=r-m,a=!0;else if(m=(r-n)/2,l=r-m,l===t||l===n)break}m>0?n=r:t=r}while(v&&oe(l*c)<oe(m));return l}Lh.exports=Fx});var Dh=g((Uj,Sh)=>{"use strict";var Lx=ou().assign,Cx=S(),Sx=wr(),yu=_r();function Dx(e,r,t,n){return i;function i(s){var f,a,o,u,c;return c=1-s,f=[0,0],Lx(s,e,r,!0,n,f,1,0),u=f[0]-t,a=f[1],n&&(a=-a),c===0&&(c=yu*64),s===0&&(s=yu*64),o=a*(-(c*e)+(r-2)*s+1),Cx(o)<c*s*Sx&&(o/=c*s),n&&(o=-o),a===0&&(a=(n?-1:1)*yu*64),[u,a,o]}}Sh.exports=Dx});var Xh=g((Hj,Jh)=>{"use strict";var Bx=tr(),Bh=mt(),bu=Dr(),xh=xe(),xx=Rn(),yt=ls(),Uh=M(),Ux=S(),Hh=H(),Qe=re(),Gh=st(),Hx=or(),Gx=Ue(),Wh=x(),wu=_r(),Vh=Hn(),Mh=Ze(),Wx=k7(),Vx=E7(),Mx=l9(),Jx=Fh(),Xx=Ch(),Kx=Dh(),Qx=32,Yx=1e3,Jr=[0,0,0,0,0];function jx(e,r,t,n){var i,s,f,a,o,u,c,l,p,v,m,h,_,d,y,b,w,q,P,I,A,O,C,L,Z,V,ne,k,T;if(s=!1,n===0)return[1,0];if(t===0)return[0,1];if(e===1){if(r===1)return[t,1-t];h=r,r=e,e=h,h=n,n=t,t=h,s=!0}if(k=0,a=0,u=1,e===.5){if(r===.5)return k=Gh(t*Vh),k*=k,T=Gh(n*Vh),T*=T,[k,T];r>.5&&(h=r,r=e,e=h,h=n,n=t,t=h,s=!s)}if(r===.5&&e>=.5&&t!==1)A={},k=Wx(e,t,A),T=A.value;else{if(r===1)return t<n?e>1?(k=Qe(t,1/e),T=-bu(Wh(t)/e)):(k=Qe(t,1/e),T=1-k):(k=Hh(xh(-n)/e),T=-bu(xh(-n)/e)),s&&(h=T,T=k,k=h),[k,T];if(e+r>5)t>.5&&(h=r,r=e,e=h,h=n,n=t,t=h,s=!s),p=Gx(e,r),l=Hx(e,r),Uh(p)>l-p&&p>5?(k=Vx(e,r,t),T=1-k):(Z=e+r,o=xx(Uh(e/Z)),f=p/Z,f>=.2&&f<=.8&&Z>=10?(m=Qe(t,1/e),m<.0025&&e+r<200?k=m*Qe(e*yt(e,r),1/e):k=Mx(t,Z,o),T=1-k):(e<r&&(h=r,r=e,e=h,h=n,n=t,t=h,s=!s),v=0,r<2&&(v=yt(e,r)),v===0?T=1:(T=Qe(r*n*v,1/r),k=1-T)),T>1e-5&&(k=Jx(e,r,t,n),T=1-k));else if(e<1&&r<1){if(I=(1-e)/(2-e-r),b=Bh(I,e,r)-t,Ux(b)/t<Mh*3)return s?[1-I,I]:[I,1-I];b<0&&(h=r,r=e,e=h,h=n,n=t,t=h,s=!s,I=1-I),P=Qe(e*t*yt(e,r),1/e),k=P/(1+P),T=1/(1+P),k>I&&(k=I),u=I}else e>1&&r>1?(I=(e-1)/(e+r-2),_=(r-1)/(e+r-2),q=Bh(I,e,r)-t,q<0&&(h=r,r=e,e=h,h=n,n=t,t=h,h=_,_=I,I=h,s=!s),w=Wh(t*e*yt(e,r))/e,k=Hh(w),T=k<.9?1-k:-bu(w),r<e&&k<.2&&(d=e-1,y=r-1,O=e*e,C=e*O,L=r*r,Jr[0]=0,Jr[1]=1,Jr[2]=y/d,d*=d,Jr[3]=y*(3*e*r+5*r+O-e-4)/(2*(e+2)*d),d*=e+1,Jr[4]=y*(33*e*L+31*L+8*O*L-30*e*r-47*r+11*O*r+6*C*r+18+4*e-C+O*O-10*O),Jr[4]/=3*(e+3)*(e+2)*d,k=Bx(Jr,k)),k>I&&(k=I),u=I):(r<e&&(h=r,r=e,e=h,h=n,n=t,t=h,s=!s),Qe(t,1/e)<.5?(k=Qe(t*e*yt(e,r),1/e),k===0&&(k=wu),T=1-k):(T=Qe(1-Qe(t,r*yt(e,r)),1/r),T===0&&(T=wu),k=1-T))}return k>.5&&(h=r,r=e,e=h,h=n,n=t,t=h,h=T,T=k,k=h,s=!s,V=1-u,ne=1-a,a=V,u=ne),a===0&&(s?(a=Mh,k<a&&(k=a)):a=wu,k<a&&(k=a)),i=Qx,k<1e-50&&(e<1||r<1)&&(i*=3,i/=2),c=Kx(e,r,t<n?t:n,t>=n),k=Xx(c,k,a,u,i,Yx),k===a&&(k=0),s?[1-k,k]:[k,1-k]}Jh.exports=jx});var Ao=g((Gj,Kh)=>{"use strict";var eU=Xh();Kh.exports=eU});var jh=g((Wj,Yh)=>{"use strict";var qu=R(),Qh=Ao();function rU(e,r,t,n){return qu(e)||qu(r)||qu(t)?NaN:r<=0||t<=0?NaN:e<0||e>1?NaN:n?Qh(r,t,1-e,e)[0]:Qh(r,t,e,1-e)[0]}Yh.exports=rU});var Pu=g((Vj,e8)=>{"use strict";var tU=jh();e8.exports=tU});var t8=g((Mj,r8)=>{"use strict";var nU=Pu(),Iu=R();function oU(e,r,t){return Iu(e)||Iu(r)||Iu(t)||r<=0||t<=0||e<0||e>1?NaN:nU(e,r,t)}r8.exports=oU});var o8=g((Jj,n8)=>{"use strict";function iU(e){return r;function r(){return e}}n8.exports=iU});var ln=g((Xj,i8)=>{"use strict";var sU=o8();i8.exports=sU});var u8=g((Kj,s8)=>{"use strict";var uU=ln(),aU=Pu(),$u=R();function cU(e,r){if($u(e)||$u(r)||e<=0||r<=0)return uU(NaN);return t;function t(n){return $u(n)||n<0||n>1?NaN:aU(n,e,r)}}s8.exports=cU});var f8=g((Qj,c8)=>{"use strict";var fU=rr(),a8=t8(),lU=u8();fU(a8,"factory",lU);c8.exports=a8});var m8=g((ree,v8)=>{"use strict";var pU=Ao(),p8=R(),vU=nn(),mU=M();function dU(e,r){var t,n;return p8(r)||p8(e)||r<=0||e<0||e>1?NaN:(t=e>.5?1-e:e,n=pU(r/2,.5,2*t,1-2*t),vU(e-.5)*mU(r*n[1]/n[0]))}v8.exports=dU});var g8=g((tee,h8)=>{"use strict";var hU=ln(),gU=Ao(),d8=R(),_U=nn(),yU=M();function bU(e){if(d8(e)||e<=0)return hU(NaN);return r;function r(t){var n,i;return d8(t)||t<0||t>1?NaN:(n=t>.5?1-t:t,i=gU(e/2,.5,2*n,1-2*n),_U(t-.5)*yU(e*i[1]/i[0]))}}h8.exports=bU});var b8=g((nee,y8)=>{"use strict";var wU=rr(),_8=m8(),qU=g8();wU(_8,"factory",qU);y8.exports=_8});var Oo=g((Ou,w8)=>{(function(e,r){typeof Ou=="object"?w8.exports=r():typeof define=="function"&&define.amd?define(r):e.jStat=r()})(Ou,function(){var e=(function(r,t){var n=Array.prototype.concat,i=Array.prototype.slice,s=Object.prototype.toString;function f(_,d){var y=_>d?_:d;return r.pow(10,17-~~(r.log(y>0?y:-y)*r.LOG10E))}var a=Array.isArray||function(d){return s.call(d)==="[object Array]"};function o(_){return s.call(_)==="[object Function]"}function u(_){return typeof _=="number"?_-_===0:!1}function c(_){return n.apply([],_)}function l(){return new l._init(arguments)}l.fn=l.prototype,l._init=function(d){if(a(d[0]))if(a(d[0][0])){o(d[1])&&(d[0]=l.map(d[0],d[1]));for(var y=0;y<d[0].length;y++)this[y]=d[0][y];this.length=d[0].length}else this[0]=o(d[1])?l.map(d[0],d[1]):d[0],this.length=1;else if(u(d[0]))this[0]=l.seq.apply(null,d),this.length=1;else{if(d[0]instanceof l)return l(d[0].toArray());this[0]=[],this.length=1}return this},l._init.prototype=l.prototype,l._init.constructor=l,l.utils={calcRdx:f,isArray:a,isFunction:o,isNumber:u,toVector:c},l._random_fn=r.random,l.setRandom=function(d){if(typeof d!="function")throw new TypeError("fn is not a function");l._random_fn=d},l.extend=function(d){var y,b;if(arguments.length===1){for(b in d)l[b]=d[b];return this}for(y=1;y<arguments.length;y++)for(b in arguments[y])d[b]=arguments[y][b];return d},l.rows=function(d){return d.length||1},l.cols=function(d){return d[0].length||1},l.dimensions=function(d){return{rows:l.rows(d),cols:l.cols(d)}},l.row=function(d,y){return a(y)?y.map(function(b){return l.row(d,b)}):d[y]},l.rowa=function(d,y){return l.row(d,y)},l.col=function(d,y){if(a(y)){var b=l.arange(d.length).map(function(){return new Array(y.length)});return y.forEach(function(P,I){l.arange(d.length).forEach(function(A){b[A][I]=d[A][P]})}),b}for(var w=new Array(d.length),q=0;q<d.length;q++)w[q]=[d[q][y]];return w},l.cola=function(d,y){return l.col(d,y).map(function(b){return b[0]})},l.diag=function(d){for(var y=l.rows(d),b=new Array(y),w=0;w<y;w++)b[w]=[d[w][w]];return b},l.antidiag=function(d){for(var y=l.rows(d)-1,b=new Array(y),w=0;y>=0;y--,w++)b[w]=[d[w][y]];return b},l.transpose=function(d){var y=[],b,w,q,P,I;for(a(d[0])||(d=[d]),w=d.length,q=d[0].length,I=0;I<q;I++){for(b=new Array(w),P=0;P<w;P++)b[P]=d[P][I];y.push(b)}return y.length===1?y[0]:y},l.map=function(d,y,b){var w,q,P,I,A;for(a(d[0])||(d=[d]),q=d.length,P=d[0].length,I=b?d:new Array(q),w=0;w<q;w++)for(I[w]||(I[w]=new Array(P)),A=0;A<P;A++)I[w][A]=y(d[w][A],w,A);return I.length===1?I[0]:I},l.cumreduce=function(d,y,b){var w,q,P,I,A;for(a(d[0])||(d=[d]),q=d.length,P=d[0].length,I=b?d:new Array(q),w=0;w<q;w++)for(I[w]||(I[w]=new Array(P)),P>0&&(I[w][0]=d[w][0]),A=1;A<P;A++)I[w][A]=y(I[w][A-1],d[w][A]);return I.length===1?I[0]:I},l.alter=function(d,y){return l.map(d,y,!0)},l.create=function(d,y,b){var w=new Array(d),q,P;for(o(y)&&(b=y,y=d),q=0;q<d;q++)for(w[q]=new Array(y),P=0;P<y;P++)w[q][P]=b(q,P);return w};function p(){return 0}l.zeros=function(d,y){return u(y)||(y=d),l.create(d,y,p)};function v(){return 1}l.ones=function(d,y){return u(y)||(y=d),l.create(d,y,v)},l.rand=function(d,y){return u(y)||(y=d),l.create(d,y,l._random_fn)};function m(_,d){return _===d?1:0}l.identity=function(d,y){return u(y)||(y=d),l.create(d,y,m)},l.symmetric=function(d){var y=d.length,b,w;if(d.length!==d[0].length)return!1;for(b=0;b<y;b++)for(w=0;w<y;w++)if(d[w][b]!==d[b][w])return!1;return!0},l.clear=function(d){return l.alter(d,p)},l.seq=function(d,y,b,w){o(w)||(w=!1);var q=[],P=f(d,y),I=(y*P-d*P)/((b-1)*P),A=d,O;for(O=0;A<=y&&O<b;O++,A=(d*P+I*P*O)/P)q.push(w?w(A,O):A);return q},l.arange=function(d,y,b){var w=[],q;if(b=b||1,y===t&&(y=d,d=0),d===y||b===0)return[];if(d<y&&b<0)return[];if(d>y&&b>0)return[];if(b>0)for(q=d;q<y;q+=b)w.push(q);else for(q=d;q>y;q+=b)w.push(q);return w},l.slice=(function(){function _(y,b,w,q){var P,I=[],A=y.length;if(b===t&&w===t&&q===t)return l.copy(y);if(b=b||0,w=w||y.length,b=b>=0?b:A+b,w=w>=0?w:A+w,q=q||1,b===w||q===0)return[];if(b<w&&q<0)return[];if(b>w&&q>0)return[];if(q>0)for(P=b;P<w;P+=q)I.push(y[P]);else for(P=b;P>w;P+=q)I.push(y[P]);return I}function d(y,b){var w,q;if(b=b||{},u(b.row)){if(u(b.col))return y[b.row][b.col];var P=l.rowa(y,b.row);return w=b.col||{},_(P,w.start,w.end,w.step)}if(u(b.col)){var I=l.cola(y,b.col);return q=b.row||{},_(I,q.start,q.end,q.step)}q=b.row||{},w=b.col||{};var A=_(y,q.start,q.end,q.step);return A.map(function(O){return _(O,w.start,w.end,w.step)})}return d})(),l.sliceAssign=function(d,y,b){var w,q;if(u(y.row)){if(u(y.col))return d[y.row][y.col]=b;y.col=y.col||{},y.col.start=y.col.start||0,y.col.end=y.col.end||d[0].length,y.col.step=y.col.step||1,w=l.arange(y.col.start,r.min(d.length,y.col.end),y.col.step);var P=y.row;return w.forEach(function(A,O){d[P][A]=b[O]}),d}if(u(y.col)){y.row=y.row||{},y.row.start=y.row.start||0,y.row.end=y.row.end||d.length,y.row.step=y.row.step||1,q=l.arange(y.row.start,r.min(d[0].length,y.row.end),y.row.step);var I=y.col;return q.forEach(function(A,O){d[A][I]=b[O]}),d}return b[0].length===t&&(b=[b]),y.row.start=y.row.start||0,y.row.end=y.row.end||d.length,y.row.step=y.row.step||1,y.col.start=y.col.start||0,y.col.end=y.col.end||d[0].length,y.col.step=y.col.step||1,q=l.arange(y.row.start,r.min(d.length,y.row.end),y.row.step),w=l.arange(y.col.start,r.min(d[0].length,y.col.end),y.col.step),q.forEach(function(A,O){w.forEach(function(C,L){d[A][C]=b[O][L]})}),d},l.diagonal=function(d){var y=l.zeros(d.length,d.length);return d.forEach(function(b,w){y[w][w]=b}),y},l.copy=function(d){return d.map(function(y){return u(y)?y:y.map(function(b){return b})})};var h=l.prototype;return h.length=0,h.push=Array.prototype.push,h.sort=Array.prototype.sort,h.splice=Array.prototype.splice,h.slice=Array.prototype.slice,h.toArray=function(){return this.length>1?i.call(this):i.call(this)[0]},h.map=function(d,y){return l(l.map(this,d,y))},h.cumreduce=function(d,y){return l(l.cumreduce(this,d,y))},h.alter=function(d){return l.alter(this,d),this},(function(_){for(var d=0;d<_.length;d++)(function(y){h[y]=function(b){var w=this,q;return b?(setTimeout(function(){b.call(w,h[y].call(w))}),this):(q=l[y](this),a(q)?l(q):q)}})(_[d])})("transpose clear symmetric rows cols dimensions diag antidiag".split(" ")),(function(_){for(var d=0;d<_.length;d++)(function(y){h[y]=function(b,w){var q=this;return w?(setTimeout(function(){w.call(q,h[y].call(q,b))}),this):l(l[y](this,b))}})(_[d])})("row col".split(" ")),(function(_){for(var d=0;d<_.length;d++)(function(y){h[y]=function(){return l(l[y].apply(null,arguments))}})(_[d])})("create zeros ones rand identity".split(" ")),l})(Math);return(function(r,t){var n=r.utils.isFunction;function i(a,o){return a-o}function s(a,o,u){return t.max(o,t.min(a,u))}r.sum=function(o){for(var u=0,c=o.length;--c>=0;)u+=o[c];return u},r.sumsqrd=function(o){for(var u=0,c=o.length;--c>=0;)u+=o[c]*o[c];return u},r.sumsqerr=function(o){for(var u=r.mean(o),c=0,l=o.length,p;--l>=0;)p=o[l]-u,c+=p*p;return c},r.sumrow=function(o){for(var u=0,c=o.length;--c>=0;)u+=o[c];return u},r.product=function(o){for(var u=1,c=o.length;--c>=0;)u*=o[c];return u},r.min=function(o){for(var u=o[0],c=0;++c<o.length;)o[c]<u&&(u=o[c]);return u},r.max=function(o){for(var u=o[0],c=0;++c<o.length;)o[c]>u&&(u=o[c]);return u},r.unique=function(o){for(var u={},c=[],l=0;l<o.length;l++)u[o[l]]||(u[o[l]]=!0,c.push(o[l]));return c},r.mean=function(o){return r.sum(o)/o.length},r.meansqerr=function(o){return r.sumsqerr(o)/o.length},r.geomean=function(o){var u=o.map(t.log),c=r.mean(u);return t.exp(c)},r.median=function(o){var u=o.length,c=o.slice().sort(i);return u&1?c[u/2|0]:(c[u/2-1]+c[u/2])/2},r.cumsum=function(o){return r.cumreduce(o,function(u,c){return u+c})},r.cumprod=function(o){return r.cumreduce(o,function(u,c){return u*c})},r.diff=function(o){var u=[],c=o.length,l;for(l=1;l<c;l++)u.push(o[l]-o[l-1]);return u},r.rank=function(a){var o,u=[],c={};for(o=0;o<a.length;o++){var l=a[o];c[l]?c[l]++:(c[l]=1,u.push(l))}var p=u.sort(i),v={},m=1;for(o=0;o<p.length;o++){var l=p[o],h=c[l],_=m,d=m+h-1,y=(_+d)/2;v[l]=y,m+=h}return a.map(function(b){return v[b]})},r.mode=function(o){var u=o.length,c=o.slice().sort(i),l=1,p=0,v=0,m=[],h;for(h=0;h<u;h++)c[h]===c[h+1]?l++:(l>p?(m=[c[h]],p=l,v=0):l===p&&(m.push(c[h]),v++),l=1);return v===0?m[0]:m},r.range=function(o){return r.max(o)-r.min(o)},r.variance=function(o,u){return r.sumsqerr(o)/(o.length-(u?1:0))},r.pooledvariance=function(o){var u=o.reduce(function(l,p){return l+r.sumsqerr(p)},0),c=o.reduce(function(l,p){return l+p.length},0);return u/(c-o.length)},r.deviation=function(a){for(var o=r.mean(a),u=a.length,c=new Array(u),l=0;l<u;l++)c[l]=a[l]-o;return c},r.stdev=function(o,u){return t.sqrt(r.variance(o,u))},r.pooledstdev=function(o){return t.sqrt(r.pooledvariance(o))},r.meandev=function(o){for(var u=r.mean(o),c=[],l=o.length-1;l>=0;l--)c.push(t.abs(o[l]-u));return r.mean(c)},r.meddev=function(o){for(var u=r.median(o),c=[],l=o.length-1;l>=0;l--)c.push(t.abs(o[l]-u));return r.median(c)},r.coeffvar=function(o){return r.stdev(o)/r.mean(o)},r.quartiles=function(o){var u=o.length,c=o.slice().sort(i);return[c[t.round(u/4)-1],c[t.round(u/2)-1],c[t.round(u*3/4)-1]]},r.quantiles=function(o,u,c,l){var p=o.slice().sort(i),v=[u.length],m=o.length,h,_,d,y,b,w;for(typeof c>"u"&&(c=3/8),typeof l>"u"&&(l=3/8),h=0;h<u.length;h++)_=u[h],d=c+_*(1-c-l),y=m*_+d,b=t.floor(s(y,1,m-1)),w=s(y-b,0,1),v[h]=(1-w)*p[b-1]+w*p[b];return v},r.percentile=function(o,u,c){var l=o.slice().sort(i),p=u*(l.length+(c?1:-1))+(c?0:1),v=parseInt(p),m=p-v;return v+1<l.length?l[v-1]+m*(l[v]-l[v-1]):l[v-1]},r.percentileOfScore=function(o,u,c){var l=0,p=o.length,v=!1,m,h;for(c==="strict"&&(v=!0),h=0;h<p;h++)m=o[h],(v&&m<u||!v&&m<=u)&&l++;return l/p},r.histogram=function(o,u){u=u||4;var c=r.min(o),l=(r.max(o)-c)/u,p=o.length,v=[],m;for(m=0;m<u;m++)v[m]=0;for(m=0;m<p;m++)v[t.min(t.floor((o[m]-c)/l),u-1)]+=1;return v},r.covariance=function(o,u){var c=r.mean(o),l=r.mean(u),p=o.length,v=new Array(p),m;for(m=0;m<p;m++)v[m]=(o[m]-c)*(u[m]-l);return r.sum(v)/(p-1)},r.corrcoeff=function(o,u){return r.covariance(o,u)/r.stdev(o,1)/r.stdev(u,1)},r.spearmancoeff=function(a,o){return a=r.rank(a),o=r.rank(o),r.corrcoeff(a,o)},r.stanMoment=function(o,u){for(var c=r.mean(o),l=r.stdev(o),p=o.length,v=0,m=0;m<p;m++)v+=t.pow((o[m]-c)/l,u);return v/o.length},r.skewness=function(o){return r.stanMoment(o,3)},r.kurtosis=function(o){return r.stanMoment(o,4)-3};var f=r.prototype;(function(a){for(var o=0;o<a.length;o++)(function(u){f[u]=function(c,l){var p=[],v=0,m=this;if(n(c)&&(l=c,c=!1),l)return setTimeout(function(){l.call(m,f[u].call(m,c))}),this;if(this.length>1){for(m=c===!0?this:this.transpose();v<m.length;v++)p[v]=r[u](m[v]);return p}return r[u](this[0],c)}})(a[o])})("cumsum cumprod".split(" ")),(function(a){for(var o=0;o<a.length;o++)(function(u){f[u]=function(c,l){var p=[],v=0,m=this;if(n(c)&&(l=c,c=!1),l)return setTimeout(function(){l.call(m,f[u].call(m,c))}),this;if(this.length>1){for(u!=="sumrow"&&(m=c===!0?this:this.transpose());v<m.length;v++)p[v]=r[u](m[v]);return c===!0?r[u](r.utils.toVector(p)):p}return r[u](this[0],c)}})(a[o])})("sum sumsqrd sumsqerr sumrow product min max unique mean meansqerr geomean median diff rank mode range variance deviation stdev meandev meddev coeffvar quartiles histogram skewness kurtosis".split(" ")),(function(a){for(var o=0;o<a.length;o++)(function(u){f[u]=function(){var c=[],l=0,p=this,v=Array.prototype.slice.call(arguments),m;if(n(v[v.length-1])){m=v[v.length-1];var h=v.slice(0,v.length-1);return setTimeout(function(){m.call(p,f[u].apply(p,h))}),this}else{m=void 0;var _=function(y){return r[u].apply(p,[y].concat(v))}}if(this.length>1){for(p=p.transpose();l<p.length;l++)c[l]=_(p[l]);return c}return _(this[0])}})(a[o])})("quantiles percentileOfScore".split(" "))})(e,Math),(function(r,t){r.gammaln=function(i){var s=0,f=[76.18009172947146,-86.50532032941678,24.01409824083091,-1.231739572450155,.001208650973866179,-5395239384953e-18],a=1.000000000190015,o,u,c;for(c=(u=o=i)+5.5,c-=(o+.5)*t.log(c);s<6;s++)a+=f[s]/++u;return t.log(2.5066282746310007*a/o)-c},r.loggam=function(i){var s,f,a,o,u,c,l,p=[.08333333333333333,-.002777777777777778,.0007936507936507937,-.0005952380952380952,.0008417508417508418,-.001917526917526918,.00641025641025641,-.02955065359477124,.1796443723688307,-1.3924322169059];if(s=i,l=0,i==1||i==2)return 0;for(i<=7&&(l=t.floor(7-i),s=i+l),f=1/(s*s),a=2*t.PI,u=p[9],c=8;c>=0;c--)u*=f,u+=p[c];if(o=u/s+.5*t.log(a)+(s-.5)*t.log(s)-s,i<=7)for(c=1;c<=l;c++)o-=t.log(s-1),s-=1;return o},r.gammafn=function(i){var s=[-1.716185138865495,24.76565080557592,-379.80425647094563,629.3311553128184,866.9662027904133,-31451.272968848367,-36144.413418691176,66456.14382024054],f=[-30.8402300119739,315.35062697960416,-1015.1563674902192,-3107.771671572311,22538.11842098015,4755.846277527881,-134659.9598649693,-115132.2596755535],a=!1,o=0,u=0,c=0,l=i,p,v,m,h;if(i>171.6243769536076)return 1/0;if(l<=0)if(h=l%1+36e-17,h)a=(l&1?-1:1)*t.PI/t.sin(t.PI*h),l=1-l;else return 1/0;for(m=l,l<1?v=l++:v=(l-=o=(l|0)-1)-1,p=0;p<8;++p)c=(c+s[p])*v,u=u*v+f[p];if(h=c/u+1,m<l)h/=m;else if(m>l)for(p=0;p<o;++p)h*=l,l++;return a&&(h=a/h),h},r.gammap=function(i,s){return r.lowRegGamma(i,s)*r.gammafn(i)},r.lowRegGamma=function(i,s){var f=r.gammaln(i),a=i,o=1/i,u=o,c=s+1-i,l=1/1e-30,p=1/c,v=p,m=1,h=-~(t.log(i>=1?i:1/i)*8.5+i*.4+17),_;if(s<0||i<=0)return NaN;if(s<i+1){for(;m<=h;m++)o+=u*=s/++a;return o*t.exp(-s+i*t.log(s)-f)}for(;m<=h;m++)_=-m*(m-i),c+=2,p=_*p+c,l=c+_/l,p=1/p,v*=p*l;return 1-v*t.exp(-s+i*t.log(s)-f)},r.factorialln=function(i){return i<0?NaN:r.gammaln(i+1)},r.factorial=function(i){return i<0?NaN:r.gammafn(i+1)},r.combination=function(i,s){return i>170||s>170?t.exp(r.combinationln(i,s)):r.factorial(i)/r.factorial(s)/r.factorial(i-s)},r.combinationln=function(i,s){return r.factorialln(i)-r.factorialln(s)-r.factorialln(i-s)},r.permutation=function(i,s){return r.factorial(i)/r.factorial(i-s)},r.betafn=function(i,s){if(!(i<=0||s<=0))return i+s>170?t.exp(r.betaln(i,s)):r.gammafn(i)*r.gammafn(s)/r.gammafn(i+s)},r.betaln=function(i,s){return r.gammaln(i)+r.gammaln(s)-r.gammaln(i+s)},r.betacf=function(i,s,f){var a=1e-30,o=1,u=s+f,c=s+1,l=s-1,p=1,v=1-u*i/c,m,h,_,d;for(t.abs(v)<a&&(v=a),v=1/v,d=v;o<=100&&(m=2*o,h=o*(f-o)*i/((l+m)*(s+m)),v=1+h*v,t.abs(v)<a&&(v=a),p=1+h/p,t.abs(p)<a&&(p=a),v=1/v,d*=v*p,h=-(s+o)*(u+o)*i/((s+m)*(c+m)),v=1+h*v,t.abs(v)<a&&(v=a),p=1+h/p,t.abs(p)<a&&(p=a),v=1/v,_=v*p,d*=_,!(t.abs(_-1)<3e-7));o++);return d},r.gammapinv=function(i,s){var f=0,a=s-1,o=1e-8,u=r.gammaln(s),c,l,p,v,m,h,_;if(i>=1)return t.max(100,s+100*t.sqrt(s));if(i<=0)return 0;for(s>1?(h=t.log(a),_=t.exp(a*(h-1)-u),m=i<.5?i:1-i,p=t.sqrt(-2*t.log(m)),c=(2.30753+p*.27061)/(1+p*(.99229+p*.04481))-p,i<.5&&(c=-c),c=t.max(.001,s*t.pow(1-1/(9*s)-c/(3*t.sqrt(s)),3))):(p=1-s*(.253+s*.12),i<p?c=t.pow(i/p,1/s):c=1-t.log(1-(i-p)/(1-p)));f<12;f++){if(c<=0)return 0;if(l=r.lowRegGamma(s,c)-i,s>1?p=_*t.exp(-(c-a)+a*(t.log(c)-h)):p=t.exp(-c+a*t.log(c)-u),v=l/p,c-=p=v/(1-.5*t.min(1,v*((s-1)/c-1))),c<=0&&(c=.5*(c+p)),t.abs(p)<o*c)break}return c},r.erf=function(i){var s=[-1.3026537197817094,.6419697923564902,.019476473204185836,-.00956151478680863,-.000946595344482036,.000366839497852761,42523324806907e-18,-20278578112534e-18,-1624290004647e-18,130365583558e-17,15626441722e-18,-85238095915e-18,6529054439e-18,5059343495e-18,-991364156e-18,-227365122e-18,96467911e-18,2394038e-18,-6886027e-18,894487e-18,313092e-18,-112708e-18,381e-18,7106e-18,-1523e-18,-94e-18,121e-18,-28e-18],f=s.length-1,a=!1,o=0,u=0,c,l,p,v;for(i<0&&(i=-i,a=!0),c=2/(2+i),l=4*c-2;f>0;f--)p=o,o=l*o-u+s[f],u=p;return v=c*t.exp(-i*i+.5*(s[0]+l*o)-u),a?v-1:1-v},r.erfc=function(i){return 1-r.erf(i)},r.erfcinv=function(i){var s=0,f,a,o,u;if(i>=2)return-100;if(i<=0)return 100;for(u=i<1?i:2-i,o=t.sqrt(-2*t.log(u/2)),f=-.70711*((2.30753+o*.27061)/(1+o*(.99229+o*.04481))-o);s<2;s++)a=r.erfc(f)-u,f+=a/(1.1283791670955126*t.exp(-f*f)-f*a);return i<1?f:-f},r.ibetainv=function(i,s,f){var a=1e-8,o=s-1,u=f-1,c=0,l,p,v,m,h,_,d,y,b,w,q;if(i<=0)return 0;if(i>=1)return 1;for(s>=1&&f>=1?(v=i<.5?i:1-i,m=t.sqrt(-2*t.log(v)),d=(2.30753+m*.27061)/(1+m*(.99229+m*.04481))-m,i<.5&&(d=-d),y=(d*d-3)/6,b=2/(1/(2*s-1)+1/(2*f-1)),w=d*t.sqrt(y+b)/b-(1/(2*f-1)-1/(2*s-1))*(y+5/6-2/(3*b)),d=s/(s+f*t.exp(2*w))):(l=t.log(s/(s+f)),p=t.log(f/(s+f)),m=t.exp(s*l)/s,h=t.exp(f*p)/f,w=m+h,i<m/w?d=t.pow(s*w*i,1/s):d=1-t.pow(f*w*(1-i),1/f)),q=-r.gammaln(s)-r.gammaln(f)+r.gammaln(s+f);c<10;c++){if(d===0||d===1)return d;if(_=r.ibeta(d,s,f)-i,m=t.exp(o*t.log(d)+u*t.log(1-d)+q),h=_/m,d-=m=h/(1-.5*t.min(1,h*(o/d-u/(1-d)))),d<=0&&(d=.5*(d+m)),d>=1&&(d=.5*(d+m+1)),t.abs(m)<a*d&&c>0)break}return d},r.ibeta=function(i,s,f){var a=i===0||i===1?0:t.exp(r.gammaln(s+f)-r.gammaln(s)-r.gammaln(f)+s*t.log(i)+f*t.log(1-i));return i<0||i>1?!1:i<(s+1)/(s+f+2)?a*r.betacf(i,s,f)/s:1-a*r.betacf(1-i,f,s)/f},r.randn=function(i,s){var f,a,o,u,c;if(s||(s=i),i)return r.create(i,s,function(){return r.randn()});do f=r._random_fn(),a=1.7156*(r._random_fn()-.5),o=f-.449871,u=t.abs(a)+.386595,c=o*o+u*(.196*u-.25472*o);while(c>.27597&&(c>.27846||a*a>-4*t.log(f)*f*f));return a/f},r.randg=function(i,s,f){var a=i,o,u,c,l,p,v;if(f||(f=s),i||(i=1),s)return v=r.zeros(s,f),v.alter(function(){return r.randg(i)}),v;i<1&&(i+=1),o=i-1/3,u=1/t.sqrt(9*o);do{do p=r.randn(),l=1+u*p;while(l<=0);l=l*l*l,c=r._random_fn()}while(c>1-.331*t.pow(p,4)&&t.log(c)>.5*p*p+o*(1-l+t.log(l)));if(i==a)return o*l;do c=r._random_fn();while(c===0);return t.pow(c,1/a)*o*l},(function(n){for(var i=0;i<n.length;i++)(function(s){r.fn[s]=function(){return r(r.map(this,function(f){return r[s](f)}))}})(n[i])})("gammaln gammafn factorial factorialln".split(" ")),(function(n){for(var i=0;i<n.length;i++)(function(s){r.fn[s]=function(){return r(r[s].apply(null,arguments))}})(n[i])})("randn".split(" "))})(e,Math),(function(r,t){(function(a){for(var o=0;o<a.length;o++)(function(u){r[u]=function c(l,p,v){return this instanceof c?(this._a=l,this._b=p,this._c=v,this):new c(l,p,v)},r.fn[u]=function(c,l,p){var v=r[u](c,l,p);return v.data=this,v},r[u].prototype.sample=function(c){var l=this._a,p=this._b,v=this._c;return c?r.alter(c,function(){return r[u].sample(l,p,v)}):r[u].sample(l,p,v)},(function(c){for(var l=0;l<c.length;l++)(function(p){r[u].prototype[p]=function(v){var m=this._a,h=this._b,_=this._c;return!v&&v!==0&&(v=this.data),typeof v!="number"?r.fn.map.call(v,function(d){return r[u][p](d,m,h,_)}):r[u][p](v,m,h,_)}})(c[l])})("pdf cdf inv".split(" ")),(function(c){for(var l=0;l<c.length;l++)(function(p){r[u].prototype[p]=function(){return r[u][p](this._a,this._b,this._c)}})(c[l])})("mean median mode variance".split(" "))})(a[o])})("beta centralF cauchy chisquare exponential gamma invgamma kumaraswamy laplace lognormal noncentralt normal pareto studentt weibull uniform binomial negbin hypgeom poisson triangular tukey arcsine".split(" ")),r.extend(r.beta,{pdf:function(o,u,c){return o>1||o<0?0:u==1&&c==1?1:u<512&&c<512?t.pow(o,u-1)*t.pow(1-o,c-1)/r.betafn(u,c):t.exp((u-1)*t.log(o)+(c-1)*t.log(1-o)-r.betaln(u,c))},cdf:function(o,u,c){return o>1||o<0?(o>1)*1:r.ibeta(o,u,c)},inv:function(o,u,c){return r.ibetainv(o,u,c)},mean:function(o,u){return o/(o+u)},median:function(o,u){return r.ibetainv(.5,o,u)},mode:function(o,u){return(o-1)/(o+u-2)},sample:function(o,u){var c=r.randg(o);return c/(c+r.randg(u))},variance:function(o,u){return o*u/(t.pow(o+u,2)*(o+u+1))}}),r.extend(r.centralF,{pdf:function(o,u,c){var l,p,v;return o<0?0:u<=2?o===0&&u<2?1/0:o===0&&u===2?1:1/r.betafn(u/2,c/2)*t.pow(u/c,u/2)*t.pow(o,u/2-1)*t.pow(1+u/c*o,-(u+c)/2):(l=u*o/(c+o*u),p=c/(c+o*u),v=u*p/2,v*r.binomial.pdf((u-2)/2,(u+c-2)/2,l))},cdf:function(o,u,c){return o<0?0:r.ibeta(u*o/(u*o+c),u/2,c/2)},inv:function(o,u,c){return c/(u*(1/r.ibetainv(o,u/2,c/2)-1))},mean:function(o,u){return u>2?u/(u-2):void 0},mode:function(o,u){return o>2?u*(o-2)/(o*(u+2)):void 0},sample:function(o,u){var c=r.randg(o/2)*2,l=r.randg(u/2)*2;return c/o/(l/u)},variance:function(o,u){if(!(u<=4))return 2*u*u*(o+u-2)/(o*(u-2)*(u-2)*(u-4))}}),r.extend(r.cauchy,{pdf:function(o,u,c){return c<0?0:c/(t.pow(o-u,2)+t.pow(c,2))/t.PI},cdf:function(o,u,c){return t.atan((o-u)/c)/t.PI+.5},inv:function(a,o,u){return o+u*t.tan(t.PI*(a-.5))},median:function(o){return o},mode:function(o){return o},sample:function(o,u){return r.randn()*t.sqrt(1/(2*r.randg(.5)))*u+o}}),r.extend(r.chisquare,{pdf:function(o,u){return o<0?0:o===0&&u===2?.5:t.exp((u/2-1)*t.log(o)-o/2-u/2*t.log(2)-r.gammaln(u/2))},cdf:function(o,u){return o<0?0:r.lowRegGamma(u/2,o/2)},inv:function(a,o){return 2*r.gammapinv(a,.5*o)},mean:function(a){return a},median:function(o){return o*t.pow(1-2/(9*o),3)},mode:function(o){return o-2>0?o-2:0},sample:function(o){return r.randg(o/2)*2},variance:function(o){return 2*o}}),r.extend(r.exponential,{pdf:function(o,u){return o<0?0:u*t.exp(-u*o)},cdf:function(o,u){return o<0?0:1-t.exp(-u*o)},inv:function(a,o){return-t.log(1-a)/o},mean:function(a){return 1/a},median:function(a){return 1/a*t.log(2)},mode:function(){return 0},sample:function(o){return-1/o*t.log(r._random_fn())},variance:function(a){return t.pow(a,-2)}}),r.extend(r.gamma,{pdf:function(o,u,c){return o<0?0:o===0&&u===1?1/c:t.exp((u-1)*t.log(o)-o/c-r.gammaln(u)-u*t.log(c))},cdf:function(o,u,c){return o<0?0:r.lowRegGamma(u,o/c)},inv:function(a,o,u){return r.gammapinv(a,o)*u},mean:function(a,o){return a*o},mode:function(o,u){if(o>1)return(o-1)*u},sample:function(o,u){return r.randg(o)*u},variance:function(o,u){return o*u*u}}),r.extend(r.invgamma,{pdf:function(o,u,c){return o<=0?0:t.exp(-(u+1)*t.log(o)-c/o-r.gammaln(u)+u*t.log(c))},cdf:function(o,u,c){return o<=0?0:1-r.lowRegGamma(u,c/o)},inv:function(a,o,u){return u/r.gammapinv(1-a,o)},mean:function(a,o){return a>1?o/(a-1):void 0},mode:function(o,u){return u/(o+1)},sample:function(o,u){return u/r.randg(o)},variance:function(o,u){if(!(o<=2))return u*u/((o-1)*(o-1)*(o-2))}}),r.extend(r.kumaraswamy,{pdf:function(o,u,c){return o===0&&u===1?c:o===1&&c===1?u:t.exp(t.log(u)+t.log(c)+(u-1)*t.log(o)+(c-1)*t.log(1-t.pow(o,u)))},cdf:function(o,u,c){return o<0?0:o>1?1:1-t.pow(1-t.pow(o,u),c)},inv:function(o,u,c){return t.pow(1-t.pow(1-o,1/c),1/u)},mean:function(a,o){return o*r.gammafn(1+1/a)*r.gammafn(o)/r.gammafn(1+1/a+o)},median:function(o,u){return t.pow(1-t.pow(2,-1/u),1/o)},mode:function(o,u){if(o>=1&&u>=1&&o!==1&&u!==1)return t.pow((o-1)/(o*u-1),1/o)},variance:function(){throw new Error("variance not yet implemented")}}),r.extend(r.lognormal,{pdf:function(o,u,c){return o<=0?0:t.exp(-t.log(o)-.5*t.log(2*t.PI)-t.log(c)-t.pow(t.log(o)-u,2)/(2*c*c))},cdf:function(o,u,c){return o<0?0:.5+.5*r.erf((t.log(o)-u)/t.sqrt(2*c*c))},inv:function(a,o,u){return t.exp(-1.4142135623730951*u*r.erfcinv(2*a)+o)},mean:function(o,u){return t.exp(o+u*u/2)},median:function(o){return t.exp(o)},mode:function(o,u){return t.exp(o-u*u)},sample:function(o,u){return t.exp(r.randn()*u+o)},variance:function(o,u){return(t.exp(u*u)-1)*t.exp(2*o+u*u)}}),r.extend(r.noncentralt,{pdf:function(o,u,c){var l=1e-14;return t.abs(c)<l?r.studentt.pdf(o,u):t.abs(o)<l?t.exp(r.gammaln((u+1)/2)-c*c/2-.5*t.log(t.PI*u)-r.gammaln(u/2)):u/o*(r.noncentralt.cdf(o*t.sqrt(1+2/u),u+2,c)-r.noncentralt.cdf(o,u,c))},cdf:function(o,u,c){var l=1e-14,p=200;if(t.abs(c)<l)return r.studentt.cdf(o,u);var v=!1;o<0&&(v=!0,c=-c);for(var m=r.normal.cdf(-c,0,1),h=l+1,_=h,d=o*o/(o*o+u),y=0,b=t.exp(-c*c/2),w=t.exp(-c*c/2-.5*t.log(2)-r.gammaln(3/2))*c;y<p||_>l||h>l;)_=h,y>0&&(b*=c*c/(2*y),w*=c*c/(2*(y+1/2))),h=b*r.beta.cdf(d,y+.5,u/2)+w*r.beta.cdf(d,y+1,u/2),m+=.5*h,y++;return v?1-m:m}}),r.extend(r.normal,{pdf:function(o,u,c){return t.exp(-.5*t.log(2*t.PI)-t.log(c)-t.pow(o-u,2)/(2*c*c))},cdf:function(o,u,c){return .5*(1+r.erf((o-u)/t.sqrt(2*c*c)))},inv:function(a,o,u){return-1.4142135623730951*u*r.erfcinv(2*a)+o},mean:function(a){return a},median:function(o){return o},mode:function(a){return a},sample:function(o,u){return r.randn()*u+o},variance:function(a,o){return o*o}}),r.extend(r.pareto,{pdf:function(o,u,c){return o<u?0:c*t.pow(u,c)/t.pow(o,c+1)},cdf:function(o,u,c){return o<u?0:1-t.pow(u/o,c)},inv:function(o,u,c){return u/t.pow(1-o,1/c)},mean:function(o,u){if(!(u<=1))return u*t.pow(o,u)/(u-1)},median:function(o,u){return o*(u*t.SQRT2)},mode:function(o){return o},variance:function(a,o){if(!(o<=2))return a*a*o/(t.pow(o-1,2)*(o-2))}}),r.extend(r.studentt,{pdf:function(o,u){return u=u>1e100?1e100:u,1/(t.sqrt(u)*r.betafn(.5,u/2))*t.pow(1+o*o/u,-((u+1)/2))},cdf:function(o,u){var c=u/2;return r.ibeta((o+t.sqrt(o*o+u))/(2*t.sqrt(o*o+u)),c,c)},inv:function(a,o){var u=r.ibetainv(2*t.min(a,1-a),.5*o,.5);return u=t.sqrt(o*(1-u)/u),a>.5?u:-u},mean:function(o){return o>1?0:void 0},median:function(){return 0},mode:function(){return 0},sample:function(o){return r.randn()*t.sqrt(o/(2*r.randg(o/2)))},variance:function(o){return o>2?o/(o-2):o>1?1/0:void 0}}),r.extend(r.weibull,{pdf:function(o,u,c){return o<0||u<0||c<0?0:c/u*t.pow(o/u,c-1)*t.exp(-t.pow(o/u,c))},cdf:function(o,u,c){return o<0?0:1-t.exp(-t.pow(o/u,c))},inv:function(a,o,u){return o*t.pow(-t.log(1-a),1/u)},mean:function(a,o){return a*r.gammafn(1+1/o)},median:function(o,u){return o*t.pow(t.log(2),1/u)},mode:function(o,u){return u<=1?0:o*t.pow((u-1)/u,1/u)},sample:function(o,u){return o*t.pow(-t.log(r._random_fn()),1/u)},variance:function(o,u){return o*o*r.gammafn(1+2/u)-t.pow(r.weibull.mean(o,u),2)}}),r.extend(r.uniform,{pdf:function(o,u,c){return o<u||o>c?0:1/(c-u)},cdf:function(o,u,c){return o<u?0:o<c?(o-u)/(c-u):1},inv:function(a,o,u){return o+a*(u-o)},mean:function(o,u){return .5*(o+u)},median:function(o,u){return r.mean(o,u)},mode:function(){throw new Error("mode is not yet implemented")},sample:function(o,u){return o/2+u/2+(u/2-o/2)*(2*r._random_fn()-1)},variance:function(o,u){return t.pow(u-o,2)/12}});function n(a,o,u,c){for(var l=0,p=1,v=1,m=1,h=0,_=0,d;t.abs((v-_)/v)>c;)_=v,d=-(o+h)*(o+u+h)*a/(o+2*h)/(o+2*h+1),l=v+d*l,p=m+d*p,h=h+1,d=h*(u-h)*a/(o+2*h-1)/(o+2*h),v=l+d*v,m=p+d*m,l=l/m,p=p/m,v=v/m,m=1;return v/o}r.extend(r.binomial,{pdf:function(o,u,c){return c===0||c===1?u*c===o?1:0:r.combination(u,o)*t.pow(c,o)*t.pow(1-c,u-o)},cdf:function(o,u,c){var l,p=1e-10;if(o<0)return 0;if(o>=u)return 1;if(c<0||c>1||u<=0)return NaN;o=t.floor(o);var v=c,m=o+1,h=u-o,_=m+h,d=t.exp(r.gammaln(_)-r.gammaln(h)-r.gammaln(m)+m*t.log(v)+h*t.log(1-v));return v<(m+1)/(_+2)?l=d*n(v,m,h,p):l=1-d*n(1-v,h,m,p),t.round((1-l)*(1/p))/(1/p)}}),r.extend(r.negbin,{pdf:function(o,u,c){return o!==o>>>0?!1:o<0?0:r.combination(o+u-1,u-1)*t.pow(1-c,o)*t.pow(c,u)},cdf:function(o,u,c){var l=0,p=0;if(o<0)return 0;for(;p<=o;p++)l+=r.negbin.pdf(p,u,c);return l}}),r.extend(r.hypgeom,{pdf:function(o,u,c,l){if(o!==o|0)return!1;if(o<0||o<c-(u-l))return 0;if(o>l||o>c)return 0;if(c*2>u)return l*2>u?r.hypgeom.pdf(u-c-l+o,u,u-c,u-l):r.hypgeom.pdf(l-o,u,u-c,l);if(l*2>u)return r.hypgeom.pdf(c-o,u,c,u-l);if(c<l)return r.hypgeom.pdf(o,u,l,c);for(var p=1,v=0,m=0;m<o;m++){for(;p>1&&v<l;)p*=1-c/(u-v),v++;p*=(l-m)*(c-m)/((m+1)*(u-c-l+m+1))}for(;v<l;v++)p*=1-c/(u-v);return t.min(1,t.max(0,p))},cdf:function(o,u,c,l){if(o<0||o<c-(u-l))return 0;if(o>=l||o>=c)return 1;if(c*2>u)return l*2>u?r.hypgeom.cdf(u-c-l+o,u,u-c,u-l):1-r.hypgeom.cdf(l-o-1,u,u-c,l);if(l*2>u)return 1-r.hypgeom.cdf(c-o-1,u,c,u-l);if(c<l)return r.hypgeom.cdf(o,u,l,c);for(var p=1,v=1,m=0,h=0;h<o;h++){for(;p>1&&m<l;){var _=1-c/(u-m);v*=_,p*=_,m++}v*=(l-h)*(c-h)/((h+1)*(u-c-l+h+1)),p+=v}for(;m<l;m++)p*=1-c/(u-m);return t.min(1,t.max(0,p))}}),r.extend(r.poisson,{pdf:function(o,u){return u<0||o%1!==0||o<0?0:t.pow(u,o)*t.exp(-u)/r.factorial(o)},cdf:function(o,u){var c=[],l=0;if(o<0)return 0;for(;l<=o;l++)c.push(r.poisson.pdf(l,u));return r.sum(c)},mean:function(a){return a},variance:function(a){return a},sampleSmall:function(o){var u=1,c=0,l=t.exp(-o);do c++,u*=r._random_fn();while(u>l);return c-1},sampleLarge:function(o){var u=o,c,l,p,v,m,h,_,d,y,b;for(v=t.sqrt(u),m=t.log(u),_=.931+2.53*v,h=-.059+.02483*_,d=1.1239+1.1328/(_-3.4),y=.9277-3.6224/(_-2);;){if(l=t.random()-.5,p=t.random(),b=.5-t.abs(l),c=t.floor((2*h/b+_)*l+u+.43),b>=.07&&p<=y)return c;if(!(c<0||b<.013&&p>b)&&t.log(p)+t.log(d)-t.log(h/(b*b)+_)<=-u+c*m-r.loggam(c+1))return c}},sample:function(o){return o<10?this.sampleSmall(o):this.sampleLarge(o)}}),r.extend(r.triangular,{pdf:function(o,u,c,l){return c<=u||l<u||l>c?NaN:o<u||o>c?0:o<l?2*(o-u)/((c-u)*(l-u)):o===l?2/(c-u):2*(c-o)/((c-u)*(c-l))},cdf:function(o,u,c,l){return c<=u||l<u||l>c?NaN:o<=u?0:o>=c?1:o<=l?t.pow(o-u,2)/((c-u)*(l-u)):1-t.pow(c-o,2)/((c-u)*(c-l))},inv:function(o,u,c,l){return c<=u||l<u||l>c?NaN:o<=(l-u)/(c-u)?u+(c-u)*t.sqrt(o*((l-u)/(c-u))):u+(c-u)*(1-t.sqrt((1-o)*(1-(l-u)/(c-u))))},mean:function(o,u,c){return(o+u+c)/3},median:function(o,u,c){if(c<=(o+u)/2)return u-t.sqrt((u-o)*(u-c))/t.sqrt(2);if(c>(o+u)/2)return o+t.sqrt((u-o)*(c-o))/t.sqrt(2)},mode:function(o,u,c){return c},sample:function(o,u,c){var l=r._random_fn();return l<(c-o)/(u-o)?o+t.sqrt(l*(u-o)*(c-o)):u-t.sqrt((1-l)*(u-o)*(u-c))},variance:function(o,u,c){return(o*o+u*u+c*c-o*u-o*c-u*c)/18}}),r.extend(r.arcsine,{pdf:function(o,u,c){return c<=u?NaN:o<=u||o>=c?0:2/t.PI*t.pow(t.pow(c-u,2)-t.pow(2*o-u-c,2),-.5)},cdf:function(o,u,c){return o<u?0:o<c?2/t.PI*t.asin(t.sqrt((o-u)/(c-u))):1},inv:function(a,o,u){return o+(.5-.5*t.cos(t.PI*a))*(u-o)},mean:function(o,u){return u<=o?NaN:(o+u)/2},median:function(o,u){return u<=o?NaN:(o+u)/2},mode:function(){throw new Error("mode is not yet implemented")},sample:function(o,u){return(o+u)/2+(u-o)/2*t.sin(2*t.PI*r.uniform.sample(0,1))},variance:function(o,u){return u<=o?NaN:t.pow(u-o,2)/8}});function i(a){return a/t.abs(a)}r.extend(r.laplace,{pdf:function(o,u,c){return c<=0?0:t.exp(-t.abs(o-u)/c)/(2*c)},cdf:function(o,u,c){return c<=0?0:o<u?.5*t.exp((o-u)/c):1-.5*t.exp(-(o-u)/c)},mean:function(a){return a},median:function(a){return a},mode:function(a){return a},variance:function(a,o){return 2*o*o},sample:function(o,u){var c=r._random_fn()-.5;return o-u*i(c)*t.log(1-2*t.abs(c))}});function s(a,o,u){var c=12,l=6,p=-30,v=-50,m=60,h=8,_=3,d=2,y=3,b=[.9815606342467192,.9041172563704749,.7699026741943047,.5873179542866175,.3678314989981802,.1252334085114689],w=[.04717533638651183,.10693932599531843,.16007832854334622,.20316742672306592,.2334925365383548,.24914704581340277],q=a*.5;if(q>=h)return 1;var P=2*r.normal.cdf(q,0,1,1,0)-1;P>=t.exp(v/u)?P=t.pow(P,u):P=0;var I;a>_?I=d:I=y;for(var A=q,O=(h-q)/I,C=A+O,L=0,Z=u-1,V=1;V<=I;V++){for(var ne=0,k=.5*(C+A),T=.5*(C-A),se=1;se<=c;se++){var me,de;l<se?(me=c-se+1,de=b[me-1]):(me=se,de=-b[me-1]);var qe=T*de,ue=k+qe,Q=ue*ue;if(Q>m)break;var U=2*r.normal.cdf(ue,0,1,1,0),Rr=2*r.normal.cdf(ue,a,1,1,0),j=U*.5-Rr*.5;j>=t.exp(p/Z)&&(j=w[me-1]*t.exp(-(.5*Q))*t.pow(j,Z),ne+=j)}ne*=2*T*u/t.sqrt(2*t.PI),L+=ne,A=C,C+=O}return P+=L,P<=t.exp(p/o)?0:(P=t.pow(P,o),P>=1?1:P)}function f(a,o,u){var c=.322232421088,l=.099348462606,p=-1,v=.588581570495,m=-.342242088547,h=.531103462366,_=-.204231210125,d=.10353775285,y=-453642210148e-16,b=.0038560700634,w=.8832,q=.2368,P=1.214,I=1.208,A=1.4142,O=120,C=.5-.5*a,L=t.sqrt(t.log(1/(C*C))),Z=L+((((L*y+_)*L+m)*L+p)*L+c)/((((L*b+d)*L+h)*L+v)*L+l);u<O&&(Z+=(Z*Z*Z+Z)/u/4);var V=w-q*Z;return u<O&&(V+=-P/u+I*Z/u),Z*(V*t.log(o-1)+A)}r.extend(r.tukey,{cdf:function(o,u,c){var l=1,p=u,v=16,m=8,h=-30,_=1e-14,d=100,y=800,b=5e3,w=25e3,q=1,P=.5,I=.25,A=.125,O=[.9894009349916499,.9445750230732326,.8656312023878318,.755404408355003,.6178762444026438,.45801677765722737,.2816035507792589,.09501250983763744],C=[.027152459411754096,.062253523938647894,.09515851168249279,.12462897125553388,.14959598881657674,.16915651939500254,.18260341504492358,.1894506104550685];if(o<=0)return 0;if(c<2||l<1||p<2)return NaN;if(!Number.isFinite(o))return 1;if(c>w)return s(o,l,p);var L=c*.5,Z=L*t.log(c)-c*t.log(2)-r.gammaln(L),V=L-1,ne=c*.25,k;c<=d?k=q:c<=y?k=P:c<=b?k=I:k=A,Z+=t.log(k);for(var T=0,se=1;se<=50;se++){for(var me=0,de=(2*se-1)*k,qe=1;qe<=v;qe++){var ue,Q;m<qe?(ue=qe-m-1,Q=Z+V*t.log(de+O[ue]*k)-(O[ue]*k+de)*ne):(ue=qe-1,Q=Z+V*t.log(de-O[ue]*k)+(O[ue]*k-de)*ne);var U;if(Q>=h){m<qe?U=o*t.sqrt((O[ue]*k+de)*.5):U=o*t.sqrt((-(O[ue]*k)+de)*.5);var Rr=s(U,l,p),j=Rr*C[ue]*t.exp(Q);me+=j}}if(se*k>=1&&me<=_)break;T+=me}if(me>_)throw new Error("tukey.cdf failed to converge");return T>1&&(T=1),T},inv:function(a,o,u){var c=1,l=o,p=1e-4,v=50;if(u<2||c<1||l<2)return NaN;if(a<0||a>1)return NaN;if(a===0)return 0;if(a===1)return 1/0;var m=f(a,l,u),h=r.tukey.cdf(m,o,u)-a,_;h>0?_=t.max(0,m-1):_=m+1;for(var d=r.tukey.cdf(_,o,u)-a,y,b=1;b<v;b++){y=_-d*(_-m)/(d-h),h=d,m=_,y<0&&(y=0,d=-a),d=r.tukey.cdf(y,o,u)-a,_=y;var w=t.abs(_-m);if(w<p)return y}throw new Error("tukey.inv failed to converge")}})})(e,Math),(function(r,t){var n=Array.prototype.push,i=r.utils.isArray;function s(f){return i(f)||f instanceof r}r.extend({add:function(a,o){return s(o)?(s(o[0])||(o=[o]),r.map(a,function(u,c,l){return u+o[c][l]})):r.map(a,function(u){return u+o})},subtract:function(a,o){return s(o)?(s(o[0])||(o=[o]),r.map(a,function(u,c,l){return u-o[c][l]||0})):r.map(a,function(u){return u-o})},divide:function(a,o){return s(o)?(s(o[0])||(o=[o]),r.multiply(a,r.inv(o))):r.map(a,function(u){return u/o})},multiply:function(a,o){var u,c,l,p,v,m,h,_;if(a.length===void 0&&o.length===void 0)return a*o;if(v=a.length,m=a[0].length,h=r.zeros(v,l=s(o)?o[0].length:m),_=0,s(o)){for(;_<l;_++)for(u=0;u<v;u++){for(p=0,c=0;c<m;c++)p+=a[u][c]*o[c][_];h[u][_]=p}return v===1&&_===1?h[0][0]:h}return r.map(a,function(d){return d*o})},outer:function(a,o){return r.multiply(a.map(function(u){return[u]}),[o])},dot:function(a,o){s(a[0])||(a=[a]),s(o[0])||(o=[o]);for(var u=a[0].length===1&&a.length!==1?r.transpose(a):a,c=o[0].length===1&&o.length!==1?r.transpose(o):o,l=[],p=0,v=u.length,m=u[0].length,h,_;p<v;p++){for(l[p]=[],h=0,_=0;_<m;_++)h+=u[p][_]*c[p][_];l[p]=h}return l.length===1?l[0]:l},pow:function(a,o){return r.map(a,function(u){return t.pow(u,o)})},exp:function(a){return r.map(a,function(o){return t.exp(o)})},log:function(a){return r.map(a,function(o){return t.log(o)})},abs:function(a){return r.map(a,function(o){return t.abs(o)})},norm:function(a,o){var u=0,c=0;for(isNaN(o)&&(o=2),s(a[0])&&(a=a[0]);c<a.length;c++)u+=t.pow(t.abs(a[c]),o);return t.pow(u,1/o)},angle:function(a,o){return t.acos(r.dot(a,o)/(r.norm(a)*r.norm(o)))},aug:function(a,o){var u=[],c;for(c=0;c<a.length;c++)u.push(a[c].slice());for(c=0;c<u.length;c++)n.apply(u[c],o[c]);return u},inv:function(a){for(var o=a.length,u=a[0].length,c=r.identity(o,u),l=r.gauss_jordan(a,c),p=[],v=0,m;v<o;v++)for(p[v]=[],m=u;m<l[0].length;m++)p[v][m-u]=l[v][m];return p},det:function f(a){if(a.length===2)return a[0][0]*a[1][1]-a[0][1]*a[1][0];for(var o=0,u=0;u<a.length;u++){for(var c=[],l=1;l<a.length;l++){c[l-1]=[];for(var p=0;p<a.length;p++)p<u?c[l-1][p]=a[l][p]:p>u&&(c[l-1][p-1]=a[l][p])}var v=u%2?-1:1;o+=f(c)*a[0][u]*v}return o},gauss_elimination:function(a,o){var u=0,c=0,l=a.length,p=a[0].length,v=1,m=0,h=[],_,d,y,b;for(a=r.aug(a,o),_=a[0].length,u=0;u<l;u++){for(d=a[u][u],c=u,b=u+1;b<p;b++)d<t.abs(a[b][u])&&(d=a[b][u],c=b);if(c!=u)for(b=0;b<_;b++)y=a[u][b],a[u][b]=a[c][b],a[c][b]=y;for(c=u+1;c<l;c++)for(v=a[c][u]/a[u][u],b=u;b<_;b++)a[c][b]=a[c][b]-v*a[u][b]}for(u=l-1;u>=0;u--){for(m=0,c=u+1;c<=l-1;c++)m=m+h[c]*a[u][c];h[u]=(a[u][_-1]-m)/a[u][u]}return h},gauss_jordan:function(a,o){var u=r.aug(a,o),c=u.length,l=u[0].length,p=0,v,m,h;for(m=0;m<c;m++){var _=m;for(h=m+1;h<c;h++)t.abs(u[h][m])>t.abs(u[_][m])&&(_=h);var d=u[m];for(u[m]=u[_],u[_]=d,h=m+1;h<c;h++)for(p=u[h][m]/u[m][m],v=m;v<l;v++)u[h][v]-=u[m][v]*p}for(m=c-1;m>=0;m--){for(p=u[m][m],h=0;h<m;h++)for(v=l-1;v>m-1;v--)u[h][v]-=u[m][v]*u[h][m]/p;for(u[m][m]/=p,v=c;v<l;v++)u[m][v]/=p}return u},triaUpSolve:function(a,o){var u=a[0].length,c=r.zeros(1,u)[0],l,p=!1;return o[0].length!=null&&(o=o.map(function(v){return v[0]}),p=!0),r.arange(u-1,-1,-1).forEach(function(v){l=r.arange(v+1,u).map(function(m){return c[m]*a[v][m]}),c[v]=(o[v]-r.sum(l))/a[v][v]}),p?c.map(function(v){return[v]}):c},triaLowSolve:function(a,o){var u=a[0].length,c=r.zeros(1,u)[0],l,p=!1;return o[0].length!=null&&(o=o.map(function(v){return v[0]}),p=!0),r.arange(u).forEach(function(v){l=r.arange(v).map(function(m){return a[v][m]*c[m]}),c[v]=(o[v]-r.sum(l))/a[v][v]}),p?c.map(function(v){return[v]}):c},lu:function(a){var o=a.length,u=r.identity(o),c=r.zeros(a.length,a[0].length),l;return r.arange(o).forEach(function(p){c[0][p]=a[0][p]}),r.arange(1,o).forEach(function(p){r.arange(p).forEach(function(v){l=r.arange(v).map(function(m){return u[p][m]*c[m][v]}),u[p][v]=(a[p][v]-r.sum(l))/c[v][v]}),r.arange(p,o).forEach(function(v){l=r.arange(p).map(function(m){return u[p][m]*c[m][v]}),c[p][v]=a[l.length][v]-r.sum(l)})}),[u,c]},cholesky:function(a){var o=a.length,u=r.zeros(a.length,a[0].length),c;return r.arange(o).forEach(function(l){c=r.arange(l).map(function(p){return t.pow(u[l][p],2)}),u[l][l]=t.sqrt(a[l][l]-r.sum(c)),r.arange(l+1,o).forEach(function(p){c=r.arange(l).map(function(v){return u[l][v]*u[p][v]}),u[p][l]=(a[l][p]-r.sum(c))/u[l][l]})}),u},gauss_jacobi:function(a,o,u,c){for(var l=0,p=0,v=a.length,m=[],h=[],_=[],d,y,b,w;l<v;l++)for(m[l]=[],h[l]=[],_[l]=[],p=0;p<v;p++)l>p?(m[l][p]=a[l][p],h[l][p]=_[l][p]=0):l<p?(h[l][p]=a[l][p],m[l][p]=_[l][p]=0):(_[l][p]=a[l][p],m[l][p]=h[l][p]=0);for(b=r.multiply(r.multiply(r.inv(_),r.add(m,h)),-1),y=r.multiply(r.inv(_),o),d=u,w=r.add(r.multiply(b,u),y),l=2;t.abs(r.norm(r.subtract(w,d)))>c;)d=w,w=r.add(r.multiply(b,d),y),l++;return w},gauss_seidel:function(a,o,u,c){for(var l=0,p=a.length,v=[],m=[],h=[],_,d,y,b,w;l<p;l++)for(v[l]=[],m[l]=[],h[l]=[],_=0;_<p;_++)l>_?(v[l][_]=a[l][_],m[l][_]=h[l][_]=0):l<_?(m[l][_]=a[l][_],v[l][_]=h[l][_]=0):(h[l][_]=a[l][_],v[l][_]=m[l][_]=0);for(b=r.multiply(r.multiply(r.inv(r.add(h,v)),m),-1),y=r.multiply(r.inv(r.add(h,v)),o),d=u,w=r.add(r.multiply(b,u),y),l=2;t.abs(r.norm(r.subtract(w,d)))>c;)d=w,w=r.add(r.multiply(b,d),y),l=l+1;return w},SOR:function(a,o,u,c,l){for(var p=0,v=a.length,m=[],h=[],_=[],d,y,b,w,q;p<v;p++)for(m[p]=[],h[p]=[],_[p]=[],d=0;d<v;d++)p>d?(m[p][d]=a[p][d],h[p][d]=_[p][d]=0):p<d?(h[p][d]=a[p][d],m[p][d]=_[p][d]=0):(_[p][d]=a[p][d],m[p][d]=h[p][d]=0);for(w=r.multiply(r.inv(r.add(_,r.multiply(m,l))),r.subtract(r.multiply(_,1-l),r.multiply(h,l))),b=r.multiply(r.multiply(r.inv(r.add(_,r.multiply(m,l))),o),l),y=u,q=r.add(r.multiply(w,u),b),p=2;t.abs(r.norm(r.subtract(q,y)))>c;)y=q,q=r.add(r.multiply(w,y),b),p++;return q},householder:function(a){for(var o=a.length,u=a[0].length,c=0,l=[],p=[],v,m,h,_,d;c<o-1;c++){for(v=0,_=c+1;_<u;_++)v+=a[_][c]*a[_][c];for(d=a[c+1][c]>0?-1:1,v=d*t.sqrt(v),m=t.sqrt((v*v-a[c+1][c]*v)/2),l=r.zeros(o,1),l[c+1][0]=(a[c+1][c]-v)/(2*m),h=c+2;h<o;h++)l[h][0]=a[h][c]/(2*m);p=r.subtract(r.identity(o,u),r.multiply(r.multiply(l,r.transpose(l)),2)),a=r.multiply(p,r.multiply(a,p))}return a},QR:(function(){var f=r.sum,a=r.arange;function o(u){var c=u.length,l=u[0].length,p=r.zeros(l,l);u=r.copy(u);var v,m,h;for(m=0;m<l;m++){for(p[m][m]=t.sqrt(f(a(c).map(function(_){return u[_][m]*u[_][m]}))),v=0;v<c;v++)u[v][m]=u[v][m]/p[m][m];for(h=m+1;h<l;h++)for(p[m][h]=f(a(c).map(function(_){return u[_][m]*u[_][h]})),v=0;v<c;v++)u[v][h]=u[v][h]-u[v][m]*p[m][h]}return[u,p]}return o})(),lstsq:(function(){function f(o){o=r.copy(o);var u=o.length,c=r.identity(u);return r.arange(u-1,-1,-1).forEach(function(l){r.sliceAssign(c,{row:l},r.divide(r.slice(c,{row:l}),o[l][l])),r.sliceAssign(o,{row:l},r.divide(r.slice(o,{row:l}),o[l][l])),r.arange(l).forEach(function(p){var v=r.multiply(o[p][l],-1),m=r.slice(o,{row:p}),h=r.multiply(r.slice(o,{row:l}),v);r.sliceAssign(o,{row:p},r.add(m,h));var _=r.slice(c,{row:p}),d=r.multiply(r.slice(c,{row:l}),v);r.sliceAssign(c,{row:p},r.add(_,d))})}),c}function a(o,u){var c=!1;u[0].length===void 0&&(u=u.map(function(w){return[w]}),c=!0);var l=r.QR(o),p=l[0],v=l[1],m=o[0].length,h=r.slice(p,{col:{end:m}}),_=r.slice(v,{row:{end:m}}),d=f(_),y=r.transpose(h);y[0].length===void 0&&(y=[y]);var b=r.multiply(r.multiply(d,y),u);return b.length===void 0&&(b=[[b]]),c?b.map(function(w){return w[0]}):b}return a})(),jacobi:function(a){for(var o=1,u=a.length,c=r.identity(u,u),l=[],p,v,m,h,_,d,y,b;o===1;){for(d=a[0][1],h=0,_=1,v=0;v<u;v++)for(m=0;m<u;m++)v!=m&&d<t.abs(a[v][m])&&(d=t.abs(a[v][m]),h=v,_=m);for(a[h][h]===a[_][_]?y=a[h][_]>0?t.PI/4:-t.PI/4:y=t.atan(2*a[h][_]/(a[h][h]-a[_][_]))/2,b=r.identity(u,u),b[h][h]=t.cos(y),b[h][_]=-t.sin(y),b[_][h]=t.sin(y),b[_][_]=t.cos(y),c=r.multiply(c,b),p=r.multiply(r.multiply(r.inv(b),a),b),a=p,o=0,v=1;v<u;v++)for(m=1;m<u;m++)v!=m&&t.abs(a[v][m])>.001&&(o=1)}for(v=0;v<u;v++)l.push(a[v][v]);return[c,l]},rungekutta:function(a,o,u,c,l,p){var v,m,h,_,d;if(p===2)for(;c<=u;)v=o*a(c,l),m=o*a(c+o,l+v),h=l+(v+m)/2,l=h,c=c+o;if(p===4)for(;c<=u;)v=o*a(c,l),m=o*a(c+o/2,l+v/2),_=o*a(c+o/2,l+m/2),d=o*a(c+o,l+_),h=l+(v+2*m+2*_+d)/6,l=h,c=c+o;return l},romberg:function(a,o,u,c){for(var l=0,p=(u-o)/2,v=[],m=[],h=[],_,d,y,b,w;l<c/2;){for(w=a(o),y=o,b=0;y<=u;y=y+p,b++)v[b]=y;for(_=v.length,y=1;y<_-1;y++)w+=(y%2!==0?4:2)*a(v[y]);w=p/3*(w+a(u)),h[l]=w,p/=2,l++}for(d=h.length,_=1;d!==1;){for(y=0;y<d-1;y++)m[y]=(t.pow(4,_)*h[y+1]-h[y])/(t.pow(4,_)-1);d=m.length,h=m,m=[],_++}return h},richardson:function(a,o,u,c){function l(q,P){for(var I=0,A=q.length,O;I<A;I++)q[I]===P&&(O=I);return O}for(var p=t.abs(u-a[l(a,u)+1]),v=0,m=[],h=[],_,d,y,b,w;c>=p;)_=l(a,u+c),d=l(a,u),m[v]=(o[_]-2*o[d]+o[2*d-_])/(c*c),c/=2,v++;for(b=m.length,y=1;b!=1;){for(w=0;w<b-1;w++)h[w]=(t.pow(4,y)*m[w+1]-m[w])/(t.pow(4,y)-1);b=h.length,m=h,h=[],y++}return m},simpson:function(a,o,u,c){for(var l=(u-o)/c,p=a(o),v=[],m=o,h=0,_=1,d;m<=u;m=m+l,h++)v[h]=m;for(d=v.length;_<d-1;_++)p+=(_%2!==0?4:2)*a(v[_]);return l/3*(p+a(u))},hermite:function(a,o,u,c){for(var l=a.length,p=0,v=0,m=[],h=[],_=[],d=[],y;v<l;v++){for(m[v]=1,y=0;y<l;y++)v!=y&&(m[v]*=(c-a[y])/(a[v]-a[y]));for(h[v]=0,y=0;y<l;y++)v!=y&&(h[v]+=1/(a[v]-a[y]));_[v]=(1-2*(c-a[v])*h[v])*(m[v]*m[v]),d[v]=(c-a[v])*(m[v]*m[v]),p+=_[v]*o[v]+d[v]*u[v]}return p},lagrange:function(a,o,u){for(var c=0,l=0,p,v,m=a.length;l<m;l++){for(v=o[l],p=0;p<m;p++)l!=p&&(v*=(u-a[p])/(a[l]-a[p]));c+=v}return c},cubic_spline:function(a,o,u){for(var c=a.length,l=0,p,v=[],m=[],h=[],_=[],d=[],y=[],b=[];l<c-1;l++)d[l]=a[l+1]-a[l];for(h[0]=0,l=1;l<c-1;l++)h[l]=3/d[l]*(o[l+1]-o[l])-3/d[l-1]*(o[l]-o[l-1]);for(l=1;l<c-1;l++)v[l]=[],m[l]=[],v[l][l-1]=d[l-1],v[l][l]=2*(d[l-1]+d[l]),v[l][l+1]=d[l],m[l][0]=h[l];for(_=r.multiply(r.inv(v),m),p=0;p<c-1;p++)y[p]=(o[p+1]-o[p])/d[p]-d[p]*(_[p+1][0]+2*_[p][0])/3,b[p]=(_[p+1][0]-_[p][0])/(3*d[p]);for(p=0;p<c&&!(a[p]>u);p++);return p-=1,o[p]+(u-a[p])*y[p]+r.sq(u-a[p])*_[p]+(u-a[p])*r.sq(u-a[p])*b[p]},gauss_quadrature:function(){throw new Error("gauss_quadrature not yet implemented")},PCA:function(a){var o=a.length,u=a[0].length,c=0,l,p,v=[],m=[],h=[],_=[],d=[],y=[],b=[],w=[],q=[],P=[];for(c=0;c<o;c++)v[c]=r.sum(a[c])/u;for(c=0;c<u;c++)for(b[c]=[],l=0;l<o;l++)b[c][l]=a[l][c]-v[l];for(b=r.transpose(b),c=0;c<o;c++)for(w[c]=[],l=0;l<o;l++)w[c][l]=r.dot([b[c]],[b[l]])/(u-1);for(h=r.jacobi(w),q=h[0],m=h[1],P=r.transpose(q),c=0;c<m.length;c++)for(l=c;l<m.length;l++)m[c]<m[l]&&(p=m[c],m[c]=m[l],m[l]=p,_=P[c],P[c]=P[l],P[l]=_);for(y=r.transpose(b),c=0;c<o;c++)for(d[c]=[],l=0;l<y.length;l++)d[c][l]=r.dot([P[c]],[y[l]]);return[a,m,P,d]}}),(function(f){for(var a=0;a<f.length;a++)(function(o){r.fn[o]=function(u,c){var l=this;return c?(setTimeout(function(){c.call(l,r.fn[o].call(l,u))},15),this):typeof r[o](this,u)=="number"?r[o](this,u):r(r[o](this,u))}})(f[a])})("add divide multiply subtract dot pow exp log abs norm angle".split(" "))})(e,Math),(function(r,t){var n=[].slice,i=r.utils.isNumber,s=r.utils.isArray;r.extend({zscore:function(){var o=n.call(arguments);return i(o[1])?(o[0]-o[1])/o[2]:(o[0]-r.mean(o[1]))/r.stdev(o[1],o[2])},ztest:function(){var o=n.call(arguments),u;return s(o[1])?(u=r.zscore(o[0],o[1],o[3]),o[2]===1?r.normal.cdf(-t.abs(u),0,1):r.normal.cdf(-t.abs(u),0,1)*2):o.length>2?(u=r.zscore(o[0],o[1],o[2]),o[3]===1?r.normal.cdf(-t.abs(u),0,1):r.normal.cdf(-t.abs(u),0,1)*2):(u=o[0],o[1]===1?r.normal.cdf(-t.abs(u),0,1):r.normal.cdf(-t.abs(u),0,1)*2)}}),r.extend(r.fn,{zscore:function(o,u){return(o-this.mean())/this.stdev(u)},ztest:function(o,u,c){var l=t.abs(this.zscore(o,c));return u===1?r.normal.cdf(-l,0,1):r.normal.cdf(-l,0,1)*2}}),r.extend({tscore:function(){var o=n.call(arguments);return o.length===4?(o[0]-o[1])/(o[2]/t.sqrt(o[3])):(o[0]-r.mean(o[1]))/(r.stdev(o[1],!0)/t.sqrt(o[1].length))},ttest:function(){var o=n.call(arguments),u;return o.length===5?(u=t.abs(r.tscore(o[0],o[1],o[2],o[3])),o[4]===1?r.studentt.cdf(-u,o[3]-1):r.studentt.cdf(-u,o[3]-1)*2):i(o[1])?(u=t.abs(o[0]),o[2]==1?r.studentt.cdf(-u,o[1]-1):r.studentt.cdf(-u,o[1]-1)*2):(u=t.abs(r.tscore(o[0],o[1])),o[2]==1?r.studentt.cdf(-u,o[1].length-1):r.studentt.cdf(-u,o[1].length-1)*2)}}),r.extend(r.fn,{tscore:function(o){return(o-this.mean())/(this.stdev(!0)/t.sqrt(this.cols()))},ttest:function(o,u){return u===1?1-r.studentt.cdf(t.abs(this.tscore(o)),this.cols()-1):r.studentt.cdf(-t.abs(this.tscore(o)),this.cols()-1)*2}}),r.extend({anovafscore:function(){var o=n.call(arguments),u,c,l,p,v,m,h,_;if(o.length===1){for(v=new Array(o[0].length),h=0;h<o[0].length;h++)v[h]=o[0][h];o=v}for(c=new Array,h=0;h<o.length;h++)c=c.concat(o[h]);for(l=r.mean(c),u=0,h=0;h<o.length;h++)u=u+o[h].length*t.pow(r.mean(o[h])-l,2);for(u/=o.length-1,m=0,h=0;h<o.length;h++)for(p=r.mean(o[h]),_=0;_<o[h].length;_++)m+=t.pow(o[h][_]-p,2);return m/=c.length-o.length,u/m},anovaftest:function(){var o=n.call(arguments),u,c,l,p;if(i(o[0]))return 1-r.centralF.cdf(o[0],o[1],o[2]);var v=r.anovafscore(o);for(u=o.length-1,l=0,p=0;p<o.length;p++)l=l+o[p].length;return c=l-u-1,1-r.centralF.cdf(v,u,c)},ftest:function(o,u,c){return 1-r.centralF.cdf(o,u,c)}}),r.extend(r.fn,{anovafscore:function(){return r.anovafscore(this.toArray())},anovaftes:function(){var o=0,u;for(u=0;u<this.length;u++)o=o+this[u].length;return r.ftest(this.anovafscore(),this.length-1,o-this.length)}}),r.extend({qscore:function(){var o=n.call(arguments),u,c,l,p,v;return i(o[0])?(u=o[0],c=o[1],l=o[2],p=o[3],v=o[4]):(u=r.mean(o[0]),c=r.mean(o[1]),l=o[0].length,p=o[1].length,v=o[2]),t.abs(u-c)/(v*t.sqrt((1/l+1/p)/2))},qtest:function(){var o=n.call(arguments),u;o.length===3?(u=o[0],o=o.slice(1)):o.length===7?(u=r.qscore(o[0],o[1],o[2],o[3],o[4]),o=o.slice(5)):(u=r.qscore(o[0],o[1],o[2]),o=o.slice(3));var c=o[0],l=o[1];return 1-r.tukey.cdf(u,l,c-l)},tukeyhsd:function(o){for(var u=r.pooledstdev(o),c=o.map(function(_){return r.mean(_)}),l=o.reduce(function(_,d){return _+d.length},0),p=[],v=0;v<o.length;++v)for(var m=v+1;m<o.length;++m){var h=r.qtest(c[v],c[m],o[v].length,o[m].length,u,l,o.length);p.push([[v,m],h])}return p}}),r.extend({normalci:function(){var o=n.call(arguments),u=new Array(2),c;return o.length===4?c=t.abs(r.normal.inv(o[1]/2,0,1)*o[2]/t.sqrt(o[3])):c=t.abs(r.normal.inv(o[1]/2,0,1)*r.stdev(o[2])/t.sqrt(o[2].length)),u[0]=o[0]-c,u[1]=o[0]+c,u},tci:function(){var o=n.call(arguments),u=new Array(2),c;return o.length===4?c=t.abs(r.studentt.inv(o[1]/2,o[3]-1)*o[2]/t.sqrt(o[3])):c=t.abs(r.studentt.inv(o[1]/2,o[2].length-1)*r.stdev(o[2],!0)/t.sqrt(o[2].length)),u[0]=o[0]-c,u[1]=o[0]+c,u},significant:function(o,u){return o<u}}),r.extend(r.fn,{normalci:function(o,u){return r.normalci(o,u,this.toArray())},tci:function(o,u){return r.tci(o,u,this.toArray())}});function f(a,o,u,c){if(a>1||u>1||a<=0||u<=0)throw new Error("Proportions should be greater than 0 and less than 1");var l=(a*o+u*c)/(o+c),p=t.sqrt(l*(1-l)*(1/o+1/c));return(a-u)/p}r.extend(r.fn,{oneSidedDifferenceOfProportions:function(o,u,c,l){var p=f(o,u,c,l);return r.ztest(p,1)},twoSidedDifferenceOfProportions:function(o,u,c,l){var p=f(o,u,c,l);return r.ztest(p,2)}})})(e,Math),e.models=(function(){function r(f){var a=f[0].length,o=e.arange(a).map(function(u){var c=e.arange(a).filter(function(l){return l!==u});return t(e.col(f,u).map(function(l){return l[0]}),e.col(f,c))});return o}function t(f,a){var o=f.length,u=a[0].length-1,c=o-u-1,l=e.lstsq(a,f),p=e.multiply(a,l.map(function(b){return[b]})).map(function(b){return b[0]}),v=e.subtract(f,p),m=e.mean(f),h=e.sum(p.map(function(b){return Math.pow(b-m,2)})),_=e.sum(f.map(function(b,w){return Math.pow(b-p[w],2)})),d=h+_,y=h/d;return{exog:a,endog:f,nobs:o,df_model:u,df_resid:c,coef:l,predict:p,resid:v,ybar:m,SST:d,SSE:h,SSR:_,R2:y}}function n(f){var a=r(f.exog),o=Math.sqrt(f.SSR/f.df_resid),u=a.map(function(m){var h=m.SST,_=m.R2;return o/Math.sqrt(h*(1-_))}),c=f.coef.map(function(m,h){return(m-0)/u[h]}),l=c.map(function(m){var h=e.studentt.cdf(m,f.df_resid);return(h>.5?1-h:h)*2}),p=e.studentt.inv(.975,f.df_resid),v=f.coef.map(function(m,h){var _=p*u[h];return[m-_,m+_]});return{se:u,t:c,p:l,sigmaHat:o,interval95:v}}function i(f){var a=f.R2/f.df_model/((1-f.R2)/f.df_resid),o=function(c,l,p){return e.beta.cdf(c/(p/l+c),l/2,p/2)},u=1-o(a,f.df_model,f.df_resid);return{F_statistic:a,pvalue:u}}function s(f,a){var o=t(f,a),u=n(o),c=i(o),l=1-(1-o.R2)*((o.nobs-1)/o.df_resid);return o.t=u,o.f=c,o.adjust_R2=l,o}return{ols:s}})(),e.extend({buildxmatrix:function(){for(var t=new Array(arguments.length),n=0;n<arguments.length;n++){var i=[1];t[n]=i.concat(arguments[n])}return e(t)},builddxmatrix:function(){for(var t=new Array(arguments[0].length),n=0;n<arguments[0].length;n++){var i=[1];t[n]=i.concat(arguments[0][n])}return e(t)},buildjxmatrix:function(t){for(var n=new Array(t.length),i=0;i<t.length;i++)n[i]=t[i];return e.builddxmatrix(n)},buildymatrix:function(t){return e(t).transpose()},buildjymatrix:function(t){return t.transpose()},matrixmult:function(t,n){var i,s,f,a,o;if(t.cols()==n.rows()){if(n.rows()>1){for(a=[],i=0;i<t.rows();i++)for(a[i]=[],s=0;s<n.cols();s++){for(o=0,f=0;f<t.cols();f++)o+=t.toArray()[i][f]*n.toArray()[f][s];a[i][s]=o}return e(a)}for(a=[],i=0;i<t.rows();i++)for(a[i]=[],s=0;s<n.cols();s++){for(o=0,f=0;f<t.cols();f++)o+=t.toArray()[i][f]*n.toArray()[s];a[i][s]=o}return e(a)}},regress:function(t,n){var i=e.xtranspxinv(t),s=t.transpose(),f=e.matrixmult(e(i),s);return e.matrixmult(f,n)},regresst:function(t,n,i){var s=e.regress(t,n),f={};f.anova={};var a=e.jMatYBar(t,s);f.yBar=a;var o=n.mean();f.anova.residuals=e.residuals(n,a),f.anova.ssr=e.ssr(a,o),f.anova.msr=f.anova.ssr/(t[0].length-1),f.anova.sse=e.sse(n,a),f.anova.mse=f.anova.sse/(n.length-(t[0].length-1)-1),f.anova.sst=e.sst(n,o),f.anova.mst=f.anova.sst/(n.length-1),f.anova.r2=1-f.anova.sse/f.anova.sst,f.anova.r2<0&&(f.anova.r2=0),f.anova.fratio=f.anova.msr/f.anova.mse,f.anova.pvalue=e.anovaftest(f.anova.fratio,t[0].length-1,n.length-(t[0].length-1)-1),f.anova.rmse=Math.sqrt(f.anova.mse),f.anova.r2adj=1-f.anova.mse/f.anova.mst,f.anova.r2adj<0&&(f.anova.r2adj=0),f.stats=new Array(t[0].length);for(var u=e.xtranspxinv(t),c,l,p,v=0;v<s.length;v++)c=Math.sqrt(f.anova.mse*Math.abs(u[v][v])),l=Math.abs(s[v]/c),p=e.ttest(l,n.length-t[0].length-1,i),f.stats[v]=[s[v],c,l,p];return f.regress=s,f},xtranspx:function(t){return e.matrixmult(t.transpose(),t)},xtranspxinv:function(t){var n=e.matrixmult(t.transpose(),t),i=e.inv(n);return i},jMatYBar:function(t,n){var i=e.matrixmult(t,n);return new e(i)},residuals:function(t,n){return e.matrixsubtract(t,n)},ssr:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n,2);return i},sse:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n[s],2);return i},sst:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n,2);return i},matrixsubtract:function(t,n){for(var i=new Array(t.length),s=0;s<t.length;s++){i[s]=new Array(t[s].length);for(var f=0;f<t[s].length;f++)i[s][f]=t[s][f]-n[s][f]}return e(i)}}),e.jStat=e,e})});var O8=g((wee,A8)=>{"use strict";var NU=ye();function zU(e){return NU(e)===e&&e>=0}A8.exports=zU});var Fu=g((qee,E8)=>{"use strict";var TU=O8();E8.exports=TU});var z8=g((Pee,N8)=>{"use strict";var ZU=ye();function RU(e){return ZU(e)===e&&e<0}N8.exports=RU});var Z8=g((Iee,T8)=>{"use strict";var FU=z8();T8.exports=FU});var F8=g(($ee,R8)=>{"use strict";var LU=Z8(),CU=Wr();function SU(e){return LU(e)?NaN:CU(e+1)}R8.exports=SU});var Lu=g((kee,L8)=>{"use strict";var DU=F8();L8.exports=DU});var D8=g((Aee,S8)=>{"use strict";var Eo=Fu(),No=R(),BU=H(),fr=Lu(),xU=or(),UU=Ue(),C8=ee();function HU(e,r,t,n){var i,s,f,a,o;return No(e)||No(r)||No(t)||No(n)||!Eo(r)||!Eo(t)||!Eo(n)||r===C8||t===C8||t>r||n>r?NaN:(o=xU(0,n+t-r),a=UU(t,n),Eo(e)&&o<=e&&e<=a?(s=fr(n)+fr(t)+fr(r-n)+fr(r-t),i=fr(r)+fr(e)+fr(n-e),i+=fr(t-e)+fr(r-t+e-n),f=s-i,BU(f)):0)}S8.exports=HU});var U8=g((Oee,x8)=>{"use strict";var zo=Fu(),To=R(),GU=ln(),WU=H(),lr=Lu(),VU=or(),MU=Ue(),B8=ee();function JU(e,r,t){var n,i;if(To(e)||To(r)||To(t)||!zo(e)||!zo(r)||!zo(t)||e===B8||r===B8||r>e||t>e)return GU(NaN);return i=VU(0,t+r-e),n=MU(r,t),s;function s(f){var a,o,u;return To(f)?NaN:zo(f)&&i<=f&&f<=n?(o=lr(t)+lr(r)+lr(e-t)+lr(e-r),a=lr(e)+lr(f)+lr(t-f),a+=lr(r-f)+lr(e-r+f-t),u=o-a,WU(u)):0}}x8.exports=JU});var W8=g((Eee,G8)=>{"use strict";var XU=rr(),H8=D8(),KU=U8();XU(H8,"factory",KU);G8.exports=H8});var eg=g((Gee,j8)=>{"use strict";var Q8=mt(),Y8=R(),oH=re();function iH(e,r){var t,n,i;return Y8(e)||Y8(r)||r<=0?NaN:e===0?.5:(t=oH(e,2),r>2*t?(i=t/(r+t),n=Q8(i,.5,r/2,!0,!0)/2):(i=r/(r+t),n=Q8(i,r/2,.5,!0,!1)/2),e>0?1-n:n)}j8.exports=iH});var og=g((Wee,ng)=>{"use strict";var sH=ln(),rg=mt(),tg=R(),uH=re();function aH(e){if(tg(e)||e<=0)return sH(NaN);return r;function r(t){var n,i,s;return tg(t)?NaN:t===0?.5:(n=uH(t,2),e>2*n?(s=n/(e+n),i=rg(s,.5,e/2,!0,!0)/2):(s=e/(e+n),i=rg(s,e/2,.5,!0,!1)/2),t>0?1-i:i)}}ng.exports=aH});var ug=g((Vee,sg)=>{"use strict";var cH=rr(),ig=eg(),fH=og();cH(ig,"factory",fH);sg.exports=ig});var ku=Be(f8(),1);function N(e,r,t){if(!e)throw new RangeError(`${r} requires ${t}`)}var Ae=e=>e>=0&&e<=1,Oe=e=>e>0&&e<1,G=e=>e>0&&Number.isFinite(e);var l8=1e-300;function Au(e,r,t){N(G(r),"clopperPearsonInterval","n above 0"),N(e>=0&&e<=r,"clopperPearsonInterval","x from 0 to n"),N(Oe(t),"clopperPearsonInterval","level inside 0 and 1");let n=(1-t)/2,i=e<l8?0:(0,ku.default)(n,e,r-e+1),s=r-e<l8?1:1-(0,ku.default)(n,r-e,e+1);return[i,s]}var $8=Be(b8(),1);var I8=Be(Oo(),1);var q8=Be(io(),1),P8=Be(Oo(),1);var PU=4;function pn(e){return N(!Number.isNaN(e),"normalUpperTail","a number"),Math.abs(e)<=PU?P8.default.jStat.normal.cdf(-e,0,1):.5*(0,q8.default)(e/Math.SQRT2)}var IU=1e-4,$U=1e-15,kU=50;function Eu(e){N(Oe(e),"normalQuantile","p inside 0 and 1");let r=I8.default.jStat.normal.inv(e,0,1),t=Math.min(e,1-e);return t<IU?Math.sign(r)*AU(Math.abs(r),t):r}function AU(e,r){let t=e;for(let n=0;n<kU;n+=1){let i=pn(t),s=Math.exp(-t*t/2)/Math.sqrt(2*Math.PI),f=i/s*Math.log(i/r);if(t+=f,Math.abs(f)<=$U*t)break}return t}function he(e,r){return N(Oe(e),"criticalValue","alpha inside 0 and 1"),N(r===null||r>=1,"criticalValue","df of at least 1, or null"),r===null?-Eu(e/2):-(0,$8.default)(e/2,r)}var OU=Be(Oo(),1);function Nu(e,r,t){return N(G(e)&&G(r),"impliedDesignEffect","margin and n above 0"),N(Oe(t),"impliedDesignEffect","level inside 0 and 1"),(e/(he(1-t,null)*Math.sqrt(.25/r)))**2}var EU=.8416212335729143;function zu(e,r){return N(G(e)&&G(r),"detectableDifference","critical and standardError above 0"),(e+EU)*r}var Tu=Be(mt(),1);function Zu(e,r,t){N(G(r),"exactBinomialP","m above 0"),N(e>=0&&e<=r,"exactBinomialP","x from 0 to m"),N(Oe(t),"exactBinomialP","p0 inside 0 and 1");let n=e===0?1:(0,Tu.default)(t,e,r-e+1),i=e===r?1:(0,Tu.default)(1-t,r-e,e+1);return Math.min(1,2*Math.min(n,i))}var k8=Be(mt(),1);function Ru(e,r){N(e>=0&&r>=0,"exactSignP","counts of at least 0");let t=Math.max(e,r);return t===0?1:Math.min(1,2*(0,k8.default)(.5,t,Math.min(e,r)+1))}var M8=Be(W8(),1);var QU=1+1e-7,YU=1e-18;function Cu(e,r,t,n){let i=[e,r,t,n].every(h=>Number.isInteger(h)&&h>=0);N(i&&e<=r&&t<=n,"fisherExactP","whole counts of at least 0, none above its sample");let s=r+n,f=e+t,a=Math.max(0,f-n),o=Math.min(f,r),u=Math.min(o,Math.max(a,Math.floor((r+1)*(f+1)/(s+2)))),c=h=>(0,M8.default)(h,s,f,r),l=c(e)*QU;if(c(u)<=l)return 1;let p=h=>c(h)<=l,v=J8(a,u,p),m=jU(u,o,p);return Math.min(1,V8(v,-1,a,c)+V8(m,1,o,c))}function J8(e,r,t){let n=e-1,i=r;for(;i-n>1;){let s=Math.floor((n+i)/2);t(s)?n=s:i=s}return n}function jU(e,r,t){return-J8(-r,-e,n=>t(-n))}function V8(e,r,t,n){let i=0;for(let s=e;(t-s)*r>=0;s+=r){let f=n(s);if(i+=f,f<=YU*i)break}return i}function Zo(e,r){return e===r||Math.abs(e-r)<1e-9*Math.max(Math.abs(e),Math.abs(r))}function pe(e,r){return e<r&&!Zo(e,r)}function Su(e){if(!(e>=0))throw new RangeError("roundHalfUp requires a number of at least 0");let r=Math.floor(e)+.5;return pe(e,r)?Math.floor(e):Math.floor(e)+1}var X8=1e-300;function Du(e,r){N(e.every(Ae),"holm","p-values from 0 to 1"),N(r>0&&r<1,"holm","alpha inside 0 and 1");let t=new Map,n=0,i=!0;return eH(e).forEach(({p:s,index:f},a)=>{let o=e.length-a;n=Math.max(n,Math.min(1,o*s)),i&&=s<r/o,t.set(f,{alpha:r/o,significant:i,pAdjusted:n})}),[...t].sort(([s],[f])=>s-f).map(([,s])=>s)}function eH(e){let r=e.map((n,i)=>({p:n,index:i})).sort((n,i)=>n.p-i.p||n.index-i.index),t=[];for(let n of r){let i=t.at(-1),s=i?.at(-1);i&&s&&rH(s.p,n.p)?i.push(n):t.push([n])}return t.flatMap(n=>n.sort((i,s)=>i.index-s.index))}function rH(e,r){return Zo(e,r)||e<X8&&r<X8}function bt(e,r,t){N(Ae(e),"wilsonInterval","p from 0 to 1"),N(G(r),"wilsonInterval","n above 0"),N(G(t),"wilsonInterval","q above 0");let n=e+t*t/(2*r),i=t*Math.sqrt(e*(1-e)/r+t*t/(4*r*r)),s=1+t*t/r,f=e===0?0:Math.max(0,(n-i)/s),a=e===1?1:Math.min(1,(n+i)/s);return[f,a]}function Bu(e,r,t,n,i){let[s,f]=bt(e,r,i),[a,o]=bt(t,n,i),u=t-e;return[u-Math.hypot(t-a,f-e),u+Math.hypot(o-t,e-s)]}var K8=1/Math.sqrt(3),tH=60;function Uu(e,r){let t=e.length;N(t>=1&&t<=4&&e.every(G),"roundingHalfWidth","one to four half units above 0"),N(Oe(r),"roundingHalfWidth","coverage inside 0 and 1");let n=Math.max(...e),i=e.map(o=>o/n).sort((o,u)=>u-o),s=(1+r)/2,f=0,a=i.reduce((o,u)=>o+u,0);for(let o=0;o<tH;o+=1){let u=(f+a)/2;xu(u,i)<s?f=u:a=u}return(f+a)/2*n}function xu(e,r){let t=r.slice(0,-1),n=r.at(-1)??0;if(t.length===0)return Math.min(1,Math.max(0,(e+n)/(2*n)));let i=nH(t).map(a=>e-a).filter(a=>a>-n&&a<n),s=[-n,...i,n].sort((a,o)=>a-o),f=0;for(let a=1;a<s.length;a+=1){let o=s[a-1]??0,u=s[a]??0;if(u===o)continue;let c=(o+u)/2,l=(u-o)/2,p=xu(e-c+l*K8,t),v=xu(e-c-l*K8,t);f+=l*(p+v)}return f/(2*n)}function nH(e){return e.reduce((r,t)=>[...new Set(r.flatMap(n=>[n-t,n+t]))],[0])}function wt(e,r,t){return N(Ae(e),"shareStandardError","p from 0 to 1"),N(G(r)&&G(t),"shareStandardError","n and deff above 0"),Math.sqrt(t*e*(1-e)/r)}function Hu(e,r,t,n){return N(Ae(e)&&Ae(r),"leadStandardError","shares from 0 to 1"),N(G(t)&&G(n),"leadStandardError","n and deff above 0"),Math.sqrt(n*Math.max(0,e+r-(e-r)**2)/t)}function Gu(e,r,t,n){return N(Ae(e)&&Ae(r),"leadNullStandardError","shares from 0 to 1"),N(G(t)&&G(n),"leadNullStandardError","n and deff above 0"),Math.sqrt(n*(e+r)/t)}function Wu(e,r,t,n){N(Ae(e)&&Ae(t),"pooledStandardError","shares from 0 to 1"),N(G(r)&&G(n),"pooledStandardError","sizes above 0");let i=Math.min(1,(r*e+n*t)/(r+n));return Math.sqrt(i*(1-i)*(1/r+1/n))}function Vu(e,r,t){return N([e,r,t].every(G),"maximumMargin","n, deff and q above 0"),t*Math.sqrt(.25*r/e)}var ag=Be(ug(),1);function Mu(e,r){N(Number.isFinite(e),"twoSidedP","a finite statistic"),N(r===null||r>=1,"twoSidedP","df of at least 1, or null");let t=r===null?pn(Math.abs(e)):(0,ag.default)(-Math.abs(e),r);return Math.min(1,2*t)}var lH=(2/1.959963984540054)**2,cg=10;function Ro(e,r){return e.n===null?"none":e.sampleSource==="probability"?"sampling":e.modelledInterval?"modelled":r.comparisonBasis?"comparison":"none"}function vn(e,r){let t=n=>Nu(n/100,r,e.level);return{value:t(e.pp),range:[t(e.pp-e.unit/2),t(e.pp+e.unit/2)]}}function Ju(e,r){return e.deff||!e.statedMargin?!1:!dH(e,vn(e.statedMargin,r).range)}function fg(e,r,t,n){let i=t==="modelled"?mH(e,r):pH(e,n)??vH(e,r,n),{unraised:s=i.value,...f}=i,a=[...f.notes];return s<1&&a.push("deff-below-one"),f.value>4&&a.push("deff-above-four"),t==="modelled"&&a.push("modelled-basis"),t==="comparison"&&a.push("comparison-basis"),{...f,notes:a}}function pH(e,r){if(!e.deff)return null;let{source:t,value:n,df:i=null}=e.deff,[s,f]=t==="kish"?r.kishRange:[1,1];return{value:n,range:[s*n,f*n],source:t,df:i,notes:[]}}function vH(e,r,t){if(e.statedMargin&&Ju(e,r)){let f=vn(e.statedMargin,r);return e.design==="unweighted"?lg(f):{...f,source:"implied",df:null,notes:[]}}let n=e.statedMargin?["stated-margin-like-unweighted"]:[],{value:i,range:s}=t.assumed[e.design];return{value:i,range:s,source:"assumed",df:null,notes:[...n,"deff-assumed"]}}function mH(e,r){if(!e.modelledInterval)throw new TypeError("chooseDesignEffect requires a modelled interval");return lg(vn(e.modelledInterval,r))}function lg({value:e,range:[r,t]}){let n=[Math.max(1,r),Math.max(1,t)];return{value:Math.max(1,e),range:n,source:"implied",df:null,notes:[],unraised:e}}function dH(e,[r]){return e.design!=="unweighted"&&!pe(lH,r)}function Xu(e,r){let t=new Map(e.shares.map(({option:f,pct:a})=>[f,a===null?null:mn(a,e.decimals)])),n=hH(e,r),s=[...t.values()].reduce((f,a)=>f+(a??0),0)>mn(100,e.decimals)?["shares-exceed-100"]:[];return{isProbability:e.sampleSource==="probability",isSizeDisclosed:e.n!==null,hasModelledInterval:!!e.modelledInterval,decimals:e.decimals,units:t,answers:e.shares.filter(f=>f.answer!==!1).map(f=>f.option),sampled:n,notes:[...s,...n?.deff.notes??[]]}}function mn(e,r){return Math.round(e*10**r)+0}function Ee(e,r){return Xr(e,r)/(100*10**e.decimals)}function Xr(e,r){let t=e.units.get(r);if(typeof t!="number")throw new RangeError("unitsOf requires a disclosed option");return t}function Ku({sampled:e,notes:r},t){if(!e)return{basis:"none",deff:null,deffSource:null,deffRange:null,nEff:null,maximumMarginPp:null,notes:[...r]};let{basis:n,n:i,deff:s,nEff:f}=e,a=he(1-t.level,s.df);return{basis:n,deff:s.value,deffSource:s.source,deffRange:s.range,nEff:f,maximumMarginPp:100*Vu(i,s.value,a),notes:[...r]}}function hH(e,r){let t=Ro(e,r);if(e.n===null||t==="none")return null;let n=fg(e,e.n,t,r);return{basis:t,n:e.n,deff:n,nEff:e.n/n.value}}function Kr({deff:e},r){return r==="chosen"?e.value:r==="low"?e.range[0]:e.range[1]}function pr(e){let r=e.flatMap(({deff:t})=>t.df===null?[]:[t.df]);return r.length>0?Math.min(...r):null}function Ye(e){return 10**-e.decimals}function Nr(e){let r=Math.max(...e.map(({base:n})=>n.decimals));return(e.reduce((n,{base:i,option:s,sign:f})=>n+f*Xr(i,s)*10**(r-i.decimals),0)+0)/10**r}function qt(e,r,t){return r===0?e===0?1:0:Mu(e/r,t)}function Pt(e,r,t){return[e-t*r,e+t*r]}var gH=10;function pg(e,r,t){let n=Ee(e.base,t),i=Ee(r.base,t),s=Nr([{base:r.base,option:t,sign:1},{base:e.base,option:t,sign:-1}]),f=[r.sampled,e.sampled],a=o=>Math.hypot(wt(n,e.sampled.n,Kr(e.sampled,o)),wt(i,r.sampled.n,Kr(r.sampled,o)));return{bases:f,estimatePp:s,df:pr(f),standardError:a,interval:o=>Pt(s/100,a("chosen"),o),unitsPp:[Ye(r.base),Ye(e.base)],secondTests:o=>_H({p:n,nEff:e.sampled.nEff},{p:i,nEff:r.sampled.nEff},{estimate:s/100,df:pr(f),alpha:o})}}function _H(e,r,{estimate:t,df:n,alpha:i}){let s=Wu(e.p,e.nEff,r.p,r.nEff),[f,a]=Bu(e.p,e.nEff,r.p,r.nEff,he(i,null)),o=[{name:"pooled",p:qt(t,s,n)},{name:"newcombe",intervalPp:[100*f,100*a]}],u=[e,r].flatMap(({p:c,nEff:l})=>[l*c,l*(1-c)]);if(u.some(c=>pe(c,gH))){let[c=0,l=0,p=0,v=0]=u.map(Su);o.push({name:"fisher",p:Cu(c,c+l,p,p+v)})}return o}var yH=50;function Fo(e,r,[t,n],i){return Hu(Ee(e,t),Ee(e,n),r.n,Kr(r,i))}function vg(e,r,t){let[n,i]=t,s=Ee(e,n),f=Ee(e,i),a=Nr([{base:e,option:n,sign:1},{base:e,option:i,sign:-1}]),o=pr([r]),u=c=>Fo(e,r,t,c);return{bases:[r],estimatePp:a,df:o,standardError:u,interval:c=>Pt(a/100,u("chosen"),c),unitsPp:[Ye(e),Ye(e)],secondTests:()=>{let c=Gu(s,f,r.n,r.deff.value),l=[{name:"score",p:qt(a/100,c,o)}];return pe(r.nEff*(s+f),yH)&&l.push({name:"exact-sign",p:Ru(r.nEff*s,r.nEff*f)}),l}}}function mg(e,r,t){let[n,i]=t,s=[r.sampled,e.sampled],f=Nr([{base:r.base,option:n,sign:1},{base:r.base,option:i,sign:-1},{base:e.base,option:n,sign:-1},{base:e.base,option:i,sign:1}]),a=o=>Math.hypot(Fo(e.base,e.sampled,t,o),Fo(r.base,r.sampled,t,o));return{bases:s,estimatePp:f,df:pr(s),standardError:a,interval:o=>Pt(f/100,a("chosen"),o),unitsPp:[r.base,r.base,e.base,e.base].map(Ye),secondTests:()=>[]}}var dg=10;function Qu(e,{nEff:r,deff:t},n){if(pe(r*e,dg)||pe(r*(1-e),dg)){let i=Math.min(r*e,r);return{interval:Au(i,r,n),method:"clopper-pearson"}}return{interval:bt(e,r,he(1-n,t.df)),method:"wilson"}}function hg(e,r,t){if(typeof e.units.get(r)!="number")return{kind:"share",option:r,estimatePct:null};let n=Ee(e,r),i={kind:"share",option:r,estimatePct:100*n};if(!e.sampled)return i;let{interval:s,method:f}=Qu(n,e.sampled,t);return{...i,intervalPct:[100*s[0],100*s[1]],method:f}}var bH=10;function gg(e,r,{option:t,pct:n},i){let{n:s,nEff:f}=r,a=Ee(e,t),o=n/100,[u,c]=Qu(a,r,i).interval;return{bases:[r],estimatePp:Xr(e,t)/10**e.decimals-n,df:pr([r]),standardError:l=>wt(o,s,Kr(r,l)),interval:()=>[u-o,c-o],unitsPp:[Ye(e)],secondTests:()=>[o,1-o,a,1-a].map(p=>f*p).some(p=>pe(p,bH))?[{name:"exact-binomial",p:Zu(Math.min(f*a,f),f,o)}]:[]}}var _g=8;function yg(e,r,t){let n={"no-sample-size":e.some(i=>!i.isSizeDisclosed),"no-sampling-basis":e.some(i=>qH(i,t)),"too-small":e.some(({sampled:i})=>i!==null&&pe(i.nEff,t.minimumNEff)),"few-clusters":e.some(({sampled:i})=>(i?.deff.df??_g)<_g),"not-comparable":new Set(e.map(i=>i.isProbability)).size>1||e.some(i=>r.some(s=>!i.units.has(s))),"not-disclosed":e.some(i=>r.some(s=>i.units.get(s)===null))};return wH.filter(i=>n[i])}var wH=["no-sample-size","no-sampling-basis","too-small","few-clusters","not-comparable","not-disclosed"];function qH(e,r){return!e.isProbability&&!e.hasModelledInterval&&!r.comparisonBasis}function bg(e,r,t){let n=Yu(e,r,1);return Lo([e],r,n,t,([i])=>vg(i.base,i.sampled,r))}function wg(e,r,t,n){return Lo([r,e],[t],[{base:r,option:t,sign:1},{base:e,option:t,sign:-1}],n,([s,f=s])=>pg(f,s,t))}function qg(e,r,t,n){let i=[...Yu(r,t,1),...Yu(e,t,-1)];return Lo([r,e],t,i,n,([s,f=s])=>mg(f,s,t))}function Pg(e,r,t){let{option:n,pct:i}=r,s=Lo([e],[n],[{base:e,option:n,sign:1}],t,([f])=>gg(f.base,f.sampled,r,t.level));return{...s,estimatePp:s.estimatePp===null?null:s.estimatePp-i}}function Yu(e,[r,t],n){return[{base:e,option:r,sign:n},{base:e,option:t,sign:n===1?-1:1}]}function Lo(e,r,t,n,i){let s=yg(e,r,n),a=t.every(({base:l,option:p})=>typeof l.units.get(p)=="number")?Nr(t):null,[o,u]=e.flatMap(l=>l.sampled?[{base:l,sampled:l.sampled}]:[]),c=s.length===0&&o?i([o,u]):null;return{reasons:s,estimatePp:a,measured:c}}function Ig(e,r){if(e.pairs)return e.pairs;let t=r.answers.flatMap(s=>{let f=r.units.get(s);return typeof f=="number"?[{option:s,units:f}]:[]}).sort((s,f)=>f.units-s.units),[n,i]=t;return n&&i?[[n.option,i.option]]:[]}function $g(e,r,t,n){return n?e.changes?e.changes:[...new Set(r.flat())].filter(s=>t.answers.includes(s)&&n.answers.includes(s)):[]}function kg(e,r){return r?e.filter(t=>t.every(n=>r.units.has(n))):[]}var ju="1.0.0";var PH=1/5;function Ag(e,{verdict:r,estimatePp:t,roundingPp:n},i,s){if(r!=="does-not-hold")return!1;let f=he(2*(1-s.level),e.df);return Math.abs(t)+n+f*100*e.standardError("high")<Math.min(s.indifferencePp,PH*i)}var Og={level:.95,assumed:{weighted:{value:1.4,range:[1.2,2]},clustered:{value:2,range:[1.5,4]},unweighted:{value:1,range:[1,1]}},kishRange:[.8,1.3],comparisonBasis:!1,indifferencePp:3,minimumNEff:100};function Co(e){return{...Og,...e,assumed:{...Og.assumed,...e?.assumed}}}function Eg(e){if(!e.isSignificant)return{verdict:"does-not-hold",reasons:IH(e)};let r=$H(e);return{verdict:r.length===0?"holds":"fragile",reasons:r}}function IH({p:e,alpha:r,familyAlpha:t,size:n,critical:i,se:s,bases:f}){let a=[];e<t&&a.push("family");let o=f.every(u=>u==="sampling");return e>=r&&n>i*s.low&&o&&a.push("would-hold-at-lower-deff"),a}function $H(e){let{size:r,rounding:t,critical:n,se:i,bases:s}=e,f=r-t>n*i.chosen,a=r>n*i.high,o=r-t>n*i.high,u=[];return f||u.push("rounding"),a||u.push("design-effect"),e.secondTestsAgree||u.push("second-test"),f&&a&&!o&&u.push("together"),s.includes("modelled")&&u.push("modelled"),s.includes("comparison")&&u.push("comparison"),u}var kH=.95;function Ng(e,r){let t=e.map(i=>qt(i.estimatePp/100,i.standardError("chosen"),i.df)),n=Du(t,1-r.level);return e.map((i,s)=>AH(i,t[s]??1,n[s],r))}function AH(e,r,t,n){if(!t)throw new TypeError("judgeFamily requires a rank for every finding");let{estimatePp:i,df:s,standardError:f}=e,a={chosen:f("chosen"),low:f("low"),high:f("high")},o=he(t.alpha,s),u=he(1-n.level,s),c=Uu(e.unitsPp.map(y=>y/2),kH),l=e.secondTests(t.alpha).map(y=>({...y,significant:EH(y,t.alpha,i)})),{verdict:p,reasons:v}=Eg({isSignificant:t.significant,p:r,alpha:t.alpha,familyAlpha:1-n.level,size:Math.abs(i)/100,rounding:c/100,critical:o,se:a,secondTestsAgree:l.every(y=>y.significant),bases:e.bases.map(({basis:y})=>y)}),m=OH(i/100,a.chosen),[h,_]=e.interval(u);return{fields:{estimatePp:i,sePp:100*a.chosen,marginPp:100*u*a.chosen,intervalPp:[100*h,100*_],z:m,p:r,pAdjusted:t.pAdjusted,alpha:t.alpha,roundingPp:c,secondTests:l,verdict:p,reasons:v,detectable80Pp:p==="does-not-hold"&&a.chosen>0?zu(o,100*a.high)+c:null,survivesTwiceError:p==="holds"?m===null||Math.abs(m)>=2*o:null},breaking:m===null?null:(m/o)**2}}function OH(e,r){return r===0?e===0?0:null:e/r}function EH(e,r,t){if(t===0)return!1;if(e.name!=="newcombe")return e.p<r;let[n,i]=e.intervalPp;return t>0?n>0:i<0}function So(e,r){let t=e.flatMap(({measured:i})=>i?[i]:[]),n=new Map(Ng(t,r).map((i,s)=>[t[s],i]));return e.map(({measured:i,estimatePp:s,reasons:f})=>{let a=i?n.get(i):void 0;return i&&a?{tested:a,measured:i}:{untested:{estimatePp:s,verdict:"cannot-be-tested",reasons:f}}})}function NH(e){let r=Co(e.policy),t=Xu(e.release,r),n=e.previous?Xu(e.previous,r):null,i=Ig(e,t);return{engine:ju,base:Ku(t,r),previousBase:n&&Ku(n,r),findings:[...e.release.shares.map(({option:s})=>hg(t,s,r.level)),...zH(t,i,r),...n?TH(e,{release:t,previous:n,pairs:i},r):[],...ZH(t,e.thresholds??[],r)]}}function zH(e,r,t){let n=r.map(i=>bg(e,i,t));return Do(r,So(n,t)).map(([i,s])=>({kind:"lead",pair:i,...Tg(s)}))}function TH(e,{release:r,previous:t,pairs:n},i){let s=$g(e,n,r,t),f=kg(n,t),a=So([...s.map(c=>wg(t,r,c,i)),...f.map(c=>qg(t,r,c,i))],i),o=Do(s,a).map(([c,l])=>{if("untested"in l)return{kind:"change",option:c,...l.untested};let p=Xr(t,c)/10**t.decimals,v=Ag(l.measured,l.tested.fields,p,i);return{kind:"change",option:c,...zg(l.tested),littleChanged:v}}),u=Do(f,a.slice(s.length)).map(([c,l])=>"untested"in l?{kind:"lead-change",pair:c,...l.untested}:{kind:"lead-change",pair:c,...zg(l.tested)});return[...o,...u]}function ZH(e,r,t){let n=r.map(i=>Pg(e,i,t));return Do(r,So(n,t)).map(([{option:i,pct:s},f])=>({kind:"threshold",option:i,thresholdPct:s,...Tg(f)}))}function Tg(e){if("untested"in e)return e.untested;let{tested:r,measured:t}=e,n=t.bases[0]?.deff.value??1;return{...r.fields,breakingDeff:r.breaking===null?null:n*r.breaking}}function zg({fields:e,breaking:r}){return{...e,breakingFactor:r}}function Do(e,r){return e.flatMap((t,n)=>{let i=r[n];return i===void 0?[]:[[t,i]]})}var X=class extends Error{constructor(t,n){super(n);this.path=t}path;name="CheckRefused";toRefusal(){return{path:this.path,message:this.message}}};var z={};gq(z,{BIGINT_FORMAT_RANGES:()=>Ho,CONSTANT_CATCH:()=>Hg,Class:()=>t0,NUMBER_FORMAT_RANGES:()=>_n,aborted:()=>be,allowsEval:()=>u0,assert:()=>DH,assertEqual:()=>RH,assertIs:()=>CH,assertNever:()=>SH,assertNotEqual:()=>FH,assignProp:()=>Le,attachSchema:()=>yn,base64ToUint8Array:()=>xg,base64urlToUint8Array:()=>oG,cached:()=>dn,captureStackTrace:()=>xo,cleanEnum:()=>nG,cleanRegex:()=>hn,clone:()=>Ce,cloneDef:()=>UH,codePointLength:()=>bn,constantCatch:()=>Gg,createTransparentProxy:()=>JH,defineLazy:()=>Rg,defineLazyInternal:()=>D,derived:()=>aG,esc:()=>i0,escapeRegex:()=>jr,explicitlyAborted:()=>f0,extend:()=>QH,finalizeIssue:()=>dr,floatSafeRemainder:()=>o0,getElementAtPath:()=>HH,getEnumValues:()=>kt,getLengthableOrigin:()=>wn,getParsedType:()=>MH,getSizableOrigin:()=>Bg,hexToUint8Array:()=>sG,hide:()=>Vo,installLazyProp:()=>pG,isObject:()=>$t,isPlainObject:()=>Yr,issue:()=>Ot,joinValues:()=>Bo,jsonStringifyReplacer:()=>At,members:()=>p0,merge:()=>jH,mergeDefs:()=>mr,normalizeParams:()=>E,nullish:()=>n0,numKeys:()=>VH,objectClone:()=>BH,omit:()=>KH,optionalKeys:()=>c0,own:()=>Tr,parsedType:()=>l0,partial:()=>eG,pick:()=>XH,prefixIssues:()=>et,primitiveTypes:()=>Sg,promiseAllObject:()=>GH,propertyKeyTypes:()=>a0,randomString:()=>WH,rawShape:()=>gn,required:()=>rG,safeExtend:()=>YH,shallowClone:()=>Cg,sizeCaps:()=>Wo,slugify:()=>s0,stringifyPrimitive:()=>Uo,toZod:()=>LH,uint8ArrayToBase64:()=>Ug,uint8ArrayToBase64url:()=>iG,uint8ArrayToHex:()=>uG,unwrapMessage:()=>It});function RH(e){return e}function FH(e){return e}function LH(){return e=>e}function CH(e){}function SH(e){throw new Error("Unexpected value in exhaustive check")}function DH(e){}function kt(e){let r=Object.values(e).filter(n=>typeof n=="number");return Object.entries(e).filter(([n,i])=>r.indexOf(+n)===-1).map(([n,i])=>i)}function Bo(e,r="|"){return e.map(t=>Uo(t)).join(r)}function At(e,r){return typeof r=="bigint"?r.toString():r}var r0=class{constructor(r){this._getter=r,this._value=void 0}get value(){let r=this._getter;return r!==void 0&&(this._value=r(),this._getter=void 0),this._value}};function dn(e){return new r0(e)}function n0(e){return e==null}function hn(e){let r=e.startsWith("^")?1:0,t=e.endsWith("$")?e.length-1:e.length;return e.slice(r,t)}function o0(e,r){let t=e/r,n=Math.round(t),i=4*Number.EPSILON*Math.max(Math.abs(t),1);return Math.abs(t-n)<i?0:t-n}var Zg=Symbol("evaluating");function Rg(e,r,t){let n;Object.defineProperty(e,r,{get(){if(n!==Zg)return n===void 0&&(n=Zg,n=t()),n},set(i){Object.defineProperty(e,r,{value:i})},configurable:!0})}function BH(e){return Object.create(Object.getPrototypeOf(e),Object.getOwnPropertyDescriptors(e))}function Le(e,r,t){Object.defineProperty(e,r,{value:t,writable:!0,enumerable:!0,configurable:!0})}function gn(e){let r=Object.getOwnPropertyDescriptor(e,"shape");return r?.get?r.get.raw:r?.value}function vr(e){return gn(e._zod.def)??e._zod.def.shape}function Fg(e,r,t){Object.defineProperty(e,r,{get(){let n=t();return Le(this,r,n),n},enumerable:!0,configurable:!0})}function Lg(e,r,t){r in e?Le(e,r,t):e[r]=t}function Qr(e,r,t,n){let i=vr(r);for(let s of t){let f=Object.getOwnPropertyDescriptor(i,s);f.enumerable&&(f.get?Fg(e,s,()=>{let a=r._zod.def.shape[s];return n?n(a,s):a}):Lg(e,s,n?n(f.value,s):f.value))}}function xH(e,r){for(let t of Reflect.ownKeys(r)){let n=Object.getOwnPropertyDescriptor(r,t);n.enumerable&&(n.get?Fg(e,t,()=>r[t]):Lg(e,t,n.value))}}function mr(...e){let r={};for(let t of e){let n=Object.getOwnPropertyDescriptors(t);Object.assign(r,n)}return Object.defineProperties({},r)}function UH(e){return mr(e._zod.def)}function HH(e,r){return r?r.reduce((t,n)=>t?.[n],e):e}function GH(e){let r=Object.keys(e),t=r.map(n=>e[n]);return Promise.all(t).then(n=>{let i={};for(let s=0;s<r.length;s++)i[r[s]]=n[s];return i})}function WH(e=10){let r="abcdefghijklmnopqrstuvwxyz",t="";for(let n=0;n<e;n++)t+=r[Math.floor(Math.random()*r.length)];return t}function i0(e){return JSON.stringify(e)}function s0(e){return e.toLowerCase().trim().replace(/[^\w\s-]/g,"").replace(/[\s_-]+/g,"-").replace(/^-+|-+$/g,"")}var xo="captureStackTrace"in Error?Error.captureStackTrace:(...e)=>{};function $t(e){return typeof e=="object"&&e!==null&&!Array.isArray(e)}var u0=dn(()=>{if(ge.jitless||typeof navigator<"u"&&navigator?.userAgent?.includes("Cloudflare"))return!1;try{let e=Function;return new e(""),!0}catch{return!1}});function Yr(e){if($t(e)===!1)return!1;let r=e.constructor;if(r===void 0||typeof r!="function")return!0;let t=r.prototype;return!($t(t)===!1||Object.prototype.hasOwnProperty.call(t,"isPrototypeOf")===!1)}function Cg(e){return Yr(e)?{...e}:Array.isArray(e)?[...e]:e instanceof Map?new Map(e):e instanceof Set?new Set(e):e}function VH(e){let r=0;for(let t in e)Object.prototype.hasOwnProperty.call(e,t)&&r++;return r}var MH=e=>{let r=typeof e;switch(r){case"undefined":return"undefined";case"string":return"string";case"number":return Number.isNaN(e)?"nan":"number";case"boolean":return"boolean";case"function":return"function";case"bigint":return"bigint";case"symbol":return"symbol";case"object":return Array.isArray(e)?"array":e===null?"null":e.then&&typeof e.then=="function"&&e.catch&&typeof e.catch=="function"?"promise":typeof Map<"u"&&e instanceof Map?"map":typeof Set<"u"&&e instanceof Set?"set":typeof Date<"u"&&e instanceof Date?"date":typeof File<"u"&&e instanceof File?"file":"object";default:throw new Error(`Unknown data type: ${r}`)}},a0=new Set(["string","number","symbol"]),Sg=new Set(["string","number","bigint","boolean","symbol","undefined"]);function jr(e){return e.replace(/[.*+?^${}()|[\]\\]/g,"\\$&")}function Ce(e,r,t){let n=new e._zod.constr(r??e._zod.def);return(!r||t?.parent)&&(n._zod.parent=e),n}function E(e){let r=e;if(!r)return{};if(typeof r=="string")return{error:()=>r};if(r?.message!==void 0){if(r?.error!==void 0)throw new Error("Cannot specify both `message` and `error` params");r.error=r.message}return delete r.message,typeof r.error=="string"?{...r,error:()=>r.error}:r}function JH(e){let r;return new Proxy({},{get(t,n,i){return r??(r=e()),Reflect.get(r,n,i)},set(t,n,i,s){return r??(r=e()),Reflect.set(r,n,i,s)},has(t,n){return r??(r=e()),Reflect.has(r,n)},deleteProperty(t,n){return r??(r=e()),Reflect.deleteProperty(r,n)},ownKeys(t){return r??(r=e()),Reflect.ownKeys(r)},getOwnPropertyDescriptor(t,n){return r??(r=e()),Reflect.getOwnPropertyDescriptor(r,n)},defineProperty(t,n,i){return r??(r=e()),Reflect.defineProperty(r,n,i)}})}function Uo(e){return typeof e=="bigint"?e.toString()+"n":typeof e=="string"?`"${e}"`:`${e}`}function c0(e){return Object.keys(e).filter(r=>e[r]._zod.optin!==void 0&&e[r]._zod.optout==="optional")}var _n={safeint:[Number.MIN_SAFE_INTEGER,Number.MAX_SAFE_INTEGER],int32:[-2147483648,2147483647],uint32:[0,4294967295],float32:[-34028234663852886e22,34028234663852886e22],float64:[-Number.MAX_VALUE,Number.MAX_VALUE]},Ho={int64:[BigInt("-9223372036854775808"),BigInt("9223372036854775807")],uint64:[BigInt(0),BigInt("18446744073709551615")]};function XH(e,r){let t=e._zod.def,n=t.checks;if(n&&n.length>0)throw new Error(".pick() cannot be used on object schemas containing refinements");let s={};return Qr(s,e,Go(e,r)),Ce(e,mr(t,{shape:s,checks:[]}))}function Go(e,r){let t=vr(e),n=[];for(let i of Reflect.ownKeys(r)){if(!Object.getOwnPropertyDescriptor(t,i)?.enumerable)throw new Error(`Unrecognized key: "${String(i)}"`);r[i]&&n.push(i)}return n}function KH(e,r){let t=e._zod.def,n=t.checks;if(n&&n.length>0)throw new Error(".omit() cannot be used on object schemas containing refinements");let s=new Set(Go(e,r)),f={};return Qr(f,e,Reflect.ownKeys(vr(e)).filter(a=>!s.has(a))),Ce(e,mr(t,{shape:f,checks:[]}))}function QH(e,r){if(!Yr(r))throw new Error("Invalid input to extend: expected a plain object");let t=e._zod.def.checks;if(t&&t.length>0){let i=vr(e);for(let s of Reflect.ownKeys(r))if(Object.getOwnPropertyDescriptor(i,s)!==void 0)throw new Error("Cannot overwrite keys on object schemas containing refinements. Use `.safeExtend()` instead.")}return Ce(e,mr(e._zod.def,{shape:Dg(e,r)}))}function Dg(e,r){let t={};return Qr(t,e,Reflect.ownKeys(vr(e))),xH(t,r),t}function YH(e,r){if(!Yr(r))throw new Error("Invalid input to safeExtend: expected a plain object");return Ce(e,mr(e._zod.def,{shape:Dg(e,r)}))}function jH(e,r){if(!r?._zod?.def)throw new Error("Invalid input to merge: expected an object schema. To merge a plain shape, use `.extend()`.");if(e._zod.def.checks?.length)throw new Error(".merge() cannot be used on object schemas containing refinements. Use .safeExtend() instead.");let t={};Qr(t,e,Reflect.ownKeys(vr(e))),Qr(t,r,Reflect.ownKeys(vr(r)));let n=mr(e._zod.def,{shape:t,get catchall(){return r._zod.def.catchall},checks:r._zod.def.checks??[]});return Ce(e,n)}function eG(e,r,t,n="partial"){let s=r._zod.def.checks;if(s&&s.length>0)throw new Error(`.${n}() cannot be used on object schemas containing refinements`);let a=t?new Set(Go(r,t)):void 0,o={};return Qr(o,r,Reflect.ownKeys(vr(r)),e&&((u,c)=>a&&!a.has(c)?u:new e({type:"optional",innerType:u}))),Ce(r,mr(r._zod.def,{shape:o,checks:[]}))}function rG(e,r,t){let n=t?new Set(Go(r,t)):void 0,i={};return Qr(i,r,Reflect.ownKeys(vr(r)),(s,f)=>n&&!n.has(f)?s:new e({type:"nonoptional",innerType:s})),Ce(r,mr(r._zod.def,{shape:i}))}function be(e,r=0){if(e.aborted===!0)return!0;for(let t=r;t<e.issues.length;t++)if(e.issues[t]?.continue!==!0)return!0;return!1}function f0(e,r=0){if(e.aborted===!0)return!0;for(let t=r;t<e.issues.length;t++)if(e.issues[t]?.continue===!1)return!0;return!1}function et(e,r){return r.map(t=>{var n;return(n=t).path??(n.path=[]),t.path.unshift(e),t})}function It(e){return typeof e=="string"?e:e?.message}function Wo(e){let r=[];for(let t of e??[]){let n=t._zod.def;if(!/_(length|size)$|_equals$/.test(n.check))break;let i=n.maximum??n.length??n.size;i>=0&&r.push([i,t])}return r}function yn(e,r,t){var n;for(let i=r;i<e.length;i++)(n=e[i]).schema??(n.schema=t)}function dr(e,r,t){var n;let i=e.inst?._zod?.traits;i?.has("$ZodType")&&(i.has("$ZodCheck")?(n=e).schema??(n.schema=e.inst):e.schema=e.inst);let s=e.schema!==e.inst?e.schema?._zod.def?.error:void 0,f=e.message?e.message:It(e.inst?._zod.def?.error?.(e))??It(s?.(e))??It(r?.error?.(e))??It(t.customError?.(e))??It(t.localeError?.(e))??"Invalid input",a={};for(let o of Object.keys(e))o==="inst"||o==="schema"||o==="continue"||o==="input"||o==="__proto__"||(a[o]=e[o]);return a.path??(a.path=[]),a.message=f,r?.reportInput&&(a.input=e.input),a}function Bg(e){return e instanceof Set?"set":e instanceof Map?"map":e instanceof File?"file":"unknown"}var tG=/[\uD800-\uDBFF]/;function bn(e){let r=e.length;if(!tG.test(e))return r;let t=r;for(let n=0;n<r-1;n++)(e.charCodeAt(n)&64512)===55296&&(e.charCodeAt(n+1)&64512)===56320&&(t--,n++);return t}function wn(e){return Array.isArray(e)?"array":typeof e=="string"?"string":"unknown"}function l0(e){let r=typeof e;switch(r){case"number":return Number.isNaN(e)?"nan":"number";case"object":{if(e===null)return"null";if(Array.isArray(e))return"array";let t=e;if(t&&Object.getPrototypeOf(t)!==Object.prototype&&"constructor"in t&&t.constructor)return t.constructor.name}}return r}function Ot(...e){let[r,t,n]=e;return typeof r=="string"?{message:r,code:"custom",input:t,inst:n}:{...r}}function nG(e){return Object.entries(e).filter(([r,t])=>Number.isNaN(Number.parseInt(r,10))).map(r=>r[1])}function xg(e){let r=atob(e),t=new Uint8Array(r.length);for(let n=0;n<r.length;n++)t[n]=r.charCodeAt(n);return t}function Ug(e){let r="";for(let t=0;t<e.length;t++)r+=String.fromCharCode(e[t]);return btoa(r)}function oG(e){let r=e.replace(/-/g,"+").replace(/_/g,"/"),t="=".repeat((4-r.length%4)%4);return xg(r+t)}function iG(e){return Ug(e).replace(/\+/g,"-").replace(/\//g,"_").replace(/=/g,"")}function sG(e){let r=e.replace(/^0x/,"");if(r.length%2!==0)throw new Error("Invalid hex string length");let t=new Uint8Array(r.length/2);for(let n=0;n<r.length;n+=2)t[n/2]=Number.parseInt(r.slice(n,n+2),16);return t}function uG(e){return Array.from(e).map(r=>r.toString(16).padStart(2,"0")).join("")}var t0=class{constructor(...r){}};function p0(e,r){for(let t in r){let n=Object.getOwnPropertyDescriptor(r,t);n.get?Object.defineProperty(e,t,{...n,enumerable:!1}):cG(e,t,n.value)}}function Tr(e,r,t,n=!0){return Object.defineProperty(e,r,{configurable:!0,writable:!0,enumerable:n,value:t}),t}function Vo(e,r,t){return Tr(e,r,t,!1)}function aG(e,r){for(let t in e){let n=e[t];Object.defineProperty(r,t,{configurable:!0,enumerable:!0,get(){return Tr(this,t,n(this))},set(i){Tr(this,t,i)}})}return r}function cG(e,r,t){Object.defineProperty(e,r,{configurable:!0,get(){return this==null?t:Tr(this,r,t.bind(this))},set(n){Tr(this,r,n)}})}function fG(e,r){let t=Object.getPrototypeOf(e);return r in t?void 0:t}var e0,zr=!1,lG={configurable:!0,get(){zr=!0}};function D(e,r,t){let n=Object.getPrototypeOf(e._zod);if(r in n&&e0!==e._zod){e0=void 0;return}e0=e._zod,Object.defineProperty(n,r,{configurable:!0,get(){Object.defineProperty(this,r,lG);let i=zr;zr=!1;try{let s=t(this);return zr?delete this[r]:Object.defineProperty(this,r,{configurable:!0,writable:!0,value:s}),zr=zr||i,s}catch(s){throw delete this[r],zr=zr||i,s}},set(i){Object.defineProperty(this,r,{configurable:!0,writable:!0,value:i})}})}function pG(e,r,t,n){let i=fG(e,r);i&&Object.defineProperty(i,r,{configurable:!0,get(){let s={configurable:!0,writable:!0,enumerable:n,value:void 0};return Object.defineProperty(this,r,s),s.value=t(this),Object.defineProperty(this,r,s),s.value},set(s){Object.defineProperty(this,r,{configurable:!0,writable:!0,enumerable:n,value:s})}})}var Hg="~constantCatch";function Gg(e){let r=()=>e;return r[Hg]=!0,r}var Wg;var v0={value:void 0,enumerable:!1},Vg="captureStackTrace"in Error?Error:null;function vG(e){let r=Vg;if(r){let t=r.stackTraceLimit;if(typeof t=="number"){try{r.stackTraceLimit=0}catch{return Vg=null,new e}try{return new e}finally{r.stackTraceLimit=t}}}return new e}function $(e,r,t,n){let i={};function s(p){this.def=p,this.constr=l,this.traits=new Set}s.prototype=i;let f=t,a=f&&new WeakSet;function o(p,v){if(p._zod){if(p._zod.traits.has(e))return}else{v0.value=new s(v);try{Object.defineProperty(p,"_zod",v0)}finally{v0.value=void 0}}if(p._zod.traits.add(e),r(p,v),a){let h=Object.getPrototypeOf(p),_=p._zod.constr.prototype,d=h;for(;d&&d!==_;)d=Object.getPrototypeOf(d);let y=d??h;a.has(y)||(a.add(y),p0(y,f))}let m=l.prototype;for(let h in m)Object.prototype.hasOwnProperty.call(m,h)&&(h in p||(p[h]=m[h].bind(p)))}let u=n?.Parent??Object;class c extends u{}Object.defineProperty(c,"name",{value:e});function l(p){let v=n?.Parent?vG(c):this;o(v,p);let m=v._zod.deferred;if(m){for(let _ of m)_();v._zod.deferred=void 0}let h=globalThis.__zod_globalConfig?.postProcessor;return h&&h(v),v}return Object.defineProperty(l,"init",{value:o}),Object.defineProperty(l,Symbol.hasInstance,{value:p=>n?.Parent&&p instanceof n.Parent?!0:p?._zod?.traits?.has(e)}),Object.defineProperty(l,"name",{value:e}),l}var Se=class extends Error{constructor(){super("Encountered Promise during synchronous parse. Use .parseAsync() instead.")}},Et=class extends Error{constructor(r){super(`Encountered unidirectional transform during encode: ${r}`),this.name="ZodEncodeError"}};(Wg=globalThis).__zod_globalConfig??(Wg.__zod_globalConfig={});var ge=globalThis.__zod_globalConfig;function De(e){return e&&Object.assign(ge,e),ge}function mG(){let e=this._zod;return e.message??(e.message=JSON.stringify(e.def,At,2)),e.message}function dG(e){this._zod.message=e}var hG={get:mG,set:dG,enumerable:!0,configurable:!0},d0={value:void 0,enumerable:!1},Mg=new WeakSet([Object.prototype,Error.prototype]),Jg=(e,r)=>{e.name="$ZodError",d0.value=r,Object.defineProperty(e,"issues",d0),d0.value=void 0,Object.defineProperty(e,"message",hG);let t=Object.getPrototypeOf(e);Mg.has(t)||(Mg.add(t),Object.defineProperty(t,"toString",{configurable:!0,enumerable:!1,get(){let n=()=>this.message;return Object.defineProperty(this,"toString",{value:n,configurable:!0,writable:!0}),n},set(n){Object.defineProperty(this,"toString",{value:n,configurable:!0,writable:!0})}}))},Xg=$("$ZodError",Jg),qte=$("$ZodError",Jg,void 0,{Parent:Error});function gG(e,r,t){return Object.prototype.hasOwnProperty.call(e,r)||(r==="__proto__"?Object.defineProperty(e,r,{value:t(),writable:!0,enumerable:!0,configurable:!0}):e[r]=t()),e[r]}function Kg(e,r=t=>t.message){let t={},n=[];for(let i of e.issues)i.path.length>0?gG(t,i.path[0],()=>[]).push(r(i)):n.push(r(i));return{formErrors:n,fieldErrors:t}}function Qg(e,r=t=>t.message){let t={_errors:[]},n=(i,s=[])=>{for(let f of i.issues)if(f.code==="invalid_union"&&f.errors.length)f.errors.map(a=>n({issues:a},[...s,...f.path]));else if(f.code==="invalid_key")n({issues:f.issues},[...s,...f.path]);else if(f.code==="invalid_element")n({issues:f.issues},[...s,...f.path]);else{let a=[...s,...f.path];if(a.length===0)t._errors.push(r(f));else{let o=t,u=0;for(;u<a.length;){let c=a[u],l=u===a.length-1;if(c==="_errors"){l&&o._errors.push(r(f)),u++;continue}Object.prototype.hasOwnProperty.call(o,c)||Object.defineProperty(o,c,{value:{_errors:[]},enumerable:!0,writable:!0,configurable:!0});let p=o[c];l&&p._errors.push(r(f)),o=p,u++}}}};return n(e),t}function Mo(e,r){return{callee:r?.callee??e,Err:r?.Err}}var Jo=e=>{let r=(t,n,i,s)=>{let f=i?{...i,async:!1}:{async:!1},a=t._zod.run({value:n,issues:[]},f);if(a instanceof Promise)throw new Se;if(a.issues.length){let o=new(s?.Err??e)(a.issues.map(u=>dr(u,f,De())));throw xo(o,s?.callee??r),o}return a.value};return r};var Xo=e=>{let r=async(t,n,i,s)=>{let f=i?{...i,async:!0}:{async:!0},a=t._zod.run({value:n,issues:[]},f);if(a instanceof Promise&&(a=await a),a.issues.length){let o=new(s?.Err??e)(a.issues.map(u=>dr(u,f,De())));throw xo(o,s?.callee??r),o}return a.value};return r};var Ko=e=>(r,t,n)=>{let i=n?{...n,async:!1}:{async:!1},s=r._zod.run({value:t,issues:[]},i);if(s instanceof Promise)throw new Se;return s.issues.length?Yg(e,s.issues,i):{success:!0,data:s.value}};function Yg(e,r,t){let n;return{success:!1,get error(){return n||(n=new e(r.map(i=>dr(i,t,De()))),r=void 0,t=void 0),n},set error(i){n=i,r=void 0,t=void 0}}}var Qo=e=>async(r,t,n)=>{let i=n?{...n,async:!0}:{async:!0},s=r._zod.run({value:t,issues:[]},i);return s instanceof Promise&&(s=await s),s.issues.length?Yg(e,s.issues,i):{success:!0,data:s.value}};var _G=Symbol.for("zod.compile.invalid"),yG=Symbol.for("zod.compile.fallback"),h0=((e,r,t)=>{let n=e._zod.bag.validator;if(n!==void 0){if(n(r)!==_G)return!0;if(n.definite===!0&&t===void 0)return!1}return bG(e,r,t)});function bG(e,r,t){let n=t?{...t,async:!1,abortEarly:!0}:{async:!1,abortEarly:!0},i=e._zod.bag.fallbackRun,s;if(i?(n[yG]=!0,s=i({value:r,issues:[]},n)):s=e._zod.run({value:r,issues:[]},n),s instanceof Promise)throw new Se;return s.issues.length===0}var g0=async(e,r,t)=>{let n=t?{...t,async:!0,abortEarly:!0}:{async:!0,abortEarly:!0},i=e._zod.run({value:r,issues:[]},n);return i instanceof Promise&&(i=await i),i.issues.length===0},jg=e=>{let r=Jo(e),t=(n,i,s,f)=>{let a=s?{...s,direction:"backward"}:{direction:"backward"};return r(n,i,a,Mo(t,f))};return t};var e_=e=>{let r=Jo(e),t=(n,i,s,f)=>r(n,i,s,Mo(t,f));return t};var r_=e=>{let r=Xo(e),t=async(n,i,s,f)=>{let a=s?{...s,direction:"backward"}:{direction:"backward"};return await r(n,i,a,Mo(t,f))};return t};var t_=e=>{let r=Xo(e),t=async(n,i,s,f)=>await r(n,i,s,Mo(t,f));return t};var n_=e=>(r,t,n)=>{let i=n?{...n,direction:"backward"}:{direction:"backward"};return Ko(e)(r,t,i)};var o_=e=>(r,t,n)=>Ko(e)(r,t,n);var i_=e=>async(r,t,n)=>{let i=n?{...n,direction:"backward"}:{direction:"backward"};return Qo(e)(r,t,i)};var s_=e=>async(r,t,n)=>Qo(e)(r,t,n);var u_=/^[cC][0-9a-z]{6,}$/,a_=/^[0-9a-z]+$/,c_=/^[0-7][0-9A-HJKMNP-TV-Za-hjkmnp-tv-z]{25}$/,f_=/^[0-9a-vA-V]{20}$/,l_=/^[A-Za-z0-9]{27}$/,p_=/^[a-zA-Z0-9_-]{21}$/;function v_(e){return new RegExp(`^[a-zA-Z0-9_-]{${e}}$`)}var m_=/^P(?:(\d+W)|(?!.*W)(?=\d|T\d)(\d+Y)?(\d+M)?(\d+D)?(T(?=\d)(\d+H)?(\d+M)?(\d+([.,]\d+)?S)?)?)$/;var d_=/^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-[0-9a-fA-F]{4}-[0-9a-fA-F]{4}-[0-9a-fA-F]{12})$/,y0=e=>e?new RegExp(`^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-${e}[0-9a-fA-F]{3}-[89abAB][0-9a-fA-F]{3}-[0-9a-fA-F]{12})$`):/^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-[1-8][0-9a-fA-F]{3}-[89abAB][0-9a-fA-F]{3}-[0-9a-fA-F]{12}|00000000-0000-0000-0000-000000000000|ffffffff-ffff-ffff-ffff-ffffffffffff)$/;var h_=/^(?:[A-Za-z0-9_'+\-]+\.)*[A-Za-z0-9_'+\-]*[A-Za-z0-9_+-]@(?:[A-Za-z0-9][A-Za-z0-9\-]*\.)+[A-Za-z]{2,}$/;var wG="^(?=[\\s\\S]*[\\p{Extended_Pictographic}\\p{Regional_Indicator}\\u20E3])[\\p{Extended_Pictographic}\\p{Emoji_Component}]+$";function g_(){return new RegExp(wG,"u")}var __=/^(?:(?:25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\.){3}(?:25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])$/,y_=/^(([0-9a-fA-F]{1,4}:){7}[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,7}:|([0-9a-fA-F]{1,4}:){1,6}:[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,5}(:[0-9a-fA-F]{1,4}){1,2}|([0-9a-fA-F]{1,4}:){1,4}(:[0-9a-fA-F]{1,4}){1,3}|([0-9a-fA-F]{1,4}:){1,3}(:[0-9a-fA-F]{1,4}){1,4}|([0-9a-fA-F]{1,4}:){1,2}(:[0-9a-fA-F]{1,4}){1,5}|[0-9a-fA-F]{1,4}:((:[0-9a-fA-F]{1,4}){1,6})|:((:[0-9a-fA-F]{1,4}){1,7}|:))$/;var b_=/^((25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\.){3}(25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\/([0-9]|[1-2][0-9]|3[0-2])$/,w_=/^(([0-9a-fA-F]{1,4}:){7}[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,7}:|([0-9a-fA-F]{1,4}:){1,6}:[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,5}(:[0-9a-fA-F]{1,4}){1,2}|([0-9a-fA-F]{1,4}:){1,4}(:[0-9a-fA-F]{1,4}){1,3}|([0-9a-fA-F]{1,4}:){1,3}(:[0-9a-fA-F]{1,4}){1,4}|([0-9a-fA-F]{1,4}:){1,2}(:[0-9a-fA-F]{1,4}){1,5}|[0-9a-fA-F]{1,4}:((:[0-9a-fA-F]{1,4}){1,6})|:((:[0-9a-fA-F]{1,4}){1,7}|:))\/(12[0-8]|1[01][0-9]|[1-9]?[0-9])$/,q_=/^$|^(?:[0-9a-zA-Z+/]{4})*(?:(?:[0-9a-zA-Z+/]{2}==)|(?:[0-9a-zA-Z+/]{3}=))?$/,P_=/^(?:[A-Za-z0-9_-]{4})*(?:[A-Za-z0-9_-]{2,3})?$/;var I_=/^https?$/,$_=/^\+[1-9]\d{6,14}$/;var k_="(?:(?:\\d\\d[2468][048]|\\d\\d[13579][26]|\\d\\d0[48]|[02468][048]00|[13579][26]00)-02-29|\\d{4}-(?:(?:0[13578]|1[02])-(?:0[1-9]|[12]\\d|3[01])|(?:0[469]|11)-(?:0[1-9]|[12]\\d|30)|(?:02)-(?:0[1-9]|1\\d|2[0-8])))";function qG(e){return new RegExp(`^${e}$`)}var A_=qG(k_);function _0(e){let r="(?:[01]\\d|2[0-3]):[0-5]\\d";return typeof e.precision=="number"?e.precision===-1?`${r}`:e.precision===0?`${r}:[0-5]\\d`:`${r}:[0-5]\\d\\.\\d{${e.precision}}`:e.seconds?`${r}:[0-5]\\d(?:\\.\\d+)?`:`${r}(?::[0-5]\\d(?:\\.\\d+)?)?`}function O_(e){return new RegExp(`^${_0(e)}$`)}function E_(e){let r=["Z"];e.offset&&r.push("([+-](?:[01]\\d|2[0-3]):[0-5]\\d)");let t=`${_0({precision:e.precision,seconds:!0})}(?:${r.join("|")})`,n=e.local?`${t}|${_0({precision:e.precision})}`:t;return new RegExp(`^${k_}T(?:${n})$`)}var N_=/^[\s\S]{0,}$/;var b0=/^-?\d+(?:\.\d+)?$/,z_=/^(?:true|false)$/i;var T_=/^[^A-Z]*$/,Z_=/^[^a-z]*$/;var ce=$("$ZodCheck",(e,r)=>{var t;e._zod??(e._zod={}),e._zod.def=r,(t=e._zod).onattach??(t.onattach=[])});var w0=e=>{let r=e.value;return!n0(r)&&r.length!==void 0},Yo={number:"number",bigint:"bigint",object:"date"},q0=$("$ZodCheckLessThan",(e,r)=>{ce.init(e,r);let t=Yo[typeof r.value];e._zod.check=n=>{(r.inclusive?n.value<=r.value:n.value<r.value)||n.issues.push({origin:Yo[typeof n.value]??t,code:"too_big",maximum:typeof r.value=="object"?r.value.getTime():r.value,input:n.value,inclusive:r.inclusive,inst:e,continue:!r.abort})}}),P0=$("$ZodCheckGreaterThan",(e,r)=>{ce.init(e,r);let t=Yo[typeof r.value];e._zod.check=n=>{(r.inclusive?n.value>=r.value:n.value>r.value)||n.issues.push({origin:Yo[typeof n.value]??t,code:"too_small",minimum:typeof r.value=="object"?r.value.getTime():r.value,input:n.value,inclusive:r.inclusive,inst:e,continue:!r.abort})}}),R_=$("$ZodCheckMultipleOf",(e,r)=>{ce.init(e,r),e._zod.check=t=>{if(typeof t.value!=typeof r.value)throw new Error("Cannot mix number and bigint in multiple_of check.");(typeof t.value=="bigint"?r.value!==BigInt(0)&&t.value%r.value===BigInt(0):o0(t.value,r.value)===0)||t.issues.push({origin:typeof t.value,code:"not_multiple_of",divisor:r.value,input:t.value,inst:e,continue:!r.abort})}}),F_=$("$ZodCheckNumberFormat",(e,r)=>{ce.init(e,r),r.format=r.format||"float64";let t=r.format?.includes("int"),n=t?"int":"number",[i,s]=_n[r.format];e._zod.check=f=>{let a=f.value;if(t){if(!Number.isInteger(a)){f.issues.push({expected:n,format:r.format,code:"invalid_type",continue:!1,input:a,inst:e});return}if(!Number.isSafeInteger(a)){a>0?f.issues.push({input:a,code:"too_big",maximum:Number.MAX_SAFE_INTEGER,note:"Integers must be within the safe integer range.",inst:e,origin:n,inclusive:!0,continue:!r.abort}):f.issues.push({input:a,code:"too_small",minimum:Number.MIN_SAFE_INTEGER,note:"Integers must be within the safe integer range.",inst:e,origin:n,inclusive:!0,continue:!r.abort});return}}a<i&&f.issues.push({origin:"number",input:a,code:"too_small",minimum:i,inclusive:!0,inst:e,continue:!r.abort}),a>s&&f.issues.push({origin:"number",input:a,code:"too_big",maximum:s,inclusive:!0,inst:e,continue:!r.abort})}});var L_=$("$ZodCheckMaxLength",(e,r)=>{var t;ce.init(e,r),(t=e._zod.def).when??(t.when=w0),e._zod.check=n=>{let i=n.value,s=i.length;if((typeof i=="string"&&s>r.maximum?bn(i):s)<=r.maximum)return;let a=wn(i);n.issues.push({origin:a,code:"too_big",maximum:r.maximum,inclusive:!0,input:i,inst:e,continue:!r.abort})}}),C_=$("$ZodCheckMinLength",(e,r)=>{var t;ce.init(e,r),(t=e._zod.def).when??(t.when=w0),e._zod.check=n=>{let i=n.value,s=i.length;if((typeof i=="string"&&s>=r.minimum&&s<r.minimum*2?bn(i):s)>=r.minimum)return;let a=wn(i);n.issues.push({origin:a,code:"too_small",minimum:r.minimum,inclusive:!0,input:i,inst:e,continue:!r.abort})}}),S_=$("$ZodCheckLengthEquals",(e,r)=>{var t;ce.init(e,r),(t=e._zod.def).when??(t.when=w0),e._zod.check=n=>{let i=n.value,s=i.length,f=typeof i=="string"&&s>=r.length&&s<=r.length*2?bn(i):s;if(f===r.length)return;let a=wn(i),o=f>r.length;n.issues.push({origin:a,...o?{code:"too_big",maximum:r.length}:{code:"too_small",minimum:r.length},inclusive:!0,exact:!0,input:n.value,inst:e,continue:!r.abort})}}),Pn=$("$ZodCheckStringFormat",(e,r)=>{var t,n;ce.init(e,r),r.pattern?(t=e._zod).check??(t.check=i=>{r.pattern.lastIndex=0,!r.pattern.test(i.value)&&i.issues.push({origin:"string",code:"invalid_format",format:r.format,input:i.value,...r.pattern?{pattern:r.pattern.toString()}:{},inst:e,continue:!r.abort})}):(n=e._zod).check??(n.check=()=>{})}),D_=$("$ZodCheckRegex",(e,r)=>{Pn.init(e,r),e._zod.check=t=>{r.pattern.lastIndex=0,!r.pattern.test(t.value)&&t.issues.push({origin:"string",code:"invalid_format",format:"regex",input:t.value,pattern:r.pattern.toString(),inst:e,continue:!r.abort})}}),B_=$("$ZodCheckLowerCase",(e,r)=>{r.pattern??(r.pattern=T_),Pn.init(e,r)}),x_=$("$ZodCheckUpperCase",(e,r)=>{r.pattern??(r.pattern=Z_),Pn.init(e,r)}),U_=$("$ZodCheckIncludes",(e,r)=>{ce.init(e,r);let t=jr(r.includes),n=new RegExp(typeof r.position=="number"?`^.{${r.position},}${t}`:t);r.pattern=n,e._zod.check=i=>{i.value.includes(r.includes,r.position)||i.issues.push({origin:"string",code:"invalid_format",format:"includes",includes:r.includes,input:i.value,inst:e,continue:!r.abort})}}),H_=$("$ZodCheckStartsWith",(e,r)=>{ce.init(e,r);let t=new RegExp(`^${jr(r.prefix)}.*`);r.pattern??(r.pattern=t),e._zod.check=n=>{n.value.startsWith(r.prefix)||n.issues.push({origin:"string",code:"invalid_format",format:"starts_with",prefix:r.prefix,input:n.value,inst:e,continue:!r.abort})}}),G_=$("$ZodCheckEndsWith",(e,r)=>{ce.init(e,r);let t=new RegExp(`.*${jr(r.suffix)}$`);r.pattern??(r.pattern=t),e._zod.check=n=>{n.value.endsWith(r.suffix)||n.issues.push({origin:"string",code:"invalid_format",format:"ends_with",suffix:r.suffix,input:n.value,inst:e,continue:!r.abort})}});var W_=$("$ZodCheckOverwrite",(e,r)=>{ce.init(e,r),e._zod.check=t=>{t.value=r.tx(t.value)}});var jo=class{constructor(r=[],t={}){this.content=[],this.indent=0,this.args=r,this.closed=t}indented(r){this.indent+=1;try{r(this)}finally{this.indent-=1}}write(r){if(typeof r=="function"){r(this,{execution:"sync"}),r(this,{execution:"async"});return}let n=r.split(`
`).filter(f=>f),i=Math.min(...n.map(f=>f.length-f.trimStart().length)),s=n.map(f=>f.slice(i)).map(f=>" ".repeat(this.indent*2)+f);for(let f of s)this.content.push(f)}compile(){let r=Function,t=this?.content??[""];return new r(...Object.keys(this.closed),`return function (${this.args.join(", ")}) {
${t.join(`
`)}
};`)(...Object.values(this.closed))}};var M_={major:4,minor:6,patch:7};var K=$("$ZodType",(e,r)=>{var t;e??(e={}),e._zod.def=r,e._zod.bag=e._zod.bag||{},e._zod.version=M_;let n=e._zod.def.checks,i=e._zod.traits.has("$ZodCheck")?[e,...n??[]]:n?.length?[...n]:[];for(let s of i)for(let f of s._zod.onattach)f(e);if(i.length===0)(t=e._zod).deferred??(t.deferred=[]),e._zod.deferred?.push(()=>{e._zod.run=e._zod.parse});else{let s=(a,o,u)=>{if(a.memo)return a;let c=be(a),l;for(let p of o){if(p._zod.def.when){if(f0(a)||!p._zod.def.when(a))continue}else if(c)continue;let v=a.issues.length,m=p._zod.check(a);if(m instanceof Promise&&u?.async===!1)throw new Se;if(l||m instanceof Promise)l=(l??Promise.resolve()).then(async()=>{await m,a.issues.length!==v&&(yn(a.issues,v,e),c||(c=be(a,v)))});else{if(a.issues.length===v)continue;yn(a.issues,v,e),c||(c=be(a,v))}}return l?l.then(()=>a):a},f=(a,o,u)=>{if(be(a))return a.aborted=!0,a;let c=s(o,i,u);if(c instanceof Promise){if(u.async===!1)throw new Se;return c.then(l=>e._zod.parse(l,u))}return e._zod.parse(c,u)};e._zod.run=(a,o)=>{if(o.skipChecks)return e._zod.parse(a,o);if(o.direction==="backward"){let c=e._zod.parse({value:a.value,issues:[]},{...o,skipChecks:!0});return c instanceof Promise?c.then(l=>f(l,a,o)):f(c,a,o)}let u=e._zod.parse(a,o);if(u instanceof Promise){if(o.async===!1)throw new Se;return u.then(c=>s(c,i,o))}return s(u,i,o)}}},{get"~standard"(){return Vo(this,"~standard",$0(this))},set"~standard"(e){Tr(this,"~standard",e)}}),uy=(e,r)=>e.issues.length?{issues:e.issues.map(t=>dr(t,r,De()))}:{value:e.value};async function IG(e,r){let t={async:!0};return uy(await e._zod.run({value:r,issues:[]},t),t)}function $0(e){return{validate:r=>{let t={async:!1};try{let n=e._zod.run({value:r,issues:[]},t);if(!(n instanceof Promise))return uy(n,t)}catch{}return IG(e,r)},vendor:"zod",version:1}}var ni=$("$ZodString",(e,r)=>{K.init(e,r),e._zod.pattern=r.pattern??N_,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=String(t.value)}catch{}return typeof t.value=="string"||t.issues.push({expected:"string",code:"invalid_type",input:t.value,inst:e}),t}}),W=$("$ZodStringFormat",(e,r)=>{Pn.init(e,r),ni.init(e,r)}),ay=$("$ZodGUID",(e,r)=>{r.pattern??(r.pattern=d_),W.init(e,r)}),cy=$("$ZodUUID",(e,r)=>{if(r.version){let n={v1:1,v2:2,v3:3,v4:4,v5:5,v6:6,v7:7,v8:8}[r.version];if(n===void 0)throw new Error(`Invalid UUID version: "${r.version}"`);r.pattern??(r.pattern=y0(n))}else r.pattern??(r.pattern=y0());W.init(e,r)}),fy=$("$ZodEmail",(e,r)=>{r.pattern??(r.pattern=h_),W.init(e,r)}),ly=1,ri=2;function py(e){try{return typeof URL<"u"&&typeof URL.canParse=="function"?URL.canParse(e):(new URL(e),!0)}catch{return!1}}function $G(e,r){return!("normalize"in r)&&!("hostname"in r)&&!("protocol"in r)?py(e)||ri:kG(e,r)}function kG(e,r){if(!r.normalize&&r.protocol?.source===I_.source&&!/^https?:\/\//i.test(e))return ly;try{if(typeof URL<"u"){let t=URL;if(typeof t.parse=="function")return t.parse(e)??ri}return new URL(e)}catch{return ri}}var AG=/[\t\n\r]/g;function J_(e){return e.replace(AG,"")}function OG(e,r){return r.lastIndex=0,r.test(e.hostname)}function EG(e,r){return r.lastIndex=0,r.test(e.protocol.endsWith(":")?e.protocol.slice(0,-1):e.protocol)}var vy=$("$ZodURL",(e,r)=>{W.init(e,r),e._zod.check=t=>{try{let n=t.value.trim(),i=$G(n,r);if(i===ly){t.issues.push({code:"invalid_format",format:"url",note:"Invalid URL format",input:t.value,inst:e,continue:!r.abort});return}if(i===ri){t.issues.push({code:"invalid_format",format:"url",input:t.value,inst:e,continue:!r.abort});return}if(i===!0){t.value=J_(n);return}r.hostname&&!OG(i,r.hostname)&&t.issues.push({code:"invalid_format",format:"url",note:"Invalid hostname",pattern:r.hostname.source,input:t.value,inst:e,continue:!r.abort}),r.protocol&&!EG(i,r.protocol)&&t.issues.push({code:"invalid_format",format:"url",note:"Invalid protocol",pattern:r.protocol.source,input:t.value,inst:e,continue:!r.abort}),t.value=r.normalize?i.href:J_(n);return}catch{t.issues.push({code:"invalid_format",format:"url",input:t.value,inst:e,continue:!r.abort})}}}),my=$("$ZodEmoji",(e,r)=>{r.pattern??(r.pattern=g_()),W.init(e,r)}),dy=$("$ZodNanoID",(e,r)=>{if(r.length!==void 0&&(!Number.isInteger(r.length)||r.length<1))throw new Error(`Invalid nanoid length: ${r.length}`);r.pattern??(r.pattern=r.length===void 0?p_:v_(r.length)),W.init(e,r)}),hy=$("$ZodCUID",(e,r)=>{r.pattern??(r.pattern=u_),W.init(e,r)}),gy=$("$ZodCUID2",(e,r)=>{r.pattern??(r.pattern=a_),W.init(e,r)}),_y=$("$ZodULID",(e,r)=>{r.pattern??(r.pattern=c_),W.init(e,r)}),yy=$("$ZodXID",(e,r)=>{r.pattern??(r.pattern=f_),W.init(e,r)}),by=$("$ZodKSUID",(e,r)=>{r.pattern??(r.pattern=l_),W.init(e,r)}),wy=$("$ZodISODateTime",(e,r)=>{r.pattern??(r.pattern=E_(r)),W.init(e,r)}),qy=$("$ZodISODate",(e,r)=>{r.pattern??(r.pattern=A_),W.init(e,r)}),Py=$("$ZodISOTime",(e,r)=>{r.pattern??(r.pattern=O_(r)),W.init(e,r)}),Iy=$("$ZodISODuration",(e,r)=>{r.pattern??(r.pattern=m_),W.init(e,r)}),$y=$("$ZodIPv4",(e,r)=>{r.pattern??(r.pattern=__),W.init(e,r)}),NG=/^[0-9a-fA-F:.]+$/;function ky(e){return NG.test(e)?py(`http://[${e}]`):!1}var Ay=$("$ZodIPv6",(e,r)=>{r.pattern??(r.pattern=y_),W.init(e,r),e._zod.check=t=>{ky(t.value)||t.issues.push({code:"invalid_format",format:"ipv6",input:t.value,inst:e,continue:!r.abort})}});var Oy=$("$ZodCIDRv4",(e,r)=>{r.pattern??(r.pattern=b_),W.init(e,r)});function zG(e){let r=e.split("/");if(r.length!==2)return!1;let[t,n]=r;if(!n)return!1;let i=Number(n);return`${i}`!==n||i<0||i>128?!1:ky(t)}var Ey=$("$ZodCIDRv6",(e,r)=>{r.pattern??(r.pattern=w_),W.init(e,r),e._zod.check=t=>{zG(t.value)||t.issues.push({code:"invalid_format",format:"cidrv6",input:t.value,inst:e,continue:!r.abort})}});function Ny(e){if(e==="")return!0;if(/\s/.test(e)||e.length%4!==0)return!1;try{return atob(e),!0}catch{return!1}}var k0=/^[0-9a-zA-Z+/]*={0,2}$/,zy=$("$ZodBase64",(e,r)=>{r.pattern??(r.pattern=k0),W.init(e,r),e._zod.check=t=>{Ny(t.value)||t.issues.push({code:"invalid_format",format:"base64",input:t.value,inst:e,continue:!r.abort})}}),oi=/^[A-Za-z0-9_-]*$/;function TG(e){if(!oi.test(e))return!1;let r=e.replace(/[-_]/g,n=>n==="-"?"+":"/"),t=r.padEnd(Math.ceil(r.length/4)*4,"=");return Ny(t)}var Ty=$("$ZodBase64URL",(e,r)=>{r.pattern??(r.pattern=oi),W.init(e,r),e._zod.check=t=>{TG(t.value)||t.issues.push({code:"invalid_format",format:"base64url",input:t.value,inst:e,continue:!r.abort})}}),Zy=$("$ZodE164",(e,r)=>{r.pattern??(r.pattern=$_),W.init(e,r)});function ZG(e,r=null){try{let t=e.split(".");if(t.length!==3)return!1;let[n]=t;if(!n)return!1;let i=JSON.parse(atob(n));return!("typ"in i&&i?.typ!=="JWT"||!i.alg||r&&(!("alg"in i)||i.alg!==r))}catch{return!1}}var Ry=$("$ZodJWT",(e,r)=>{W.init(e,r),e._zod.check=t=>{ZG(t.value,r.alg)||t.issues.push({code:"invalid_format",format:"jwt",input:t.value,inst:e,continue:!r.abort})}});var A0=$("$ZodNumber",(e,r)=>{K.init(e,r),e._zod.pattern=b0,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=Number(t.value)}catch{}let i=t.value;if(typeof i=="number"&&!Number.isNaN(i)&&Number.isFinite(i))return t;let s=typeof i=="number"?Number.isNaN(i)?"NaN":Number.isFinite(i)?void 0:String(i):void 0;return t.issues.push({expected:"number",code:"invalid_type",input:i,inst:e,...s?{received:s}:{}}),t}}),Fy=$("$ZodNumberFormat",(e,r)=>{F_.init(e,r),A0.init(e,r)}),Ly=$("$ZodBoolean",(e,r)=>{K.init(e,r),e._zod.pattern=z_,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=!!t.value}catch{}let i=t.value;return typeof i=="boolean"||t.issues.push({expected:"boolean",code:"invalid_type",input:i,inst:e}),t}});var Cy=$("$ZodUnknown",(e,r)=>{K.init(e,r),e._zod.parse=t=>t}),Sy=$("$ZodNever",(e,r)=>{K.init(e,r),e._zod.parse=(t,n)=>(t.issues.push({expected:"never",code:"invalid_type",input:t.value,inst:e}),t)});function RG(e,r){let t=Wo(e._zod.def.checks);if(!t.length)return;let n=Math.min(...t.map(s=>s[0])),i=e._zod.parse;e._zod.parse=(s,f)=>{let a=r(s.value);if(a>n&&!f?.skipChecks&&f?.direction!=="backward"){for(let[o,u]of Wo(e._zod.def.checks))if(a>o&&u._zod.def.when(s)){let c=s.issues.length;return u._zod.check(s),s.issues[c].continue=!1,yn(s.issues,c,e),s}}return i(s,f)}}var FG=e=>Array.isArray(e)?e.length:-1;function X_(e,r,t){e.issues.length&&r.issues.push(...et(t,e.issues)),r.value[t]=e.value}var Dy=$("$ZodArray",(e,r)=>{K.init(e,r);let t=ge.memoizer;t?.attach(e),e._zod.parse=(n,i)=>{let s=n.value;if(!Array.isArray(s))return n.issues.push({expected:"array",code:"invalid_type",input:s,inst:e}),n;n.value=t?t.alloc(e,n,Array(s.length),i):Array(s.length);let f=[],a=i?.abortEarly;for(let o=0;o<s.length;o++){let u=s[o],c=r.element._zod.run({value:u,issues:[]},i);if(c instanceof Promise)f.push(c.then(l=>X_(l,n,o)));else if(X_(c,n,o),a&&c.issues.length!==0&&be(c))break}return f.length?Promise.all(f).then(()=>n):n},RG(e,FG)});function ti(e,r,t,n,i,s){let f=t in n,a=s==="optional";if(!(!f&&a&&i==="optional")){if(e.issues.length){if(i!==void 0&&a&&!f)return;r.issues.push(...et(t,e.issues))}if(!f&&i===void 0){e.issues.length||r.issues.push({code:"invalid_type",expected:"nonoptional",input:void 0,path:[t]});return}e.value===void 0?(f||i==="defaulted"&&!a)&&(r.value[t]=void 0):r.value[t]=e.value}}var LG=[];function By(e){let r=Object.keys(e.shape),t=Object.getOwnPropertySymbols(e.shape),n=t.length?t:LG,i=n.length?[...r,...n]:r;for(let f of i)if(!e.shape?.[f]?._zod?.traits?.has("$ZodType"))throw new Error(`Invalid element at key "${String(f)}": expected a Zod schema`);let s=c0(e.shape);return{...e,allKeys:i,symbolKeys:n,keySet:new Set(r),numKeys:r.length,optionalKeys:new Set(s)}}function xy(e,r,t,n,i,s,f){let a=[],o=i.keySet,u=i.catchall._zod,c=u.def.type,l=u.optin,p=u.optout,v=0;for(let m in r){if(f&&t.issues.length!==v){if(be(t,v))break;v=t.issues.length}if(o.has(m))continue;if(m==="__proto__"){c==="never"&&a.push(m);continue}if(c==="never"){a.push(m);continue}let h=u.run({value:r[m],issues:[]},n);h instanceof Promise?e.push(h.then(_=>ti(_,t,m,r,l,p))):ti(h,t,m,r,l,p)}return a.length&&t.issues.push({code:"unrecognized_keys",keys:a,input:r,inst:s,continue:!0}),e.length?Promise.all(e).then(()=>t):t}var CG=$("$ZodObject",(e,r)=>{K.init(e,r);let t=Object.getOwnPropertyDescriptor(r,"shape"),n=t?.get?t.get.raw:r.shape??{};if(n){let u=()=>{let c={...n};return Object.defineProperty(r,"shape",{value:c}),u.raw=c,c};u.raw=n,Object.defineProperty(r,"shape",{get:u})}let i=dn(()=>By(r));D(e,"propValues",u=>{let c=u.def.shape,l={};for(let p in c){let v=c[p]._zod;if(v.values){Object.prototype.hasOwnProperty.call(l,p)||Le(l,p,new Set);for(let m of v.values)l[p].add(m);v.optin!==void 0&&l[p].add(void 0)}}return l});let s=$t,f=r.catchall,a,o=ge.memoizer;o?.attach(e),e._zod.parse=(u,c)=>{a??(a=i.value);let l=u.value;if(!s(l))return u.issues.push({expected:"object",code:"invalid_type",input:l,inst:e}),u;u.value=o?o.alloc(e,u,{},c):{};let p=[],v=a.shape,m=c?.abortEarly,h=u.issues.length;for(let _ of a.allKeys){if(m&&u.issues.length!==h){if(be(u,h))break;h=u.issues.length}if(_==="__proto__")continue;let d=v[_],y=d._zod.optin,b=d._zod.optout,w=d._zod.run({value:l[_],issues:[]},c);w instanceof Promise?p.push(w.then(q=>ti(q,u,_,l,y,b))):ti(w,u,_,l,y,b)}return f?xy(p,l,u,c,i.value,e,m===!0):p.length?Promise.all(p).then(()=>u):u}}),Uy=$("$ZodObjectJIT",(e,r)=>{CG.init(e,r);let t=e._zod.parse,n=dn(()=>By(r)),i=ge.memoizer,s=v=>{let m=n.value,h=m.symbolKeys,_=new jo(["payload","ctx"],{shape:v,inst:e,memo:i,syms:h}),d=q=>`shape[${q}]._zod.run({ value: input[${q}], issues: [] }, ctx)`,y=(q,P)=>`
          let ${q}_ab = false;
          for (let i = 0; i < ${q}.issues.length; i++) {
            const iss = ${q}.issues[i];
            iss.path = iss.path ? [${P}, ...iss.path] : [${P}];
            payload.issues.push(iss);
            if (iss.continue !== true) ${q}_ab = true;
          }
          if (${q}_ab && ctx && ctx.abortEarly) {
            payload.value = newResult;
            return payload;
          }`;_.write("const input = payload.value;");let b=Object.create(null),w=0;for(let q of m.allKeys)b[q]=`key_${w++}`;_.write(i?"const newResult = memo.alloc(inst, payload, {}, ctx);":"const newResult = {};");for(let q of m.allKeys){if(q==="__proto__")continue;let P=b[q],I=typeof q=="symbol"?`syms[${h.indexOf(q)}]`:i0(q),A=`${I} in input`,O=v[q],C=O?._zod?.optin,L=C!==void 0,Z=O?._zod?.optout==="optional";if(_.write(`const ${P} = ${d(I)};`),L&&Z){let V=C==="optional"?`${P}_present`:`${P}.value !== undefined || ${P}_present`;_.write(`
        const ${P}_present = ${A};
        if (!${P}.issues.length || ${P}_present) {
          if (${P}.issues.length) {${y(P,I)}
          }

          if (${V}) {
            newResult[${I}] = ${P}.value;
          }
        }

      `)}else L?(_.write(`
        if (${P}.issues.length) {${y(P,I)}
        }
      `),C==="defaulted"?_.write(`newResult[${I}] = ${P}.value;`):_.write(`
        if (${P}.value !== undefined || ${A}) {
          newResult[${I}] = ${P}.value;
        }
      `)):_.write(`
        const ${P}_present = ${A};
        if (${P}.issues.length) {${y(P,I)}
        }
        if (!${P}_present && !${P}.issues.length) {
          payload.issues.push({
            code: "invalid_type",
            expected: "nonoptional",
            input: undefined,
            path: [${I}]
          });
          if (ctx && ctx.abortEarly) {
            payload.value = newResult;
            return payload;
          }
        }

        if (${P}_present) {
          newResult[${I}] = ${P}.value;
        }

      `)}return _.write("payload.value = newResult;"),_.write("return payload;"),_.compile()},f,a=$t,o=!ge.jitless,c=o&&u0.value,l=r.catchall,p;e._zod.parse=(v,m)=>{p??(p=n.value);let h=v.value;return a(h)?o&&c&&m?.async===!1&&m.jitless!==!0?(f||(f=s(r.shape)),v=f(v,m),l?xy([],h,v,m,p,e,m?.abortEarly===!0):v):t(v,m):(v.issues.push({expected:"object",code:"invalid_type",input:h,inst:e}),v)}});function K_(e,r,t,n){for(let s of e)if(s.issues.length===0)return r.value=s.value,r;let i=e.filter(s=>!be(s));return i.length===1?(r.value=i[0].value,i[0]):(r.issues.push({code:"invalid_union",input:r.value,inst:t,errors:e.map(s=>s.issues.map(f=>dr(f,n,De())))}),r)}var Hy=$("$ZodUnion",(e,r)=>{K.init(e,r),D(e,"optin",n=>n.def.options.some(i=>i._zod.optin==="defaulted")?"defaulted":n.def.options.some(i=>i._zod.optin!==void 0)?"optional":void 0),D(e,"optout",n=>n.def.options.some(i=>i._zod.optout==="optional")?"optional":void 0),D(e,"values",n=>{if(n.def.options.every(i=>i._zod.values))return new Set(n.def.options.flatMap(i=>Array.from(i._zod.values)))}),D(e,"pattern",n=>{if(n.def.options.every(i=>i._zod.pattern)){let i=n.def.options.map(s=>s._zod.pattern);return new RegExp(`^(${i.map(s=>hn(s.source)).join("|")})$`)}});let t=r.options.length===1?r.options[0]._zod.run:null;e._zod.parse=(n,i)=>{if(t)return t(n,i);let s=!1,f=[];for(let a of r.options){let o=a._zod.run({value:n.value,issues:[]},i);if(o instanceof Promise)f.push(o),s=!0;else{if(o.issues.length===0)return o;f.push(o)}}return s?Promise.all(f).then(a=>K_(a,n,e,i)):K_(f,n,e,i)}});var Gy=$("$ZodIntersection",(e,r)=>{K.init(e,r),e._zod.parse=(t,n)=>{let i=t.value,s=r.left._zod.run({value:i,issues:[]},n),f=r.right._zod.run({value:i,issues:[]},n);return s instanceof Promise||f instanceof Promise?Promise.all([s,f]).then(([o,u])=>Q_(t,o,u)):Q_(t,s,f)}});function I0(e,r){if(e===r)return{valid:!0,data:e};if(e instanceof Date&&r instanceof Date&&+e==+r)return{valid:!0,data:e};if(Yr(e)&&Yr(r)){let t=Object.keys(r),n=Object.keys(e).filter(s=>t.indexOf(s)!==-1),i={...e,...r};Object.prototype.hasOwnProperty.call(i,"__proto__")&&delete i.__proto__;for(let s of n){if(s==="__proto__")continue;let f=I0(e[s],r[s]);if(!f.valid)return{valid:!1,mergeErrorPath:[s,...f.mergeErrorPath]};i[s]=f.data}return{valid:!0,data:i}}if(Array.isArray(e)&&Array.isArray(r)){if(e.length!==r.length)return{valid:!1,mergeErrorPath:[]};let t=[];for(let n=0;n<e.length;n++){let i=e[n],s=r[n],f=I0(i,s);if(!f.valid)return{valid:!1,mergeErrorPath:[n,...f.mergeErrorPath]};t.push(f.data)}return{valid:!0,data:t}}return{valid:!1,mergeErrorPath:[]}}function Q_(e,r,t){let n=new Map,i,s=new Map,f=(u,c)=>{let l;if(u.code==="unrecognized_keys"&&!u.path?.length)i??(i=u),l=u.keys;else if(u.code==="invalid_key"&&u.origin==="record"&&u.path?.length===1){let p=String(u.path[0]);s.has(p)||s.set(p,u),l=[p]}else return!1;for(let p of l)n.has(p)||n.set(p,{}),n.get(p)[c]=!0;return!0};for(let u of r.issues)f(u,"l")||e.issues.push(u);for(let u of t.issues)f(u,"r")||e.issues.push(u);let a=[...n].filter(([,u])=>u.l&&u.r).map(([u])=>u);if(a.length){let u=i?a.filter(c=>i.keys.includes(c)):[];u.length&&e.issues.push({...i,keys:u});for(let c of a)!u.includes(c)&&s.has(c)&&e.issues.push(s.get(c))}let o=I0(r.value,t.value);if(!o.valid){if(be(e))return e;throw new Error(`Unmergable intersection. Error path: ${JSON.stringify(o.mergeErrorPath)}`)}return e.value=o.data,e}var Wy=$("$ZodTuple",(e,r)=>{K.init(e,r);let t=r.items,n=ge.memoizer;n?.attach(e),e._zod.parse=(i,s)=>{let f=i.value;if(!Array.isArray(f))return i.issues.push({input:f,inst:e,expected:"tuple",code:"invalid_type"}),i;i.value=n?n.alloc(e,i,[],s):[];let a=[],o=Y_(t,"optin"),u=Y_(t,"optout");if(!r.rest){if(f.length<o)return i.issues.push({code:"too_small",minimum:o,inclusive:!0,input:f,inst:e,origin:"array"}),i;f.length>t.length&&i.issues.push({code:"too_big",maximum:t.length,inclusive:!0,input:f,inst:e,origin:"array"})}let c=new Array(t.length),l=r.rest?s?.abortEarly:void 0,p=!1;for(let v=0;v<t.length;v++){let m=t[v]._zod.run({value:f[v],issues:[]},s);m instanceof Promise?a.push(m.then(h=>{c[v]=h})):(c[v]=m,l&&!p&&m.issues.length&&(p=be(m)))}if(r.rest&&!p){let v=t.length-1,m=f.slice(t.length),h=i.issues.length;for(let _ of m){if(l&&i.issues.length!==h){if(be(i,h))break;h=i.issues.length}v++;let d=r.rest._zod.run({value:_,issues:[]},s);d instanceof Promise?a.push(d.then(y=>j_(y,i,v))):j_(d,i,v)}}return a.length?Promise.all(a).then(()=>ey(c,i,t,f,u)):ey(c,i,t,f,u)}});function Y_(e,r){for(let t=e.length-1;t>=0;t--)if(!(r==="optin"?e[t]._zod.optin!==void 0:e[t]._zod.optout==="optional"))return t+1;return 0}function j_(e,r,t){e.issues.length&&r.issues.push(...et(t,e.issues)),r.value[t]=e.value}function ey(e,r,t,n,i){for(let s=0;s<t.length;s++){let f=e[s],a=s<n.length;if(!a&&s>=i&&t[s]._zod.optin==="optional"){r.value.length=s;break}if(f.issues.length){if(!a&&s>=i){r.value.length=s;break}r.issues.push(...et(s,f.issues))}r.value[s]=f.value}for(let s=r.value.length-1;s>=n.length&&(t[s]._zod.optout==="optional"&&r.value[s]===void 0);s--)r.value.length=s;return r}var Vy=$("$ZodEnum",(e,r)=>{K.init(e,r);let t=kt(r.entries),n=new Set(t);e._zod.values=n,D(e,"pattern",i=>{let s=kt(i.def.entries).filter(f=>a0.has(typeof f));return new RegExp(s.length?`^(${s.map(f=>jr(f.toString())).join("|")})$`:"^[^\\s\\S]$")}),e._zod.parse=(i,s)=>{let f=i.value;return n.has(f)||i.issues.push({code:"invalid_value",values:t,input:f,inst:e}),i}});var My=$("$ZodTransform",(e,r)=>{K.init(e,r),e._zod.optin="optional",ge.memoizer?.guard(e),e._zod.parse=(t,n)=>{if(n.direction==="backward")throw new Et(e.constructor.name);let i=r.transform(t.value,t);if(n.async)return(i instanceof Promise?i:Promise.resolve(i)).then(f=>(t.value=f,t));if(i instanceof Promise)throw new Se;return t.value=i,t}});function ry(e,r){return e.value=r.issues.length?void 0:r.value,e}var O0=$("$ZodOptional",(e,r)=>{K.init(e,r),D(e,"optin",t=>t.def.innerType._zod.optin==="defaulted"?"defaulted":"optional"),e._zod.optout="optional",D(e,"values",t=>{let n=t.def.innerType._zod.values;return n?new Set([...n,void 0]):void 0}),D(e,"pattern",t=>{let n=t.def.innerType._zod.pattern;return n?new RegExp(`^(${hn(n.source)})?$`):void 0}),e._zod.parse=(t,n)=>{if(t.value===void 0){if(r.innerType._zod.optin!=="defaulted")return t;let i=r.innerType._zod.run({value:t.value,issues:[]},n);return i instanceof Promise?i.then(s=>ry(t,s)):ry(t,i)}return r.innerType._zod.run(t,n)}}),Jy=$("$ZodExactOptional",(e,r)=>{O0.init(e,r),D(e,"values",t=>t.def.innerType._zod.values),D(e,"pattern",t=>t.def.innerType._zod.pattern),e._zod.parse=(t,n)=>r.innerType._zod.run(t,n)}),Xy=$("$ZodNullable",(e,r)=>{K.init(e,r),D(e,"optin",t=>t.def.innerType._zod.optin),D(e,"optout",t=>t.def.innerType._zod.optout),D(e,"pattern",t=>{let n=t.def.innerType._zod.pattern;return n?new RegExp(`^(${hn(n.source)}|null)$`):void 0}),D(e,"values",t=>t.def.innerType._zod.values?new Set([...t.def.innerType._zod.values,null]):void 0),e._zod.parse=(t,n)=>t.value===null?t:r.innerType._zod.run(t,n)}),Ky=$("$ZodDefault",(e,r)=>{K.init(e,r),e._zod.optin="defaulted",D(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);if(t.value===void 0)return t.value=r.defaultValue,t;let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(s=>ty(s,r)):ty(i,r)}});function ty(e,r){return e.value===void 0&&(e.value=r.defaultValue),e}var Qy=$("$ZodPrefault",(e,r)=>{K.init(e,r),e._zod.optin="defaulted",D(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>(n.direction==="backward"||t.value===void 0&&(t.value=r.defaultValue),r.innerType._zod.run(t,n))}),Yy=$("$ZodNonOptional",(e,r)=>{K.init(e,r),D(e,"values",t=>{let n=t.def.innerType._zod.values;return n?new Set([...n].filter(i=>i!==void 0)):void 0}),e._zod.parse=(t,n)=>{let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(s=>ny(s,e)):ny(i,e)}});function ny(e,r){return!e.issues.length&&e.value===void 0&&e.issues.push({code:"invalid_type",expected:"nonoptional",input:e.value,inst:r}),e}function oy(e,r,t,n){return r.issues.length?(e.value=t.catchValue({...r,value:e.value,error:{issues:r.issues.map(i=>dr(i,n,De()))},input:e.value}),e):(e.value=r.value,r.memo&&(e.memo=!0),e)}var jy=$("$ZodCatch",(e,r)=>{K.init(e,r),D(e,"optin",t=>t.def.innerType._zod.optin==="defaulted"?"defaulted":"optional"),D(e,"optout",t=>t.def.innerType._zod.optout),D(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);let i=r.innerType._zod.run({value:t.value,issues:[]},n);return i instanceof Promise?i.then(s=>oy(t,s,r,n)):oy(t,i,r,n)}});var eb=$("$ZodPipe",(e,r)=>{K.init(e,r),D(e,"values",t=>t.def.in._zod.values),D(e,"optin",t=>t.def.in._zod.optin),D(e,"optout",t=>t.def.out._zod.optout),D(e,"propValues",t=>t.def.in._zod.propValues),e._zod.parse=(t,n)=>{if(n.direction==="backward"){let s=r.out._zod.run(t,n);return s instanceof Promise?s.then(f=>ei(f,r.in,n)):ei(s,r.in,n)}let i=r.in._zod.run(t,n);return i instanceof Promise?i.then(s=>ei(s,r.out,n)):ei(i,r.out,n)}});function ei(e,r,t){return e.issues.some(n=>n.code!=="unrecognized_keys")?(e.aborted=!0,e):r._zod.run({value:e.value,issues:e.issues},t)}var rb=$("$ZodReadonly",(e,r)=>{K.init(e,r),D(e,"propValues",t=>t.def.innerType._zod.propValues),D(e,"values",t=>t.def.innerType._zod.values),D(e,"optin",t=>t.def.innerType?._zod?.optin),D(e,"optout",t=>t.def.innerType?._zod?.optout),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(iy):iy(i)}});function iy(e){return e.memo||(e.value=Object.freeze(e.value)),e}var tb=$("$ZodCustom",(e,r)=>{ce.init(e,r),K.init(e,r),e._zod.parse=(t,n)=>t,e._zod.check=t=>{let n=t.value,i=r.fn(n);if(i instanceof Promise)return i.then(s=>sy(s,t,n,e));sy(i,t,n,e)}});function sy(e,r,t,n){if(!e){let i={code:"custom",input:t,inst:n,path:[...n._zod.def.path??[]],continue:!n._zod.def.abort};n._zod.def.params&&(i.params=n._zod.def.params),r.issues.push(Ot(i))}}var N0=class extends Error{constructor(){super("Cannot parse a reference cycle that closes through a transform"),this.name="ZodCyclicError"}},z0="~memo",nb=[];function ob(e){return e!==null&&typeof e=="object"}function E0(e){return e.map(r=>r.path?{...r,path:r.path.slice()}:{...r})}var ib=new WeakMap,In=0,ui=1,$n=2;function ai(e,r,t){let n=ib.get(e);if(n!==void 0)return n?$n:In;if(r.has(e))return $n;r.add(e);let i=In,s=c=>{if(i!==$n&&c?._zod){let l=ai(c,r,t);l>i&&(i=l)}},f=(c,l)=>{let p=In;for(let v of Reflect.ownKeys(c)){let m=Object.getOwnPropertyDescriptor(c,v);if(l&&!m.enumerable)continue;let h=m.get?ui:m.value?._zod?ai(m.value,r,t):In;h>p&&(p=h)}return p},a=c=>{c>i&&(i=c)},o=e._zod.def,u=o.type;switch(u){case"object":{let c=gn(o);a(c?f(c,!0):ui),s(o.catchall);break}case"array":s(o.element);break;case"tuple":for(let c of o.items)s(c);s(o.rest);break;case"record":case"map":s(o.keyType),s(o.valueType);break;case"set":s(o.valueType);break;case"union":for(let c of o.options)s(c);break;case"intersection":s(o.left),s(o.right);break;case"optional":case"nullable":case"default":case"prefault":case"catch":case"readonly":case"nonoptional":case"promise":case"success":s(o.innerType);break;case"pipe":s(o.in),s(o.out);break;case"function":s(o.input),s(o.output);break;case"lazy":{let c=o._cachedInner??(t?e._zod.innerType:void 0);a(c?ai(c,r,!1):ui);break}case"template_literal":case"string":case"number":case"int":case"boolean":case"bigint":case"symbol":case"undefined":case"null":case"void":case"never":case"any":case"unknown":case"date":case"nan":case"enum":case"literal":case"file":case"transform":case"custom":break;default:for(let c in o){let l=Object.getOwnPropertyDescriptor(o,c);if(!l||l.get)continue;let p=l.value;if(!(!p||typeof p!="object")){if(p._zod)s(p);else if(Array.isArray(p))for(let v of p)s(v)}}}return r.delete(e),SG(e,i)}function SG(e,r){return r!==ui&&ib.set(e,r===$n),r}function DG(e,r){let t=e.buckets.get(r);return t||(t=new WeakMap,e.buckets.set(r,t)),t}var ii,si=[],BG={alloc(e,r,t){let n=ii;if(!n)return t;ii=void 0;let i={value:t,issues:null};return n.set(r.value,i),si.push(i),t},guard(e){var r;(r=e._zod).deferred??(r.deferred=[]),e._zod.deferred.push(()=>{let t=e._zod.parse,n=(i,s)=>{if(s.direction!=="backward"&&xG(s,i.value))throw new N0;return t(i,s)};e._zod.parse=n,e._zod.run===t&&(e._zod.run=n)})},attach(e){var r;let t,n=!1,i,s;(r=e._zod).deferred??(r.deferred=[]),e._zod.deferred.push(()=>{let f=e._zod.parse,a=(o,u)=>{if(t===void 0){let d=ai(e,new Set,!1);if(d===In)return e._zod.parse=f,e._zod.run===a&&(e._zod.run=f),f(o,u);d===$n||n?t=!0:n=!0}let c=o.value;if(!ob(c))return f(o,u);let l=u[z0];l||(l={buckets:new WeakMap,backEdges:void 0},u[z0]=l);let p;i===u?p=s:(p=DG(l,e),i=u,s=p);let v=p.get(c);if(v)return o.value=v.value,v.issues?v.issues.length&&o.issues.push(...E0(v.issues)):(o.memo=!0,l.backEdges??(l.backEdges=new WeakSet),l.backEdges.add(v.value)),o;ii=p;let m=si.length,h=f(o,u);ii=void 0;let _=si.length>m?si.pop():void 0;return h instanceof Promise?h.then(d=>(_&&(_.issues=d.issues.length?E0(d.issues):nb),d)):(_&&(_.issues=h.issues.length?E0(h.issues):nb),h)};e._zod.parse=a,e._zod.run===f&&(e._zod.run=a)})}};function sb(){return BG}function xG(e,r){let t=e[z0]?.backEdges;return t!==void 0&&ob(r)&&t.has(r)}var UG=()=>{let e={string:{unit:"characters",verb:"to have"},file:{unit:"bytes",verb:"to have"},array:{unit:"items",verb:"to have"},set:{unit:"items",verb:"to have"},map:{unit:"entries",verb:"to have"}};function r(s){return e[s]??null}let t={regex:"input",email:"email address",url:"URL",emoji:"emoji",uuid:"UUID",uuidv4:"UUIDv4",uuidv6:"UUIDv6",nanoid:"nanoid",guid:"GUID",cuid:"cuid",cuid2:"cuid2",ulid:"ULID",xid:"XID",ksuid:"KSUID",datetime:"ISO datetime",date:"ISO date",time:"ISO time",duration:"ISO duration",ipv4:"IPv4 address",ipv6:"IPv6 address",mac:"MAC address",cidrv4:"IPv4 range",cidrv6:"IPv6 range",base64:"base64-encoded string",base64url:"base64url-encoded string",json_string:"JSON string",e164:"E.164 number",currency_code:"currency code",credit_card:"credit card number",iban:"IBAN",jwt:"JWT",template_literal:"input"},n={nan:"NaN"};function i(s,f){return s==="number"&&typeof f=="number"&&!Number.isFinite(f)?String(f):n[s]??s}return s=>{switch(s.code){case"invalid_type":{let f=i(s.expected),a=l0(s.input),o=i(a,s.input);return`Invalid input: expected ${f}, received ${o}`}case"invalid_value":return s.values.length===1?`Invalid input: expected ${Uo(s.values[0])}`:`Invalid option: expected one of ${Bo(s.values,"|")}`;case"too_big":{let f=s.exact?"exactly ":s.inclusive?"<=":"<",a=r(s.origin);return a?`Too big: expected ${s.origin??"value"} to have ${f}${s.maximum.toString()} ${a.unit??"elements"}`:`Too big: expected ${s.origin??"value"} to be ${f}${s.maximum.toString()}`}case"too_small":{let f=s.exact?"exactly ":s.inclusive?">=":">",a=r(s.origin);return a?`Too small: expected ${s.origin} to have ${f}${s.minimum.toString()} ${a.unit}`:`Too small: expected ${s.origin} to be ${f}${s.minimum.toString()}`}case"invalid_format":{let f=s;return f.format==="starts_with"?`Invalid string: must start with "${f.prefix}"`:f.format==="ends_with"?`Invalid string: must end with "${f.suffix}"`:f.format==="includes"?`Invalid string: must include "${f.includes}"`:f.format==="regex"?`Invalid string: must match pattern ${f.pattern}`:`Invalid ${t[f.format]??s.format}`}case"not_multiple_of":return`Invalid number: must be a multiple of ${s.divisor}`;case"unrecognized_keys":return`Unrecognized key${s.keys.length>1?"s":""}: ${Bo(s.keys,", ")}`;case"invalid_key":return`Invalid key in ${s.origin}`;case"invalid_union":return s.options&&Array.isArray(s.options)&&s.options.length>0?`Invalid discriminator value. Expected ${s.options.map(a=>`'${a}'`).join(" | ")}`:s.inclusive===!1?"Invalid input: more than one option matched":"Invalid input";case"invalid_element":return`Invalid value in ${s.origin}`;default:return"Invalid input"}}};function ub(){return{localeError:UG()}}var ab;var T0=class{constructor(){this._map=new WeakMap,this._idmap=new Map}add(r,...t){let n=t[0];return this._map.set(r,n),n&&typeof n=="object"&&"id"in n&&this._idmap.set(n.id,r),this}clear(){return this._map=new WeakMap,this._idmap=new Map,this}remove(r){let t=this._map.get(r);return t&&typeof t=="object"&&"id"in t&&this._idmap.delete(t.id),this._map.delete(r),this}get(r){let t=r._zod.parent;if(t){let n={...this.get(t)??{}};delete n.id;let i={...n,...this._map.get(r)};return Object.keys(i).length?i:void 0}return this._map.get(r)}has(r){return this._map.has(r)}};function HG(){return new T0}(ab=globalThis).__zod_globalRegistry??(ab.__zod_globalRegistry=HG());var rt=globalThis.__zod_globalRegistry;function cb(e){return e.checks&&(e.checks=[...e.checks]),e}function fb(e,r){return new e(cb({type:"string",...E(r)}))}function lb(e,r){return new e({type:"string",format:"email",check:"string_format",abort:!1,...E(r)})}function pb(e,r){return new e({type:"string",format:"guid",check:"string_format",abort:!1,...E(r)})}function vb(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,...E(r)})}function mb(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v4",...E(r)})}function db(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v6",...E(r)})}function hb(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v7",...E(r)})}function gb(e,r){return new e({type:"string",format:"url",check:"string_format",abort:!1,...E(r)})}function _b(e,r){return new e({type:"string",format:"emoji",check:"string_format",abort:!1,...E(r)})}function yb(e,r){return new e({type:"string",format:"nanoid",check:"string_format",abort:!1,...E(r)})}function bb(e,r){return new e({type:"string",format:"cuid",check:"string_format",abort:!1,...E(r)})}function wb(e,r){return new e({type:"string",format:"cuid2",check:"string_format",abort:!1,...E(r)})}function qb(e,r){return new e({type:"string",format:"ulid",check:"string_format",abort:!1,...E(r)})}function Pb(e,r){return new e({type:"string",format:"xid",check:"string_format",abort:!1,...E(r)})}function Ib(e,r){return new e({type:"string",format:"ksuid",check:"string_format",abort:!1,...E(r)})}function $b(e,r){return new e({type:"string",format:"ipv4",check:"string_format",abort:!1,...E(r)})}function kb(e,r){return new e({type:"string",format:"ipv6",check:"string_format",abort:!1,...E(r)})}function Ab(e,r){return new e({type:"string",format:"cidrv4",check:"string_format",abort:!1,...E(r)})}function Ob(e,r){return new e({type:"string",format:"cidrv6",check:"string_format",abort:!1,...E(r)})}function Eb(e,r){return new e({type:"string",format:"base64",check:"string_format",abort:!1,...E(r)})}function Nb(e,r){return new e({type:"string",format:"base64url",check:"string_format",abort:!1,...E(r)})}function zb(e,r){return new e({type:"string",format:"e164",check:"string_format",abort:!1,...E(r)})}function Tb(e,r){return new e({type:"string",format:"jwt",check:"string_format",abort:!1,...E(r)})}function Zb(e,r){return new e({type:"string",format:"datetime",check:"string_format",offset:!1,local:!1,precision:null,...E(r)})}function Rb(e,r){return new e({type:"string",format:"date",check:"string_format",...E(r)})}function Fb(e,r){return new e({type:"string",format:"time",check:"string_format",precision:null,...E(r)})}function Lb(e,r){return new e({type:"string",format:"duration",check:"string_format",...E(r)})}function Cb(e,r){return new e(cb({type:"number",checks:[],...E(r)}))}function Sb(e,r){return new e({type:"number",check:"number_format",abort:!1,format:"safeint",...E(r)})}function Db(e,r){return new e({type:"boolean",...E(r)})}function Bb(e){return new e({type:"unknown"})}function xb(e,r){return new e({type:"never",...E(r)})}function ci(e,r){return new q0({check:"less_than",...E(r),value:e,inclusive:!1})}function kn(e,r){return new q0({check:"less_than",...E(r),value:e,inclusive:!0})}function fi(e,r){return new P0({check:"greater_than",...E(r),value:e,inclusive:!1})}function An(e,r){return new P0({check:"greater_than",...E(r),value:e,inclusive:!0})}function li(e,r){return new R_({check:"multiple_of",...E(r),value:e})}function pi(e,r){return new L_({check:"max_length",...E(r),maximum:e})}function Nt(e,r){return new C_({check:"min_length",...E(r),minimum:e})}function vi(e,r){return new S_({check:"length_equals",...E(r),length:e})}function Z0(e,r){return new D_({check:"string_format",format:"regex",...E(r),pattern:e})}function R0(e){return new B_({check:"string_format",format:"lowercase",...E(e)})}function F0(e){return new x_({check:"string_format",format:"uppercase",...E(e)})}function L0(e,r){return new U_({check:"string_format",format:"includes",...E(r),includes:e})}function C0(e,r){return new H_({check:"string_format",format:"starts_with",...E(r),prefix:e})}function S0(e,r){return new G_({check:"string_format",format:"ends_with",...E(r),suffix:e})}function Zr(e){return new W_({check:"overwrite",tx:e})}function D0(e){return Zr(r=>r.normalize(e))}function B0(){return Zr(e=>e.trim())}function x0(){return Zr(e=>e.toLowerCase())}function U0(){return Zr(e=>e.toUpperCase())}function H0(){return Zr(e=>s0(e))}function Ub(e,r,t){return new e({type:"array",element:r,...E(t)})}function Hb(e,r,t){return new e({type:"custom",check:"custom",fn:r,...E(t)})}function Gb(e,r){let t=GG(n=>(n.addIssue=i=>{if(typeof i=="string")n.issues.push(Ot(i,n.value,t._zod.def));else{let s=i;s.fatal&&(s.continue=!1),s.code??(s.code="custom"),"input"in s||(s.input=n.value),s.inst??(s.inst=t),s.continue??(s.continue=!t._zod.def.abort),n.issues.push(Ot(s))}},e(n.value,n)),r);return t}function GG(e,r){let t=new ce({check:"custom",...E(r)});return t._zod.check=e,t}function On(e,...r){for(let t of r)for(let n of Reflect.ownKeys(t))Object.prototype.propertyIsEnumerable.call(t,n)&&Le(e,n,t[n]);return e}function W0(e){let r=e?.target??"draft-2020-12";return r==="draft-4"&&(r="draft-04"),r==="draft-7"&&(r="draft-07"),{processors:e.processors??{},metadataRegistry:e?.metadata??rt,target:r,unrepresentable:e?.unrepresentable??"throw",override:e?.override??(()=>{}),io:e?.io??"output",counter:0,seen:new Map,sharedDefsExtractedFor:void 0,sharedEmitDoneFor:void 0,cycles:e?.cycles??"ref",reused:e?.reused??"inline",intersections:[],deferred:[],external:e?.external??void 0}}function tt(e,r,t,n,i){let s=typeof r.unrepresentable=="function"?r.unrepresentable({zodSchema:e,path:n.path,message:i}):r.unrepresentable;if(s==="any")return!1;if(s===void 0||s==="throw")throw new Error(i);return Object.assign(t,s),!0}function ie(e,r,t={path:[],schemaPath:[]}){var n;let i=e._zod.def,s=r.seen.get(e);if(s)return s.count++,t.schemaPath.includes(e)&&(s.cycle=t.path),s.schema;let f={schema:{},count:1,cycle:void 0,path:t.path};r.seen.set(e,f),r.sharedDefsExtractedFor=void 0,r.sharedEmitDoneFor=void 0;let a=e._zod.toJSONSchema?.();if(a)f.schema=a;else{let c={...t,schemaPath:[...t.schemaPath,e],path:t.path};if(e._zod.processJSONSchema)e._zod.processJSONSchema(r,f.schema,c);else{let p=f.schema,v=r.processors[i.type];if(!v)throw new Error(`[toJSONSchema]: Non-representable type encountered: ${i.type}`);v(e,r,p,c)}let l=e._zod.parent;l&&(f.ref||(f.ref=l),ie(l,r,c),r.seen.get(l).isParent=!0)}let o=r.metadataRegistry.get(e);return o&&On(f.schema,o),r.io==="input"&&ve(e)&&(delete f.schema.examples,delete f.schema.default),r.io==="input"&&"_prefault"in f.schema&&((n=f.schema).default??(n.default=f.schema._prefault)),delete f.schema._prefault,r.seen.get(e).schema}function Wb(e){return e.replace(/~/g,"~0").replace(/\//g,"~1")}function V0(e,r){let t=e.seen.get(r);if(!t)throw new Error("Unprocessed schema. This is a bug in Zod.");if(e.external&&e.sharedDefsExtractedFor===e.external)return;let n=new Map;for(let f of e.seen.entries()){let a=e.metadataRegistry.get(f[0])?.id;if(a){let o=n.get(a);if(o&&o!==f[0])throw new Error(`Duplicate schema id "${a}" detected during JSON Schema conversion. Two different schemas cannot share the same id when converted together.`);n.set(a,f[0])}}let i=f=>{let a=e.target==="draft-2020-12"?"$defs":"definitions";if(e.external){let l=e.external.registry.get(f[0])?.id,p=e.external.uri??(m=>m);if(l)return{ref:p(l)};let v=f[1].defId??f[1].schema.id??`schema${e.counter++}`;return f[1].defId=v,{defId:v,ref:`${p("__shared")}#/${a}/${Wb(v)}`}}let o="#",u=`${o}/${a}/`;if(f[1]===t&&!f[1].schema.id)return{ref:o};let c=f[1].schema.id??`__schema${e.counter++}`;return{defId:c,ref:u+Wb(c)}},s=f=>{if(f[1].schema.$ref)return;let a=f[1],{ref:o,defId:u}=i(f);a.def={...a.schema},u&&(a.defId=u);let c=a.schema;for(let l in c)delete c[l];c.$ref=o};if(e.cycles==="throw")for(let f of e.seen.entries()){let a=f[1];if(a.cycle)throw new Error(`Cycle detected: #/${a.cycle?.join("/")}/<root>

Set the \`cycles\` parameter to \`"ref"\` to resolve cyclical schemas with defs.`)}for(let f of e.seen.entries()){let a=f[1];if(r===f[0]){s(f);continue}if(e.external){let u=e.external.registry.get(f[0])?.id;if(r!==f[0]&&u){s(f);continue}}if(e.metadataRegistry.get(f[0])?.id){s(f);continue}if(a.cycle){s(f);continue}a.count>1&&e.reused==="ref"&&s(f)}e.external&&(e.sharedDefsExtractedFor=e.external)}function Jb(e){let r=e.anyOf;if(!Array.isArray(r)||r.length===0||e.type!==void 0)return;let t=[];for(let n of r){if(!n||typeof n!="object")return;Jb(n);let i=Object.keys(n);if(i.length!==1||i[0]!=="type")return;let s=n.type;for(let f of Array.isArray(s)?s:[s]){if(typeof f!="string")return;t.includes(f)||t.push(f)}}delete e.anyOf,e.type=t.length===1?t[0]:t}var Xb=new Set(["type","properties","required","additionalProperties"]),Vb=["oneOf","anyOf"];function Mb(e){let r=e.additionalProperties;return r===void 0||r===!1||typeof r!="object"||r===null?null:Object.keys(r).length?r:null}function G0(e){let r=[];for(let s of e){if(typeof s!="object"||s.type!=="object")return null;for(let f in s)if(!Xb.has(f))return null;r.push(s)}let t={},n=new Set;for(let s of r){for(let f in s.properties){if(Object.prototype.hasOwnProperty.call(t,f))continue;let a=[];for(let u of r){let c=u.properties?.[f]??Mb(u);c!=null&&(a.some(l=>JSON.stringify(l)===JSON.stringify(c))||a.push(c))}let o=a.length===1?a[0]:G0(a)??{allOf:a};Le(t,f,o)}for(let f of s.required??[])n.add(f)}let i={type:"object",properties:t};if(n.size&&(i.required=[...n]),r.every(s=>s.additionalProperties===!1))i.additionalProperties=!1;else{let s=[];for(let f of r){let a=Mb(f);a&&!s.some(o=>JSON.stringify(o)===JSON.stringify(a))&&s.push(a)}s.length===1?i.additionalProperties=s[0]:s.length>1&&(i.additionalProperties={allOf:s})}return i}function WG(e){let r=e.allOf;if(!Array.isArray(r)||r.length<2)return;for(let i of Xb)if(i in e)return;let t=r.filter(i=>Vb.some(s=>Array.isArray(i[s]))),n=null;if(!t.length)n=G0(r);else{let i=t[0],s=Vb.find(o=>Array.isArray(i[o]));if(Object.keys(i).length!==1)return;let f=r.filter(o=>o!==i),a=i[s].map(o=>G0([...f,o]));if(a.some(o=>!o))return;n={[s]:a}}n&&(delete e.allOf,On(e,n))}function M0(e,r){let t=e.seen.get(r);if(!t)throw new Error("Unprocessed schema. This is a bug in Zod.");let n=a=>{let o=e.seen.get(a);if(o.ref===null)return;let u=o.def??o.schema,c={...u},l=o.ref;if(o.ref=null,l){n(l);let v=e.seen.get(l),m=v.schema;if(m.$ref&&(e.target==="draft-07"||e.target==="draft-04"||e.target==="openapi-3.0")?(u.allOf=u.allOf??[],u.allOf.push(m)):On(u,m),On(u,c),a._zod.parent===l)for(let _ in u)_==="$ref"||_==="allOf"||_ in c||delete u[_];if(m.$ref&&v.def)for(let _ in u)_==="$ref"||_==="allOf"||_ in v.def&&JSON.stringify(u[_])===JSON.stringify(v.def[_])&&delete u[_]}let p=a._zod.parent;if(p&&p!==l){n(p);let v=e.seen.get(p);if(v?.schema.$ref&&(u.$ref=v.schema.$ref,v.def))for(let m in u)m==="$ref"||m==="allOf"||m in v.def&&JSON.stringify(u[m])===JSON.stringify(v.def[m])&&delete u[m]}e.override({zodSchema:a,jsonSchema:u,path:o.path??[]})};if(!e.external||e.sharedEmitDoneFor!==e.external){for(let a of[...e.seen.entries()].reverse())n(a[0]);if(e.target!=="openapi-3.0")for(let a of e.seen.entries())Jb(a[1].def??a[1].schema);for(let a of e.deferred)a();if(e.intersections.length){let a=new Map;for(let o of e.seen.values())for(let u of[o.schema,o.def]){let c=u?.allOf;if(!Array.isArray(c))continue;let l=a.get(c);l?l.push(u):a.set(c,[u])}for(let o of e.intersections)for(let u of a.get(o)??[])WG(u)}}let i={};if(e.target==="draft-2020-12"?i.$schema="https://json-schema.org/draft/2020-12/schema":e.target==="draft-07"?i.$schema="http://json-schema.org/draft-07/schema#":e.target==="draft-04"?i.$schema="http://json-schema.org/draft-04/schema#":e.target,e.external?.uri){let a=e.external.registry.get(r)?.id;if(!a)throw new Error("Schema is missing an `id` property");i.$id=e.external.uri(a)}On(i,t.defId?t.schema:t.def??t.schema);let s=e.metadataRegistry.get(r)?.id;s!==void 0&&i.id===s&&delete i.id;let f=e.external?.defs??{};if(!e.external||e.sharedEmitDoneFor!==e.external)for(let a of e.seen.entries()){let o=a[1];o.def&&o.defId&&(o.def.id===o.defId&&delete o.def.id,Le(f,o.defId,o.def))}e.external&&(e.sharedEmitDoneFor=e.external),e.external||Object.keys(f).length>0&&(e.target==="draft-2020-12"?i.$defs=f:i.definitions=f);try{let a=JSON.parse(JSON.stringify(i));return Object.defineProperty(a,"~standard",{value:{...r["~standard"],jsonSchema:{input:En(r,"input",e.processors),output:En(r,"output",e.processors)}},enumerable:!1,writable:!1}),a}catch{throw new Error("Error converting schema to JSON.")}}function ve(e,r){let t=r??{seen:new Set};if(t.seen.has(e))return!1;t.seen.add(e);let n=e._zod.def;if(n.type==="transform")return!0;if(n.type==="array")return ve(n.element,t);if(n.type==="set")return ve(n.valueType,t);if(n.type==="lazy")return ve(n.getter(),t);if(n.type==="promise"||n.type==="optional"||n.type==="nonoptional"||n.type==="nullable"||n.type==="readonly"||n.type==="default"||n.type==="prefault"||n.type==="catch")return ve(n.innerType,t);if(n.type==="intersection")return ve(n.left,t)||ve(n.right,t);if(n.type==="record"||n.type==="map")return ve(n.keyType,t)||ve(n.valueType,t);if(n.type==="pipe")return e._zod.traits.has("$ZodCodec")?!0:ve(n.in,t)||ve(n.out,t);if(n.type==="object"){for(let i in n.shape)if(ve(n.shape[i],t))return!0;return!1}if(n.type==="union"){for(let i of n.options)if(ve(i,t))return!0;return!1}if(n.type==="tuple"){for(let i of n.items)if(ve(i,t))return!0;return!!(n.rest&&ve(n.rest,t))}return!1}var Kb=(e,r={})=>t=>{let n=W0({...t,processors:r});return ie(e,n),V0(n,e),M0(n,e)},En=(e,r,t={})=>n=>{let{libraryOptions:i,target:s}=n??{},f=W0({...i??{},target:s,io:r,processors:t});return ie(e,f),V0(f,e),M0(f,e)};var zt=(e,r,t)=>{(e[r]===void 0||t>e[r])&&(e[r]=t)},Tt=(e,r,t)=>{(e[r]===void 0||t<e[r])&&(e[r]=t)},Qb=(e,r)=>{zt(e,"minimum",r),Tt(e,"maximum",r)},rw=(e,r)=>{e.multipleOf??(e.multipleOf=[]),e.multipleOf.includes(r)||e.multipleOf.push(r)},tw=(e,r)=>{e.patterns??(e.patterns=new Set),e.patterns.add(r)},nw=(e,r)=>{e.mime=e.mime?e.mime.filter(t=>r.includes(t)):[...r]},ow=(e,r)=>{e.format=r,r.includes("int")&&(e.isInt=!0)},Yb=(e,r)=>zt(e,"minimum",r.minimum),jb=(e,r)=>Tt(e,"maximum",r.maximum),ew=e=>(r,t)=>{ow(r,t.format);let[n,i]=e[t.format];zt(r,"minimum",n),Tt(r,"maximum",i)},VG={greater_than:(e,r)=>zt(e,r.inclusive?"minimum":"exclusiveMinimum",r.value),less_than:(e,r)=>Tt(e,r.inclusive?"maximum":"exclusiveMaximum",r.value),multiple_of:(e,r)=>rw(e,r.value),number_format:ew(_n),bigint_format:ew(Ho),min_length:Yb,max_length:jb,length_equals:(e,r)=>Qb(e,r.length),min_size:Yb,max_size:jb,size_equals:(e,r)=>Qb(e,r.size),string_format:(e,r)=>{ow(e,r.format),r.pattern&&tw(e,r.pattern),(r.format==="base64"||r.format==="base64url")&&(e.contentEncoding=r.format),(r.local||r.precision===-1)&&(e.laxFormat=!0)},mime_type:(e,r)=>nw(e,r.mime)};function Ne(e){let r={},t=e._zod.def,n=e._zod.traits.has("$ZodCheck")?[e,...t.checks??[]]:t.checks??[];for(let s of n)VG[s._zod.def.check]?.(r,s._zod.def);let i=e._zod.bag;i.minimum!==void 0&&zt(r,"minimum",i.minimum),i.exclusiveMinimum!==void 0&&zt(r,"exclusiveMinimum",i.exclusiveMinimum),i.maximum!==void 0&&Tt(r,"maximum",i.maximum),i.exclusiveMaximum!==void 0&&Tt(r,"exclusiveMaximum",i.exclusiveMaximum),i.multipleOf!==void 0&&rw(r,i.multipleOf),i.format!==void 0&&(r.format??(r.format=i.format),i.format.includes("int")&&(r.isInt=!0)),i.mime&&nw(r,i.mime);for(let s of i.patterns??[])tw(r,s);return r}var MG={guid:"uuid",url:"uri",datetime:"date-time",json_string:"json-string",regex:""},JG=new Map([[k0,q_],[oi,P_]]),XG=e=>JG.get(e)??e,iw=(e,r,t,n)=>{let i=t;i.type="string";let{minimum:s,maximum:f,format:a,patterns:o,contentEncoding:u,laxFormat:c}=Ne(e);if(typeof s=="number"&&(i.minLength=s),typeof f=="number"&&(i.maxLength=f),a&&(i.format=MG[a]??a,i.format===""&&delete i.format,(a==="time"||c)&&delete i.format),u&&(i.contentEncoding=u),o&&o.size>0){let l=[...o].map(XG);l.length===1?i.pattern=l[0].source:l.length>1&&(i.allOf=[...l.map(p=>({...r.target==="draft-07"||r.target==="draft-04"||r.target==="openapi-3.0"?{type:"string"}:{},pattern:p.source}))])}},sw=(e,r,t,n)=>{let i=t,{minimum:s,maximum:f,multipleOf:a,exclusiveMaximum:o,exclusiveMinimum:u,isInt:c}=Ne(e);i.type=c?"integer":"number";let l=typeof u=="number"&&u>=(s??Number.NEGATIVE_INFINITY),p=typeof o=="number"&&o<=(f??Number.POSITIVE_INFINITY),v=r.target==="draft-04"||r.target==="openapi-3.0";if(l?v?(i.minimum=u,i.exclusiveMinimum=!0):i.exclusiveMinimum=u:typeof s=="number"&&(i.minimum=s),p?v?(i.maximum=o,i.exclusiveMaximum=!0):i.exclusiveMaximum=o:typeof f=="number"&&(i.maximum=f),a){let m=new Set;for(let d of a)Number.isFinite(d)&&d!==0?m.add(Math.abs(d)):tt(e,r,i,n,`A multipleOf divisor of ${d} cannot be represented in JSON Schema`);let[h,..._]=m;h!==void 0&&(i.multipleOf=h),_.length&&(i.allOf=[...i.allOf??[],..._.map(d=>({multipleOf:d}))])}},uw=(e,r,t,n)=>{t.type="boolean"};var aw=(e,r,t,n)=>{t.not={}};var cw=(e,r,t,n)=>{};var fw=(e,r,t,n)=>{let i=e._zod.def,s=kt(i.entries);if(s.length===0){t.not={};return}s.every(f=>typeof f=="number")&&(t.type="number"),s.every(f=>typeof f=="string")&&(t.type="string"),t.enum=s};var lw=(e,r,t,n)=>{tt(e,r,t,n,"Custom types cannot be represented in JSON Schema")};var pw=(e,r,t,n)=>{tt(e,r,t,n,"Transforms cannot be represented in JSON Schema")};var vw=(e,r,t,n)=>{let i=t,s=e._zod.def,{minimum:f,maximum:a}=Ne(e);typeof f=="number"&&(i.minItems=f),typeof a=="number"&&(i.maxItems=a),i.type="array",i.items=ie(s.element,r,{...n,path:[...n.path,"items"]})};function mi(e){let r=e._zod.def;return r.type==="pipe"&&r.in._zod.traits.has("$ZodTransform")?mi(r.out):r.type==="catch"?mi(r.innerType):e._zod.optin}var mw=(e,r,t,n)=>{let i=t,s=e._zod.def,f=s.shape;if(Object.getOwnPropertySymbols(f).length&&tt(e,r,i,n,"Symbol keys cannot be represented in JSON Schema"))return;i.type="object",i.properties={};for(let u in f)Le(i.properties,u,ie(f[u],r,{...n,path:[...n.path,"properties",u]}));let o=[];for(let u of Object.keys(f)){let c=s.shape[u];(r.io==="input"?mi(c)===void 0:c._zod.optout===void 0)&&o.push(u)}o.length>0&&(i.required=o),s.catchall?._zod.def.type==="never"?i.additionalProperties=!1:s.catchall?s.catchall&&(i.additionalProperties=ie(s.catchall,r,{...n,path:[...n.path,"additionalProperties"]})):r.io==="output"&&(i.additionalProperties=!1)},dw=(e,r,t,n)=>{let i=e._zod.def,s=i.inclusive===!1,f=i.options.map((a,o)=>ie(a,r,{...n,path:[...n.path,s?"oneOf":"anyOf",o]}));s?t.oneOf=f:t.anyOf=f},hw=(e,r,t,n)=>{let i=e._zod.def,s=ie(i.left,r,{...n,path:[...n.path,"allOf",0]}),f=ie(i.right,r,{...n,path:[...n.path,"allOf",1]}),a=u=>"allOf"in u&&Object.keys(u).length===1,o=[...a(s)?s.allOf:[s],...a(f)?f.allOf:[f]];t.allOf=o,r.intersections.push(o)},gw=(e,r,t,n)=>{let i=t,s=e._zod.def;i.type="array";let f=r.target==="draft-2020-12"?"prefixItems":"items",a=r.target==="draft-2020-12"||r.target==="openapi-3.0"?"items":"additionalItems",o=s.items.map((h,_)=>ie(h,r,{...n,path:[...n.path,f,_]})),u=s.rest?ie(s.rest,r,{...n,path:[...n.path,a,...r.target==="openapi-3.0"?[s.items.length]:[]]}):null,c=s.items.length;for(;c>0;){let h=s.items[c-1];if(!(r.io==="input"?mi(h)!==void 0:h._zod.optout==="optional"))break;c--}let l=s.items.length,p=!s.rest;r.target==="draft-2020-12"?(i.prefixItems=o,p?i.items=!1:u&&(i.items=u),c>0&&(i.minItems=c),p&&(i.maxItems=l)):r.target==="openapi-3.0"?(i.items={anyOf:o},u&&i.items.anyOf.push(u),c>0&&(i.minItems=c),p&&(i.maxItems=l)):(i.items=o,p?i.additionalItems=!1:u&&(i.additionalItems=u),c>0&&(i.minItems=c),p&&(i.maxItems=l));let{minimum:v,maximum:m}=Ne(e);typeof v=="number"&&(i.minItems=v),typeof m=="number"&&(i.maxItems=m)};var _w=(e,r,t,n)=>{let i=e._zod.def,s=ie(i.innerType,r,n),f=r.seen.get(e);r.target==="openapi-3.0"?(f.ref=i.innerType,t.nullable=!0):t.anyOf=[s,{type:"null"}]},yw=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType},J0=Symbol();function bw(e,r,t,n,i){let s=!1,f=JSON.stringify(e,(a,o)=>typeof o!="bigint"?o:(s=!0,null));return s?(tt(r,t,n,i,"BigInt defaults cannot be represented in JSON Schema"),J0):JSON.parse(f)}var ww=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType;let f=bw(i.defaultValue,e,r,t,n);f!==J0&&(t.default=f)},qw=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);if(s.ref=i.innerType,r.io!=="input")return;let f=bw(i.defaultValue,e,r,t,n);f!==J0&&(t._prefault=f)},Pw=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType;let f;try{f=i.catchValue(void 0)}catch{tt(e,r,t,n,"Dynamic catch values are not supported in JSON Schema");return}t.default=f},Iw=(e,r,t,n)=>{let i=e._zod.def,s=i.in._zod.traits.has("$ZodTransform"),f=r.io==="input"?s?i.out:i.in:i.out;ie(f,r,n);let a=r.seen.get(e);a.ref=f},$w=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType,t.readOnly=!0};var X0=(e,r,t,n)=>{let i=e._zod.def;ie(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType};var kw=new WeakSet([Object.prototype,Error.prototype]);function di(e,r,t){Object.defineProperty(e,r,{configurable:!0,enumerable:!1,get(){let n=t(this);return Object.defineProperty(this,r,{value:n,configurable:!0,writable:!0}),n},set(n){Object.defineProperty(this,r,{value:n,configurable:!0,writable:!0})}})}var nW=(e,r)=>{Xg.init(e,r),e.name="ZodError";let t=Object.getPrototypeOf(e);kw.has(t)||(kw.add(t),di(t,"format",n=>i=>Qg(n,i)),di(t,"flatten",n=>i=>Kg(n,i)),di(t,"addIssue",n=>i=>{n.issues.push(i),n.message=JSON.stringify(n.issues,At,2)}),di(t,"addIssues",n=>i=>{n.issues.push(...i),n.message=JSON.stringify(n.issues,At,2)}),Object.defineProperty(t,"isEmpty",{configurable:!0,enumerable:!1,get(){return this.issues.length===0}}))};var we=$("ZodError",nW,void 0,{Parent:Error});var Aw=Jo(we),Ow=Xo(we),Ew=Ko(we),Nw=Qo(we),zw=jg(we),Tw=e_(we),Zw=r_(we),Rw=t_(we),Fw=n_(we),Lw=o_(we),Cw=i_(we),Sw=s_(we);function iW(){ge.localeError||De(ub())}function gi(){ge.memoizer||De({memoizer:sb()})}var te=$("ZodType",(e,r)=>(iW(),K.init(e,r),e.def=r,e.type=r.type,e),{check(...e){let r=this.def;return this.clone(z.mergeDefs(r,{checks:[...r.checks??[],...e.map(t=>typeof t=="function"?{_zod:{check:t,def:{check:"custom"},onattach:[]}}:t)]}),{parent:!0})},with(...e){return this.check(...e)},clone(e,r){return Ce(this,e,r)},brand(){return this},register(e,r){return e.add(this,r),this},refine(e,r){return this.check(rV(e,r))},superRefine(e,r){return this.check(tV(e,r))},overwrite(e){return this.check(Zr(e))},optional(){return xw(this)},exactOptional(){return UW(this)},nullable(){return Uw(this)},nullish(){return xw(Uw(this))},nonoptional(e){return JW(this,e)},array(){return Zt(this)},or(e){return LW([this,e])},and(e){return SW(this,e)},transform(e){return Hw(this,xW(e))},default(e){return WW(this,e)},prefault(e){return MW(this,e)},catch(e){return KW(this,e)},pipe(e){return Hw(this,e)},readonly(){return jW(this)},describe(e){let r=this.clone();return rt.add(r,{description:e}),r},meta(...e){if(e.length===0)return rt.get(this);let r=this.clone();return rt.add(r,e[0]),r},isOptional(){return this.safeParse(void 0).success},isNullable(){return this.safeParse(null).success},apply(e,...r){return r.length===0?e(this):e(this,...r)},get"~standard"(){return z.hide(this,"~standard",{...$0(this),jsonSchema:{input:En(this,"input"),output:En(this,"output")}})},set"~standard"(e){z.own(this,"~standard",e)},parse:function e(r,t){return Aw(this,r,t,{callee:e})},parseAsync:async function e(r,t){return await Ow(this,r,t,{callee:e})},safeParse(e,r){return Ew(this,e,r)},async safeParseAsync(e,r){return Nw(this,e,r)},get spa(){return this?.safeParseAsync},set spa(e){z.own(this,"spa",e)},validate(e,r){return h0(this,e,r)},validateAsync(e,r){return g0(this,e,r)},encode:function e(r,t){return zw(this,r,t,{callee:e})},decode:function e(r,t){return Tw(this,r,t,{callee:e})},encodeAsync:async function e(r,t){return await Zw(this,r,t,{callee:e})},decodeAsync:async function e(r,t){return await Rw(this,r,t,{callee:e})},safeEncode(e,r){return Fw(this,e,r)},safeDecode(e,r){return Lw(this,e,r)},async safeEncodeAsync(e,r){return Cw(this,e,r)},async safeDecodeAsync(e,r){return Sw(this,e,r)},toJSONSchema(e){return Kb(this,{})(e)},get description(){return rt.get(this)?.description},get _def(){return this._zod.def}}),Gw=$("_ZodString",(e,r)=>{ni.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>iw(e,t,n,i)},z.derived({format:e=>Ne(e).format??null,minLength:e=>Ne(e).minimum??null,maxLength:e=>Ne(e).maximum??null},{regex(...e){return this.check(Z0(...e))},includes(...e){return this.check(L0(...e))},startsWith(...e){return this.check(C0(...e))},endsWith(...e){return this.check(S0(...e))},min(...e){return this.check(Nt(...e))},max(...e){return this.check(pi(...e))},length(...e){return this.check(vi(...e))},nonempty(...e){return this.check(Nt(1,...e))},lowercase(e){return this.check(R0(e))},uppercase(e){return this.check(F0(e))},trim(){return this.check(B0())},normalize(...e){return this.check(D0(...e))},toLowerCase(){return this.check(x0())},toUpperCase(){return this.check(U0())},slugify(){return this.check(H0())}})),sW=$("ZodString",(e,r)=>{ni.init(e,r),Gw.init(e,r)},{email(e){return this.check(lb(lW,e))},url(e){return this.check(gb(vW,e))},jwt(e){return this.check(Tb(OW,e))},emoji(e){return this.check(_b(mW,e))},guid(e){return this.check(pb(pW,e))},uuid(e){return this.check(vb(hi,e))},uuidv4(e){return this.check(mb(hi,e))},uuidv6(e){return this.check(db(hi,e))},uuidv7(e){return this.check(hb(hi,e))},nanoid(e){return this.check(yb(dW,e))},cuid(e){return this.check(bb(hW,e))},cuid2(e){return this.check(wb(gW,e))},ulid(e){return this.check(qb(_W,e))},base64(e){return this.check(Eb($W,e))},base64url(e){return this.check(Nb(kW,e))},xid(e){return this.check(Pb(yW,e))},ksuid(e){return this.check(Ib(bW,e))},ipv4(e){return this.check($b(wW,e))},ipv6(e){return this.check(kb(qW,e))},cidrv4(e){return this.check(Ab(PW,e))},cidrv6(e){return this.check(Ob(IW,e))},e164(e){return this.check(zb(AW,e))},datetime(e){return this.check(Zb(uW,e))},date(e){return this.check(Rb(aW,e))},time(e){return this.check(Fb(cW,e))},duration(e){return this.check(Lb(fW,e))}});function Ww(e){return fb(sW,e)}var Y=$("ZodStringFormat",(e,r)=>{W.init(e,r),Gw.init(e,r)}),uW=$("ZodISODateTime",(e,r)=>{wy.init(e,r),Y.init(e,r)}),aW=$("ZodISODate",(e,r)=>{qy.init(e,r),Y.init(e,r)}),cW=$("ZodISOTime",(e,r)=>{Py.init(e,r),Y.init(e,r)}),fW=$("ZodISODuration",(e,r)=>{Iy.init(e,r),Y.init(e,r)}),lW=$("ZodEmail",(e,r)=>{fy.init(e,r),Y.init(e,r)});var pW=$("ZodGUID",(e,r)=>{ay.init(e,r),Y.init(e,r)});var hi=$("ZodUUID",(e,r)=>{cy.init(e,r),Y.init(e,r)});var vW=$("ZodURL",(e,r)=>{vy.init(e,r),Y.init(e,r)});var mW=$("ZodEmoji",(e,r)=>{my.init(e,r),Y.init(e,r)});var dW=$("ZodNanoID",(e,r)=>{dy.init(e,r),Y.init(e,r)});var hW=$("ZodCUID",(e,r)=>{hy.init(e,r),Y.init(e,r)});var gW=$("ZodCUID2",(e,r)=>{gy.init(e,r),Y.init(e,r)});var _W=$("ZodULID",(e,r)=>{_y.init(e,r),Y.init(e,r)});var yW=$("ZodXID",(e,r)=>{yy.init(e,r),Y.init(e,r)});var bW=$("ZodKSUID",(e,r)=>{by.init(e,r),Y.init(e,r)});var wW=$("ZodIPv4",(e,r)=>{$y.init(e,r),Y.init(e,r)});var qW=$("ZodIPv6",(e,r)=>{Ay.init(e,r),Y.init(e,r)});var PW=$("ZodCIDRv4",(e,r)=>{Oy.init(e,r),Y.init(e,r)});var IW=$("ZodCIDRv6",(e,r)=>{Ey.init(e,r),Y.init(e,r)});var $W=$("ZodBase64",(e,r)=>{zy.init(e,r),Y.init(e,r)});var kW=$("ZodBase64URL",(e,r)=>{Ty.init(e,r),Y.init(e,r)});var AW=$("ZodE164",(e,r)=>{Zy.init(e,r),Y.init(e,r)});var OW=$("ZodJWT",(e,r)=>{Ry.init(e,r),Y.init(e,r)});var Vw=$("ZodNumber",(e,r)=>{A0.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>sw(e,t,n,i),e.isFinite=!0},z.derived({minValue:e=>{let{minimum:r,exclusiveMinimum:t}=Ne(e);return Math.max(r??Number.NEGATIVE_INFINITY,t??Number.NEGATIVE_INFINITY)},maxValue:e=>{let{maximum:r,exclusiveMaximum:t}=Ne(e);return Math.min(r??Number.POSITIVE_INFINITY,t??Number.POSITIVE_INFINITY)},isInt:e=>{let{isInt:r,multipleOf:t}=Ne(e);return!!r||!!t?.some(Number.isSafeInteger)},format:e=>Ne(e).format??null},{gt(e,r){return this.check(fi(e,r))},gte(e,r){return this.check(An(e,r))},min(e,r){return this.check(An(e,r))},lt(e,r){return this.check(ci(e,r))},lte(e,r){return this.check(kn(e,r))},max(e,r){return this.check(kn(e,r))},int(e){return this.check(Dw(e))},safe(e){return this.check(Dw(e))},positive(e){return this.check(fi(0,e))},nonnegative(e){return this.check(An(0,e))},negative(e){return this.check(ci(0,e))},nonpositive(e){return this.check(kn(0,e))},multipleOf(e,r){return this.check(li(e,r))},step(e,r){return this.check(li(e,r))},finite(){return this}}));function Mw(e){return Cb(Vw,e)}var EW=$("ZodNumberFormat",(e,r)=>{Fy.init(e,r),Vw.init(e,r)});function Dw(e){return Sb(EW,e)}var NW=$("ZodBoolean",(e,r)=>{Ly.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>uw(e,t,n,i)});function Y0(e){return Db(NW,e)}var zW=$("ZodUnknown",(e,r)=>{Cy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>cw(e,t,n,i)});function Bw(){return Bb(zW)}var TW=$("ZodNever",(e,r)=>{Sy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>aw(e,t,n,i)});function Jw(e){return xb(TW,e)}var ZW=$("ZodArray",(e,r)=>{gi(),Dy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>vw(e,t,n,i),e.element=r.element},{min(e,r){return this.check(Nt(e,r))},nonempty(e){return this.check(Nt(1,e))},max(e,r){return this.check(pi(e,r))},length(e,r){return this.check(vi(e,r))},unwrap(){return this.element}});function Zt(e,r){return Ub(ZW,e,r)}var RW=$("ZodObject",(e,r)=>{gi(),Uy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>mw(e,t,n,i),z.installLazyProp(e,"shape",t=>t._zod.def.shape,!1)},{keyof(){return Nn(Object.keys(this._zod.def.shape))},catchall(e){return this.clone(z.mergeDefs(this._zod.def,{catchall:e}))},passthrough(){return this.clone(z.mergeDefs(this._zod.def,{catchall:Bw()}))},loose(){return this.clone(z.mergeDefs(this._zod.def,{catchall:Bw()}))},strict(){return this.clone(z.mergeDefs(this._zod.def,{catchall:Jw()}))},strip(){return this.clone(z.mergeDefs(this._zod.def,{catchall:void 0}))},extend(e){return z.extend(this,e)},safeExtend(e){return z.safeExtend(this,e)},merge(e){return z.merge(this,e)},pick(e){return z.pick(this,e)},omit(e){return z.omit(this,e)},partial(...e){return z.partial(ea,this,e[0])},exactPartial(...e){return z.partial(Xw,this,e[0],"exactPartial")},required(...e){return z.required(Kw,this,e[0])}});function je(e,r){return new RW({type:"object",shape:e,catchall:Jw(),...z.normalizeParams(r)})}var FW=$("ZodUnion",(e,r)=>{Hy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>dw(e,t,n,i),e.options=r.options});function LW(e,r){return new FW({type:"union",options:e,...z.normalizeParams(r)})}var CW=$("ZodIntersection",(e,r)=>{Gy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>hw(e,t,n,i)});function SW(e,r){return new CW({type:"intersection",left:e,right:r})}var DW=$("ZodTuple",(e,r)=>{gi(),Wy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>gw(e,t,n,i)},{rest(e){return this.clone({...this._zod.def,rest:e})},partial(){let e=this._zod.def;if(e.checks?.length)throw new Error(".partial() cannot be used on tuple schemas containing refinements");return this.clone({...e,items:e.items.map(r=>new ea({type:"optional",innerType:r}))})}});function j0(e,r,t){let n=r instanceof K,i=n?t:r,s=n?r:null;return new DW({type:"tuple",items:e,rest:s,...z.normalizeParams(i)})}var Q0=$("ZodEnum",(e,r)=>{Vy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(n,i,s)=>fw(e,n,i,s),e.enum=r.entries,e.options=[...e._zod.values];let t=new Set(Object.keys(r.entries));e.extract=(n,i)=>{let s={};for(let f of n)if(t.has(f))s[f]=r.entries[f];else throw new Error(`Key ${f} not found in enum`);return new Q0({...r,checks:[],...z.normalizeParams(i),entries:s})},e.exclude=(n,i)=>{let s={...r.entries};for(let f of n)if(t.has(f))delete s[f];else throw new Error(`Key ${f} not found in enum`);return new Q0({...r,checks:[],...z.normalizeParams(i),entries:s})}});function Nn(e,r){let t=Array.isArray(e)?Object.fromEntries(e.map(n=>[n,n])):e;return new Q0({type:"enum",entries:t,...z.normalizeParams(r)})}var BW=$("ZodTransform",(e,r)=>{gi(),My.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>pw(e,t,n,i),e._zod.parse=(t,n)=>{if(n.direction==="backward")throw new Et(e.constructor.name);t.addIssue=s=>{if(typeof s=="string")t.issues.push(z.issue(s,t.value,r));else{let f=s;f.fatal&&(f.continue=!1),f.code??(f.code="custom"),"input"in f||(f.input=t.value),f.inst??(f.inst=e),t.issues.push(z.issue(f))}};let i=r.transform(t.value,t);return i instanceof Promise?i.then(s=>(t.value=s,t)):(t.value=i,t)}});function xW(e){return new BW({type:"transform",transform:e})}var ea=$("ZodOptional",(e,r)=>{O0.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>X0(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function xw(e){return new ea({type:"optional",innerType:e})}var Xw=$("ZodExactOptional",(e,r)=>{Jy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>X0(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function UW(e){return new Xw({type:"optional",innerType:e})}var HW=$("ZodNullable",(e,r)=>{Xy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>_w(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function Uw(e){return new HW({type:"nullable",innerType:e})}var GW=$("ZodDefault",(e,r)=>{Ky.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>ww(e,t,n,i),e.unwrap=()=>e._zod.def.innerType,e.removeDefault=e.unwrap});function WW(e,r){return new GW({type:"default",innerType:e,get defaultValue(){return typeof r=="function"?r():z.shallowClone(r)}})}var VW=$("ZodPrefault",(e,r)=>{Qy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>qw(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function MW(e,r){return new VW({type:"prefault",innerType:e,get defaultValue(){return typeof r=="function"?r():z.shallowClone(r)}})}var Kw=$("ZodNonOptional",(e,r)=>{Yy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>yw(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function JW(e,r){return new Kw({type:"nonoptional",innerType:e,...z.normalizeParams(r)})}var XW=$("ZodCatch",(e,r)=>{jy.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>Pw(e,t,n,i),e.unwrap=()=>e._zod.def.innerType,e.removeCatch=e.unwrap});function KW(e,r){return new XW({type:"catch",innerType:e,catchValue:typeof r=="function"?r:z.constantCatch(r)})}var QW=$("ZodPipe",(e,r)=>{eb.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>Iw(e,t,n,i),e.in=r.in,e.out=r.out});function Hw(e,r){return new QW({type:"pipe",in:e,out:r})}var YW=$("ZodReadonly",(e,r)=>{rb.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>$w(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function jW(e){return new YW({type:"readonly",innerType:e})}var eV=$("ZodCustom",(e,r)=>{tb.init(e,r),te.init(e,r),e._zod.processJSONSchema=(t,n,i)=>lw(e,t,n,i)});function rV(e,r={}){return Hb(eV,e,r)}function tV(e,r){return Gb(e,r)}var nV="Enter a number.",ze=Mw({error:nV}),jw=ze.refine(e=>e>.5&&e<1,{error:"A level lies between 0.5 and 1, such as 0.95."}),eq=ze.refine(e=>e>=.5&&e<=10,{error:"A design effect lies from 0.5 to 10."}),rq=(e,r)=>ze.refine(t=>Number.isInteger(t)&&t>=e,{error:r}),Qw=je({pp:ze.refine(e=>e>0&&e<100,{error:"A margin in points lies between 0 and 100."}),unit:ze.refine(e=>e>0&&e<=10,{error:"The unit a margin is rounded to lies above 0 and not above 10 points."}),level:jw}),oV=je({source:Nn(["design","kish","stated"],{error:"A design effect comes from design, kish or stated."}),value:eq,df:rq(1,"Degrees of freedom are a whole number of at least 1.").optional()}),zn=Ww({error:"An option needs its name."}),iV=je({option:zn,pct:ze.refine(e=>e>=0&&e<=100,{error:"A share lies from 0 to 100 percent."}).nullable(),answer:Y0({error:"answer is true or false."}).optional()}),Yw=je({sampleSource:Nn(["probability","quota","opt-in","blended","unknown"],{error:"The sample source is probability, quota, opt-in, blended or unknown."}),n:rq(1,"The sample size is a whole number of at least 1.").nullable(),design:Nn(["weighted","unweighted","clustered"],{error:"The design is weighted, unweighted or clustered."}),deff:oV.nullable().optional(),statedMargin:Qw.nullable().optional(),modelledInterval:Qw.nullable().optional(),decimals:ze.refine(e=>Number.isInteger(e)&&e>=0&&e<=6,{error:"Decimals are a whole number from 0 to 6."}),shares:Zt(iV,{error:"Shares are a list."}).min(1,{error:"A release needs at least one share."})}),tq=j0([ze,ze],{error:"A range has a low and a high end."}),ra=je({value:eq,range:tq}),sV=je({level:jw.optional(),assumed:je({weighted:ra.optional(),clustered:ra.optional(),unweighted:ra.optional()}).optional(),kishRange:tq.optional(),comparisonBasis:Y0({error:"comparisonBasis is true or false."}).optional(),indifferencePp:ze.refine(e=>e>0,{error:"The margin of indifference lies above 0 points."}).optional(),minimumNEff:ze.refine(e=>e>=1,{error:"The smallest effective sample size is at least 1."}).optional()}),uV=je({option:zn,pct:ze.refine(e=>e>0&&e<100,{error:"A threshold lies between 0 and 100 percent."})}),nq=je({policy:sV.optional(),release:Yw,previous:Yw.nullable().optional(),pairs:Zt(j0([zn,zn],{error:"A pair names two options."})).optional(),changes:Zt(zn).optional(),thresholds:Zt(uV).optional()},{error:e=>e.code==="invalid_type"?"A check document is a JSON object.":void 0});function ta(e){let[r="0",t="0"]=String(e).split("e"),[n="0",i=""]=r.split("."),s=i.length-Number(t),f=BigInt(n+i);return s>=0?{digits:f,places:s}:{digits:f*10n**BigInt(-s),places:0}}function oq(e){return ta(e).places}function iq(e,r){let t=ta(e),n=ta(r),i=Math.max(t.places,n.places),s=({digits:f,places:a})=>f*10n**BigInt(i-a);return s(t)%s(n)===0n}function na(e,r,t){if(aV(e,r),e.deff?.df!==void 0&&e.deff.source!=="design")throw new X(`${r}.deff.df`,"Degrees of freedom belong only to a design effect computed from the design.");sq(e.statedMargin,`${r}.statedMargin`),sq(e.modelledInterval,`${r}.modelledInterval`),cV(e,r,t)}function aV({shares:e,decimals:r},t){let n=new Set,i=0,s=0;if(e.forEach(({option:f,pct:a},o)=>{if(n.has(f))throw new X(`${t}.shares[${o}].option`,"This option is already in the list.");if(n.add(f),a!==null){if(oq(a)>r)throw new X(`${t}.shares[${o}].pct`,`This share has more than the ${r} decimals of its release.`);i+=mn(a,r),s+=1}}),i>mn(100,r)+s/2)throw new X(`${t}.shares`,"The shares sum to more than 100 percent and rounding allow.")}function sq(e,r){if(e&&!iq(e.pp,e.unit))throw new X(`${r}.pp`,`This margin is not a multiple of ${e.unit}, the unit it is said to be rounded to.`)}function cV(e,r,t){let n=Ro(e,t);if(!(e.n===null||n!=="sampling"&&n!=="comparison")&&!(!e.statedMargin||!Ju(e,e.n))&&vn(e.statedMargin,e.n).value>cg)throw new X(`${r}.statedMargin.pp`,"This margin implies a design effect above 10: check it and the sample size.")}function uq(e){for(let[r,t]of Object.entries(e?.assumed??{}))if(t&&!fV(t))throw new X(`policy.assumed.${r}.range`,"The range ascends from at least 0.5 to at most 10 and contains the value.");if(e?.kishRange&&!aq(e.kishRange,1))throw new X("policy.kishRange","The range is positive, ascends and contains 1.")}function fV({value:e,range:r}){return aq(r,e)&&r[0]>=.5&&r[1]<=10}function aq([e,r],t){return e>0&&e<=t&&t<=r}var oa="This option is not in the release.",lV="This is asked already.";function cq(e){let r=new Set(e.release.shares.map(({option:s})=>s));pV(e.pairs??[],r);let t=e.changes??[];if(t.length>0&&!e.previous)throw new X("changes","A change needs the release it is compared with.");let n=new Set;t.forEach((s,f)=>{if(!r.has(s))throw new X(`changes[${f}]`,oa);ia(n,s,`changes[${f}]`)});let i=new Set;(e.thresholds??[]).forEach(({option:s,pct:f},a)=>{if(!r.has(s))throw new X(`thresholds[${a}].option`,oa);ia(i,JSON.stringify([s,f]),`thresholds[${a}]`)})}function pV(e,r){let t=new Set;e.forEach((n,i)=>{if(n.forEach((s,f)=>{if(!r.has(s))throw new X(`pairs[${i}][${f}]`,oa)}),n[0]===n[1])throw new X(`pairs[${i}]`,"A pair names two different options.");ia(t,JSON.stringify([...n].sort()),`pairs[${i}]`)})}function ia(e,r,t){if(e.has(r))throw new X(t,lV);e.add(r)}function vV(e){let r=nq.safeParse(e);if(!r.success)throw dV(r.error);let t=r.data;uq(t.policy);let n=Co(t.policy);return na(t.release,"release",n),t.previous&&na(t.previous,"previous",n),cq(t),t}var mV=/^(policy\.assumed\.\w+\.range|policy\.kishRange)\b.*$/,fq=/^(pairs\[\d+\])\[\d+\]$/;function dV(e){let[r]=e.issues;if(!r)throw new TypeError("refusalOf requires an issue");if(r.code==="unrecognized_keys")return new X(lq([...r.path,...r.keys.slice(0,1)]),"This key is not known here.");let t=lq(r.path).replace(mV,"$1");return r.code==="invalid_type"&&r.input===void 0&&r.path.length>0&&fq.test(t)?new X(t.replace(fq,"$1"),"A pair names two options."):new X(t,r.message)}function lq(e){return e.reduce((r,t)=>typeof t=="number"?`${r}[${t}]`:r===""?String(t):`${r}.${String(t)}`,"")}export{X as CheckRefused,ju as ENGINE_VERSION,NH as check,vV as parseCheckDocument};
/*! Bundled license information:

@stdlib/utils-define-property/lib/define_property.js:
@stdlib/utils-define-property/lib/has_define_property_support.js:
@stdlib/math-base-special-abs/lib/main.js:
@stdlib/array-base-filled/lib/main.js:
@stdlib/array-base-filled/lib/index.js:
@stdlib/array-base-zeros/lib/main.js:
@stdlib/array-base-zeros/lib/index.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2021 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/utils-define-property/lib/builtin.js:
@stdlib/utils-define-property/lib/polyfill.js:
@stdlib/utils-define-property/lib/index.js:
@stdlib/utils-define-nonenumerable-read-only-property/lib/main.js:
@stdlib/utils-define-nonenumerable-read-only-property/lib/index.js:
@stdlib/math-base-assert-is-nan/lib/main.js:
@stdlib/math-base-assert-is-nan/lib/index.js:
@stdlib/math-base-tools-evalpoly/lib/main.js:
@stdlib/math-base-tools-evalpoly/lib/factory.js:
@stdlib/math-base-tools-evalpoly/lib/index.js:
@stdlib/assert-has-symbol-support/lib/main.js:
@stdlib/assert-has-symbol-support/lib/index.js:
@stdlib/assert-has-tostringtag-support/lib/main.js:
@stdlib/assert-has-tostringtag-support/lib/index.js:
@stdlib/utils-native-class/lib/tostring.js:
@stdlib/utils-native-class/lib/main.js:
@stdlib/assert-has-own-property/lib/main.js:
@stdlib/assert-has-own-property/lib/index.js:
@stdlib/symbol-ctor/lib/main.js:
@stdlib/symbol-ctor/lib/index.js:
@stdlib/utils-native-class/lib/tostringtag.js:
@stdlib/utils-native-class/lib/polyfill.js:
@stdlib/utils-native-class/lib/index.js:
@stdlib/assert-is-uint32array/lib/main.js:
@stdlib/assert-is-uint32array/lib/index.js:
@stdlib/constants-uint32-max/lib/index.js:
@stdlib/assert-has-uint32array-support/lib/uint32array.js:
@stdlib/assert-has-uint32array-support/lib/main.js:
@stdlib/assert-has-uint32array-support/lib/index.js:
@stdlib/array-uint32/lib/main.js:
@stdlib/array-uint32/lib/polyfill.js:
@stdlib/array-uint32/lib/index.js:
@stdlib/assert-is-float64array/lib/main.js:
@stdlib/assert-is-float64array/lib/index.js:
@stdlib/assert-has-float64array-support/lib/float64array.js:
@stdlib/assert-has-float64array-support/lib/main.js:
@stdlib/assert-has-float64array-support/lib/index.js:
@stdlib/array-float64/lib/main.js:
@stdlib/array-float64/lib/polyfill.js:
@stdlib/array-float64/lib/index.js:
@stdlib/assert-is-uint8array/lib/main.js:
@stdlib/assert-is-uint8array/lib/index.js:
@stdlib/constants-uint8-max/lib/index.js:
@stdlib/assert-has-uint8array-support/lib/uint8array.js:
@stdlib/assert-has-uint8array-support/lib/main.js:
@stdlib/assert-has-uint8array-support/lib/index.js:
@stdlib/array-uint8/lib/main.js:
@stdlib/array-uint8/lib/polyfill.js:
@stdlib/array-uint8/lib/index.js:
@stdlib/assert-is-uint16array/lib/main.js:
@stdlib/assert-is-uint16array/lib/index.js:
@stdlib/constants-uint16-max/lib/index.js:
@stdlib/assert-has-uint16array-support/lib/uint16array.js:
@stdlib/assert-has-uint16array-support/lib/main.js:
@stdlib/assert-has-uint16array-support/lib/index.js:
@stdlib/array-uint16/lib/main.js:
@stdlib/array-uint16/lib/polyfill.js:
@stdlib/array-uint16/lib/index.js:
@stdlib/assert-is-little-endian/lib/ctors.js:
@stdlib/assert-is-little-endian/lib/main.js:
@stdlib/assert-is-little-endian/lib/index.js:
@stdlib/number-float64-base-get-high-word/lib/high.js:
@stdlib/number-float64-base-get-high-word/lib/main.js:
@stdlib/number-float64-base-get-high-word/lib/index.js:
@stdlib/number-float64-base-set-high-word/lib/high.js:
@stdlib/number-float64-base-set-high-word/lib/main.js:
@stdlib/number-float64-base-set-high-word/lib/index.js:
@stdlib/number-float64-base-from-words/lib/indices.js:
@stdlib/number-float64-base-from-words/lib/main.js:
@stdlib/number-float64-base-from-words/lib/index.js:
@stdlib/constants-float64-pinf/lib/index.js:
@stdlib/number-ctor/lib/main.js:
@stdlib/number-ctor/lib/index.js:
@stdlib/constants-float64-ninf/lib/index.js:
@stdlib/constants-float64-exponent-bias/lib/index.js:
@stdlib/constants-float64-half-ln-two/lib/index.js:
@stdlib/math-base-special-expm1/lib/index.js:
@stdlib/math-base-special-floor/lib/main.js:
@stdlib/math-base-special-floor/lib/index.js:
@stdlib/math-base-special-log1p/lib/index.js:
@stdlib/math-base-special-sqrt/lib/main.js:
@stdlib/math-base-special-sqrt/lib/index.js:
@stdlib/constants-float64-fourth-pi/lib/index.js:
@stdlib/math-base-special-asin/lib/index.js:
@stdlib/math-base-special-abs/lib/index.js:
@stdlib/math-base-special-ceil/lib/main.js:
@stdlib/math-base-special-ceil/lib/index.js:
@stdlib/math-base-special-trunc/lib/main.js:
@stdlib/math-base-special-trunc/lib/index.js:
@stdlib/constants-float64-max-base2-exponent/lib/index.js:
@stdlib/constants-float64-max-base2-exponent-subnormal/lib/index.js:
@stdlib/constants-float64-min-base2-exponent-subnormal/lib/index.js:
@stdlib/math-base-assert-is-infinite/lib/main.js:
@stdlib/math-base-assert-is-infinite/lib/index.js:
@stdlib/number-float64-base-to-words/lib/indices.js:
@stdlib/number-float64-base-to-words/lib/assign.js:
@stdlib/number-float64-base-to-words/lib/main.js:
@stdlib/number-float64-base-to-words/lib/index.js:
@stdlib/math-base-special-copysign/lib/main.js:
@stdlib/math-base-special-copysign/lib/index.js:
@stdlib/constants-float64-smallest-normal/lib/index.js:
@stdlib/number-float64-base-normalize/lib/assign.js:
@stdlib/number-float64-base-normalize/lib/main.js:
@stdlib/number-float64-base-normalize/lib/index.js:
@stdlib/constants-float64-high-word-exponent-mask/lib/index.js:
@stdlib/number-float64-base-exponent/lib/main.js:
@stdlib/number-float64-base-exponent/lib/index.js:
@stdlib/math-base-special-ldexp/lib/main.js:
@stdlib/math-base-special-ldexp/lib/index.js:
@stdlib/math-base-special-exp/lib/index.js:
@stdlib/math-base-assert-is-integer/lib/main.js:
@stdlib/math-base-assert-is-integer/lib/index.js:
@stdlib/math-base-assert-is-even/lib/main.js:
@stdlib/math-base-assert-is-even/lib/index.js:
@stdlib/math-base-assert-is-odd/lib/main.js:
@stdlib/math-base-assert-is-odd/lib/index.js:
@stdlib/number-float64-base-set-low-word/lib/low.js:
@stdlib/number-float64-base-set-low-word/lib/main.js:
@stdlib/number-float64-base-set-low-word/lib/index.js:
@stdlib/number-uint32-base-to-int32/lib/main.js:
@stdlib/number-uint32-base-to-int32/lib/index.js:
@stdlib/math-base-special-pow/lib/y_is_infinite.js:
@stdlib/constants-float64-ln-two/lib/index.js:
@stdlib/constants-float64-high-word-significand-mask/lib/index.js:
@stdlib/math-base-special-pow/lib/index.js:
@stdlib/constants-float64-e/lib/index.js:
@stdlib/constants-float64-eps/lib/index.js:
@stdlib/math-base-special-beta/lib/index.js:
@stdlib/math-base-assert-is-positive-zero/lib/main.js:
@stdlib/math-base-assert-is-positive-zero/lib/index.js:
@stdlib/math-base-special-max/lib/main.js:
@stdlib/math-base-special-max/lib/index.js:
@stdlib/math-base-assert-is-negative-zero/lib/main.js:
@stdlib/math-base-assert-is-negative-zero/lib/index.js:
@stdlib/math-base-special-min/lib/main.js:
@stdlib/math-base-special-min/lib/index.js:
@stdlib/constants-float64-max/lib/index.js:
@stdlib/constants-int32-max/lib/index.js:
@stdlib/constants-float64-half-pi/lib/index.js:
@stdlib/constants-float64-pi/lib/index.js:
@stdlib/math-base-special-kernel-cos/lib/index.js:
@stdlib/math-base-special-kernel-sin/lib/index.js:
@stdlib/number-float64-base-get-low-word/lib/low.js:
@stdlib/number-float64-base-get-low-word/lib/main.js:
@stdlib/number-float64-base-get-low-word/lib/index.js:
@stdlib/math-base-special-round/lib/main.js:
@stdlib/math-base-special-round/lib/index.js:
@stdlib/math-base-special-rempio2/lib/index.js:
@stdlib/math-base-special-sin/lib/index.js:
@stdlib/constants-float64-sqrt-two-pi/lib/index.js:
@stdlib/constants-float64-eulergamma/lib/index.js:
@stdlib/math-base-special-gamma/lib/index.js:
@stdlib/math-base-special-factorial/lib/main.js:
@stdlib/math-base-special-factorial/lib/index.js:
@stdlib/math-base-special-gamma-lanczos-sum/lib/index.js:
@stdlib/constants-float64-gamma-lanczos-g/lib/index.js:
@stdlib/math-base-special-gamma-delta-ratio/lib/index.js:
@stdlib/math-base-special-ln/lib/index.js:
@stdlib/math-base-special-cos/lib/index.js:
@stdlib/math-base-special-sinpi/lib/main.js:
@stdlib/math-base-special-sinpi/lib/index.js:
@stdlib/math-base-special-gammaln/lib/index.js:
@stdlib/constants-float64-max-ln/lib/index.js:
@stdlib/constants-float64-sqrt-eps/lib/index.js:
@stdlib/utils-eval/lib/index.js:
@stdlib/assert-has-generator-support/lib/main.js:
@stdlib/assert-has-generator-support/lib/index.js:
@stdlib/math-base-tools-sum-series/lib/generators.js:
@stdlib/math-base-tools-sum-series/lib/basic.js:
@stdlib/math-base-tools-sum-series/lib/index.js:
@stdlib/math-base-special-erfc/lib/index.js:
@stdlib/constants-float64-min-ln/lib/index.js:
@stdlib/constants-float64-two-pi/lib/index.js:
@stdlib/math-base-special-gamma-lanczos-sum-expg-scaled/lib/index.js:
@stdlib/math-base-special-powm1/lib/index.js:
@stdlib/math-base-special-gamma1pm1/lib/index.js:
@stdlib/constants-float32-smallest-normal/lib/index.js:
@stdlib/math-base-tools-continued-fraction/lib/generators.js:
@stdlib/math-base-tools-continued-fraction/lib/basic.js:
@stdlib/math-base-tools-continued-fraction/lib/index.js:
@stdlib/math-base-special-gammainc/lib/index.js:
@stdlib/math-base-special-maxabs/lib/main.js:
@stdlib/math-base-special-maxabs/lib/index.js:
@stdlib/math-base-special-minabs/lib/main.js:
@stdlib/math-base-special-minabs/lib/index.js:
@stdlib/constants-float64-max-safe-integer/lib/index.js:
@stdlib/math-base-special-gcd/lib/bitwise_binary_gcd.js:
@stdlib/math-base-special-gcd/lib/binary_gcd.js:
@stdlib/math-base-special-gcd/lib/main.js:
@stdlib/math-base-special-gcd/lib/index.js:
@stdlib/math-base-special-binomcoef/lib/main.js:
@stdlib/math-base-special-binomcoef/lib/index.js:
@stdlib/math-base-special-kernel-betainc/lib/main.js:
@stdlib/math-base-special-kernel-betainc/lib/index.js:
@stdlib/math-base-special-betainc/lib/main.js:
@stdlib/math-base-special-betainc/lib/index.js:
@stdlib/math-base-special-erfcinv/lib/index.js:
@stdlib/math-base-special-acos/lib/index.js:
@stdlib/constants-float64-sqrt-two/lib/index.js:
@stdlib/math-base-special-signum/lib/main.js:
@stdlib/math-base-special-signum/lib/index.js:
@stdlib/constants-float32-max/lib/index.js:
@stdlib/math-base-special-gammaincinv/lib/higher_newton.js:
@stdlib/math-base-special-gammaincinv/lib/lambdaeta.js:
@stdlib/constants-float64-ln-sqrt-two-pi/lib/index.js:
@stdlib/math-base-special-gammaincinv/lib/chepolsum.js:
@stdlib/math-base-special-gammaincinv/lib/stirling.js:
@stdlib/math-base-special-gammaincinv/lib/gamstar.js:
@stdlib/math-base-special-gammaincinv/lib/eps1.js:
@stdlib/math-base-special-gammaincinv/lib/eps2.js:
@stdlib/math-base-special-gammaincinv/lib/eps3.js:
@stdlib/math-base-special-gammaincinv/lib/compute.js:
@stdlib/math-base-special-gammaincinv/lib/main.js:
@stdlib/math-base-special-gammaincinv/lib/index.js:
@stdlib/constants-float64-smallest-subnormal/lib/index.js:
@stdlib/math-base-special-kernel-betaincinv/lib/index.js:
@stdlib/math-base-special-betaincinv/lib/main.js:
@stdlib/math-base-special-betaincinv/lib/index.js:
@stdlib/stats-base-dists-beta-quantile/lib/main.js:
@stdlib/utils-constant-function/lib/main.js:
@stdlib/utils-constant-function/lib/index.js:
@stdlib/stats-base-dists-beta-quantile/lib/factory.js:
@stdlib/stats-base-dists-beta-quantile/lib/index.js:
@stdlib/stats-base-dists-t-quantile/lib/main.js:
@stdlib/stats-base-dists-t-quantile/lib/factory.js:
@stdlib/stats-base-dists-t-quantile/lib/index.js:
@stdlib/math-base-assert-is-nonnegative-integer/lib/main.js:
@stdlib/math-base-assert-is-nonnegative-integer/lib/index.js:
@stdlib/math-base-assert-is-negative-integer/lib/main.js:
@stdlib/math-base-assert-is-negative-integer/lib/index.js:
@stdlib/math-base-special-factorialln/lib/main.js:
@stdlib/math-base-special-factorialln/lib/index.js:
@stdlib/stats-base-dists-hypergeometric-pmf/lib/main.js:
@stdlib/stats-base-dists-hypergeometric-pmf/lib/factory.js:
@stdlib/stats-base-dists-hypergeometric-pmf/lib/index.js:
@stdlib/stats-base-dists-t-cdf/lib/main.js:
@stdlib/stats-base-dists-t-cdf/lib/factory.js:
@stdlib/stats-base-dists-t-cdf/lib/index.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/string-base-format-interpolate/lib/is_number.js:
@stdlib/string-base-format-interpolate/lib/zero_pad.js:
@stdlib/string-base-format-interpolate/lib/format_integer.js:
@stdlib/string-base-format-interpolate/lib/is_string.js:
@stdlib/string-base-format-interpolate/lib/format_double.js:
@stdlib/string-base-format-interpolate/lib/space_pad.js:
@stdlib/string-base-format-interpolate/lib/main.js:
@stdlib/string-base-format-interpolate/lib/index.js:
@stdlib/string-base-format-tokenize/lib/main.js:
@stdlib/string-base-format-tokenize/lib/index.js:
@stdlib/string-format/lib/is_string.js:
@stdlib/string-format/lib/main.js:
@stdlib/string-format/lib/index.js:
@stdlib/function-ctor/lib/main.js:
@stdlib/function-ctor/lib/index.js:
@stdlib/math-base-special-expm1/lib/polyval_q.js:
@stdlib/math-base-special-log1p/lib/polyval_lp.js:
@stdlib/math-base-special-asin/lib/rational_pq.js:
@stdlib/math-base-special-asin/lib/rational_rs.js:
@stdlib/constants-float64-high-word-sign-mask/lib/index.js:
@stdlib/constants-float64-high-word-abs-mask/lib/index.js:
@stdlib/math-base-special-exp/lib/polyval_p.js:
@stdlib/math-base-special-kernel-cos/lib/polyval_c13.js:
@stdlib/math-base-special-kernel-cos/lib/polyval_c46.js:
@stdlib/math-base-special-ln/lib/polyval_p.js:
@stdlib/math-base-special-ln/lib/polyval_q.js:
@stdlib/math-base-special-erfc/lib/polyval_pp.js:
@stdlib/math-base-special-erfc/lib/polyval_qq.js:
@stdlib/math-base-special-erfc/lib/polyval_pa.js:
@stdlib/math-base-special-erfc/lib/polyval_qa.js:
@stdlib/math-base-special-erfc/lib/polyval_ra.js:
@stdlib/math-base-special-erfc/lib/polyval_sa.js:
@stdlib/math-base-special-erfc/lib/polyval_rb.js:
@stdlib/math-base-special-erfc/lib/polyval_sb.js:
@stdlib/math-base-special-gammainc/lib/polyval_c0.js:
@stdlib/math-base-special-gammainc/lib/polyval_c1.js:
@stdlib/math-base-special-gammainc/lib/polyval_c2.js:
@stdlib/math-base-special-gammainc/lib/polyval_c3.js:
@stdlib/math-base-special-gammainc/lib/polyval_c4.js:
@stdlib/math-base-special-gammainc/lib/polyval_c5.js:
@stdlib/math-base-special-gammainc/lib/polyval_c6.js:
@stdlib/math-base-special-gammainc/lib/polyval_c7.js:
@stdlib/math-base-special-gammainc/lib/polyval_c8.js:
@stdlib/math-base-special-gamma-lanczos-sum-expg-scaled/lib/rational_pq.js:
@stdlib/math-base-special-erfcinv/lib/rational_p1q1.js:
@stdlib/math-base-special-erfcinv/lib/rational_p2q2.js:
@stdlib/math-base-special-erfcinv/lib/rational_p3q3.js:
@stdlib/math-base-special-erfcinv/lib/rational_p4q4.js:
@stdlib/math-base-special-erfcinv/lib/rational_p5q5.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co14.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co15.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co16.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co17.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co18.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co19.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co20.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co21.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co22.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co1.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co2.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co3.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co4.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co5.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co6.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co7.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co8.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co9.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co10.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co11.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co12.js:
@stdlib/math-base-special-kernel-betaincinv/lib/polyval_co13.js:
@stdlib/math-base-special-gammaincinv/lib/polyval_ak1.js:
@stdlib/math-base-special-gammaincinv/lib/polyval_ak2.js:
@stdlib/math-base-special-gammaincinv/lib/polyval_c.js:
@stdlib/math-base-special-gammaincinv/lib/polyval_d.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak0bk0.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak1bk1.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak2bk2.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak3bk3.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak4bk4.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak5bk5.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak6bk6.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak7bk7.js:
@stdlib/math-base-special-gammaincinv/lib/rational_ak8bk8.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2022 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/math-base-special-expm1/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FDLIBM]{@link http://www.netlib.org/fdlibm/s_expm1.c} and [FreeBSD]{@link https://svnweb.freebsd.org/base/release/12.2.0/lib/msun/src/s_expm1.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 2004 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-log1p/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FDLIBM]{@link http://www.netlib.org/fdlibm/s_log1p.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-asin/lib/main.js:
@stdlib/math-base-special-acos/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C code, long comment, copyright, license, and constants are from [Cephes]{@link http://www.netlib.org/cephes}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright 1984, 1995, 2000 by Stephen L. Moshier
  *
  * Some software in this archive may be from the book _Methods and Programs for Mathematical Functions_ (Prentice-Hall or Simon & Schuster International, 1989) or from the Cephes Mathematical Library, a commercial product. In either event, it is copyrighted by the author. What you see here may be used freely but it comes with no support or guarantee.
  *
  * Stephen L. Moshier
  * moshier@na-net.ornl.gov
  * ```
  *)

@stdlib/math-base-special-exp/lib/expmulti.js:
@stdlib/math-base-special-exp/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyrights, licenses, and long comment were part of the original implementation available as part of [Go]{@link https://github.com/golang/go/blob/cb07765045aed5104a3df31507564ac99e6ddce8/src/math/exp.go}, which in turn was based on an implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/e_exp.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (c) 2009 The Go Authors. All rights reserved.
  *
  * Redistribution and use in source and binary forms, with or without
  * modification, are permitted provided that the following conditions are
  * met:
  *
  *    * Redistributions of source code must retain the above copyright
  * notice, this list of conditions and the following disclaimer.
  *    * Redistributions in binary form must reproduce the above
  * copyright notice, this list of conditions and the following disclaimer
  * in the documentation and/or other materials provided with the
  * distribution.
  *    * Neither the name of Google Inc. nor the names of its
  * contributors may be used to endorse or promote products derived from
  * this software without specific prior written permission.
  *
  * THIS SOFTWARE IS PROVIDED BY THE COPYRIGHT HOLDERS AND CONTRIBUTORS
  * "AS IS" AND ANY EXPRESS OR IMPLIED WARRANTIES, INCLUDING, BUT NOT
  * LIMITED TO, THE IMPLIED WARRANTIES OF MERCHANTABILITY AND FITNESS FOR
  * A PARTICULAR PURPOSE ARE DISCLAIMED. IN NO EVENT SHALL THE COPYRIGHT
  * OWNER OR CONTRIBUTORS BE LIABLE FOR ANY DIRECT, INDIRECT, INCIDENTAL,
  * SPECIAL, EXEMPLARY, OR CONSEQUENTIAL DAMAGES (INCLUDING, BUT NOT
  * LIMITED TO, PROCUREMENT OF SUBSTITUTE GOODS OR SERVICES; LOSS OF USE,
  * DATA, OR PROFITS; OR BUSINESS INTERRUPTION) HOWEVER CAUSED AND ON ANY
  * THEORY OF LIABILITY, WHETHER IN CONTRACT, STRICT LIABILITY, OR TORT
  * (INCLUDING NEGLIGENCE OR OTHERWISE) ARISING IN ANY WAY OUT OF THE USE
  * OF THIS SOFTWARE, EVEN IF ADVISED OF THE POSSIBILITY OF SUCH DAMAGE.
  * ```
  *
  * ```text
  * Copyright (C) 2004 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-pow/lib/x_is_zero.js:
@stdlib/math-base-special-pow/lib/y_is_huge.js:
@stdlib/math-base-special-pow/lib/log2ax.js:
@stdlib/math-base-special-pow/lib/logx.js:
@stdlib/math-base-special-pow/lib/pow2.js:
@stdlib/math-base-special-pow/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright and license were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/s_pow.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 2004 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/constants-float64-num-high-word-significand-bits/lib/index.js:
@stdlib/math-base-special-pow/lib/polyval_l.js:
@stdlib/math-base-special-pow/lib/polyval_w.js:
@stdlib/math-base-special-pow/lib/polyval_p.js:
@stdlib/math-base-special-beta/lib/lanczos_sum_expg_scaled.js:
@stdlib/math-base-special-gamma/lib/polyval_s.js:
@stdlib/math-base-special-gamma/lib/rational_pq.js:
@stdlib/math-base-special-gamma-lanczos-sum/lib/rational_pq.js:
@stdlib/math-base-special-gammaln/lib/polyval_a1.js:
@stdlib/math-base-special-gammaln/lib/polyval_a2.js:
@stdlib/math-base-special-gammaln/lib/polyval_r.js:
@stdlib/math-base-special-gammaln/lib/polyval_s.js:
@stdlib/math-base-special-gammaln/lib/polyval_t1.js:
@stdlib/math-base-special-gammaln/lib/polyval_t2.js:
@stdlib/math-base-special-gammaln/lib/polyval_t3.js:
@stdlib/math-base-special-gammaln/lib/polyval_u.js:
@stdlib/math-base-special-gammaln/lib/polyval_v.js:
@stdlib/math-base-special-gammaln/lib/polyval_w.js:
@stdlib/math-base-special-gamma1pm1/lib/rational_p1q1.js:
@stdlib/math-base-special-gamma1pm1/lib/rational_p2q2.js:
@stdlib/math-base-special-gamma1pm1/lib/rational_p3q3.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2024 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/math-base-special-beta/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{http://www.boost.org/doc/libs/1_85_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-cos/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/12.2.0/lib/msun/src/k_cos.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-kernel-sin/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/k_sin.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-rempio2/lib/kernel_rempio2.js:
@stdlib/math-base-special-rempio2/lib/rempio2_medium.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright and license were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/k_rem_pio2.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-rempio2/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright and license were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/e_rem_pio2.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  *
  * Optimized by Bruce D. Evans.
  * ```
  *)

@stdlib/math-base-special-sin/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/s_sin.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-gamma/lib/stirling_approximation.js:
@stdlib/math-base-special-gamma/lib/small_approximation.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C code, copyright, license, and constants are from [Cephes]{@link http://www.netlib.org/cephes}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright 1984, 1987, 1989, 1992, 2000 by Stephen L. Moshier
  *
  * Some software in this archive may be from the book _Methods and Programs for Mathematical Functions_ (Prentice-Hall or Simon & Schuster International, 1989) or from the Cephes Mathematical Library, a commercial product. In either event, it is copyrighted by the author. What you see here may be used freely but it comes with no support or guarantee.
  *
  * Stephen L. Moshier
  * moshier@na-net.ornl.gov
  * ```
  *)

@stdlib/math-base-special-gamma/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C code, long comment, copyright, license, and constants are from [Cephes]{@link http://www.netlib.org/cephes}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright 1984, 1987, 1989, 1992, 2000 by Stephen L. Moshier
  *
  * Some software in this archive may be from the book _Methods and Programs for Mathematical Functions_ (Prentice-Hall or Simon & Schuster International, 1989) or from the Cephes Mathematical Library, a commercial product. In either event, it is copyrighted by the author. What you see here may be used freely but it comes with no support or guarantee.
  *
  * Stephen L. Moshier
  * moshier@na-net.ornl.gov
  * ```
  *)

@stdlib/constants-float64-max-nth-factorial/lib/index.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2025 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/math-base-special-gamma-lanczos-sum/lib/main.js:
@stdlib/math-base-special-gamma-lanczos-sum-expg-scaled/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_64_0/boost/math/special_functions/lanczos.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-gamma-delta-ratio/lib/gamma_delta_ratio_lanczos.js:
@stdlib/math-base-special-gamma-delta-ratio/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_85_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006-7, 2013-14.
  * Copyright Paul A. Bristow 2007, 2013-14.
  * Copyright Nikhar Agrawal 2013-14.
  * Copyright Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-ln/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright and license were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/e_log.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-cos/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/s_cos.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-gammaln/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/12.2.0/lib/msun/src/e_lgamma_r.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-gammainc/lib/tgamma_i_large_x_series.js:
@stdlib/math-base-special-gammainc/lib/tgamma_i_large_x.js:
@stdlib/math-base-special-gammainc/lib/igamma_final.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2025 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link https://www.boost.org/doc/libs/1_88_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  * (C) Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-gammainc/lib/finite_gamma_q.js:
@stdlib/math-base-special-gammainc/lib/finite_half_gamma_q.js:
@stdlib/math-base-special-gammainc/lib/full_igamma_prefix.js:
@stdlib/math-base-special-gammainc/lib/igamma_temme_large.js:
@stdlib/math-base-special-gammainc/lib/lower_incomplete_gamma_series.js:
@stdlib/math-base-special-gammainc/lib/lower_gamma_series.js:
@stdlib/math-base-special-gammainc/lib/small_gamma2_series.js:
@stdlib/math-base-special-gammainc/lib/tgamma_small_upper_part.js:
@stdlib/math-base-special-gammainc/lib/upper_incomplete_gamma_fract.js:
@stdlib/math-base-special-gammainc/lib/upper_gamma_fraction.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link https://www.boost.org/doc/libs/1_88_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  * (C) Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-erfc/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The following copyright, license, and long comment were part of the original implementation available as part of [FreeBSD]{@link https://svnweb.freebsd.org/base/release/9.3.0/lib/msun/src/s_erf.c}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * Copyright (C) 1993 by Sun Microsystems, Inc. All rights reserved.
  *
  * Developed at SunPro, a Sun Microsystems, Inc. business.
  * Permission to use, copy, modify, and distribute this
  * software is freely granted, provided that this notice
  * is preserved.
  * ```
  *)

@stdlib/math-base-special-log1pmx/lib/log1p_series.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2023 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link https://www.boost.org/doc/libs/1_83_0/boost/math/special_functions/log1p.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2005-2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  *)

@stdlib/math-base-special-log1pmx/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2023 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link https://www.boost.org/doc/libs/1_83_0/boost/math/special_functions/log1p.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2005-2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-log1pmx/lib/index.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2023 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *)

@stdlib/math-base-special-gammainc/lib/regularised_gamma_prefix.js:
@stdlib/math-base-special-kernel-betainc/lib/regularized_gamma_prefix.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_64_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006-7, 2013-14.
  * Copyright Paul A. Bristow 2007, 2013-14.
  * Copyright Nikhar Agrawal 2013-14.
  * Copyright Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-powm1/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_85_0/boost/math/special_functions/powm1.hpp}. The implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-gamma1pm1/lib/lgamma_small_imp.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_85_0/boost/math/special_functions/detail/lgamma_small.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006-7, 2013-14.
  * (C) Copyright Paul A. Bristow 2007, 2013-14.
  * (C) Copyright Nikhar Agrawal 2013-14.
  * (C) Copyright Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-gamma1pm1/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_85_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006-7, 2013-14.
  * (C) Copyright Paul A. Bristow 2007, 2013-14.
  * (C) Copyright Nikhar Agrawal 2013-14.
  * (C) Copyright Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-gammainc/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link https://www.boost.org/doc/libs/1_88_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006-7, 2013-14.
  * (C) Copyright Paul A. Bristow 2007, 2013-14.
  * (C) Copyright Nikhar Agrawal 2013-14.
  * (C) Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/full_igamma_prefix.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_37_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  * (C) Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/beta_small_b_large_a_series.js:
@stdlib/math-base-special-kernel-betainc/lib/ibeta_fraction2.js:
@stdlib/math-base-special-kernel-betainc/lib/binomial_ccdf.js:
@stdlib/math-base-special-kernel-betainc/lib/ibeta_a_step.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_61_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/rising_factorial_ratio.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_37_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/ibeta_power_terms.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_62_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/ibeta_series.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_64_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betainc/lib/assign.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_61_0/boost/math/special_functions/beta.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  * (C) Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-erfcinv/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_81_0/boost/math/special_functions/detail/erf_inv.hpp}. This implementation follows the original, but has been modified for JavaScript.
  *
  * ```text
  * (C) Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betaincinv/lib/inverse_students_t_body_series.js:
@stdlib/math-base-special-kernel-betaincinv/lib/inverse_students_t.js:
@stdlib/math-base-special-kernel-betaincinv/lib/find_ibeta_inv_from_t_dist.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_62_0/boost/math/special_functions/detail/t_distribution_inv.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  * Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betaincinv/lib/inverse_students_t_tail_series.js:
@stdlib/math-base-special-kernel-betaincinv/lib/inverse_students_t_hill.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_61_0/boost/math/special_functions/detail/t_distribution_inv.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  * Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betaincinv/lib/temme1.js:
@stdlib/math-base-special-kernel-betaincinv/lib/temme2.js:
@stdlib/math-base-special-kernel-betaincinv/lib/temme3.js:
@stdlib/math-base-special-kernel-betaincinv/lib/ibeta_roots.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_64_0/boost/math/special_functions/detail/ibeta_inverse.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  * Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betaincinv/lib/root_finder.js:
@stdlib/math-base-special-kernel-betaincinv/lib/main.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_62_0/boost/math/special_functions/detail/ibeta_inverse.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  * Copyright Paul A. Bristow 2007.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)

@stdlib/math-base-special-kernel-betaincinv/lib/newton_raphson.js:
@stdlib/math-base-special-kernel-betaincinv/lib/halley_iterate.js:
  (**
  * @license Apache-2.0
  *
  * Copyright (c) 2018 The Stdlib Authors.
  *
  * Licensed under the Apache License, Version 2.0 (the "License");
  * you may not use this file except in compliance with the License.
  * You may obtain a copy of the License at
  *
  *    http://www.apache.org/licenses/LICENSE-2.0
  *
  * Unless required by applicable law or agreed to in writing, software
  * distributed under the License is distributed on an "AS IS" BASIS,
  * WITHOUT WARRANTIES OR CONDITIONS OF ANY KIND, either express or implied.
  * See the License for the specific language governing permissions and
  * limitations under the License.
  *
  *
  * ## Notice
  *
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_62_0/boost/math/tools/roots.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)
*/
