var bA=Object.create;var Ci=Object.defineProperty;var _A=Object.getOwnPropertyDescriptor;var wA=Object.getOwnPropertyNames;var qA=Object.getPrototypeOf,PA=Object.prototype.hasOwnProperty;var h=(e,r)=>()=>{try{return r||e((r={exports:{}}).exports,r),r.exports}catch(t){throw r=0,t}},AA=(e,r)=>{for(var t in r)Ci(e,t,{get:r[t],enumerable:!0})},IA=(e,r,t,n)=>{if(r&&typeof r=="object"||typeof r=="function")for(let i of wA(r))!PA.call(e,i)&&i!==t&&Ci(e,i,{get:()=>r[i],enumerable:!(n=_A(r,i))||n.enumerable});return e};var me=(e,r,t)=>(t=e!=null?bA(qA(e)):{},IA(r||!e||!e.__esModule?Ci(t,"default",{value:e,enumerable:!0}):t,e));var Jc=h((HX,Kc)=>{"use strict";var TA=typeof Object.defineProperty=="function"?Object.defineProperty:null;Kc.exports=TA});var Qc=h((VX,Xc)=>{"use strict";var SA=Jc();function $A(){try{return SA({},"x",{}),!0}catch{return!1}}Xc.exports=$A});var jc=h((GX,Yc)=>{"use strict";var LA=Object.defineProperty;Yc.exports=LA});var Zi=h((WX,e0)=>{"use strict";function zA(e){return typeof e=="number"}e0.exports=zA});var Di=h((KX,t0)=>{"use strict";function FA(e){return e[0]==="-"}function r0(e){var r="",t;for(t=0;t<e;t++)r+="0";return r}function xA(e,r,t){var n=!1,i=r-e.length;return i<0||(FA(e)&&(n=!0,e=e.substr(1)),e=t?e+r0(i):r0(i)+e,n&&(e="-"+e)),e}t0.exports=xA});var s0=h((JX,i0)=>{"use strict";var RA=Zi(),n0=Di(),CA=String.prototype.toLowerCase,o0=String.prototype.toUpperCase;function ZA(e){var r,t,n;switch(e.specifier){case"b":r=2;break;case"o":r=8;break;case"x":case"X":r=16;break;default:r=10;break}if(t=e.arg,n=parseInt(t,10),!isFinite(n)){if(!RA(t))throw new Error("invalid integer. Value: "+t);n=0}return n<0&&(e.specifier==="u"||r!==10)&&(n=4294967295+n+1),n<0?(t=(-n).toString(r),e.precision&&(t=n0(t,e.precision,e.padRight)),t="-"+t):(t=n.toString(r),!n&&!e.precision?t="":e.precision&&(t=n0(t,e.precision,e.padRight)),e.sign&&(t=e.sign+t)),r===16&&(e.alternate&&(t="0x"+t),t=e.specifier===o0.call(e.specifier)?o0.call(t):CA.call(t)),r===8&&e.alternate&&t.charAt(0)!=="0"&&(t="0"+t),t}i0.exports=ZA});var u0=h((XX,a0)=>{"use strict";function DA(e){return typeof e=="string"}a0.exports=DA});var f0=h((QX,l0)=>{"use strict";var MA=Math.abs,BA=String.prototype.toLowerCase,c0=String.prototype.toUpperCase,Ur=String.prototype.replace,UA=/e\+(\d)$/,HA=/e-(\d)$/,VA=/^(\d+)$/,GA=/^(\d+)e/,WA=/\.0$/,KA=/\.0*e/,JA=/(\..*[^0])0*e/;function XA(e,r){var t,n;switch(r.specifier){case"e":case"E":n=e.toExponential(r.precision);break;case"f":case"F":n=e.toFixed(r.precision);break;case"g":case"G":MA(e)<1e-4?(t=r.precision,t>0&&(t-=1),n=e.toExponential(t)):n=e.toPrecision(r.precision),r.alternate||(n=Ur.call(n,JA,"$1e"),n=Ur.call(n,KA,"e"),n=Ur.call(n,WA,""));break;default:throw new Error("invalid double notation. Value: "+r.specifier)}return n=Ur.call(n,UA,"e+0$1"),n=Ur.call(n,HA,"e-0$1"),r.alternate&&(n=Ur.call(n,VA,"$1."),n=Ur.call(n,GA,"$1.e")),e>=0&&r.sign&&(n=r.sign+n),n=r.specifier===c0.call(r.specifier)?c0.call(n):BA.call(n),n}l0.exports=XA});var d0=h((YX,p0)=>{"use strict";function m0(e){var r="",t;for(t=0;t<e;t++)r+=" ";return r}function QA(e,r,t){var n=r-e.length;return n<0||(e=t?e+m0(n):m0(n)+e),e}p0.exports=QA});var h0=h((jX,v0)=>{"use strict";var YA=s0(),jA=u0(),eI=Zi(),rI=f0(),tI=d0(),nI=Di(),oI=String.fromCharCode,iI=Array.isArray;function Bn(e){return e!==e}function sI(e){var r={};return r.specifier=e.specifier,r.precision=e.precision===void 0?1:e.precision,r.width=e.width,r.flags=e.flags||"",r.mapping=e.mapping,r}function aI(e){var r,t,n,i,s,l,u,o,a,c;if(!iI(e))throw new TypeError("invalid argument. First argument must be an array. Value: `"+e+"`.");for(l="",u=1,a=0;a<e.length;a++)if(n=e[a],jA(n))l+=n;else{if(r=n.precision!==void 0,n=sI(n),!n.specifier)throw new TypeError("invalid argument. Token is missing `specifier` property. Index: `"+a+"`. Value: `"+n+"`.");for(n.mapping&&(u=n.mapping),t=n.flags,c=0;c<t.length;c++)switch(i=t.charAt(c),i){case" ":n.sign=" ";break;case"+":n.sign="+";break;case"-":n.padRight=!0,n.padZeros=!1;break;case"0":n.padZeros=t.indexOf("-")<0;break;case"#":n.alternate=!0;break;default:throw new Error("invalid flag: "+i)}if(n.width==="*"){if(n.width=parseInt(arguments[u],10),u+=1,Bn(n.width))throw new TypeError("the argument for * width at position "+u+" is not a number. Value: `"+n.width+"`.");n.width<0&&(n.padRight=!0,n.width=-n.width)}if(r&&n.precision==="*"){if(n.precision=parseInt(arguments[u],10),u+=1,Bn(n.precision))throw new TypeError("the argument for * precision at position "+u+" is not a number. Value: `"+n.precision+"`.");n.precision<0&&(n.precision=1,r=!1)}switch(n.arg=arguments[u],n.specifier){case"b":case"o":case"x":case"X":case"d":case"i":case"u":r&&(n.padZeros=!1),n.arg=YA(n);break;case"s":n.maxWidth=r?n.precision:-1,n.arg=String(n.arg);break;case"c":if(!Bn(n.arg)){if(s=parseInt(n.arg,10),s<0||s>127)throw new Error("invalid character code. Value: "+n.arg);n.arg=Bn(s)?String(n.arg):oI(s)}break;case"e":case"E":case"f":case"F":case"g":case"G":if(r||(n.precision=6),o=parseFloat(n.arg),!isFinite(o)){if(!eI(n.arg))throw new Error("invalid floating-point number. Value: "+l);o=n.arg,n.padZeros=!1}n.arg=rI(o,n);break;default:throw new Error("invalid specifier: "+n.specifier)}n.maxWidth>=0&&n.arg.length>n.maxWidth&&(n.arg=n.arg.substring(0,n.maxWidth)),n.padZeros?n.arg=nI(n.arg,n.width||n.precision,n.padRight):n.width&&(n.arg=tI(n.arg,n.width,n.padRight)),l+=n.arg||"",u+=1}return l}v0.exports=aI});var y0=h((eQ,g0)=>{"use strict";var uI=h0();g0.exports=uI});var _0=h((rQ,b0)=>{"use strict";var Un=/%(?:([1-9]\d*)\$)?([0 +\-#]*)(\*|\d+)?(?:(\.)(\*|\d+)?)?[hlL]?([%A-Za-z])/g;function cI(e){var r={mapping:e[1]?parseInt(e[1],10):void 0,flags:e[2],width:e[3],precision:e[5],specifier:e[6]};return e[4]==="."&&e[5]===void 0&&(r.precision="1"),r}function lI(e){var r,t,n,i;for(t=[],i=0,n=Un.exec(e);n;)r=e.slice(i,Un.lastIndex-n[0].length),r.length&&t.push(r),n[6]==="%"?t.push("%"):t.push(cI(n)),i=Un.lastIndex,n=Un.exec(e);return r=e.slice(i),r.length&&t.push(r),t}b0.exports=lI});var q0=h((tQ,w0)=>{"use strict";var fI=_0();w0.exports=fI});var A0=h((nQ,P0)=>{"use strict";function mI(e){return typeof e=="string"}P0.exports=mI});var O0=h((oQ,E0)=>{"use strict";var pI=y0(),dI=q0(),vI=A0();function I0(e){var r,t;if(!vI(e))throw new TypeError(I0("invalid argument. First argument must be a string. Value: `%s`.",e));for(r=[dI(e)],t=1;t<arguments.length;t++)r.push(arguments[t]);return pI.apply(null,r)}E0.exports=I0});var k0=h((iQ,N0)=>{"use strict";var hI=O0();N0.exports=hI});var F0=h((sQ,z0)=>{"use strict";var T0=k0(),ft=Object.prototype,S0=ft.toString,$0=ft.__defineGetter__,L0=ft.__defineSetter__,gI=ft.__lookupGetter__,yI=ft.__lookupSetter__;function bI(e,r,t){var n,i,s,l;if(typeof e!="object"||e===null||S0.call(e)==="[object Array]")throw new TypeError(T0("invalid argument. First argument must be an object. Value: `%s`.",e));if(typeof t!="object"||t===null||S0.call(t)==="[object Array]")throw new TypeError(T0("invalid argument. Property descriptor must be an object. Value: `%s`.",t));if(i="value"in t,i&&(gI.call(e,r)||yI.call(e,r)?(n=e.__proto__,e.__proto__=ft,delete e[r],e[r]=t.value,e.__proto__=n):e[r]=t.value),s="get"in t,l="set"in t,i&&(s||l))throw new Error("invalid argument. Cannot specify one or more accessors and a value or writable attribute in the property descriptor.");return s&&$0&&$0.call(e,r,t.get),l&&L0&&L0.call(e,r,t.set),e}z0.exports=bI});var R0=h((aQ,x0)=>{"use strict";var _I=Qc(),wI=jc(),qI=F0(),Mi;_I()?Mi=wI:Mi=qI;x0.exports=Mi});var Z0=h((uQ,C0)=>{"use strict";var PI=R0();function AI(e,r,t){PI(e,r,{configurable:!1,enumerable:!1,writable:!1,value:t})}C0.exports=AI});var qe=h((cQ,D0)=>{"use strict";var II=Z0();D0.exports=II});var B0=h((lQ,M0)=>{"use strict";function EI(e){return e!==e}M0.exports=EI});var S=h((fQ,U0)=>{"use strict";var OI=B0();U0.exports=OI});var V0=h((mQ,H0)=>{"use strict";function NI(){return typeof Symbol=="function"&&typeof Symbol("foo")=="symbol"}H0.exports=NI});var W0=h((pQ,G0)=>{"use strict";var kI=V0();G0.exports=kI});var J0=h((dQ,K0)=>{"use strict";var TI=W0(),SI=TI();function $I(){return SI&&typeof Symbol.toStringTag=="symbol"}K0.exports=$I});var Q0=h((vQ,X0)=>{"use strict";var LI=J0();X0.exports=LI});var Bi=h((hQ,Y0)=>{"use strict";var zI=Object.prototype.toString;Y0.exports=zI});var el=h((gQ,j0)=>{"use strict";var FI=Bi();function xI(e){return FI.call(e)}j0.exports=xI});var tl=h((yQ,rl)=>{"use strict";var RI=Object.prototype.hasOwnProperty;function CI(e,r){return e==null?!1:RI.call(e,r)}rl.exports=CI});var ol=h((bQ,nl)=>{"use strict";var ZI=tl();nl.exports=ZI});var sl=h((_Q,il)=>{"use strict";var DI=typeof Symbol=="function"?Symbol:void 0;il.exports=DI});var ul=h((wQ,al)=>{"use strict";var MI=sl();al.exports=MI});var fl=h((qQ,ll)=>{"use strict";var cl=ul(),BI=typeof cl=="function"?cl.toStringTag:"";ll.exports=BI});var pl=h((PQ,ml)=>{"use strict";var UI=ol(),Zt=fl(),Ui=Bi();function HI(e){var r,t,n;if(e==null)return Ui.call(e);t=e[Zt],r=UI(e,Zt);try{e[Zt]=void 0}catch{return Ui.call(e)}return n=Ui.call(e),r?e[Zt]=t:delete e[Zt],n}ml.exports=HI});var Dt=h((AQ,dl)=>{"use strict";var VI=Q0(),GI=el(),WI=pl(),Hi;VI()?Hi=WI:Hi=GI;dl.exports=Hi});var hl=h((IQ,vl)=>{"use strict";var KI=Dt(),JI=typeof Uint32Array=="function";function XI(e){return JI&&e instanceof Uint32Array||KI(e)==="[object Uint32Array]"}vl.exports=XI});var yl=h((EQ,gl)=>{"use strict";var QI=hl();gl.exports=QI});var _l=h((OQ,bl)=>{"use strict";var YI=4294967295;bl.exports=YI});var ql=h((NQ,wl)=>{"use strict";var jI=typeof Uint32Array=="function"?Uint32Array:null;wl.exports=jI});var Il=h((kQ,Al)=>{"use strict";var eE=yl(),Vi=_l(),Pl=ql();function rE(){var e,r;if(typeof Pl!="function")return!1;try{r=[1,3.14,-3.14,Vi+1,Vi+2],r=new Pl(r),e=eE(r)&&r[0]===1&&r[1]===3&&r[2]===Vi-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}Al.exports=rE});var Ol=h((TQ,El)=>{"use strict";var tE=Il();El.exports=tE});var kl=h((SQ,Nl)=>{"use strict";var nE=typeof Uint32Array=="function"?Uint32Array:void 0;Nl.exports=nE});var Sl=h(($Q,Tl)=>{"use strict";function oE(){throw new Error("not implemented")}Tl.exports=oE});var Hr=h((LQ,$l)=>{"use strict";var iE=Ol(),sE=kl(),aE=Sl(),Gi;iE()?Gi=sE:Gi=aE;$l.exports=Gi});var zl=h((zQ,Ll)=>{"use strict";var uE=Dt(),cE=typeof Float64Array=="function";function lE(e){return cE&&e instanceof Float64Array||uE(e)==="[object Float64Array]"}Ll.exports=lE});var xl=h((FQ,Fl)=>{"use strict";var fE=zl();Fl.exports=fE});var Cl=h((xQ,Rl)=>{"use strict";var mE=typeof Float64Array=="function"?Float64Array:null;Rl.exports=mE});var Ml=h((RQ,Dl)=>{"use strict";var pE=xl(),Zl=Cl();function dE(){var e,r;if(typeof Zl!="function")return!1;try{r=new Zl([1,3.14,-3.14,NaN]),e=pE(r)&&r[0]===1&&r[1]===3.14&&r[2]===-3.14&&r[3]!==r[3]}catch{e=!1}return e}Dl.exports=dE});var Ul=h((CQ,Bl)=>{"use strict";var vE=Ml();Bl.exports=vE});var Vl=h((ZQ,Hl)=>{"use strict";var hE=typeof Float64Array=="function"?Float64Array:void 0;Hl.exports=hE});var Wl=h((DQ,Gl)=>{"use strict";function gE(){throw new Error("not implemented")}Gl.exports=gE});var Vr=h((MQ,Kl)=>{"use strict";var yE=Ul(),bE=Vl(),_E=Wl(),Wi;yE()?Wi=bE:Wi=_E;Kl.exports=Wi});var Xl=h((BQ,Jl)=>{"use strict";var wE=Dt(),qE=typeof Uint8Array=="function";function PE(e){return qE&&e instanceof Uint8Array||wE(e)==="[object Uint8Array]"}Jl.exports=PE});var Yl=h((UQ,Ql)=>{"use strict";var AE=Xl();Ql.exports=AE});var ef=h((HQ,jl)=>{"use strict";var IE=255;jl.exports=IE});var tf=h((VQ,rf)=>{"use strict";var EE=typeof Uint8Array=="function"?Uint8Array:null;rf.exports=EE});var sf=h((GQ,of)=>{"use strict";var OE=Yl(),Ki=ef(),nf=tf();function NE(){var e,r;if(typeof nf!="function")return!1;try{r=[1,3.14,-3.14,Ki+1,Ki+2],r=new nf(r),e=OE(r)&&r[0]===1&&r[1]===3&&r[2]===Ki-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}of.exports=NE});var uf=h((WQ,af)=>{"use strict";var kE=sf();af.exports=kE});var lf=h((KQ,cf)=>{"use strict";var TE=typeof Uint8Array=="function"?Uint8Array:void 0;cf.exports=TE});var mf=h((JQ,ff)=>{"use strict";function SE(){throw new Error("not implemented")}ff.exports=SE});var df=h((XQ,pf)=>{"use strict";var $E=uf(),LE=lf(),zE=mf(),Ji;$E()?Ji=LE:Ji=zE;pf.exports=Ji});var hf=h((QQ,vf)=>{"use strict";var FE=Dt(),xE=typeof Uint16Array=="function";function RE(e){return xE&&e instanceof Uint16Array||FE(e)==="[object Uint16Array]"}vf.exports=RE});var yf=h((YQ,gf)=>{"use strict";var CE=hf();gf.exports=CE});var _f=h((jQ,bf)=>{"use strict";var ZE=65535;bf.exports=ZE});var qf=h((eY,wf)=>{"use strict";var DE=typeof Uint16Array=="function"?Uint16Array:null;wf.exports=DE});var If=h((rY,Af)=>{"use strict";var ME=yf(),Xi=_f(),Pf=qf();function BE(){var e,r;if(typeof Pf!="function")return!1;try{r=[1,3.14,-3.14,Xi+1,Xi+2],r=new Pf(r),e=ME(r)&&r[0]===1&&r[1]===3&&r[2]===Xi-2&&r[3]===0&&r[4]===1}catch{e=!1}return e}Af.exports=BE});var Of=h((tY,Ef)=>{"use strict";var UE=If();Ef.exports=UE});var kf=h((nY,Nf)=>{"use strict";var HE=typeof Uint16Array=="function"?Uint16Array:void 0;Nf.exports=HE});var Sf=h((oY,Tf)=>{"use strict";function VE(){throw new Error("not implemented")}Tf.exports=VE});var Lf=h((iY,$f)=>{"use strict";var GE=Of(),WE=kf(),KE=Sf(),Qi;GE()?Qi=WE:Qi=KE;$f.exports=Qi});var Ff=h((sY,zf)=>{"use strict";var JE=df(),XE=Lf(),QE={uint16:XE,uint8:JE};zf.exports=QE});var Zf=h((aY,Cf)=>{"use strict";var xf=Ff(),Rf;function YE(){var e,r;return e=new xf.uint16(1),e[0]=4660,r=new xf.uint8(e.buffer),r[0]===52}Rf=YE();Cf.exports=Rf});var Gr=h((uY,Df)=>{"use strict";var jE=Zf();Df.exports=jE});var Bf=h((cY,Mf)=>{"use strict";var eO=Gr(),Yi;eO===!0?Yi=1:Yi=0;Mf.exports=Yi});var Vf=h((lY,Hf)=>{"use strict";var rO=Hr(),tO=Vr(),nO=Bf(),Uf=new tO(1),oO=new rO(Uf.buffer);function iO(e){return Uf[0]=e,oO[nO]}Hf.exports=iO});var Pe=h((fY,Gf)=>{"use strict";var sO=Vf();Gf.exports=sO});var Kf=h((mY,Wf)=>{"use strict";var aO=Gr(),ji;aO===!0?ji=1:ji=0;Wf.exports=ji});var Xf=h((pY,Jf)=>{"use strict";var uO=Hr(),cO=Vr(),lO=Kf(),es=new cO(1),fO=new uO(es.buffer);function mO(e,r){return es[0]=e,fO[lO]=r>>>0,es[0]}Jf.exports=mO});var mt=h((dY,Qf)=>{"use strict";var pO=Xf();Qf.exports=pO});var em=h((vY,jf)=>{"use strict";var dO=Gr(),Yf,rs,ts;dO===!0?(rs=1,ts=0):(rs=0,ts=1);Yf={HIGH:rs,LOW:ts};jf.exports=Yf});var im=h((hY,om)=>{"use strict";var vO=Hr(),hO=Vr(),tm=em(),nm=new hO(1),rm=new vO(nm.buffer),gO=tm.HIGH,yO=tm.LOW;function bO(e,r){return rm[gO]=e,rm[yO]=r,nm[0]}om.exports=bO});var Mt=h((gY,sm)=>{"use strict";var _O=im();sm.exports=_O});var B=h((yY,am)=>{"use strict";var wO=Number.POSITIVE_INFINITY;am.exports=wO});var cm=h((bY,um)=>{"use strict";um.exports=Number});var fm=h((_Y,lm)=>{"use strict";var qO=cm();lm.exports=qO});var te=h((wY,mm)=>{"use strict";var PO=fm(),AO=PO.NEGATIVE_INFINITY;mm.exports=AO});var br=h((qY,pm)=>{"use strict";var IO=1023;pm.exports=IO});var vm=h((PY,dm)=>{"use strict";var EO=.34657359027997264;dm.exports=EO});var gm=h((AY,hm)=>{"use strict";function OO(e){return e===0?-.03333333333333313:-.03333333333333313+e*(.0015873015872548146+e*(-793650757867488e-19+e*(4008217827329362e-21+e*-20109921818362437e-23)))}hm.exports=OO});var Pm=h((IY,qm)=>{"use strict";var NO=S(),ym=Pe(),ns=mt(),kO=Mt(),bm=B(),TO=te(),_m=br(),SO=vm(),$O=gm(),LO=709.782712893384,os=.6931471803691238,is=19082149292705877e-26,wm=1.4426950408889634,zO=38.816242111356935,FO=1.0397207708399179;function xO(e){var r,t,n,i,s,l,u,o,a,c,f,m,p;if(e===bm||NO(e))return e;if(e===TO)return-1;if(e===0)return e;if(e<0?(n=!0,o=-e):(n=!1,o=e),o>=zO){if(n)return-1;if(o>=LO)return bm}if(l=ym(o)|0,o>SO)o<FO?n?(i=e+os,s=-is,p=-1):(i=e-os,s=is,p=1):(n?p=wm*e-.5:p=wm*e+.5,p|=0,f=p,i=e-f*os,s=f*is),e=i-s,c=i-e-s;else{if(l<1016070144)return e;p=0}return r=.5*e,a=e*r,u=1+a*$O(a),f=3-u*r,m=a*((u-f)/(6-e*f)),p===0?e-(e*m-a):(t=kO(_m+p<<20,0),m=e*(m-c)-c,m-=a,p===-1?.5*(e-m)-.5:p===1?e<-.25?-2*(m-(e+.5)):1+2*(e-m):p<=-2||p>56?(o=1-(m-e),p===1024?(i=ym(o)+(p<<20)|0,o=ns(o,i)):o*=t,o-1):(f=1,p<20?(i=1072693248-(2097152>>p)|0,f=ns(f,i),o=f-(m-e)):(i=_m-p<<20|0,f=ns(f,i),o=e-(m+f),o+=1),o*=t,o))}qm.exports=xO});var Wr=h((EY,Am)=>{"use strict";var RO=Pm();Am.exports=RO});var Em=h((OY,Im)=>{"use strict";var CO=Math.floor;Im.exports=CO});var Oe=h((NY,Om)=>{"use strict";var ZO=Em();Om.exports=ZO});var km=h((kY,Nm)=>{"use strict";function DO(e){return e===0?.6666666666666735:.6666666666666735+e*(.3999999999940942+e*(.2857142874366239+e*(.22222198432149784+e*(.1818357216161805+e*(.15313837699209373+e*.14798198605116586)))))}Nm.exports=DO});var zm=h((TY,Lm)=>{"use strict";var MO=S(),Tm=Pe(),Sm=mt(),BO=B(),UO=te(),$m=br(),HO=km(),ss=.6931471803691238,as=19082149292705877e-26,VO=.41421356237309503,GO=-.2928932188134525,WO=1862645149230957e-24,KO=5551115123125783e-32,JO=9007199254740992,XO=.6666666666666666;function QO(e){var r,t,n,i,s,l,u,o,a,c;if(e<-1||MO(e))return NaN;if(e===-1)return UO;if(e===BO||e===0)return e;if(e<0?n=-e:n=e,c=1,n<VO){if(n<WO)return n<KO?e:e-e*e*.5;e>GO&&(c=0,i=e,t=1)}return c!==0&&(n<JO?(a=1+e,t=Tm(a),c=(t>>20)-$m,c>0?s=1-(a-e):s=e-(a-1),s/=a):(a=e,t=Tm(a),c=(t>>20)-$m,s=0),t&=1048575,t<434334?a=Sm(a,t|1072693248):(c+=1,a=Sm(a,t|1071644672),t=1048576-t>>2),i=a-1),r=.5*i*i,t===0?i===0?(s+=c*as,c*ss+s):(o=r*(1-XO*i),c*ss-(o-(c*as+s)-i)):(l=i/(2+i),u=l*l,o=u*HO(u),c===0?i-(r-l*(r+o)):c*ss-(r-(l*(r+o)+(c*as+s))-i))}Lm.exports=QO});var ve=h((SY,Fm)=>{"use strict";var YO=zm();Fm.exports=YO});var Rm=h(($Y,xm)=>{"use strict";var jO=Math.sqrt;xm.exports=jO});var W=h((LY,Cm)=>{"use strict";var eN=Rm();Cm.exports=eN});var us=h((zY,Zm)=>{"use strict";var rN=.7853981633974483;Zm.exports=rN});var Mm=h((FY,Dm)=>{"use strict";function tN(e){var r,t,n;return e===0?.16666666666666713:(e<0?r=-e:r=e,r<=1?(t=-8.198089802484825+e*(19.562619833175948+e*(-16.262479672107002+e*(5.444622390564711+e*(-.6019598008014124+e*.004253011369004428)))),n=-49.18853881490881+e*(139.51056146574857+e*(-147.1791292232726+e*(70.49610280856842+e*(-14.740913729888538+e*1))))):(e=1/e,t=.004253011369004428+e*(-.6019598008014124+e*(5.444622390564711+e*(-16.262479672107002+e*(19.562619833175948+e*-8.198089802484825)))),n=1+e*(-14.740913729888538+e*(70.49610280856842+e*(-147.1791292232726+e*(139.51056146574857+e*-49.18853881490881))))),t/n)}Dm.exports=tN});var Um=h((xY,Bm)=>{"use strict";function nN(e){var r,t,n;return e===0?.08333333333333809:(e<0?r=-e:r=e,r<=1?(t=28.536655482610616+e*(-25.56901049652825+e*(6.968710824104713+e*(-.5634242780008963+e*.002967721961301243))),n=342.43986579130785+e*(-383.8770957603691+e*(147.0656354026815+e*(-21.947795316429207+e*1)))):(e=1/e,t=.002967721961301243+e*(-.5634242780008963+e*(6.968710824104713+e*(-25.56901049652825+e*28.536655482610616))),n=1+e*(-21.947795316429207+e*(147.0656354026815+e*(-383.8770957603691+e*342.43986579130785)))),t/n)}Bm.exports=nN});var Gm=h((RY,Vm)=>{"use strict";var oN=S(),iN=W(),Hm=us(),sN=Mm(),aN=Um(),uN=6123233995736766e-32;function cN(e){var r,t,n,i,s;if(oN(e))return NaN;if(e>0?n=e:(r=!0,n=-e),n>1)return NaN;if(n>.625)t=1-n,i=t*aN(t),t=iN(t+t),s=Hm-t,t=t*i-uN,s-=t,s+=Hm;else{if(n<1e-8)return e;t=n*n,s=t*sN(t),s=n*s+n}return r?-s:s}Vm.exports=cN});var Hn=h((CY,Wm)=>{"use strict";var lN=Gm();Wm.exports=lN});var Jm=h((ZY,Km)=>{"use strict";function fN(e){return Math.abs(e)}Km.exports=fN});var R=h((DY,Xm)=>{"use strict";var mN=Jm();Xm.exports=mN});var Ym=h((MY,Qm)=>{"use strict";var pN=Math.ceil;Qm.exports=pN});var ep=h((BY,jm)=>{"use strict";var dN=Ym();jm.exports=dN});var tp=h((UY,rp)=>{"use strict";var vN=Oe(),hN=ep();function gN(e){return e<0?hN(e):vN(e)}rp.exports=gN});var Vn=h((HY,np)=>{"use strict";var yN=tp();np.exports=yN});var ip=h((VY,op)=>{"use strict";var bN=1023;op.exports=bN});var ap=h((GY,sp)=>{"use strict";var _N=-1023;sp.exports=_N});var cp=h((WY,up)=>{"use strict";var wN=-1074;up.exports=wN});var fp=h((KY,lp)=>{"use strict";var qN=B(),PN=te();function AN(e){return e===qN||e===PN}lp.exports=AN});var Kr=h((JY,mp)=>{"use strict";var IN=fp();mp.exports=IN});var dp=h((XY,pp)=>{"use strict";var EN=2147483648;pp.exports=EN});var _r=h((QY,vp)=>{"use strict";var ON=2147483647;vp.exports=ON});var yp=h((YY,gp)=>{"use strict";var NN=Gr(),hp,cs,ls;NN===!0?(cs=1,ls=0):(cs=0,ls=1);hp={HIGH:cs,LOW:ls};gp.exports=hp});var fs=h((jY,qp)=>{"use strict";var kN=Hr(),TN=Vr(),_p=yp(),wp=new TN(1),bp=new kN(wp.buffer),SN=_p.HIGH,$N=_p.LOW;function LN(e,r,t,n){return wp[0]=e,r[n]=bp[SN],r[n+t]=bp[$N],r}qp.exports=LN});var Ap=h((ej,Pp)=>{"use strict";var zN=fs();function FN(e){return zN(e,[0,0],1,0)}Pp.exports=FN});var Gn=h((rj,Ep)=>{"use strict";var xN=qe(),Ip=Ap(),RN=fs();xN(Ip,"assign",RN);Ep.exports=Ip});var Np=h((tj,Op)=>{"use strict";var CN=dp(),ZN=_r(),DN=Gn(),MN=Pe(),BN=Mt(),ms=[0,0];function UN(e,r){var t,n;return DN.assign(e,ms,1,0),t=ms[0],t&=ZN,n=MN(r),n&=CN,t|=n,BN(t,ms[1])}Op.exports=UN});var Wn=h((nj,kp)=>{"use strict";var HN=Np();kp.exports=HN});var wr=h((oj,Tp)=>{"use strict";var VN=22250738585072014e-324;Tp.exports=VN});var ps=h((ij,Sp)=>{"use strict";var GN=wr(),WN=Kr(),KN=S(),JN=R(),XN=4503599627370496;function QN(e,r,t,n){return KN(e)||WN(e)?(r[n]=e,r[n+t]=0,r):e!==0&&JN(e)<GN?(r[n]=e*XN,r[n+t]=-52,r):(r[n]=e,r[n+t]=0,r)}Sp.exports=QN});var Lp=h((sj,$p)=>{"use strict";var YN=ps();function jN(e){return YN(e,[0,0],1,0)}$p.exports=jN});var xp=h((aj,Fp)=>{"use strict";var ek=qe(),zp=Lp(),rk=ps();ek(zp,"assign",rk);Fp.exports=zp});var Bt=h((uj,Rp)=>{"use strict";var tk=2146435072;Rp.exports=tk});var Zp=h((cj,Cp)=>{"use strict";var nk=Pe(),ok=Bt(),ik=br();function sk(e){var r=nk(e);return r=(r&ok)>>>20,r-ik|0}Cp.exports=sk});var Mp=h((lj,Dp)=>{"use strict";var ak=Zp();Dp.exports=ak});var Up=h((fj,Bp)=>{"use strict";var uk=B(),ck=te(),lk=br(),fk=ip(),mk=ap(),pk=cp(),dk=S(),vk=Kr(),hk=Wn(),gk=xp().assign,yk=Mp(),bk=Gn(),_k=Mt(),wk=2220446049250313e-31,qk=2148532223,ds=[0,0],vs=[0,0];function Pk(e,r){var t,n;return r===0||e===0||dk(e)||vk(e)?e:(gk(e,ds,1,0),e=ds[0],r+=ds[1],r+=yk(e),r<pk?hk(0,e):r>fk?e<0?ck:uk:(r<=mk?(r+=52,n=wk):n=1,bk.assign(e,vs,1,0),t=vs[0],t&=qk,t|=r+lk<<20,n*_k(t,vs[1])))}Bp.exports=Pk});var Jr=h((mj,Hp)=>{"use strict";var Ak=Up();Hp.exports=Ak});var Gp=h((pj,Vp)=>{"use strict";function Ik(e){return e===0?.16666666666666602:.16666666666666602+e*(-.0027777777777015593+e*(6613756321437934e-20+e*(-16533902205465252e-22+e*41381367970572385e-24)))}Vp.exports=Ik});var Kp=h((dj,Wp)=>{"use strict";var Ek=Jr(),Ok=Gp();function Nk(e,r,t){var n,i,s,l;return n=e-r,i=n*n,s=n-i*Ok(i),l=1-(r-n*s/(2-s)-e),Ek(l,t)}Wp.exports=Nk});var e1=h((vj,jp)=>{"use strict";var kk=S(),Jp=Vn(),Tk=te(),Xp=B(),Sk=Kp(),$k=.6931471803691238,Lk=19082149292705877e-26,Qp=1.4426950408889634,zk=709.782712893384,Fk=-745.1332191019411,Yp=1/(1<<28),xk=-Yp;function Rk(e){var r,t,n;return kk(e)||e===Xp?e:e===Tk?0:e>zk?Xp:e<Fk?0:e>xk&&e<Yp?1+e:(e<0?n=Jp(Qp*e-.5):n=Jp(Qp*e+.5),r=e-n*$k,t=n*Lk,Sk(r,t,n))}jp.exports=Rk});var V=h((hj,r1)=>{"use strict";var Ck=e1();r1.exports=Ck});var n1=h((gj,t1)=>{"use strict";var Zk=Oe();function Dk(e){return Zk(e)===e}t1.exports=Dk});var qr=h((yj,o1)=>{"use strict";var Mk=n1();o1.exports=Mk});var s1=h((bj,i1)=>{"use strict";var Bk=qr();function Uk(e){return Bk(e/2)}i1.exports=Uk});var u1=h((_j,a1)=>{"use strict";var Hk=s1();a1.exports=Hk});var f1=h((wj,l1)=>{"use strict";var c1=u1();function Vk(e){return e>0?c1(e-1):c1(e+1)}l1.exports=Vk});var Kn=h((qj,m1)=>{"use strict";var Gk=f1();m1.exports=Gk});var d1=h((Pj,p1)=>{"use strict";var Wk=Gr(),hs;Wk===!0?hs=0:hs=1;p1.exports=hs});var h1=h((Aj,v1)=>{"use strict";var Kk=Hr(),Jk=Vr(),Xk=d1(),gs=new Jk(1),Qk=new Kk(gs.buffer);function Yk(e,r){return gs[0]=e,Qk[Xk]=r>>>0,gs[0]}v1.exports=Yk});var pt=h((Ij,g1)=>{"use strict";var jk=h1();g1.exports=jk});var b1=h((Ej,y1)=>{"use strict";function eT(e){return e|0}y1.exports=eT});var ys=h((Oj,_1)=>{"use strict";var rT=b1();_1.exports=rT});var P1=h((Nj,q1)=>{"use strict";var w1=Kn(),tT=Wn(),nT=te(),Jn=B();function oT(e,r){return r===nT?Jn:r===Jn?0:r>0?w1(r)?e:0:w1(r)?tT(Jn,e):Jn}q1.exports=oT});var I1=h((kj,A1)=>{"use strict";var iT=_r(),sT=Pe(),aT=1072693247,Xn=1e300,Qn=1e-300;function uT(e,r){var t,n;return n=sT(e),t=n&iT,t<=aT?r<0?Xn*Xn:Qn*Qn:r>0?Xn*Xn:Qn*Qn}A1.exports=uT});var N1=h((Tj,O1)=>{"use strict";var cT=R(),E1=B();function lT(e,r){return e===-1?(e-e)/(e-e):e===1?1:cT(e)<1==(r===E1)?0:E1}O1.exports=lT});var bs=h((Sj,k1)=>{"use strict";var fT=20;k1.exports=fT});var S1=h(($j,T1)=>{"use strict";function mT(e){return e===0?.5999999999999946:.5999999999999946+e*(.4285714285785502+e*(.33333332981837743+e*(.272728123808534+e*(.23066074577556175+e*.20697501780033842))))}T1.exports=mT});var F1=h((Lj,z1)=>{"use strict";var pT=Pe(),Yn=pt(),$1=mt(),dT=br(),vT=bs(),hT=S1(),gT=1048575,L1=1048576,yT=1072693248,bT=536870912,_T=524288,wT=9007199254740992,qT=.9617966939259756,PT=.9617967009544373,AT=-7028461650952758e-24,IT=[1,1.5],ET=[0,.5849624872207642],OT=[0,1350039202129749e-23];function NT(e,r,t){var n,i,s,l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P,A,N;return P=0,t<L1&&(r*=wT,P-=53,t=pT(r)),P+=(t>>vT)-dT|0,A=t&gT|0,t=A|yT|0,A<=235662?N=0:A<767610?N=1:(N=0,P+=1,t-=L1),r=$1(r,t),c=IT[N],w=r-c,q=1/(r+c),i=w*q,l=Yn(i,0),n=(t>>1|bT)+_T,n+=N<<18,o=$1(0,n),a=r-(o-c),u=q*(w-l*o-l*a),s=i*i,_=s*s*hT(s),_+=u*(l+i),s=l*l,o=3+s+_,o=Yn(o,0),a=_-(o-3-s),w=l*o,q=u*o+a*i,m=w+q,m=Yn(m,0),p=q-(m-w),d=PT*m,g=AT*m+p*qT+OT[N],f=ET[N],b=P,y=d+g+f+b,y=Yn(y,0),v=g-(y-b-f-d),e[0]=y,e[1]=v,e}z1.exports=NT});var R1=h((zj,x1)=>{"use strict";function kT(e){return e===0?.5:.5+e*(-.3333333333333333+e*.25)}x1.exports=kT});var Z1=h((Fj,C1)=>{"use strict";var TT=pt(),ST=R1(),$T=1.4426950408889634,LT=1.4426950216293335,zT=19259629911266175e-24;function FT(e,r){var t,n,i,s,l,u;return i=r-1,s=i*i*ST(i),l=LT*i,u=i*zT-s*$T,n=l+u,n=TT(n,0),t=u-(n-l),e[0]=n,e[1]=t,e}C1.exports=FT});var M1=h((xj,D1)=>{"use strict";var xT=.6931471805599453;D1.exports=xT});var _s=h((Rj,B1)=>{"use strict";var RT=1048575;B1.exports=RT});var H1=h((Cj,U1)=>{"use strict";function CT(e){return e===0?.16666666666666602:.16666666666666602+e*(-.0027777777777015593+e*(6613756321437934e-20+e*(-16533902205465252e-22+e*41381367970572385e-24)))}U1.exports=CT});var Q1=h((Zj,X1)=>{"use strict";var ZT=Pe(),V1=mt(),DT=pt(),MT=ys(),BT=Jr(),UT=M1(),G1=br(),W1=_r(),K1=_s(),Ut=bs(),HT=H1(),J1=1048576,VT=1071644672,GT=.6931471824645996,WT=-1904654299957768e-24;function KT(e,r,t){var n,i,s,l,u,o,a,c,f,m,p;return m=e&W1|0,p=(m>>Ut)-G1|0,f=0,m>VT&&(f=e+(J1>>p+1)>>>0,p=((f&W1)>>Ut)-G1|0,n=(f&~(K1>>p))>>>0,s=V1(0,n),f=(f&K1|J1)>>Ut-p>>>0,e<0&&(f=-f),r-=s),s=t+r,s=DT(s,0),u=s*GT,o=(t-(s-r))*UT+s*WT,c=u+o,a=o-(c-u),s=c*c,i=c-s*HT(s),l=c*i/(i-2)-(a+c*a),c=1-(l-c),e=ZT(c),e=MT(e),e+=f<<Ut>>>0,e>>Ut<=0?c=BT(c,f):c=V1(c,e),c}X1.exports=KT});var ud=h((Dj,ad)=>{"use strict";var Y1=S(),j1=Kn(),ed=Kr(),JT=qr(),rd=W(),XT=R(),ws=Gn(),QT=pt(),td=ys(),YT=te(),jT=B(),qs=_r(),eS=P1(),rS=I1(),tS=N1(),nS=F1(),oS=Z1(),iS=Q1(),sS=1072693247,aS=1105199104,uS=1139802112,nd=1083179008,cS=1072693248,lS=1083231232,fS=3230714880,od=31,Pr=1e300,Ar=1e-300,mS=8008566259537294e-32,ir=[0,0],id=[0,0];function sd(e,r){var t,n,i,s,l,u,o,a,c,f,m,p,d,g,y,v;if(Y1(e)||Y1(r))return NaN;if(ws.assign(r,ir,1,0),u=ir[0],o=ir[1],o===0){if(r===0)return 1;if(r===1)return e;if(r===-1)return 1/e;if(r===.5)return rd(e);if(r===-.5)return 1/rd(e);if(r===2)return e*e;if(r===3)return e*e*e;if(r===4)return e*=e,e*e;if(ed(r))return tS(e,r)}if(ws.assign(e,ir,1,0),s=ir[0],l=ir[1],l===0){if(s===0)return eS(e,r);if(e===1)return 1;if(e===-1&&j1(r))return-1;if(ed(e))return e===YT?sd(-0,-r):r<0?0:jT}if(e<0&&JT(r)===!1)return(e-e)/(e-e);if(i=XT(e),t=s&qs|0,n=u&qs|0,a=s>>>od|0,c=u>>>od|0,a&&j1(r)?a=-1:a=1,n>aS){if(n>uS)return rS(e,r);if(t<sS)return c===1?a*Pr*Pr:a*Ar*Ar;if(t>cS)return c===0?a*Pr*Pr:a*Ar*Ar;d=oS(id,i)}else d=nS(id,i,t);if(f=QT(r,0),p=(r-f)*d[0]+r*d[1],m=f*d[0],g=p+m,ws.assign(g,ir,1,0),y=td(ir[0]),v=td(ir[1]),y>=nd){if((y-nd|v)!==0||p+mS>g-m)return a*Pr*Pr}else if((y&qs)>=lS&&((y-fS|v)!==0||p<=g-m))return a*Ar*Ar;return g=iS(y,m,p),a*g}ad.exports=sd});var Q=h((Mj,cd)=>{"use strict";var pS=ud();cd.exports=pS});var Ir=h((Bj,ld)=>{"use strict";var dS=2.718281828459045;ld.exports=dS});var Re=h((Uj,fd)=>{"use strict";var vS=2220446049250313e-31;fd.exports=vS});var pd=h((Hj,md)=>{"use strict";function hS(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=709811.662581658+e*(679979.8474157227+e*(293136.7857211597+e*(74887.54032914672+e*(12555.290582413863+e*(1443.4299244417066+e*(115.24194596137347+e*(6.309239205732627+e*(.22668404630224365+e*(.004826466289237662+e*4624429436045379e-20))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=4624429436045379e-20+e*(.004826466289237662+e*(.22668404630224365+e*(6.309239205732627+e*(115.24194596137347+e*(1443.4299244417066+e*(12555.290582413863+e*(74887.54032914672+e*(293136.7857211597+e*(679979.8474157227+e*709811.662581658))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}md.exports=hS});var hd=h((Vj,vd)=>{"use strict";var dd=S(),gS=ve(),yS=W(),bS=R(),_S=V(),Ps=Q(),wS=Ir(),As=Re(),Is=pd(),Es=10.900511;function qS(e,r){var t,n,i,s,l,u,o;return dd(e)||dd(r)?NaN:e<0||r<0?NaN:r===1?1/e:e===1?1/r:(o=e+r,o<As?(l=o/e,l/=r,l):o===e&&r<As?1/r:o===r&&e<As?1/e:(e<r&&(u=r,r=e,e=u),n=e+Es-.5,i=r+Es-.5,s=o+Es-.5,l=Is(e)*(Is(r)/Is(o)),t=e-.5-r,bS(r*t)<s*100&&e>100?l*=_S(t*gS(-r/s)):l*=Ps(n/s,t),s>1e10?l*=Ps(n/s*(i/s),r):l*=Ps(n*i/(s*s),r),l*=yS(wS/i),l))}vd.exports=qS});var Os=h((Gj,gd)=>{"use strict";var PS=hd();gd.exports=PS});var bd=h((Wj,yd)=>{"use strict";var AS=B();function IS(e){return e===0&&1/e===AS}yd.exports=IS});var wd=h((Kj,_d)=>{"use strict";var ES=bd();_d.exports=ES});var Ad=h((Jj,Pd)=>{"use strict";var OS=wd(),qd=S(),Ns=B();function NS(e,r){return qd(e)||qd(r)?NaN:e===Ns||r===Ns?Ns:e===r&&e===0?OS(e)?e:r:e>r?e:r}Pd.exports=NS});var sr=h((Xj,Id)=>{"use strict";var kS=Ad();Id.exports=kS});var Od=h((Qj,Ed)=>{"use strict";var TS=te();function SS(e){return e===0&&1/e===TS}Ed.exports=SS});var ks=h((Yj,Nd)=>{"use strict";var $S=Od();Nd.exports=$S});var Sd=h((jj,Td)=>{"use strict";var LS=ks(),kd=S(),Ts=te();function zS(e,r){return kd(e)||kd(r)?NaN:e===Ts||r===Ts?Ts:e===r&&e===0?LS(e)?e:r:e<r?e:r}Td.exports=zS});var Ve=h((eee,$d)=>{"use strict";var FS=Sd();$d.exports=FS});var ar=h((ree,Ld)=>{"use strict";var xS=17976931348623157e292;Ld.exports=xS});var Ss=h((tee,zd)=>{"use strict";var RS=2147483647;zd.exports=RS});var jn=h((nee,Fd)=>{"use strict";var CS=1.5707963267948966;Fd.exports=CS});var ur=h((oee,xd)=>{"use strict";var ZS=3.141592653589793;xd.exports=ZS});var Cd=h((iee,Rd)=>{"use strict";function DS(e){return e===0?.0416666666666666:.0416666666666666+e*(-.001388888888887411+e*2480158728947673e-20)}Rd.exports=DS});var Dd=h((see,Zd)=>{"use strict";function MS(e){return e===0?-27557314351390663e-23:-27557314351390663e-23+e*(2087572321298175e-24+e*-11359647557788195e-27)}Zd.exports=MS});var Bd=h((aee,Md)=>{"use strict";var BS=Cd(),US=Dd();function HS(e,r){var t,n,i,s;return s=e*e,i=s*s,n=s*BS(s),n+=i*i*US(s),t=.5*s,i=1-t,i+(1-i-t+(s*n-e*r))}Md.exports=HS});var $s=h((uee,Ud)=>{"use strict";var VS=Bd();Ud.exports=VS});var Gd=h((cee,Vd)=>{"use strict";var Hd=-.16666666666666632,GS=.00833333333332249,WS=-.0001984126982985795,KS=27557313707070068e-22,JS=-25050760253406863e-24,XS=158969099521155e-24;function QS(e,r){var t,n,i,s;return s=e*e,i=s*s,t=GS+s*(WS+s*KS)+s*i*(JS+s*XS),n=s*e,r===0?e+n*(Hd+s*t):e-(s*(.5*r-n*t)-r-n*Hd)}Vd.exports=QS});var Ls=h((lee,Wd)=>{"use strict";var YS=Gd();Wd.exports=YS});var Jd=h((fee,Kd)=>{"use strict";var jS=Gr(),zs;jS===!0?zs=0:zs=1;Kd.exports=zs});var Yd=h((mee,Qd)=>{"use strict";var e$=Hr(),r$=Vr(),t$=Jd(),Xd=new r$(1),n$=new e$(Xd.buffer);function o$(e){return Xd[0]=e,n$[t$]}Qd.exports=o$});var ev=h((pee,jd)=>{"use strict";var i$=Yd();jd.exports=i$});var tv=h((dee,rv)=>{"use strict";function s$(e,r){var t,n;for(t=[],n=0;n<r;n++)t.push(e);return t}rv.exports=s$});var ov=h((vee,nv)=>{"use strict";var a$=tv();nv.exports=a$});var sv=h((hee,iv)=>{"use strict";var u$=ov();function c$(e){return u$(0,e)}iv.exports=c$});var uv=h((gee,av)=>{"use strict";var l$=sv();av.exports=l$});var pv=h((yee,mv)=>{"use strict";var f$=Oe(),eo=Jr(),no=uv(),lv=[10680707,7228996,1387004,2578385,16069853,12639074,9804092,4427841,16666979,11263675,12935607,2387514,4345298,14681673,3074569,13734428,16653803,1880361,10960616,8533493,3062596,8710556,7349940,6258241,3772886,3769171,3798172,8675211,12450088,3874808,9961438,366607,15675153,9132554,7151469,3571407,2607881,12013382,4155038,6285869,7677882,13102053,15825725,473591,9065106,15363067,6271263,9264392,5636912,4652155,7056368,13614112,10155062,1944035,9527646,15080200,6658437,6231200,6832269,16767104,5075751,3212806,1398474,7579849,6349435,12618859],m$=[1.570796251296997,7549789415861596e-23,5390302529957765e-30,3282003415807913e-37,1270655753080676e-44,12293330898111133e-52,27337005381646456e-60,21674168387780482e-67],Fs=16777216,xs=5960464477539063e-23,ro=no(20),cv=no(20),to=no(20),pe=no(20);function fv(e,r,t,n,i,s,l,u,o){var a,c,f,m,p,d,g,y,v;for(m=s,v=n[t],y=t,p=0;y>0;p++)c=xs*v|0,pe[p]=v-Fs*c|0,v=n[y-1]+c,y-=1;if(v=eo(v,i),v-=8*f$(v*.125),g=v|0,v-=g,f=0,i>0?(p=pe[t-1]>>24-i,g+=p,pe[t-1]-=p<<24-i,f=pe[t-1]>>23-i):i===0?f=pe[t-1]>>23:v>=.5&&(f=2),f>0){for(g+=1,a=0,p=0;p<t;p++)y=pe[p],a===0?y!==0&&(a=1,pe[p]=16777216-y):pe[p]=16777215-y;if(i>0)switch(i){case 1:pe[t-1]&=8388607;break;case 2:pe[t-1]&=4194303;break}f===2&&(v=1-v,a!==0&&(v-=eo(1,i)))}if(v===0){for(y=0,p=t-1;p>=s;p--)y|=pe[p];if(y===0){for(d=1;pe[s-d]===0;d++);for(p=t+1;p<=t+d;p++){for(o[u+p]=lv[l+p],c=0,y=0;y<=u;y++)c+=e[y]*o[u+(p-y)];n[p]=c}return t+=d,fv(e,r,t,n,i,s,l,u,o)}for(t-=1,i-=24;pe[t]===0;)t-=1,i-=24}else v=eo(v,-i),v>=Fs?(c=xs*v|0,pe[t]=v-Fs*c|0,t+=1,i+=24,pe[t]=c):pe[t]=v|0;for(c=eo(1,i),p=t;p>=0;p--)n[p]=c*pe[p],c*=xs;for(p=t;p>=0;p--){for(c=0,d=0;d<=m&&d<=t-p;d++)c+=m$[d]*n[p+d];to[t-p]=c}for(c=0,p=t;p>=0;p--)c+=to[p];for(f===0?r[0]=c:r[0]=-c,c=to[0]-c,p=1;p<=t;p++)c+=to[p];return f===0?r[1]=c:r[1]=-c,g&7}function p$(e,r,t,n){var i,s,l,u,o,a,c,f,m;for(s=4,u=n-1,l=(t-3)/24|0,l<0&&(l=0),a=t-24*(l+1),f=l-u,m=u+s,c=0;c<=m;c++)f<0?ro[c]=0:ro[c]=lv[f],f+=1;for(c=0;c<=s;c++){for(i=0,f=0;f<=u;f++)i+=e[f]*ro[u+(c-f)];cv[c]=i}return o=s,fv(e,r,o,cv,a,s,l,u,ro)}mv.exports=p$});var vv=h((bee,dv)=>{"use strict";var d$=Math.round;dv.exports=d$});var Rs=h((_ee,hv)=>{"use strict";var v$=vv();hv.exports=v$});var _v=h((wee,bv)=>{"use strict";var h$=Rs(),gv=Pe(),g$=.6366197723675814,y$=1.5707963267341256,b$=6077100506506192e-26,_$=6077100506303966e-26,w$=20222662487959506e-37,q$=20222662487111665e-37,P$=84784276603689e-45,yv=2047;function A$(e,r,t){var n,i,s,l,u,o,a;return i=h$(e*g$),l=e-i*y$,u=i*b$,a=r>>20|0,t[0]=l-u,n=gv(t[0]),o=a-(n>>20&yv),o>16&&(s=l,u=i*_$,l=s-u,u=i*w$-(s-l-u),t[0]=l-u,n=gv(t[0]),o=a-(n>>20&yv),o>49&&(s=l,u=i*q$,l=s-u,u=i*P$-(s-l-u),t[0]=l-u)),t[1]=l-t[0]-u,i}bv.exports=A$});var qv=h((qee,wv)=>{"use strict";var I$=_r(),E$=Bt(),O$=_s(),N$=Pe(),k$=ev(),T$=Mt(),S$=pv(),oo=_v(),$$=0,L$=16777216,Er=1.5707963267341256,Xr=6077100506506192e-26,io=2*Xr,so=3*Xr,ao=4*Xr,z$=598523,F$=1072243195,x$=1073928572,R$=1074752122,C$=1074977148,Z$=1075183036,D$=1075388923,M$=1075594811,B$=1094263291,Ht=[0,0,0],Vt=[0,0];function U$(e,r){var t,n,i,s,l,u,o,a;if(i=N$(e)|0,s=i&I$|0,s<=F$)return r[0]=e,r[1]=0,0;if(s<=R$)return(s&O$)===z$?oo(e,s,r):s<=x$?i>0?(a=e-Er,r[0]=a-Xr,r[1]=a-r[0]-Xr,1):(a=e+Er,r[0]=a+Xr,r[1]=a-r[0]+Xr,-1):i>0?(a=e-2*Er,r[0]=a-io,r[1]=a-r[0]-io,2):(a=e+2*Er,r[0]=a+io,r[1]=a-r[0]+io,-2);if(s<=M$)return s<=Z$?s===C$?oo(e,s,r):i>0?(a=e-3*Er,r[0]=a-so,r[1]=a-r[0]-so,3):(a=e+3*Er,r[0]=a+so,r[1]=a-r[0]+so,-3):s===D$?oo(e,s,r):i>0?(a=e-4*Er,r[0]=a-ao,r[1]=a-r[0]-ao,4):(a=e+4*Er,r[0]=a+ao,r[1]=a-r[0]+ao,-4);if(s<B$)return oo(e,s,r);if(s>=E$)return r[0]=NaN,r[1]=NaN,0;for(t=k$(e),n=(s>>20)-1046,a=T$(s-(n<<20|0),t),u=0;u<2;u++)Ht[u]=a|0,a=(a-Ht[u])*L$;for(Ht[2]=a,l=3;Ht[l-1]===$$;)l-=1;return o=S$(Ht,Vt,n,l,1),i<0?(r[0]=-Vt[0],r[1]=-Vt[1],-o):(r[0]=Vt[0],r[1]=Vt[1],o)}wv.exports=U$});var Cs=h((Pee,Pv)=>{"use strict";var H$=qv();Pv.exports=H$});var Ev=h((Aee,Iv)=>{"use strict";var V$=_r(),G$=Bt(),W$=Pe(),Av=$s(),Zs=Ls(),K$=Cs(),J$=1072243195,X$=1045430272,cr=[0,0];function Q$(e){var r,t;if(r=W$(e),r&=V$,r<=J$)return r<X$?e:Zs(e,0);if(r>=G$)return NaN;switch(t=K$(e,cr),t&3){case 0:return Zs(cr[0],cr[1]);case 1:return Av(cr[0],cr[1]);case 2:return-Zs(cr[0],cr[1]);default:return-Av(cr[0],cr[1])}}Iv.exports=Q$});var dt=h((Iee,Ov)=>{"use strict";var Y$=Ev();Ov.exports=Y$});var Gt=h((Eee,Nv)=>{"use strict";var j$=2.5066282746310007;Nv.exports=j$});var Tv=h((Oee,kv)=>{"use strict";function eL(e){return e===0?.08333333333334822:.08333333333334822+e*(.0034722222160545866+e*(-.0026813261780578124+e*(-.00022954996161337813+e*.0007873113957930937)))}kv.exports=eL});var Lv=h((Nee,$v)=>{"use strict";var rL=Gt(),Sv=Q(),tL=V(),nL=Tv(),oL=143.01608;function iL(e){var r,t,n;return r=1/e,r=1+r*nL(r),t=tL(e),e>oL?(n=Sv(e,.5*e-.25),t=n*(n/t)):t=Sv(e,e-.5)/t,rL*t*r}$v.exports=iL});var Fv=h((kee,zv)=>{"use strict";var sL=.5772156649015329;zv.exports=sL});var Rv=h((Tee,xv)=>{"use strict";var aL=Fv();function uL(e,r){return r/((1+aL*e)*e)}xv.exports=uL});var Zv=h((See,Cv)=>{"use strict";function cL(e){var r,t,n;return e===0?1:(e<0?r=-e:r=e,r<=1?(t=1+e*(.4942148268014971+e*(.20744822764843598+e*(.04763678004571372+e*(.010421379756176158+e*(.0011913514700658638+e*(.00016011952247675185+e*0)))))),n=1+e*(.0714304917030273+e*(-.23459179571824335+e*(.035823639860549865+e*(.011813978522206043+e*(-.004456419138517973+e*(.0005396055804933034+e*-23158187332412014e-21))))))):(e=1/e,t=0+e*(.00016011952247675185+e*(.0011913514700658638+e*(.010421379756176158+e*(.04763678004571372+e*(.20744822764843598+e*(.4942148268014971+e*1)))))),n=-23158187332412014e-21+e*(.0005396055804933034+e*(-.004456419138517973+e*(.011813978522206043+e*(.035823639860549865+e*(-.23459179571824335+e*(.0714304917030273+e*1))))))),t/n)}Cv.exports=cL});var Wv=h(($ee,Gv)=>{"use strict";var lL=S(),fL=qr(),mL=ks(),Dv=R(),pL=Oe(),dL=dt(),Mv=B(),Bv=te(),Uv=ur(),Hv=Lv(),Vv=Rv(),vL=Zv();function hL(e){var r,t,n,i;if(fL(e)&&e<0||e===Bv||lL(e))return NaN;if(e===0)return mL(e)?Bv:Mv;if(e>171.61447887182297)return Mv;if(e<-170.5674972726612)return 0;if(t=Dv(e),t>33)return e>=0?Hv(e):(n=pL(t),(n&1)===0?r=-1:r=1,i=t-n,i>.5&&(n+=1,i=t-n),i=t*dL(Uv*i),r*Uv/(Dv(i)*Hv(t)));for(i=1;e>=3;)e-=1,i*=e;for(;e<0;){if(e>-1e-9)return Vv(e,i);i/=e,e+=1}for(;e<2;){if(e<1e-9)return Vv(e,i);i/=e,e+=1}return e===2?i:(e-=2,i*vL(e))}Gv.exports=hL});var Ne=h((Lee,Kv)=>{"use strict";var gL=Wv();Kv.exports=gL});var Wt=h((zee,Jv)=>{"use strict";var yL=170;Jv.exports=yL});var Xv=h((Fee,bL)=>{bL.exports=[1,1,2,6,24,120,720,5040,40320,362880,3628800,39916800,479001600,6227020800,87178291200,1307674368e3,20922789888e3,355687428096e3,6402373705728e3,121645100408832e3,243290200817664e4,5109094217170944e4,11240007277776077e5,2585201673888498e7,6204484017332394e8,15511210043330986e9,40329146112660565e10,10888869450418352e12,30488834461171387e13,8841761993739702e15,26525285981219107e16,8222838654177922e18,2631308369336935e20,8683317618811886e21,29523279903960416e22,10333147966386145e24,37199332678990125e25,13763753091226346e27,5230226174666011e29,20397882081197444e30,8159152832478977e32,3345252661316381e34,140500611775288e37,6041526306337383e37,2658271574788449e39,11962222086548019e40,5502622159812089e42,25862324151116818e43,12413915592536073e45,6082818640342675e47,30414093201713376e48,15511187532873822e50,8065817517094388e52,42748832840600255e53,2308436973392414e56,12696403353658276e57,7109985878048635e59,40526919504877214e60,23505613312828785e62,13868311854568984e64,832098711274139e67,5075802138772248e68,3146997326038794e70,198260831540444e73,12688693218588417e73,8247650592082472e75,5443449390774431e77,3647111091818868e79,24800355424368305e80,1711224524281413e83,11978571669969892e84,8504785885678623e86,61234458376886085e87,44701154615126844e89,3307885441519386e92,248091408113954e95,18854947016660504e95,14518309202828587e97,11324281178206297e99,8946182130782976e101,7156945704626381e103,5797126020747368e105,4753643337012842e107,3945523969720659e109,3314240134565353e111,281710411438055e114,24227095383672734e114,2107757298379528e117,18548264225739844e118,1650795516090846e121,14857159644817615e122,1352001527678403e125,12438414054641308e126,11567725070816416e128,1087366156656743e131,1032997848823906e133,9916779348709496e134,9619275968248212e136,9426890448883248e138,9332621544394415e140,9332621544394415e142,942594775983836e145,9614466715035127e146,990290071648618e149,10299016745145628e150,1081396758240291e153,11462805637347084e154,1226520203196138e157,1324641819451829e159,14438595832024937e160,1588245541522743e163,17629525510902446e164,1974506857221074e167,22311927486598138e168,25435597334721877e170,2925093693493016e173,3393108684451898e175,3969937160808721e177,4684525849754291e179,5574585761207606e181,6689502913449127e183,8094298525273444e185,9875044200833601e187,1214630436702533e190,1506141741511141e192,1882677176888926e194,2372173242880047e196,30126600184576594e197,3856204823625804e200,4974504222477287e202,6466855489220474e204,847158069087882e207,11182486511960043e208,14872707060906857e210,19929427461615188e212,26904727073180504e214,3659042881952549e217,5012888748274992e219,6917786472619489e221,9615723196941089e223,13462012475717526e225,1898143759076171e228,2695364137888163e230,3854370717180073e232,55502938327393044e233,8047926057471992e236,11749972043909107e238,1727245890454639e241,25563239178728654e242,380892263763057e246,5713383956445855e247,862720977423324e250,13113358856834524e251,20063439050956823e253,30897696138473508e255,4789142901463394e258,7471062926282894e260,11729568794264145e262,1853271869493735e265,29467022724950384e266,47147236359920616e268,7590705053947219e271,12296942187394494e273,20044015765453026e275,3287218585534296e278,5423910666131589e280,9003691705778438e282,1503616514864999e285,25260757449731984e286,4269068009004705e289,7257415615307999e291]});var Yv=h((xee,Qv)=>{"use strict";var _L=S(),wL=qr(),qL=Ne(),PL=B(),AL=Wt(),IL=Xv();function EL(e){return _L(e)?NaN:wL(e)?e<0?NaN:e<=AL?IL[e]:PL:qL(e+1)}Qv.exports=EL});var Ds=h((Ree,jv)=>{"use strict";var OL=Yv();jv.exports=OL});var r2=h((Cee,e2)=>{"use strict";function NL(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=3847467039331777e-5+e*(3685766504351951e-5+e*(1588920245372942e-5+e*(4059208354298835e-6+e*(6805476611834733e-7+e*(7823975500312005e-8+e*(6246580776401795e-9+e*(341986.3488721347+e*(12287.194511824551+e*(261.61404416416684+e*2.5066282746310007))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=2.5066282746310007+e*(261.61404416416684+e*(12287.194511824551+e*(341986.3488721347+e*(6246580776401795e-9+e*(7823975500312005e-8+e*(6805476611834733e-7+e*(4059208354298835e-6+e*(1588920245372942e-5+e*(3685766504351951e-5+e*3847467039331777e-5))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}e2.exports=NL});var n2=h((Zee,t2)=>{"use strict";var kL=r2();t2.exports=kL});var i2=h((Dee,o2)=>{"use strict";var TL=n2();o2.exports=TL});var Qr=h((Mee,s2)=>{"use strict";var SL=10.900511;s2.exports=SL});var v2=h((Bee,d2)=>{"use strict";var a2=i2(),$L=Ne(),LL=ve(),u2=R(),c2=V(),l2=Q(),f2=Re(),zL=Ir(),FL=Qr(),m2=Wt(),xL=4269068009004705e289;function p2(e,r){var t,n,i;return e<f2?r>=m2?(n=p2(r,m2-r),n*=e,n*=xL,1/n):1/(e*$L(e+r)):(i=e+FL-.5,e+r===e?u2(r/i)<f2?t=c2(-r):t=1:(u2(r)<10?t=c2((.5-e)*LL(r/i)):t=l2(i/(i+r),e-.5),t*=a2(e)/a2(e+r)),t*=l2(zL/(i+r),r),t)}d2.exports=p2});var w2=h((Uee,_2)=>{"use strict";var RL=R(),h2=Oe(),g2=Ne(),y2=Ds(),b2=Wt(),CL=v2();function ZL(e,r){var t,n,i;if(e<=0||e+r<=0)return g2(e)/g2(e+r);if(n=h2(r),n===r){if(i=h2(e),i===e&&e<=b2&&e+r<=b2)return y2(i-1)/y2(n+i-1);if(RL(r)<20){if(r===0)return 1;if(r<0){for(e-=1,t=e,r+=1;r!==0;)e-=1,t*=e,r+=1;return t}for(t=1/e,r-=1;r!==0;)e+=1,t/=e,r-=1;return t}}return CL(e,r)}_2.exports=ZL});var uo=h((Hee,q2)=>{"use strict";var DL=w2();q2.exports=DL});var A2=h((Vee,P2)=>{"use strict";function ML(e){return e===0?.3999999999940942:.3999999999940942+e*(.22222198432149784+e*.15313837699209373)}P2.exports=ML});var E2=h((Gee,I2)=>{"use strict";function BL(e){return e===0?.6666666666666735:.6666666666666735+e*(.2857142874366239+e*(.1818357216161805+e*.14798198605116586))}I2.exports=BL});var T2=h((Wee,k2)=>{"use strict";var O2=Pe(),UL=mt(),HL=S(),VL=br(),GL=te(),WL=A2(),KL=E2(),co=.6931471803691238,lo=19082149292705877e-26,JL=0x40000000000000,XL=.3333333333333333,N2=1048575,QL=2146435072,YL=1048576,jL=1072693248;function ez(e){var r,t,n,i,s,l,u,o,a,c,f,m;return e===0?GL:HL(e)||e<0?NaN:(t=O2(e),s=0,t<YL&&(s-=54,e*=JL,t=O2(e)),t>=QL?e+e:(s+=(t>>20)-VL|0,t&=N2,o=t+614244&1048576|0,e=UL(e,t|o^jL),s+=o>>20|0,u=e-1,(N2&2+t)<3?u===0?s===0?0:s*co+s*lo:(l=u*u*(.5-XL*u),s===0?u-l:s*co-(l-s*lo-u)):(c=u/(2+u),m=c*c,o=t-398458|0,f=m*m,a=440401-t|0,i=f*WL(f),n=m*KL(f),o|=a,l=n+i,o>0?(r=.5*u*u,s===0?u-(r-c*(r+l)):s*co-(r-(c*(r+l)+s*lo)-u)):s===0?u-c*(u-l):s*co-(c*(u-l)-s*lo-u))))}k2.exports=ez});var F=h((Kee,S2)=>{"use strict";var rz=T2();S2.exports=rz});var z2=h((Jee,L2)=>{"use strict";var tz=Pe(),Ms=$s(),$2=Ls(),nz=Cs(),oz=_r(),iz=Bt(),lr=[0,0],sz=1072243195,az=1044381696;function uz(e){var r,t;if(r=tz(e),r&=oz,r<=sz)return r<az?1:Ms(e,0);if(r>=iz)return NaN;switch(t=nz(e,lr),t&3){case 0:return Ms(lr[0],lr[1]);case 1:return-$2(lr[0],lr[1]);case 2:return-Ms(lr[0],lr[1]);default:return $2(lr[0],lr[1])}}L2.exports=uz});var fo=h((Xee,F2)=>{"use strict";var cz=z2();F2.exports=cz});var C2=h((Qee,R2)=>{"use strict";var lz=S(),fz=Kr(),x2=fo(),Bs=dt(),mz=R(),Kt=Wn(),Jt=ur();function pz(e){var r,t;return lz(e)?NaN:fz(e)?NaN:(t=e%2,r=mz(t),r===0||r===1?Kt(0,t):r<.25?Bs(Jt*t):r<.75?(r=.5-r,Kt(x2(Jt*r),t)):r<1.25?(t=Kt(1,t)-t,Bs(Jt*t)):r<1.75?(r-=1.5,-Kt(x2(Jt*r),t)):(t-=Kt(2,t),Bs(Jt*t)))}R2.exports=pz});var D2=h((Yee,Z2)=>{"use strict";var dz=C2();Z2.exports=dz});var B2=h((jee,M2)=>{"use strict";function vz(e){return e===0?.06735230105312927:.06735230105312927+e*(.007385550860814029+e*(.0011927076318336207+e*(.00022086279071390839+e*25214456545125733e-21)))}M2.exports=vz});var H2=h((ere,U2)=>{"use strict";function hz(e){return e===0?.020580808432516733:.020580808432516733+e*(.0028905138367341563+e*(.0005100697921535113+e*(.00010801156724758394+e*44864094961891516e-21)))}U2.exports=hz});var G2=h((rre,V2)=>{"use strict";function gz(e){return e===0?1.3920053346762105:1.3920053346762105+e*(.7219355475671381+e*(.17193386563280308+e*(.01864591917156529+e*(.0007779424963818936+e*7326684307446256e-21))))}V2.exports=gz});var K2=h((tre,W2)=>{"use strict";function yz(e){return e===0?.21498241596060885:.21498241596060885+e*(.325778796408931+e*(.14635047265246445+e*(.02664227030336386+e*(.0018402845140733772+e*3194753265841009e-20))))}W2.exports=yz});var X2=h((nre,J2)=>{"use strict";function bz(e){return e===0?-.032788541075985965:-.032788541075985965+e*(.006100538702462913+e*(-.0014034646998923284+e*.00031563207090362595))}J2.exports=bz});var Y2=h((ore,Q2)=>{"use strict";function _z(e){return e===0?.01797067508118204:.01797067508118204+e*(-.0036845201678113826+e*(.000881081882437654+e*-.00031275416837512086))}Q2.exports=_z});var eh=h((ire,j2)=>{"use strict";function wz(e){return e===0?-.010314224129834144:-.010314224129834144+e*(.0022596478090061247+e*(-.0005385953053567405+e*.0003355291926355191))}j2.exports=wz});var th=h((sre,rh)=>{"use strict";function qz(e){return e===0?.6328270640250934:.6328270640250934+e*(1.4549225013723477+e*(.9777175279633727+e*(.22896372806469245+e*.013381091853678766)))}rh.exports=qz});var oh=h((are,nh)=>{"use strict";function Pz(e){return e===0?2.4559779371304113:2.4559779371304113+e*(2.128489763798934+e*(.7692851504566728+e*(.10422264559336913+e*.003217092422824239)))}nh.exports=Pz});var sh=h((ure,ih)=>{"use strict";function Az(e){return e===0?.08333333333333297:.08333333333333297+e*(-.0027777777772877554+e*(.0007936505586430196+e*(-.00059518755745034+e*(.0008363399189962821+e*-.0016309293409657527))))}ih.exports=Az});var ch=h((cre,uh)=>{"use strict";var Iz=S(),Ez=Kr(),Oz=R(),vt=F(),Nz=Vn(),kz=D2(),Tz=ur(),Us=B(),Sz=B2(),$z=H2(),Lz=G2(),zz=K2(),Fz=X2(),xz=Y2(),Rz=eh(),Cz=th(),Zz=oh(),Dz=sh(),Mz=.07721566490153287,Bz=.3224670334241136,Uz=1,Hz=-.07721566490153287,Vz=.48383612272381005,Gz=-.1475877229945939,Wz=.06462494023913339,Kz=-.07721566490153287,Jz=1,Xz=.4189385332046727,mo=1.4616321449683622,Qz=4503599627370496,Yz=72057594037927940,jz=13877787807814457e-33,ah=1.4616321449683622,eF=-.12148629053584961,rF=-3638676997039505e-33;function tF(e){var r,t,n,i,s,l,u,o,a,c,f,m,p;if(Iz(e)||Ez(e))return e;if(e===0)return Us;if(e<0?(r=!0,e=-e):r=!1,e<jz)return-vt(e);if(r){if(e>=Qz||(a=kz(e),a===0))return Us;t=vt(Tz/Oz(a*e))}if(e===1||e===2)return 0;if(e<2)switch(e<=.9?(p=-vt(e),e>=mo-1+.27?(f=1-e,n=0):e>=mo-1-.27?(f=e-(ah-1),n=1):(f=e,n=2)):(p=0,e>=mo+.27?(f=2-e,n=0):e>=mo-.27?(f=e-ah,n=1):(f=e-1,n=2)),n){case 0:m=f*f,l=Mz+m*Sz(m),s=m*(Bz+m*$z(m)),u=f*l+s,p+=u-.5*f;break;case 1:m=f*f,c=m*f,l=Vz+c*Fz(c),s=Gz+c*xz(c),i=Wz+c*Rz(c),u=m*l-(rF-c*(s+f*i)),p+=eF+u;break;case 2:l=f*(Kz+f*Cz(f)),s=Jz+f*Zz(f),p+=-.5*f+l/s;break}else if(e<8)switch(n=Nz(e),f=e-n,u=f*(Hz+f*zz(f)),o=Uz+f*Lz(f),p=.5*f+u/o,m=1,n){case 7:m*=f+6;case 6:m*=f+5;case 5:m*=f+4;case 4:m*=f+3;case 3:m*=f+2,p+=vt(m)}else e<Yz?(a=vt(e),m=1/e,f=m*m,c=Xz+m*Dz(f),p=(e-.5)*(a-1)+c):p=e*(vt(e)-1);return r&&(p=t-p),p}uh.exports=tF});var fr=h((lre,lh)=>{"use strict";var nF=ch();lh.exports=nF});var Ge=h((fre,fh)=>{"use strict";var oF=709.782712893384;fh.exports=oF});var ph=h((mre,mh)=>{"use strict";var iF=14901161193847656e-24;mh.exports=iF});var vh=h((pre,dh)=>{"use strict";var sF=eval;dh.exports=sF});var gh=h((dre,hh)=>{"use strict";var aF=vh();function uF(){var e;try{aF('"use strict"; (function* () {})'),e=!0}catch{e=!1}return e}hh.exports=uF});var Hs=h((vre,yh)=>{"use strict";var cF=gh();yh.exports=cF});var _h=h((hre,bh)=>{"use strict";var po=R(),lF=Re(),fF=1e6;function mF(e,r){var t,n,i,s,l,u;if(u={},arguments.length>1&&(u=r),n=u.tolerance||lF,s=u.maxTerms||fF,l=u.initialValue||0,t=typeof e.next=="function",t===!0){for(i of e)if(l+=i,po(n*l)>=po(i)||--s===0)break}else do i=e(),l+=i;while(po(n*l)<po(i)&&--s);return l}bh.exports=mF});var Ph=h((gre,qh)=>{"use strict";var wh=R(),pF=Re(),dF=1e6;function vF(e,r){var t,n,i,s,l;l={},arguments.length>1&&(l=r),t=l.tolerance||pF,i=l.maxTerms||dF,s=l.initialValue||0;do n=e(),s+=n;while(wh(t*s)<wh(n)&&--i);return s}qh.exports=vF});var ht=h((yre,Ah)=>{"use strict";var hF=Hs(),gF=_h(),yF=Ph(),Vs;hF()?Vs=gF:Vs=yF;Ah.exports=Vs});var Eh=h((bre,Ih)=>{"use strict";function bF(e,r){var t=1,n=e,i=r;return s;function s(){var l=t;return t*=n/i,n-=1,l}}Ih.exports=bF});var Nh=h((_re,Oh)=>{"use strict";var _F=ht(),wF=Eh();function qF(e,r){var t,n;return n=wF(e,r),t=_F(n),t}Oh.exports=qF});var Th=h((wre,kh)=>{"use strict";var PF=V();function AF(e,r){var t,n,i,s;if(i=PF(-r),n=i,n!==0)for(t=n,s=1;s<e;++s)t/=s,t*=r,n+=t;return n}kh.exports=AF});var $h=h((qre,Sh)=>{"use strict";function IF(e){return e===0?-.3250421072470015:-.3250421072470015+e*(-.02848174957559851+e*(-.005770270296489442+e*-23763016656650163e-21))}Sh.exports=IF});var zh=h((Pre,Lh)=>{"use strict";function EF(e){return e===0?.39791722395915535:.39791722395915535+e*(.0650222499887673+e*(.005081306281875766+e*(.00013249473800432164+e*-3960228278775368e-21)))}Lh.exports=EF});var xh=h((Are,Fh)=>{"use strict";function OF(e){return e===0?.41485611868374833:.41485611868374833+e*(-.3722078760357013+e*(.31834661990116175+e*(-.11089469428239668+e*(.035478304325618236+e*-.002166375594868791))))}Fh.exports=OF});var Ch=h((Ire,Rh)=>{"use strict";function NF(e){return e===0?.10642088040084423:.10642088040084423+e*(.540397917702171+e*(.07182865441419627+e*(.12617121980876164+e*(.01363708391202905+e*.011984499846799107))))}Rh.exports=NF});var Dh=h((Ere,Zh)=>{"use strict";function kF(e){return e===0?-.6938585727071818:-.6938585727071818+e*(-10.558626225323291+e*(-62.375332450326006+e*(-162.39666946257347+e*(-184.60509290671104+e*(-81.2874355063066+e*-9.814329344169145)))))}Zh.exports=kF});var Bh=h((Ore,Mh)=>{"use strict";function TF(e){return e===0?19.651271667439257:19.651271667439257+e*(137.65775414351904+e*(434.56587747522923+e*(645.3872717332679+e*(429.00814002756783+e*(108.63500554177944+e*(6.570249770319282+e*-.0604244152148581))))))}Mh.exports=TF});var Hh=h((Nre,Uh)=>{"use strict";function SF(e){return e===0?-.799283237680523:-.799283237680523+e*(-17.757954917754752+e*(-160.63638485582192+e*(-637.5664433683896+e*(-1025.0951316110772+e*-483.5191916086514))))}Uh.exports=SF});var Gh=h((kre,Vh)=>{"use strict";function $F(e){return e===0?30.33806074348246:30.33806074348246+e*(325.7925129965739+e*(1536.729586084437+e*(3199.8582195085955+e*(2553.0504064331644+e*(474.52854120695537+e*-22.44095244658582)))))}Vh.exports=$F});var Xh=h((Tre,Jh)=>{"use strict";var LF=S(),Wh=V(),zF=pt(),FF=B(),xF=te(),RF=$h(),CF=zh(),ZF=xh(),DF=Ch(),MF=Dh(),BF=Bh(),UF=Hh(),HF=Gh(),vo=1e-300,VF=13877787807814457e-33,Kh=.8450629115104675,GF=.12837916709551256,WF=1,KF=-.0023621185607526594,JF=1,XF=-.009864944034847148,QF=1,YF=-.0098649429247001,jF=1;function ex(e){var r,t,n,i,s,l,u,o;if(LF(e))return NaN;if(e===FF)return 0;if(e===xF)return 2;if(e===0)return 1;if(e<0?(r=!0,t=-e):(r=!1,t=e),t<.84375)return t<VF?1-e:(n=e*e,i=GF+n*RF(n),s=WF+n*CF(n),l=i/s,e<.25?1-(e+e*l):(i=e*l,i+=e-.5,.5-i));if(t<1.25)return s=t-1,u=KF+s*ZF(s),o=JF+s*DF(s),r?1+Kh+u/o:1-Kh-u/o;if(t<28){if(s=1/(t*t),t<2.857142857142857)i=XF+s*MF(s),s=QF+s*BF(s);else{if(e<-6)return 2-vo;i=YF+s*UF(s),s=jF+s*HF(s)}return n=zF(t,0),i=Wh(-(n*n)-.5625)*Wh((n-t)*(n+t)+i/s),r?2-i/t:i/t}return r?2-vo:vo*vo}Jh.exports=ex});var ho=h((Sre,Qh)=>{"use strict";var rx=Xh();Qh.exports=rx});var e3=h(($re,jh)=>{"use strict";var tx=ho(),Yh=W(),nx=V(),ox=ur();function ix(e,r){var t,n,i,s,l;if(s=tx(Yh(r)),s!==0&&e>1){for(n=nx(-r)/Yh(ox*r),n*=r,t=.5,n/=t,i=n,l=2;l<e;++l)n/=l-t,n*=r,i+=n;s+=i}return s}jh.exports=ix});var Or=h((Lre,r3)=>{"use strict";var sx=-708.3964185322641;r3.exports=sx});var i3=h((zre,o3)=>{"use strict";var gt=V(),go=Q(),ax=F(),t3=Ge(),n3=Or();function ux(e,r){var t,n;return n=e*ax(r),r>=1?n<t3&&-r>n3?t=go(r,e)*gt(-r):e>=1?t=go(r/gt(r/e),e):t=gt(n-r):n>n3?t=go(r,e)*gt(-r):r/e<t3?t=go(r/gt(r/e),e):t=gt(n-r),t}o3.exports=ux});var Gs=h((Fre,s3)=>{"use strict";function cx(e,r){var t,n;if(n=e.length,n<2||r===0)return n===0?0:e[0];for(n-=1,t=e[n]*r+e[n-1],n-=2;n>=0;)t=t*r+e[n],n-=1;return t}s3.exports=cx});var u3=h((xre,a3)=>{"use strict";var lx=Function;a3.exports=lx});var l3=h((Rre,c3)=>{"use strict";var fx=u3();c3.exports=fx});var m3=h((Cre,f3)=>{"use strict";var mx=l3(),px=Gs();function dx(e){var r,t,n,i;if(e.length>500)return s;if(r="return function evalpoly(x){",t=e.length,t===0)r+="return 0.0;";else if(t===1)r+="return "+e[0]+";";else{for(r+="if(x===0.0){return "+e[0]+";}",r+="return "+e[0],n=t-1,i=1;i<t;i++)r+="+x*",i<n&&(r+="("),r+=e[i];for(i=0;i<n-1;i++)r+=")";r+=";"}return r+="}",r+="//# sourceURL=evalpoly.factory.js",new mx(r)();function s(l){return px(e,l)}}f3.exports=dx});var mr=h((Zre,d3)=>{"use strict";var vx=qe(),p3=Gs(),hx=m3();vx(p3,"factory",hx);d3.exports=p3});var h3=h((Dre,v3)=>{"use strict";function gx(e){var r=-e,t=-1,n=0;return i;function i(){return t*=r,n+=1,t/n}}v3.exports=gx});var y3=h((Mre,g3)=>{"use strict";var yx=R(),bx=F(),_x=Re(),wx=ht(),qx=h3();function Px(e){var r,t;return e<=-1?NaN:(t=yx(e),t>.95?bx(1+e)-e:t<_x?-e*e/2:(r={initialValue:-e},wx(qx(e),r)))}g3.exports=Px});var Ws=h((Bre,b3)=>{"use strict";var Ax=y3();b3.exports=Ax});var Ks=h((Ure,_3)=>{"use strict";var Ix=6.283185307179586;_3.exports=Ix});var q3=h((Hre,w3)=>{"use strict";function Ex(e){return e===0?-.3333333333333333:-.3333333333333333+e*(.08333333333333333+e*(-.014814814814814815+e*(.0011574074074074073+e*(.0003527336860670194+e*(-.0001787551440329218+e*(3919263178522438e-20+e*(-21854485106799924e-22+e*(-185406221071516e-20+e*(8296711340953087e-22+e*(-17665952736826078e-23+e*(6707853543401498e-24+e*(10261809784240309e-24+e*(-4382036018453353e-24+e*914769958223679e-24)))))))))))))}w3.exports=Ex});var A3=h((Vre,P3)=>{"use strict";function Ox(e){return e===0?-.001851851851851852:-.001851851851851852+e*(-.003472222222222222+e*(.0026455026455026454+e*(-.0009902263374485596+e*(.00020576131687242798+e*(-4018775720164609e-22+e*(-18098550334489977e-21+e*(764916091608111e-20+e*(-16120900894563446e-22+e*(4647127802807434e-24+e*(1378633446915721e-22+e*(-5752545603517705e-23+e*11951628599778148e-24)))))))))))}P3.exports=Ox});var E3=h((Gre,I3)=>{"use strict";function Nx(e){return e===0?.004133597883597883:.004133597883597883+e*(-.0026813271604938273+e*(.0007716049382716049+e*(20093878600823047e-22+e*(-.00010736653226365161+e*(52923448829120125e-21+e*(-12760635188618728e-21+e*(3423578734096138e-23+e*(13721957309062932e-22+e*(-6298992138380055e-22+e*14280614206064242e-23)))))))))}I3.exports=Nx});var N3=h((Wre,O3)=>{"use strict";function kx(e){return e===0?.0006494341563786008:.0006494341563786008+e*(.00022947209362139917+e*(-.0004691894943952557+e*(.00026772063206283885+e*(-7561801671883977e-20+e*(-2396505113867297e-22+e*(11082654115347302e-21+e*(-56749528269915965e-22+e*14230900732435883e-22)))))))}O3.exports=kx});var T3=h((Kre,k3)=>{"use strict";function Tx(e){return e===0?-.0008618882909167117:-.0008618882909167117+e*(.0007840392217200666+e*(-.0002990724803031902+e*(-14638452578843418e-22+e*(6641498215465122e-20+e*(-3968365047179435e-20+e*11375726970678419e-21)))))}k3.exports=Tx});var $3=h((Jre,S3)=>{"use strict";function Sx(e){return e===0?-.00033679855336635813:-.00033679855336635813+e*(-6972813758365858e-20+e*(.0002772753244959392+e*(-.00019932570516188847+e*(6797780477937208e-20+e*(1419062920643967e-22+e*(-13594048189768693e-21+e*(8018470256334202e-21+e*-2291481176508095e-21)))))))}S3.exports=Sx});var z3=h((Xre,L3)=>{"use strict";function $x(e){return e===0?.0005313079364639922:.0005313079364639922+e*(-.0005921664373536939+e*(.0002708782096718045+e*(7902353232660328e-22+e*(-8153969367561969e-20+e*(561168275310625e-19+e*-18329116582843375e-21)))))}L3.exports=$x});var x3=h((Qre,F3)=>{"use strict";function Lx(e){return e===0?.00034436760689237765:.00034436760689237765+e*(5171790908260592e-20+e*(-.00033493161081142234+e*(.0002812695154763237+e*-.00010976582244684731)))}F3.exports=Lx});var C3=h((Yre,R3)=>{"use strict";function zx(e){return e===0?-.0006526239185953094:-.0006526239185953094+e*(.0008394987206720873+e*-.000438297098541721)}R3.exports=zx});var D3=h((jre,Z3)=>{"use strict";var Fx=mr(),xx=Ws(),Rx=ho(),Js=W(),Cx=V(),Zx=Ks(),Dx=q3(),Mx=A3(),Bx=E3(),Ux=N3(),Hx=T3(),Vx=$3(),Gx=z3(),Wx=x3(),Kx=C3(),Ce=[0,0,0,0,0,0,0,0,0,0];function Jx(e,r){var t,n,i,s,l;return n=(r-e)/e,i=-xx(n),s=e*i,l=Js(2*i),r<e&&(l=-l),Ce[0]=Dx(l),Ce[1]=Mx(l),Ce[2]=Bx(l),Ce[3]=Ux(l),Ce[4]=Hx(l),Ce[5]=Vx(l),Ce[6]=Gx(l),Ce[7]=Wx(l),Ce[8]=Kx(l),Ce[9]=-.0005967612901927463,t=Fx(Ce,1/e),t*=Cx(-s)/Js(Zx*e),r<e&&(t=-t),t+=Rx(Js(s))/2,t}Z3.exports=Jx});var B3=h((ete,M3)=>{"use strict";function Xx(e,r){var t=1,n=e,i=r;return s;function s(){var l=t;return n+=1,t*=i/n,l}}M3.exports=Xx});var Xs=h((rte,U3)=>{"use strict";var Qx=ht(),Yx=B3();function jx(e,r,t){var n,i;return t=t||0,i=Yx(e,r),n=Qx(i,{initialValue:t}),n}U3.exports=jx});var V3=h((tte,H3)=>{"use strict";function eR(e){var r,t,n;return e===0?1/0:(e<0?r=-e:r=e,r<=1?(t=709811.662581658+e*(679979.8474157227+e*(293136.7857211597+e*(74887.54032914672+e*(12555.290582413863+e*(1443.4299244417066+e*(115.24194596137347+e*(6.309239205732627+e*(.22668404630224365+e*(.004826466289237662+e*4624429436045379e-20))))))))),n=0+e*(362880+e*(1026576+e*(1172700+e*(723680+e*(269325+e*(63273+e*(9450+e*(870+e*(45+e*1)))))))))):(e=1/e,t=4624429436045379e-20+e*(.004826466289237662+e*(.22668404630224365+e*(6.309239205732627+e*(115.24194596137347+e*(1443.4299244417066+e*(12555.290582413863+e*(74887.54032914672+e*(293136.7857211597+e*(679979.8474157227+e*709811.662581658))))))))),n=1+e*(45+e*(870+e*(9450+e*(63273+e*(269325+e*(723680+e*(1172700+e*(1026576+e*(362880+e*0)))))))))),t/n)}H3.exports=eR});var W3=h((nte,G3)=>{"use strict";var rR=V3();G3.exports=rR});var yt=h((ote,K3)=>{"use strict";var tR=W3();K3.exports=tR});var Q3=h((ite,X3)=>{"use strict";var nR=yt(),oR=fr(),iR=Ne(),sR=Ws(),aR=W(),uR=R(),Nr=V(),Xt=Q(),Qs=sr(),Ys=Ve(),J3=F(),cR=ar(),yo=Ge(),Qt=Or(),js=Qr(),lR=Ir();function fR(e,r){var t,n,i,s,l,u,o;return i=e+js-.5,o=(r-e-js+.5)/i,e<1?r<=Qt||e<1/cR?Nr(e*J3(r)-r-oR(e)):Xt(r,e)*Nr(-r)/iR(e):(uR(o*o*e)<=100&&e>150?(t=e*sR(o)+r*(.5-js)/i,t=Nr(t)):(s=e*J3(r/i),l=e-r,Ys(s,l)<=Qt||Qs(s,l)>=yo?(n=l/e,Ys(s,l)/2>Qt&&Qs(s,l)/2<yo?(u=Xt(r/i,e/2)*Nr(l/2),t=u*u):Ys(s,l)/4>Qt&&Qs(s,l)/4<yo&&r>e?(u=Xt(r/i,e/4)*Nr(l/4),t=u*u,t*=t):n>Qt&&n<yo?t=Xt(r*Nr(n)/i,e):t=Nr(s+l)):t=Xt(r/i,e)*Nr(l)),t*=aR(i/lR)/nR(e),t)}X3.exports=fR});var e6=h((ste,j3)=>{"use strict";var ea=S(),mR=Kr(),Y3=R(),pR=Wr(),dR=F(),vR=Q(),hR=Vn();function gR(e,r){var t,n;if(ea(e)||ea(r))return NaN;if(r===0)return 0;if(e===0)return-1;if(e<0&&r%2===0&&(e=-e),e>0){if((Y3(r*(e-1))<.5||Y3(r)<.2)&&(n=dR(e)*r,n<.5))return pR(n)}else if(hR(r)!==r)return NaN;return t=vR(e,r)-1,mR(t)||ea(t)?NaN:t}j3.exports=gR});var t6=h((ate,r6)=>{"use strict";var yR=e6();r6.exports=yR});var o6=h((ute,n6)=>{"use strict";function bR(e){var r,t,n;return e===0?-.01803556856784494:(e<0?r=-e:r=e,r<=1?(t=-.01803556856784494+e*(.02512664961998968+e*(.049410315156753225+e*(.0172491608709614+e*(-.0002594535632054381+e*(-.0005410098692152044+e*(-3245886498259485e-20+e*0)))))),n=1+e*(1.962029871977952+e*(1.4801966942423133+e*(.5413914320717209+e*(.09885042511280101+e*(.008213096746488934+e*(.00022493629192211576+e*-22335276320861708e-23))))))):(e=1/e,t=0+e*(-3245886498259485e-20+e*(-.0005410098692152044+e*(-.0002594535632054381+e*(.0172491608709614+e*(.049410315156753225+e*(.02512664961998968+e*-.01803556856784494)))))),n=-22335276320861708e-23+e*(.00022493629192211576+e*(.008213096746488934+e*(.09885042511280101+e*(.5413914320717209+e*(1.4801966942423133+e*(1.962029871977952+e*1))))))),t/n)}n6.exports=bR});var s6=h((cte,i6)=>{"use strict";function _R(e){var r,t,n;return e===0?.04906224540690395:(e<0?r=-e:r=e,r<=1?(t=.04906224540690395+e*(-.09691175301595212+e*(-.4149833583594954+e*(-.4065671242119384+e*(-.1584135863906922+e*(-.024014982064857155+e*-.0010034668769627955))))),n=1+e*(3.0234982984646304+e*(3.4873958536072385+e*(1.9141558827442668+e*(.5071377386143635+e*(.05770397226904519+e*.001957681026011072)))))):(e=1/e,t=-.0010034668769627955+e*(-.024014982064857155+e*(-.1584135863906922+e*(-.4065671242119384+e*(-.4149833583594954+e*(-.09691175301595212+e*.04906224540690395))))),n=.001957681026011072+e*(.05770397226904519+e*(.5071377386143635+e*(1.9141558827442668+e*(3.4873958536072385+e*(3.0234982984646304+e*1)))))),t/n)}i6.exports=_R});var u6=h((lte,a6)=>{"use strict";function wR(e){var r,t,n;return e===0?-.029232972183027003:(e<0?r=-e:r=e,r<=1?(t=-.029232972183027003+e*(.14421626775719232+e*(-.14244039073863127+e*(.05428096940550536+e*(-.008505359768683364+e*(.0004311713426792973+e*0))))),n=1+e*(-1.5016935605448505+e*(.846973248876495+e*(-.22009515181499575+e*(.02558279715597587+e*(-.0010066679553914337+e*-8271935218912905e-22)))))):(e=1/e,t=0+e*(.0004311713426792973+e*(-.008505359768683364+e*(.05428096940550536+e*(-.14244039073863127+e*(.14421626775719232+e*-.029232972183027003))))),n=-8271935218912905e-22+e*(-.0010066679553914337+e*(.02558279715597587+e*(-.22009515181499575+e*(.846973248876495+e*(-1.5016935605448505+e*1)))))),t/n)}a6.exports=wR});var l6=h((fte,c6)=>{"use strict";var ra=F(),qR=Re(),PR=o6(),AR=s6(),IR=u6(),ER=.15896368026733398,OR=.5281534194946289,NR=.45201730728149414;function kR(e,r,t){var n,i,s,l;if(e<qR)return-ra(e);if(r===0||t===0)return 0;if(i=0,e>2){if(e>=3){do e-=1,t-=1,i+=ra(e);while(e>=3);t=e-2}return s=t*(e+1),l=PR(t),i+=s*ER+s*l,i}return e<1&&(i+=-ra(e),t=r,r=e,e+=1),e<=1.5?(s=AR(r),n=r*t,i+=n*OR+n*s,i):(s=t*r,l=IR(-t),i+=s*NR+s*l,i)}c6.exports=kR});var v6=h((mte,d6)=>{"use strict";var f6=Ne(),m6=Wr(),TR=ve(),SR=S(),p6=l6();function $R(e){return SR(e)?NaN:e<0?e<-.5?f6(1+e)-1:m6(-TR(e)+p6(e+2,e+1,e)):e<2?m6(p6(e+1,e,e-1)):f6(1+e)-1}d6.exports=$R});var g6=h((pte,h6)=>{"use strict";var LR=v6();h6.exports=LR});var b6=h((dte,y6)=>{"use strict";function zR(e,r){var t,n,i,s;return t=-r,r=-r,n=e+1,i=1,l;function l(){return s=t/n,t*=r,i+=1,t/=i,n+=1,s}}y6.exports=zR});var w6=h((vte,_6)=>{"use strict";var FR=t6(),xR=ht(),RR=g6(),CR=b6();function ZR(e,r,t){var n,i,s,l,u;return i=RR(e),s=(i+1)/e,l=FR(r,e),i-=l,i/=e,u=CR(e,r),l+=1,n=t?s:0,i=-l*xR(u,{initialValue:(n-i)/l}),t&&(i=-i),[i,s]}_6.exports=ZR});var Yt=h((hte,q6)=>{"use strict";var DR=11754943508222875e-54;q6.exports=DR});var A6=h((gte,P6)=>{"use strict";var bo=R(),We=Yt(),MR=Re(),BR=1e6;function UR(e,r,t){var n,i,s,l,u,o,a;if(n=typeof e.next=="function",a=n?e.next().value:e(),l=a[1],s=a[0],l===0&&(l=We),u=l,o=0,n===!0)do a=e.next().value,a&&(o=a[1]+a[0]*o,o===0&&(o=We),u=a[1]+a[0]/u,u===0&&(u=We),o=1/o,i=u*o,l*=i);while(bo(i-1)>r&&--t);else do a=e(),a&&(o=a[1]+a[0]*o,o===0&&(o=We),u=a[1]+a[0]/u,u===0&&(u=We),o=1/o,i=u*o,l*=i);while(a&&bo(i-1)>r&&--t);return s/l}function HR(e,r,t){var n,i,s,l,u,o;if(n=typeof e.next=="function",o=n?e.next().value:e(),s=o[1],s===0&&(s=We),l=s,u=0,n===!0)do o=e.next().value,o&&(u=o[1]+o[0]*u,u===0&&(u=We),l=o[1]+o[0]/l,l===0&&(l=We),u=1/u,i=l*u,s*=i);while(o&&bo(i-1)>r&&--t);else do o=e(),o&&(u=o[1]+o[0]*u,u===0&&(u=We),l=o[1]+o[0]/l,l===0&&(l=We),u=1/u,i=l*u,s*=i);while(o&&bo(i-1)>r&&--t);return s}function VR(e,r){var t,n,i;return n={},arguments.length>1&&(n=r),t=n.maxIter||BR,i=n.tolerance||MR,n.keep?HR(e,i,t):UR(e,i,t)}P6.exports=VR});var O6=h((yte,E6)=>{"use strict";var I6=R(),GR=Re(),bt=Yt(),WR=1e6;function KR(e,r,t){var n,i,s,l,u,o;o=e(),u=o[1],i=o[0],u===0&&(u=bt),s=u,l=0;do o=e(),o&&(l=o[1]+o[0]*l,l===0&&(l=bt),s=o[1]+o[0]/s,s===0&&(s=bt),l=1/l,n=s*l,u*=n);while(o&&I6(n-1)>r&&--t);return i/u}function JR(e,r,t){var n,i,s,l,u;u=e(),l=u[1],l===0&&(l=bt),i=l,s=0;do u=e(),u&&(s=u[1]+u[0]*s,s===0&&(s=bt),i=u[1]+u[0]/i,i===0&&(i=bt),s=1/s,n=i*s,l*=n);while(u&&I6(n-1)>r&&--t);return l}function XR(e,r){var t,n,i;return n={},arguments.length>1&&(n=r),i=n.tolerance||GR,t=n.maxIter||WR,n.keep?JR(e,i,t):KR(e,i,t)}E6.exports=XR});var na=h((bte,N6)=>{"use strict";var QR=Hs(),YR=A6(),jR=O6(),ta;QR()?ta=YR:ta=jR;N6.exports=ta});var T6=h((_te,k6)=>{"use strict";function eC(e,r){var t=r-e+1,n=e,i=0;return s;function s(){return i+=1,t+=2,[i*(n-i),t]}}k6.exports=eC});var oa=h((wte,S6)=>{"use strict";var rC=na(),tC=T6();function nC(e,r){var t=tC(e,r);return 1/(r-e+1+rC(t))}S6.exports=nC});var F6=h((qte,z6)=>{"use strict";var oC=Oe(),jt=Ne(),ia=R(),$6=Q(),iC=F(),sC=ph(),L6=ar(),aC=Ge(),uC=Nh(),cC=Th(),lC=e3(),sa=i3(),fC=D3(),mC=Xs(),aa=Q3(),pC=w6(),dC=oa();function vC(e,r,t,n){var i,s,l,u,o,a,c,f,m,p,d,g,y,v;switch(c=0,f=n,a=r<30&&r<=e+1&&e<aC,a?(y=oC(r),m=y===r,l=m?!1:ia(y-r)===.5):(m=!1,l=!1),m&&e>.6?(f=!f,s=0):l&&e>.2?(f=!f,s=1):e<sC&&r>1?s=6:e>1e3&&(r<e||ia(r-50)/e<1)?(f=!f,s=7):e<.5?-.4/iC(e)<r?s=2:s=3:e<1.1?e*.75<r?s=2:s=3:(o=!1,t&&r>20&&(p=ia((e-r)/r),r>200?20/r>p*p&&(o=!0):p<.4&&(o=!0)),o?s=5:e-1/(3*e)<r?s=2:(s=4,f=!f)),s){case 0:c=cC(r,e),t===!1&&(c*=jt(r));break;case 1:c=lC(r,e),t===!1&&(c*=jt(r));break;case 2:c=t?aa(r,e):sa(r,e),c!==0&&(u=0,i=!1,f&&(u=t?1:jt(r),t||c>=1||L6*c>u?(u/=c,t||r<1||L6/r>u?(u*=-r,i=!0):u=0):u=0),c*=mC(r,e,u)/r,i&&(f=!1,c=-c));break;case 3:f=!f,d=pC(r,e,f),c=d[0],v=d[1],f=!1,t&&(c/=v);break;case 4:c=t?aa(r,e):sa(r,e),c!==0&&(c*=dC(r,e));break;case 5:c=fC(r,e),e>=r&&(f=!f);break;case 6:c=t?$6(e,r)/jt(r+1):$6(e,r)/r,c*=1-r*e/(r+1);break;case 7:c=t?aa(r,e):sa(r,e),c/=e,c!==0&&(c*=uC(r,e));break}return t&&c>1&&(c=1),f&&(g=t?1:jt(r),c=g-c),c}z6.exports=vC});var Z6=h((Pte,C6)=>{"use strict";var hC=fr(),gC=V(),Ke=F(),yC=Gt(),bC=Ge(),_C=B(),wC=Wt(),x6=F6(),R6=Xs(),qC=oa();function PC(e,r,t,n){var i,s,l,u;return e<0||r<=0?NaN:(i=t===void 0?!0:t,l=n,r>=wC&&!i?(l&&r*4<e?(u=r*Ke(e)-e,u+=Ke(qC(r,e))):!l&&r>4*e?(u=r*Ke(e)-e,s=0,u+=Ke(R6(r,e,s)/r)):(u=x6(e,r,!0,l),u===0?l?(u=1+1/(12*r)+1/(288*r*r),u=Ke(u)-r+(r-.5)*Ke(r),u+=Ke(yC)):(u=r*Ke(e)-e,s=0,u+=Ke(R6(r,e,s)/r)):u=Ke(u)+hC(r)),u>bC?_C:gC(u)):x6(e,r,i,l))}C6.exports=PC});var _o=h((Ate,D6)=>{"use strict";var AC=Z6();D6.exports=AC});var H6=h((Ite,U6)=>{"use strict";var _t=V(),wo=Q(),IC=F(),M6=Ge(),B6=Or();function EC(e,r){var t,n;return n=e*IC(r),r>=1?n<M6&&-r>B6?t=wo(r,e)*_t(-r):e>=1?t=wo(r/_t(r/e),e):t=_t(n-r):n>B6?t=wo(r,e)*_t(-r):r/e<M6?t=wo(r/_t(r/e),e):t=_t(n-r),t}U6.exports=EC});var W6=h((Ete,G6)=>{"use strict";var OC=yt(),NC=fr(),kC=Ne(),TC=ve(),SC=W(),$C=R(),kr=V(),en=Q(),ua=sr(),ca=Ve(),V6=F(),qo=Ge(),rn=Or(),la=Qr(),LC=Ir();function zC(e,r){var t,n,i,s,l,u,o;return i=e+la-.5,o=(r-e-la+.5)/i,e<1?r<=rn?kr(e*V6(r)-r-NC(e)):en(r,e)*kr(-r)/kC(e):($C(o*o*e)<=100&&e>150?(t=e*(TC(o)-o)+r*(.5-la)/i,t=kr(t)):(s=e*V6(r/i),l=e-r,ca(s,l)<=rn||ua(s,l)>=qo?(n=l/e,ca(s,l)/2>rn&&ua(s,l)/2<qo?(u=en(r/i,e/2)*kr(l/2),t=u*u):ca(s,l)/4>rn&&ua(s,l)/4<qo&&r>e?(u=en(r/i,e/4)*kr(l/4),t=u*u,t*=t):n>rn&&n<qo?t=en(r*kr(n)/i,e):t=kr(s+l)):t=en(r/i,e)*kr(l)),t*=SC(i/LC)/OC(e),t)}G6.exports=zC});var Y6=h((Ote,Q6)=>{"use strict";var FC=uo(),K6=Ds(),xC=_o(),RC=ve(),Po=R(),J6=Q(),CC=F(),ZC=wr(),X6=Re(),DC=H6(),MC=W6(),Tr=new Array(30);function BC(e,r,t,n,i,s,l){var u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P,A,N;if(m=r-1,A=e+m/2,n<.35?y=RC(-n):y=CC(t),N=-A*y,b=MC(r,N),b<=ZC)return i;for(l?(u=b/FC(e,r),u/=J6(A,r)):u=DC(r,N)/J6(A,r),u*=s,Tr[0]=1,_=xC(N,r,!0,!0),_/=b,c=i+u*_,a=1,p=y/2,p*=p,d=1,v=4*A*A,f=r,q=1;q<Tr.length;++q){for(a+=2,Tr[q]=0,g=r-q,o=3,w=1;w<q;++w)g=w*r-q,Tr[q]+=g*Tr[q-w]/K6(o),o+=2;if(Tr[q]/=q,Tr[q]+=m/K6(a),_=(f*(f+1)*_+(N+f+1)*d)/v,d*=p,f+=2,P=u*Tr[q]*_,c+=P,P>1){if(Po(P)<Po(X6*c))break}else if(Po(P/X6)<Po(c))break}return c}Q6.exports=BC});var e4=h((Nte,j6)=>{"use strict";function UC(e,r,t){var n,i;if(t===0)return 1;for(n=1,i=0;i<t;i++)n*=(e+i)/(r+i);return n}j6.exports=UC});var n4=h((kte,t4)=>{"use strict";var r4=R(),HC=sr();function VC(e,r){return HC(r4(e),r4(r))}t4.exports=VC});var i4=h((Tte,o4)=>{"use strict";var GC=n4();o4.exports=GC});var u4=h((Ste,a4)=>{"use strict";var s4=R(),WC=Ve();function KC(e,r){return WC(s4(e),s4(r))}a4.exports=KC});var l4=h(($te,c4)=>{"use strict";var JC=u4();c4.exports=JC});var Io=h((Lte,p4)=>{"use strict";var fa=yt(),XC=i4(),QC=l4(),f4=Wr(),Sr=ve(),m4=W(),Ao=R(),Je=V(),Xe=Q(),YC=Ve(),ke=F(),Qe=Ge(),wt=Or(),ma=Qr(),jC=Ir();function eZ(e,r,t,n,i){var s,l,u,o,a,c,f,m,p,d,g,y,v,b;if(!i)return Xe(t,e)*Xe(n,r);if(v=e+r,o=e+ma-.5,a=r+ma-.5,c=v+ma-.5,s=fa(v),s/=fa(e)*fa(r),s*=m4(a/jC),s*=m4(o/c),f=(t*r-n*o)/o,m=(n*e-t*a)/a,QC(f,m)<.2)if(f*m>0||YC(e,r)<1)Ao(f)<.1?s*=Je(e*Sr(f)):s*=Xe(t*c/o,e),Ao(m)<.1?s*=Je(r*Sr(m)):s*=Xe(n*c/a,r);else if(XC(f,m)<.5)l=e<r,u=r/e,l&&u*m<.1||!l&&f/u>.1?(p=f4(u*Sr(m)),p=f+p+p*f,p=e*Sr(p),s*=Je(p)):(p=f4(Sr(f)/u),p=m+p+p*m,p=r*Sr(p),s*=Je(p));else if(Ao(f)<Ao(m))if(b=e*Sr(f)+r*ke(n*c/a),b<=wt||b>=Qe){if(b+=ke(s),b>=Qe)return NaN;s=Je(b)}else s*=Je(b);else if(b=r*Sr(m)+e*ke(t*c/o),b<=wt||b>=Qe){if(b+=ke(s),b>=Qe)return NaN;s=Je(b)}else s*=Je(b);else if(g=t*c/o,y=n*c/a,f=e*ke(g),m=r*ke(y),f>=Qe||f<=wt||m>=Qe||m<=wt)if(e<r)if(d=Xe(y,r/e),p=e*(ke(g)+ke(d)),p<Qe&&p>wt)s*=Xe(d*g,e);else{if(m+=f+ke(s),m>=Qe)return NaN;s=Je(m)}else if(d=Xe(g,e/r),p=(ke(d)+ke(y))*r,p<Qe&&p>wt)s*=Xe(d*y,r);else{if(m+=f+ke(s),m>=Qe)return NaN;s=Je(m)}else s*=Xe(g,e)*Xe(y,r);return s}p4.exports=eZ});var v4=h((zte,d4)=>{"use strict";var rZ=na(),tZ=Io(),nZ={keep:!0,maxIter:1e3};function oZ(e,r,t,n){var i=0;return s;function s(){var l,u,o;return u=(e+i-1)*(e+r+i-1)*i*(r-i)*t*t,l=e+2*i-1,u/=l*l,o=i,o+=i*(r-i)*t/(e+2*i-1),o+=(e+i)*(e*n-r*t+1+i*(2-t))/(e+2*i+1),i+=1,[u,o]}}function iZ(e,r,t,n,i,s){var l,u,o;return l=tZ(e,r,t,n,i),s&&(s[1]=l),l===0?l:(o=oZ(e,r,t,n),u=rZ(o,nZ),l/u)}d4.exports=iZ});var g4=h((Fte,h4)=>{"use strict";var sZ=9007199254740991;h4.exports=sZ});var b4=h((xte,y4)=>{"use strict";function aZ(e,r){var t=0,n;if(e===0)return r;if(r===0)return e;for(;(e&1)===0&&(r&1)===0;)e>>>=1,r>>>=1,t+=1;for(;(e&1)===0;)e>>>=1;for(;r;){for(;(r&1)===0;)r>>>=1;e>r&&(n=r,r=e,e=n),r-=e}return e<<t}y4.exports=aZ});var w4=h((Rte,_4)=>{"use strict";function uZ(e,r){var t=1,n;if(e===0)return r;if(r===0)return e;for(;e%2===0&&r%2===0;)e/=2,r/=2,t*=2;for(;e%2===0;)e/=2;for(;r;){for(;r%2===0;)r/=2;e>r&&(n=r,r=e,e=n),r-=e}return t*e}_4.exports=uZ});var N4=h((Cte,O4)=>{"use strict";var q4=S(),P4=qr(),A4=B(),I4=te(),E4=Ss(),cZ=b4(),lZ=w4();function fZ(e,r){return q4(e)||q4(r)?NaN:e===A4||r===A4||e===I4||r===I4?NaN:P4(e)&&P4(r)?(e<0&&(e=-e),r<0&&(r=-r),e<=E4&&r<=E4?cZ(e,r):lZ(e,r)):NaN}O4.exports=fZ});var T4=h((Zte,k4)=>{"use strict";var mZ=N4();k4.exports=mZ});var z4=h((Dte,L4)=>{"use strict";var pZ=g4(),dZ=B(),S4=qr(),$4=S(),vZ=Kn(),hZ=Oe(),gZ=T4();function pa(e,r){var t,n,i,s,l,u,o;if($4(e)||$4(r))return NaN;if(!S4(e)||!S4(r))return NaN;if(r<0||(n=1,e<0&&(e=-e+r-1,vZ(r)&&(n*=-1)),r>e))return 0;if(r===0||r===e)return n;if(r===1||r===e-1)return n*e;for(e-r<r&&(r=e-r),o=hZ(pZ/e),t=1,l=1;l<=r&&!(t>o);l++)t*=e,t/=l,e-=1;return l>r?n*t:(i=pa(e,r-l+1),i===dZ?n*i:(s=pa(r,r-l+1),u=gZ(i,s),i/=u,s/=u,t/=s,n*t*i))}L4.exports=pa});var x4=h((Mte,F4)=>{"use strict";var yZ=z4();F4.exports=yZ});var Z4=h((Bte,C4)=>{"use strict";var R4=x4(),Yr=Oe(),tn=Q(),bZ=wr();function _Z(e,r,t,n){var i,s,l,u,o;if(s=tn(t,e),s>bZ)for(u=s,o=Yr(e-1);o>r;o--)u*=(o+1)*n/((e-o)*t),s+=u;else if(l=Yr(e*t),l<=r+1&&(l=Yr(r+2)),s=tn(t,l)*tn(n,e-l),s*=R4(Yr(e),Yr(l)),s===0)for(o=l-1;o>r;o--)s+=tn(t,o)*tn(n,e-o),s*=R4(Yr(e),Yr(o));else{for(u=s,i=s,o=l-1;o>r;o--)u*=(o+1)*n/((e-o)*t),s+=u;for(u=i,o=l+1;o<=e;o++)u*=(e-o+1)*t/(o*n),s+=u}return s}C4.exports=_Z});var M4=h((Ute,D4)=>{"use strict";var wZ=Io();function qZ(e,r,t,n,i,s,l){var u,o,a,c;if(u=wZ(e,r,t,n,s),l&&(l[1]=u),u/=e,u===0)return u;for(a=1,o=1,c=0;c<i-1;++c)o*=(e+r+c)*t/(e+c+1),a+=o;return u*=a,u}D4.exports=qZ});var G4=h((Hte,V4)=>{"use strict";var da=yt(),PZ=ht(),AZ=ve(),IZ=W(),va=V(),Eo=Q(),nn=F(),EZ=wr(),B4=Ge(),U4=Or(),ha=Qr(),OZ=Ir(),H4={maxTerms:100};function NZ(e,r,t,n){var i=1-r,s=1;return l;function l(){var u=n/e;return e+=1,n*=i*t/s,s+=1,i+=1,u}}function kZ(e,r,t,n,i,s,l){var u,o,a,c,f,m,p,d;return i?(p=e+r,o=e+ha-.5,a=r+ha-.5,c=p+ha-.5,u=da(p)/(da(e)*da(r)),f=nn(c/a)*(r-.5),m=nn(t*c/o)*e,f>U4&&f<B4&&m>U4&&m<B4?(e*r<a*10?u*=va((r-.5)*AZ(e/a)):u*=Eo(c/a,r-.5),u*=Eo(t*c/o,e),u*=IZ(o/OZ),s&&(s[1]=u*Eo(l,r))):(u=nn(u)+f+m+(nn(o)-1)/2,s&&(s[1]=va(u+r*nn(l))),u=va(u))):u=Eo(t,e),u<EZ?n:(d=NZ(e,r,t,u),H4.initialValue=n,PZ(d,H4))}V4.exports=kZ});var ba=h((Vte,j4)=>{"use strict";var TZ=S(),SZ=Wr(),Oo=Oe(),W4=ve(),K4=Hn(),Te=Os(),ga=W(),$Z=V(),on=Q(),LZ=sr(),J4=Ve(),No=ar(),X4=wr(),zZ=Ss(),FZ=jn(),Y4=ur(),$r=Y6(),ya=e4(),xZ=Io(),Q4=v4(),RZ=Z4(),sn=M4(),Ye=G4(),CZ=1/Y4;function ZZ(e,r,t,n,i,s,l,u){var o,a,c,f,m,p,d,g,y,v,b,_;if(_=1-e,d=u,g=u+l,s[g]=-1,TZ(e)||e<0||e>1)return s[d]=NaN,s[g]=NaN,s;if(n){if(r<0||t<0)return s[d]=NaN,s[g]=NaN,s;if(r===0){if(t===0)return s[d]=NaN,s[g]=NaN,s;if(t>0)return s[d]=i?0:1,s}else if(t===0&&r>0)return s[d]=i?1:0,s}else if(r<=0||t<=0)return s[d]=NaN,s[g]=NaN,s;return e===0?(r===1?s[g]=1:s[g]=r<1?No/2:X4*2,i?(s[d]=n?1:Te(r,t),s):(s[d]=0,s)):e===1?(t===1?s[g]=1:s[g]=t<1?No/2:X4*2,i?s[d]=0:s[d]=n?1:Te(r,t),s):r===.5&&t===.5?(s[g]=CZ*ga(_*e),b=K4(ga(i?_:e)),b/=FZ,n||(b*=Y4),s[d]=b,s):(r===1&&(p=t,t=r,r=p,p=_,_=e,e=p,i=!i),t===1?r===1?(s[d]=i?_:e,s[g]=1,s):(s[g]=r*on(e,r-1),_<.5?b=i?-SZ(r*W4(-_)):$Z(r*W4(-_)):b=i?-(on(e,r)-1):on(e,r),n||(b/=r),s[d]=b,s):(J4(r,t)<=1?(e>.5&&(p=t,t=r,r=p,p=_,_=e,e=p,i=!i),LZ(r,t)<=1?r>=J4(.2,t)||on(e,r)<=.9?i?(c=-(n?1:Te(r,t)),i=!1,c=-Ye(r,t,e,c,n,s,_)):c=Ye(r,t,e,0,n,s,_):(p=t,t=r,r=p,p=_,_=e,e=p,i=!i,_>=.3?i?(c=-(n?1:Te(r,t)),i=!1,c=-Ye(r,t,e,c,n,s,_)):c=Ye(r,t,e,0,n,s,_):(n?a=1:a=ya(r+t,r,20),c=sn(r,t,e,_,20,n,s),i?(c-=n?1:Te(r,t),i=!1,c=-$r(r+20,t,e,_,c,a,n)):c=$r(r+20,t,e,_,c,a,n))):t<=1||e<.1&&on(t*e,r)<=.7?i?(c=-(n?1:Te(r,t)),i=!1,c=-Ye(r,t,e,c,n,s,_)):c=Ye(r,t,e,0,n,s,_):(p=t,t=r,r=p,p=_,_=e,e=p,i=!i,_>=.3?i?(c=-(n?1:Te(r,t)),i=!1,c=-Ye(r,t,e,c,n,s,_)):c=Ye(r,t,e,0,n,s,_):r>=15?i?(c=-(n?1:Te(r,t)),i=!1,c=-$r(r,t,e,_,c,1,n)):c=$r(r,t,e,_,0,1,n):(n?a=1:a=ya(r+t,r,20),c=sn(r,t,e,_,20,n,s),i?(c-=n?1:Te(r,t),i=!1,c=-$r(r+20,t,e,_,c,a,n)):c=$r(r+20,t,e,_,c,a,n)))):(r<t?o=r-(r+t)*e:o=(r+t)*_-t,o<0&&(p=t,t=r,r=p,p=_,_=e,e=p,i=!i),t<40?Oo(r)===r&&Oo(t)===t&&r<zZ-100?(y=r-1,v=t+y,c=RZ(v,y,e,_),n||(c*=Te(r,t))):t*e<=.7?i?(c=-(n?1:Te(r,t)),i=!1,c=-Ye(r,t,e,c,n,s,_)):c=Ye(r,t,e,0,n,s,_):r>15?(v=Oo(t),v===t&&(v-=1),f=t-v,n?a=1:a=ya(r+f,f,v),c=sn(f,r,_,e,v,n),c=$r(r,f,e,_,c,1,n),c/=a):n?(v=Oo(t),f=t-v,f<=0&&(v-=1,f+=1),c=sn(f,r,_,e,v,n),c+=sn(r,f,e,_,20,n),i&&(c-=1),c=$r(r+20,f,e,_,c,1,n),i&&(c=-c,i=!1)):c=Q4(r,t,e,_,n,s):c=Q4(r,t,e,_,n,s)),s[g]<0&&(s[g]=xZ(r,t,e,_,!0)),m=_*e,s[g]!==0&&(No*m<s[g]?s[g]=No/2:s[g]/=m),s[d]=i?(n?1:Te(r,t))-c:c,s))}j4.exports=ZZ});var rg=h((Gte,eg)=>{"use strict";var DZ=ba();function MZ(e,r,t,n,i){return DZ(e,r,t,n,i,[0,0],1,0)}eg.exports=MZ});var _a=h((Wte,ng)=>{"use strict";var BZ=qe(),tg=rg(),UZ=ba();BZ(tg,"assign",UZ);ng.exports=tg});var ig=h((Kte,og)=>{"use strict";var HZ=_a().assign;function VZ(e,r,t,n,i){var s=[0,0];return n=n!==!1,i=i===!0,HZ(e,r,t,n,i,s,1,0),s[0]}og.exports=VZ});var Lr=h((Jte,sg)=>{"use strict";var GZ=ig();sg.exports=GZ});var lg=h((Xte,cg)=>{"use strict";var ag=Lr(),ug=S(),WZ=Q();function KZ(e,r){var t,n,i;return ug(e)||ug(r)||r<=0?NaN:e===0?.5:(t=WZ(e,2),r>2*t?(i=t/(r+t),n=ag(i,.5,r/2,!0,!0)/2):(i=r/(r+t),n=ag(i,r/2,.5,!0,!1)/2),e>0?1-n:n)}cg.exports=KZ});var mg=h((Qte,fg)=>{"use strict";function JZ(e){return r;function r(){return e}}fg.exports=JZ});var pr=h((Yte,pg)=>{"use strict";var XZ=mg();pg.exports=XZ});var gg=h((jte,hg)=>{"use strict";var QZ=pr(),dg=Lr(),vg=S(),YZ=Q();function jZ(e){if(vg(e)||e<=0)return QZ(NaN);return r;function r(t){var n,i,s;return vg(t)?NaN:t===0?.5:(n=YZ(t,2),e>2*n?(s=n/(e+n),i=dg(s,.5,e/2,!0,!0)/2):(s=e/(e+n),i=dg(s,e/2,.5,!0,!1)/2),t>0?1-i:i)}}hg.exports=jZ});var wa=h((ene,bg)=>{"use strict";var eD=qe(),yg=lg(),rD=gg();eD(yg,"factory",rD);bg.exports=yg});var Pa=h((qa,_g)=>{(function(e,r){typeof qa=="object"?_g.exports=r():typeof define=="function"&&define.amd?define(r):e.jStat=r()})(qa,function(){var e=(function(r,t){var n=Array.prototype.concat,i=Array.prototype.slice,s=Object.prototype.toString;function l(y,v){var b=y>v?y:v;return r.pow(10,17-~~(r.log(b>0?b:-b)*r.LOG10E))}var u=Array.isArray||function(v){return s.call(v)==="[object Array]"};function o(y){return s.call(y)==="[object Function]"}function a(y){return typeof y=="number"?y-y===0:!1}function c(y){return n.apply([],y)}function f(){return new f._init(arguments)}f.fn=f.prototype,f._init=function(v){if(u(v[0]))if(u(v[0][0])){o(v[1])&&(v[0]=f.map(v[0],v[1]));for(var b=0;b<v[0].length;b++)this[b]=v[0][b];this.length=v[0].length}else this[0]=o(v[1])?f.map(v[0],v[1]):v[0],this.length=1;else if(a(v[0]))this[0]=f.seq.apply(null,v),this.length=1;else{if(v[0]instanceof f)return f(v[0].toArray());this[0]=[],this.length=1}return this},f._init.prototype=f.prototype,f._init.constructor=f,f.utils={calcRdx:l,isArray:u,isFunction:o,isNumber:a,toVector:c},f._random_fn=r.random,f.setRandom=function(v){if(typeof v!="function")throw new TypeError("fn is not a function");f._random_fn=v},f.extend=function(v){var b,_;if(arguments.length===1){for(_ in v)f[_]=v[_];return this}for(b=1;b<arguments.length;b++)for(_ in arguments[b])v[_]=arguments[b][_];return v},f.rows=function(v){return v.length||1},f.cols=function(v){return v[0].length||1},f.dimensions=function(v){return{rows:f.rows(v),cols:f.cols(v)}},f.row=function(v,b){return u(b)?b.map(function(_){return f.row(v,_)}):v[b]},f.rowa=function(v,b){return f.row(v,b)},f.col=function(v,b){if(u(b)){var _=f.arange(v.length).map(function(){return new Array(b.length)});return b.forEach(function(P,A){f.arange(v.length).forEach(function(N){_[N][A]=v[N][P]})}),_}for(var w=new Array(v.length),q=0;q<v.length;q++)w[q]=[v[q][b]];return w},f.cola=function(v,b){return f.col(v,b).map(function(_){return _[0]})},f.diag=function(v){for(var b=f.rows(v),_=new Array(b),w=0;w<b;w++)_[w]=[v[w][w]];return _},f.antidiag=function(v){for(var b=f.rows(v)-1,_=new Array(b),w=0;b>=0;b--,w++)_[w]=[v[w][b]];return _},f.transpose=function(v){var b=[],_,w,q,P,A;for(u(v[0])||(v=[v]),w=v.length,q=v[0].length,A=0;A<q;A++){for(_=new Array(w),P=0;P<w;P++)_[P]=v[P][A];b.push(_)}return b.length===1?b[0]:b},f.map=function(v,b,_){var w,q,P,A,N;for(u(v[0])||(v=[v]),q=v.length,P=v[0].length,A=_?v:new Array(q),w=0;w<q;w++)for(A[w]||(A[w]=new Array(P)),N=0;N<P;N++)A[w][N]=b(v[w][N],w,N);return A.length===1?A[0]:A},f.cumreduce=function(v,b,_){var w,q,P,A,N;for(u(v[0])||(v=[v]),q=v.length,P=v[0].length,A=_?v:new Array(q),w=0;w<q;w++)for(A[w]||(A[w]=new Array(P)),P>0&&(A[w][0]=v[w][0]),N=1;N<P;N++)A[w][N]=b(A[w][N-1],v[w][N]);return A.length===1?A[0]:A},f.alter=function(v,b){return f.map(v,b,!0)},f.create=function(v,b,_){var w=new Array(v),q,P;for(o(b)&&(_=b,b=v),q=0;q<v;q++)for(w[q]=new Array(b),P=0;P<b;P++)w[q][P]=_(q,P);return w};function m(){return 0}f.zeros=function(v,b){return a(b)||(b=v),f.create(v,b,m)};function p(){return 1}f.ones=function(v,b){return a(b)||(b=v),f.create(v,b,p)},f.rand=function(v,b){return a(b)||(b=v),f.create(v,b,f._random_fn)};function d(y,v){return y===v?1:0}f.identity=function(v,b){return a(b)||(b=v),f.create(v,b,d)},f.symmetric=function(v){var b=v.length,_,w;if(v.length!==v[0].length)return!1;for(_=0;_<b;_++)for(w=0;w<b;w++)if(v[w][_]!==v[_][w])return!1;return!0},f.clear=function(v){return f.alter(v,m)},f.seq=function(v,b,_,w){o(w)||(w=!1);var q=[],P=l(v,b),A=(b*P-v*P)/((_-1)*P),N=v,k;for(k=0;N<=b&&k<_;k++,N=(v*P+A*P*k)/P)q.push(w?w(N,k):N);return q},f.arange=function(v,b,_){var w=[],q;if(_=_||1,b===t&&(b=v,v=0),v===b||_===0)return[];if(v<b&&_<0)return[];if(v>b&&_>0)return[];if(_>0)for(q=v;q<b;q+=_)w.push(q);else for(q=v;q>b;q+=_)w.push(q);return w},f.slice=(function(){function y(b,_,w,q){var P,A=[],N=b.length;if(_===t&&w===t&&q===t)return f.copy(b);if(_=_||0,w=w||b.length,_=_>=0?_:N+_,w=w>=0?w:N+w,q=q||1,_===w||q===0)return[];if(_<w&&q<0)return[];if(_>w&&q>0)return[];if(q>0)for(P=_;P<w;P+=q)A.push(b[P]);else for(P=_;P>w;P+=q)A.push(b[P]);return A}function v(b,_){var w,q;if(_=_||{},a(_.row)){if(a(_.col))return b[_.row][_.col];var P=f.rowa(b,_.row);return w=_.col||{},y(P,w.start,w.end,w.step)}if(a(_.col)){var A=f.cola(b,_.col);return q=_.row||{},y(A,q.start,q.end,q.step)}q=_.row||{},w=_.col||{};var N=y(b,q.start,q.end,q.step);return N.map(function(k){return y(k,w.start,w.end,w.step)})}return v})(),f.sliceAssign=function(v,b,_){var w,q;if(a(b.row)){if(a(b.col))return v[b.row][b.col]=_;b.col=b.col||{},b.col.start=b.col.start||0,b.col.end=b.col.end||v[0].length,b.col.step=b.col.step||1,w=f.arange(b.col.start,r.min(v.length,b.col.end),b.col.step);var P=b.row;return w.forEach(function(N,k){v[P][N]=_[k]}),v}if(a(b.col)){b.row=b.row||{},b.row.start=b.row.start||0,b.row.end=b.row.end||v.length,b.row.step=b.row.step||1,q=f.arange(b.row.start,r.min(v[0].length,b.row.end),b.row.step);var A=b.col;return q.forEach(function(N,k){v[N][A]=_[k]}),v}return _[0].length===t&&(_=[_]),b.row.start=b.row.start||0,b.row.end=b.row.end||v.length,b.row.step=b.row.step||1,b.col.start=b.col.start||0,b.col.end=b.col.end||v[0].length,b.col.step=b.col.step||1,q=f.arange(b.row.start,r.min(v.length,b.row.end),b.row.step),w=f.arange(b.col.start,r.min(v[0].length,b.col.end),b.col.step),q.forEach(function(N,k){w.forEach(function(D,Z){v[N][D]=_[k][Z]})}),v},f.diagonal=function(v){var b=f.zeros(v.length,v.length);return v.forEach(function(_,w){b[w][w]=_}),b},f.copy=function(v){return v.map(function(b){return a(b)?b:b.map(function(_){return _})})};var g=f.prototype;return g.length=0,g.push=Array.prototype.push,g.sort=Array.prototype.sort,g.splice=Array.prototype.splice,g.slice=Array.prototype.slice,g.toArray=function(){return this.length>1?i.call(this):i.call(this)[0]},g.map=function(v,b){return f(f.map(this,v,b))},g.cumreduce=function(v,b){return f(f.cumreduce(this,v,b))},g.alter=function(v){return f.alter(this,v),this},(function(y){for(var v=0;v<y.length;v++)(function(b){g[b]=function(_){var w=this,q;return _?(setTimeout(function(){_.call(w,g[b].call(w))}),this):(q=f[b](this),u(q)?f(q):q)}})(y[v])})("transpose clear symmetric rows cols dimensions diag antidiag".split(" ")),(function(y){for(var v=0;v<y.length;v++)(function(b){g[b]=function(_,w){var q=this;return w?(setTimeout(function(){w.call(q,g[b].call(q,_))}),this):f(f[b](this,_))}})(y[v])})("row col".split(" ")),(function(y){for(var v=0;v<y.length;v++)(function(b){g[b]=function(){return f(f[b].apply(null,arguments))}})(y[v])})("create zeros ones rand identity".split(" ")),f})(Math);return(function(r,t){var n=r.utils.isFunction;function i(u,o){return u-o}function s(u,o,a){return t.max(o,t.min(u,a))}r.sum=function(o){for(var a=0,c=o.length;--c>=0;)a+=o[c];return a},r.sumsqrd=function(o){for(var a=0,c=o.length;--c>=0;)a+=o[c]*o[c];return a},r.sumsqerr=function(o){for(var a=r.mean(o),c=0,f=o.length,m;--f>=0;)m=o[f]-a,c+=m*m;return c},r.sumrow=function(o){for(var a=0,c=o.length;--c>=0;)a+=o[c];return a},r.product=function(o){for(var a=1,c=o.length;--c>=0;)a*=o[c];return a},r.min=function(o){for(var a=o[0],c=0;++c<o.length;)o[c]<a&&(a=o[c]);return a},r.max=function(o){for(var a=o[0],c=0;++c<o.length;)o[c]>a&&(a=o[c]);return a},r.unique=function(o){for(var a={},c=[],f=0;f<o.length;f++)a[o[f]]||(a[o[f]]=!0,c.push(o[f]));return c},r.mean=function(o){return r.sum(o)/o.length},r.meansqerr=function(o){return r.sumsqerr(o)/o.length},r.geomean=function(o){var a=o.map(t.log),c=r.mean(a);return t.exp(c)},r.median=function(o){var a=o.length,c=o.slice().sort(i);return a&1?c[a/2|0]:(c[a/2-1]+c[a/2])/2},r.cumsum=function(o){return r.cumreduce(o,function(a,c){return a+c})},r.cumprod=function(o){return r.cumreduce(o,function(a,c){return a*c})},r.diff=function(o){var a=[],c=o.length,f;for(f=1;f<c;f++)a.push(o[f]-o[f-1]);return a},r.rank=function(u){var o,a=[],c={};for(o=0;o<u.length;o++){var f=u[o];c[f]?c[f]++:(c[f]=1,a.push(f))}var m=a.sort(i),p={},d=1;for(o=0;o<m.length;o++){var f=m[o],g=c[f],y=d,v=d+g-1,b=(y+v)/2;p[f]=b,d+=g}return u.map(function(_){return p[_]})},r.mode=function(o){var a=o.length,c=o.slice().sort(i),f=1,m=0,p=0,d=[],g;for(g=0;g<a;g++)c[g]===c[g+1]?f++:(f>m?(d=[c[g]],m=f,p=0):f===m&&(d.push(c[g]),p++),f=1);return p===0?d[0]:d},r.range=function(o){return r.max(o)-r.min(o)},r.variance=function(o,a){return r.sumsqerr(o)/(o.length-(a?1:0))},r.pooledvariance=function(o){var a=o.reduce(function(f,m){return f+r.sumsqerr(m)},0),c=o.reduce(function(f,m){return f+m.length},0);return a/(c-o.length)},r.deviation=function(u){for(var o=r.mean(u),a=u.length,c=new Array(a),f=0;f<a;f++)c[f]=u[f]-o;return c},r.stdev=function(o,a){return t.sqrt(r.variance(o,a))},r.pooledstdev=function(o){return t.sqrt(r.pooledvariance(o))},r.meandev=function(o){for(var a=r.mean(o),c=[],f=o.length-1;f>=0;f--)c.push(t.abs(o[f]-a));return r.mean(c)},r.meddev=function(o){for(var a=r.median(o),c=[],f=o.length-1;f>=0;f--)c.push(t.abs(o[f]-a));return r.median(c)},r.coeffvar=function(o){return r.stdev(o)/r.mean(o)},r.quartiles=function(o){var a=o.length,c=o.slice().sort(i);return[c[t.round(a/4)-1],c[t.round(a/2)-1],c[t.round(a*3/4)-1]]},r.quantiles=function(o,a,c,f){var m=o.slice().sort(i),p=[a.length],d=o.length,g,y,v,b,_,w;for(typeof c>"u"&&(c=3/8),typeof f>"u"&&(f=3/8),g=0;g<a.length;g++)y=a[g],v=c+y*(1-c-f),b=d*y+v,_=t.floor(s(b,1,d-1)),w=s(b-_,0,1),p[g]=(1-w)*m[_-1]+w*m[_];return p},r.percentile=function(o,a,c){var f=o.slice().sort(i),m=a*(f.length+(c?1:-1))+(c?0:1),p=parseInt(m),d=m-p;return p+1<f.length?f[p-1]+d*(f[p]-f[p-1]):f[p-1]},r.percentileOfScore=function(o,a,c){var f=0,m=o.length,p=!1,d,g;for(c==="strict"&&(p=!0),g=0;g<m;g++)d=o[g],(p&&d<a||!p&&d<=a)&&f++;return f/m},r.histogram=function(o,a){a=a||4;var c=r.min(o),f=(r.max(o)-c)/a,m=o.length,p=[],d;for(d=0;d<a;d++)p[d]=0;for(d=0;d<m;d++)p[t.min(t.floor((o[d]-c)/f),a-1)]+=1;return p},r.covariance=function(o,a){var c=r.mean(o),f=r.mean(a),m=o.length,p=new Array(m),d;for(d=0;d<m;d++)p[d]=(o[d]-c)*(a[d]-f);return r.sum(p)/(m-1)},r.corrcoeff=function(o,a){return r.covariance(o,a)/r.stdev(o,1)/r.stdev(a,1)},r.spearmancoeff=function(u,o){return u=r.rank(u),o=r.rank(o),r.corrcoeff(u,o)},r.stanMoment=function(o,a){for(var c=r.mean(o),f=r.stdev(o),m=o.length,p=0,d=0;d<m;d++)p+=t.pow((o[d]-c)/f,a);return p/o.length},r.skewness=function(o){return r.stanMoment(o,3)},r.kurtosis=function(o){return r.stanMoment(o,4)-3};var l=r.prototype;(function(u){for(var o=0;o<u.length;o++)(function(a){l[a]=function(c,f){var m=[],p=0,d=this;if(n(c)&&(f=c,c=!1),f)return setTimeout(function(){f.call(d,l[a].call(d,c))}),this;if(this.length>1){for(d=c===!0?this:this.transpose();p<d.length;p++)m[p]=r[a](d[p]);return m}return r[a](this[0],c)}})(u[o])})("cumsum cumprod".split(" ")),(function(u){for(var o=0;o<u.length;o++)(function(a){l[a]=function(c,f){var m=[],p=0,d=this;if(n(c)&&(f=c,c=!1),f)return setTimeout(function(){f.call(d,l[a].call(d,c))}),this;if(this.length>1){for(a!=="sumrow"&&(d=c===!0?this:this.transpose());p<d.length;p++)m[p]=r[a](d[p]);return c===!0?r[a](r.utils.toVector(m)):m}return r[a](this[0],c)}})(u[o])})("sum sumsqrd sumsqerr sumrow product min max unique mean meansqerr geomean median diff rank mode range variance deviation stdev meandev meddev coeffvar quartiles histogram skewness kurtosis".split(" ")),(function(u){for(var o=0;o<u.length;o++)(function(a){l[a]=function(){var c=[],f=0,m=this,p=Array.prototype.slice.call(arguments),d;if(n(p[p.length-1])){d=p[p.length-1];var g=p.slice(0,p.length-1);return setTimeout(function(){d.call(m,l[a].apply(m,g))}),this}else{d=void 0;var y=function(b){return r[a].apply(m,[b].concat(p))}}if(this.length>1){for(m=m.transpose();f<m.length;f++)c[f]=y(m[f]);return c}return y(this[0])}})(u[o])})("quantiles percentileOfScore".split(" "))})(e,Math),(function(r,t){r.gammaln=function(i){var s=0,l=[76.18009172947146,-86.50532032941678,24.01409824083091,-1.231739572450155,.001208650973866179,-5395239384953e-18],u=1.000000000190015,o,a,c;for(c=(a=o=i)+5.5,c-=(o+.5)*t.log(c);s<6;s++)u+=l[s]/++a;return t.log(2.5066282746310007*u/o)-c},r.loggam=function(i){var s,l,u,o,a,c,f,m=[.08333333333333333,-.002777777777777778,.0007936507936507937,-.0005952380952380952,.0008417508417508418,-.001917526917526918,.00641025641025641,-.02955065359477124,.1796443723688307,-1.3924322169059];if(s=i,f=0,i==1||i==2)return 0;for(i<=7&&(f=t.floor(7-i),s=i+f),l=1/(s*s),u=2*t.PI,a=m[9],c=8;c>=0;c--)a*=l,a+=m[c];if(o=a/s+.5*t.log(u)+(s-.5)*t.log(s)-s,i<=7)for(c=1;c<=f;c++)o-=t.log(s-1),s-=1;return o},r.gammafn=function(i){var s=[-1.716185138865495,24.76565080557592,-379.80425647094563,629.3311553128184,866.9662027904133,-31451.272968848367,-36144.413418691176,66456.14382024054],l=[-30.8402300119739,315.35062697960416,-1015.1563674902192,-3107.771671572311,22538.11842098015,4755.846277527881,-134659.9598649693,-115132.2596755535],u=!1,o=0,a=0,c=0,f=i,m,p,d,g;if(i>171.6243769536076)return 1/0;if(f<=0)if(g=f%1+36e-17,g)u=(f&1?-1:1)*t.PI/t.sin(t.PI*g),f=1-f;else return 1/0;for(d=f,f<1?p=f++:p=(f-=o=(f|0)-1)-1,m=0;m<8;++m)c=(c+s[m])*p,a=a*p+l[m];if(g=c/a+1,d<f)g/=d;else if(d>f)for(m=0;m<o;++m)g*=f,f++;return u&&(g=u/g),g},r.gammap=function(i,s){return r.lowRegGamma(i,s)*r.gammafn(i)},r.lowRegGamma=function(i,s){var l=r.gammaln(i),u=i,o=1/i,a=o,c=s+1-i,f=1/1e-30,m=1/c,p=m,d=1,g=-~(t.log(i>=1?i:1/i)*8.5+i*.4+17),y;if(s<0||i<=0)return NaN;if(s<i+1){for(;d<=g;d++)o+=a*=s/++u;return o*t.exp(-s+i*t.log(s)-l)}for(;d<=g;d++)y=-d*(d-i),c+=2,m=y*m+c,f=c+y/f,m=1/m,p*=m*f;return 1-p*t.exp(-s+i*t.log(s)-l)},r.factorialln=function(i){return i<0?NaN:r.gammaln(i+1)},r.factorial=function(i){return i<0?NaN:r.gammafn(i+1)},r.combination=function(i,s){return i>170||s>170?t.exp(r.combinationln(i,s)):r.factorial(i)/r.factorial(s)/r.factorial(i-s)},r.combinationln=function(i,s){return r.factorialln(i)-r.factorialln(s)-r.factorialln(i-s)},r.permutation=function(i,s){return r.factorial(i)/r.factorial(i-s)},r.betafn=function(i,s){if(!(i<=0||s<=0))return i+s>170?t.exp(r.betaln(i,s)):r.gammafn(i)*r.gammafn(s)/r.gammafn(i+s)},r.betaln=function(i,s){return r.gammaln(i)+r.gammaln(s)-r.gammaln(i+s)},r.betacf=function(i,s,l){var u=1e-30,o=1,a=s+l,c=s+1,f=s-1,m=1,p=1-a*i/c,d,g,y,v;for(t.abs(p)<u&&(p=u),p=1/p,v=p;o<=100&&(d=2*o,g=o*(l-o)*i/((f+d)*(s+d)),p=1+g*p,t.abs(p)<u&&(p=u),m=1+g/m,t.abs(m)<u&&(m=u),p=1/p,v*=p*m,g=-(s+o)*(a+o)*i/((s+d)*(c+d)),p=1+g*p,t.abs(p)<u&&(p=u),m=1+g/m,t.abs(m)<u&&(m=u),p=1/p,y=p*m,v*=y,!(t.abs(y-1)<3e-7));o++);return v},r.gammapinv=function(i,s){var l=0,u=s-1,o=1e-8,a=r.gammaln(s),c,f,m,p,d,g,y;if(i>=1)return t.max(100,s+100*t.sqrt(s));if(i<=0)return 0;for(s>1?(g=t.log(u),y=t.exp(u*(g-1)-a),d=i<.5?i:1-i,m=t.sqrt(-2*t.log(d)),c=(2.30753+m*.27061)/(1+m*(.99229+m*.04481))-m,i<.5&&(c=-c),c=t.max(.001,s*t.pow(1-1/(9*s)-c/(3*t.sqrt(s)),3))):(m=1-s*(.253+s*.12),i<m?c=t.pow(i/m,1/s):c=1-t.log(1-(i-m)/(1-m)));l<12;l++){if(c<=0)return 0;if(f=r.lowRegGamma(s,c)-i,s>1?m=y*t.exp(-(c-u)+u*(t.log(c)-g)):m=t.exp(-c+u*t.log(c)-a),p=f/m,c-=m=p/(1-.5*t.min(1,p*((s-1)/c-1))),c<=0&&(c=.5*(c+m)),t.abs(m)<o*c)break}return c},r.erf=function(i){var s=[-1.3026537197817094,.6419697923564902,.019476473204185836,-.00956151478680863,-.000946595344482036,.000366839497852761,42523324806907e-18,-20278578112534e-18,-1624290004647e-18,130365583558e-17,15626441722e-18,-85238095915e-18,6529054439e-18,5059343495e-18,-991364156e-18,-227365122e-18,96467911e-18,2394038e-18,-6886027e-18,894487e-18,313092e-18,-112708e-18,381e-18,7106e-18,-1523e-18,-94e-18,121e-18,-28e-18],l=s.length-1,u=!1,o=0,a=0,c,f,m,p;for(i<0&&(i=-i,u=!0),c=2/(2+i),f=4*c-2;l>0;l--)m=o,o=f*o-a+s[l],a=m;return p=c*t.exp(-i*i+.5*(s[0]+f*o)-a),u?p-1:1-p},r.erfc=function(i){return 1-r.erf(i)},r.erfcinv=function(i){var s=0,l,u,o,a;if(i>=2)return-100;if(i<=0)return 100;for(a=i<1?i:2-i,o=t.sqrt(-2*t.log(a/2)),l=-.70711*((2.30753+o*.27061)/(1+o*(.99229+o*.04481))-o);s<2;s++)u=r.erfc(l)-a,l+=u/(1.1283791670955126*t.exp(-l*l)-l*u);return i<1?l:-l},r.ibetainv=function(i,s,l){var u=1e-8,o=s-1,a=l-1,c=0,f,m,p,d,g,y,v,b,_,w,q;if(i<=0)return 0;if(i>=1)return 1;for(s>=1&&l>=1?(p=i<.5?i:1-i,d=t.sqrt(-2*t.log(p)),v=(2.30753+d*.27061)/(1+d*(.99229+d*.04481))-d,i<.5&&(v=-v),b=(v*v-3)/6,_=2/(1/(2*s-1)+1/(2*l-1)),w=v*t.sqrt(b+_)/_-(1/(2*l-1)-1/(2*s-1))*(b+5/6-2/(3*_)),v=s/(s+l*t.exp(2*w))):(f=t.log(s/(s+l)),m=t.log(l/(s+l)),d=t.exp(s*f)/s,g=t.exp(l*m)/l,w=d+g,i<d/w?v=t.pow(s*w*i,1/s):v=1-t.pow(l*w*(1-i),1/l)),q=-r.gammaln(s)-r.gammaln(l)+r.gammaln(s+l);c<10;c++){if(v===0||v===1)return v;if(y=r.ibeta(v,s,l)-i,d=t.exp(o*t.log(v)+a*t.log(1-v)+q),g=y/d,v-=d=g/(1-.5*t.min(1,g*(o/v-a/(1-v)))),v<=0&&(v=.5*(v+d)),v>=1&&(v=.5*(v+d+1)),t.abs(d)<u*v&&c>0)break}return v},r.ibeta=function(i,s,l){var u=i===0||i===1?0:t.exp(r.gammaln(s+l)-r.gammaln(s)-r.gammaln(l)+s*t.log(i)+l*t.log(1-i));return i<0||i>1?!1:i<(s+1)/(s+l+2)?u*r.betacf(i,s,l)/s:1-u*r.betacf(1-i,l,s)/l},r.randn=function(i,s){var l,u,o,a,c;if(s||(s=i),i)return r.create(i,s,function(){return r.randn()});do l=r._random_fn(),u=1.7156*(r._random_fn()-.5),o=l-.449871,a=t.abs(u)+.386595,c=o*o+a*(.196*a-.25472*o);while(c>.27597&&(c>.27846||u*u>-4*t.log(l)*l*l));return u/l},r.randg=function(i,s,l){var u=i,o,a,c,f,m,p;if(l||(l=s),i||(i=1),s)return p=r.zeros(s,l),p.alter(function(){return r.randg(i)}),p;i<1&&(i+=1),o=i-1/3,a=1/t.sqrt(9*o);do{do m=r.randn(),f=1+a*m;while(f<=0);f=f*f*f,c=r._random_fn()}while(c>1-.331*t.pow(m,4)&&t.log(c)>.5*m*m+o*(1-f+t.log(f)));if(i==u)return o*f;do c=r._random_fn();while(c===0);return t.pow(c,1/u)*o*f},(function(n){for(var i=0;i<n.length;i++)(function(s){r.fn[s]=function(){return r(r.map(this,function(l){return r[s](l)}))}})(n[i])})("gammaln gammafn factorial factorialln".split(" ")),(function(n){for(var i=0;i<n.length;i++)(function(s){r.fn[s]=function(){return r(r[s].apply(null,arguments))}})(n[i])})("randn".split(" "))})(e,Math),(function(r,t){(function(u){for(var o=0;o<u.length;o++)(function(a){r[a]=function c(f,m,p){return this instanceof c?(this._a=f,this._b=m,this._c=p,this):new c(f,m,p)},r.fn[a]=function(c,f,m){var p=r[a](c,f,m);return p.data=this,p},r[a].prototype.sample=function(c){var f=this._a,m=this._b,p=this._c;return c?r.alter(c,function(){return r[a].sample(f,m,p)}):r[a].sample(f,m,p)},(function(c){for(var f=0;f<c.length;f++)(function(m){r[a].prototype[m]=function(p){var d=this._a,g=this._b,y=this._c;return!p&&p!==0&&(p=this.data),typeof p!="number"?r.fn.map.call(p,function(v){return r[a][m](v,d,g,y)}):r[a][m](p,d,g,y)}})(c[f])})("pdf cdf inv".split(" ")),(function(c){for(var f=0;f<c.length;f++)(function(m){r[a].prototype[m]=function(){return r[a][m](this._a,this._b,this._c)}})(c[f])})("mean median mode variance".split(" "))})(u[o])})("beta centralF cauchy chisquare exponential gamma invgamma kumaraswamy laplace lognormal noncentralt normal pareto studentt weibull uniform binomial negbin hypgeom poisson triangular tukey arcsine".split(" ")),r.extend(r.beta,{pdf:function(o,a,c){return o>1||o<0?0:a==1&&c==1?1:a<512&&c<512?t.pow(o,a-1)*t.pow(1-o,c-1)/r.betafn(a,c):t.exp((a-1)*t.log(o)+(c-1)*t.log(1-o)-r.betaln(a,c))},cdf:function(o,a,c){return o>1||o<0?(o>1)*1:r.ibeta(o,a,c)},inv:function(o,a,c){return r.ibetainv(o,a,c)},mean:function(o,a){return o/(o+a)},median:function(o,a){return r.ibetainv(.5,o,a)},mode:function(o,a){return(o-1)/(o+a-2)},sample:function(o,a){var c=r.randg(o);return c/(c+r.randg(a))},variance:function(o,a){return o*a/(t.pow(o+a,2)*(o+a+1))}}),r.extend(r.centralF,{pdf:function(o,a,c){var f,m,p;return o<0?0:a<=2?o===0&&a<2?1/0:o===0&&a===2?1:1/r.betafn(a/2,c/2)*t.pow(a/c,a/2)*t.pow(o,a/2-1)*t.pow(1+a/c*o,-(a+c)/2):(f=a*o/(c+o*a),m=c/(c+o*a),p=a*m/2,p*r.binomial.pdf((a-2)/2,(a+c-2)/2,f))},cdf:function(o,a,c){return o<0?0:r.ibeta(a*o/(a*o+c),a/2,c/2)},inv:function(o,a,c){return c/(a*(1/r.ibetainv(o,a/2,c/2)-1))},mean:function(o,a){return a>2?a/(a-2):void 0},mode:function(o,a){return o>2?a*(o-2)/(o*(a+2)):void 0},sample:function(o,a){var c=r.randg(o/2)*2,f=r.randg(a/2)*2;return c/o/(f/a)},variance:function(o,a){if(!(a<=4))return 2*a*a*(o+a-2)/(o*(a-2)*(a-2)*(a-4))}}),r.extend(r.cauchy,{pdf:function(o,a,c){return c<0?0:c/(t.pow(o-a,2)+t.pow(c,2))/t.PI},cdf:function(o,a,c){return t.atan((o-a)/c)/t.PI+.5},inv:function(u,o,a){return o+a*t.tan(t.PI*(u-.5))},median:function(o){return o},mode:function(o){return o},sample:function(o,a){return r.randn()*t.sqrt(1/(2*r.randg(.5)))*a+o}}),r.extend(r.chisquare,{pdf:function(o,a){return o<0?0:o===0&&a===2?.5:t.exp((a/2-1)*t.log(o)-o/2-a/2*t.log(2)-r.gammaln(a/2))},cdf:function(o,a){return o<0?0:r.lowRegGamma(a/2,o/2)},inv:function(u,o){return 2*r.gammapinv(u,.5*o)},mean:function(u){return u},median:function(o){return o*t.pow(1-2/(9*o),3)},mode:function(o){return o-2>0?o-2:0},sample:function(o){return r.randg(o/2)*2},variance:function(o){return 2*o}}),r.extend(r.exponential,{pdf:function(o,a){return o<0?0:a*t.exp(-a*o)},cdf:function(o,a){return o<0?0:1-t.exp(-a*o)},inv:function(u,o){return-t.log(1-u)/o},mean:function(u){return 1/u},median:function(u){return 1/u*t.log(2)},mode:function(){return 0},sample:function(o){return-1/o*t.log(r._random_fn())},variance:function(u){return t.pow(u,-2)}}),r.extend(r.gamma,{pdf:function(o,a,c){return o<0?0:o===0&&a===1?1/c:t.exp((a-1)*t.log(o)-o/c-r.gammaln(a)-a*t.log(c))},cdf:function(o,a,c){return o<0?0:r.lowRegGamma(a,o/c)},inv:function(u,o,a){return r.gammapinv(u,o)*a},mean:function(u,o){return u*o},mode:function(o,a){if(o>1)return(o-1)*a},sample:function(o,a){return r.randg(o)*a},variance:function(o,a){return o*a*a}}),r.extend(r.invgamma,{pdf:function(o,a,c){return o<=0?0:t.exp(-(a+1)*t.log(o)-c/o-r.gammaln(a)+a*t.log(c))},cdf:function(o,a,c){return o<=0?0:1-r.lowRegGamma(a,c/o)},inv:function(u,o,a){return a/r.gammapinv(1-u,o)},mean:function(u,o){return u>1?o/(u-1):void 0},mode:function(o,a){return a/(o+1)},sample:function(o,a){return a/r.randg(o)},variance:function(o,a){if(!(o<=2))return a*a/((o-1)*(o-1)*(o-2))}}),r.extend(r.kumaraswamy,{pdf:function(o,a,c){return o===0&&a===1?c:o===1&&c===1?a:t.exp(t.log(a)+t.log(c)+(a-1)*t.log(o)+(c-1)*t.log(1-t.pow(o,a)))},cdf:function(o,a,c){return o<0?0:o>1?1:1-t.pow(1-t.pow(o,a),c)},inv:function(o,a,c){return t.pow(1-t.pow(1-o,1/c),1/a)},mean:function(u,o){return o*r.gammafn(1+1/u)*r.gammafn(o)/r.gammafn(1+1/u+o)},median:function(o,a){return t.pow(1-t.pow(2,-1/a),1/o)},mode:function(o,a){if(o>=1&&a>=1&&o!==1&&a!==1)return t.pow((o-1)/(o*a-1),1/o)},variance:function(){throw new Error("variance not yet implemented")}}),r.extend(r.lognormal,{pdf:function(o,a,c){return o<=0?0:t.exp(-t.log(o)-.5*t.log(2*t.PI)-t.log(c)-t.pow(t.log(o)-a,2)/(2*c*c))},cdf:function(o,a,c){return o<0?0:.5+.5*r.erf((t.log(o)-a)/t.sqrt(2*c*c))},inv:function(u,o,a){return t.exp(-1.4142135623730951*a*r.erfcinv(2*u)+o)},mean:function(o,a){return t.exp(o+a*a/2)},median:function(o){return t.exp(o)},mode:function(o,a){return t.exp(o-a*a)},sample:function(o,a){return t.exp(r.randn()*a+o)},variance:function(o,a){return(t.exp(a*a)-1)*t.exp(2*o+a*a)}}),r.extend(r.noncentralt,{pdf:function(o,a,c){var f=1e-14;return t.abs(c)<f?r.studentt.pdf(o,a):t.abs(o)<f?t.exp(r.gammaln((a+1)/2)-c*c/2-.5*t.log(t.PI*a)-r.gammaln(a/2)):a/o*(r.noncentralt.cdf(o*t.sqrt(1+2/a),a+2,c)-r.noncentralt.cdf(o,a,c))},cdf:function(o,a,c){var f=1e-14,m=200;if(t.abs(c)<f)return r.studentt.cdf(o,a);var p=!1;o<0&&(p=!0,c=-c);for(var d=r.normal.cdf(-c,0,1),g=f+1,y=g,v=o*o/(o*o+a),b=0,_=t.exp(-c*c/2),w=t.exp(-c*c/2-.5*t.log(2)-r.gammaln(3/2))*c;b<m||y>f||g>f;)y=g,b>0&&(_*=c*c/(2*b),w*=c*c/(2*(b+1/2))),g=_*r.beta.cdf(v,b+.5,a/2)+w*r.beta.cdf(v,b+1,a/2),d+=.5*g,b++;return p?1-d:d}}),r.extend(r.normal,{pdf:function(o,a,c){return t.exp(-.5*t.log(2*t.PI)-t.log(c)-t.pow(o-a,2)/(2*c*c))},cdf:function(o,a,c){return .5*(1+r.erf((o-a)/t.sqrt(2*c*c)))},inv:function(u,o,a){return-1.4142135623730951*a*r.erfcinv(2*u)+o},mean:function(u){return u},median:function(o){return o},mode:function(u){return u},sample:function(o,a){return r.randn()*a+o},variance:function(u,o){return o*o}}),r.extend(r.pareto,{pdf:function(o,a,c){return o<a?0:c*t.pow(a,c)/t.pow(o,c+1)},cdf:function(o,a,c){return o<a?0:1-t.pow(a/o,c)},inv:function(o,a,c){return a/t.pow(1-o,1/c)},mean:function(o,a){if(!(a<=1))return a*t.pow(o,a)/(a-1)},median:function(o,a){return o*(a*t.SQRT2)},mode:function(o){return o},variance:function(u,o){if(!(o<=2))return u*u*o/(t.pow(o-1,2)*(o-2))}}),r.extend(r.studentt,{pdf:function(o,a){return a=a>1e100?1e100:a,1/(t.sqrt(a)*r.betafn(.5,a/2))*t.pow(1+o*o/a,-((a+1)/2))},cdf:function(o,a){var c=a/2;return r.ibeta((o+t.sqrt(o*o+a))/(2*t.sqrt(o*o+a)),c,c)},inv:function(u,o){var a=r.ibetainv(2*t.min(u,1-u),.5*o,.5);return a=t.sqrt(o*(1-a)/a),u>.5?a:-a},mean:function(o){return o>1?0:void 0},median:function(){return 0},mode:function(){return 0},sample:function(o){return r.randn()*t.sqrt(o/(2*r.randg(o/2)))},variance:function(o){return o>2?o/(o-2):o>1?1/0:void 0}}),r.extend(r.weibull,{pdf:function(o,a,c){return o<0||a<0||c<0?0:c/a*t.pow(o/a,c-1)*t.exp(-t.pow(o/a,c))},cdf:function(o,a,c){return o<0?0:1-t.exp(-t.pow(o/a,c))},inv:function(u,o,a){return o*t.pow(-t.log(1-u),1/a)},mean:function(u,o){return u*r.gammafn(1+1/o)},median:function(o,a){return o*t.pow(t.log(2),1/a)},mode:function(o,a){return a<=1?0:o*t.pow((a-1)/a,1/a)},sample:function(o,a){return o*t.pow(-t.log(r._random_fn()),1/a)},variance:function(o,a){return o*o*r.gammafn(1+2/a)-t.pow(r.weibull.mean(o,a),2)}}),r.extend(r.uniform,{pdf:function(o,a,c){return o<a||o>c?0:1/(c-a)},cdf:function(o,a,c){return o<a?0:o<c?(o-a)/(c-a):1},inv:function(u,o,a){return o+u*(a-o)},mean:function(o,a){return .5*(o+a)},median:function(o,a){return r.mean(o,a)},mode:function(){throw new Error("mode is not yet implemented")},sample:function(o,a){return o/2+a/2+(a/2-o/2)*(2*r._random_fn()-1)},variance:function(o,a){return t.pow(a-o,2)/12}});function n(u,o,a,c){for(var f=0,m=1,p=1,d=1,g=0,y=0,v;t.abs((p-y)/p)>c;)y=p,v=-(o+g)*(o+a+g)*u/(o+2*g)/(o+2*g+1),f=p+v*f,m=d+v*m,g=g+1,v=g*(a-g)*u/(o+2*g-1)/(o+2*g),p=f+v*p,d=m+v*d,f=f/d,m=m/d,p=p/d,d=1;return p/o}r.extend(r.binomial,{pdf:function(o,a,c){return c===0||c===1?a*c===o?1:0:r.combination(a,o)*t.pow(c,o)*t.pow(1-c,a-o)},cdf:function(o,a,c){var f,m=1e-10;if(o<0)return 0;if(o>=a)return 1;if(c<0||c>1||a<=0)return NaN;o=t.floor(o);var p=c,d=o+1,g=a-o,y=d+g,v=t.exp(r.gammaln(y)-r.gammaln(g)-r.gammaln(d)+d*t.log(p)+g*t.log(1-p));return p<(d+1)/(y+2)?f=v*n(p,d,g,m):f=1-v*n(1-p,g,d,m),t.round((1-f)*(1/m))/(1/m)}}),r.extend(r.negbin,{pdf:function(o,a,c){return o!==o>>>0?!1:o<0?0:r.combination(o+a-1,a-1)*t.pow(1-c,o)*t.pow(c,a)},cdf:function(o,a,c){var f=0,m=0;if(o<0)return 0;for(;m<=o;m++)f+=r.negbin.pdf(m,a,c);return f}}),r.extend(r.hypgeom,{pdf:function(o,a,c,f){if(o!==o|0)return!1;if(o<0||o<c-(a-f))return 0;if(o>f||o>c)return 0;if(c*2>a)return f*2>a?r.hypgeom.pdf(a-c-f+o,a,a-c,a-f):r.hypgeom.pdf(f-o,a,a-c,f);if(f*2>a)return r.hypgeom.pdf(c-o,a,c,a-f);if(c<f)return r.hypgeom.pdf(o,a,f,c);for(var m=1,p=0,d=0;d<o;d++){for(;m>1&&p<f;)m*=1-c/(a-p),p++;m*=(f-d)*(c-d)/((d+1)*(a-c-f+d+1))}for(;p<f;p++)m*=1-c/(a-p);return t.min(1,t.max(0,m))},cdf:function(o,a,c,f){if(o<0||o<c-(a-f))return 0;if(o>=f||o>=c)return 1;if(c*2>a)return f*2>a?r.hypgeom.cdf(a-c-f+o,a,a-c,a-f):1-r.hypgeom.cdf(f-o-1,a,a-c,f);if(f*2>a)return 1-r.hypgeom.cdf(c-o-1,a,c,a-f);if(c<f)return r.hypgeom.cdf(o,a,f,c);for(var m=1,p=1,d=0,g=0;g<o;g++){for(;m>1&&d<f;){var y=1-c/(a-d);p*=y,m*=y,d++}p*=(f-g)*(c-g)/((g+1)*(a-c-f+g+1)),m+=p}for(;d<f;d++)m*=1-c/(a-d);return t.min(1,t.max(0,m))}}),r.extend(r.poisson,{pdf:function(o,a){return a<0||o%1!==0||o<0?0:t.pow(a,o)*t.exp(-a)/r.factorial(o)},cdf:function(o,a){var c=[],f=0;if(o<0)return 0;for(;f<=o;f++)c.push(r.poisson.pdf(f,a));return r.sum(c)},mean:function(u){return u},variance:function(u){return u},sampleSmall:function(o){var a=1,c=0,f=t.exp(-o);do c++,a*=r._random_fn();while(a>f);return c-1},sampleLarge:function(o){var a=o,c,f,m,p,d,g,y,v,b,_;for(p=t.sqrt(a),d=t.log(a),y=.931+2.53*p,g=-.059+.02483*y,v=1.1239+1.1328/(y-3.4),b=.9277-3.6224/(y-2);;){if(f=t.random()-.5,m=t.random(),_=.5-t.abs(f),c=t.floor((2*g/_+y)*f+a+.43),_>=.07&&m<=b)return c;if(!(c<0||_<.013&&m>_)&&t.log(m)+t.log(v)-t.log(g/(_*_)+y)<=-a+c*d-r.loggam(c+1))return c}},sample:function(o){return o<10?this.sampleSmall(o):this.sampleLarge(o)}}),r.extend(r.triangular,{pdf:function(o,a,c,f){return c<=a||f<a||f>c?NaN:o<a||o>c?0:o<f?2*(o-a)/((c-a)*(f-a)):o===f?2/(c-a):2*(c-o)/((c-a)*(c-f))},cdf:function(o,a,c,f){return c<=a||f<a||f>c?NaN:o<=a?0:o>=c?1:o<=f?t.pow(o-a,2)/((c-a)*(f-a)):1-t.pow(c-o,2)/((c-a)*(c-f))},inv:function(o,a,c,f){return c<=a||f<a||f>c?NaN:o<=(f-a)/(c-a)?a+(c-a)*t.sqrt(o*((f-a)/(c-a))):a+(c-a)*(1-t.sqrt((1-o)*(1-(f-a)/(c-a))))},mean:function(o,a,c){return(o+a+c)/3},median:function(o,a,c){if(c<=(o+a)/2)return a-t.sqrt((a-o)*(a-c))/t.sqrt(2);if(c>(o+a)/2)return o+t.sqrt((a-o)*(c-o))/t.sqrt(2)},mode:function(o,a,c){return c},sample:function(o,a,c){var f=r._random_fn();return f<(c-o)/(a-o)?o+t.sqrt(f*(a-o)*(c-o)):a-t.sqrt((1-f)*(a-o)*(a-c))},variance:function(o,a,c){return(o*o+a*a+c*c-o*a-o*c-a*c)/18}}),r.extend(r.arcsine,{pdf:function(o,a,c){return c<=a?NaN:o<=a||o>=c?0:2/t.PI*t.pow(t.pow(c-a,2)-t.pow(2*o-a-c,2),-.5)},cdf:function(o,a,c){return o<a?0:o<c?2/t.PI*t.asin(t.sqrt((o-a)/(c-a))):1},inv:function(u,o,a){return o+(.5-.5*t.cos(t.PI*u))*(a-o)},mean:function(o,a){return a<=o?NaN:(o+a)/2},median:function(o,a){return a<=o?NaN:(o+a)/2},mode:function(){throw new Error("mode is not yet implemented")},sample:function(o,a){return(o+a)/2+(a-o)/2*t.sin(2*t.PI*r.uniform.sample(0,1))},variance:function(o,a){return a<=o?NaN:t.pow(a-o,2)/8}});function i(u){return u/t.abs(u)}r.extend(r.laplace,{pdf:function(o,a,c){return c<=0?0:t.exp(-t.abs(o-a)/c)/(2*c)},cdf:function(o,a,c){return c<=0?0:o<a?.5*t.exp((o-a)/c):1-.5*t.exp(-(o-a)/c)},mean:function(u){return u},median:function(u){return u},mode:function(u){return u},variance:function(u,o){return 2*o*o},sample:function(o,a){var c=r._random_fn()-.5;return o-a*i(c)*t.log(1-2*t.abs(c))}});function s(u,o,a){var c=12,f=6,m=-30,p=-50,d=60,g=8,y=3,v=2,b=3,_=[.9815606342467192,.9041172563704749,.7699026741943047,.5873179542866175,.3678314989981802,.1252334085114689],w=[.04717533638651183,.10693932599531843,.16007832854334622,.20316742672306592,.2334925365383548,.24914704581340277],q=u*.5;if(q>=g)return 1;var P=2*r.normal.cdf(q,0,1,1,0)-1;P>=t.exp(p/a)?P=t.pow(P,a):P=0;var A;u>y?A=v:A=b;for(var N=q,k=(g-q)/A,D=N+k,Z=0,x=a-1,J=1;J<=A;J++){for(var se=0,O=.5*(D+N),z=.5*(D-N),le=1;le<=c;le++){var be,_e;f<le?(be=c-le+1,_e=_[be-1]):(be=le,_e=-_[be-1]);var Ee=z*_e,fe=O+Ee,re=fe*fe;if(re>d)break;var G=2*r.normal.cdf(fe,0,1,1,0),Br=2*r.normal.cdf(fe,u,1,1,0),oe=G*.5-Br*.5;oe>=t.exp(m/x)&&(oe=w[be-1]*t.exp(-(.5*re))*t.pow(oe,x),se+=oe)}se*=2*z*a/t.sqrt(2*t.PI),Z+=se,N=D,D+=k}return P+=Z,P<=t.exp(m/o)?0:(P=t.pow(P,o),P>=1?1:P)}function l(u,o,a){var c=.322232421088,f=.099348462606,m=-1,p=.588581570495,d=-.342242088547,g=.531103462366,y=-.204231210125,v=.10353775285,b=-453642210148e-16,_=.0038560700634,w=.8832,q=.2368,P=1.214,A=1.208,N=1.4142,k=120,D=.5-.5*u,Z=t.sqrt(t.log(1/(D*D))),x=Z+((((Z*b+y)*Z+d)*Z+m)*Z+c)/((((Z*_+v)*Z+g)*Z+p)*Z+f);a<k&&(x+=(x*x*x+x)/a/4);var J=w-q*x;return a<k&&(J+=-P/a+A*x/a),x*(J*t.log(o-1)+N)}r.extend(r.tukey,{cdf:function(o,a,c){var f=1,m=a,p=16,d=8,g=-30,y=1e-14,v=100,b=800,_=5e3,w=25e3,q=1,P=.5,A=.25,N=.125,k=[.9894009349916499,.9445750230732326,.8656312023878318,.755404408355003,.6178762444026438,.45801677765722737,.2816035507792589,.09501250983763744],D=[.027152459411754096,.062253523938647894,.09515851168249279,.12462897125553388,.14959598881657674,.16915651939500254,.18260341504492358,.1894506104550685];if(o<=0)return 0;if(c<2||f<1||m<2)return NaN;if(!Number.isFinite(o))return 1;if(c>w)return s(o,f,m);var Z=c*.5,x=Z*t.log(c)-c*t.log(2)-r.gammaln(Z),J=Z-1,se=c*.25,O;c<=v?O=q:c<=b?O=P:c<=_?O=A:O=N,x+=t.log(O);for(var z=0,le=1;le<=50;le++){for(var be=0,_e=(2*le-1)*O,Ee=1;Ee<=p;Ee++){var fe,re;d<Ee?(fe=Ee-d-1,re=x+J*t.log(_e+k[fe]*O)-(k[fe]*O+_e)*se):(fe=Ee-1,re=x+J*t.log(_e-k[fe]*O)+(k[fe]*O-_e)*se);var G;if(re>=g){d<Ee?G=o*t.sqrt((k[fe]*O+_e)*.5):G=o*t.sqrt((-(k[fe]*O)+_e)*.5);var Br=s(G,f,m),oe=Br*D[fe]*t.exp(re);be+=oe}}if(le*O>=1&&be<=y)break;z+=be}if(be>y)throw new Error("tukey.cdf failed to converge");return z>1&&(z=1),z},inv:function(u,o,a){var c=1,f=o,m=1e-4,p=50;if(a<2||c<1||f<2)return NaN;if(u<0||u>1)return NaN;if(u===0)return 0;if(u===1)return 1/0;var d=l(u,f,a),g=r.tukey.cdf(d,o,a)-u,y;g>0?y=t.max(0,d-1):y=d+1;for(var v=r.tukey.cdf(y,o,a)-u,b,_=1;_<p;_++){b=y-v*(y-d)/(v-g),g=v,d=y,b<0&&(b=0,v=-u),v=r.tukey.cdf(b,o,a)-u,y=b;var w=t.abs(y-d);if(w<m)return b}throw new Error("tukey.inv failed to converge")}})})(e,Math),(function(r,t){var n=Array.prototype.push,i=r.utils.isArray;function s(l){return i(l)||l instanceof r}r.extend({add:function(u,o){return s(o)?(s(o[0])||(o=[o]),r.map(u,function(a,c,f){return a+o[c][f]})):r.map(u,function(a){return a+o})},subtract:function(u,o){return s(o)?(s(o[0])||(o=[o]),r.map(u,function(a,c,f){return a-o[c][f]||0})):r.map(u,function(a){return a-o})},divide:function(u,o){return s(o)?(s(o[0])||(o=[o]),r.multiply(u,r.inv(o))):r.map(u,function(a){return a/o})},multiply:function(u,o){var a,c,f,m,p,d,g,y;if(u.length===void 0&&o.length===void 0)return u*o;if(p=u.length,d=u[0].length,g=r.zeros(p,f=s(o)?o[0].length:d),y=0,s(o)){for(;y<f;y++)for(a=0;a<p;a++){for(m=0,c=0;c<d;c++)m+=u[a][c]*o[c][y];g[a][y]=m}return p===1&&y===1?g[0][0]:g}return r.map(u,function(v){return v*o})},outer:function(u,o){return r.multiply(u.map(function(a){return[a]}),[o])},dot:function(u,o){s(u[0])||(u=[u]),s(o[0])||(o=[o]);for(var a=u[0].length===1&&u.length!==1?r.transpose(u):u,c=o[0].length===1&&o.length!==1?r.transpose(o):o,f=[],m=0,p=a.length,d=a[0].length,g,y;m<p;m++){for(f[m]=[],g=0,y=0;y<d;y++)g+=a[m][y]*c[m][y];f[m]=g}return f.length===1?f[0]:f},pow:function(u,o){return r.map(u,function(a){return t.pow(a,o)})},exp:function(u){return r.map(u,function(o){return t.exp(o)})},log:function(u){return r.map(u,function(o){return t.log(o)})},abs:function(u){return r.map(u,function(o){return t.abs(o)})},norm:function(u,o){var a=0,c=0;for(isNaN(o)&&(o=2),s(u[0])&&(u=u[0]);c<u.length;c++)a+=t.pow(t.abs(u[c]),o);return t.pow(a,1/o)},angle:function(u,o){return t.acos(r.dot(u,o)/(r.norm(u)*r.norm(o)))},aug:function(u,o){var a=[],c;for(c=0;c<u.length;c++)a.push(u[c].slice());for(c=0;c<a.length;c++)n.apply(a[c],o[c]);return a},inv:function(u){for(var o=u.length,a=u[0].length,c=r.identity(o,a),f=r.gauss_jordan(u,c),m=[],p=0,d;p<o;p++)for(m[p]=[],d=a;d<f[0].length;d++)m[p][d-a]=f[p][d];return m},det:function l(u){if(u.length===2)return u[0][0]*u[1][1]-u[0][1]*u[1][0];for(var o=0,a=0;a<u.length;a++){for(var c=[],f=1;f<u.length;f++){c[f-1]=[];for(var m=0;m<u.length;m++)m<a?c[f-1][m]=u[f][m]:m>a&&(c[f-1][m-1]=u[f][m])}var p=a%2?-1:1;o+=l(c)*u[0][a]*p}return o},gauss_elimination:function(u,o){var a=0,c=0,f=u.length,m=u[0].length,p=1,d=0,g=[],y,v,b,_;for(u=r.aug(u,o),y=u[0].length,a=0;a<f;a++){for(v=u[a][a],c=a,_=a+1;_<m;_++)v<t.abs(u[_][a])&&(v=u[_][a],c=_);if(c!=a)for(_=0;_<y;_++)b=u[a][_],u[a][_]=u[c][_],u[c][_]=b;for(c=a+1;c<f;c++)for(p=u[c][a]/u[a][a],_=a;_<y;_++)u[c][_]=u[c][_]-p*u[a][_]}for(a=f-1;a>=0;a--){for(d=0,c=a+1;c<=f-1;c++)d=d+g[c]*u[a][c];g[a]=(u[a][y-1]-d)/u[a][a]}return g},gauss_jordan:function(u,o){var a=r.aug(u,o),c=a.length,f=a[0].length,m=0,p,d,g;for(d=0;d<c;d++){var y=d;for(g=d+1;g<c;g++)t.abs(a[g][d])>t.abs(a[y][d])&&(y=g);var v=a[d];for(a[d]=a[y],a[y]=v,g=d+1;g<c;g++)for(m=a[g][d]/a[d][d],p=d;p<f;p++)a[g][p]-=a[d][p]*m}for(d=c-1;d>=0;d--){for(m=a[d][d],g=0;g<d;g++)for(p=f-1;p>d-1;p--)a[g][p]-=a[d][p]*a[g][d]/m;for(a[d][d]/=m,p=c;p<f;p++)a[d][p]/=m}return a},triaUpSolve:function(u,o){var a=u[0].length,c=r.zeros(1,a)[0],f,m=!1;return o[0].length!=null&&(o=o.map(function(p){return p[0]}),m=!0),r.arange(a-1,-1,-1).forEach(function(p){f=r.arange(p+1,a).map(function(d){return c[d]*u[p][d]}),c[p]=(o[p]-r.sum(f))/u[p][p]}),m?c.map(function(p){return[p]}):c},triaLowSolve:function(u,o){var a=u[0].length,c=r.zeros(1,a)[0],f,m=!1;return o[0].length!=null&&(o=o.map(function(p){return p[0]}),m=!0),r.arange(a).forEach(function(p){f=r.arange(p).map(function(d){return u[p][d]*c[d]}),c[p]=(o[p]-r.sum(f))/u[p][p]}),m?c.map(function(p){return[p]}):c},lu:function(u){var o=u.length,a=r.identity(o),c=r.zeros(u.length,u[0].length),f;return r.arange(o).forEach(function(m){c[0][m]=u[0][m]}),r.arange(1,o).forEach(function(m){r.arange(m).forEach(function(p){f=r.arange(p).map(function(d){return a[m][d]*c[d][p]}),a[m][p]=(u[m][p]-r.sum(f))/c[p][p]}),r.arange(m,o).forEach(function(p){f=r.arange(m).map(function(d){return a[m][d]*c[d][p]}),c[m][p]=u[f.length][p]-r.sum(f)})}),[a,c]},cholesky:function(u){var o=u.length,a=r.zeros(u.length,u[0].length),c;return r.arange(o).forEach(function(f){c=r.arange(f).map(function(m){return t.pow(a[f][m],2)}),a[f][f]=t.sqrt(u[f][f]-r.sum(c)),r.arange(f+1,o).forEach(function(m){c=r.arange(f).map(function(p){return a[f][p]*a[m][p]}),a[m][f]=(u[f][m]-r.sum(c))/a[f][f]})}),a},gauss_jacobi:function(u,o,a,c){for(var f=0,m=0,p=u.length,d=[],g=[],y=[],v,b,_,w;f<p;f++)for(d[f]=[],g[f]=[],y[f]=[],m=0;m<p;m++)f>m?(d[f][m]=u[f][m],g[f][m]=y[f][m]=0):f<m?(g[f][m]=u[f][m],d[f][m]=y[f][m]=0):(y[f][m]=u[f][m],d[f][m]=g[f][m]=0);for(_=r.multiply(r.multiply(r.inv(y),r.add(d,g)),-1),b=r.multiply(r.inv(y),o),v=a,w=r.add(r.multiply(_,a),b),f=2;t.abs(r.norm(r.subtract(w,v)))>c;)v=w,w=r.add(r.multiply(_,v),b),f++;return w},gauss_seidel:function(u,o,a,c){for(var f=0,m=u.length,p=[],d=[],g=[],y,v,b,_,w;f<m;f++)for(p[f]=[],d[f]=[],g[f]=[],y=0;y<m;y++)f>y?(p[f][y]=u[f][y],d[f][y]=g[f][y]=0):f<y?(d[f][y]=u[f][y],p[f][y]=g[f][y]=0):(g[f][y]=u[f][y],p[f][y]=d[f][y]=0);for(_=r.multiply(r.multiply(r.inv(r.add(g,p)),d),-1),b=r.multiply(r.inv(r.add(g,p)),o),v=a,w=r.add(r.multiply(_,a),b),f=2;t.abs(r.norm(r.subtract(w,v)))>c;)v=w,w=r.add(r.multiply(_,v),b),f=f+1;return w},SOR:function(u,o,a,c,f){for(var m=0,p=u.length,d=[],g=[],y=[],v,b,_,w,q;m<p;m++)for(d[m]=[],g[m]=[],y[m]=[],v=0;v<p;v++)m>v?(d[m][v]=u[m][v],g[m][v]=y[m][v]=0):m<v?(g[m][v]=u[m][v],d[m][v]=y[m][v]=0):(y[m][v]=u[m][v],d[m][v]=g[m][v]=0);for(w=r.multiply(r.inv(r.add(y,r.multiply(d,f))),r.subtract(r.multiply(y,1-f),r.multiply(g,f))),_=r.multiply(r.multiply(r.inv(r.add(y,r.multiply(d,f))),o),f),b=a,q=r.add(r.multiply(w,a),_),m=2;t.abs(r.norm(r.subtract(q,b)))>c;)b=q,q=r.add(r.multiply(w,b),_),m++;return q},householder:function(u){for(var o=u.length,a=u[0].length,c=0,f=[],m=[],p,d,g,y,v;c<o-1;c++){for(p=0,y=c+1;y<a;y++)p+=u[y][c]*u[y][c];for(v=u[c+1][c]>0?-1:1,p=v*t.sqrt(p),d=t.sqrt((p*p-u[c+1][c]*p)/2),f=r.zeros(o,1),f[c+1][0]=(u[c+1][c]-p)/(2*d),g=c+2;g<o;g++)f[g][0]=u[g][c]/(2*d);m=r.subtract(r.identity(o,a),r.multiply(r.multiply(f,r.transpose(f)),2)),u=r.multiply(m,r.multiply(u,m))}return u},QR:(function(){var l=r.sum,u=r.arange;function o(a){var c=a.length,f=a[0].length,m=r.zeros(f,f);a=r.copy(a);var p,d,g;for(d=0;d<f;d++){for(m[d][d]=t.sqrt(l(u(c).map(function(y){return a[y][d]*a[y][d]}))),p=0;p<c;p++)a[p][d]=a[p][d]/m[d][d];for(g=d+1;g<f;g++)for(m[d][g]=l(u(c).map(function(y){return a[y][d]*a[y][g]})),p=0;p<c;p++)a[p][g]=a[p][g]-a[p][d]*m[d][g]}return[a,m]}return o})(),lstsq:(function(){function l(o){o=r.copy(o);var a=o.length,c=r.identity(a);return r.arange(a-1,-1,-1).forEach(function(f){r.sliceAssign(c,{row:f},r.divide(r.slice(c,{row:f}),o[f][f])),r.sliceAssign(o,{row:f},r.divide(r.slice(o,{row:f}),o[f][f])),r.arange(f).forEach(function(m){var p=r.multiply(o[m][f],-1),d=r.slice(o,{row:m}),g=r.multiply(r.slice(o,{row:f}),p);r.sliceAssign(o,{row:m},r.add(d,g));var y=r.slice(c,{row:m}),v=r.multiply(r.slice(c,{row:f}),p);r.sliceAssign(c,{row:m},r.add(y,v))})}),c}function u(o,a){var c=!1;a[0].length===void 0&&(a=a.map(function(w){return[w]}),c=!0);var f=r.QR(o),m=f[0],p=f[1],d=o[0].length,g=r.slice(m,{col:{end:d}}),y=r.slice(p,{row:{end:d}}),v=l(y),b=r.transpose(g);b[0].length===void 0&&(b=[b]);var _=r.multiply(r.multiply(v,b),a);return _.length===void 0&&(_=[[_]]),c?_.map(function(w){return w[0]}):_}return u})(),jacobi:function(u){for(var o=1,a=u.length,c=r.identity(a,a),f=[],m,p,d,g,y,v,b,_;o===1;){for(v=u[0][1],g=0,y=1,p=0;p<a;p++)for(d=0;d<a;d++)p!=d&&v<t.abs(u[p][d])&&(v=t.abs(u[p][d]),g=p,y=d);for(u[g][g]===u[y][y]?b=u[g][y]>0?t.PI/4:-t.PI/4:b=t.atan(2*u[g][y]/(u[g][g]-u[y][y]))/2,_=r.identity(a,a),_[g][g]=t.cos(b),_[g][y]=-t.sin(b),_[y][g]=t.sin(b),_[y][y]=t.cos(b),c=r.multiply(c,_),m=r.multiply(r.multiply(r.inv(_),u),_),u=m,o=0,p=1;p<a;p++)for(d=1;d<a;d++)p!=d&&t.abs(u[p][d])>.001&&(o=1)}for(p=0;p<a;p++)f.push(u[p][p]);return[c,f]},rungekutta:function(u,o,a,c,f,m){var p,d,g,y,v;if(m===2)for(;c<=a;)p=o*u(c,f),d=o*u(c+o,f+p),g=f+(p+d)/2,f=g,c=c+o;if(m===4)for(;c<=a;)p=o*u(c,f),d=o*u(c+o/2,f+p/2),y=o*u(c+o/2,f+d/2),v=o*u(c+o,f+y),g=f+(p+2*d+2*y+v)/6,f=g,c=c+o;return f},romberg:function(u,o,a,c){for(var f=0,m=(a-o)/2,p=[],d=[],g=[],y,v,b,_,w;f<c/2;){for(w=u(o),b=o,_=0;b<=a;b=b+m,_++)p[_]=b;for(y=p.length,b=1;b<y-1;b++)w+=(b%2!==0?4:2)*u(p[b]);w=m/3*(w+u(a)),g[f]=w,m/=2,f++}for(v=g.length,y=1;v!==1;){for(b=0;b<v-1;b++)d[b]=(t.pow(4,y)*g[b+1]-g[b])/(t.pow(4,y)-1);v=d.length,g=d,d=[],y++}return g},richardson:function(u,o,a,c){function f(q,P){for(var A=0,N=q.length,k;A<N;A++)q[A]===P&&(k=A);return k}for(var m=t.abs(a-u[f(u,a)+1]),p=0,d=[],g=[],y,v,b,_,w;c>=m;)y=f(u,a+c),v=f(u,a),d[p]=(o[y]-2*o[v]+o[2*v-y])/(c*c),c/=2,p++;for(_=d.length,b=1;_!=1;){for(w=0;w<_-1;w++)g[w]=(t.pow(4,b)*d[w+1]-d[w])/(t.pow(4,b)-1);_=g.length,d=g,g=[],b++}return d},simpson:function(u,o,a,c){for(var f=(a-o)/c,m=u(o),p=[],d=o,g=0,y=1,v;d<=a;d=d+f,g++)p[g]=d;for(v=p.length;y<v-1;y++)m+=(y%2!==0?4:2)*u(p[y]);return f/3*(m+u(a))},hermite:function(u,o,a,c){for(var f=u.length,m=0,p=0,d=[],g=[],y=[],v=[],b;p<f;p++){for(d[p]=1,b=0;b<f;b++)p!=b&&(d[p]*=(c-u[b])/(u[p]-u[b]));for(g[p]=0,b=0;b<f;b++)p!=b&&(g[p]+=1/(u[p]-u[b]));y[p]=(1-2*(c-u[p])*g[p])*(d[p]*d[p]),v[p]=(c-u[p])*(d[p]*d[p]),m+=y[p]*o[p]+v[p]*a[p]}return m},lagrange:function(u,o,a){for(var c=0,f=0,m,p,d=u.length;f<d;f++){for(p=o[f],m=0;m<d;m++)f!=m&&(p*=(a-u[m])/(u[f]-u[m]));c+=p}return c},cubic_spline:function(u,o,a){for(var c=u.length,f=0,m,p=[],d=[],g=[],y=[],v=[],b=[],_=[];f<c-1;f++)v[f]=u[f+1]-u[f];for(g[0]=0,f=1;f<c-1;f++)g[f]=3/v[f]*(o[f+1]-o[f])-3/v[f-1]*(o[f]-o[f-1]);for(f=1;f<c-1;f++)p[f]=[],d[f]=[],p[f][f-1]=v[f-1],p[f][f]=2*(v[f-1]+v[f]),p[f][f+1]=v[f],d[f][0]=g[f];for(y=r.multiply(r.inv(p),d),m=0;m<c-1;m++)b[m]=(o[m+1]-o[m])/v[m]-v[m]*(y[m+1][0]+2*y[m][0])/3,_[m]=(y[m+1][0]-y[m][0])/(3*v[m]);for(m=0;m<c&&!(u[m]>a);m++);return m-=1,o[m]+(a-u[m])*b[m]+r.sq(a-u[m])*y[m]+(a-u[m])*r.sq(a-u[m])*_[m]},gauss_quadrature:function(){throw new Error("gauss_quadrature not yet implemented")},PCA:function(u){var o=u.length,a=u[0].length,c=0,f,m,p=[],d=[],g=[],y=[],v=[],b=[],_=[],w=[],q=[],P=[];for(c=0;c<o;c++)p[c]=r.sum(u[c])/a;for(c=0;c<a;c++)for(_[c]=[],f=0;f<o;f++)_[c][f]=u[f][c]-p[f];for(_=r.transpose(_),c=0;c<o;c++)for(w[c]=[],f=0;f<o;f++)w[c][f]=r.dot([_[c]],[_[f]])/(a-1);for(g=r.jacobi(w),q=g[0],d=g[1],P=r.transpose(q),c=0;c<d.length;c++)for(f=c;f<d.length;f++)d[c]<d[f]&&(m=d[c],d[c]=d[f],d[f]=m,y=P[c],P[c]=P[f],P[f]=y);for(b=r.transpose(_),c=0;c<o;c++)for(v[c]=[],f=0;f<b.length;f++)v[c][f]=r.dot([P[c]],[b[f]]);return[u,d,P,v]}}),(function(l){for(var u=0;u<l.length;u++)(function(o){r.fn[o]=function(a,c){var f=this;return c?(setTimeout(function(){c.call(f,r.fn[o].call(f,a))},15),this):typeof r[o](this,a)=="number"?r[o](this,a):r(r[o](this,a))}})(l[u])})("add divide multiply subtract dot pow exp log abs norm angle".split(" "))})(e,Math),(function(r,t){var n=[].slice,i=r.utils.isNumber,s=r.utils.isArray;r.extend({zscore:function(){var o=n.call(arguments);return i(o[1])?(o[0]-o[1])/o[2]:(o[0]-r.mean(o[1]))/r.stdev(o[1],o[2])},ztest:function(){var o=n.call(arguments),a;return s(o[1])?(a=r.zscore(o[0],o[1],o[3]),o[2]===1?r.normal.cdf(-t.abs(a),0,1):r.normal.cdf(-t.abs(a),0,1)*2):o.length>2?(a=r.zscore(o[0],o[1],o[2]),o[3]===1?r.normal.cdf(-t.abs(a),0,1):r.normal.cdf(-t.abs(a),0,1)*2):(a=o[0],o[1]===1?r.normal.cdf(-t.abs(a),0,1):r.normal.cdf(-t.abs(a),0,1)*2)}}),r.extend(r.fn,{zscore:function(o,a){return(o-this.mean())/this.stdev(a)},ztest:function(o,a,c){var f=t.abs(this.zscore(o,c));return a===1?r.normal.cdf(-f,0,1):r.normal.cdf(-f,0,1)*2}}),r.extend({tscore:function(){var o=n.call(arguments);return o.length===4?(o[0]-o[1])/(o[2]/t.sqrt(o[3])):(o[0]-r.mean(o[1]))/(r.stdev(o[1],!0)/t.sqrt(o[1].length))},ttest:function(){var o=n.call(arguments),a;return o.length===5?(a=t.abs(r.tscore(o[0],o[1],o[2],o[3])),o[4]===1?r.studentt.cdf(-a,o[3]-1):r.studentt.cdf(-a,o[3]-1)*2):i(o[1])?(a=t.abs(o[0]),o[2]==1?r.studentt.cdf(-a,o[1]-1):r.studentt.cdf(-a,o[1]-1)*2):(a=t.abs(r.tscore(o[0],o[1])),o[2]==1?r.studentt.cdf(-a,o[1].length-1):r.studentt.cdf(-a,o[1].length-1)*2)}}),r.extend(r.fn,{tscore:function(o){return(o-this.mean())/(this.stdev(!0)/t.sqrt(this.cols()))},ttest:function(o,a){return a===1?1-r.studentt.cdf(t.abs(this.tscore(o)),this.cols()-1):r.studentt.cdf(-t.abs(this.tscore(o)),this.cols()-1)*2}}),r.extend({anovafscore:function(){var o=n.call(arguments),a,c,f,m,p,d,g,y;if(o.length===1){for(p=new Array(o[0].length),g=0;g<o[0].length;g++)p[g]=o[0][g];o=p}for(c=new Array,g=0;g<o.length;g++)c=c.concat(o[g]);for(f=r.mean(c),a=0,g=0;g<o.length;g++)a=a+o[g].length*t.pow(r.mean(o[g])-f,2);for(a/=o.length-1,d=0,g=0;g<o.length;g++)for(m=r.mean(o[g]),y=0;y<o[g].length;y++)d+=t.pow(o[g][y]-m,2);return d/=c.length-o.length,a/d},anovaftest:function(){var o=n.call(arguments),a,c,f,m;if(i(o[0]))return 1-r.centralF.cdf(o[0],o[1],o[2]);var p=r.anovafscore(o);for(a=o.length-1,f=0,m=0;m<o.length;m++)f=f+o[m].length;return c=f-a-1,1-r.centralF.cdf(p,a,c)},ftest:function(o,a,c){return 1-r.centralF.cdf(o,a,c)}}),r.extend(r.fn,{anovafscore:function(){return r.anovafscore(this.toArray())},anovaftes:function(){var o=0,a;for(a=0;a<this.length;a++)o=o+this[a].length;return r.ftest(this.anovafscore(),this.length-1,o-this.length)}}),r.extend({qscore:function(){var o=n.call(arguments),a,c,f,m,p;return i(o[0])?(a=o[0],c=o[1],f=o[2],m=o[3],p=o[4]):(a=r.mean(o[0]),c=r.mean(o[1]),f=o[0].length,m=o[1].length,p=o[2]),t.abs(a-c)/(p*t.sqrt((1/f+1/m)/2))},qtest:function(){var o=n.call(arguments),a;o.length===3?(a=o[0],o=o.slice(1)):o.length===7?(a=r.qscore(o[0],o[1],o[2],o[3],o[4]),o=o.slice(5)):(a=r.qscore(o[0],o[1],o[2]),o=o.slice(3));var c=o[0],f=o[1];return 1-r.tukey.cdf(a,f,c-f)},tukeyhsd:function(o){for(var a=r.pooledstdev(o),c=o.map(function(y){return r.mean(y)}),f=o.reduce(function(y,v){return y+v.length},0),m=[],p=0;p<o.length;++p)for(var d=p+1;d<o.length;++d){var g=r.qtest(c[p],c[d],o[p].length,o[d].length,a,f,o.length);m.push([[p,d],g])}return m}}),r.extend({normalci:function(){var o=n.call(arguments),a=new Array(2),c;return o.length===4?c=t.abs(r.normal.inv(o[1]/2,0,1)*o[2]/t.sqrt(o[3])):c=t.abs(r.normal.inv(o[1]/2,0,1)*r.stdev(o[2])/t.sqrt(o[2].length)),a[0]=o[0]-c,a[1]=o[0]+c,a},tci:function(){var o=n.call(arguments),a=new Array(2),c;return o.length===4?c=t.abs(r.studentt.inv(o[1]/2,o[3]-1)*o[2]/t.sqrt(o[3])):c=t.abs(r.studentt.inv(o[1]/2,o[2].length-1)*r.stdev(o[2],!0)/t.sqrt(o[2].length)),a[0]=o[0]-c,a[1]=o[0]+c,a},significant:function(o,a){return o<a}}),r.extend(r.fn,{normalci:function(o,a){return r.normalci(o,a,this.toArray())},tci:function(o,a){return r.tci(o,a,this.toArray())}});function l(u,o,a,c){if(u>1||a>1||u<=0||a<=0)throw new Error("Proportions should be greater than 0 and less than 1");var f=(u*o+a*c)/(o+c),m=t.sqrt(f*(1-f)*(1/o+1/c));return(u-a)/m}r.extend(r.fn,{oneSidedDifferenceOfProportions:function(o,a,c,f){var m=l(o,a,c,f);return r.ztest(m,1)},twoSidedDifferenceOfProportions:function(o,a,c,f){var m=l(o,a,c,f);return r.ztest(m,2)}})})(e,Math),e.models=(function(){function r(l){var u=l[0].length,o=e.arange(u).map(function(a){var c=e.arange(u).filter(function(f){return f!==a});return t(e.col(l,a).map(function(f){return f[0]}),e.col(l,c))});return o}function t(l,u){var o=l.length,a=u[0].length-1,c=o-a-1,f=e.lstsq(u,l),m=e.multiply(u,f.map(function(_){return[_]})).map(function(_){return _[0]}),p=e.subtract(l,m),d=e.mean(l),g=e.sum(m.map(function(_){return Math.pow(_-d,2)})),y=e.sum(l.map(function(_,w){return Math.pow(_-m[w],2)})),v=g+y,b=g/v;return{exog:u,endog:l,nobs:o,df_model:a,df_resid:c,coef:f,predict:m,resid:p,ybar:d,SST:v,SSE:g,SSR:y,R2:b}}function n(l){var u=r(l.exog),o=Math.sqrt(l.SSR/l.df_resid),a=u.map(function(d){var g=d.SST,y=d.R2;return o/Math.sqrt(g*(1-y))}),c=l.coef.map(function(d,g){return(d-0)/a[g]}),f=c.map(function(d){var g=e.studentt.cdf(d,l.df_resid);return(g>.5?1-g:g)*2}),m=e.studentt.inv(.975,l.df_resid),p=l.coef.map(function(d,g){var y=m*a[g];return[d-y,d+y]});return{se:a,t:c,p:f,sigmaHat:o,interval95:p}}function i(l){var u=l.R2/l.df_model/((1-l.R2)/l.df_resid),o=function(c,f,m){return e.beta.cdf(c/(m/f+c),f/2,m/2)},a=1-o(u,l.df_model,l.df_resid);return{F_statistic:u,pvalue:a}}function s(l,u){var o=t(l,u),a=n(o),c=i(o),f=1-(1-o.R2)*((o.nobs-1)/o.df_resid);return o.t=a,o.f=c,o.adjust_R2=f,o}return{ols:s}})(),e.extend({buildxmatrix:function(){for(var t=new Array(arguments.length),n=0;n<arguments.length;n++){var i=[1];t[n]=i.concat(arguments[n])}return e(t)},builddxmatrix:function(){for(var t=new Array(arguments[0].length),n=0;n<arguments[0].length;n++){var i=[1];t[n]=i.concat(arguments[0][n])}return e(t)},buildjxmatrix:function(t){for(var n=new Array(t.length),i=0;i<t.length;i++)n[i]=t[i];return e.builddxmatrix(n)},buildymatrix:function(t){return e(t).transpose()},buildjymatrix:function(t){return t.transpose()},matrixmult:function(t,n){var i,s,l,u,o;if(t.cols()==n.rows()){if(n.rows()>1){for(u=[],i=0;i<t.rows();i++)for(u[i]=[],s=0;s<n.cols();s++){for(o=0,l=0;l<t.cols();l++)o+=t.toArray()[i][l]*n.toArray()[l][s];u[i][s]=o}return e(u)}for(u=[],i=0;i<t.rows();i++)for(u[i]=[],s=0;s<n.cols();s++){for(o=0,l=0;l<t.cols();l++)o+=t.toArray()[i][l]*n.toArray()[s];u[i][s]=o}return e(u)}},regress:function(t,n){var i=e.xtranspxinv(t),s=t.transpose(),l=e.matrixmult(e(i),s);return e.matrixmult(l,n)},regresst:function(t,n,i){var s=e.regress(t,n),l={};l.anova={};var u=e.jMatYBar(t,s);l.yBar=u;var o=n.mean();l.anova.residuals=e.residuals(n,u),l.anova.ssr=e.ssr(u,o),l.anova.msr=l.anova.ssr/(t[0].length-1),l.anova.sse=e.sse(n,u),l.anova.mse=l.anova.sse/(n.length-(t[0].length-1)-1),l.anova.sst=e.sst(n,o),l.anova.mst=l.anova.sst/(n.length-1),l.anova.r2=1-l.anova.sse/l.anova.sst,l.anova.r2<0&&(l.anova.r2=0),l.anova.fratio=l.anova.msr/l.anova.mse,l.anova.pvalue=e.anovaftest(l.anova.fratio,t[0].length-1,n.length-(t[0].length-1)-1),l.anova.rmse=Math.sqrt(l.anova.mse),l.anova.r2adj=1-l.anova.mse/l.anova.mst,l.anova.r2adj<0&&(l.anova.r2adj=0),l.stats=new Array(t[0].length);for(var a=e.xtranspxinv(t),c,f,m,p=0;p<s.length;p++)c=Math.sqrt(l.anova.mse*Math.abs(a[p][p])),f=Math.abs(s[p]/c),m=e.ttest(f,n.length-t[0].length-1,i),l.stats[p]=[s[p],c,f,m];return l.regress=s,l},xtranspx:function(t){return e.matrixmult(t.transpose(),t)},xtranspxinv:function(t){var n=e.matrixmult(t.transpose(),t),i=e.inv(n);return i},jMatYBar:function(t,n){var i=e.matrixmult(t,n);return new e(i)},residuals:function(t,n){return e.matrixsubtract(t,n)},ssr:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n,2);return i},sse:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n[s],2);return i},sst:function(t,n){for(var i=0,s=0;s<t.length;s++)i+=Math.pow(t[s]-n,2);return i},matrixsubtract:function(t,n){for(var i=new Array(t.length),s=0;s<t.length;s++){i[s]=new Array(t[s].length);for(var l=0;l<t[s].length;l++)i[s][l]=t[s][l]-n[s][l]}return e(i)}}),e.jStat=e,e})});var Ig=h((fne,Ag)=>{"use strict";function nD(e){var r,t,n;return e===0?-.0005087819496582806:(e<0?r=-e:r=e,r<=1?(t=-.0005087819496582806+e*(-.008368748197417368+e*(.03348066254097446+e*(-.012692614766297404+e*(-.03656379714117627+e*(.02198786811111689+e*(.008226878746769157+e*(-.005387729650712429+e*(0+e*0)))))))),n=1+e*(-.9700050433032906+e*(-1.5657455823417585+e*(1.5622155839842302+e*(.662328840472003+e*(-.7122890234154284+e*(-.05273963823400997+e*(.07952836873415717+e*(-.0023339375937419+e*.0008862163904564247))))))))):(e=1/e,t=0+e*(0+e*(-.005387729650712429+e*(.008226878746769157+e*(.02198786811111689+e*(-.03656379714117627+e*(-.012692614766297404+e*(.03348066254097446+e*(-.008368748197417368+e*-.0005087819496582806)))))))),n=.0008862163904564247+e*(-.0023339375937419+e*(.07952836873415717+e*(-.05273963823400997+e*(-.7122890234154284+e*(.662328840472003+e*(1.5622155839842302+e*(-1.5657455823417585+e*(-.9700050433032906+e*1))))))))),t/n)}Ag.exports=nD});var Og=h((mne,Eg)=>{"use strict";function oD(e){var r,t,n;return e===0?-.20243350835593876:(e<0?r=-e:r=e,r<=1?(t=-.20243350835593876+e*(.10526468069939171+e*(8.3705032834312+e*(17.644729840837403+e*(-18.851064805871424+e*(-44.6382324441787+e*(17.445385985570866+e*(21.12946554483405+e*-3.6719225470772936))))))),n=1+e*(6.242641248542475+e*(3.971343795334387+e*(-28.66081804998+e*(-20.14326346804852+e*(48.560921310873994+e*(10.826866735546016+e*(-22.643693341313973+e*1.7211476576120028)))))))):(e=1/e,t=-3.6719225470772936+e*(21.12946554483405+e*(17.445385985570866+e*(-44.6382324441787+e*(-18.851064805871424+e*(17.644729840837403+e*(8.3705032834312+e*(.10526468069939171+e*-.20243350835593876))))))),n=1.7211476576120028+e*(-22.643693341313973+e*(10.826866735546016+e*(48.560921310873994+e*(-20.14326346804852+e*(-28.66081804998+e*(3.971343795334387+e*(6.242641248542475+e*1)))))))),t/n)}Eg.exports=oD});var kg=h((pne,Ng)=>{"use strict";function iD(e){var r,t,n;return e===0?-.1311027816799519:(e<0?r=-e:r=e,r<=1?(t=-.1311027816799519+e*(-.16379404719331705+e*(.11703015634199525+e*(.38707973897260434+e*(.3377855389120359+e*(.14286953440815717+e*(.029015791000532906+e*(.0021455899538880526+e*(-6794655751811263e-22+e*(28522533178221704e-24+e*-681149956853777e-24))))))))),n=1+e*(3.4662540724256723+e*(5.381683457070069+e*(4.778465929458438+e*(2.5930192162362027+e*(.848854343457902+e*(.15226433829533179+e*(.011059242293464892+e*(0+e*(0+e*0)))))))))):(e=1/e,t=-681149956853777e-24+e*(28522533178221704e-24+e*(-6794655751811263e-22+e*(.0021455899538880526+e*(.029015791000532906+e*(.14286953440815717+e*(.3377855389120359+e*(.38707973897260434+e*(.11703015634199525+e*(-.16379404719331705+e*-.1311027816799519))))))))),n=0+e*(0+e*(0+e*(.011059242293464892+e*(.15226433829533179+e*(.848854343457902+e*(2.5930192162362027+e*(4.778465929458438+e*(5.381683457070069+e*(3.4662540724256723+e*1)))))))))),t/n)}Ng.exports=iD});var Sg=h((dne,Tg)=>{"use strict";function sD(e){var r,t,n;return e===0?-.0350353787183178:(e<0?r=-e:r=e,r<=1?(t=-.0350353787183178+e*(-.0022242652921344794+e*(.018557330651423107+e*(.009508047013259196+e*(.0018712349281955923+e*(.00015754461742496055+e*(460469890584318e-20+e*(-2304047769118826e-25+e*26633922742578204e-28))))))),n=1+e*(1.3653349817554064+e*(.7620591645536234+e*(.22009110576413124+e*(.03415891436709477+e*(.00263861676657016+e*(7646752923027944e-20+e*(0+e*0)))))))):(e=1/e,t=26633922742578204e-28+e*(-2304047769118826e-25+e*(460469890584318e-20+e*(.00015754461742496055+e*(.0018712349281955923+e*(.009508047013259196+e*(.018557330651423107+e*(-.0022242652921344794+e*-.0350353787183178))))))),n=0+e*(0+e*(7646752923027944e-20+e*(.00263861676657016+e*(.03415891436709477+e*(.22009110576413124+e*(.7620591645536234+e*(1.3653349817554064+e*1)))))))),t/n)}Tg.exports=sD});var Lg=h((vne,$g)=>{"use strict";function aD(e){var r,t,n;return e===0?-.016743100507663373:(e<0?r=-e:r=e,r<=1?(t=-.016743100507663373+e*(-.0011295143874558028+e*(.001056288621524929+e*(.00020938631748758808+e*(14962478375834237e-21+e*(44969678992770644e-23+e*(4625961635228786e-24+e*(-2811287356288318e-29+e*9905570997331033e-32))))))),n=1+e*(.5914293448864175+e*(.1381518657490833+e*(.016074608709367652+e*(.0009640118070051656+e*(27533547476472603e-21+e*(282243172016108e-21+e*(0+e*0)))))))):(e=1/e,t=9905570997331033e-32+e*(-2811287356288318e-29+e*(4625961635228786e-24+e*(44969678992770644e-23+e*(14962478375834237e-21+e*(.00020938631748758808+e*(.001056288621524929+e*(-.0011295143874558028+e*-.016743100507663373))))))),n=0+e*(0+e*(282243172016108e-21+e*(27533547476472603e-21+e*(.0009640118070051656+e*(.016074608709367652+e*(.1381518657490833+e*(.5914293448864175+e*1)))))))),t/n)}$g.exports=aD});var Rg=h((hne,xg)=>{"use strict";var uD=S(),zg=W(),Fg=F(),cD=B(),lD=te(),fD=Ig(),mD=Og(),pD=kg(),dD=Sg(),vD=Lg(),hD=.08913147449493408,gD=2.249481201171875,yD=.807220458984375,bD=.9399557113647461,_D=.9836282730102539;function wD(e){var r,t,n,i,s;return uD(e)?NaN:e===0?cD:e===2?lD:e===1?0:e>2||e<0?NaN:(e>1?(r=-1,n=2-e):(r=1,n=e),e=1-n,e<=.5?(i=e*(e+10),s=fD(e),r*(i*hD+i*s)):n>=.25?(i=zg(-2*Fg(n)),n-=.25,s=mD(n),r*(i/(gD+s))):(n=zg(-Fg(n)),n<3?(t=n-1.125,s=pD(t),r*(yD*n+s*n)):n<6?(t=n-3,s=dD(t),r*(bD*n+s*n)):(t=n-6,s=vD(t),r*(_D*n+s*n))))}xg.exports=wD});var qt=h((gne,Cg)=>{"use strict";var qD=Rg();Cg.exports=qD});var Bg=h((yne,Mg)=>{"use strict";var PD=S(),Zg=Hn(),AD=W(),Dg=us(),ID=6123233995736766e-32;function ED(e){var r;return PD(e)?NaN:e<-1||e>1?NaN:e>.5?2*Zg(AD(.5-.5*e)):(r=Dg-Zg(e),r+=ID,r+=Dg,r)}Mg.exports=ED});var Hg=h((bne,Ug)=>{"use strict";var OD=Bg();Ug.exports=OD});var ko=h((_ne,Vg)=>{"use strict";var ND=1.4142135623730951;Vg.exports=ND});var Wg=h((wne,Gg)=>{"use strict";function kD(e){return e===0?.16666666666666666:.16666666666666666+e*.16666666666666666}Gg.exports=kD});var Jg=h((qne,Kg)=>{"use strict";function TD(e){return e===0?.058333333333333334:.058333333333333334+e*(.06666666666666667+e*.008333333333333333)}Kg.exports=TD});var Qg=h((Pne,Xg)=>{"use strict";function SD(e){return e===0?.0251984126984127:.0251984126984127+e*(.026785714285714284+e*(.0017857142857142857+e*.0001984126984126984))}Xg.exports=SD});var jg=h((Ane,Yg)=>{"use strict";function $D(e){return e===0?.012039792768959435:.012039792768959435+e*(.010559964726631394+e*(-.0011078042328042327+e*(.0003747795414462081+e*27557319223985893e-22)))}Yg.exports=$D});var r5=h((Ine,e5)=>{"use strict";function LD(e){return e===0?.003837005972422639:.003837005972422639+e*(.00610392115600449+e*(-.0016095979637646305+e*(.0005945867404200738+e*(-6270542728876062e-20+e*2505210838544172e-23))))}e5.exports=LD});var n5=h((Ene,t5)=>{"use strict";function zD(e){return e===0?.0032177478835464946:.0032177478835464946+e*(.0010898206731540065+e*(-.0012579159844784845+e*(.0006908420797309686+e*(-.00016376804137220805+e*(154012654012654e-19+e*16059043836821613e-26)))))}t5.exports=zD});var i5=h((One,o5)=>{"use strict";function FD(e){return e===0?.001743826229834001:.001743826229834001+e*(3353097688001788e-20+e*(-.0007624513544032393+e*(.0006451304695145635+e*(-.000249472580470431+e*(49255746366361444e-21+e*(-39851014346715405e-22+e*7647163731819816e-28))))))}o5.exports=FD});var a5=h((Nne,s5)=>{"use strict";function xD(e){return e===0?.0009647274732138864:.0009647274732138864+e*(-.0003110108632631878+e*(-.00036307660358786886+e*(.0005140660578834113+e*(-.00029133414466938067+e*(9086710793521991e-20+e*(-15303004486655377e-21+e*(10914179173496788e-22+e*28114572543455206e-31)))))))}s5.exports=xD});var c5=h((kne,u5)=>{"use strict";function RD(e){return e===0?.0005422926281312969:.0005422926281312969+e*(-.0003694266780000966+e*(-.00010230378073700413+e*(.00035764655430568635+e*(-.00028690924218514614+e*(.00012645437628698076+e*(-33202652391372056e-21+e*(4890304529197534e-21+e*(-3123956959982987e-22+e*822063524662433e-32))))))))}u5.exports=RD});var f5=h((Tne,l5)=>{"use strict";var CD=uo(),ZD=mr(),DD=W(),MD=ur(),BD=Wg(),UD=Jg(),HD=Qg(),VD=jg(),GD=r5(),WD=n5(),KD=i5(),JD=a5(),XD=c5(),QD=0,er=[1,0,0,0,0,0,0,0,0,0];function YD(e,r){var t,n;return n=CD(e/2,.5)*DD(e*MD)*(r-.5),t=1/e,er[1]=BD(t),er[2]=UD(t),er[3]=HD(t),er[4]=VD(t),er[5]=GD(t),er[6]=WD(t),er[7]=KD(t),er[8]=JD(t),er[9]=XD(t),QD+n*ZD(er,n*n)}l5.exports=YD});var d5=h((Sne,p5)=>{"use strict";var jD=uo(),eM=mr(),m5=W(),rM=Q(),tM=ur(),Fr=[0,0,0,0,0,0,0];function nM(e,r){var t,n,i,s,l,u,o,a;return a=jD(e/2,.5)*m5(e*tM)*r,s=e+2,l=e+4,u=e+6,Fr[0]=1,Fr[1]=-(e+1)/(2*s),s*=e+2,Fr[2]=-e*(e+1)*(e+3)/(8*s*l),s*=e+2,Fr[3]=-e*(e+1)*(e+5)*((3*e+7)*e-2)/(48*s*l*u),s*=e+2,l*=e+4,Fr[4]=-e*(e+1)*(e+7)*(((((15*e+154)*e+465)*e+286)*e-336)*e+64)/(384*s*l*u*(e+8)),s*=e+2,Fr[5]=-e*(e+1)*(e+3)*(e+9)*((((((35*e+452)*e+1573)*e+600)*e-2020)*e+928)*e-128)/(1280*s*l*u*(e+8)*(e+10)),s*=e+2,l*=e+4,u*=e+6,Fr[6]=-e*(e+1)*(e+11)*(((((((((((945*e+31506)*e+425858)*e+2980236)*e+11266745)*e+20675018)*e+7747124)*e-22574632)*e-8565600)*e+18108416)*e-7099392)*e+884736)/(46080*s*l*u*(e+8)*(e+10)*(e+12)),o=m5(e),i=rM(o*a,1/e),n=i*i,t=eM(Fr,n),t*=o,t/=i,-t}p5.exports=nM});var b5=h(($ne,y5)=>{"use strict";var v5=qt(),oM=Wr(),h5=W(),iM=Q(),sM=jn(),g5=ko();function aM(e,r){var t,n,i,s,l,u,o;return e>1e20?-v5(2*r)*g5:(t=1/(e-.5),n=48/(t*t),i=((20700*t/n-98)*t-16)*t+96.36,s=((94.5/(n+i)-3)/n+1)*h5(t*sM)*e,o=iM(s*2*r,2/e),o>.05+t?(u=-v5(2*r)*g5,o=u*u,e<5&&(i+=.3*(e-4.5)*(u+.6)),i+=(((.05*s*u-5)*u-7)*u-2)*u+n,o=(((((.4*o+6.3)*o+36)*o+94.5)/i-o-3)/n+1)*u,o=oM(t*o*o)):o=((1/(((e+6)/(e*o)-.089*s-.822)*(e+2)*3)+.5/(e+4))*o-1)*(e+1)/(e+2)+1/o,l=h5(e*o),-l)}y5.exports=aM});var k5=h((Lne,N5)=>{"use strict";var _5=qt(),w5=Oe(),Aa=Jr(),q5=Rs(),uM=Hg(),To=W(),cM=R(),P5=fo(),lM=Q(),fM=dt(),A5=ko(),I5=ur(),E5=f5(),So=d5(),Ia=b5(),O5=268435456,mM=1/3,pM=106/3,dM=.8549879733383485;function vM(e,r,t){var n,i,s,l,u,o,a,c,f,m,p,d,g,y,v,b;if(u=0,r>t?(a=t,t=r,r=a,l=!0):l=!1,w5(e)===e&&e<20)switch(i=Aa(1,pM),w5(e)){case 1:r===.5?u=0:u=-P5(I5*r)/fM(I5*r);break;case 2:u=(2*r-1)/To(2*r*t);break;case 4:o=4*r*t,s=To(o),g=4*P5(uM(s)/3)/s,y=To(g-4),u=r-.5<0?-y:y;break;case 6:if(r<1e-150)return(l?-1:1)*Ia(e,r);v=4*(r-r*r),b=lM(v,mM),d=6*(1+dM*(1/b-1));do f=d*d,m=f*f,p=d*m,c=d,d=2*(8*v*p-270*f+2187)/(5*(4*v*m-216*d-243));while(cM((d-c)/d)>i);d=To(d-e),u=r-.5<0?-d:d;break;default:e>O5?u=_5(2*r)*A5:e<3?(n=.2742-e*.0242143,r>n?u=E5(e,r):u=So(e,r)):(n=Aa(1,q5(e/-.654)),r>n?u=Ia(e,r):u=So(e,r))}else e>O5?u=-_5(2*r)*A5:e<3?(n=.2742-e*.0242143,r>n?u=E5(e,r):u=So(e,r)):(n=Aa(1,q5(e/-.654)),r>n?u=Ia(e,r):u=So(e,r));return l?-u:u}N5.exports=vM});var S5=h((zne,T5)=>{"use strict";var hM=k5();function gM(e,r,t){var n,i,s,l;return i=r/2,s=1-i,n=e*2,l=hM(n,i,s),t&&(t.value=l*l/(n+l*l)),n/(n+l*l)}T5.exports=gM});var z5=h((Fne,L5)=>{"use strict";var $o=mr(),yM=qt(),$5=W(),bM=V(),dr=ko(),Y=[0,0,0,0,0,0,0],an=[0,0,0,0];function _M(e,r,t){var n,i,s,l,u,o,a;return n=yM(2*t),n/=-$5(e/2),an[0]=n,o=r-e,l=o*o,u=l*o,Y[0]=-o*dr/2,Y[1]=(1-2*o)/8,Y[2]=-(o*dr/48),Y[3]=-1/192,Y[4]=-o*dr/3840,Y[5]=0,Y[6]=0,an[1]=$o(Y,n),Y[0]=o*dr*(3*o-2)/12,Y[1]=(20*l-12*o+1)/128,Y[2]=o*dr*(20*o-1)/960,Y[3]=(16*l+30*o-15)/4608,Y[4]=o*dr*(21*o+32)/53760,Y[5]=(-(32*l)+63)/368640,Y[6]=-o*dr*(120*o+17)/25804480,an[2]=$o(Y,n),Y[0]=o*dr*(-75*l+80*o-16)/480,Y[1]=(-1080*u+868*l-90*o-45)/9216,Y[2]=o*dr*(-1190*l+84*o+373)/53760,Y[3]=(-2240*u-2508*l+2100*o-165)/368640,Y[4]=0,Y[5]=0,Y[6]=0,an[3]=$o(Y,n),s=$o(an,1/e),i=s*s,a=-bM(-i/2),i===0?.5:(1+s*$5((1+a)/i))/2}L5.exports=_M});var Ea=h((xne,x5)=>{"use strict";var F5=F(),wM=ar(),Lo=wM/4;function qM(e,r){return t;function t(n){var i,s,l;return l=1-n,l===0?[-Lo,-Lo]:n===0?[-Lo,-Lo]:(s=F5(n)+r*F5(l)+e,i=1/n-r/l,[s,i])}}x5.exports=qM});var C5=h((Rne,R5)=>{"use strict";var PM=S();function AM(e){return e===0||PM(e)?e:e<0?-1:1}R5.exports=AM});var un=h((Cne,Z5)=>{"use strict";var IM=C5();Z5.exports=IM});var Na=h((Zne,M5)=>{"use strict";var D5=un(),zo=R(),EM=Jr(),Oa=ar();function OM(e,r,t,n,i,s){var l,u,o,a,c,f,m,p,d,g;d=0,l=0,c=r,a=EM(1,1-i),m=Oa,u=Oa,o=Oa,f=s;do{if(l=d,o=u,u=m,p=e(c),d=p[0],g=p[1],f-=1,d===0)break;if(g===0?(l===0&&(c===t?r=n:r=t,l=e(r),m=r-c),D5(l)*D5(d)<0?m<0?m=(c-t)/2:m=(c-n)/2:m<0?m=(c-n)/2:m=(c-t)/2):m=d/g,zo(m*2)>zo(o)&&(m=m>0?(c-t)/2:(c-n)/2),r=c,c-=m,c<=t){if(m=.5*(r-t),c=r-m,c===t||c===n)break}else if(c>=n&&(m=.5*(r-n),c=r-m,c===t||c===n))break;m>0?n=r:t=r}while(f&&zo(c*a)<zo(m));return c}M5.exports=OM});var U5=h((Dne,B5)=>{"use strict";function NM(e){return e===0?-1:-1+e*(-5+e*5)}B5.exports=NM});var V5=h((Mne,H5)=>{"use strict";function kM(e){return e===0?1:1+e*(21+e*(-69+e*46))}H5.exports=kM});var W5=h((Bne,G5)=>{"use strict";function TM(e){return e===0?7:7+e*(-2+e*(33+e*(-62+e*31)))}G5.exports=TM});var J5=h((Une,K5)=>{"use strict";function SM(e){return e===0?25:25+e*(-52+e*(-17+e*(88+e*(-115+e*46))))}K5.exports=SM});var Q5=h((Hne,X5)=>{"use strict";function $M(e){return e===0?7:7+e*(12+e*(-78+e*52))}X5.exports=$M});var j5=h((Vne,Y5)=>{"use strict";function LM(e){return e===0?-7:-7+e*(2+e*(183+e*(-370+e*185)))}Y5.exports=LM});var ry=h((Gne,ey)=>{"use strict";function zM(e){return e===0?-533:-533+e*(776+e*(-1835+e*(10240+e*(-13525+e*5410))))}ey.exports=zM});var ny=h((Wne,ty)=>{"use strict";function FM(e){return e===0?-1579:-1579+e*(3747+e*(-3372+e*(-15821+e*(45588+e*(-45213+e*15071)))))}ty.exports=FM});var iy=h((Kne,oy)=>{"use strict";function xM(e){return e===0?449:449+e*(-1259+e*(-769+e*(6686+e*(-9260+e*3704))))}oy.exports=xM});var ay=h((Jne,sy)=>{"use strict";function RM(e){return e===0?63149:63149+e*(-151557+e*(140052+e*(-727469+e*(2239932+e*(-2251437+e*750479)))))}sy.exports=RM});var cy=h((Xne,uy)=>{"use strict";function CM(e){return e===0?29233:29233+e*(-78755+e*(105222+e*(146879+e*(-1602610+e*(3195183+e*(-2554139+e*729754))))))}uy.exports=CM});var fy=h((Qne,ly)=>{"use strict";function ZM(e){return e===0?1:1+e*(-13+e*13)}ly.exports=ZM});var py=h((Yne,my)=>{"use strict";function DM(e){return e===0?1:1+e*(21+e*(-69+e*46))}my.exports=DM});var hy=h((jne,vy)=>{"use strict";var Pt=mr(),MM=qt(),BM=R(),UM=V(),dy=F(),HM=W(),VM=dt(),GM=fo(),WM=Ea(),KM=Na(),JM=U5(),XM=V5(),QM=W5(),YM=J5(),jM=Q5(),eB=j5(),rB=ry(),tB=ny(),nB=iy(),oB=ay(),iB=cy(),sB=fy(),aB=py(),C=[0,0,0,0,0,0],cn=[0,0,0,0];function uB(e,r,t){var n,i,s,l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P;return u=MM(2*e)/-HM(r/2),w=VM(t),_=GM(t),cn[0]=u,v=w*w,b=_*_,g=w*_,d=g*g,p=d*g,m=d*d,f=d*p,c=p*p,a=m*p,C[0]=(2*v-1)/(3*g),C[1]=-JM(v)/(36*d),C[2]=XM(v)/(1620*p),C[3]=QM(v)/(6480*m),C[4]=YM(v)/(90720*f),C[5]=0,cn[1]=Pt(C,u),C[0]=-jM(v)/(405*p),C[1]=eB(v)/(2592*m),C[2]=-rB(v)/(204120*f),C[3]=-tB(v)/(2099520*c),C[4]=0,C[5]=0,cn[2]=Pt(C,u),C[0]=nB(v)/(102060*f),C[1]=-oB(v)/(20995200*c),C[2]=iB(v)/(36741600*a),C[3]=0,C[4]=0,C[5]=0,cn[3]=Pt(C,u),o=Pt(cn,1/r),s=_/w,s*=s,y=-(o*o)/(2*v)+dy(v)+b*dy(b)/v,BM(o)<.7?(C[0]=v,C[1]=g,C[2]=(1-2*v)/3,C[3]=sB(v)/(36*g),C[4]=aB(v)/(270*d),C[5]=0,P=Pt(C,o)):(q=UM(y),C[0]=q,C[1]=s,C[2]=0,C[3]=3*s*(3*s+1)/6,C[4]=4*s*(4*s+1)*(4*s+2)/24,C[5]=5*s*(5*s+1)*(5*s+2)*(5*s+3)/120,P=Pt(C,q),(P-v)*o<0&&(P=1-P)),o<0?(i=0,n=v):(i=v,n=1),(P<i||P>n)&&(P=(i+n)/2),l=WM(-y,s),P=KM(l,P,i,n,32,100),P}vy.exports=uB});var yy=h((eoe,gy)=>{var ln=1e3,fn=ln*60,mn=fn*60,pn=mn*24,cB=pn*365.25;gy.exports=function(e,r){r=r||{};var t=typeof e;if(t==="string"&&e.length>0)return lB(e);if(t==="number"&&isNaN(e)===!1)return r.long?mB(e):fB(e);throw new Error("val is not a non-empty string or a valid number. val="+JSON.stringify(e))};function lB(e){if(e=String(e),!(e.length>100)){var r=/^((?:\d+)?\.?\d+) *(milliseconds?|msecs?|ms|seconds?|secs?|s|minutes?|mins?|m|hours?|hrs?|h|days?|d|years?|yrs?|y)?$/i.exec(e);if(r){var t=parseFloat(r[1]),n=(r[2]||"ms").toLowerCase();switch(n){case"years":case"year":case"yrs":case"yr":case"y":return t*cB;case"days":case"day":case"d":return t*pn;case"hours":case"hour":case"hrs":case"hr":case"h":return t*mn;case"minutes":case"minute":case"mins":case"min":case"m":return t*fn;case"seconds":case"second":case"secs":case"sec":case"s":return t*ln;case"milliseconds":case"millisecond":case"msecs":case"msec":case"ms":return t;default:return}}}}function fB(e){return e>=pn?Math.round(e/pn)+"d":e>=mn?Math.round(e/mn)+"h":e>=fn?Math.round(e/fn)+"m":e>=ln?Math.round(e/ln)+"s":e+"ms"}function mB(e){return Fo(e,pn,"day")||Fo(e,mn,"hour")||Fo(e,fn,"minute")||Fo(e,ln,"second")||e+" ms"}function Fo(e,r,t){if(!(e<r))return e<r*1.5?Math.floor(e/r)+" "+t:Math.ceil(e/r)+" "+t+"s"}});var _y=h((U,by)=>{U=by.exports=Ta.debug=Ta.default=Ta;U.coerce=gB;U.disable=vB;U.enable=dB;U.enabled=hB;U.humanize=yy();U.names=[];U.skips=[];U.formatters={};var ka;function pB(e){var r=0,t;for(t in e)r=(r<<5)-r+e.charCodeAt(t),r|=0;return U.colors[Math.abs(r)%U.colors.length]}function Ta(e){function r(){if(r.enabled){var t=r,n=+new Date,i=n-(ka||n);t.diff=i,t.prev=ka,t.curr=n,ka=n;for(var s=new Array(arguments.length),l=0;l<s.length;l++)s[l]=arguments[l];s[0]=U.coerce(s[0]),typeof s[0]!="string"&&s.unshift("%O");var u=0;s[0]=s[0].replace(/%([a-zA-Z%])/g,function(a,c){if(a==="%%")return a;u++;var f=U.formatters[c];if(typeof f=="function"){var m=s[u];a=f.call(t,m),s.splice(u,1),u--}return a}),U.formatArgs.call(t,s);var o=r.log||U.log||console.log.bind(console);o.apply(t,s)}}return r.namespace=e,r.enabled=U.enabled(e),r.useColors=U.useColors(),r.color=pB(e),typeof U.init=="function"&&U.init(r),r}function dB(e){U.save(e),U.names=[],U.skips=[];for(var r=(typeof e=="string"?e:"").split(/[\s,]+/),t=r.length,n=0;n<t;n++)r[n]&&(e=r[n].replace(/\*/g,".*?"),e[0]==="-"?U.skips.push(new RegExp("^"+e.substr(1)+"$")):U.names.push(new RegExp("^"+e+"$")))}function vB(){U.enable("")}function hB(e){var r,t;for(r=0,t=U.skips.length;r<t;r++)if(U.skips[r].test(e))return!1;for(r=0,t=U.names.length;r<t;r++)if(U.names[r].test(e))return!0;return!1}function gB(e){return e instanceof Error?e.stack||e.message:e}});var Sa=h((he,qy)=>{he=qy.exports=_y();he.log=_B;he.formatArgs=bB;he.save=wB;he.load=wy;he.useColors=yB;he.storage=typeof chrome<"u"&&typeof chrome.storage<"u"?chrome.storage.local:qB();he.colors=["lightseagreen","forestgreen","goldenrod","dodgerblue","darkorchid","crimson"];function yB(){return typeof window<"u"&&window.process&&window.process.type==="renderer"?!0:typeof document<"u"&&document.documentElement&&document.documentElement.style&&document.documentElement.style.WebkitAppearance||typeof window<"u"&&window.console&&(window.console.firebug||window.console.exception&&window.console.table)||typeof navigator<"u"&&navigator.userAgent&&navigator.userAgent.toLowerCase().match(/firefox\/(\d+)/)&&parseInt(RegExp.$1,10)>=31||typeof navigator<"u"&&navigator.userAgent&&navigator.userAgent.toLowerCase().match(/applewebkit\/(\d+)/)}he.formatters.j=function(e){try{return JSON.stringify(e)}catch(r){return"[UnexpectedJSONParseError]: "+r.message}};function bB(e){var r=this.useColors;if(e[0]=(r?"%c":"")+this.namespace+(r?" %c":" ")+e[0]+(r?"%c ":" ")+"+"+he.humanize(this.diff),!!r){var t="color: "+this.color;e.splice(1,0,t,"color: inherit");var n=0,i=0;e[0].replace(/%[a-zA-Z%]/g,function(s){s!=="%%"&&(n++,s==="%c"&&(i=n))}),e.splice(i,0,t)}}function _B(){return typeof console=="object"&&console.log&&Function.prototype.apply.call(console.log,console,arguments)}function wB(e){try{e==null?he.storage.removeItem("debug"):he.storage.debug=e}catch{}}function wy(){var e;try{e=he.storage.debug}catch{}return!e&&typeof process<"u"&&"env"in process&&(e=process.env.DEBUG),e}he.enable(wy());function qB(){try{return window.localStorage}catch{}}});var dn=h((roe,Py)=>{"use strict";var PB=34028234663852886e22;Py.exports=PB});var Ny=h((toe,Oy)=>{"use strict";var AB=Sa(),Ay=_o(),IB=R(),EB=V(),Iy=F(),OB=dn(),Ey=AB("gammaincinv:higher_newton");function NB(e,r,t,n,i,s,l,u){var o,a,c,f,m,p,d,g,y,v,b,_,w,q;q=e,b=1,_=1,p=r*r,a=e;do{if(q=e,d=q*q,t===0){if(o=(1-r)*Iy(q)+q+s,o>Iy(OB))return Ey("Warning: overflow problems in one or more steps of the computation. The initial approximation to the root is returned."),a;w=EB(o)}else w=-l*q;u?(g=Ay(q,r,!0,!1),c=-w*(g-n)):(y=Ay(q,r,!0,!0),c=w*(y-i)),w=c,n>1e-120||_>1?(f=.5*(q-r+1)/q,m=(2*d-4*q*r+4*q+2*p-3*r+1)/d,m/=6,e=q+w*(1+w*(f+w*m))):e=q+w,b=IB(q/e-1),_+=1,q=e,q<0&&(q=a,_=100)}while(b>2e-14&&_<35);return(b>2e-14||_>99)&&Ey("Warning: the number of iterations in the Newton method reached the upper limit N=35. The last value obtained for the root is given as output."),v=q||0,v}Oy.exports=NB});var Ty=h((noe,ky)=>{"use strict";function kB(e){return e===0?0:0+e*(1+e*(1+e*(1.5+e*(2.6666666666666665+e*(5.208333333333333+e*10.8)))))}ky.exports=kB});var $y=h((ooe,Sy)=>{"use strict";function TB(e){return e===0?1:1+e*(1+e*(.3333333333333333+e*(.027777777777777776+e*(-.003703703703703704+e*(.0002314814814814815+e*5878894767783657e-20)))))}Sy.exports=TB});var $a=h((ioe,zy)=>{"use strict";var SB=R(),$B=V(),Ly=F(),LB=mr(),zB=Ty(),FB=$y(),xB=1e-8,RB=.08333333333333333,CB=.008333333333333333,At=[1,0,0,0,0,0];function ZB(e){var r,t,n,i,s,l,u,o,a;if(a=e*e*.5,e===0?s=0:e<-1?(o=$B(-1-a),s=zB(o)):e<1?(o=e,s=FB(o)):(o=11+a,l=Ly(o),s=o+l,o=1/o,r=l*l,t=r*l,n=t*l,i=n*l,At[1]=(2-l)*.5,At[2]=(-9*l+6+2*r)/6,At[3]=-(3*t+36*l-22*r-12)*RB,At[4]=(60+350*r-300*l-125*t+12*n)/60,At[5]=-(-120-274*n+900*l-1700*r+1125*t+20*i)*CB,s+=l*o*LB(At,o)),o=1,e>-3.5&&e<-.03||e>.03&&e<40){o=1,u=s;do s=u*(a+Ly(u))/(u-1),o=SB(u/s-1),u=s;while(o>xB)}return s}zy.exports=ZB});var La=h((soe,Fy)=>{"use strict";var DB=.9189385332046728;Fy.exports=DB});var Ry=h((aoe,xy)=>{"use strict";var MB=[1.9963790515900766,-.0017971032528832887,13129285796384672e-21,-2340875228178749e-22,72291210671127e-22,-3280997607821e-22,19875070901e-21,-1509214183e-21,1375340084e-22,-145728923e-22,17532367e-22,-2351465e-22,346551e-22,-55471e-22,9548e-22,-1748e-22,332e-22,-58e-22];function BB(e,r){var t,n,i,s,l;n=0,i=0,t=r+r,l=e;do s=i,i=n,n=t*i-s+MB[l],l-=1;while(l>=0);return(n-s)/2}xy.exports=BB});var Zy=h((uoe,Cy)=>{"use strict";function UB(e){return e===0?.025721014990011306:.025721014990011306+e*(.08247596616699963+e*(-.0025328157302663564+e*(.0006099292666946337+e*(-.00033543297638406+e*.000250505279903))))}Cy.exports=UB});var My=h((coe,Dy)=>{"use strict";function HB(e){return e===0?.08333333333333333:.08333333333333333+e*(-.002777777777777778+e*(.0007936507936507937+e*-.0005952380952380953))}Dy.exports=HB});var Uy=h((loe,By)=>{"use strict";var za=fr(),xo=F(),Fa=La(),VB=Yt(),GB=dn(),WB=Ry(),KB=Zy(),JB=My(),XB=.30865217988013566;function QB(e){var r;return e<VB?GB:e<1?za(e+1)-(e+.5)*xo(e)+e-Fa:e<2?za(e)-(e-.5)*xo(e)+e-Fa:e<3?za(e-1)-(e-.5)*xo(e)+e-Fa+xo(e-1):e<12?(r=18/(e*e)-1,WB(17,r)/(12*e)):(r=1/(e*e),e<1e3?KB(r)/(XB+r)/e:JB(r)/e)}By.exports=QB});var Gy=h((foe,Vy)=>{"use strict";var Hy=V(),YB=Ne(),jB=F(),eU=dn(),rU=Gt(),tU=Uy();function nU(e){return e>=3?Hy(tU(e)):e>0?YB(e)/(Hy(-e+(e-.5)*jB(e))*rU):eU}Vy.exports=nU});var Ky=h((moe,Wy)=>{"use strict";function oU(e){var r,t,n;return e===0?-.3333333333438:(e<0?r=-e:r=e,r<=1?(t=-.3333333333438+e*(-.2070740359969+e*(-.05041806657154+e*(-.004923635739372+e*-4293658292782e-17))),n=1+e*(.7045554412463+e*(.2118190062224+e*(.03048648397436+e*.001605037988091)))):(e=1/e,t=-4293658292782e-17+e*(-.004923635739372+e*(-.05041806657154+e*(-.2070740359969+e*-.3333333333438))),n=.001605037988091+e*(.03048648397436+e*(.2118190062224+e*(.7045554412463+e*1)))),t/n)}Wy.exports=oU});var Xy=h((poe,Jy)=>{"use strict";var iU=R(),sU=F(),aU=$a(),uU=Ky();function cU(e){var r;return iU(e)<1?uU(e):(r=aU(e),sU(e/(r-1))/e)}Jy.exports=cU});var Yy=h((doe,Qy)=>{"use strict";function lU(e){var r,t,n;return e===0?-.0172847633523:(e<0?r=-e:r=e,r<=1?(t=-.0172847633523+e*(-.0159372646475+e*(-.00464910887221+e*(-.00060683488776+e*-614830384279e-17))),n=1+e*(.764050615669+e*(.297143406325+e*(.0579490176079+e*.00574558524851)))):(e=1/e,t=-614830384279e-17+e*(-.00060683488776+e*(-.00464910887221+e*(-.0159372646475+e*-.0172847633523))),n=.00574558524851+e*(.0579490176079+e*(.297143406325+e*(.764050615669+e*1)))),t/n)}Qy.exports=lU});var e9=h((voe,jy)=>{"use strict";function fU(e){var r,t,n;return e===0?-.0172839517431:(e<0?r=-e:r=e,r<=1?(t=-.0172839517431+e*(-.0146362417966+e*(-.00357406772616+e*(-.000391032032692+e*249634036069e-17))),n=1+e*(.690560400696+e*(.249962384741+e*(.0443843438769+e*.00424073217211)))):(e=1/e,t=249634036069e-17+e*(-.000391032032692+e*(-.00357406772616+e*(-.0146362417966+e*-.0172839517431))),n=.00424073217211+e*(.0443843438769+e*(.249962384741+e*(.690560400696+e*1)))),t/n)}jy.exports=fU});var t9=h((hoe,r9)=>{"use strict";function mU(e){var r,t,n;return e===0?.99994466948:(e<0?r=-e:r=e,r<=1?(t=.99994466948+e*(104.649839762+e*(857.204033806+e*(731.901559577+e*45.5174411671))),n=1+e*(104.526456943+e*(823.313447808+e*(3119.93802124+e*3970.03311219)))):(e=1/e,t=45.5174411671+e*(731.901559577+e*(857.204033806+e*(104.649839762+e*.99994466948))),n=3970.03311219+e*(3119.93802124+e*(823.313447808+e*(104.526456943+e*1)))),t/n)}r9.exports=mU});var o9=h((goe,n9)=>{"use strict";var pU=F(),dU=Yy(),vU=e9(),hU=t9();function gU(e){var r,t;return e<-5?(t=e*e,r=pU(-e),(12-t-6*(r*r))/(12*t*e)):e<-2?dU(e):e<2?vU(e):e<1e3?(t=1/e,hU(e)/(-12*e)):-1/(12*e)}n9.exports=gU});var s9=h((yoe,i9)=>{"use strict";function yU(e){var r,t,n;return e===0?.0495346498136:(e<0?r=-e:r=e,r<=1?(t=.0495346498136+e*(.0299521337141+e*(.00688296911516+e*(.000512634846317+e*-201411722031e-16))),n=1+e*(.759803615283+e*(.261547111595+e*(.0464854522477+e*.00403751193496)))):(e=1/e,t=-201411722031e-16+e*(.000512634846317+e*(.00688296911516+e*(.0299521337141+e*.0495346498136))),n=.00403751193496+e*(.0464854522477+e*(.261547111595+e*(.759803615283+e*1)))),t/n)}i9.exports=yU});var u9=h((boe,a9)=>{"use strict";function bU(e){var r,t,n;return e===0?.00452313583942:(e<0?r=-e:r=e,r<=1?(t=.00452313583942+e*(.00120744920113+e*(-789724156582e-16+e*(-504476066942e-16+e*-535770949796e-17))),n=1+e*(.912203410349+e*(.405368773071+e*(.0901638932349+e*.00948935714996)))):(e=1/e,t=-535770949796e-17+e*(-504476066942e-16+e*(-789724156582e-16+e*(.00120744920113+e*.00452313583942))),n=.00948935714996+e*(.0901638932349+e*(.405368773071+e*(.912203410349+e*1)))),t/n)}a9.exports=bU});var l9=h((_oe,c9)=>{"use strict";function _U(e){var r,t,n;return e===0?.00439937562904:(e<0?r=-e:r=e,r<=1?(t=.00439937562904+e*(.000487225670639+e*(-.000128470657374+e*(529110969589e-17+e*15716677175e-17))),n=1+e*(.794435257415+e*(.333094721709+e*(.0703527806143+e*.00806110846078)))):(e=1/e,t=15716677175e-17+e*(529110969589e-17+e*(-.000128470657374+e*(.000487225670639+e*.00439937562904))),n=.00806110846078+e*(.0703527806143+e*(.333094721709+e*(.794435257415+e*1)))),t/n)}c9.exports=_U});var m9=h((woe,f9)=>{"use strict";function wU(e){var r,t,n;return e===0?-.0011481191232:(e<0?r=-e:r=e,r<=1?(t=-.0011481191232+e*(-.112850923276+e*(1.51623048511+e*(-.218472031183+e*.0730002451555))),n=1+e*(14.2482206905+e*(69.7360396285+e*(218.938950816+e*277.067027185)))):(e=1/e,t=.0730002451555+e*(-.218472031183+e*(1.51623048511+e*(-.112850923276+e*-.0011481191232))),n=277.067027185+e*(218.938950816+e*(69.7360396285+e*(14.2482206905+e*1)))),t/n)}f9.exports=wU});var d9=h((qoe,p9)=>{"use strict";function qU(e){var r,t,n;return e===0?-.000145727889667:(e<0?r=-e:r=e,r<=1?(t=-.000145727889667+e*(-.290806748131+e*(-13.308504545+e*(199.722374056+e*-11.4311378756))),n=1+e*(139.612587808+e*(2189.01116348+e*(7115.24019009+e*45574.6081453)))):(e=1/e,t=-11.4311378756+e*(199.722374056+e*(-13.308504545+e*(-.290806748131+e*-.000145727889667))),n=45574.6081453+e*(7115.24019009+e*(2189.01116348+e*(139.612587808+e*1)))),t/n)}p9.exports=qU});var g9=h((Poe,h9)=>{"use strict";var v9=F(),PU=s9(),AU=u9(),IU=l9(),EU=m9(),OU=d9();function NU(e){var r,t;return e<-8?(r=e*e,t=v9(-e)/e,(-30+e*t*(6*r*t*t-12+r))/(12*e*r*r)):e<-4?PU(e)/(e*e):e<-2?AU(e):e<2?IU(e):e<10?(r=1/e,EU(r)/(e*e)):e<100?(r=1/e,OU(r)/(e*e)):-v9(e)/(12*e*e*e)}h9.exports=NU});var E9=h((Aoe,I9)=>{"use strict";var kU=Sa(),y9=mr(),Ze=fr(),TU=qt(),b9=Ne(),Ro=W(),_9=R(),It=V(),SU=Ve(),$U=Q(),Se=F(),LU=Gt(),zU=dn(),FU=Ks(),xU=Ny(),w9=$a(),q9=Gy(),RU=Xy(),CU=o9(),ZU=g9(),DU=kU("gammaincinv:compute"),xr=.5,xa=.3333333333333333,MU=.25,P9=.2,A9=.16666666666666666,BU=.08333333333333333,UU=.041666666666666664,$e=[0,0,0,0,0];function HU(e,r,t){var n,i,s,l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P,A,N,k,D,Z,x,J,se,O,z,le,be,_e,Ee,fe,re,G,Br,oe,or,xe,Fi,xi,Ri;if(r<xr?(l=!0,u=r,Fi=-1):(l=!1,u=t,Fi=1),oe=0,_9(e-1)<1e-4&&(or=0,l?r<.001?(be=r*r,se=be*r,le=se*r,P=le*r,q=P*r,A=r+be*xr+se*xa+le*MU+P*P9+q*A9):A=-Se(1-r):A=-Se(t),e===1?(oe=2,Ee=A):(s=Ze(e),oe=1)),t<1e-30&&e<xr&&(or=0,A=-Se(t*b9(e))+(e-1)*Se(-Se(t*b9(e))),oe=1,s=Ze(e)),e>1&&e<500&&r<1e-80){for(or=0,o=1/e,n=1/(e+1),A=(Ze(e+1)+Se(r))*o,A=It(A),y=A,Br=0;Br<10;Br++)A=y*It(A*o)*$U(1-A*n,o);oe=1,s=Ze(e)}if(a=1/e*(Se(r)+Ze(e+1)),a<Se(P9*(1+e))&&oe===0&&(xe=It(a),or=0,N=e*e,_e=N*e,O=_e*e,v=e+1,p=v*v,m=v*p,f=p*p,b=e+2,c=b*b,_=e+3,$e[0]=1,$e[1]=1/v,$e[2]=xr*(3*e+5)/(p*b),$e[3]=xa*(31+8*N+33*e)/(m*b*_),$e[4]=UU*(2888+1179*_e+125*O+3971*N+5661*e)/(f*c*_*(e+4)),A=xe*y9($e,xe),s=Ze(e),oe=1),e<10&&oe===0&&(d=Ro(e)/(q9(e)*LU),g=SU(.02,d),t<g&&(or=0,re=1-e,x=re*re,J=x*re,w=Ro(-2/e*Se(t/d)),A=e*w9(w),G=Se(A),A>5?(k=G*G,D=k*G,Z=D*G,xe=1/A,$e[0]=G-1,$e[1]=(3*re-2*re*G+k-2*G+2)*xr,$e[2]=(24*re*G-11*x-24*re-6*k+12*G-12-9*re*k+6*x*G+2*D)*A9,$e[3]=(-12*J*G+8.04*re*k-114*x*G+(72+36*k)+(3*Z-72*G+162)*(re-168*re*G)-(12*D+25*J)-(22*re*D+36*x*k+120*x))*BU,$e[4]=0,A=A-G+re*xe*y9($e,xe)):(xe=1/A,k=G*G,fe=G-1,xi=G-re*xe*fe,xi<A&&(A-=xi)),s=Ze(e),oe=1)),_9(u-xr)<1e-5&&oe===0&&(or=0,o=1/e,A=e-xa+(.019753086419753086+.007211444248481286*o)*o,s=Ze(e),oe=1),e<1&&oe===0&&(or=0,l?A=It(1/e*(Se(u)+Ze(e+1))):A=It(1/e*(Se(1-u)+Ze(e+1))),s=Ze(e),oe=1),oe===0)if(or=1,o=1/e,xe=TU(2*u),w=Fi*xe/Ro(e*xr),xe<zU)w+=(RU(w)+(CU(w)+ZU(w)*o)*o)*o,A=e*w9(w),Ri=w,z=-Ro(e/FU)*It(-xr*e*Ri*Ri)/q9(e),i=1/z;else return DU("Warning: Overflow problems in one or more steps of the computation."),NaN;return oe<2&&(Ee=xU(A,e,or,r,t,s,i,l)),Ee}I9.exports=HU});var S9=h((Ioe,T9)=>{"use strict";var O9=S(),VU=Yt(),N9=B(),k9=E9();function GU(e,r,t){return O9(e)||O9(r)?NaN:r<VU?NaN:e>1||e<0?NaN:t===!0?e===0?N9:e===1?0:k9(r,1-e,e):e===0?0:e===1?N9:k9(r,e,1-e)}T9.exports=GU});var L9=h((Eoe,$9)=>{"use strict";var WU=S9();$9.exports=WU});var F9=h((Ooe,z9)=>{"use strict";var KU=5e-324;z9.exports=KU});var Z9=h((Noe,C9)=>{"use strict";var x9=L9(),R9=F(),JU=W(),XU=F9(),QU=Ea(),YU=Na();function jU(e,r,t,n){var i,s,l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P,A,N,k,D,Z,x,J,se,O,z,le;return t<n?o=x9(t,r,!0):o=x9(n,r,!1),o/=e,v=r/e,O=JU(1+v),q=O*O,P=q*O,A=q*q,N=P*q,k=P*P,D=A*P,Z=A*A,x=N*A,c=N*N,se=o-v,b=se*se,_=b*se,w=b*b,J=O+1,f=J*J,m=J*f,p=f*f,d=(O+2)*(O-1)/(3*O),d+=(P+9*q+21*O+5)*se/(36*q*J),d-=(A-13*P+69*q+167*O+46)*b/(1620*f*P),d-=(7*N+21*A+70*P+26*q-93*O-31)*_/(6480*m*A),d-=(75*k+202*N+188*A-888*P-1345*q+118*O+138)*w/(272160*p*N),g=(28*A+131*P+402*q+581*O+208)*(O-1)/(1620*J*P),g-=(35*k-154*N-623*A-1636*P-3983*q-3514*O-925)*se/(12960*f*A),g-=(2132*D+7915*k+16821*N+35066*A+87490*P+141183*q+95993*O+21640)*b/(816480*N*m),g-=(11053*Z+53308*D+117010*k+163924*N+116188*A-258428*P-677042*q-481940*O-105497)*_/(14696640*p*k),y=-((3592*D+8375*k-1323*N-29198*A-89578*P-154413*q-116063*O-29632)*(O-1))/(816480*N*f),y-=(442043*x+2054169*Z+3803094*D+3470754*k+2141568*N-2393568*A-19904934*P-34714674*q-23128299*O-5253353)*se/(146966400*k*m),y-=(116932*c+819281*x+2378172*Z+4341330*D+6806004*k+10622748*N+18739500*A+30651894*P+30869976*q+15431867*O+2919016)*b/(146966400*p*D),a=o+d/e+g/(e*e)+y/(e*e*e),a<=0&&(a=XU),z=a-v*R9(a)+(1+v)*R9(1+v)-v,i=1/(1+v),l=a<v?i:0,u=a<v?1:i,le=(l+u)/2,s=QU(z,v),YU(s,le,l,u,32,100)}C9.exports=jU});var M9=h((koe,D9)=>{"use strict";var ae=R(),eH=Jr(),Ra=un(),rH=sr(),Ca=ar();function tH(e,r,t,n,i,s){var l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q;_=0,u=!1,f=r,c=eH(1,1-i),d=rH(1e7*r,1e7),m=0,o=d,a=d,p=s;do{if(m=_,a=o,o=d,b=e(f),_=b[0],w=b[1],q=b[2],p-=1,_===0)break;if(w===0?(m===0&&(f===t?r=n:r=t,m=e(r),d=r-f),Ra(m)*Ra(_)<0?d<0?d=(f-t)/2:d=(f-n)/2:d<0?d=(f-n)/2:d=(f-t)/2):q===0?d=_/w:(g=2*_,v=2*w-_*(q/w),ae(v)<1&&ae(g)>=ae(v)*Ca?d=_/w:d=g/v,d*w/_<0&&(d=_/w,ae(d)>2*ae(r)&&(d=(d<0?-1:1)*2*ae(r)))),l=ae(d/a),l>.8&&l<2&&(d=d>0?(f-t)/2:(f-n)/2,ae(d)>f&&(d=Ra(d)*f),a=d*3),r=f,f-=d,f<t){if(ae(t)<1&&ae(f)>1&&Ca/ae(f)<ae(t)?y=1e3:y=f/t,ae(y)<1&&(y=1/y),!u&&y>0&&y<3)d=.99*(r-t),f=r-d,u=!0;else if(d=(r-t)/2,f=r-d,f===t||f===n)break}else if(f>n){if(ae(n)<1&&ae(f)>1&&Ca/ae(f)<ae(n)?y=1e3:y=f/n,ae(y)<1&&(y=1/y),!u&&y>0&&y<3)d=.99*(r-n),f=r-d,u=!0;else if(d=(r-n)/2,f=r-d,f===t||f===n)break}d>0?n=r:t=r}while(p&&ae(f*c)<ae(d));return f}D9.exports=tH});var U9=h((Toe,B9)=>{"use strict";var nH=_a().assign,oH=R(),iH=ar(),Za=wr();function sH(e,r,t,n){return i;function i(s){var l,u,o,a,c;return c=1-s,l=[0,0],nH(s,e,r,!0,n,l,1,0),a=l[0]-t,u=l[1],n&&(u=-u),c===0&&(c=Za*64),s===0&&(s=Za*64),o=u*(-(c*e)+(r-2)*s+1),oH(o)<c*s*iH&&(o/=c*s),n&&(o=-o),u===0&&(u=(n?-1:1)*Za*64),[a,u,o]}}B9.exports=sH});var j9=h((Soe,Y9)=>{"use strict";var aH=mr(),H9=Lr(),Da=Wr(),V9=ve(),uH=Hn(),Et=Os(),G9=W(),cH=R(),W9=V(),rr=Q(),K9=dt(),lH=sr(),fH=Ve(),J9=F(),Ma=wr(),X9=jn(),Q9=Re(),mH=S5(),pH=z5(),dH=hy(),vH=Z9(),hH=M9(),gH=U9(),yH=32,bH=1e3,jr=[0,0,0,0,0];function _H(e,r,t,n){var i,s,l,u,o,a,c,f,m,p,d,g,y,v,b,_,w,q,P,A,N,k,D,Z,x,J,se,O,z;if(s=!1,n===0)return[1,0];if(t===0)return[0,1];if(e===1){if(r===1)return[t,1-t];g=r,r=e,e=g,g=n,n=t,t=g,s=!0}if(O=0,u=0,a=1,e===.5){if(r===.5)return O=K9(t*X9),O*=O,z=K9(n*X9),z*=z,[O,z];r>.5&&(g=r,r=e,e=g,g=n,n=t,t=g,s=!s)}if(r===.5&&e>=.5&&t!==1)N={},O=mH(e,t,N),z=N.value;else{if(r===1)return t<n?e>1?(O=rr(t,1/e),z=-Da(J9(t)/e)):(O=rr(t,1/e),z=1-O):(O=W9(V9(-n)/e),z=-Da(V9(-n)/e)),s&&(g=z,z=O,O=g),[O,z];if(e+r>5)t>.5&&(g=r,r=e,e=g,g=n,n=t,t=g,s=!s),m=fH(e,r),f=lH(e,r),G9(m)>f-m&&m>5?(O=pH(e,r,t),z=1-O):(x=e+r,o=uH(G9(e/x)),l=m/x,l>=.2&&l<=.8&&x>=10?(d=rr(t,1/e),d<.0025&&e+r<200?O=d*rr(e*Et(e,r),1/e):O=dH(t,x,o),z=1-O):(e<r&&(g=r,r=e,e=g,g=n,n=t,t=g,s=!s),p=0,r<2&&(p=Et(e,r)),p===0?z=1:(z=rr(r*n*p,1/r),O=1-z)),z>1e-5&&(O=vH(e,r,t,n),z=1-O));else if(e<1&&r<1){if(A=(1-e)/(2-e-r),_=H9(A,e,r)-t,cH(_)/t<Q9*3)return s?[1-A,A]:[A,1-A];_<0&&(g=r,r=e,e=g,g=n,n=t,t=g,s=!s,A=1-A),P=rr(e*t*Et(e,r),1/e),O=P/(1+P),z=1/(1+P),O>A&&(O=A),a=A}else e>1&&r>1?(A=(e-1)/(e+r-2),y=(r-1)/(e+r-2),q=H9(A,e,r)-t,q<0&&(g=r,r=e,e=g,g=n,n=t,t=g,g=y,y=A,A=g,s=!s),w=J9(t*e*Et(e,r))/e,O=W9(w),z=O<.9?1-O:-Da(w),r<e&&O<.2&&(v=e-1,b=r-1,k=e*e,D=e*k,Z=r*r,jr[0]=0,jr[1]=1,jr[2]=b/v,v*=v,jr[3]=b*(3*e*r+5*r+k-e-4)/(2*(e+2)*v),v*=e+1,jr[4]=b*(33*e*Z+31*Z+8*k*Z-30*e*r-47*r+11*k*r+6*D*r+18+4*e-D+k*k-10*k),jr[4]/=3*(e+3)*(e+2)*v,O=aH(jr,O)),O>A&&(O=A),a=A):(r<e&&(g=r,r=e,e=g,g=n,n=t,t=g,s=!s),rr(t,1/e)<.5?(O=rr(t*e*Et(e,r),1/e),O===0&&(O=Ma),z=1-O):(z=rr(1-rr(t,r*Et(e,r)),1/r),z===0&&(z=Ma),O=1-z))}return O>.5&&(g=r,r=e,e=g,g=n,n=t,t=g,g=z,z=O,O=g,s=!s,J=1-a,se=1-u,u=J,a=se),u===0&&(s?(u=Q9,O<u&&(O=u)):u=Ma,O<u&&(O=u)),i=yH,O<1e-50&&(e<1||r<1)&&(i*=3,i/=2),c=gH(e,r,t<n?t:n,t>=n),O=hH(c,O,u,a,i,bH),O===u&&(O=0),s?[1-O,O]:[O,1-O]}Y9.exports=_H});var Co=h(($oe,e7)=>{"use strict";var wH=j9();e7.exports=wH});var n7=h((Loe,t7)=>{"use strict";var qH=Co(),r7=S(),PH=un(),AH=W();function IH(e,r){var t,n;return r7(r)||r7(e)||r<=0||e<0||e>1?NaN:(t=e>.5?1-e:e,n=qH(r/2,.5,2*t,1-2*t),PH(e-.5)*AH(r*n[1]/n[0]))}t7.exports=IH});var s7=h((zoe,i7)=>{"use strict";var EH=pr(),OH=Co(),o7=S(),NH=un(),kH=W();function TH(e){if(o7(e)||e<=0)return EH(NaN);return r;function r(t){var n,i;return o7(t)||t<0||t>1?NaN:(n=t>.5?1-t:t,i=OH(e/2,.5,2*n,1-2*n),NH(t-.5)*kH(e*i[1]/i[0]))}}i7.exports=TH});var c7=h((Foe,u7)=>{"use strict";var SH=qe(),a7=n7(),$H=s7();SH(a7,"factory",$H);u7.exports=a7});var b7=h((ase,y7)=>{"use strict";var Ka=S(),g7=Co();function YH(e,r,t,n){return Ka(e)||Ka(r)||Ka(t)?NaN:r<=0||t<=0?NaN:e<0||e>1?NaN:n?g7(r,t,1-e,e)[0]:g7(r,t,e,1-e)[0]}y7.exports=YH});var Ja=h((use,_7)=>{"use strict";var jH=b7();_7.exports=jH});var q7=h((cse,w7)=>{"use strict";var eV=Ja(),Xa=S();function rV(e,r,t){return Xa(e)||Xa(r)||Xa(t)||r<=0||t<=0||e<0||e>1?NaN:eV(e,r,t)}w7.exports=rV});var A7=h((lse,P7)=>{"use strict";var tV=pr(),nV=Ja(),Qa=S();function oV(e,r){if(Qa(e)||Qa(r)||e<=0||r<=0)return tV(NaN);return t;function t(n){return Qa(n)||n<0||n>1?NaN:nV(n,e,r)}}P7.exports=oV});var Ya=h((fse,E7)=>{"use strict";var iV=qe(),I7=q7(),sV=A7();iV(I7,"factory",sV);E7.exports=I7});var k7=h((mse,N7)=>{"use strict";var O7=[1276642195630063e-46,-3401102254316749e-45,1025680058010471e-43,-35475981581010704e-43,14292273559424982e-41,-6831888753985767e-39,39628370610464347e-38,-2868042435334643e-35,2683181998482699e-33,-3399615005417722e-31,6221098041892606e-29,-1809129475572494e-26,981082564692473e-23,-1384948176067564e-20,.16663894804518634],aV=O7.length;function uV(e){var r,t,n,i,s;if(e<-1.1||e>1.1)return NaN;for(n=0,i=0,r=2*e,s=0;s<aV;s++)t=n,n=i,i=r*n-t+O7[s];return(i-t)*.5}N7.exports=uV});var S7=h((pse,T7)=>{"use strict";var cV=Q(),lV=k7(),fV=9490626562425156e-8,mV=3745194030963158e291;function pV(e){return e<10?NaN:e>=mV?0:e<fV?lV(2*cV(10/e,2)-1)/e:1/(e*12)}T7.exports=pV});var F7=h((dse,z7)=>{"use strict";var dV=fr(),$7=ve(),ja=Ne(),vV=sr(),hV=Ve(),Mo=F(),gV=La(),yV=te(),L7=B(),gn=S7();function bV(e,r){var t,n,i;return n=hV(e,r),i=vV(e,r),n<0?NaN:n===0?L7:i===L7?yV:n>=10?(t=gn(n)+gn(i)-gn(n+i),-.5*Mo(i)+gV+t+(n-.5)*Mo(n/(n+i))+i*$7(-n/(n+i))):i>=10?(t=gn(i)-gn(n+i),dV(n)+t+n-n*Mo(n+i)+(i-.5)*$7(-n/(n+i))):Mo(ja(n)*(ja(i)/ja(n+i)))}z7.exports=bV});var Bo=h((vse,x7)=>{"use strict";var _V=F7();x7.exports=_V});var Z7=h((hse,C7)=>{"use strict";var wV=Bo(),eu=S(),qV=ve(),ru=F(),R7=B(),tu=te();function PV(e,r,t){var n;return eu(e)||eu(r)||eu(t)||r<=0||t<=0?NaN:e<0||e>1?tu:e===0?r<1?R7:r>1?tu:ru(t):e===1?t<1?R7:t>1?tu:ru(r):(n=(r-1)*ru(e),n+=(t-1)*qV(-e),n-=wV(r,t),n)}C7.exports=PV});var B7=h((gse,M7)=>{"use strict";var AV=pr(),IV=Bo(),nu=S(),EV=ve(),ou=F(),iu=te(),D7=B();function OV(e,r){var t;if(nu(e)||nu(r)||e<=0||r<=0)return AV(NaN);return t=IV(e,r),n;function n(i){var s;return nu(i)?NaN:i<0||i>1?iu:i===0?e<1?D7:e>1?iu:ou(r):i===1?r<1?D7:r>1?iu:ou(e):(s=-t,s+=(e-1)*ou(i)+(r-1)*EV(-i),s)}}M7.exports=OV});var V7=h((yse,H7)=>{"use strict";var NV=qe(),U7=Z7(),kV=B7();NV(U7,"factory",kV);H7.exports=U7});var K7=h((qse,W7)=>{"use strict";var LV=yt(),zV=fr(),FV=Ne(),xV=ve(),RV=W(),CV=R(),Rr=V(),yn=Q(),su=sr(),au=Ve(),G7=F(),Uo=Ge(),bn=Or(),uu=Qr(),ZV=Ir();function DV(e,r){var t,n,i,s,l,u,o;return i=e+uu-.5,o=(r-e-uu+.5)/i,e<1?r<=bn?Rr(e*G7(r)-r-zV(e)):yn(r,e)*Rr(-r)/FV(e):(CV(o*o*e)<=100&&e>150?(t=e*(xV(o)-o)+r*(.5-uu)/i,t=Rr(t)):(s=e*G7(r/i),l=e-r,au(s,l)<=bn||su(s,l)>=Uo?(n=l/e,au(s,l)/2>bn&&su(s,l)/2<Uo?(u=yn(r/i,e/2)*Rr(l/2),t=u*u):au(s,l)/4>bn&&su(s,l)/4<Uo&&r>e?(u=yn(r/i,e/4)*Rr(l/4),t=u*u,t*=t):n>bn&&n<Uo?t=yn(r*Rr(n)/i,e):t=Rr(s+l)):t=yn(r/i,e)*Rr(l)),t*=RV(i/ZV)/LV(e),t)}W7.exports=DV});var cu=h((Pse,Q7)=>{"use strict";var MV=fr(),BV=V(),J7=F(),X7=B(),UV=ar(),HV=K7();function VV(e,r){var t;return e<=0?NaN:r<0?NaN:r===0?e>1?0:e===1?1:X7:(t=HV(e,r),r<1&&UV*r<t?X7:(t===0?(t=e*J7(r)-r-MV(e)-J7(r),t=BV(t)):t/=r,t))}Q7.exports=VV});var t8=h((Ase,r8)=>{"use strict";var lu=S(),Y7=F(),j7=B(),e8=te(),GV=cu();function WV(e,r,t){return lu(e)||lu(r)||lu(t)||r<0||t<=0?NaN:e<0||e===j7?e8:r===0?e===0?j7:e8:Y7(GV(r,e*t))+Y7(t)}r8.exports=WV});var i8=h((Ise,o8)=>{"use strict";var KV=B(),JV=te(),n8=S();function XV(e,r){return n8(e)||n8(r)?NaN:e===r?KV:JV}o8.exports=XV});var u8=h((Ese,a8)=>{"use strict";var QV=pr(),YV=B(),jV=te(),s8=S();function eG(e){if(s8(e))return QV(NaN);return r;function r(t){return s8(t)?NaN:t===e?YV:jV}}a8.exports=eG});var f8=h((Ose,l8)=>{"use strict";var rG=qe(),c8=i8(),tG=u8();rG(c8,"factory",tG);l8.exports=c8});var d8=h((Nse,p8)=>{"use strict";var nG=pr(),oG=f8().factory,fu=S(),m8=F(),iG=te(),sG=B(),aG=cu();function uG(e,r){if(fu(e)||fu(r)||e<0||r<=0)return nG(NaN);if(e===0)return oG(0);return t;function t(n){return fu(n)?NaN:n<0||n===sG?iG:m8(aG(e,n*r))+m8(r)}}p8.exports=uG});var mu=h((kse,h8)=>{"use strict";var cG=qe(),v8=t8(),lG=d8();cG(v8,"factory",lG);h8.exports=v8});var b8=h((Vse,y8)=>{"use strict";var vG=Oe();function hG(e){return vG(e)===e&&e>=0}y8.exports=hG});var pu=h((Gse,_8)=>{"use strict";var gG=b8();_8.exports=gG});var E8=h((Wse,I8)=>{"use strict";var w8=qr(),q8=S(),yG=Bo(),bG=R(),P8=F(),A8=te();function du(e,r){return q8(e)||q8(r)?NaN:!w8(e)||!w8(r)?NaN:e<0?du(-e+r-1,r):r<0?A8:r===0?0:r===1?P8(bG(e)):e<r?A8:e-r<2?du(e,e-r):-P8(e+1)-yG(e-r+1,r+1)}I8.exports=du});var vu=h((Kse,O8)=>{"use strict";var _G=E8();O8.exports=_G});var T8=h((Jse,k8)=>{"use strict";var N8=pu(),wG=vu(),hu=S(),qG=ve(),PG=V(),AG=F(),IG=B();function EG(e,r,t){var n;return hu(e)||hu(r)||hu(t)||t<0||t>1||!N8(r)||r===IG?NaN:N8(e)?e>r?0:t===0?e===0?1:0:t===1?e===r?1:0:(n=wG(r,e),n+=e*AG(t)+(r-e)*qG(-t),PG(n)):0}k8.exports=EG});var L8=h((Xse,$8)=>{"use strict";var S8=S();function OG(e,r){return S8(e)||S8(r)?NaN:e===r?1:0}$8.exports=OG});var x8=h((Qse,F8)=>{"use strict";var NG=pr(),z8=S();function kG(e){if(z8(e))return NG(NaN);return r;function r(t){return z8(t)?NaN:t===e?1:0}}F8.exports=kG});var Z8=h((Yse,C8)=>{"use strict";var TG=qe(),R8=L8(),SG=x8();TG(R8,"factory",SG);C8.exports=R8});var U8=h((jse,B8)=>{"use strict";var D8=pu(),$G=pr(),LG=vu(),M8=Z8().factory,gu=S(),zG=ve(),FG=V(),xG=F(),RG=B();function CG(e,r){if(gu(e)||gu(r)||!D8(e)||e===RG||r<0||r>1)return $G(NaN);if(r===0||e===0)return M8(0);if(r===1)return M8(e);return t;function t(n){var i;return gu(n)?NaN:D8(n)?n>e?0:(i=LG(e,n),i+=n*xG(r)+(e-n)*zG(-r),FG(i)):0}}B8.exports=CG});var G8=h((eae,V8)=>{"use strict";var ZG=qe(),H8=T8(),DG=U8();ZG(H8,"factory",DG);V8.exports=H8});function E(e,r,t){if(!e)throw new RangeError(`${r} requires ${t}`)}var X=e=>e>=0&&e<=1,H=e=>e>0&&e<1,EA=1e-75,OA=1e75,L=e=>e>=EA&&e<=OA;var Pg=me(wa(),1);var wg=me(ho(),1),qg=me(Pa(),1);var tD=4;function je(e){return E(!Number.isNaN(e),"normalUpperTail","a number"),Math.abs(e)<=tD?qg.default.jStat.normal.cdf(-e,0,1):.5*(0,wg.default)(e/Math.SQRT2)}function zr(e,r){E(Number.isFinite(e),"twoSidedP","a finite statistic"),E(r===null||r>=1,"twoSidedP","df of at least 1, or null");let t=r===null?je(Math.abs(e)):(0,Pg.default)(-Math.abs(e),r);return Math.min(1,2*t)}var f7=me(c7(),1);var l7=me(Pa(),1);var LH=1e-4,zH=1e-15,FH=50;function vn(e){E(H(e),"normalQuantile","p inside 0 and 1");let r=l7.default.jStat.normal.inv(e,0,1),t=Math.min(e,1-e);return t<LH?Math.sign(r)*xH(Math.abs(r),t):r}function xH(e,r){let t=e;for(let n=0;n<FH;n+=1){let i=je(t),s=Math.exp(-t*t/2)/Math.sqrt(2*Math.PI),l=i/s*Math.log(i/r);if(t+=l,Math.abs(l)<=zH*t)break}return t}var RH=1e15;function ce(e,r){return E(H(e),"criticalValue","alpha inside 0 and 1"),E(r===null||r>=1,"criticalValue","df of at least 1, or null"),r===null||r>=RH?-vn(e/2):-(0,f7.default)(e/2,r)}var m7=1/Math.sqrt(3),CH=60;function Zo(e,r){let t=e.length;E(t>=1&&t<=4&&e.every(L),"roundingHalfWidth","one to four half units above 0"),E(H(r),"roundingHalfWidth","coverage inside 0 and 1");let n=Math.max(...e),i=e.map(o=>o/n).sort((o,a)=>a-o),s=(1+r)/2,l=0,u=i.reduce((o,a)=>o+a,0);for(let o=0;o<CH;o+=1){let a=(l+u)/2;Ba(a,i)<s?l=a:u=a}return(l+u)/2*n}function Ba(e,r){let t=r.slice(0,-1),n=r.at(-1)??0;if(t.length===0)return Math.min(1,Math.max(0,(e+n)/(2*n)));let i=ZH(t).map(u=>e-u).filter(u=>u>-n&&u<n),s=[-n,...i,n].sort((u,o)=>u-o),l=0;for(let u=1;u<s.length;u+=1){let o=s[u-1]??0,a=s[u]??0;if(a===o)continue;let c=(o+a)/2,f=(a-o)/2,m=Ba(e-c+f*m7,t),p=Ba(e-c-f*m7,t);l+=f*(m+p)}return l/(2*n)}function ZH(e){return e.reduce((r,t)=>[...new Set(r.flatMap(n=>[n-t,n+t]))],[0])}var DH=me(wa(),1);function Do(e,r){return e===r||Math.abs(e-r)<1e-9*Math.max(Math.abs(e),Math.abs(r))}function ge(e,r){return e<r&&!Do(e,r)}function Ua(e){if(!(e>=0))throw new RangeError("roundHalfUp requires a number of at least 0");let r=Math.floor(e)+.5;return ge(e,r)?Math.floor(e):Math.floor(e)+1}var d7=1e-300;function Ha(e,r){E(e.every(X),"holm","p-values from 0 to 1"),E(r>0&&r<1,"holm","alpha inside 0 and 1");let t=new Map,n=0,i=!0;return HH(e).forEach(({p:s,index:l},u)=>{let o=e.length-u;n=Math.max(n,Math.min(1,o*s)),i&&=s<r/o,t.set(l,{alpha:r/o,significant:i,pAdjusted:n})}),[...t].sort(([s],[l])=>s-l).map(([,s])=>s)}function HH(e){let r=e.map((n,i)=>({p:n,index:i})).sort((n,i)=>n.p-i.p||n.index-i.index),t=[];for(let n of r){let i=t.at(-1),s=i?.at(-1);i&&s&&VH(s.p,n.p)?i.push(n):t.push([n])}return t.flatMap(n=>n.sort((i,s)=>i.index-s.index))}function VH(e,r){return Do(e,r)||e<d7&&r<d7}var KH=.8416212335729143;function Wa(e,r){return E(L(e)&&L(r),"detectableDifference","critical and standardError above 0"),(e+KH)*r}var dG=me(Ya(),1);var SV=me(Lr(),1),$V=me(V7(),1);var mG=me(mu(),1);function g8(e){let r=Array.from({length:e+1},(l,u)=>u),t=r.map(l=>Math.PI*(1-l/e)),n=l=>l===0||l===e?.5:1,s=t.map(l=>r.map(u=>fG(u,l))).map(l=>t.map((u,o)=>{let a=l.map((c,f)=>n(f)*Math.cos(f*u)*c);return 2/e*n(o)*a.reduce((c,f)=>c+f,0)}));return{points:t.map(Math.cos),running:s}}function fG(e,r){if(e===0)return Math.cos(r)+1;if(e===1)return(Math.cos(r)**2-1)/2;let t=n=>(Math.cos((e+1)*n)/(e+1)-Math.cos((e-1)*n)/(e-1))/2;return t(r)-t(Math.PI)}var Lse=g8(20);var zse=2**-30;var MG=me(Lr(),1),BG=me(G8(),1);var tae=1+1e-7;function et(e,r,t){return E(X(e),"shareStandardError","p from 0 to 1"),E(L(r)&&L(t),"shareStandardError","n and deff above 0"),Math.sqrt(t*e*(1-e)/r)}function _n(e,r,t,n){return E(X(e)&&X(r),"leadStandardError","shares from 0 to 1"),E(L(t)&&L(n),"leadStandardError","n and deff above 0"),Math.sqrt(n*Math.max(0,e+r-(e-r)**2)/t)}function Ho(e,r,t,n){return E(X(e)&&X(r),"leadNullStandardError","shares from 0 to 1"),E(L(t)&&L(n),"leadNullStandardError","n and deff above 0"),Math.sqrt(n*(e+r)/t)}function Vo(e,r,t,n){E(X(e)&&X(t),"pooledStandardError","shares from 0 to 1"),E(L(r)&&L(n),"pooledStandardError","sizes above 0");let i=Math.min(1,(r*e+n*t)/(r+n));return Math.sqrt(i*(1-i)*(1/r+1/n))}function yu(e,r,t){return E([e,r,t].every(L),"maximumMargin","n, deff and q above 0"),t*Math.sqrt(.25*r/e)}var _u=me(Ya(),1),VG=1e-300;function Wo(e,r,t){return r<VG?0:(0,_u.default)(e,r,t)}function wu(e,r,t){let n=Wo(e,t,r);return n>.5?(0,_u.default)(1-e,r,t):1-n}function Ko(e,r,t){E(L(r),"clopperPearsonInterval","n above 0"),E(e>=0&&e<=r,"clopperPearsonInterval","x from 0 to n"),E(H(t),"clopperPearsonInterval","level inside 0 and 1");let n=(1-t)/2,i=e===0?0:Wo(n,e,r-e+1),s=e===r?1:wu(n,e+1,r-e);return[i,s]}var qu=me(Lr(),1);function Pu(e,r,t){E(L(r),"exactBinomialP","m above 0"),E(e>=0&&e<=r,"exactBinomialP","x from 0 to m"),E(H(t),"exactBinomialP","p0 inside 0 and 1");let n=e===0?1:(0,qu.default)(t,e,r-e+1),i=e===r?1:(0,qu.default)(1-t,r-e,e+1);return Math.min(1,2*Math.min(n,i))}var W8=me(Lr(),1);function Iu(e,r,t){let n=e>=0&&r>=0&&Number.isFinite(e+r);return E(n,"signTest","counts of at least 0"),e+r===0?null:t==="greater"?Au(e,r):t==="less"?Au(r,e):Math.min(1,2*Au(Math.max(e,r),Math.min(e,r)))}function Au(e,r){return e===0?1:(0,W8.default)(.5,e,r+1)}function Eu(e,r){let t=e>=0&&r>=0&&Number.isFinite(e+r);return E(t,"exactSignP","counts of at least 0"),Iu(e,r,"two-sided")??1}var GG=1+1e-7,K8=1e-307,WG=800;function Ou(e,r,t,n,i="two-sided"){let s=[e,r,t,n].every(m=>Number.isSafeInteger(m)&&m>=0);E(s&&e<=r&&t<=n,"fisherExactP","whole counts of at least 0, none above its sample");let l=(e+t)/(r+n);if(Math.max(J8(e,r,l),J8(t,n,l))>WG){let m=e/r<t/n;return i===(m?"greater":"less")?1:0}let u={hits:e+t,n1:r,n2:n},o=KG(e,u)*GG,a={"two-sided":(m,p)=>p<=o,less:m=>m<=e,greater:m=>m>=e}[i],c=0,f=0;return X8(u,(m,p)=>{c+=p,a(m,p)&&(f+=p)}),Math.min(1,f/c)}function J8(e,r,t){let n=(i,s)=>i===0?0:i*Math.log(i/s);return n(e,r*t)+n(r-e,r*(1-t))}function KG(e,r){let t=0;return X8(r,(n,i)=>{n===e&&(t=i)}),t}function X8({hits:e,n1:r,n2:t},n){let i=Math.max(0,e-t),s=Math.min(e,r),l=Math.floor((r+1)*(e+1)/(r+t+2)),u=Math.min(s,Math.max(i,l));n(u,1);for(let o=u,a=1;o<s&&(a*=(e-o)/(o+1)*((r-o)/(t-e+o+1)),!(a<K8));o+=1)n(o+1,a);for(let o=u,a=1;o>i&&(a*=o/(e-o+1)*((t-e+o)/(r-o+1)),!(a<K8));o-=1)n(o-1,a)}function rt(e,r,t){E(X(e),"wilsonInterval","p from 0 to 1"),E(L(r),"wilsonInterval","n above 0"),E(L(t),"wilsonInterval","q above 0");let n=e+t*t/(2*r),i=t*Math.sqrt(e*(1-e)/r+t*t/(4*r*r)),s=1+t*t/r,l=e===0?0:e*e/(n+i),u=e===1?1:Math.min(1,(n+i)/s);return[l,u]}function Jo(e,r,t,n,i){let[s,l]=rt(e,r,i),[u,o]=rt(t,n,i),a=t-e;return[a-Math.hypot(t-u,l-e),a+Math.hypot(o-t,e-s)]}function Nu(e,r,t){return E(L(e)&&L(r),"impliedDesignEffect","margin and n above 0"),E(H(t),"impliedDesignEffect","level inside 0 and 1"),(e/(ce(1-t,null)*Math.sqrt(.25/r)))**2}var Uue=2**12;var rW=me(_o(),1),tW=me(mu(),1);var dle=[-1,0,1].flatMap(e=>[-1,0,1].map(r=>({x:r,y:e})));function tt(e,r){if(!(r>=1))throw new RangeError("boundedMemo requires a limit of at least 1");let t=new Map;return n=>{let i=t.get(n);if(i!==void 0)return i;let s=e(n);return t.size>=r&&t.clear(),t.set(n,s),s}}var vW=4096,hW=tt(e=>ce(e,null),vW),gW=tt(e=>tt(r=>ce(r,e),64),64);function De(e,r){return r===null?hW(e):gW(r)(e)}var yW=(2/1.959963984540054)**2,mb=10;function Xo(e,r){return e.n===null?"none":e.sampleSource==="probability"?"sampling":e.modelledInterval?"modelled":r.comparisonBasis?"comparison":"none"}function Pn(e,r){let t=n=>Nu(n/100,r,e.level);return{value:t(e.pp),range:[t(e.pp-e.unit/2),t(e.pp+e.unit/2)]}}function Lu(e,r){return e.deff||!e.statedMargin?!1:!qW(e,Pn(e.statedMargin,r).range)}function pb(e,r,t,n){let i=t==="modelled"?wW(e,r):bW(e,n)??_W(e,r,n),{unraised:s=i.value,...l}=i,u=[...l.notes];return s<1&&u.push("deff-below-one"),l.value>4&&u.push("deff-above-four"),t==="modelled"&&u.push("modelled-basis"),t==="comparison"&&u.push("comparison-basis"),{...l,notes:u}}function bW(e,r){if(!e.deff)return null;let{source:t,value:n,df:i=null}=e.deff,[s,l]=t==="kish"?r.kishRange:[1,1];return{value:n,range:[s*n,l*n],source:t,df:i,notes:[]}}function _W(e,r,t){if(e.statedMargin&&Lu(e,r)){let l=Pn(e.statedMargin,r);return e.design==="unweighted"?db(l):{...l,source:"implied",df:null,notes:[]}}let n=e.statedMargin?["stated-margin-like-unweighted"]:[],{value:i,range:s}=t.assumed[e.design];return{value:i,range:s,source:"assumed",df:null,notes:[...n,"deff-assumed"]}}function wW(e,r){if(!e.modelledInterval)throw new TypeError("chooseDesignEffect requires a modelled interval");return db(Pn(e.modelledInterval,r))}function db({value:e,range:[r,t]}){let n=[Math.max(1,r),Math.max(1,t)];return{value:Math.max(1,e),range:n,source:"implied",df:null,notes:[],unraised:e}}function qW(e,[r]){return e.design!=="unweighted"&&!ge(yW,r)}function zu(e,r){let t=new Map(e.shares.map(({option:l,pct:u})=>[l,u===null?null:An(u,e.decimals)])),n=PW(e,r),s=[...t.values()].reduce((l,u)=>l+(u??0),0)>An(100,e.decimals)?["shares-exceed-100"]:[];return{isProbability:e.sampleSource==="probability",isSizeDisclosed:e.n!==null,hasModelledInterval:!!e.modelledInterval,decimals:e.decimals,units:t,answers:e.shares.filter(l=>l.answer!==!1).map(l=>l.option),sampled:n,notes:[...s,...n?.deff.notes??[]]}}function An(e,r){return Math.round(e*10**r)+0}function Le(e,r){return nt(e,r)/(100*10**e.decimals)}function nt(e,r){let t=e.units.get(r);if(typeof t!="number")throw new RangeError("unitsOf requires a disclosed option");return t}function tr(e,r){return e.roundings?.get(r)??[10**-e.decimals]}function Fu({sampled:e,notes:r},t){if(!e)return{basis:"none",deff:null,deffSource:null,deffRange:null,nEff:null,maximumMarginPp:null,notes:[...r]};let{basis:n,n:i,deff:s,nEff:l}=e,u=De(1-t.level,s.df);return{basis:n,deff:s.value,deffSource:s.source,deffRange:s.range,nEff:l,maximumMarginPp:100*yu(i,s.value,u),notes:[...r]}}function PW(e,r){let t=Xo(e,r);if(e.n===null||t==="none")return null;let n=pb(e,e.n,t,r);return{basis:t,n:e.n,deff:n,nEff:e.n/n.value}}function ot({deff:e},r){return r==="chosen"?e.value:r==="low"?e.range[0]:e.range[1]}function vr(e){let r=null;for(let{deff:t}of e)t.df!==null&&(r===null||t.df<r)&&(r=t.df);return r}function Cr(e){let r=0;for(let{base:n}of e)r=Math.max(r,n.decimals);let t=0;for(let{base:n,option:i,sign:s}of e)t+=s*nt(n,i)*10**(r-n.decimals);return(t+0)/10**r}function Ot(e,r,t){return r===0?e===0?1:0:zr(e/r,t)}function Nt(e,r,t){return[e-t*r,e+t*r]}var AW=10;function vb(e,r,t){let n=Le(e.base,t),i=Le(r.base,t),s=Cr([{base:r.base,option:t,sign:1},{base:e.base,option:t,sign:-1}]),l=[r.sampled,e.sampled],u=o=>Math.hypot(et(n,e.sampled.n,ot(e.sampled,o)),et(i,r.sampled.n,ot(r.sampled,o)));return{bases:l,estimatePp:s,df:vr(l),standardError:u,interval:o=>Nt(s/100,u("chosen"),o),unitsPp:[...tr(r.base,t),...tr(e.base,t)],secondTests:o=>IW({p:n,nEff:e.sampled.nEff},{p:i,nEff:r.sampled.nEff},{estimate:s/100,df:vr(l),alpha:o})}}function IW(e,r,{estimate:t,df:n,alpha:i}){let s=Vo(e.p,e.nEff,r.p,r.nEff),[l,u]=Jo(e.p,e.nEff,r.p,r.nEff,De(i,null)),o=[{name:"pooled",p:Ot(t,s,n)},{name:"newcombe",intervalPp:[100*l,100*u]}],a=[e,r].flatMap(({p:c,nEff:f})=>[f*c,f*(1-c)]);if(a.some(c=>ge(c,AW))){let[c=0,f=0,m=0,p=0]=a.map(Ua);o.push({name:"fisher",p:Ou(c,c+f,m,m+p)})}return o}var EW=50;function Qo(e,r,[t,n],i){return _n(Le(e,t),Le(e,n),r.n,ot(r,i))}function hb(e,r,t){let[n,i]=t,s=Le(e,n),l=Le(e,i),u=Cr([{base:e,option:n,sign:1},{base:e,option:i,sign:-1}]),o=vr([r]),a=c=>Qo(e,r,t,c);return{bases:[r],estimatePp:u,df:o,standardError:a,interval:c=>Nt(u/100,a("chosen"),c),unitsPp:[...tr(e,n),...tr(e,i)],secondTests:()=>{let c=Ho(s,l,r.n,r.deff.value),f=[{name:"score",p:Ot(u/100,c,o)}];return ge(r.nEff*(s+l),EW)&&f.push({name:"exact-sign",p:Eu(r.nEff*s,r.nEff*l)}),f}}}function gb(e,r,t){let[n,i]=t,s=[r.sampled,e.sampled],l=Cr([{base:r.base,option:n,sign:1},{base:r.base,option:i,sign:-1},{base:e.base,option:n,sign:-1},{base:e.base,option:i,sign:1}]),u=o=>Math.hypot(Qo(e.base,e.sampled,t,o),Qo(r.base,r.sampled,t,o));return{bases:s,estimatePp:l,df:vr(s),standardError:u,interval:o=>Nt(l/100,u("chosen"),o),unitsPp:[r.base,e.base].flatMap(o=>t.flatMap(a=>tr(o,a))),secondTests:()=>[]}}var yb=10;function xu(e,{nEff:r,deff:t},n){if(ge(r*e,yb)||ge(r*(1-e),yb)){let i=Math.min(r*e,r);return{interval:Ko(i,r,n),method:"clopper-pearson"}}return{interval:rt(e,r,De(1-n,t.df)),method:"wilson"}}function bb(e,r,t){if(typeof e.units.get(r)!="number")return{kind:"share",option:r,estimatePct:null};let n=Le(e,r),i=100*n;if(!e.sampled)return{kind:"share",option:r,estimatePct:i};let{interval:s,method:l}=xu(n,e.sampled,t),u=[100*s[0],100*s[1]];return{kind:"share",option:r,estimatePct:i,intervalPct:u,method:l}}var OW=10;function _b(e,r,{option:t,pct:n},i){let{n:s,nEff:l}=r,u=Le(e,t),o=n/100,[a,c]=xu(u,r,i).interval;return{bases:[r],estimatePp:nt(e,t)/10**e.decimals-n,df:vr([r]),standardError:f=>et(o,s,ot(r,f)),interval:()=>[a-o,c-o],unitsPp:tr(e,t),secondTests:()=>[o,1-o,u,1-u].map(m=>l*m).some(m=>ge(m,OW))?[{name:"exact-binomial",p:Pu(Math.min(l*u,l),l,o)}]:[]}}var wb=8;function qb(e,r,t){let n=e[0],i=l=>e.some(l),s=[];return i(l=>!l.isSizeDisclosed)&&s.push("no-sample-size"),i(l=>kW(l,t))&&s.push("no-sampling-basis"),i(({sampled:l})=>l!==null&&ge(l.nEff,t.minimumNEff))&&s.push("too-small"),i(({sampled:l})=>(l?.deff.df??wb)<wb)&&s.push("few-clusters"),i(l=>l.isProbability!==n?.isProbability||NW(l,r))&&s.push("not-comparable"),i(l=>r.some(u=>l.units.get(u)===null))&&s.push("not-disclosed"),s}function NW(e,r){return r.some(t=>!e.units.has(t))}function kW(e,r){return!e.isProbability&&!e.hasModelledInterval&&!r.comparisonBasis}function Pb(e,r,t){let n=Ru(e,r,1);return Yo([e],r,n,t,([i])=>hb(i.base,i.sampled,r))}function Ab(e,r,t,n){return Yo([r,e],[t],[{base:r,option:t,sign:1},{base:e,option:t,sign:-1}],n,([s,l=s])=>vb(l,s,t))}function Ib(e,r,t,n){let i=[...Ru(r,t,1),...Ru(e,t,-1)];return Yo([r,e],t,i,n,([s,l=s])=>gb(l,s,t))}function Eb(e,r,t){let{option:n,pct:i}=r,s=Yo([e],[n],[{base:e,option:n,sign:1}],t,([l])=>_b(l.base,l.sampled,r,t.level));return{...s,estimatePp:s.estimatePp===null?null:s.estimatePp-i}}function Ru(e,[r,t],n){return[{base:e,option:r,sign:n},{base:e,option:t,sign:n===1?-1:1}]}function TW(e){return e.sampled&&{base:e,sampled:e.sampled}}function Yo(e,r,t,n,i){let s=qb(e,r,n),u=t.every(({base:f,option:m})=>typeof f.units.get(m)=="number")?Cr(t):null,[o,a]=e.map(TW),c=s.length===0&&o?i([o,a??void 0]):null;return{terms:t,bases:e,reasons:s,estimatePp:u,measured:c}}function Ob(e,r){if(e.pairs)return e.pairs;let t=r.answers.flatMap(s=>{let l=r.units.get(s);return typeof l=="number"?[{option:s,units:l}]:[]}).sort((s,l)=>l.units-s.units),[n,i]=t;return n&&i?[[n.option,i.option]]:[]}function Nb(e,r,t,n){return n?e.changes?e.changes:[...new Set(r.flat())].filter(s=>t.answers.includes(s)&&n.answers.includes(s)):[]}function kb(e,r){return r?e.filter(t=>t.every(n=>r.units.has(n))):[]}var Cu="1.0.1";var SW=1/5;function Tb(e,{verdict:r,estimatePp:t,roundingPp:n},i,s){if(r!=="does-not-hold")return!1;let l=De(2*(1-s.level),e.df);return Math.abs(t)+n+l*100*e.standardError("high")<Math.min(s.indifferencePp,SW*i)}var Sb={level:.95,assumed:{weighted:{value:1.4,range:[1.2,2]},clustered:{value:2,range:[1.5,4]},unweighted:{value:1,range:[1,1]}},kishRange:[.8,1.3],comparisonBasis:!1,indifferencePp:3,minimumNEff:100};function jo(e){return{...Sb,...e,assumed:{...Sb.assumed,...e?.assumed}}}var ei=.95,Zu=4,$W=60,LW=.8,zW=1e3;function $b(e){if(e.length===0||!e.every(t=>t>0&&t<1/0))throw new RangeError("roundingAllowancePp requires at least one unit, each above 0");let[r=1]=e;return e.length<=Zu&&e.every(t=>t===r)?FW(e.length)*r/2:xW([...e].sort((t,n)=>n-t).join(" "))}var FW=tt(e=>Zo(Array(e).fill(1),ei),Zu),xW=tt(e=>{let r=e.split(" ").map(Number);return r.length<=Zu?Zo(r.map(t=>t/2),ei):RW(r)??Lb(r)},512);function Lb(e){let r=e.reduce((t,n)=>t+n**2/12,0);return ce(1-ei,null)*Math.sqrt(r)}function RW(e){let r=e[0]??1,t=e.map(a=>a/r),n=t.reduce((a,c,f)=>a*c*(f+1),1),i=t.reduce((a,c)=>a+c/2,0),s=CW(t,i),l=a=>s.map(({at:c,count:f})=>f*Math.max(0,i-a-c)**t.length/n),u=Lb(t),o=LW*u;if(l(o).some(a=>Math.abs(a)>zW))return null;for(let a=0;a<$W;a+=1){let c=(o+u)/2;l(c).reduce((m,p)=>m+p,0)>(1-ei)/2?o=c:u=c}return(o+u)/2*r}function CW(e,r){let t=new Map([[0,1]]);for(let n of e)for(let[i,s]of[...t]){let l=Number((i+n).toPrecision(12));l<r&&t.set(l,(t.get(l)??0)-s)}return[...t].map(([n,i])=>({at:n,count:i}))}function zb(e){if(!e.isSignificant)return{verdict:"does-not-hold",reasons:ZW(e)};let r=DW(e);return{verdict:r.length===0?"holds":"fragile",reasons:r}}function ZW({p:e,alpha:r,familyAlpha:t,size:n,critical:i,se:s,bases:l}){let u=[];e<t&&u.push("family");let o=l.every(a=>a==="sampling");return e>=r&&n>i*s.low&&o&&u.push("would-hold-at-lower-deff"),u}function DW(e){let{size:r,rounding:t,critical:n,se:i,bases:s}=e,l=r-t>n*i.chosen,u=r>n*i.high,o=r-t>n*i.high,a=[];return l||a.push("rounding"),u||a.push("design-effect"),e.secondTestsAgree||a.push("second-test"),l&&u&&!o&&a.push("together"),s.includes("modelled")&&a.push("modelled"),s.includes("comparison")&&a.push("comparison"),a}function Fb(e,r){let t=e.map(i=>Ot(i.estimatePp/100,i.standardError("chosen"),i.df)),n=Ha(t,1-r.level);return e.map((i,s)=>MW(i,t[s]??1,n[s],r))}function MW(e,r,t,n){if(!t)throw new TypeError("judgeFamily requires a rank for every finding");let{estimatePp:i,df:s,standardError:l}=e,u={chosen:l("chosen"),low:l("low"),high:l("high")},o=De(t.alpha,s),a=De(1-n.level,s),c=$b(e.unitsPp),f=e.secondTests(t.alpha).map(b=>({...b,significant:UW(b,t.alpha,i)})),{verdict:m,reasons:p}=zb({isSignificant:t.significant,p:r,alpha:t.alpha,familyAlpha:1-n.level,size:Math.abs(i)/100,rounding:c/100,critical:o,se:u,secondTestsAgree:f.every(b=>b.significant),bases:e.bases.map(({basis:b})=>b)}),d=BW(i/100,u.chosen),[g,y]=e.interval(a);return{fields:{estimatePp:i,sePp:100*u.chosen,marginPp:100*a*u.chosen,intervalPp:[100*g,100*y],z:d,p:r,pAdjusted:t.pAdjusted,alpha:t.alpha,roundingPp:c,secondTests:f,verdict:m,reasons:p,detectable80Pp:m==="does-not-hold"&&u.chosen>0?Wa(o,100*u.high)+c:null,survivesTwiceError:m==="holds"?d===null||Math.abs(d)>=2*o:null},breaking:d===null?null:(d/o)**2}}function BW(e,r){return r===0?e===0?0:null:e/r}function UW(e,r,t){if(t===0)return!1;if(e.name!=="newcombe")return e.p<r;let[n,i]=e.intervalPp;return t>0?n>0:i<0}function ri(e,r){let t=e.flatMap(({measured:s})=>s?[s]:[]),n=Fb(t,r),i=0;return e.map(({measured:s,estimatePp:l,reasons:u})=>{let o=s?n[i++]:void 0;return s&&o?{tested:o,measured:s}:{untested:{estimatePp:l,verdict:"cannot-be-tested",reasons:u}}})}function HW(e){let r=jo(e.policy),t=zu(e.release,r),n=e.previous?zu(e.previous,r):null,i=Ob(e,t);return{engine:Cu,base:Fu(t,r),previousBase:n&&Fu(n,r),findings:[...e.release.shares.map(({option:s})=>bb(t,s,r.level)),...VW(t,i,r),...n?GW(e,{release:t,previous:n,pairs:i},r):[],...WW(t,e.thresholds??[],r)]}}function VW(e,r,t){let n=r.map(i=>Pb(e,i,t));return ti(r,ri(n,t)).map(([i,s])=>({kind:"lead",pair:i,...Rb(s)}))}function GW(e,{release:r,previous:t,pairs:n},i){let s=Nb(e,n,r,t),l=kb(n,t),u=ri([...s.map(c=>Ab(t,r,c,i)),...l.map(c=>Ib(t,r,c,i))],i),o=ti(s,u).map(([c,f])=>{if("untested"in f)return{kind:"change",option:c,...f.untested};let m=nt(t,c)/10**t.decimals,p=Tb(f.measured,f.tested.fields,m,i);return{kind:"change",option:c,...xb(f.tested),littleChanged:p}}),a=ti(l,u.slice(s.length)).map(([c,f])=>"untested"in f?{kind:"lead-change",pair:c,...f.untested}:{kind:"lead-change",pair:c,...xb(f.tested)});return[...o,...a]}function WW(e,r,t){let n=r.map(i=>Eb(e,i,t));return ti(r,ri(n,t)).map(([{option:i,pct:s},l])=>({kind:"threshold",option:i,thresholdPct:s,...Rb(l)}))}function Rb(e){if("untested"in e)return e.untested;let{tested:r,measured:t}=e,n=t.bases[0]?.deff.value??1;return{...r.fields,breakingDeff:r.breaking===null?null:n*r.breaking}}function xb({fields:e,breaking:r}){return{...e,breakingFactor:r}}function ti(e,r){let t=[];return e.forEach((n,i)=>{let s=r[i];s!==void 0&&t.push([n,s])}),t}var j=class extends Error{constructor(t,n){super(n);this.path=t}path;name="CheckRefused";toRefusal(){return{path:this.path,message:this.message}}};var $={};AA($,{BIGINT_FORMAT_RANGES:()=>si,CONSTANT_CATCH:()=>Kb,Class:()=>Bu,NUMBER_FORMAT_RANGES:()=>Nn,aborted:()=>Ae,allowsEval:()=>Wu,assert:()=>jW,assertEqual:()=>KW,assertIs:()=>QW,assertNever:()=>YW,assertNotEqual:()=>JW,assignProp:()=>Me,attachSchema:()=>kn,base64ToUint8Array:()=>Gb,base64urlToUint8Array:()=>yK,cached:()=>In,captureStackTrace:()=>oi,cleanEnum:()=>gK,cleanRegex:()=>En,clone:()=>Be,cloneDef:()=>tK,codePointLength:()=>Tn,constantCatch:()=>Jb,createTransparentProxy:()=>uK,defineLazy:()=>Zb,defineLazyInternal:()=>M,derived:()=>qK,esc:()=>Vu,escapeRegex:()=>at,explicitlyAborted:()=>Xu,extend:()=>fK,finalizeIssue:()=>yr,floatSafeRemainder:()=>Hu,getElementAtPath:()=>nK,getEnumValues:()=>St,getLengthableOrigin:()=>Sn,getParsedType:()=>aK,getSizableOrigin:()=>Vb,hexToUint8Array:()=>_K,hide:()=>ci,installLazyProp:()=>EK,isObject:()=>Tt,isPlainObject:()=>st,issue:()=>Lt,joinValues:()=>ni,jsonStringifyReplacer:()=>$t,members:()=>Yu,merge:()=>pK,mergeDefs:()=>gr,normalizeParams:()=>T,nullish:()=>Uu,numKeys:()=>sK,objectClone:()=>eK,omit:()=>lK,optionalKeys:()=>Ju,own:()=>Dr,parsedType:()=>Qu,partial:()=>dK,pick:()=>cK,prefixIssues:()=>ut,primitiveTypes:()=>Ub,promiseAllObject:()=>oK,propertyKeyTypes:()=>Ku,randomString:()=>iK,rawShape:()=>On,required:()=>vK,safeExtend:()=>mK,shallowClone:()=>Bb,sizeCaps:()=>ui,slugify:()=>Gu,stringifyPrimitive:()=>ii,toZod:()=>XW,uint8ArrayToBase64:()=>Wb,uint8ArrayToBase64url:()=>bK,uint8ArrayToHex:()=>wK,unwrapMessage:()=>kt});function KW(e){return e}function JW(e){return e}function XW(){return e=>e}function QW(e){}function YW(e){throw new Error("Unexpected value in exhaustive check")}function jW(e){}function St(e){let r=Object.values(e).filter(n=>typeof n=="number");return Object.entries(e).filter(([n,i])=>r.indexOf(+n)===-1).map(([n,i])=>i)}function ni(e,r="|"){return e.map(t=>ii(t)).join(r)}function $t(e,r){return typeof r=="bigint"?r.toString():r}var Mu=class{constructor(r){this._getter=r,this._value=void 0}get value(){let r=this._getter;return r!==void 0&&(this._value=r(),this._getter=void 0),this._value}};function In(e){return new Mu(e)}function Uu(e){return e==null}function En(e){let r=e.startsWith("^")?1:0,t=e.endsWith("$")?e.length-1:e.length;return e.slice(r,t)}function Hu(e,r){let t=e/r,n=Math.round(t),i=4*Number.EPSILON*Math.max(Math.abs(t),1);return Math.abs(t-n)<i?0:t-n}var Cb=Symbol("evaluating");function Zb(e,r,t){let n;Object.defineProperty(e,r,{get(){if(n!==Cb)return n===void 0&&(n=Cb,n=t()),n},set(i){Object.defineProperty(e,r,{value:i})},configurable:!0})}function eK(e){return Object.create(Object.getPrototypeOf(e),Object.getOwnPropertyDescriptors(e))}function Me(e,r,t){Object.defineProperty(e,r,{value:t,writable:!0,enumerable:!0,configurable:!0})}function On(e){let r=Object.getOwnPropertyDescriptor(e,"shape");return r?.get?r.get.raw:r?.value}function hr(e){return On(e._zod.def)??e._zod.def.shape}function Db(e,r,t){Object.defineProperty(e,r,{get(){let n=t();return Me(this,r,n),n},enumerable:!0,configurable:!0})}function Mb(e,r,t){r in e?Me(e,r,t):e[r]=t}function it(e,r,t,n){let i=hr(r);for(let s of t){let l=Object.getOwnPropertyDescriptor(i,s);l.enumerable&&(l.get?Db(e,s,()=>{let u=r._zod.def.shape[s];return n?n(u,s):u}):Mb(e,s,n?n(l.value,s):l.value))}}function rK(e,r){for(let t of Reflect.ownKeys(r)){let n=Object.getOwnPropertyDescriptor(r,t);n.enumerable&&(n.get?Db(e,t,()=>r[t]):Mb(e,t,n.value))}}function gr(...e){let r={};for(let t of e){let n=Object.getOwnPropertyDescriptors(t);Object.assign(r,n)}return Object.defineProperties({},r)}function tK(e){return gr(e._zod.def)}function nK(e,r){return r?r.reduce((t,n)=>t?.[n],e):e}function oK(e){let r=Object.keys(e),t=r.map(n=>e[n]);return Promise.all(t).then(n=>{let i={};for(let s=0;s<r.length;s++)i[r[s]]=n[s];return i})}function iK(e=10){let r="abcdefghijklmnopqrstuvwxyz",t="";for(let n=0;n<e;n++)t+=r[Math.floor(Math.random()*r.length)];return t}function Vu(e){return JSON.stringify(e)}function Gu(e){return e.toLowerCase().trim().replace(/[^\w\s-]/g,"").replace(/[\s_-]+/g,"-").replace(/^-+|-+$/g,"")}var oi="captureStackTrace"in Error?Error.captureStackTrace:(...e)=>{};function Tt(e){return typeof e=="object"&&e!==null&&!Array.isArray(e)}var Wu=In(()=>{if(we.jitless||typeof navigator<"u"&&navigator?.userAgent?.includes("Cloudflare"))return!1;try{let e=Function;return new e(""),!0}catch{return!1}});function st(e){if(Tt(e)===!1)return!1;let r=e.constructor;if(r===void 0||typeof r!="function")return!0;let t=r.prototype;return!(Tt(t)===!1||Object.prototype.hasOwnProperty.call(t,"isPrototypeOf")===!1)}function Bb(e){return st(e)?{...e}:Array.isArray(e)?[...e]:e instanceof Map?new Map(e):e instanceof Set?new Set(e):e}function sK(e){let r=0;for(let t in e)Object.prototype.hasOwnProperty.call(e,t)&&r++;return r}var aK=e=>{let r=typeof e;switch(r){case"undefined":return"undefined";case"string":return"string";case"number":return Number.isNaN(e)?"nan":"number";case"boolean":return"boolean";case"function":return"function";case"bigint":return"bigint";case"symbol":return"symbol";case"object":return Array.isArray(e)?"array":e===null?"null":e.then&&typeof e.then=="function"&&e.catch&&typeof e.catch=="function"?"promise":typeof Map<"u"&&e instanceof Map?"map":typeof Set<"u"&&e instanceof Set?"set":typeof Date<"u"&&e instanceof Date?"date":typeof File<"u"&&e instanceof File?"file":"object";default:throw new Error(`Unknown data type: ${r}`)}},Ku=new Set(["string","number","symbol"]),Ub=new Set(["string","number","bigint","boolean","symbol","undefined"]);function at(e){return e.replace(/[.*+?^${}()|[\]\\]/g,"\\$&")}function Be(e,r,t){let n=new e._zod.constr(r??e._zod.def);return(!r||t?.parent)&&(n._zod.parent=e),n}function T(e){let r=e;if(!r)return{};if(typeof r=="string")return{error:()=>r};if(r?.message!==void 0){if(r?.error!==void 0)throw new Error("Cannot specify both `message` and `error` params");r.error=r.message}return delete r.message,typeof r.error=="string"?{...r,error:()=>r.error}:r}function uK(e){let r;return new Proxy({},{get(t,n,i){return r??(r=e()),Reflect.get(r,n,i)},set(t,n,i,s){return r??(r=e()),Reflect.set(r,n,i,s)},has(t,n){return r??(r=e()),Reflect.has(r,n)},deleteProperty(t,n){return r??(r=e()),Reflect.deleteProperty(r,n)},ownKeys(t){return r??(r=e()),Reflect.ownKeys(r)},getOwnPropertyDescriptor(t,n){return r??(r=e()),Reflect.getOwnPropertyDescriptor(r,n)},defineProperty(t,n,i){return r??(r=e()),Reflect.defineProperty(r,n,i)}})}function ii(e){return typeof e=="bigint"?e.toString()+"n":typeof e=="string"?`"${e}"`:`${e}`}function Ju(e){return Object.keys(e).filter(r=>e[r]._zod.optin!==void 0&&e[r]._zod.optout==="optional")}var Nn={safeint:[Number.MIN_SAFE_INTEGER,Number.MAX_SAFE_INTEGER],int32:[-2147483648,2147483647],uint32:[0,4294967295],float32:[-34028234663852886e22,34028234663852886e22],float64:[-Number.MAX_VALUE,Number.MAX_VALUE]},si={int64:[BigInt("-9223372036854775808"),BigInt("9223372036854775807")],uint64:[BigInt(0),BigInt("18446744073709551615")]};function cK(e,r){let t=e._zod.def,n=t.checks;if(n&&n.length>0)throw new Error(".pick() cannot be used on object schemas containing refinements");let s={};return it(s,e,ai(e,r)),Be(e,gr(t,{shape:s,checks:[]}))}function ai(e,r){let t=hr(e),n=[];for(let i of Reflect.ownKeys(r)){if(!Object.getOwnPropertyDescriptor(t,i)?.enumerable)throw new Error(`Unrecognized key: "${String(i)}"`);r[i]&&n.push(i)}return n}function lK(e,r){let t=e._zod.def,n=t.checks;if(n&&n.length>0)throw new Error(".omit() cannot be used on object schemas containing refinements");let s=new Set(ai(e,r)),l={};return it(l,e,Reflect.ownKeys(hr(e)).filter(u=>!s.has(u))),Be(e,gr(t,{shape:l,checks:[]}))}function fK(e,r){if(!st(r))throw new Error("Invalid input to extend: expected a plain object");let t=e._zod.def.checks;if(t&&t.length>0){let i=hr(e);for(let s of Reflect.ownKeys(r))if(Object.getOwnPropertyDescriptor(i,s)!==void 0)throw new Error("Cannot overwrite keys on object schemas containing refinements. Use `.safeExtend()` instead.")}return Be(e,gr(e._zod.def,{shape:Hb(e,r)}))}function Hb(e,r){let t={};return it(t,e,Reflect.ownKeys(hr(e))),rK(t,r),t}function mK(e,r){if(!st(r))throw new Error("Invalid input to safeExtend: expected a plain object");return Be(e,gr(e._zod.def,{shape:Hb(e,r)}))}function pK(e,r){if(!r?._zod?.def)throw new Error("Invalid input to merge: expected an object schema. To merge a plain shape, use `.extend()`.");if(e._zod.def.checks?.length)throw new Error(".merge() cannot be used on object schemas containing refinements. Use .safeExtend() instead.");let t={};it(t,e,Reflect.ownKeys(hr(e))),it(t,r,Reflect.ownKeys(hr(r)));let n=gr(e._zod.def,{shape:t,get catchall(){return r._zod.def.catchall},checks:r._zod.def.checks??[]});return Be(e,n)}function dK(e,r,t,n="partial"){let s=r._zod.def.checks;if(s&&s.length>0)throw new Error(`.${n}() cannot be used on object schemas containing refinements`);let u=t?new Set(ai(r,t)):void 0,o={};return it(o,r,Reflect.ownKeys(hr(r)),e&&((a,c)=>u&&!u.has(c)?a:new e({type:"optional",innerType:a}))),Be(r,gr(r._zod.def,{shape:o,checks:[]}))}function vK(e,r,t){let n=t?new Set(ai(r,t)):void 0,i={};return it(i,r,Reflect.ownKeys(hr(r)),(s,l)=>n&&!n.has(l)?s:new e({type:"nonoptional",innerType:s})),Be(r,gr(r._zod.def,{shape:i}))}function Ae(e,r=0){if(e.aborted===!0)return!0;for(let t=r;t<e.issues.length;t++)if(e.issues[t]?.continue!==!0)return!0;return!1}function Xu(e,r=0){if(e.aborted===!0)return!0;for(let t=r;t<e.issues.length;t++)if(e.issues[t]?.continue===!1)return!0;return!1}function ut(e,r){return r.map(t=>{var n;return(n=t).path??(n.path=[]),t.path.unshift(e),t})}function kt(e){return typeof e=="string"?e:e?.message}function ui(e){let r=[];for(let t of e??[]){let n=t._zod.def;if(!/_(length|size)$|_equals$/.test(n.check))break;let i=n.maximum??n.length??n.size;i>=0&&r.push([i,t])}return r}function kn(e,r,t){var n;for(let i=r;i<e.length;i++)(n=e[i]).schema??(n.schema=t)}function yr(e,r,t){var n;let i=e.inst?._zod?.traits;i?.has("$ZodType")&&(i.has("$ZodCheck")?(n=e).schema??(n.schema=e.inst):e.schema=e.inst);let s=e.schema!==e.inst?e.schema?._zod.def?.error:void 0,l=e.message?e.message:kt(e.inst?._zod.def?.error?.(e))??kt(s?.(e))??kt(r?.error?.(e))??kt(t.customError?.(e))??kt(t.localeError?.(e))??"Invalid input",u={};for(let o of Object.keys(e))o==="inst"||o==="schema"||o==="continue"||o==="input"||o==="__proto__"||(u[o]=e[o]);return u.path??(u.path=[]),u.message=l,r?.reportInput&&(u.input=e.input),u}function Vb(e){return e instanceof Set?"set":e instanceof Map?"map":e instanceof File?"file":"unknown"}var hK=/[\uD800-\uDBFF]/;function Tn(e){let r=e.length;if(!hK.test(e))return r;let t=r;for(let n=0;n<r-1;n++)(e.charCodeAt(n)&64512)===55296&&(e.charCodeAt(n+1)&64512)===56320&&(t--,n++);return t}function Sn(e){return Array.isArray(e)?"array":typeof e=="string"?"string":"unknown"}function Qu(e){let r=typeof e;switch(r){case"number":return Number.isNaN(e)?"nan":"number";case"object":{if(e===null)return"null";if(Array.isArray(e))return"array";let t=e;if(t&&Object.getPrototypeOf(t)!==Object.prototype&&"constructor"in t&&t.constructor)return t.constructor.name}}return r}function Lt(...e){let[r,t,n]=e;return typeof r=="string"?{message:r,code:"custom",input:t,inst:n}:{...r}}function gK(e){return Object.entries(e).filter(([r,t])=>Number.isNaN(Number.parseInt(r,10))).map(r=>r[1])}function Gb(e){let r=atob(e),t=new Uint8Array(r.length);for(let n=0;n<r.length;n++)t[n]=r.charCodeAt(n);return t}function Wb(e){let r="";for(let t=0;t<e.length;t++)r+=String.fromCharCode(e[t]);return btoa(r)}function yK(e){let r=e.replace(/-/g,"+").replace(/_/g,"/"),t="=".repeat((4-r.length%4)%4);return Gb(r+t)}function bK(e){return Wb(e).replace(/\+/g,"-").replace(/\//g,"_").replace(/=/g,"")}function _K(e){let r=e.replace(/^0x/,"");if(r.length%2!==0)throw new Error("Invalid hex string length");let t=new Uint8Array(r.length/2);for(let n=0;n<r.length;n+=2)t[n/2]=Number.parseInt(r.slice(n,n+2),16);return t}function wK(e){return Array.from(e).map(r=>r.toString(16).padStart(2,"0")).join("")}var Bu=class{constructor(...r){}};function Yu(e,r){for(let t in r){let n=Object.getOwnPropertyDescriptor(r,t);n.get?Object.defineProperty(e,t,{...n,enumerable:!1}):PK(e,t,n.value)}}function Dr(e,r,t,n=!0){return Object.defineProperty(e,r,{configurable:!0,writable:!0,enumerable:n,value:t}),t}function ci(e,r,t){return Dr(e,r,t,!1)}function qK(e,r){for(let t in e){let n=e[t];Object.defineProperty(r,t,{configurable:!0,enumerable:!0,get(){return Dr(this,t,n(this))},set(i){Dr(this,t,i)}})}return r}function PK(e,r,t){Object.defineProperty(e,r,{configurable:!0,get(){return this==null?t:Dr(this,r,t.bind(this))},set(n){Dr(this,r,n)}})}function AK(e,r){let t=Object.getPrototypeOf(e);return r in t?void 0:t}var Du,Zr=!1,IK={configurable:!0,get(){Zr=!0}};function M(e,r,t){let n=Object.getPrototypeOf(e._zod);if(r in n&&Du!==e._zod){Du=void 0;return}Du=e._zod,Object.defineProperty(n,r,{configurable:!0,get(){Object.defineProperty(this,r,IK);let i=Zr;Zr=!1;try{let s=t(this);return Zr?delete this[r]:Object.defineProperty(this,r,{configurable:!0,writable:!0,value:s}),Zr=Zr||i,s}catch(s){throw delete this[r],Zr=Zr||i,s}},set(i){Object.defineProperty(this,r,{configurable:!0,writable:!0,value:i})}})}function EK(e,r,t,n){let i=AK(e,r);i&&Object.defineProperty(i,r,{configurable:!0,get(){let s={configurable:!0,writable:!0,enumerable:n,value:void 0};return Object.defineProperty(this,r,s),s.value=t(this),Object.defineProperty(this,r,s),s.value},set(s){Object.defineProperty(this,r,{configurable:!0,writable:!0,enumerable:n,value:s})}})}var Kb="~constantCatch";function Jb(e){let r=()=>e;return r[Kb]=!0,r}var Xb;var ju={value:void 0,enumerable:!1},Qb="captureStackTrace"in Error?Error:null;function OK(e){let r=Qb;if(r){let t=r.stackTraceLimit;if(typeof t=="number"){try{r.stackTraceLimit=0}catch{return Qb=null,new e}try{return new e}finally{r.stackTraceLimit=t}}}return new e}function I(e,r,t,n){let i={};function s(m){this.def=m,this.constr=f,this.traits=new Set}s.prototype=i;let l=t,u=l&&new WeakSet;function o(m,p){if(m._zod){if(m._zod.traits.has(e))return}else{ju.value=new s(p);try{Object.defineProperty(m,"_zod",ju)}finally{ju.value=void 0}}if(m._zod.traits.add(e),r(m,p),u){let g=Object.getPrototypeOf(m),y=m._zod.constr.prototype,v=g;for(;v&&v!==y;)v=Object.getPrototypeOf(v);let b=v??g;u.has(b)||(u.add(b),Yu(b,l))}let d=f.prototype;for(let g in d)Object.prototype.hasOwnProperty.call(d,g)&&(g in m||(m[g]=d[g].bind(m)))}let a=n?.Parent??Object;class c extends a{}Object.defineProperty(c,"name",{value:e});function f(m){let p=n?.Parent?OK(c):this;o(p,m);let d=p._zod.deferred;if(d){for(let y of d)y();p._zod.deferred=void 0}let g=globalThis.__zod_globalConfig?.postProcessor;return g&&g(p),p}return Object.defineProperty(f,"init",{value:o}),Object.defineProperty(f,Symbol.hasInstance,{value:m=>n?.Parent&&m instanceof n.Parent?!0:m?._zod?.traits?.has(e)}),Object.defineProperty(f,"name",{value:e}),f}var Ue=class extends Error{constructor(){super("Encountered Promise during synchronous parse. Use .parseAsync() instead.")}},zt=class extends Error{constructor(r){super(`Encountered unidirectional transform during encode: ${r}`),this.name="ZodEncodeError"}};(Xb=globalThis).__zod_globalConfig??(Xb.__zod_globalConfig={});var we=globalThis.__zod_globalConfig;function He(e){return e&&Object.assign(we,e),we}function NK(){let e=this._zod;return e.message??(e.message=JSON.stringify(e.def,$t,2)),e.message}function kK(e){this._zod.message=e}var TK={get:NK,set:kK,enumerable:!0,configurable:!0},rc={value:void 0,enumerable:!1},Yb=new WeakSet([Object.prototype,Error.prototype]),jb=(e,r)=>{e.name="$ZodError",rc.value=r,Object.defineProperty(e,"issues",rc),rc.value=void 0,Object.defineProperty(e,"message",TK);let t=Object.getPrototypeOf(e);Yb.has(t)||(Yb.add(t),Object.defineProperty(t,"toString",{configurable:!0,enumerable:!1,get(){let n=()=>this.message;return Object.defineProperty(this,"toString",{value:n,configurable:!0,writable:!0}),n},set(n){Object.defineProperty(this,"toString",{value:n,configurable:!0,writable:!0})}}))},e_=I("$ZodError",jb),M1e=I("$ZodError",jb,void 0,{Parent:Error});function SK(e,r,t){return Object.prototype.hasOwnProperty.call(e,r)||(r==="__proto__"?Object.defineProperty(e,r,{value:t(),writable:!0,enumerable:!0,configurable:!0}):e[r]=t()),e[r]}function r_(e,r=t=>t.message){let t={},n=[];for(let i of e.issues)i.path.length>0?SK(t,i.path[0],()=>[]).push(r(i)):n.push(r(i));return{formErrors:n,fieldErrors:t}}function t_(e,r=t=>t.message){let t={_errors:[]},n=(i,s=[])=>{for(let l of i.issues)if(l.code==="invalid_union"&&l.errors.length)l.errors.map(u=>n({issues:u},[...s,...l.path]));else if(l.code==="invalid_key")n({issues:l.issues},[...s,...l.path]);else if(l.code==="invalid_element")n({issues:l.issues},[...s,...l.path]);else{let u=[...s,...l.path];if(u.length===0)t._errors.push(r(l));else{let o=t,a=0;for(;a<u.length;){let c=u[a],f=a===u.length-1;if(c==="_errors"){f&&o._errors.push(r(l)),a++;continue}Object.prototype.hasOwnProperty.call(o,c)||Object.defineProperty(o,c,{value:{_errors:[]},enumerable:!0,writable:!0,configurable:!0});let m=o[c];f&&m._errors.push(r(l)),o=m,a++}}}};return n(e),t}function li(e,r){return{callee:r?.callee??e,Err:r?.Err}}var fi=e=>{let r=(t,n,i,s)=>{let l=i?{...i,async:!1}:{async:!1},u=t._zod.run({value:n,issues:[]},l);if(u instanceof Promise)throw new Ue;if(u.issues.length){let o=new(s?.Err??e)(u.issues.map(a=>yr(a,l,He())));throw oi(o,s?.callee??r),o}return u.value};return r};var mi=e=>{let r=async(t,n,i,s)=>{let l=i?{...i,async:!0}:{async:!0},u=t._zod.run({value:n,issues:[]},l);if(u instanceof Promise&&(u=await u),u.issues.length){let o=new(s?.Err??e)(u.issues.map(a=>yr(a,l,He())));throw oi(o,s?.callee??r),o}return u.value};return r};var pi=e=>(r,t,n)=>{let i=n?{...n,async:!1}:{async:!1},s=r._zod.run({value:t,issues:[]},i);if(s instanceof Promise)throw new Ue;return s.issues.length?n_(e,s.issues,i):{success:!0,data:s.value}};function n_(e,r,t){let n;return{success:!1,get error(){return n||(n=new e(r.map(i=>yr(i,t,He()))),r=void 0,t=void 0),n},set error(i){n=i,r=void 0,t=void 0}}}var di=e=>async(r,t,n)=>{let i=n?{...n,async:!0}:{async:!0},s=r._zod.run({value:t,issues:[]},i);return s instanceof Promise&&(s=await s),s.issues.length?n_(e,s.issues,i):{success:!0,data:s.value}};var $K=Symbol.for("zod.compile.invalid"),LK=Symbol.for("zod.compile.fallback"),tc=((e,r,t)=>{let n=e._zod.bag.validator;if(n!==void 0){if(n(r)!==$K)return!0;if(n.definite===!0&&t===void 0)return!1}return zK(e,r,t)});function zK(e,r,t){let n=t?{...t,async:!1,abortEarly:!0}:{async:!1,abortEarly:!0},i=e._zod.bag.fallbackRun,s;if(i?(n[LK]=!0,s=i({value:r,issues:[]},n)):s=e._zod.run({value:r,issues:[]},n),s instanceof Promise)throw new Ue;return s.issues.length===0}var nc=async(e,r,t)=>{let n=t?{...t,async:!0,abortEarly:!0}:{async:!0,abortEarly:!0},i=e._zod.run({value:r,issues:[]},n);return i instanceof Promise&&(i=await i),i.issues.length===0},o_=e=>{let r=fi(e),t=(n,i,s,l)=>{let u=s?{...s,direction:"backward"}:{direction:"backward"};return r(n,i,u,li(t,l))};return t};var i_=e=>{let r=fi(e),t=(n,i,s,l)=>r(n,i,s,li(t,l));return t};var s_=e=>{let r=mi(e),t=async(n,i,s,l)=>{let u=s?{...s,direction:"backward"}:{direction:"backward"};return await r(n,i,u,li(t,l))};return t};var a_=e=>{let r=mi(e),t=async(n,i,s,l)=>await r(n,i,s,li(t,l));return t};var u_=e=>(r,t,n)=>{let i=n?{...n,direction:"backward"}:{direction:"backward"};return pi(e)(r,t,i)};var c_=e=>(r,t,n)=>pi(e)(r,t,n);var l_=e=>async(r,t,n)=>{let i=n?{...n,direction:"backward"}:{direction:"backward"};return di(e)(r,t,i)};var f_=e=>async(r,t,n)=>di(e)(r,t,n);var m_=/^[cC][0-9a-z]{6,}$/,p_=/^[0-9a-z]+$/,d_=/^[0-7][0-9A-HJKMNP-TV-Za-hjkmnp-tv-z]{25}$/,v_=/^[0-9a-vA-V]{20}$/,h_=/^[A-Za-z0-9]{27}$/,g_=/^[a-zA-Z0-9_-]{21}$/;function y_(e){return new RegExp(`^[a-zA-Z0-9_-]{${e}}$`)}var b_=/^P(?:(\d+W)|(?!.*W)(?=\d|T\d)(\d+Y)?(\d+M)?(\d+D)?(T(?=\d)(\d+H)?(\d+M)?(\d+([.,]\d+)?S)?)?)$/;var __=/^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-[0-9a-fA-F]{4}-[0-9a-fA-F]{4}-[0-9a-fA-F]{12})$/,ic=e=>e?new RegExp(`^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-${e}[0-9a-fA-F]{3}-[89abAB][0-9a-fA-F]{3}-[0-9a-fA-F]{12})$`):/^([0-9a-fA-F]{8}-[0-9a-fA-F]{4}-[1-8][0-9a-fA-F]{3}-[89abAB][0-9a-fA-F]{3}-[0-9a-fA-F]{12}|00000000-0000-0000-0000-000000000000|ffffffff-ffff-ffff-ffff-ffffffffffff)$/;var w_=/^(?:[A-Za-z0-9_'+\-]+\.)*[A-Za-z0-9_'+\-]*[A-Za-z0-9_+-]@(?:[A-Za-z0-9][A-Za-z0-9\-]*\.)+[A-Za-z]{2,}$/;var FK="^(?=[\\s\\S]*[\\p{Extended_Pictographic}\\p{Regional_Indicator}\\u20E3])[\\p{Extended_Pictographic}\\p{Emoji_Component}]+$";function q_(){return new RegExp(FK,"u")}var P_=/^(?:(?:25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\.){3}(?:25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])$/,A_=/^(([0-9a-fA-F]{1,4}:){7}[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,7}:|([0-9a-fA-F]{1,4}:){1,6}:[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,5}(:[0-9a-fA-F]{1,4}){1,2}|([0-9a-fA-F]{1,4}:){1,4}(:[0-9a-fA-F]{1,4}){1,3}|([0-9a-fA-F]{1,4}:){1,3}(:[0-9a-fA-F]{1,4}){1,4}|([0-9a-fA-F]{1,4}:){1,2}(:[0-9a-fA-F]{1,4}){1,5}|[0-9a-fA-F]{1,4}:((:[0-9a-fA-F]{1,4}){1,6})|:((:[0-9a-fA-F]{1,4}){1,7}|:))$/;var I_=/^((25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\.){3}(25[0-5]|2[0-4][0-9]|1[0-9][0-9]|[1-9][0-9]|[0-9])\/([0-9]|[1-2][0-9]|3[0-2])$/,E_=/^(([0-9a-fA-F]{1,4}:){7}[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,7}:|([0-9a-fA-F]{1,4}:){1,6}:[0-9a-fA-F]{1,4}|([0-9a-fA-F]{1,4}:){1,5}(:[0-9a-fA-F]{1,4}){1,2}|([0-9a-fA-F]{1,4}:){1,4}(:[0-9a-fA-F]{1,4}){1,3}|([0-9a-fA-F]{1,4}:){1,3}(:[0-9a-fA-F]{1,4}){1,4}|([0-9a-fA-F]{1,4}:){1,2}(:[0-9a-fA-F]{1,4}){1,5}|[0-9a-fA-F]{1,4}:((:[0-9a-fA-F]{1,4}){1,6})|:((:[0-9a-fA-F]{1,4}){1,7}|:))\/(12[0-8]|1[01][0-9]|[1-9]?[0-9])$/,O_=/^$|^(?:[0-9a-zA-Z+/]{4})*(?:(?:[0-9a-zA-Z+/]{2}==)|(?:[0-9a-zA-Z+/]{3}=))?$/,N_=/^(?:[A-Za-z0-9_-]{4})*(?:[A-Za-z0-9_-]{2,3})?$/;var k_=/^https?$/,T_=/^\+[1-9]\d{6,14}$/;var S_="(?:(?:\\d\\d[2468][048]|\\d\\d[13579][26]|\\d\\d0[48]|[02468][048]00|[13579][26]00)-02-29|\\d{4}-(?:(?:0[13578]|1[02])-(?:0[1-9]|[12]\\d|3[01])|(?:0[469]|11)-(?:0[1-9]|[12]\\d|30)|(?:02)-(?:0[1-9]|1\\d|2[0-8])))";function xK(e){return new RegExp(`^${e}$`)}var $_=xK(S_);function oc(e){let r="(?:[01]\\d|2[0-3]):[0-5]\\d";return typeof e.precision=="number"?e.precision===-1?`${r}`:e.precision===0?`${r}:[0-5]\\d`:`${r}:[0-5]\\d\\.\\d{${e.precision}}`:e.seconds?`${r}:[0-5]\\d(?:\\.\\d+)?`:`${r}(?::[0-5]\\d(?:\\.\\d+)?)?`}function L_(e){return new RegExp(`^${oc(e)}$`)}function z_(e){let r=["Z"];e.offset&&r.push("([+-](?:[01]\\d|2[0-3]):[0-5]\\d)");let t=`${oc({precision:e.precision,seconds:!0})}(?:${r.join("|")})`,n=e.local?`${t}|${oc({precision:e.precision})}`:t;return new RegExp(`^${S_}T(?:${n})$`)}var F_=/^[\s\S]{0,}$/;var sc=/^-?\d+(?:\.\d+)?$/,x_=/^(?:true|false)$/i;var R_=/^[^A-Z]*$/,C_=/^[^a-z]*$/;var de=I("$ZodCheck",(e,r)=>{var t;e._zod??(e._zod={}),e._zod.def=r,(t=e._zod).onattach??(t.onattach=[])});var ac=e=>{let r=e.value;return!Uu(r)&&r.length!==void 0},vi={number:"number",bigint:"bigint",object:"date"},uc=I("$ZodCheckLessThan",(e,r)=>{de.init(e,r);let t=vi[typeof r.value];e._zod.check=n=>{(r.inclusive?n.value<=r.value:n.value<r.value)||n.issues.push({origin:vi[typeof n.value]??t,code:"too_big",maximum:typeof r.value=="object"?r.value.getTime():r.value,input:n.value,inclusive:r.inclusive,inst:e,continue:!r.abort})}}),cc=I("$ZodCheckGreaterThan",(e,r)=>{de.init(e,r);let t=vi[typeof r.value];e._zod.check=n=>{(r.inclusive?n.value>=r.value:n.value>r.value)||n.issues.push({origin:vi[typeof n.value]??t,code:"too_small",minimum:typeof r.value=="object"?r.value.getTime():r.value,input:n.value,inclusive:r.inclusive,inst:e,continue:!r.abort})}}),Z_=I("$ZodCheckMultipleOf",(e,r)=>{de.init(e,r),e._zod.check=t=>{if(typeof t.value!=typeof r.value)throw new Error("Cannot mix number and bigint in multiple_of check.");(typeof t.value=="bigint"?r.value!==BigInt(0)&&t.value%r.value===BigInt(0):Hu(t.value,r.value)===0)||t.issues.push({origin:typeof t.value,code:"not_multiple_of",divisor:r.value,input:t.value,inst:e,continue:!r.abort})}}),D_=I("$ZodCheckNumberFormat",(e,r)=>{de.init(e,r),r.format=r.format||"float64";let t=r.format?.includes("int"),n=t?"int":"number",[i,s]=Nn[r.format];e._zod.check=l=>{let u=l.value;if(t){if(!Number.isInteger(u)){l.issues.push({expected:n,format:r.format,code:"invalid_type",continue:!1,input:u,inst:e});return}if(!Number.isSafeInteger(u)){u>0?l.issues.push({input:u,code:"too_big",maximum:Number.MAX_SAFE_INTEGER,note:"Integers must be within the safe integer range.",inst:e,origin:n,inclusive:!0,continue:!r.abort}):l.issues.push({input:u,code:"too_small",minimum:Number.MIN_SAFE_INTEGER,note:"Integers must be within the safe integer range.",inst:e,origin:n,inclusive:!0,continue:!r.abort});return}}u<i&&l.issues.push({origin:"number",input:u,code:"too_small",minimum:i,inclusive:!0,inst:e,continue:!r.abort}),u>s&&l.issues.push({origin:"number",input:u,code:"too_big",maximum:s,inclusive:!0,inst:e,continue:!r.abort})}});var M_=I("$ZodCheckMaxLength",(e,r)=>{var t;de.init(e,r),(t=e._zod.def).when??(t.when=ac),e._zod.check=n=>{let i=n.value,s=i.length;if((typeof i=="string"&&s>r.maximum?Tn(i):s)<=r.maximum)return;let u=Sn(i);n.issues.push({origin:u,code:"too_big",maximum:r.maximum,inclusive:!0,input:i,inst:e,continue:!r.abort})}}),B_=I("$ZodCheckMinLength",(e,r)=>{var t;de.init(e,r),(t=e._zod.def).when??(t.when=ac),e._zod.check=n=>{let i=n.value,s=i.length;if((typeof i=="string"&&s>=r.minimum&&s<r.minimum*2?Tn(i):s)>=r.minimum)return;let u=Sn(i);n.issues.push({origin:u,code:"too_small",minimum:r.minimum,inclusive:!0,input:i,inst:e,continue:!r.abort})}}),U_=I("$ZodCheckLengthEquals",(e,r)=>{var t;de.init(e,r),(t=e._zod.def).when??(t.when=ac),e._zod.check=n=>{let i=n.value,s=i.length,l=typeof i=="string"&&s>=r.length&&s<=r.length*2?Tn(i):s;if(l===r.length)return;let u=Sn(i),o=l>r.length;n.issues.push({origin:u,...o?{code:"too_big",maximum:r.length}:{code:"too_small",minimum:r.length},inclusive:!0,exact:!0,input:n.value,inst:e,continue:!r.abort})}}),Ln=I("$ZodCheckStringFormat",(e,r)=>{var t,n;de.init(e,r),r.pattern?(t=e._zod).check??(t.check=i=>{r.pattern.lastIndex=0,!r.pattern.test(i.value)&&i.issues.push({origin:"string",code:"invalid_format",format:r.format,input:i.value,...r.pattern?{pattern:r.pattern.toString()}:{},inst:e,continue:!r.abort})}):(n=e._zod).check??(n.check=()=>{})}),H_=I("$ZodCheckRegex",(e,r)=>{Ln.init(e,r),e._zod.check=t=>{r.pattern.lastIndex=0,!r.pattern.test(t.value)&&t.issues.push({origin:"string",code:"invalid_format",format:"regex",input:t.value,pattern:r.pattern.toString(),inst:e,continue:!r.abort})}}),V_=I("$ZodCheckLowerCase",(e,r)=>{r.pattern??(r.pattern=R_),Ln.init(e,r)}),G_=I("$ZodCheckUpperCase",(e,r)=>{r.pattern??(r.pattern=C_),Ln.init(e,r)}),W_=I("$ZodCheckIncludes",(e,r)=>{de.init(e,r);let t=at(r.includes),n=new RegExp(typeof r.position=="number"?`^.{${r.position},}${t}`:t);r.pattern=n,e._zod.check=i=>{i.value.includes(r.includes,r.position)||i.issues.push({origin:"string",code:"invalid_format",format:"includes",includes:r.includes,input:i.value,inst:e,continue:!r.abort})}}),K_=I("$ZodCheckStartsWith",(e,r)=>{de.init(e,r);let t=new RegExp(`^${at(r.prefix)}.*`);r.pattern??(r.pattern=t),e._zod.check=n=>{n.value.startsWith(r.prefix)||n.issues.push({origin:"string",code:"invalid_format",format:"starts_with",prefix:r.prefix,input:n.value,inst:e,continue:!r.abort})}}),J_=I("$ZodCheckEndsWith",(e,r)=>{de.init(e,r);let t=new RegExp(`.*${at(r.suffix)}$`);r.pattern??(r.pattern=t),e._zod.check=n=>{n.value.endsWith(r.suffix)||n.issues.push({origin:"string",code:"invalid_format",format:"ends_with",suffix:r.suffix,input:n.value,inst:e,continue:!r.abort})}});var X_=I("$ZodCheckOverwrite",(e,r)=>{de.init(e,r),e._zod.check=t=>{t.value=r.tx(t.value)}});var hi=class{constructor(r=[],t={}){this.content=[],this.indent=0,this.args=r,this.closed=t}indented(r){this.indent+=1;try{r(this)}finally{this.indent-=1}}write(r){if(typeof r=="function"){r(this,{execution:"sync"}),r(this,{execution:"async"});return}let n=r.split(`
`).filter(l=>l),i=Math.min(...n.map(l=>l.length-l.trimStart().length)),s=n.map(l=>l.slice(i)).map(l=>" ".repeat(this.indent*2)+l);for(let l of s)this.content.push(l)}compile(){let r=Function,t=this?.content??[""];return new r(...Object.keys(this.closed),`return function (${this.args.join(", ")}) {
${t.join(`
`)}
};`)(...Object.values(this.closed))}};var Y_={major:4,minor:6,patch:7};var ee=I("$ZodType",(e,r)=>{var t;e??(e={}),e._zod.def=r,e._zod.bag=e._zod.bag||{},e._zod.version=Y_;let n=e._zod.def.checks,i=e._zod.traits.has("$ZodCheck")?[e,...n??[]]:n?.length?[...n]:[];for(let s of i)for(let l of s._zod.onattach)l(e);if(i.length===0)(t=e._zod).deferred??(t.deferred=[]),e._zod.deferred?.push(()=>{e._zod.run=e._zod.parse});else{let s=(u,o,a)=>{if(u.memo)return u;let c=Ae(u),f;for(let m of o){if(m._zod.def.when){if(Xu(u)||!m._zod.def.when(u))continue}else if(c)continue;let p=u.issues.length,d=m._zod.check(u);if(d instanceof Promise&&a?.async===!1)throw new Ue;if(f||d instanceof Promise)f=(f??Promise.resolve()).then(async()=>{await d,u.issues.length!==p&&(kn(u.issues,p,e),c||(c=Ae(u,p)))});else{if(u.issues.length===p)continue;kn(u.issues,p,e),c||(c=Ae(u,p))}}return f?f.then(()=>u):u},l=(u,o,a)=>{if(Ae(u))return u.aborted=!0,u;let c=s(o,i,a);if(c instanceof Promise){if(a.async===!1)throw new Ue;return c.then(f=>e._zod.parse(f,a))}return e._zod.parse(c,a)};e._zod.run=(u,o)=>{if(o.skipChecks)return e._zod.parse(u,o);if(o.direction==="backward"){let c=e._zod.parse({value:u.value,issues:[]},{...o,skipChecks:!0});return c instanceof Promise?c.then(f=>l(f,u,o)):l(c,u,o)}let a=e._zod.parse(u,o);if(a instanceof Promise){if(o.async===!1)throw new Ue;return a.then(c=>s(c,i,o))}return s(a,i,o)}}},{get"~standard"(){return ci(this,"~standard",fc(this))},set"~standard"(e){Dr(this,"~standard",e)}}),mw=(e,r)=>e.issues.length?{issues:e.issues.map(t=>yr(t,r,He()))}:{value:e.value};async function CK(e,r){let t={async:!0};return mw(await e._zod.run({value:r,issues:[]},t),t)}function fc(e){return{validate:r=>{let t={async:!1};try{let n=e._zod.run({value:r,issues:[]},t);if(!(n instanceof Promise))return mw(n,t)}catch{}return CK(e,r)},vendor:"zod",version:1}}var _i=I("$ZodString",(e,r)=>{ee.init(e,r),e._zod.pattern=r.pattern??F_,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=String(t.value)}catch{}return typeof t.value=="string"||t.issues.push({expected:"string",code:"invalid_type",input:t.value,inst:e}),t}}),K=I("$ZodStringFormat",(e,r)=>{Ln.init(e,r),_i.init(e,r)}),pw=I("$ZodGUID",(e,r)=>{r.pattern??(r.pattern=__),K.init(e,r)}),dw=I("$ZodUUID",(e,r)=>{if(r.version){let n={v1:1,v2:2,v3:3,v4:4,v5:5,v6:6,v7:7,v8:8}[r.version];if(n===void 0)throw new Error(`Invalid UUID version: "${r.version}"`);r.pattern??(r.pattern=ic(n))}else r.pattern??(r.pattern=ic());K.init(e,r)}),vw=I("$ZodEmail",(e,r)=>{r.pattern??(r.pattern=w_),K.init(e,r)}),hw=1,yi=2;function gw(e){try{return typeof URL<"u"&&typeof URL.canParse=="function"?URL.canParse(e):(new URL(e),!0)}catch{return!1}}function ZK(e,r){return!("normalize"in r)&&!("hostname"in r)&&!("protocol"in r)?gw(e)||yi:DK(e,r)}function DK(e,r){if(!r.normalize&&r.protocol?.source===k_.source&&!/^https?:\/\//i.test(e))return hw;try{if(typeof URL<"u"){let t=URL;if(typeof t.parse=="function")return t.parse(e)??yi}return new URL(e)}catch{return yi}}var MK=/[\t\n\r]/g;function j_(e){return e.replace(MK,"")}function BK(e,r){return r.lastIndex=0,r.test(e.hostname)}function UK(e,r){return r.lastIndex=0,r.test(e.protocol.endsWith(":")?e.protocol.slice(0,-1):e.protocol)}var yw=I("$ZodURL",(e,r)=>{K.init(e,r),e._zod.check=t=>{try{let n=t.value.trim(),i=ZK(n,r);if(i===hw){t.issues.push({code:"invalid_format",format:"url",note:"Invalid URL format",input:t.value,inst:e,continue:!r.abort});return}if(i===yi){t.issues.push({code:"invalid_format",format:"url",input:t.value,inst:e,continue:!r.abort});return}if(i===!0){t.value=j_(n);return}r.hostname&&!BK(i,r.hostname)&&t.issues.push({code:"invalid_format",format:"url",note:"Invalid hostname",pattern:r.hostname.source,input:t.value,inst:e,continue:!r.abort}),r.protocol&&!UK(i,r.protocol)&&t.issues.push({code:"invalid_format",format:"url",note:"Invalid protocol",pattern:r.protocol.source,input:t.value,inst:e,continue:!r.abort}),t.value=r.normalize?i.href:j_(n);return}catch{t.issues.push({code:"invalid_format",format:"url",input:t.value,inst:e,continue:!r.abort})}}}),bw=I("$ZodEmoji",(e,r)=>{r.pattern??(r.pattern=q_()),K.init(e,r)}),_w=I("$ZodNanoID",(e,r)=>{if(r.length!==void 0&&(!Number.isInteger(r.length)||r.length<1))throw new Error(`Invalid nanoid length: ${r.length}`);r.pattern??(r.pattern=r.length===void 0?g_:y_(r.length)),K.init(e,r)}),ww=I("$ZodCUID",(e,r)=>{r.pattern??(r.pattern=m_),K.init(e,r)}),qw=I("$ZodCUID2",(e,r)=>{r.pattern??(r.pattern=p_),K.init(e,r)}),Pw=I("$ZodULID",(e,r)=>{r.pattern??(r.pattern=d_),K.init(e,r)}),Aw=I("$ZodXID",(e,r)=>{r.pattern??(r.pattern=v_),K.init(e,r)}),Iw=I("$ZodKSUID",(e,r)=>{r.pattern??(r.pattern=h_),K.init(e,r)}),Ew=I("$ZodISODateTime",(e,r)=>{r.pattern??(r.pattern=z_(r)),K.init(e,r)}),Ow=I("$ZodISODate",(e,r)=>{r.pattern??(r.pattern=$_),K.init(e,r)}),Nw=I("$ZodISOTime",(e,r)=>{r.pattern??(r.pattern=L_(r)),K.init(e,r)}),kw=I("$ZodISODuration",(e,r)=>{r.pattern??(r.pattern=b_),K.init(e,r)}),Tw=I("$ZodIPv4",(e,r)=>{r.pattern??(r.pattern=P_),K.init(e,r)}),HK=/^[0-9a-fA-F:.]+$/;function Sw(e){return HK.test(e)?gw(`http://[${e}]`):!1}var $w=I("$ZodIPv6",(e,r)=>{r.pattern??(r.pattern=A_),K.init(e,r),e._zod.check=t=>{Sw(t.value)||t.issues.push({code:"invalid_format",format:"ipv6",input:t.value,inst:e,continue:!r.abort})}});var Lw=I("$ZodCIDRv4",(e,r)=>{r.pattern??(r.pattern=I_),K.init(e,r)});function VK(e){let r=e.split("/");if(r.length!==2)return!1;let[t,n]=r;if(!n)return!1;let i=Number(n);return`${i}`!==n||i<0||i>128?!1:Sw(t)}var zw=I("$ZodCIDRv6",(e,r)=>{r.pattern??(r.pattern=E_),K.init(e,r),e._zod.check=t=>{VK(t.value)||t.issues.push({code:"invalid_format",format:"cidrv6",input:t.value,inst:e,continue:!r.abort})}});function Fw(e){if(e==="")return!0;if(/\s/.test(e)||e.length%4!==0)return!1;try{return atob(e),!0}catch{return!1}}var mc=/^[0-9a-zA-Z+/]*={0,2}$/,xw=I("$ZodBase64",(e,r)=>{r.pattern??(r.pattern=mc),K.init(e,r),e._zod.check=t=>{Fw(t.value)||t.issues.push({code:"invalid_format",format:"base64",input:t.value,inst:e,continue:!r.abort})}}),wi=/^[A-Za-z0-9_-]*$/;function GK(e){if(!wi.test(e))return!1;let r=e.replace(/[-_]/g,n=>n==="-"?"+":"/"),t=r.padEnd(Math.ceil(r.length/4)*4,"=");return Fw(t)}var Rw=I("$ZodBase64URL",(e,r)=>{r.pattern??(r.pattern=wi),K.init(e,r),e._zod.check=t=>{GK(t.value)||t.issues.push({code:"invalid_format",format:"base64url",input:t.value,inst:e,continue:!r.abort})}}),Cw=I("$ZodE164",(e,r)=>{r.pattern??(r.pattern=T_),K.init(e,r)});function WK(e,r=null){try{let t=e.split(".");if(t.length!==3)return!1;let[n]=t;if(!n)return!1;let i=JSON.parse(atob(n));return!("typ"in i&&i?.typ!=="JWT"||!i.alg||r&&(!("alg"in i)||i.alg!==r))}catch{return!1}}var Zw=I("$ZodJWT",(e,r)=>{K.init(e,r),e._zod.check=t=>{WK(t.value,r.alg)||t.issues.push({code:"invalid_format",format:"jwt",input:t.value,inst:e,continue:!r.abort})}});var pc=I("$ZodNumber",(e,r)=>{ee.init(e,r),e._zod.pattern=sc,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=Number(t.value)}catch{}let i=t.value;if(typeof i=="number"&&!Number.isNaN(i)&&Number.isFinite(i))return t;let s=typeof i=="number"?Number.isNaN(i)?"NaN":Number.isFinite(i)?void 0:String(i):void 0;return t.issues.push({expected:"number",code:"invalid_type",input:i,inst:e,...s?{received:s}:{}}),t}}),Dw=I("$ZodNumberFormat",(e,r)=>{D_.init(e,r),pc.init(e,r)}),Mw=I("$ZodBoolean",(e,r)=>{ee.init(e,r),e._zod.pattern=x_,e._zod.parse=(t,n)=>{if(r.coerce)try{t.value=!!t.value}catch{}let i=t.value;return typeof i=="boolean"||t.issues.push({expected:"boolean",code:"invalid_type",input:i,inst:e}),t}});var Bw=I("$ZodUnknown",(e,r)=>{ee.init(e,r),e._zod.parse=t=>t}),Uw=I("$ZodNever",(e,r)=>{ee.init(e,r),e._zod.parse=(t,n)=>(t.issues.push({expected:"never",code:"invalid_type",input:t.value,inst:e}),t)});function KK(e,r){let t=ui(e._zod.def.checks);if(!t.length)return;let n=Math.min(...t.map(s=>s[0])),i=e._zod.parse;e._zod.parse=(s,l)=>{let u=r(s.value);if(u>n&&!l?.skipChecks&&l?.direction!=="backward"){for(let[o,a]of ui(e._zod.def.checks))if(u>o&&a._zod.def.when(s)){let c=s.issues.length;return a._zod.check(s),s.issues[c].continue=!1,kn(s.issues,c,e),s}}return i(s,l)}}var JK=e=>Array.isArray(e)?e.length:-1;function ew(e,r,t){e.issues.length&&r.issues.push(...ut(t,e.issues)),r.value[t]=e.value}var Hw=I("$ZodArray",(e,r)=>{ee.init(e,r);let t=we.memoizer;t?.attach(e),e._zod.parse=(n,i)=>{let s=n.value;if(!Array.isArray(s))return n.issues.push({expected:"array",code:"invalid_type",input:s,inst:e}),n;n.value=t?t.alloc(e,n,Array(s.length),i):Array(s.length);let l=[],u=i?.abortEarly;for(let o=0;o<s.length;o++){let a=s[o],c=r.element._zod.run({value:a,issues:[]},i);if(c instanceof Promise)l.push(c.then(f=>ew(f,n,o)));else if(ew(c,n,o),u&&c.issues.length!==0&&Ae(c))break}return l.length?Promise.all(l).then(()=>n):n},KK(e,JK)});function bi(e,r,t,n,i,s){let l=t in n,u=s==="optional";if(!(!l&&u&&i==="optional")){if(e.issues.length){if(i!==void 0&&u&&!l)return;r.issues.push(...ut(t,e.issues))}if(!l&&i===void 0){e.issues.length||r.issues.push({code:"invalid_type",expected:"nonoptional",input:void 0,path:[t]});return}e.value===void 0?(l||i==="defaulted"&&!u)&&(r.value[t]=void 0):r.value[t]=e.value}}var XK=[];function Vw(e){let r=Object.keys(e.shape),t=Object.getOwnPropertySymbols(e.shape),n=t.length?t:XK,i=n.length?[...r,...n]:r;for(let l of i)if(!e.shape?.[l]?._zod?.traits?.has("$ZodType"))throw new Error(`Invalid element at key "${String(l)}": expected a Zod schema`);let s=Ju(e.shape);return{...e,allKeys:i,symbolKeys:n,keySet:new Set(r),numKeys:r.length,optionalKeys:new Set(s)}}function Gw(e,r,t,n,i,s,l){let u=[],o=i.keySet,a=i.catchall._zod,c=a.def.type,f=a.optin,m=a.optout,p=0;for(let d in r){if(l&&t.issues.length!==p){if(Ae(t,p))break;p=t.issues.length}if(o.has(d))continue;if(d==="__proto__"){c==="never"&&u.push(d);continue}if(c==="never"){u.push(d);continue}let g=a.run({value:r[d],issues:[]},n);g instanceof Promise?e.push(g.then(y=>bi(y,t,d,r,f,m))):bi(g,t,d,r,f,m)}return u.length&&t.issues.push({code:"unrecognized_keys",keys:u,input:r,inst:s,continue:!0}),e.length?Promise.all(e).then(()=>t):t}var QK=I("$ZodObject",(e,r)=>{ee.init(e,r);let t=Object.getOwnPropertyDescriptor(r,"shape"),n=t?.get?t.get.raw:r.shape??{};if(n){let a=()=>{let c={...n};return Object.defineProperty(r,"shape",{value:c}),a.raw=c,c};a.raw=n,Object.defineProperty(r,"shape",{get:a})}let i=In(()=>Vw(r));M(e,"propValues",a=>{let c=a.def.shape,f={};for(let m in c){let p=c[m]._zod;if(p.values){Object.prototype.hasOwnProperty.call(f,m)||Me(f,m,new Set);for(let d of p.values)f[m].add(d);p.optin!==void 0&&f[m].add(void 0)}}return f});let s=Tt,l=r.catchall,u,o=we.memoizer;o?.attach(e),e._zod.parse=(a,c)=>{u??(u=i.value);let f=a.value;if(!s(f))return a.issues.push({expected:"object",code:"invalid_type",input:f,inst:e}),a;a.value=o?o.alloc(e,a,{},c):{};let m=[],p=u.shape,d=c?.abortEarly,g=a.issues.length;for(let y of u.allKeys){if(d&&a.issues.length!==g){if(Ae(a,g))break;g=a.issues.length}if(y==="__proto__")continue;let v=p[y],b=v._zod.optin,_=v._zod.optout,w=v._zod.run({value:f[y],issues:[]},c);w instanceof Promise?m.push(w.then(q=>bi(q,a,y,f,b,_))):bi(w,a,y,f,b,_)}return l?Gw(m,f,a,c,i.value,e,d===!0):m.length?Promise.all(m).then(()=>a):a}}),Ww=I("$ZodObjectJIT",(e,r)=>{QK.init(e,r);let t=e._zod.parse,n=In(()=>Vw(r)),i=we.memoizer,s=p=>{let d=n.value,g=d.symbolKeys,y=new hi(["payload","ctx"],{shape:p,inst:e,memo:i,syms:g}),v=q=>`shape[${q}]._zod.run({ value: input[${q}], issues: [] }, ctx)`,b=(q,P)=>`
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
          }`;y.write("const input = payload.value;");let _=Object.create(null),w=0;for(let q of d.allKeys)_[q]=`key_${w++}`;y.write(i?"const newResult = memo.alloc(inst, payload, {}, ctx);":"const newResult = {};");for(let q of d.allKeys){if(q==="__proto__")continue;let P=_[q],A=typeof q=="symbol"?`syms[${g.indexOf(q)}]`:Vu(q),N=`${A} in input`,k=p[q],D=k?._zod?.optin,Z=D!==void 0,x=k?._zod?.optout==="optional";if(y.write(`const ${P} = ${v(A)};`),Z&&x){let J=D==="optional"?`${P}_present`:`${P}.value !== undefined || ${P}_present`;y.write(`
        const ${P}_present = ${N};
        if (!${P}.issues.length || ${P}_present) {
          if (${P}.issues.length) {${b(P,A)}
          }

          if (${J}) {
            newResult[${A}] = ${P}.value;
          }
        }

      `)}else Z?(y.write(`
        if (${P}.issues.length) {${b(P,A)}
        }
      `),D==="defaulted"?y.write(`newResult[${A}] = ${P}.value;`):y.write(`
        if (${P}.value !== undefined || ${N}) {
          newResult[${A}] = ${P}.value;
        }
      `)):y.write(`
        const ${P}_present = ${N};
        if (${P}.issues.length) {${b(P,A)}
        }
        if (!${P}_present && !${P}.issues.length) {
          payload.issues.push({
            code: "invalid_type",
            expected: "nonoptional",
            input: undefined,
            path: [${A}]
          });
          if (ctx && ctx.abortEarly) {
            payload.value = newResult;
            return payload;
          }
        }

        if (${P}_present) {
          newResult[${A}] = ${P}.value;
        }

      `)}return y.write("payload.value = newResult;"),y.write("return payload;"),y.compile()},l,u=Tt,o=!we.jitless,c=o&&Wu.value,f=r.catchall,m;e._zod.parse=(p,d)=>{m??(m=n.value);let g=p.value;return u(g)?o&&c&&d?.async===!1&&d.jitless!==!0?(l||(l=s(r.shape)),p=l(p,d),f?Gw([],g,p,d,m,e,d?.abortEarly===!0):p):t(p,d):(p.issues.push({expected:"object",code:"invalid_type",input:g,inst:e}),p)}});function rw(e,r,t,n){for(let s of e)if(s.issues.length===0)return r.value=s.value,r;let i=e.filter(s=>!Ae(s));return i.length===1?(r.value=i[0].value,i[0]):(r.issues.push({code:"invalid_union",input:r.value,inst:t,errors:e.map(s=>s.issues.map(l=>yr(l,n,He())))}),r)}var Kw=I("$ZodUnion",(e,r)=>{ee.init(e,r),M(e,"optin",n=>n.def.options.some(i=>i._zod.optin==="defaulted")?"defaulted":n.def.options.some(i=>i._zod.optin!==void 0)?"optional":void 0),M(e,"optout",n=>n.def.options.some(i=>i._zod.optout==="optional")?"optional":void 0),M(e,"values",n=>{if(n.def.options.every(i=>i._zod.values))return new Set(n.def.options.flatMap(i=>Array.from(i._zod.values)))}),M(e,"pattern",n=>{if(n.def.options.every(i=>i._zod.pattern)){let i=n.def.options.map(s=>s._zod.pattern);return new RegExp(`^(${i.map(s=>En(s.source)).join("|")})$`)}});let t=r.options.length===1?r.options[0]._zod.run:null;e._zod.parse=(n,i)=>{if(t)return t(n,i);let s=!1,l=[];for(let u of r.options){let o=u._zod.run({value:n.value,issues:[]},i);if(o instanceof Promise)l.push(o),s=!0;else{if(o.issues.length===0)return o;l.push(o)}}return s?Promise.all(l).then(u=>rw(u,n,e,i)):rw(l,n,e,i)}});var Jw=I("$ZodIntersection",(e,r)=>{ee.init(e,r),e._zod.parse=(t,n)=>{let i=t.value,s=r.left._zod.run({value:i,issues:[]},n),l=r.right._zod.run({value:i,issues:[]},n);return s instanceof Promise||l instanceof Promise?Promise.all([s,l]).then(([o,a])=>tw(t,o,a)):tw(t,s,l)}});function lc(e,r){if(e===r)return{valid:!0,data:e};if(e instanceof Date&&r instanceof Date&&+e==+r)return{valid:!0,data:e};if(st(e)&&st(r)){let t=Object.keys(r),n=Object.keys(e).filter(s=>t.indexOf(s)!==-1),i={...e,...r};Object.prototype.hasOwnProperty.call(i,"__proto__")&&delete i.__proto__;for(let s of n){if(s==="__proto__")continue;let l=lc(e[s],r[s]);if(!l.valid)return{valid:!1,mergeErrorPath:[s,...l.mergeErrorPath]};i[s]=l.data}return{valid:!0,data:i}}if(Array.isArray(e)&&Array.isArray(r)){if(e.length!==r.length)return{valid:!1,mergeErrorPath:[]};let t=[];for(let n=0;n<e.length;n++){let i=e[n],s=r[n],l=lc(i,s);if(!l.valid)return{valid:!1,mergeErrorPath:[n,...l.mergeErrorPath]};t.push(l.data)}return{valid:!0,data:t}}return{valid:!1,mergeErrorPath:[]}}function tw(e,r,t){let n=new Map,i,s=new Map,l=(a,c)=>{let f;if(a.code==="unrecognized_keys"&&!a.path?.length)i??(i=a),f=a.keys;else if(a.code==="invalid_key"&&a.origin==="record"&&a.path?.length===1){let m=String(a.path[0]);s.has(m)||s.set(m,a),f=[m]}else return!1;for(let m of f)n.has(m)||n.set(m,{}),n.get(m)[c]=!0;return!0};for(let a of r.issues)l(a,"l")||e.issues.push(a);for(let a of t.issues)l(a,"r")||e.issues.push(a);let u=[...n].filter(([,a])=>a.l&&a.r).map(([a])=>a);if(u.length){let a=i?u.filter(c=>i.keys.includes(c)):[];a.length&&e.issues.push({...i,keys:a});for(let c of u)!a.includes(c)&&s.has(c)&&e.issues.push(s.get(c))}let o=lc(r.value,t.value);if(!o.valid){if(Ae(e))return e;throw new Error(`Unmergable intersection. Error path: ${JSON.stringify(o.mergeErrorPath)}`)}return e.value=o.data,e}var Xw=I("$ZodTuple",(e,r)=>{ee.init(e,r);let t=r.items,n=we.memoizer;n?.attach(e),e._zod.parse=(i,s)=>{let l=i.value;if(!Array.isArray(l))return i.issues.push({input:l,inst:e,expected:"tuple",code:"invalid_type"}),i;i.value=n?n.alloc(e,i,[],s):[];let u=[],o=nw(t,"optin"),a=nw(t,"optout");if(!r.rest){if(l.length<o)return i.issues.push({code:"too_small",minimum:o,inclusive:!0,input:l,inst:e,origin:"array"}),i;l.length>t.length&&i.issues.push({code:"too_big",maximum:t.length,inclusive:!0,input:l,inst:e,origin:"array"})}let c=new Array(t.length),f=r.rest?s?.abortEarly:void 0,m=!1;for(let p=0;p<t.length;p++){let d=t[p]._zod.run({value:l[p],issues:[]},s);d instanceof Promise?u.push(d.then(g=>{c[p]=g})):(c[p]=d,f&&!m&&d.issues.length&&(m=Ae(d)))}if(r.rest&&!m){let p=t.length-1,d=l.slice(t.length),g=i.issues.length;for(let y of d){if(f&&i.issues.length!==g){if(Ae(i,g))break;g=i.issues.length}p++;let v=r.rest._zod.run({value:y,issues:[]},s);v instanceof Promise?u.push(v.then(b=>ow(b,i,p))):ow(v,i,p)}}return u.length?Promise.all(u).then(()=>iw(c,i,t,l,a)):iw(c,i,t,l,a)}});function nw(e,r){for(let t=e.length-1;t>=0;t--)if(!(r==="optin"?e[t]._zod.optin!==void 0:e[t]._zod.optout==="optional"))return t+1;return 0}function ow(e,r,t){e.issues.length&&r.issues.push(...ut(t,e.issues)),r.value[t]=e.value}function iw(e,r,t,n,i){for(let s=0;s<t.length;s++){let l=e[s],u=s<n.length;if(!u&&s>=i&&t[s]._zod.optin==="optional"){r.value.length=s;break}if(l.issues.length){if(!u&&s>=i){r.value.length=s;break}r.issues.push(...ut(s,l.issues))}r.value[s]=l.value}for(let s=r.value.length-1;s>=n.length&&(t[s]._zod.optout==="optional"&&r.value[s]===void 0);s--)r.value.length=s;return r}var Qw=I("$ZodEnum",(e,r)=>{ee.init(e,r);let t=St(r.entries),n=new Set(t);e._zod.values=n,M(e,"pattern",i=>{let s=St(i.def.entries).filter(l=>Ku.has(typeof l));return new RegExp(s.length?`^(${s.map(l=>at(l.toString())).join("|")})$`:"^[^\\s\\S]$")}),e._zod.parse=(i,s)=>{let l=i.value;return n.has(l)||i.issues.push({code:"invalid_value",values:t,input:l,inst:e}),i}});var Yw=I("$ZodTransform",(e,r)=>{ee.init(e,r),e._zod.optin="optional",we.memoizer?.guard(e),e._zod.parse=(t,n)=>{if(n.direction==="backward")throw new zt(e.constructor.name);let i=r.transform(t.value,t);if(n.async)return(i instanceof Promise?i:Promise.resolve(i)).then(l=>(t.value=l,t));if(i instanceof Promise)throw new Ue;return t.value=i,t}});function sw(e,r){return e.value=r.issues.length?void 0:r.value,e}var dc=I("$ZodOptional",(e,r)=>{ee.init(e,r),M(e,"optin",t=>t.def.innerType._zod.optin==="defaulted"?"defaulted":"optional"),e._zod.optout="optional",M(e,"values",t=>{let n=t.def.innerType._zod.values;return n?new Set([...n,void 0]):void 0}),M(e,"pattern",t=>{let n=t.def.innerType._zod.pattern;return n?new RegExp(`^(${En(n.source)})?$`):void 0}),e._zod.parse=(t,n)=>{if(t.value===void 0){if(r.innerType._zod.optin!=="defaulted")return t;let i=r.innerType._zod.run({value:t.value,issues:[]},n);return i instanceof Promise?i.then(s=>sw(t,s)):sw(t,i)}return r.innerType._zod.run(t,n)}}),jw=I("$ZodExactOptional",(e,r)=>{dc.init(e,r),M(e,"values",t=>t.def.innerType._zod.values),M(e,"pattern",t=>t.def.innerType._zod.pattern),e._zod.parse=(t,n)=>r.innerType._zod.run(t,n)}),eq=I("$ZodNullable",(e,r)=>{ee.init(e,r),M(e,"optin",t=>t.def.innerType._zod.optin),M(e,"optout",t=>t.def.innerType._zod.optout),M(e,"pattern",t=>{let n=t.def.innerType._zod.pattern;return n?new RegExp(`^(${En(n.source)}|null)$`):void 0}),M(e,"values",t=>t.def.innerType._zod.values?new Set([...t.def.innerType._zod.values,null]):void 0),e._zod.parse=(t,n)=>t.value===null?t:r.innerType._zod.run(t,n)}),rq=I("$ZodDefault",(e,r)=>{ee.init(e,r),e._zod.optin="defaulted",M(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);if(t.value===void 0)return t.value=r.defaultValue,t;let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(s=>aw(s,r)):aw(i,r)}});function aw(e,r){return e.value===void 0&&(e.value=r.defaultValue),e}var tq=I("$ZodPrefault",(e,r)=>{ee.init(e,r),e._zod.optin="defaulted",M(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>(n.direction==="backward"||t.value===void 0&&(t.value=r.defaultValue),r.innerType._zod.run(t,n))}),nq=I("$ZodNonOptional",(e,r)=>{ee.init(e,r),M(e,"values",t=>{let n=t.def.innerType._zod.values;return n?new Set([...n].filter(i=>i!==void 0)):void 0}),e._zod.parse=(t,n)=>{let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(s=>uw(s,e)):uw(i,e)}});function uw(e,r){return!e.issues.length&&e.value===void 0&&e.issues.push({code:"invalid_type",expected:"nonoptional",input:e.value,inst:r}),e}function cw(e,r,t,n){return r.issues.length?(e.value=t.catchValue({...r,value:e.value,error:{issues:r.issues.map(i=>yr(i,n,He()))},input:e.value}),e):(e.value=r.value,r.memo&&(e.memo=!0),e)}var oq=I("$ZodCatch",(e,r)=>{ee.init(e,r),M(e,"optin",t=>t.def.innerType._zod.optin==="defaulted"?"defaulted":"optional"),M(e,"optout",t=>t.def.innerType._zod.optout),M(e,"values",t=>t.def.innerType._zod.values),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);let i=r.innerType._zod.run({value:t.value,issues:[]},n);return i instanceof Promise?i.then(s=>cw(t,s,r,n)):cw(t,i,r,n)}});var iq=I("$ZodPipe",(e,r)=>{ee.init(e,r),M(e,"values",t=>t.def.in._zod.values),M(e,"optin",t=>t.def.in._zod.optin),M(e,"optout",t=>t.def.out._zod.optout),M(e,"propValues",t=>t.def.in._zod.propValues),e._zod.parse=(t,n)=>{if(n.direction==="backward"){let s=r.out._zod.run(t,n);return s instanceof Promise?s.then(l=>gi(l,r.in,n)):gi(s,r.in,n)}let i=r.in._zod.run(t,n);return i instanceof Promise?i.then(s=>gi(s,r.out,n)):gi(i,r.out,n)}});function gi(e,r,t){return e.issues.some(n=>n.code!=="unrecognized_keys")?(e.aborted=!0,e):r._zod.run({value:e.value,issues:e.issues},t)}var sq=I("$ZodReadonly",(e,r)=>{ee.init(e,r),M(e,"propValues",t=>t.def.innerType._zod.propValues),M(e,"values",t=>t.def.innerType._zod.values),M(e,"optin",t=>t.def.innerType?._zod?.optin),M(e,"optout",t=>t.def.innerType?._zod?.optout),e._zod.parse=(t,n)=>{if(n.direction==="backward")return r.innerType._zod.run(t,n);let i=r.innerType._zod.run(t,n);return i instanceof Promise?i.then(lw):lw(i)}});function lw(e){return e.memo||(e.value=Object.freeze(e.value)),e}var aq=I("$ZodCustom",(e,r)=>{de.init(e,r),ee.init(e,r),e._zod.parse=(t,n)=>t,e._zod.check=t=>{let n=t.value,i=r.fn(n);if(i instanceof Promise)return i.then(s=>fw(s,t,n,e));fw(i,t,n,e)}});function fw(e,r,t,n){if(!e){let i={code:"custom",input:t,inst:n,path:[...n._zod.def.path??[]],continue:!n._zod.def.abort};n._zod.def.params&&(i.params=n._zod.def.params),r.issues.push(Lt(i))}}var hc=class extends Error{constructor(){super("Cannot parse a reference cycle that closes through a transform"),this.name="ZodCyclicError"}},gc="~memo",uq=[];function cq(e){return e!==null&&typeof e=="object"}function vc(e){return e.map(r=>r.path?{...r,path:r.path.slice()}:{...r})}var lq=new WeakMap,zn=0,Ai=1,Fn=2;function Ii(e,r,t){let n=lq.get(e);if(n!==void 0)return n?Fn:zn;if(r.has(e))return Fn;r.add(e);let i=zn,s=c=>{if(i!==Fn&&c?._zod){let f=Ii(c,r,t);f>i&&(i=f)}},l=(c,f)=>{let m=zn;for(let p of Reflect.ownKeys(c)){let d=Object.getOwnPropertyDescriptor(c,p);if(f&&!d.enumerable)continue;let g=d.get?Ai:d.value?._zod?Ii(d.value,r,t):zn;g>m&&(m=g)}return m},u=c=>{c>i&&(i=c)},o=e._zod.def,a=o.type;switch(a){case"object":{let c=On(o);u(c?l(c,!0):Ai),s(o.catchall);break}case"array":s(o.element);break;case"tuple":for(let c of o.items)s(c);s(o.rest);break;case"record":case"map":s(o.keyType),s(o.valueType);break;case"set":s(o.valueType);break;case"union":for(let c of o.options)s(c);break;case"intersection":s(o.left),s(o.right);break;case"optional":case"nullable":case"default":case"prefault":case"catch":case"readonly":case"nonoptional":case"promise":case"success":s(o.innerType);break;case"pipe":s(o.in),s(o.out);break;case"function":s(o.input),s(o.output);break;case"lazy":{let c=o._cachedInner??(t?e._zod.innerType:void 0);u(c?Ii(c,r,!1):Ai);break}case"template_literal":case"string":case"number":case"int":case"boolean":case"bigint":case"symbol":case"undefined":case"null":case"void":case"never":case"any":case"unknown":case"date":case"nan":case"enum":case"literal":case"file":case"transform":case"custom":break;default:for(let c in o){let f=Object.getOwnPropertyDescriptor(o,c);if(!f||f.get)continue;let m=f.value;if(!(!m||typeof m!="object")){if(m._zod)s(m);else if(Array.isArray(m))for(let p of m)s(p)}}}return r.delete(e),YK(e,i)}function YK(e,r){return r!==Ai&&lq.set(e,r===Fn),r}function jK(e,r){let t=e.buckets.get(r);return t||(t=new WeakMap,e.buckets.set(r,t)),t}var qi,Pi=[],eJ={alloc(e,r,t){let n=qi;if(!n)return t;qi=void 0;let i={value:t,issues:null};return n.set(r.value,i),Pi.push(i),t},guard(e){var r;(r=e._zod).deferred??(r.deferred=[]),e._zod.deferred.push(()=>{let t=e._zod.parse,n=(i,s)=>{if(s.direction!=="backward"&&rJ(s,i.value))throw new hc;return t(i,s)};e._zod.parse=n,e._zod.run===t&&(e._zod.run=n)})},attach(e){var r;let t,n=!1,i,s;(r=e._zod).deferred??(r.deferred=[]),e._zod.deferred.push(()=>{let l=e._zod.parse,u=(o,a)=>{if(t===void 0){let v=Ii(e,new Set,!1);if(v===zn)return e._zod.parse=l,e._zod.run===u&&(e._zod.run=l),l(o,a);v===Fn||n?t=!0:n=!0}let c=o.value;if(!cq(c))return l(o,a);let f=a[gc];f||(f={buckets:new WeakMap,backEdges:void 0},a[gc]=f);let m;i===a?m=s:(m=jK(f,e),i=a,s=m);let p=m.get(c);if(p)return o.value=p.value,p.issues?p.issues.length&&o.issues.push(...vc(p.issues)):(o.memo=!0,f.backEdges??(f.backEdges=new WeakSet),f.backEdges.add(p.value)),o;qi=m;let d=Pi.length,g=l(o,a);qi=void 0;let y=Pi.length>d?Pi.pop():void 0;return g instanceof Promise?g.then(v=>(y&&(y.issues=v.issues.length?vc(v.issues):uq),v)):(y&&(y.issues=g.issues.length?vc(g.issues):uq),g)};e._zod.parse=u,e._zod.run===l&&(e._zod.run=u)})}};function fq(){return eJ}function rJ(e,r){let t=e[gc]?.backEdges;return t!==void 0&&cq(r)&&t.has(r)}var tJ=()=>{let e={string:{unit:"characters",verb:"to have"},file:{unit:"bytes",verb:"to have"},array:{unit:"items",verb:"to have"},set:{unit:"items",verb:"to have"},map:{unit:"entries",verb:"to have"}};function r(s){return e[s]??null}let t={regex:"input",email:"email address",url:"URL",emoji:"emoji",uuid:"UUID",uuidv4:"UUIDv4",uuidv6:"UUIDv6",nanoid:"nanoid",guid:"GUID",cuid:"cuid",cuid2:"cuid2",ulid:"ULID",xid:"XID",ksuid:"KSUID",datetime:"ISO datetime",date:"ISO date",time:"ISO time",duration:"ISO duration",ipv4:"IPv4 address",ipv6:"IPv6 address",mac:"MAC address",cidrv4:"IPv4 range",cidrv6:"IPv6 range",base64:"base64-encoded string",base64url:"base64url-encoded string",json_string:"JSON string",e164:"E.164 number",currency_code:"currency code",credit_card:"credit card number",iban:"IBAN",jwt:"JWT",template_literal:"input"},n={nan:"NaN"};function i(s,l){return s==="number"&&typeof l=="number"&&!Number.isFinite(l)?String(l):n[s]??s}return s=>{switch(s.code){case"invalid_type":{let l=i(s.expected),u=Qu(s.input),o=i(u,s.input);return`Invalid input: expected ${l}, received ${o}`}case"invalid_value":return s.values.length===1?`Invalid input: expected ${ii(s.values[0])}`:`Invalid option: expected one of ${ni(s.values,"|")}`;case"too_big":{let l=s.exact?"exactly ":s.inclusive?"<=":"<",u=r(s.origin);return u?`Too big: expected ${s.origin??"value"} to have ${l}${s.maximum.toString()} ${u.unit??"elements"}`:`Too big: expected ${s.origin??"value"} to be ${l}${s.maximum.toString()}`}case"too_small":{let l=s.exact?"exactly ":s.inclusive?">=":">",u=r(s.origin);return u?`Too small: expected ${s.origin} to have ${l}${s.minimum.toString()} ${u.unit}`:`Too small: expected ${s.origin} to be ${l}${s.minimum.toString()}`}case"invalid_format":{let l=s;return l.format==="starts_with"?`Invalid string: must start with "${l.prefix}"`:l.format==="ends_with"?`Invalid string: must end with "${l.suffix}"`:l.format==="includes"?`Invalid string: must include "${l.includes}"`:l.format==="regex"?`Invalid string: must match pattern ${l.pattern}`:`Invalid ${t[l.format]??s.format}`}case"not_multiple_of":return`Invalid number: must be a multiple of ${s.divisor}`;case"unrecognized_keys":return`Unrecognized key${s.keys.length>1?"s":""}: ${ni(s.keys,", ")}`;case"invalid_key":return`Invalid key in ${s.origin}`;case"invalid_union":return s.options&&Array.isArray(s.options)&&s.options.length>0?`Invalid discriminator value. Expected ${s.options.map(u=>`'${u}'`).join(" | ")}`:s.inclusive===!1?"Invalid input: more than one option matched":"Invalid input";case"invalid_element":return`Invalid value in ${s.origin}`;default:return"Invalid input"}}};function mq(){return{localeError:tJ()}}var pq;var yc=class{constructor(){this._map=new WeakMap,this._idmap=new Map}add(r,...t){let n=t[0];return this._map.set(r,n),n&&typeof n=="object"&&"id"in n&&this._idmap.set(n.id,r),this}clear(){return this._map=new WeakMap,this._idmap=new Map,this}remove(r){let t=this._map.get(r);return t&&typeof t=="object"&&"id"in t&&this._idmap.delete(t.id),this._map.delete(r),this}get(r){let t=r._zod.parent;if(t){let n={...this.get(t)??{}};delete n.id;let i={...n,...this._map.get(r)};return Object.keys(i).length?i:void 0}return this._map.get(r)}has(r){return this._map.has(r)}};function nJ(){return new yc}(pq=globalThis).__zod_globalRegistry??(pq.__zod_globalRegistry=nJ());var ct=globalThis.__zod_globalRegistry;function dq(e){return e.checks&&(e.checks=[...e.checks]),e}function vq(e,r){return new e(dq({type:"string",...T(r)}))}function hq(e,r){return new e({type:"string",format:"email",check:"string_format",abort:!1,...T(r)})}function gq(e,r){return new e({type:"string",format:"guid",check:"string_format",abort:!1,...T(r)})}function yq(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,...T(r)})}function bq(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v4",...T(r)})}function _q(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v6",...T(r)})}function wq(e,r){return new e({type:"string",format:"uuid",check:"string_format",abort:!1,version:"v7",...T(r)})}function qq(e,r){return new e({type:"string",format:"url",check:"string_format",abort:!1,...T(r)})}function Pq(e,r){return new e({type:"string",format:"emoji",check:"string_format",abort:!1,...T(r)})}function Aq(e,r){return new e({type:"string",format:"nanoid",check:"string_format",abort:!1,...T(r)})}function Iq(e,r){return new e({type:"string",format:"cuid",check:"string_format",abort:!1,...T(r)})}function Eq(e,r){return new e({type:"string",format:"cuid2",check:"string_format",abort:!1,...T(r)})}function Oq(e,r){return new e({type:"string",format:"ulid",check:"string_format",abort:!1,...T(r)})}function Nq(e,r){return new e({type:"string",format:"xid",check:"string_format",abort:!1,...T(r)})}function kq(e,r){return new e({type:"string",format:"ksuid",check:"string_format",abort:!1,...T(r)})}function Tq(e,r){return new e({type:"string",format:"ipv4",check:"string_format",abort:!1,...T(r)})}function Sq(e,r){return new e({type:"string",format:"ipv6",check:"string_format",abort:!1,...T(r)})}function $q(e,r){return new e({type:"string",format:"cidrv4",check:"string_format",abort:!1,...T(r)})}function Lq(e,r){return new e({type:"string",format:"cidrv6",check:"string_format",abort:!1,...T(r)})}function zq(e,r){return new e({type:"string",format:"base64",check:"string_format",abort:!1,...T(r)})}function Fq(e,r){return new e({type:"string",format:"base64url",check:"string_format",abort:!1,...T(r)})}function xq(e,r){return new e({type:"string",format:"e164",check:"string_format",abort:!1,...T(r)})}function Rq(e,r){return new e({type:"string",format:"jwt",check:"string_format",abort:!1,...T(r)})}function Cq(e,r){return new e({type:"string",format:"datetime",check:"string_format",offset:!1,local:!1,precision:null,...T(r)})}function Zq(e,r){return new e({type:"string",format:"date",check:"string_format",...T(r)})}function Dq(e,r){return new e({type:"string",format:"time",check:"string_format",precision:null,...T(r)})}function Mq(e,r){return new e({type:"string",format:"duration",check:"string_format",...T(r)})}function Bq(e,r){return new e(dq({type:"number",checks:[],...T(r)}))}function Uq(e,r){return new e({type:"number",check:"number_format",abort:!1,format:"safeint",...T(r)})}function Hq(e,r){return new e({type:"boolean",...T(r)})}function Vq(e){return new e({type:"unknown"})}function Gq(e,r){return new e({type:"never",...T(r)})}function Ei(e,r){return new uc({check:"less_than",...T(r),value:e,inclusive:!1})}function xn(e,r){return new uc({check:"less_than",...T(r),value:e,inclusive:!0})}function Oi(e,r){return new cc({check:"greater_than",...T(r),value:e,inclusive:!1})}function Rn(e,r){return new cc({check:"greater_than",...T(r),value:e,inclusive:!0})}function Ni(e,r){return new Z_({check:"multiple_of",...T(r),value:e})}function ki(e,r){return new M_({check:"max_length",...T(r),maximum:e})}function Ft(e,r){return new B_({check:"min_length",...T(r),minimum:e})}function Ti(e,r){return new U_({check:"length_equals",...T(r),length:e})}function bc(e,r){return new H_({check:"string_format",format:"regex",...T(r),pattern:e})}function _c(e){return new V_({check:"string_format",format:"lowercase",...T(e)})}function wc(e){return new G_({check:"string_format",format:"uppercase",...T(e)})}function qc(e,r){return new W_({check:"string_format",format:"includes",...T(r),includes:e})}function Pc(e,r){return new K_({check:"string_format",format:"starts_with",...T(r),prefix:e})}function Ac(e,r){return new J_({check:"string_format",format:"ends_with",...T(r),suffix:e})}function Mr(e){return new X_({check:"overwrite",tx:e})}function Ic(e){return Mr(r=>r.normalize(e))}function Ec(){return Mr(e=>e.trim())}function Oc(){return Mr(e=>e.toLowerCase())}function Nc(){return Mr(e=>e.toUpperCase())}function kc(){return Mr(e=>Gu(e))}function Wq(e,r,t){return new e({type:"array",element:r,...T(t)})}function Kq(e,r,t){return new e({type:"custom",check:"custom",fn:r,...T(t)})}function Jq(e,r){let t=oJ(n=>(n.addIssue=i=>{if(typeof i=="string")n.issues.push(Lt(i,n.value,t._zod.def));else{let s=i;s.fatal&&(s.continue=!1),s.code??(s.code="custom"),"input"in s||(s.input=n.value),s.inst??(s.inst=t),s.continue??(s.continue=!t._zod.def.abort),n.issues.push(Lt(s))}},e(n.value,n)),r);return t}function oJ(e,r){let t=new de({check:"custom",...T(r)});return t._zod.check=e,t}function Cn(e,...r){for(let t of r)for(let n of Reflect.ownKeys(t))Object.prototype.propertyIsEnumerable.call(t,n)&&Me(e,n,t[n]);return e}function Sc(e){let r=e?.target??"draft-2020-12";return r==="draft-4"&&(r="draft-04"),r==="draft-7"&&(r="draft-07"),{processors:e.processors??{},metadataRegistry:e?.metadata??ct,target:r,unrepresentable:e?.unrepresentable??"throw",override:e?.override??(()=>{}),io:e?.io??"output",counter:0,seen:new Map,sharedDefsExtractedFor:void 0,sharedEmitDoneFor:void 0,cycles:e?.cycles??"ref",reused:e?.reused??"inline",intersections:[],deferred:[],external:e?.external??void 0}}function lt(e,r,t,n,i){let s=typeof r.unrepresentable=="function"?r.unrepresentable({zodSchema:e,path:n.path,message:i}):r.unrepresentable;if(s==="any")return!1;if(s===void 0||s==="throw")throw new Error(i);return Object.assign(t,s),!0}function ue(e,r,t={path:[],schemaPath:[]}){var n;let i=e._zod.def,s=r.seen.get(e);if(s)return s.count++,t.schemaPath.includes(e)&&(s.cycle=t.path),s.schema;let l={schema:{},count:1,cycle:void 0,path:t.path};r.seen.set(e,l),r.sharedDefsExtractedFor=void 0,r.sharedEmitDoneFor=void 0;let u=e._zod.toJSONSchema?.();if(u)l.schema=u;else{let c={...t,schemaPath:[...t.schemaPath,e],path:t.path};if(e._zod.processJSONSchema)e._zod.processJSONSchema(r,l.schema,c);else{let m=l.schema,p=r.processors[i.type];if(!p)throw new Error(`[toJSONSchema]: Non-representable type encountered: ${i.type}`);p(e,r,m,c)}let f=e._zod.parent;f&&(l.ref||(l.ref=f),ue(f,r,c),r.seen.get(f).isParent=!0)}let o=r.metadataRegistry.get(e);return o&&Cn(l.schema,o),r.io==="input"&&ye(e)&&(delete l.schema.examples,delete l.schema.default),r.io==="input"&&"_prefault"in l.schema&&((n=l.schema).default??(n.default=l.schema._prefault)),delete l.schema._prefault,r.seen.get(e).schema}function Xq(e){return e.replace(/~/g,"~0").replace(/\//g,"~1")}function $c(e,r){let t=e.seen.get(r);if(!t)throw new Error("Unprocessed schema. This is a bug in Zod.");if(e.external&&e.sharedDefsExtractedFor===e.external)return;let n=new Map;for(let l of e.seen.entries()){let u=e.metadataRegistry.get(l[0])?.id;if(u){let o=n.get(u);if(o&&o!==l[0])throw new Error(`Duplicate schema id "${u}" detected during JSON Schema conversion. Two different schemas cannot share the same id when converted together.`);n.set(u,l[0])}}let i=l=>{let u=e.target==="draft-2020-12"?"$defs":"definitions";if(e.external){let f=e.external.registry.get(l[0])?.id,m=e.external.uri??(d=>d);if(f)return{ref:m(f)};let p=l[1].defId??l[1].schema.id??`schema${e.counter++}`;return l[1].defId=p,{defId:p,ref:`${m("__shared")}#/${u}/${Xq(p)}`}}let o="#",a=`${o}/${u}/`;if(l[1]===t&&!l[1].schema.id)return{ref:o};let c=l[1].schema.id??`__schema${e.counter++}`;return{defId:c,ref:a+Xq(c)}},s=l=>{if(l[1].schema.$ref)return;let u=l[1],{ref:o,defId:a}=i(l);u.def={...u.schema},a&&(u.defId=a);let c=u.schema;for(let f in c)delete c[f];c.$ref=o};if(e.cycles==="throw")for(let l of e.seen.entries()){let u=l[1];if(u.cycle)throw new Error(`Cycle detected: #/${u.cycle?.join("/")}/<root>

Set the \`cycles\` parameter to \`"ref"\` to resolve cyclical schemas with defs.`)}for(let l of e.seen.entries()){let u=l[1];if(r===l[0]){s(l);continue}if(e.external){let a=e.external.registry.get(l[0])?.id;if(r!==l[0]&&a){s(l);continue}}if(e.metadataRegistry.get(l[0])?.id){s(l);continue}if(u.cycle){s(l);continue}u.count>1&&e.reused==="ref"&&s(l)}e.external&&(e.sharedDefsExtractedFor=e.external)}function jq(e){let r=e.anyOf;if(!Array.isArray(r)||r.length===0||e.type!==void 0)return;let t=[];for(let n of r){if(!n||typeof n!="object")return;jq(n);let i=Object.keys(n);if(i.length!==1||i[0]!=="type")return;let s=n.type;for(let l of Array.isArray(s)?s:[s]){if(typeof l!="string")return;t.includes(l)||t.push(l)}}delete e.anyOf,e.type=t.length===1?t[0]:t}var eP=new Set(["type","properties","required","additionalProperties"]),Qq=["oneOf","anyOf"];function Yq(e){let r=e.additionalProperties;return r===void 0||r===!1||typeof r!="object"||r===null?null:Object.keys(r).length?r:null}function Tc(e){let r=[];for(let s of e){if(typeof s!="object"||s.type!=="object")return null;for(let l in s)if(!eP.has(l))return null;r.push(s)}let t={},n=new Set;for(let s of r){for(let l in s.properties){if(Object.prototype.hasOwnProperty.call(t,l))continue;let u=[];for(let a of r){let c=a.properties?.[l]??Yq(a);c!=null&&(u.some(f=>JSON.stringify(f)===JSON.stringify(c))||u.push(c))}let o=u.length===1?u[0]:Tc(u)??{allOf:u};Me(t,l,o)}for(let l of s.required??[])n.add(l)}let i={type:"object",properties:t};if(n.size&&(i.required=[...n]),r.every(s=>s.additionalProperties===!1))i.additionalProperties=!1;else{let s=[];for(let l of r){let u=Yq(l);u&&!s.some(o=>JSON.stringify(o)===JSON.stringify(u))&&s.push(u)}s.length===1?i.additionalProperties=s[0]:s.length>1&&(i.additionalProperties={allOf:s})}return i}function iJ(e){let r=e.allOf;if(!Array.isArray(r)||r.length<2)return;for(let i of eP)if(i in e)return;let t=r.filter(i=>Qq.some(s=>Array.isArray(i[s]))),n=null;if(!t.length)n=Tc(r);else{let i=t[0],s=Qq.find(o=>Array.isArray(i[o]));if(Object.keys(i).length!==1)return;let l=r.filter(o=>o!==i),u=i[s].map(o=>Tc([...l,o]));if(u.some(o=>!o))return;n={[s]:u}}n&&(delete e.allOf,Cn(e,n))}function Lc(e,r){let t=e.seen.get(r);if(!t)throw new Error("Unprocessed schema. This is a bug in Zod.");let n=u=>{let o=e.seen.get(u);if(o.ref===null)return;let a=o.def??o.schema,c={...a},f=o.ref;if(o.ref=null,f){n(f);let p=e.seen.get(f),d=p.schema;if(d.$ref&&(e.target==="draft-07"||e.target==="draft-04"||e.target==="openapi-3.0")?(a.allOf=a.allOf??[],a.allOf.push(d)):Cn(a,d),Cn(a,c),u._zod.parent===f)for(let y in a)y==="$ref"||y==="allOf"||y in c||delete a[y];if(d.$ref&&p.def)for(let y in a)y==="$ref"||y==="allOf"||y in p.def&&JSON.stringify(a[y])===JSON.stringify(p.def[y])&&delete a[y]}let m=u._zod.parent;if(m&&m!==f){n(m);let p=e.seen.get(m);if(p?.schema.$ref&&(a.$ref=p.schema.$ref,p.def))for(let d in a)d==="$ref"||d==="allOf"||d in p.def&&JSON.stringify(a[d])===JSON.stringify(p.def[d])&&delete a[d]}e.override({zodSchema:u,jsonSchema:a,path:o.path??[]})};if(!e.external||e.sharedEmitDoneFor!==e.external){for(let u of[...e.seen.entries()].reverse())n(u[0]);if(e.target!=="openapi-3.0")for(let u of e.seen.entries())jq(u[1].def??u[1].schema);for(let u of e.deferred)u();if(e.intersections.length){let u=new Map;for(let o of e.seen.values())for(let a of[o.schema,o.def]){let c=a?.allOf;if(!Array.isArray(c))continue;let f=u.get(c);f?f.push(a):u.set(c,[a])}for(let o of e.intersections)for(let a of u.get(o)??[])iJ(a)}}let i={};if(e.target==="draft-2020-12"?i.$schema="https://json-schema.org/draft/2020-12/schema":e.target==="draft-07"?i.$schema="http://json-schema.org/draft-07/schema#":e.target==="draft-04"?i.$schema="http://json-schema.org/draft-04/schema#":e.target,e.external?.uri){let u=e.external.registry.get(r)?.id;if(!u)throw new Error("Schema is missing an `id` property");i.$id=e.external.uri(u)}Cn(i,t.defId?t.schema:t.def??t.schema);let s=e.metadataRegistry.get(r)?.id;s!==void 0&&i.id===s&&delete i.id;let l=e.external?.defs??{};if(!e.external||e.sharedEmitDoneFor!==e.external)for(let u of e.seen.entries()){let o=u[1];o.def&&o.defId&&(o.def.id===o.defId&&delete o.def.id,Me(l,o.defId,o.def))}e.external&&(e.sharedEmitDoneFor=e.external),e.external||Object.keys(l).length>0&&(e.target==="draft-2020-12"?i.$defs=l:i.definitions=l);try{let u=JSON.parse(JSON.stringify(i));return Object.defineProperty(u,"~standard",{value:{...r["~standard"],jsonSchema:{input:Zn(r,"input",e.processors),output:Zn(r,"output",e.processors)}},enumerable:!1,writable:!1}),u}catch{throw new Error("Error converting schema to JSON.")}}function ye(e,r){let t=r??{seen:new Set};if(t.seen.has(e))return!1;t.seen.add(e);let n=e._zod.def;if(n.type==="transform")return!0;if(n.type==="array")return ye(n.element,t);if(n.type==="set")return ye(n.valueType,t);if(n.type==="lazy")return ye(n.getter(),t);if(n.type==="promise"||n.type==="optional"||n.type==="nonoptional"||n.type==="nullable"||n.type==="readonly"||n.type==="default"||n.type==="prefault"||n.type==="catch")return ye(n.innerType,t);if(n.type==="intersection")return ye(n.left,t)||ye(n.right,t);if(n.type==="record"||n.type==="map")return ye(n.keyType,t)||ye(n.valueType,t);if(n.type==="pipe")return e._zod.traits.has("$ZodCodec")?!0:ye(n.in,t)||ye(n.out,t);if(n.type==="object"){for(let i in n.shape)if(ye(n.shape[i],t))return!0;return!1}if(n.type==="union"){for(let i of n.options)if(ye(i,t))return!0;return!1}if(n.type==="tuple"){for(let i of n.items)if(ye(i,t))return!0;return!!(n.rest&&ye(n.rest,t))}return!1}var rP=(e,r={})=>t=>{let n=Sc({...t,processors:r});return ue(e,n),$c(n,e),Lc(n,e)},Zn=(e,r,t={})=>n=>{let{libraryOptions:i,target:s}=n??{},l=Sc({...i??{},target:s,io:r,processors:t});return ue(e,l),$c(l,e),Lc(l,e)};var xt=(e,r,t)=>{(e[r]===void 0||t>e[r])&&(e[r]=t)},Rt=(e,r,t)=>{(e[r]===void 0||t<e[r])&&(e[r]=t)},tP=(e,r)=>{xt(e,"minimum",r),Rt(e,"maximum",r)},sP=(e,r)=>{e.multipleOf??(e.multipleOf=[]),e.multipleOf.includes(r)||e.multipleOf.push(r)},aP=(e,r)=>{e.patterns??(e.patterns=new Set),e.patterns.add(r)},uP=(e,r)=>{e.mime=e.mime?e.mime.filter(t=>r.includes(t)):[...r]},cP=(e,r)=>{e.format=r,r.includes("int")&&(e.isInt=!0)},nP=(e,r)=>xt(e,"minimum",r.minimum),oP=(e,r)=>Rt(e,"maximum",r.maximum),iP=e=>(r,t)=>{cP(r,t.format);let[n,i]=e[t.format];xt(r,"minimum",n),Rt(r,"maximum",i)},sJ={greater_than:(e,r)=>xt(e,r.inclusive?"minimum":"exclusiveMinimum",r.value),less_than:(e,r)=>Rt(e,r.inclusive?"maximum":"exclusiveMaximum",r.value),multiple_of:(e,r)=>sP(e,r.value),number_format:iP(Nn),bigint_format:iP(si),min_length:nP,max_length:oP,length_equals:(e,r)=>tP(e,r.length),min_size:nP,max_size:oP,size_equals:(e,r)=>tP(e,r.size),string_format:(e,r)=>{cP(e,r.format),r.pattern&&aP(e,r.pattern),(r.format==="base64"||r.format==="base64url")&&(e.contentEncoding=r.format),(r.local||r.precision===-1)&&(e.laxFormat=!0)},mime_type:(e,r)=>uP(e,r.mime)};function ze(e){let r={},t=e._zod.def,n=e._zod.traits.has("$ZodCheck")?[e,...t.checks??[]]:t.checks??[];for(let s of n)sJ[s._zod.def.check]?.(r,s._zod.def);let i=e._zod.bag;i.minimum!==void 0&&xt(r,"minimum",i.minimum),i.exclusiveMinimum!==void 0&&xt(r,"exclusiveMinimum",i.exclusiveMinimum),i.maximum!==void 0&&Rt(r,"maximum",i.maximum),i.exclusiveMaximum!==void 0&&Rt(r,"exclusiveMaximum",i.exclusiveMaximum),i.multipleOf!==void 0&&sP(r,i.multipleOf),i.format!==void 0&&(r.format??(r.format=i.format),i.format.includes("int")&&(r.isInt=!0)),i.mime&&uP(r,i.mime);for(let s of i.patterns??[])aP(r,s);return r}var aJ={guid:"uuid",url:"uri",datetime:"date-time",json_string:"json-string",regex:""},uJ=new Map([[mc,O_],[wi,N_]]),cJ=e=>uJ.get(e)??e,lP=(e,r,t,n)=>{let i=t;i.type="string";let{minimum:s,maximum:l,format:u,patterns:o,contentEncoding:a,laxFormat:c}=ze(e);if(typeof s=="number"&&(i.minLength=s),typeof l=="number"&&(i.maxLength=l),u&&(i.format=aJ[u]??u,i.format===""&&delete i.format,(u==="time"||c)&&delete i.format),a&&(i.contentEncoding=a),o&&o.size>0){let f=[...o].map(cJ);f.length===1?i.pattern=f[0].source:f.length>1&&(i.allOf=[...f.map(m=>({...r.target==="draft-07"||r.target==="draft-04"||r.target==="openapi-3.0"?{type:"string"}:{},pattern:m.source}))])}},fP=(e,r,t,n)=>{let i=t,{minimum:s,maximum:l,multipleOf:u,exclusiveMaximum:o,exclusiveMinimum:a,isInt:c}=ze(e);i.type=c?"integer":"number";let f=typeof a=="number"&&a>=(s??Number.NEGATIVE_INFINITY),m=typeof o=="number"&&o<=(l??Number.POSITIVE_INFINITY),p=r.target==="draft-04"||r.target==="openapi-3.0";if(f?p?(i.minimum=a,i.exclusiveMinimum=!0):i.exclusiveMinimum=a:typeof s=="number"&&(i.minimum=s),m?p?(i.maximum=o,i.exclusiveMaximum=!0):i.exclusiveMaximum=o:typeof l=="number"&&(i.maximum=l),u){let d=new Set;for(let v of u)Number.isFinite(v)&&v!==0?d.add(Math.abs(v)):lt(e,r,i,n,`A multipleOf divisor of ${v} cannot be represented in JSON Schema`);let[g,...y]=d;g!==void 0&&(i.multipleOf=g),y.length&&(i.allOf=[...i.allOf??[],...y.map(v=>({multipleOf:v}))])}},mP=(e,r,t,n)=>{t.type="boolean"};var pP=(e,r,t,n)=>{t.not={}};var dP=(e,r,t,n)=>{};var vP=(e,r,t,n)=>{let i=e._zod.def,s=St(i.entries);if(s.length===0){t.not={};return}s.every(l=>typeof l=="number")&&(t.type="number"),s.every(l=>typeof l=="string")&&(t.type="string"),t.enum=s};var hP=(e,r,t,n)=>{lt(e,r,t,n,"Custom types cannot be represented in JSON Schema")};var gP=(e,r,t,n)=>{lt(e,r,t,n,"Transforms cannot be represented in JSON Schema")};var yP=(e,r,t,n)=>{let i=t,s=e._zod.def,{minimum:l,maximum:u}=ze(e);typeof l=="number"&&(i.minItems=l),typeof u=="number"&&(i.maxItems=u),i.type="array",i.items=ue(s.element,r,{...n,path:[...n.path,"items"]})};function Si(e){let r=e._zod.def;return r.type==="pipe"&&r.in._zod.traits.has("$ZodTransform")?Si(r.out):r.type==="catch"?Si(r.innerType):e._zod.optin}var bP=(e,r,t,n)=>{let i=t,s=e._zod.def,l=s.shape;if(Object.getOwnPropertySymbols(l).length&&lt(e,r,i,n,"Symbol keys cannot be represented in JSON Schema"))return;i.type="object",i.properties={};for(let a in l)Me(i.properties,a,ue(l[a],r,{...n,path:[...n.path,"properties",a]}));let o=[];for(let a of Object.keys(l)){let c=s.shape[a];(r.io==="input"?Si(c)===void 0:c._zod.optout===void 0)&&o.push(a)}o.length>0&&(i.required=o),s.catchall?._zod.def.type==="never"?i.additionalProperties=!1:s.catchall?s.catchall&&(i.additionalProperties=ue(s.catchall,r,{...n,path:[...n.path,"additionalProperties"]})):r.io==="output"&&(i.additionalProperties=!1)},_P=(e,r,t,n)=>{let i=e._zod.def,s=i.inclusive===!1,l=i.options.map((u,o)=>ue(u,r,{...n,path:[...n.path,s?"oneOf":"anyOf",o]}));s?t.oneOf=l:t.anyOf=l},wP=(e,r,t,n)=>{let i=e._zod.def,s=ue(i.left,r,{...n,path:[...n.path,"allOf",0]}),l=ue(i.right,r,{...n,path:[...n.path,"allOf",1]}),u=a=>"allOf"in a&&Object.keys(a).length===1,o=[...u(s)?s.allOf:[s],...u(l)?l.allOf:[l]];t.allOf=o,r.intersections.push(o)},qP=(e,r,t,n)=>{let i=t,s=e._zod.def;i.type="array";let l=r.target==="draft-2020-12"?"prefixItems":"items",u=r.target==="draft-2020-12"||r.target==="openapi-3.0"?"items":"additionalItems",o=s.items.map((g,y)=>ue(g,r,{...n,path:[...n.path,l,y]})),a=s.rest?ue(s.rest,r,{...n,path:[...n.path,u,...r.target==="openapi-3.0"?[s.items.length]:[]]}):null,c=s.items.length;for(;c>0;){let g=s.items[c-1];if(!(r.io==="input"?Si(g)!==void 0:g._zod.optout==="optional"))break;c--}let f=s.items.length,m=!s.rest;r.target==="draft-2020-12"?(i.prefixItems=o,m?i.items=!1:a&&(i.items=a),c>0&&(i.minItems=c),m&&(i.maxItems=f)):r.target==="openapi-3.0"?(i.items={anyOf:o},a&&i.items.anyOf.push(a),c>0&&(i.minItems=c),m&&(i.maxItems=f)):(i.items=o,m?i.additionalItems=!1:a&&(i.additionalItems=a),c>0&&(i.minItems=c),m&&(i.maxItems=f));let{minimum:p,maximum:d}=ze(e);typeof p=="number"&&(i.minItems=p),typeof d=="number"&&(i.maxItems=d)};var PP=(e,r,t,n)=>{let i=e._zod.def,s=ue(i.innerType,r,n),l=r.seen.get(e);r.target==="openapi-3.0"?(l.ref=i.innerType,t.nullable=!0):t.anyOf=[s,{type:"null"}]},AP=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType},zc=Symbol();function IP(e,r,t,n,i){let s=!1,l=JSON.stringify(e,(u,o)=>typeof o!="bigint"?o:(s=!0,null));return s?(lt(r,t,n,i,"BigInt defaults cannot be represented in JSON Schema"),zc):JSON.parse(l)}var EP=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType;let l=IP(i.defaultValue,e,r,t,n);l!==zc&&(t.default=l)},OP=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);if(s.ref=i.innerType,r.io!=="input")return;let l=IP(i.defaultValue,e,r,t,n);l!==zc&&(t._prefault=l)},NP=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType;let l;try{l=i.catchValue(void 0)}catch{lt(e,r,t,n,"Dynamic catch values are not supported in JSON Schema");return}t.default=l},kP=(e,r,t,n)=>{let i=e._zod.def,s=i.in._zod.traits.has("$ZodTransform"),l=r.io==="input"?s?i.out:i.in:i.out;ue(l,r,n);let u=r.seen.get(e);u.ref=l},TP=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType,t.readOnly=!0};var Fc=(e,r,t,n)=>{let i=e._zod.def;ue(i.innerType,r,n);let s=r.seen.get(e);s.ref=i.innerType};var SP=new WeakSet([Object.prototype,Error.prototype]);function $i(e,r,t){Object.defineProperty(e,r,{configurable:!0,enumerable:!1,get(){let n=t(this);return Object.defineProperty(this,r,{value:n,configurable:!0,writable:!0}),n},set(n){Object.defineProperty(this,r,{value:n,configurable:!0,writable:!0})}})}var gJ=(e,r)=>{e_.init(e,r),e.name="ZodError";let t=Object.getPrototypeOf(e);SP.has(t)||(SP.add(t),$i(t,"format",n=>i=>t_(n,i)),$i(t,"flatten",n=>i=>r_(n,i)),$i(t,"addIssue",n=>i=>{n.issues.push(i),n.message=JSON.stringify(n.issues,$t,2)}),$i(t,"addIssues",n=>i=>{n.issues.push(...i),n.message=JSON.stringify(n.issues,$t,2)}),Object.defineProperty(t,"isEmpty",{configurable:!0,enumerable:!1,get(){return this.issues.length===0}}))};var Ie=I("ZodError",gJ,void 0,{Parent:Error});var $P=fi(Ie),LP=mi(Ie),zP=pi(Ie),FP=di(Ie),xP=o_(Ie),RP=i_(Ie),CP=s_(Ie),ZP=a_(Ie),DP=u_(Ie),MP=c_(Ie),BP=l_(Ie),UP=f_(Ie);function bJ(){we.localeError||He(mq())}function zi(){we.memoizer||He({memoizer:fq()})}var ie=I("ZodType",(e,r)=>(bJ(),ee.init(e,r),e.def=r,e.type=r.type,e),{check(...e){let r=this.def;return this.clone($.mergeDefs(r,{checks:[...r.checks??[],...e.map(t=>typeof t=="function"?{_zod:{check:t,def:{check:"custom"},onattach:[]}}:t)]}),{parent:!0})},with(...e){return this.check(...e)},clone(e,r){return Be(this,e,r)},brand(){return this},register(e,r){return e.add(this,r),this},refine(e,r){return this.check(vX(e,r))},superRefine(e,r){return this.check(hX(e,r))},overwrite(e){return this.check(Mr(e))},optional(){return GP(this)},exactOptional(){return tX(this)},nullable(){return WP(this)},nullish(){return GP(WP(this))},nonoptional(e){return uX(this,e)},array(){return Ct(this)},or(e){return XJ([this,e])},and(e){return YJ(this,e)},transform(e){return KP(this,rX(e))},default(e){return iX(this,e)},prefault(e){return aX(this,e)},catch(e){return lX(this,e)},pipe(e){return KP(this,e)},readonly(){return pX(this)},describe(e){let r=this.clone();return ct.add(r,{description:e}),r},meta(...e){if(e.length===0)return ct.get(this);let r=this.clone();return ct.add(r,e[0]),r},isOptional(){return this.safeParse(void 0).success},isNullable(){return this.safeParse(null).success},apply(e,...r){return r.length===0?e(this):e(this,...r)},get"~standard"(){return $.hide(this,"~standard",{...fc(this),jsonSchema:{input:Zn(this,"input"),output:Zn(this,"output")}})},set"~standard"(e){$.own(this,"~standard",e)},parse:function e(r,t){return $P(this,r,t,{callee:e})},parseAsync:async function e(r,t){return await LP(this,r,t,{callee:e})},safeParse(e,r){return zP(this,e,r)},async safeParseAsync(e,r){return FP(this,e,r)},get spa(){return this?.safeParseAsync},set spa(e){$.own(this,"spa",e)},validate(e,r){return tc(this,e,r)},validateAsync(e,r){return nc(this,e,r)},encode:function e(r,t){return xP(this,r,t,{callee:e})},decode:function e(r,t){return RP(this,r,t,{callee:e})},encodeAsync:async function e(r,t){return await CP(this,r,t,{callee:e})},decodeAsync:async function e(r,t){return await ZP(this,r,t,{callee:e})},safeEncode(e,r){return DP(this,e,r)},safeDecode(e,r){return MP(this,e,r)},async safeEncodeAsync(e,r){return BP(this,e,r)},async safeDecodeAsync(e,r){return UP(this,e,r)},toJSONSchema(e){return rP(this,{})(e)},get description(){return ct.get(this)?.description},get _def(){return this._zod.def}}),JP=I("_ZodString",(e,r)=>{_i.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>lP(e,t,n,i)},$.derived({format:e=>ze(e).format??null,minLength:e=>ze(e).minimum??null,maxLength:e=>ze(e).maximum??null},{regex(...e){return this.check(bc(...e))},includes(...e){return this.check(qc(...e))},startsWith(...e){return this.check(Pc(...e))},endsWith(...e){return this.check(Ac(...e))},min(...e){return this.check(Ft(...e))},max(...e){return this.check(ki(...e))},length(...e){return this.check(Ti(...e))},nonempty(...e){return this.check(Ft(1,...e))},lowercase(e){return this.check(_c(e))},uppercase(e){return this.check(wc(e))},trim(){return this.check(Ec())},normalize(...e){return this.check(Ic(...e))},toLowerCase(){return this.check(Oc())},toUpperCase(){return this.check(Nc())},slugify(){return this.check(kc())}})),_J=I("ZodString",(e,r)=>{_i.init(e,r),JP.init(e,r)},{email(e){return this.check(hq(IJ,e))},url(e){return this.check(qq(OJ,e))},jwt(e){return this.check(Rq(BJ,e))},emoji(e){return this.check(Pq(NJ,e))},guid(e){return this.check(gq(EJ,e))},uuid(e){return this.check(yq(Li,e))},uuidv4(e){return this.check(bq(Li,e))},uuidv6(e){return this.check(_q(Li,e))},uuidv7(e){return this.check(wq(Li,e))},nanoid(e){return this.check(Aq(kJ,e))},cuid(e){return this.check(Iq(TJ,e))},cuid2(e){return this.check(Eq(SJ,e))},ulid(e){return this.check(Oq($J,e))},base64(e){return this.check(zq(ZJ,e))},base64url(e){return this.check(Fq(DJ,e))},xid(e){return this.check(Nq(LJ,e))},ksuid(e){return this.check(kq(zJ,e))},ipv4(e){return this.check(Tq(FJ,e))},ipv6(e){return this.check(Sq(xJ,e))},cidrv4(e){return this.check($q(RJ,e))},cidrv6(e){return this.check(Lq(CJ,e))},e164(e){return this.check(xq(MJ,e))},datetime(e){return this.check(Cq(wJ,e))},date(e){return this.check(Zq(qJ,e))},time(e){return this.check(Dq(PJ,e))},duration(e){return this.check(Mq(AJ,e))}});function XP(e){return vq(_J,e)}var ne=I("ZodStringFormat",(e,r)=>{K.init(e,r),JP.init(e,r)}),wJ=I("ZodISODateTime",(e,r)=>{Ew.init(e,r),ne.init(e,r)}),qJ=I("ZodISODate",(e,r)=>{Ow.init(e,r),ne.init(e,r)}),PJ=I("ZodISOTime",(e,r)=>{Nw.init(e,r),ne.init(e,r)}),AJ=I("ZodISODuration",(e,r)=>{kw.init(e,r),ne.init(e,r)}),IJ=I("ZodEmail",(e,r)=>{vw.init(e,r),ne.init(e,r)});var EJ=I("ZodGUID",(e,r)=>{pw.init(e,r),ne.init(e,r)});var Li=I("ZodUUID",(e,r)=>{dw.init(e,r),ne.init(e,r)});var OJ=I("ZodURL",(e,r)=>{yw.init(e,r),ne.init(e,r)});var NJ=I("ZodEmoji",(e,r)=>{bw.init(e,r),ne.init(e,r)});var kJ=I("ZodNanoID",(e,r)=>{_w.init(e,r),ne.init(e,r)});var TJ=I("ZodCUID",(e,r)=>{ww.init(e,r),ne.init(e,r)});var SJ=I("ZodCUID2",(e,r)=>{qw.init(e,r),ne.init(e,r)});var $J=I("ZodULID",(e,r)=>{Pw.init(e,r),ne.init(e,r)});var LJ=I("ZodXID",(e,r)=>{Aw.init(e,r),ne.init(e,r)});var zJ=I("ZodKSUID",(e,r)=>{Iw.init(e,r),ne.init(e,r)});var FJ=I("ZodIPv4",(e,r)=>{Tw.init(e,r),ne.init(e,r)});var xJ=I("ZodIPv6",(e,r)=>{$w.init(e,r),ne.init(e,r)});var RJ=I("ZodCIDRv4",(e,r)=>{Lw.init(e,r),ne.init(e,r)});var CJ=I("ZodCIDRv6",(e,r)=>{zw.init(e,r),ne.init(e,r)});var ZJ=I("ZodBase64",(e,r)=>{xw.init(e,r),ne.init(e,r)});var DJ=I("ZodBase64URL",(e,r)=>{Rw.init(e,r),ne.init(e,r)});var MJ=I("ZodE164",(e,r)=>{Cw.init(e,r),ne.init(e,r)});var BJ=I("ZodJWT",(e,r)=>{Zw.init(e,r),ne.init(e,r)});var QP=I("ZodNumber",(e,r)=>{pc.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>fP(e,t,n,i),e.isFinite=!0},$.derived({minValue:e=>{let{minimum:r,exclusiveMinimum:t}=ze(e);return Math.max(r??Number.NEGATIVE_INFINITY,t??Number.NEGATIVE_INFINITY)},maxValue:e=>{let{maximum:r,exclusiveMaximum:t}=ze(e);return Math.min(r??Number.POSITIVE_INFINITY,t??Number.POSITIVE_INFINITY)},isInt:e=>{let{isInt:r,multipleOf:t}=ze(e);return!!r||!!t?.some(Number.isSafeInteger)},format:e=>ze(e).format??null},{gt(e,r){return this.check(Oi(e,r))},gte(e,r){return this.check(Rn(e,r))},min(e,r){return this.check(Rn(e,r))},lt(e,r){return this.check(Ei(e,r))},lte(e,r){return this.check(xn(e,r))},max(e,r){return this.check(xn(e,r))},int(e){return this.check(HP(e))},safe(e){return this.check(HP(e))},positive(e){return this.check(Oi(0,e))},nonnegative(e){return this.check(Rn(0,e))},negative(e){return this.check(Ei(0,e))},nonpositive(e){return this.check(xn(0,e))},multipleOf(e,r){return this.check(Ni(e,r))},step(e,r){return this.check(Ni(e,r))},finite(){return this}}));function YP(e){return Bq(QP,e)}var UJ=I("ZodNumberFormat",(e,r)=>{Dw.init(e,r),QP.init(e,r)});function HP(e){return Uq(UJ,e)}var HJ=I("ZodBoolean",(e,r)=>{Mw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>mP(e,t,n,i)});function Cc(e){return Hq(HJ,e)}var VJ=I("ZodUnknown",(e,r)=>{Bw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>dP(e,t,n,i)});function VP(){return Vq(VJ)}var GJ=I("ZodNever",(e,r)=>{Uw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>pP(e,t,n,i)});function jP(e){return Gq(GJ,e)}var WJ=I("ZodArray",(e,r)=>{zi(),Hw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>yP(e,t,n,i),e.element=r.element},{min(e,r){return this.check(Ft(e,r))},nonempty(e){return this.check(Ft(1,e))},max(e,r){return this.check(ki(e,r))},length(e,r){return this.check(Ti(e,r))},unwrap(){return this.element}});function Ct(e,r){return Wq(WJ,e,r)}var KJ=I("ZodObject",(e,r)=>{zi(),Ww.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>bP(e,t,n,i),$.installLazyProp(e,"shape",t=>t._zod.def.shape,!1)},{keyof(){return Dn(Object.keys(this._zod.def.shape))},catchall(e){return this.clone($.mergeDefs(this._zod.def,{catchall:e}))},passthrough(){return this.clone($.mergeDefs(this._zod.def,{catchall:VP()}))},loose(){return this.clone($.mergeDefs(this._zod.def,{catchall:VP()}))},strict(){return this.clone($.mergeDefs(this._zod.def,{catchall:jP()}))},strip(){return this.clone($.mergeDefs(this._zod.def,{catchall:void 0}))},extend(e){return $.extend(this,e)},safeExtend(e){return $.safeExtend(this,e)},merge(e){return $.merge(this,e)},pick(e){return $.pick(this,e)},omit(e){return $.omit(this,e)},partial(...e){return $.partial(Dc,this,e[0])},exactPartial(...e){return $.partial(eA,this,e[0],"exactPartial")},required(...e){return $.required(rA,this,e[0])}});function nr(e,r){return new KJ({type:"object",shape:e,catchall:jP(),...$.normalizeParams(r)})}var JJ=I("ZodUnion",(e,r)=>{Kw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>_P(e,t,n,i),e.options=r.options});function XJ(e,r){return new JJ({type:"union",options:e,...$.normalizeParams(r)})}var QJ=I("ZodIntersection",(e,r)=>{Jw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>wP(e,t,n,i)});function YJ(e,r){return new QJ({type:"intersection",left:e,right:r})}var jJ=I("ZodTuple",(e,r)=>{zi(),Xw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>qP(e,t,n,i)},{rest(e){return this.clone({...this._zod.def,rest:e})},partial(){let e=this._zod.def;if(e.checks?.length)throw new Error(".partial() cannot be used on tuple schemas containing refinements");return this.clone({...e,items:e.items.map(r=>new Dc({type:"optional",innerType:r}))})}});function Zc(e,r,t){let n=r instanceof ee,i=n?t:r,s=n?r:null;return new jJ({type:"tuple",items:e,rest:s,...$.normalizeParams(i)})}var Rc=I("ZodEnum",(e,r)=>{Qw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(n,i,s)=>vP(e,n,i,s),e.enum=r.entries,e.options=[...e._zod.values];let t=new Set(Object.keys(r.entries));e.extract=(n,i)=>{let s={};for(let l of n)if(t.has(l))s[l]=r.entries[l];else throw new Error(`Key ${l} not found in enum`);return new Rc({...r,checks:[],...$.normalizeParams(i),entries:s})},e.exclude=(n,i)=>{let s={...r.entries};for(let l of n)if(t.has(l))delete s[l];else throw new Error(`Key ${l} not found in enum`);return new Rc({...r,checks:[],...$.normalizeParams(i),entries:s})}});function Dn(e,r){let t=Array.isArray(e)?Object.fromEntries(e.map(n=>[n,n])):e;return new Rc({type:"enum",entries:t,...$.normalizeParams(r)})}var eX=I("ZodTransform",(e,r)=>{zi(),Yw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>gP(e,t,n,i),e._zod.parse=(t,n)=>{if(n.direction==="backward")throw new zt(e.constructor.name);t.addIssue=s=>{if(typeof s=="string")t.issues.push($.issue(s,t.value,r));else{let l=s;l.fatal&&(l.continue=!1),l.code??(l.code="custom"),"input"in l||(l.input=t.value),l.inst??(l.inst=e),t.issues.push($.issue(l))}};let i=r.transform(t.value,t);return i instanceof Promise?i.then(s=>(t.value=s,t)):(t.value=i,t)}});function rX(e){return new eX({type:"transform",transform:e})}var Dc=I("ZodOptional",(e,r)=>{dc.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>Fc(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function GP(e){return new Dc({type:"optional",innerType:e})}var eA=I("ZodExactOptional",(e,r)=>{jw.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>Fc(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function tX(e){return new eA({type:"optional",innerType:e})}var nX=I("ZodNullable",(e,r)=>{eq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>PP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function WP(e){return new nX({type:"nullable",innerType:e})}var oX=I("ZodDefault",(e,r)=>{rq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>EP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType,e.removeDefault=e.unwrap});function iX(e,r){return new oX({type:"default",innerType:e,get defaultValue(){return typeof r=="function"?r():$.shallowClone(r)}})}var sX=I("ZodPrefault",(e,r)=>{tq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>OP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function aX(e,r){return new sX({type:"prefault",innerType:e,get defaultValue(){return typeof r=="function"?r():$.shallowClone(r)}})}var rA=I("ZodNonOptional",(e,r)=>{nq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>AP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function uX(e,r){return new rA({type:"nonoptional",innerType:e,...$.normalizeParams(r)})}var cX=I("ZodCatch",(e,r)=>{oq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>NP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType,e.removeCatch=e.unwrap});function lX(e,r){return new cX({type:"catch",innerType:e,catchValue:typeof r=="function"?r:$.constantCatch(r)})}var fX=I("ZodPipe",(e,r)=>{iq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>kP(e,t,n,i),e.in=r.in,e.out=r.out});function KP(e,r){return new fX({type:"pipe",in:e,out:r})}var mX=I("ZodReadonly",(e,r)=>{sq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>TP(e,t,n,i),e.unwrap=()=>e._zod.def.innerType});function pX(e){return new mX({type:"readonly",innerType:e})}var dX=I("ZodCustom",(e,r)=>{aq.init(e,r),ie.init(e,r),e._zod.processJSONSchema=(t,n,i)=>hP(e,t,n,i)});function vX(e,r={}){return Kq(dX,e,r)}function hX(e,r){return Jq(e,r)}var gX="Enter a number.",Fe=YP({error:gX}),oA=Fe.refine(e=>e>.5&&e<1,{error:"A level lies between 0.5 and 1, such as 0.95."}),iA=Fe.refine(e=>e>=.5&&e<=10,{error:"A design effect lies from 0.5 to 10."}),yX=1e15,sA=1e-12,aA=(e,r)=>Fe.refine(t=>Number.isInteger(t)&&t>=e,{error:r}),bX=e=>aA(1,e).refine(r=>r<=yX,{error:"No sample has so many people."}),tA=nr({pp:Fe.refine(e=>e>=sA&&e<100,{error:"A margin in points lies between 0 and 100."}),unit:Fe.refine(e=>e>0&&e<=10,{error:"The unit a margin is rounded to lies above 0 and not above 10 points."}),level:oA}),_X=nr({source:Dn(["design","kish","stated"],{error:"A design effect comes from design, kish or stated."}),value:iA,df:aA(1,"Degrees of freedom are a whole number of at least 1.").optional()}),Mn=XP({error:"An option needs its name."}),wX=nr({option:Mn,pct:Fe.refine(e=>e>=0&&e<=100,{error:"A share lies from 0 to 100 percent."}).nullable(),answer:Cc({error:"answer is true or false."}).optional()}),nA=nr({sampleSource:Dn(["probability","quota","opt-in","blended","unknown"],{error:"The sample source is probability, quota, opt-in, blended or unknown."}),n:bX("The sample size is a whole number of at least 1.").nullable(),design:Dn(["weighted","unweighted","clustered"],{error:"The design is weighted, unweighted or clustered."}),deff:_X.nullable().optional(),statedMargin:tA.nullable().optional(),modelledInterval:tA.nullable().optional(),decimals:Fe.refine(e=>Number.isInteger(e)&&e>=0&&e<=6,{error:"Decimals are a whole number from 0 to 6."}),shares:Ct(wX,{error:"Shares are a list."}).min(1,{error:"A release needs at least one share."})}),uA=Zc([Fe,Fe],{error:"A range has a low and a high end."}),Mc=nr({value:iA,range:uA}),qX=nr({level:oA.optional(),assumed:nr({weighted:Mc.optional(),clustered:Mc.optional(),unweighted:Mc.optional()}).optional(),kishRange:uA.optional(),comparisonBasis:Cc({error:"comparisonBasis is true or false."}).optional(),indifferencePp:Fe.refine(e=>e>0,{error:"The margin of indifference lies above 0 points."}).optional(),minimumNEff:Fe.refine(e=>e>=1,{error:"The smallest effective sample size is at least 1."}).optional()}),PX=nr({option:Mn,pct:Fe.refine(e=>e>=sA&&e<100,{error:"A threshold lies between 0 and 100 percent."})}),cA=nr({policy:qX.optional(),release:nA,previous:nA.nullable().optional(),pairs:Ct(Zc([Mn,Mn],{error:"A pair names two options."})).optional(),changes:Ct(Mn).optional(),thresholds:Ct(PX).optional()},{error:e=>e.code==="invalid_type"?"A check document is a JSON object.":void 0});function Bc(e){let[r="0",t="0"]=String(e).split("e"),[n="0",i=""]=r.split("."),s=i.length-Number(t),l=BigInt(n+i);return s>=0?{digits:l,places:s}:{digits:l*10n**BigInt(-s),places:0}}function lA(e){return Bc(e).places}function fA(e,r){let t=Bc(e),n=Bc(r),i=Math.max(t.places,n.places),s=({digits:l,places:u})=>l*10n**BigInt(i-u);return s(t)%s(n)===0n}function Uc(e,r,t){if(AX(e,r),e.deff?.df!==void 0&&e.deff.source!=="design")throw new j(`${r}.deff.df`,"Degrees of freedom belong only to a design effect computed from the design.");mA(e.statedMargin,`${r}.statedMargin`),mA(e.modelledInterval,`${r}.modelledInterval`),IX(e,r,t)}function AX({shares:e,decimals:r},t){let n=new Set,i=0,s=0;if(e.forEach(({option:l,pct:u},o)=>{if(n.has(l))throw new j(`${t}.shares[${o}].option`,"This option is already in the list.");if(n.add(l),u!==null){if(lA(u)>r)throw new j(`${t}.shares[${o}].pct`,`This share has more than the ${r} decimals of its release.`);i+=An(u,r),s+=1}}),i>An(100,r)+s/2)throw new j(`${t}.shares`,"The shares sum to more than 100 percent and rounding allow.")}function mA(e,r){if(e&&!fA(e.pp,e.unit))throw new j(`${r}.pp`,`This margin is not a multiple of ${e.unit}, the unit it is said to be rounded to.`)}function IX(e,r,t){let n=Xo(e,t);if(!(e.n===null||n!=="sampling"&&n!=="comparison")&&!(!e.statedMargin||!Lu(e,e.n))&&Pn(e.statedMargin,e.n).value>mb)throw new j(`${r}.statedMargin.pp`,"This margin implies a design effect above 10: check it and the sample size.")}var EX=1e-9,OX=1e9;function pA(e){for(let[t,n]of Object.entries(e?.assumed??{}))if(n&&!NX(n))throw new j(`policy.assumed.${t}.range`,"The range ascends from at least 0.5 to at most 10 and contains the value.");let{kishRange:r}=e??{};if(r&&!(dA(r,1)&&r[0]>=EX&&r[1]<=OX))throw new j("policy.kishRange","The range is positive, ascends and contains 1.")}function NX({value:e,range:r}){return dA(r,e)&&r[0]>=.5&&r[1]<=10}function dA([e,r],t){return e>0&&e<=t&&t<=r}var Hc="This option is not in the release.",kX="This is asked already.";function vA(e){let r=new Set(e.release.shares.map(({option:s})=>s));TX(e.pairs??[],r);let t=e.changes??[];if(t.length>0&&!e.previous)throw new j("changes","A change needs the release it is compared with.");let n=new Set;t.forEach((s,l)=>{if(!r.has(s))throw new j(`changes[${l}]`,Hc);Vc(n,s,`changes[${l}]`)});let i=new Set;(e.thresholds??[]).forEach(({option:s,pct:l},u)=>{if(!r.has(s))throw new j(`thresholds[${u}].option`,Hc);Vc(i,JSON.stringify([s,l]),`thresholds[${u}]`)})}function TX(e,r){let t=new Set;e.forEach((n,i)=>{if(n.forEach((s,l)=>{if(!r.has(s))throw new j(`pairs[${i}][${l}]`,Hc)}),n[0]===n[1])throw new j(`pairs[${i}]`,"A pair names two different options.");Vc(t,JSON.stringify([...n].sort()),`pairs[${i}]`)})}function Vc(e,r,t,n=kX){if(e.has(r))throw new j(t,n);e.add(r)}var SX=/^(policy\.assumed\.\w+\.range|policy\.kishRange)\b.*$/,hA=/^(pairs\[\d+\])\[\d+\]$/;function yA(e){let[r]=e.issues;if(!r)throw new TypeError("refusalOf requires an issue");if(r.code==="unrecognized_keys")return new j(gA([...r.path,...r.keys.slice(0,1)]),"This key is not known here.");let t=gA(r.path).replace(SX,"$1");return r.code==="invalid_type"&&r.input===void 0&&r.path.length>0&&hA.test(t)?new j(t.replace(hA,"$1"),"A pair names two options."):new j(t,r.message)}function gA(e){return e.reduce((r,t)=>typeof t=="number"?`${r}[${t}]`:r===""?String(t):`${r}.${String(t)}`,"")}function $X(e){let r=cA.safeParse(e);if(!r.success)throw yA(r.error);let t=r.data;pA(t.policy);let n=jo(t.policy);return Uc(t.release,"release",n),t.previous&&Uc(t.previous,"previous",n),vA(t),t}export{j as CheckRefused,Cu as ENGINE_VERSION,HW as check,$X as parseCheckDocument};
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
@stdlib/math-base-tools-evalpoly/lib/main.js:
@stdlib/math-base-tools-evalpoly/lib/factory.js:
@stdlib/math-base-tools-evalpoly/lib/index.js:
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
@stdlib/stats-base-dists-t-cdf/lib/main.js:
@stdlib/utils-constant-function/lib/main.js:
@stdlib/utils-constant-function/lib/index.js:
@stdlib/stats-base-dists-t-cdf/lib/factory.js:
@stdlib/stats-base-dists-t-cdf/lib/index.js:
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
@stdlib/stats-base-dists-t-quantile/lib/main.js:
@stdlib/stats-base-dists-t-quantile/lib/factory.js:
@stdlib/stats-base-dists-t-quantile/lib/index.js:
@stdlib/math-base-special-betaincinv/lib/main.js:
@stdlib/math-base-special-betaincinv/lib/index.js:
@stdlib/stats-base-dists-beta-quantile/lib/main.js:
@stdlib/stats-base-dists-beta-quantile/lib/factory.js:
@stdlib/stats-base-dists-beta-quantile/lib/index.js:
@stdlib/math-base-special-betaln/lib/index.js:
@stdlib/stats-base-dists-beta-logpdf/lib/main.js:
@stdlib/stats-base-dists-beta-logpdf/lib/factory.js:
@stdlib/stats-base-dists-beta-logpdf/lib/index.js:
@stdlib/stats-base-dists-gamma-logpdf/lib/main.js:
@stdlib/stats-base-dists-degenerate-logpdf/lib/main.js:
@stdlib/stats-base-dists-degenerate-logpdf/lib/factory.js:
@stdlib/stats-base-dists-degenerate-logpdf/lib/index.js:
@stdlib/stats-base-dists-gamma-logpdf/lib/factory.js:
@stdlib/stats-base-dists-gamma-logpdf/lib/index.js:
@stdlib/math-base-assert-is-nonnegative-integer/lib/main.js:
@stdlib/math-base-assert-is-nonnegative-integer/lib/index.js:
@stdlib/math-base-special-binomcoefln/lib/main.js:
@stdlib/math-base-special-binomcoefln/lib/index.js:
@stdlib/stats-base-dists-binomial-pmf/lib/main.js:
@stdlib/stats-base-dists-degenerate-pmf/lib/main.js:
@stdlib/stats-base-dists-degenerate-pmf/lib/factory.js:
@stdlib/stats-base-dists-degenerate-pmf/lib/index.js:
@stdlib/stats-base-dists-binomial-pmf/lib/factory.js:
@stdlib/stats-base-dists-binomial-pmf/lib/index.js:
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
@stdlib/function-ctor/lib/main.js:
@stdlib/function-ctor/lib/index.js:
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
@stdlib/stats-base-dists-gamma-logpdf/lib/regularised_gamma_prefix.js:
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

@stdlib/math-base-special-betaln/lib/dceval.js:
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
  * The code is adapted from the Fortran routine from the FNLIB library of the [SLATEC Common Mathematical Library]{@link https://netlib.org/slatec/fnlib/dcsevl.f}.
  *
  * The original code was developed by W. Fullerton of Los Alamos Scientific Laboratory, a governmental institution, and is therefore public domain.
  *)

@stdlib/math-base-special-betaln/lib/gamma_correction.js:
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
  * The code is adapted from the Fortran routine from the FNLIB library of the [SLATEC Common Mathematical Library]{@link https://netlib.org/fn/d9lgmc.f}.
  *
  * The original code was developed by W. Fullerton of Los Alamos Scientific Laboratory, a governmental institution, and is therefore public domain.
  *)

@stdlib/math-base-special-betaln/lib/main.js:
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
  * The code is adapted from the Fortran routine from the FNLIB library of the [SLATEC Common Mathematical Library]{@link https://www.netlib.org/slatec/fnlib/albeta.f}.
  *
  * The original code was developed by W. Fullerton of Los Alamos Scientific Laboratory, a governmental institution, and is therefore public domain.
  *)

@stdlib/stats-base-dists-gamma-logpdf/lib/gamma_p_derivative.js:
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
  * The original C++ code and copyright notice are from the [Boost library]{@link http://www.boost.org/doc/libs/1_58_0/boost/math/special_functions/gamma.hpp}. The implementation has been modified for JavaScript.
  *
  * ```text
  * Copyright John Maddock 2006-7, 2013-14.
  * Copyright Paul A. Bristow 2007, 2013-14.
  * Copyright Nikhar Agrawal 2013-14.
  * Copyright Christopher Kormanyos 2013-14.
  *
  * Use, modification and distribution are subject to the
  * Boost Software License, Version 1.0. (See accompanying file
  * LICENSE_1_0.txt or copy at http://www.boost.org/LICENSE_1_0.txt)
  * ```
  *)
*/
